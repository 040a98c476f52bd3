import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { type FilmLife, type WorkItem } from '@/lib/care/types';
import { type Actor } from '@/lib/permissions';
import { type Membership } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { homeFor } from '../scope';
import { wall, wallPlan, workItem } from '../schema';
import { type HomeRow } from './homes';
import { type WallDetail, wallsOfHome } from './walls';
import { type RecordDetail, recordsOfHome } from './work';

export type PlannedWall = WallDetail & { coat: FilmLife; seal: FilmLife; items: WorkItem[] };

/** A home as its pages show it: walls in plan order with sun, films and next work, and every record. */
export type HomeView = { home: HomeRow; membership: Membership; walls: PlannedWall[]; records: RecordDetail[] };

type ItemRow = typeof workItem.$inferSelect;

/** The stored row as the core's shape. */
export const toWorkItem = (row: ItemRow): WorkItem => ({
  wallId: row.wallId,
  kind: row.kind,
  rule: row.rule,
  startOn: row.startOn,
  dueOn: row.dueOn,
  window: { opensOn: row.opensOn, closesOn: row.closesOn, moved: row.moved },
  missedOn: row.missedOn,
  lapsesOn: row.lapsesOn,
  basis: row.basis,
  lifeMonths: row.lifeMonths,
  because: row.because,
  explanation: row.explanation,
});

/** Throws `Refused` (not found) for a home out of the actor's scope. */
export function homeView(actor: Actor, homeId: string): HomeView {
  const { home, membership } = homeFor(actor, homeId, 'home.view');
  const details = wallsOfHome(homeId);
  const plans = plansOf(homeId);
  const items = itemsOf([homeId]);
  const walls = details.flatMap((detail) => {
    const plan = plans.get(detail.wall.id);
    return plan ? [{ ...detail, ...plan, items: items.filter((item) => item.wallId === detail.wall.id) }] : [];
  });
  return { home, membership, walls, records: recordsOfHome(homeId) };
}

function plansOf(homeId: string): Map<string, { coat: FilmLife; seal: FilmLife }> {
  const rows = database()
    .select({ wallId: wallPlan.wallId, coat: wallPlan.coat, seal: wallPlan.seal })
    .from(wallPlan)
    .innerJoin(wall, eq(wall.id, wallPlan.wallId))
    .where(and(eq(wall.homeId, homeId), isNull(wall.removedAt)))
    .all();
  return new Map(rows.map(({ wallId, ...plan }) => [wallId, plan]));
}

/** The next work of standing walls of some homes, by the day it opens. */
export function itemsOf(homeIds: string[]): WorkItem[] {
  if (homeIds.length === 0) return [];
  return database()
    .select({ item: workItem })
    .from(workItem)
    .innerJoin(wall, eq(wall.id, workItem.wallId))
    .where(and(inArray(workItem.homeId, homeIds), isNull(wall.removedAt)))
    .orderBy(asc(workItem.opensOn), asc(wall.position), asc(workItem.kind))
    .all()
    .map(({ item }) => toWorkItem(item));
}
