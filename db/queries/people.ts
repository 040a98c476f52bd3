import { and, eq, isNull } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { type Role, type UnitSystem } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { user } from '../schema';

export type PersonRow = typeof user.$inferSelect;

const toActor = ({ id, role, email, name }: PersonRow): Actor => ({ id, role, email, name });

/** The person of a session, if there still is one and the session is not older than the last "sign out everywhere". Milliseconds since 1970. */
export function activePerson(id: string, signedInAt: number): Actor | null {
  const row = database().select().from(user).where(eq(user.id, id)).get();
  if (!row || signedInAt < (row.sessionsValidFrom?.getTime() ?? 0)) return null;
  return toActor(row);
}

/** For signing in only. `email` is lower case. */
export const personByEmail = (email: string): PersonRow | undefined => database().select().from(user).where(eq(user.email, email)).get();

type NewPerson = { name: string; email: string; passwordHash: string; role: Extract<Role, 'homeowner' | 'contractor'>; company?: string | undefined };

/** Makes an account that is not yet verified; null when the address has one already. */
export function registerPerson(person: NewPerson): PersonRow | null {
  const { company, ...rest } = person;
  return database().insert(user).values({ ...rest, company: company ?? null }).onConflictDoNothing({ target: user.email }).returning().get() ?? null;
}

/** The address is the person's own. */
export function markVerified(userId: string, now: Date): void {
  database().update(user).set({ emailVerified: now }).where(and(eq(user.id, userId), isNull(user.emailVerified))).run();
}

/** A new password ends every session that began before it. Whoever got the link by mail owns the address. */
export function setPassword(userId: string, passwordHash: string, now: Date, options: { provesAddress: boolean }): void {
  database().update(user).set({ passwordHash, sessionsValidFrom: now }).where(eq(user.id, userId)).run();
  if (options.provesAddress) markVerified(userId, now);
}

export function endSessions(actor: Actor, now: Date): void {
  database().update(user).set({ sessionsValidFrom: now }).where(eq(user.id, actor.id)).run();
}

export type Profile = { name: string; email: string; units: UnitSystem; company: string | null; remindersOn: boolean; hasPassword: boolean; passwordHash: string | null };

/** A person's own account; throws when the account is gone. */
export function profileOf(actor: Actor): Profile {
  const row = database().select().from(user).where(eq(user.id, actor.id)).get();
  if (!row) throw new Error('the account does not exist');
  return { name: row.name ?? '', email: row.email, units: row.units, company: row.company, remindersOn: row.remindersOn, hasPassword: row.passwordHash !== null, passwordHash: row.passwordHash };
}

export function updateProfile(actor: Actor, change: { name: string; units: UnitSystem; company?: string | undefined; remindersOn: boolean }): void {
  database().update(user).set({ ...change, company: change.company ?? null }).where(eq(user.id, actor.id)).run();
}
