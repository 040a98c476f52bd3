import { asc, eq, sql } from 'drizzle-orm';
import { type Actor, type HomeVerb } from '@/lib/permissions';
import { type Membership } from '@/lib/schemas/vocabulary';
import { database, transaction } from '../client';
import { demand, homeFor, memberOf } from '../scope';
import { home, homeMember } from '../schema';

export type HomeRow = typeof home.$inferSelect;
type HomeFacts = Omit<typeof home.$inferInsert, 'id' | 'createdBy' | 'createdAt' | 'revision' | 'plannedAt' | 'replanOn' | 'archivedAt'>;

export type HomeSummary = { home: HomeRow; membership: Membership; nextOpensOn: string | null; wallCount: number };

/** Every home the actor may see, by name, with the day its next work opens. */
export function listHomes(actor: Actor): HomeSummary[] {
  // Asked home by home, so that the cost follows the actor's homes and not everybody's.
  const nextOpensOn = sql<string | null>`(select min(opens_on) from work_item where work_item.home_id = home.id)`;
  const wallCount = sql<number>`(select count(*) from wall where wall.home_id = home.id and wall.removed_at is null)`;
  return database()
    .select({ home, membership: homeMember.membership, nextOpensOn, wallCount })
    .from(homeMember)
    .innerJoin(home, eq(homeMember.homeId, home.id))
    .where(memberOf(actor))
    .orderBy(asc(home.name))
    .all();
}

/** One home that the actor may do `verb` to. */
export const homeOf = (actor: Actor, homeId: string, verb: HomeVerb): { home: HomeRow; membership: Membership } => homeFor(actor, homeId, verb);

/** Makes a home owned by the actor. The caller adds walls and plans it in the same transaction. */
export function createHome(actor: Actor, facts: HomeFacts): HomeRow {
  demand(actor, 'home.create');
  return transaction(() => {
    const row = database().insert(home).values({ ...facts, createdBy: actor.id }).returning().get();
    database().insert(homeMember).values({ homeId: row.id, userId: actor.id, membership: 'owner', addedBy: actor.id }).run();
    return row;
  });
}

export function updateHome(actor: Actor, homeId: string, facts: Partial<HomeFacts>): HomeRow {
  homeFor(actor, homeId, 'home.edit');
  return database().update(home).set(facts).where(eq(home.id, homeId)).returning().get();
}

/** Takes a home out of every list. Nothing is deleted. */
export function archiveHome(actor: Actor, homeId: string, now: Date): void {
  homeFor(actor, homeId, 'home.archive');
  database().update(home).set({ archivedAt: now }).where(eq(home.id, homeId)).run();
}

/** A home that the actor owns and took out, so that it can be brought back. */
export function archivedHome(actor: Actor, homeId: string | undefined): { id: string; name: string } | undefined {
  if (!homeId) return undefined;
  return database()
    .select({ id: home.id, name: home.name })
    .from(home)
    .innerJoin(homeMember, eq(homeMember.homeId, home.id))
    .where(sql`${home.id} = ${homeId} and ${homeMember.userId} = ${actor.id} and ${homeMember.membership} = 'owner' and ${home.archivedAt} is not null`)
    .get();
}

/** Brings back a home that its owner took out. */
export function restoreHome(actor: Actor, homeId: string): boolean {
  if (!archivedHome(actor, homeId)) return false;
  database().update(home).set({ archivedAt: null }).where(eq(home.id, homeId)).run();
  return true;
}
