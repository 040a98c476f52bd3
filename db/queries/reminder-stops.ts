import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { database } from '../client';
import { home, homeMember, reminderStop } from '../schema';
import { memberOf } from '../scope';

const membershipIn = (userId: string, homeId: string) => and(eq(homeMember.userId, userId), eq(homeMember.homeId, homeId));

/** No more reminders of this home for this person; saying it twice is the same. False when the person is no member (any more). */
export function stopHome(userId: string, homeId: string, now: Date): boolean {
  database().update(homeMember).set({ remindersStoppedAt: now }).where(and(membershipIn(userId, homeId), isNull(homeMember.remindersStoppedAt))).run();
  return database().select({ homeId: homeMember.homeId }).from(homeMember).where(membershipIn(userId, homeId)).get() !== undefined;
}

/** Reminds the actor of this home again. */
export const resumeHome = (actor: Actor, homeId: string): boolean =>
  database().update(homeMember).set({ remindersStoppedAt: null }).where(membershipIn(actor.id, homeId)).run().changes === 1;

/** The actor's homes without reminders. */
export const stoppedHomes = (actor: Actor): { id: string; name: string }[] =>
  database()
    .select({ id: home.id, name: home.name })
    .from(homeMember)
    .innerJoin(home, eq(home.id, homeMember.homeId))
    .where(and(memberOf(actor), isNotNull(homeMember.remindersStoppedAt)))
    .orderBy(home.name)
    .all();

/** The name of the home for the page behind an unsubscribe address; null when the person is no member any more. */
export const homeToStop = (userId: string, homeId: string): { name: string; stopped: boolean } | null => {
  const row = database()
    .select({ name: home.name, stoppedAt: homeMember.remindersStoppedAt })
    .from(homeMember)
    .innerJoin(home, eq(home.id, homeMember.homeId))
    .where(membershipIn(userId, homeId))
    .get();
  return row ? { name: row.name, stopped: row.stoppedAt !== null } : null;
};

/** The pieces of work that the person wants to hear no more of. */
export const stoppedWork = (userId: string, homeId: string): Set<string> =>
  new Set(
    database()
      .select({ key: reminderStop.workKey })
      .from(reminderStop)
      .where(and(eq(reminderStop.userId, userId), eq(reminderStop.homeId, homeId), isNull(reminderStop.withdrawnAt)))
      .all()
      .map((row) => row.key),
  );
