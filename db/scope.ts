import { and, eq, isNull } from 'drizzle-orm';
import { type Actor, can, type HomeVerb, Refused, type RoleVerb, type Subject } from '@/lib/permissions';
import { type Membership } from '@/lib/schemas/vocabulary';
import { database } from './client';
import { home, homeMember, wall, workRecord } from './schema';

/** The condition every query on homes starts from: not archived, and this actor is a member. Joins `home_member`. */
export const memberOf = (actor: Actor) => and(eq(homeMember.userId, actor.id), isNull(home.archivedAt));

export type ScopedHome = { home: typeof home.$inferSelect; membership: Membership };

/** The home if the actor may see it and do `verb` to it. Out of scope is not found; in scope but refused is not allowed. */
export function homeFor(actor: Actor, homeId: string, verb: HomeVerb): ScopedHome {
  const row = database()
    .select({ home, membership: homeMember.membership })
    .from(home)
    .innerJoin(homeMember, eq(homeMember.homeId, home.id))
    .where(and(eq(home.id, homeId), memberOf(actor)))
    .get();
  if (!row) throw new Refused('not found', 'That home');
  demand(actor, verb, { membership: row.membership });
  return row;
}

/** The wall (not removed) with its home, if the actor may do `verb` to the home. */
export function wallFor(actor: Actor, wallId: string, verb: HomeVerb): ScopedHome & { wall: typeof wall.$inferSelect } {
  const row = database().select().from(wall).where(and(eq(wall.id, wallId), isNull(wall.removedAt))).get();
  if (!row) throw new Refused('not found', 'That wall');
  const scoped = scopedOrMissing(() => homeFor(actor, row.homeId, verb), 'That wall');
  return { ...scoped, wall: row };
}

/** The work record (not removed), if the actor may do `verb`; who made it counts for taking it back. */
export function recordFor(actor: Actor, recordId: string, verb: HomeVerb): ScopedHome & { record: typeof workRecord.$inferSelect } {
  const record = database().select().from(workRecord).where(and(eq(workRecord.id, recordId), isNull(workRecord.removedAt))).get();
  if (!record) throw new Refused('not found', 'That work record');
  const scoped = scopedOrMissing(() => homeFor(actor, record.homeId, 'home.view'), 'That work record');
  demand(actor, verb, { membership: scoped.membership, createdBy: record.createdBy });
  return { ...scoped, record };
}

/** Throws `Refused` unless the policy allows it. */
export function demand(actor: Actor, verb: HomeVerb | RoleVerb, subject: Subject = {}): void {
  if (!can(actor, verb, subject)) throw new Refused('not allowed', verb);
}

function scopedOrMissing<T>(read: () => T, what: string): T {
  try {
    return read();
  } catch (error) {
    if (error instanceof Refused && error.reason === 'not found') throw new Refused('not found', what);
    throw error;
  }
}
