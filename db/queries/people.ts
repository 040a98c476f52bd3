import { and, eq, isNull } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { type Role, type UnitSystem } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { user } from '../schema';
import { withdrawTokens } from './account-tokens';
import { liftBounce } from './bounces';

export type PersonRow = typeof user.$inferSelect;

const toActor = ({ id, role, email, name }: PersonRow): Actor => ({ id, role, email, name });

/** The person of a session, if there still is one and the session is not older than the last "sign out everywhere". Milliseconds since 1970. */
export function activePerson(id: string, signedInAt: number): Actor | null {
  const row = personById(id);
  if (!row || signedInAt < (row.sessionsValidFrom?.getTime() ?? 0)) return null;
  return toActor(row);
}

export const personById = (id: string): PersonRow | undefined => database().select().from(user).where(eq(user.id, id)).get();

/** For signing in only. `email` is lower case. */
export const personByEmail = (email: string): PersonRow | undefined => database().select().from(user).where(eq(user.email, email)).get();

type NewPerson = { name: string; email: string; passwordHash: string; role: Extract<Role, 'homeowner' | 'contractor'>; company?: string | undefined };

/** Makes an account that is not yet verified; null when the address has one already. */
export function registerPerson(person: NewPerson): PersonRow | null {
  const { company, ...rest } = person;
  return database().insert(user).values({ ...rest, company: company ?? null }).onConflictDoNothing({ target: user.email }).returning().get() ?? null;
}

/** Whether the person has shown that the address is theirs. */
export const hasConfirmedAddress = (actor: Actor): boolean => Boolean(personById(actor.id)?.emailVerified);

/** The address is the person's own, and mail reaches it. */
export function markVerified(userId: string, now: Date): void {
  liftBounce(userId);
  database().update(user).set({ emailVerified: now }).where(and(eq(user.id, userId), isNull(user.emailVerified))).run();
}

/** A new password ends every session that began before it, and open links for setting one. Whoever got the link by mail owns the address. */
export function setPassword(userId: string, passwordHash: string, now: Date, options: { provesAddress: boolean }): void {
  withdrawTokens(userId, 'reset');
  database().update(user).set({ passwordHash, sessionsValidFrom: now }).where(eq(user.id, userId)).run();
  if (options.provesAddress) markVerified(userId, now);
}

export function endSessions(actor: Actor, now: Date): void {
  database().update(user).set({ sessionsValidFrom: now }).where(eq(user.id, actor.id)).run();
}

export type Profile = { name: string; email: string; units: UnitSystem; company: string | null; remindersOn: boolean; hasPassword: boolean; passwordHash: string | null };

/** A person's own account; throws when the account is gone. */
export function profileOf(actor: Actor): Profile {
  const row = personById(actor.id);
  if (!row) throw new Error('the account does not exist');
  return { name: row.name ?? '', email: row.email, units: row.units, company: row.company, remindersOn: row.remindersOn, hasPassword: row.passwordHash !== null, passwordHash: row.passwordHash };
}

/** Companies are a contractor's, reminders a homeowner's; for others these stay as they are. */
export function updateProfile(actor: Actor, change: { name: string; units: UnitSystem; company?: string | undefined; remindersOn: boolean }): void {
  const { name, units, company, remindersOn } = change;
  const byRole = actor.role === 'contractor' ? { company: company ?? null } : actor.role === 'homeowner' ? { remindersOn } : {};
  database().update(user).set({ name, units, ...byRole }).where(eq(user.id, actor.id)).run();
}
