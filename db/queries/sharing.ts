import { and, asc, eq, ne } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { type Membership, type Role } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { homeFor } from '../scope';
import { homeMember, user } from '../schema';

export type Member = { userId: string; name: string | null; email: string; company: string | null; membership: Membership; since: Date };

export function membersOf(actor: Actor, homeId: string): Member[] {
  homeFor(actor, homeId, 'home.view');
  return database()
    .select({ userId: user.id, name: user.name, email: user.email, company: user.company, membership: homeMember.membership, since: homeMember.createdAt })
    .from(homeMember)
    .innerJoin(user, eq(user.id, homeMember.userId))
    .where(eq(homeMember.homeId, homeId))
    .orderBy(asc(homeMember.createdAt))
    .all();
}

const roleNeeded: Record<Exclude<Membership, 'owner'>, Role> = { contractor: 'contractor', caretaker: 'homeowner', 'co-owner': 'homeowner' };

export type ShareOutcome = { shared: true; userId: string; isNew: boolean } | { shared: false; why: 'no account' | 'wrong role' | 'already a member' };

/** Lets another person see the home. `email` is lower case; an account whose address is not confirmed may be somebody else's. A person has one membership in a home. */
export function shareHome(actor: Actor, homeId: string, email: string, membership: Exclude<Membership, 'owner'>): ShareOutcome {
  homeFor(actor, homeId, 'home.share');
  const person = database().select().from(user).where(eq(user.email, email)).get();
  if (!person?.emailVerified) return { shared: false, why: 'no account' };
  if (person.role !== roleNeeded[membership]) return { shared: false, why: 'wrong role' };
  const made = database()
    .insert(homeMember)
    .values({ homeId, userId: person.id, membership, addedBy: actor.id })
    .onConflictDoNothing()
    .returning()
    .all();
  return made.length > 0 ? { shared: true, userId: person.id, isNew: true } : { shared: false, why: 'already a member' };
}

/** Ends a person's access; the owner's own cannot be ended. */
export function withdrawShare(actor: Actor, homeId: string, userId: string): boolean {
  homeFor(actor, homeId, 'home.share');
  const gone = database()
    .delete(homeMember)
    .where(and(eq(homeMember.homeId, homeId), eq(homeMember.userId, userId), ne(homeMember.membership, 'owner')))
    .returning()
    .all();
  return gone.length > 0;
}
