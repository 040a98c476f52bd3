import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { type WorkItem } from '@/lib/care/types';
import { type Actor } from '@/lib/permissions';
import { database } from '../client';
import { demand, memberOf } from '../scope';
import { home, homeMember, opening, user, wall, workItem } from '../schema';
import { toWorkItem } from './home-view';
import { type HomeRow } from './homes';
import { type OpeningRow, type WallRow } from './walls';

export type Job = { home: HomeRow; wall: WallRow; openings: OpeningRow[]; item: WorkItem };
export type JobList = { jobs: Job[]; owners: Map<string, { name: string | null; email: string }> };

/** Upcoming restains and recaulks of every home shared with a contractor, by the day they open. Three queries. */
export function upcomingJobs(actor: Actor): JobList {
  demand(actor, 'job.view');
  const rows = database()
    .select({ home, wall, item: workItem })
    .from(workItem)
    .innerJoin(wall, eq(wall.id, workItem.wallId))
    .innerJoin(home, eq(home.id, workItem.homeId))
    .innerJoin(homeMember, eq(homeMember.homeId, home.id))
    .where(and(memberOf(actor), eq(homeMember.membership, 'contractor'), isNull(wall.removedAt), inArray(workItem.kind, ['restain', 'recaulk'])))
    .orderBy(asc(workItem.opensOn), asc(home.name), asc(wall.position))
    .all();
  const wallIds = [...new Set(rows.map((row) => row.wall.id))];
  const openings = wallIds.length > 0 ? database().select().from(opening).where(inArray(opening.wallId, wallIds)).all() : [];
  const homeIds = [...new Set(rows.map((row) => row.home.id))];
  return {
    jobs: rows.map((row) => ({ ...row, item: toWorkItem(row.item), openings: openings.filter((one) => one.wallId === row.wall.id) })),
    owners: ownersOf(homeIds),
  };
}

function ownersOf(homeIds: string[]): JobList['owners'] {
  if (homeIds.length === 0) return new Map();
  const rows = database()
    .select({ homeId: homeMember.homeId, name: user.name, email: user.email })
    .from(homeMember)
    .innerJoin(user, eq(user.id, homeMember.userId))
    .where(and(inArray(homeMember.homeId, homeIds), eq(homeMember.membership, 'owner')))
    .all();
  return new Map(rows.map(({ homeId, ...owner }) => [homeId, owner]));
}
