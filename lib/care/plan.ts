import { type CalendarDay } from '@/lib/calendar';
import { carriedOver } from './carry-over';
import { filmWork } from './film-work';
import { knownWall } from './films';
import { groupedPlan } from './grouped-plan';
import { type CareHome, type CareWall, type HomePlan, type WallPlan, type WorkItem } from './types';
import { putOff } from './put-off';
import { visitsOf } from './visits';
import { withRestain } from './with-restain';
import { yearlyWork } from './yearly-work';

const inPosition = (a: CareWall, b: CareWall) => a.position - b.position || (a.id < b.id ? -1 : 1);

/** The films and next work of one wall, before walls are gathered into visits. */
export function planWall(home: CareHome, wall: CareWall, today: CalendarDay): WallPlan {
  const known = knownWall(home, wall);
  const { seasons } = home.seasons[known.wall.stainBase];
  const carried = (item: WorkItem | null) => item && carriedOver(putOff(item, home.deferrals, seasons), seasons, today);
  const restain = carried(filmWork(home, known, 'restain'));
  const items: (WorkItem | null)[] = [
    yearlyWork(home, known, 'walkaround', today),
    withRestain(yearlyWork(home, known, 'wash', today), restain),
    carried(withRestain(filmWork(home, known, 'recaulk'), restain)),
    restain,
  ];
  return { wallId: wall.id, coat: known.coat, seal: known.seal, items: items.filter((item) => item !== null) };
}

/**
 * What is next on every wall of a home, gathered into the trips that cost least, and the visits that it makes. The same home gives
 * the same items on every day until the next `lapsesOn`; the order in which work was logged does not matter.
 */
export function planHome(home: CareHome, today: CalendarDay): HomePlan {
  const single = [...home.walls].sort(inPosition).map((wall) => planWall(home, wall, today));
  const { walls, grouping } = groupedPlan(home, single, today);
  return { homeId: home.id, walls, visits: visitsOf(walls.flatMap(({ items }) => items)), grouping };
}
