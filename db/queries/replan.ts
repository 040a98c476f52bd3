import { and, eq, inArray, isNull, lte, sql } from 'drizzle-orm';
import { type CalendarDay, dayIn } from '@/lib/calendar';
import { planHome } from '@/lib/care';
import { nextStageDay, stageOn } from '@/lib/care/stages';
import { type CareHome, type WallPlan, type WorkItem } from '@/lib/care/types';
import { type Climate, climateAt, coatingSeason, stationById } from '@/lib/climate';
import { wallAreaM2 } from '@/lib/takeoff';
import { database, transaction } from '../client';
import { careRule, home, wall, wallPlan, workItem } from '../schema';
import { refreshExposures } from './exposure';
import { type HomeRow } from './homes';
import { type WallDetail, wallsOfHome } from './walls';
import { recordsOfHome } from './work';

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
    const row = database().select().from(home).where(eq(home.id, homeId)).get();
    if (!row) throw new Error('the home to plan does not exist');
    const station = stationById(row.stationId);
    if (!station) throw new Error(`the climate station ${row.stationId} does not exist`);
    const climate = climateAt(station, row.elevationM);
    const walls = wallsOfHome(homeId);
    const doses = refreshExposures(row, climate, walls, now);
    const today = dayIn(row.timeZone, now);
    const plan = planHome(careHomeOf(row, climate, walls, doses), today);
    writePlan(row, plan.walls, today, now);
  });
}

function careHomeOf(row: HomeRow, climate: Climate, walls: WallDetail[], doses: Map<string, number>): CareHome {
  const oil = coatingSeason(climate, 'oil');
  const waterborne = coatingSeason(climate, 'waterborne');
  return {
    id: row.id,
    latitude: row.latitude,
    scheffer: climate.scheffer,
    seasons: { oil: { seasons: oil.seasons, warning: oil.warning }, waterborne: { seasons: waterborne.seasons, warning: waterborne.warning } },
    since: dayIn(row.timeZone, row.createdAt),
    walls: walls.map(({ wall: one, openings }) => ({ ...one, wood: row.wood, areaM2: wallAreaM2({ ...one, openings }), doseKwhM2: doses.get(one.id) ?? 0 })),
    records: recordsOfHome(row.id).map((record) => ({
      id: record.id,
      kind: record.kind,
      doneOn: record.doneOn,
      wallIds: record.wallIds,
      finish: record.finish ?? undefined,
      stainBase: record.stainBase ?? undefined,
      sealant: record.sealant ?? undefined,
    })),
    ownRules: ownRulesOf(row.id),
  };
}

const ownRulesOf = (homeId: string) =>
  database()
    .select({ wallId: careRule.wallId, kind: careRule.kind, rule: careRule.rule, startOn: careRule.startOn })
    .from(careRule)
    .innerJoin(wall, eq(wall.id, careRule.wallId))
    .where(and(eq(wall.homeId, homeId), isNull(wall.removedAt)))
    .all();

/** The day on which the next reminder of an item falls: the stage it is in, which the unique key keeps from going out twice, or the next. */
const remindDay = (item: WorkItem, today: CalendarDay): CalendarDay | null => stageOn(item, today)?.onDay ?? nextStageDay(item, today);

function writePlan(row: HomeRow, plans: WallPlan[], today: CalendarDay, now: Date) {
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
  database().update(home).set({ plannedAt: now, replanOn: lapses[0] ?? null }).where(eq(home.id, row.id)).run();
}

/** Plans anew every home in whose plan something has lapsed by now; returns how many. A home that fails does not hold up the others; then throws. */
export function replanLapsed(now: Date): number {
  const latestDayAnywhere = dayIn('Etc/GMT-14', now);
  const lapsed = database()
    .select({ id: home.id, timeZone: home.timeZone, replanOn: home.replanOn })
    .from(home)
    .where(and(lte(home.replanOn, latestDayAnywhere), isNull(home.archivedAt)))
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
