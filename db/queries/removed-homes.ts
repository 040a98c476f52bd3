import { and, desc, eq, gt, isNotNull, lte } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { database } from '../client';
import { home, homeMember } from '../schema';

/** A removed home can be brought back for so many days; then it is deleted for good. Our rule. */
export const undoDays = 30;
const dayMs = 86_400_000;

export type RemovedHome = { id: string; name: string; daysLeft: number };

/** The homes that the actor owned and removed, and for how many days each can still be brought back; the last removed first. */
export const removedHomes = (actor: Actor, now: Date): RemovedHome[] =>
  database()
    .select({ id: home.id, name: home.name, archivedAt: home.archivedAt })
    .from(home)
    .innerJoin(homeMember, and(eq(homeMember.homeId, home.id), eq(homeMember.userId, actor.id), eq(homeMember.membership, 'owner')))
    .where(and(isNotNull(home.archivedAt), gt(home.archivedAt, new Date(now.getTime() - undoDays * dayMs))))
    .orderBy(desc(home.archivedAt))
    .all()
    .map(({ id, name, archivedAt }) => ({ id, name, daysLeft: Math.ceil(((archivedAt?.getTime() ?? 0) + undoDays * dayMs - now.getTime()) / dayMs) }));

/** Deletes homes that were removed thirty days ago or longer, with everything that hangs on them; how many. */
export const purgeRemovedHomes = (now: Date): number =>
  database().delete(home).where(and(isNotNull(home.archivedAt), lte(home.archivedAt, new Date(now.getTime() - undoDays * dayMs)))).run().changes;
