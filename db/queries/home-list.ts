import { and, asc, inArray, isNull } from 'drizzle-orm';
import { type WorkItem } from '@/lib/care/types';
import { type Actor } from '@/lib/permissions';
import { database } from '../client';
import { wall } from '../schema';
import { itemsOf } from './home-view';
import { type HomeSummary, listHomes } from './homes';

export type HomeWithWork = HomeSummary & { walls: { id: string; name: string }[]; items: WorkItem[] };

/** Every home the actor may see, with its walls in plan order and what comes next on them: three queries whatever the number of homes. */
export function homesWithWork(actor: Actor): HomeWithWork[] {
  const homes = listHomes(actor);
  const ids = homes.map(({ home }) => home.id);
  if (ids.length === 0) return [];
  const walls = database()
    .select({ id: wall.id, name: wall.name, homeId: wall.homeId })
    .from(wall)
    .where(and(inArray(wall.homeId, ids), isNull(wall.removedAt)))
    .orderBy(asc(wall.position))
    .all();
  const items = itemsOf(ids);
  return homes.map((summary) => {
    const own = walls.filter((one) => one.homeId === summary.home.id);
    return { ...summary, walls: own, items: items.filter((item) => own.some((one) => one.id === item.wallId)) };
  });
}
