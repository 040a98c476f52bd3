import { defineHandler } from '@/app/_server/handler';
import { homeView } from '@/db/queries/home-view';
import { dayIn } from '@/lib/calendar';
import { planView } from '@/lib/home/plan-view';

/** The plan of one home, for a page that stays open while it changes. */
export const GET = defineHandler({
  verb: 'home.view',
  run: ({ actor, params }) => {
    const { home, walls } = homeView(actor, params.homeId ?? '');
    const items = walls.flatMap((wall) => wall.items);
    return planView(home, walls.map(({ wall }) => wall), items, dayIn(home.timeZone, new Date()));
  },
});
