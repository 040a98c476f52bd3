import { and, eq, inArray, isNull, lte, sql } from 'drizzle-orm';
import { type CalendarDay, dayIn } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { nextStageDay, stageOn } from '@/lib/care/stages';
import { type HomePlan, type WorkItem } from '@/lib/care/types';
import { database, transaction } from '../client';
import { home, wall, wallPlan, workItem } from '../schema';
import { careHomeAt } from './care-home';
import { type HomeRow } from './homes';

/**
 * Every change to a home, its walls or its records goes through here: one transaction that makes the change, recomputes the
 * sun where its inputs changed, and writes the plan anew. The change itself checks who may make it.
 */
export function changeHome<T>(homeId: string, now: Date, work: () => T): T {
  return transaction(() => {
    const result = work();
    database().update(home).set({ revision: sql`${home.revision} + 1` }).where(eq(home.id, homeId)).run();
    replanHome(homeId, now);
    return result;
  });
}

/** Writes the plan of a home as it stands at `now` (the day at the home). Throws when the home or its station does not exist. */
export function replanHome(homeId: string, now: Date): void {
  transaction(() => {
    const { row, home: planned, today } = careHomeAt(homeId, now);
    const plan = planHome(planned, today);
    writePlan(row, plan, today, now);
  });
}

/** The day on which the next reminder of an item falls: the stage it is in, which the unique key keeps from going out twice, or the next. */
const remindDay = (item: WorkItem, today: CalendarDay): CalendarDay | null => stageOn(item, today)?.onDay ?? nextStageDay(item, today);

function writePlan(row: HomeRow, { walls: plans, grouping }: HomePlan, today: CalendarDay, now: Date) {
  const everyWall = database().select({ id: wall.id }).from(wall).where(eq(wall.homeId, row.id));
  database().delete(workItem).where(eq(workItem.homeId, row.id)).run();
  database().delete(wallPlan).where(inArray(wallPlan.wallId, everyWall)).run();
  const items = plans.flatMap((plan) => plan.items);
  if (plans.length > 0) database().insert(wallPlan).values(plans.map(({ wallId, coat, seal }) => ({ wallId, coat, seal }))).run();
  if (items.length > 0) {
    const rows = items.map(({ window, ...item }) => ({ ...item, ...window, homeId: row.id, remindOn: remindDay({ window, ...item }, today) }));
    database().insert(workItem).values(rows).run();
  }
  const lapses = items.flatMap((item) => item.lapsesOn ?? []).sort();
  database().update(home).set({ plannedAt: now, replanOn: lapses[0] ?? null, grouping }).where(eq(home.id, row.id)).run();
}

/** Homes whose plan has lapsed at least somewhere on Earth; read from the index on replan_on. */
export const nearlyLapsed = (now: Date) =>
  database()
    .select({ id: home.id, timeZone: home.timeZone, replanOn: home.replanOn })
    .from(home)
    .where(and(lte(home.replanOn, dayIn('Etc/GMT-14', now)), isNull(home.archivedAt)));

/** Plans anew every home in whose plan something has lapsed by now; returns how many. A home that fails does not hold up the others; then throws. */
export function replanLapsed(now: Date): number {
  const lapsed = nearlyLapsed(now)
    .all()
    .filter(({ timeZone, replanOn }) => replanOn !== null && replanOn <= dayIn(timeZone, now));
  const faults: unknown[] = [];
  for (const { id } of lapsed) {
    try {
      replanHome(id, now);
    } catch (error) {
      faults.push(error);
    }
  }
  if (faults.length > 0) throw new AggregateError(faults, `${faults.length} of ${lapsed.length} homes could not be planned anew: ${faults.map(String).slice(0, 3).join('; ')}`);
  return lapsed.length;
}
