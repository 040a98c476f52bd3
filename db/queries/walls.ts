import { and, asc, eq, isNotNull, isNull, max } from 'drizzle-orm';
import { type Actor, type HomeVerb, Refused } from '@/lib/permissions';
import { database, transaction } from '../client';
import { homeFor, wallFor } from '../scope';
import { opening, wall, wallExposure } from '../schema';
import { recallWork } from './recalled';

export type WallRow = typeof wall.$inferSelect;
export type OpeningRow = typeof opening.$inferSelect;
export type ExposureRow = typeof wallExposure.$inferSelect;
export type WallDetail = { wall: WallRow; openings: OpeningRow[]; exposure: ExposureRow | null };

type WallFacts = Omit<typeof wall.$inferInsert, 'id' | 'homeId' | 'position' | 'createdAt' | 'removedAt'>;
type OpeningFacts = Omit<typeof opening.$inferInsert, 'id' | 'wallId'>;
export type WallChange = WallFacts & { openings: OpeningFacts[]; stained: string | null; caulked: string | null };

/** The walls of one home in plan order with openings and stored exposure, in two queries. The caller has checked the home. */
export function wallsOfHome(homeId: string): WallDetail[] {
  const standing = and(eq(wall.homeId, homeId), isNull(wall.removedAt));
  const walls = database().select({ wall, exposure: wallExposure }).from(wall).leftJoin(wallExposure, eq(wallExposure.wallId, wall.id)).where(standing).orderBy(asc(wall.position)).all();
  const openings = database().select({ opening }).from(opening).innerJoin(wall, eq(wall.id, opening.wallId)).where(standing).all();
  return walls.map((row) => ({ ...row, openings: openings.flatMap((one) => (one.opening.wallId === row.wall.id ? [one.opening] : [])) }));
}

/** A wall of this home that the actor may do `verb` to; a wall of another home is not found. */
export function wallOf(actor: Actor, homeId: string, wallId: string, verb: HomeVerb) {
  const scoped = wallFor(actor, wallId, verb);
  if (scoped.home.id !== homeId) throw new Refused('not found', 'That wall');
  return scoped;
}

/** Adds a wall at the end of the round, or at a given position when a home is set up. */
export function addWall(actor: Actor, homeId: string, change: WallChange, position?: number): WallRow {
  homeFor(actor, homeId, 'home.edit');
  return transaction(() => {
    const last = database().select({ last: max(wall.position) }).from(wall).where(eq(wall.homeId, homeId)).get()?.last;
    const { openings, stained, caulked, ...facts } = change;
    const row = database().insert(wall).values({ ...facts, homeId, position: position ?? (last ?? -1) + 1 }).returning().get();
    writeParts(actor, row, openings, stained, caulked);
    return row;
  });
}

export function updateWall(actor: Actor, wallId: string, change: WallChange): WallRow {
  wallFor(actor, wallId, 'home.edit');
  return transaction(() => {
    const { openings, stained, caulked, ...facts } = change;
    const row = database().update(wall).set(facts).where(eq(wall.id, wallId)).returning().get();
    database().delete(opening).where(eq(opening.wallId, wallId)).run();
    writeParts(actor, row, openings, stained, caulked);
    return row;
  });
}

/** Takes a wall out of the plan; its history stays and `restoreWall` brings it back. */
export function removeWall(actor: Actor, wallId: string, now: Date): WallRow {
  const { wall: row } = wallFor(actor, wallId, 'home.edit');
  database().update(wall).set({ removedAt: now }).where(eq(wall.id, wallId)).run();
  return row;
}

export function restoreWall(actor: Actor, homeId: string, wallId: string): void {
  homeFor(actor, homeId, 'home.edit');
  const { changes } = database().update(wall).set({ removedAt: null }).where(and(eq(wall.id, wallId), eq(wall.homeId, homeId))).run();
  if (changes === 0) throw new Refused('not found', 'That wall');
}

/** A wall of this home that was taken out and can come back. */
export function takenOutWall(actor: Actor, homeId: string, wallId: string | undefined): WallRow | undefined {
  if (!wallId) return undefined;
  homeFor(actor, homeId, 'home.edit');
  return database().select().from(wall).where(and(eq(wall.id, wallId), eq(wall.homeId, homeId), isNotNull(wall.removedAt))).get();
}

/** Turns the whole house: every wall's direction by the same angle, degrees clockwise. */
export function turnWalls(actor: Actor, homeId: string, byDeg: number): void {
  homeFor(actor, homeId, 'home.edit');
  transaction(() => {
    for (const row of database().select().from(wall).where(eq(wall.homeId, homeId)).all()) {
      const azimuthDeg = (((row.azimuthDeg + byDeg) % 360) + 360) % 360;
      database().update(wall).set({ azimuthDeg }).where(eq(wall.id, row.id)).run();
    }
  });
}

function writeParts(actor: Actor, row: WallRow, openings: OpeningFacts[], stained: string | null, caulked: string | null) {
  if (openings.length > 0) database().insert(opening).values(openings.map((one) => ({ ...one, wallId: row.id }))).run();
  recallWork(actor, row, 'restain', stained);
  recallWork(actor, row, 'recaulk', caulked);
}
