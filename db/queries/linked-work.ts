import { and, eq, gte, isNull } from 'drizzle-orm';
import { type WorkItem } from '@/lib/care/types';
import { workKey } from '@/lib/care/work-key';
import { dayIn } from '@/lib/calendar';
import { type Actor, can, type HomeVerb, Refused } from '@/lib/permissions';
import { database } from '../client';
import { deferral, home, homeMember, reminderStop, user, wall } from '../schema';
import { itemsOf } from './home-view';
import { linkDays, type MailLink } from './mail-links';

/** What a link from a mail is about, and on whose behalf. Nothing else of the home. */
export type LinkedWork = { actor: Actor; homeId: string; wallName: string; timeZone: string; today: string; item: WorkItem };

const verbs: Record<Exclude<MailLink['action'], 'stop home'>, HomeVerb> = { log: 'work.log', 'put off': 'work.putOff', stop: 'home.view' };

/** The work as it stands; null when it is done or moved to another piece of work, or the person may not do this (any more). */
export function linkedWork(link: MailLink, now: Date): LinkedWork | null {
  if (link.action === 'stop home') return null;
  const member = database()
    .select({ person: user, membership: homeMember.membership, timeZone: home.timeZone })
    .from(homeMember)
    .innerJoin(home, eq(home.id, homeMember.homeId))
    .innerJoin(user, eq(user.id, homeMember.userId))
    .where(and(eq(homeMember.homeId, link.homeId), eq(homeMember.userId, link.userId), isNull(home.archivedAt)))
    .get();
  const item = itemsOf([link.homeId]).find((one) => workKey(one) === link.workKey);
  if (!member || !item) return null;
  const { id, role, email, name } = member.person;
  const actor: Actor = { id, role, email, name };
  if (!can(actor, verbs[link.action], { membership: member.membership })) return null;
  const on = database().select({ name: wall.name }).from(wall).where(and(eq(wall.id, item.wallId), isNull(wall.removedAt))).get();
  return on ? { actor, homeId: link.homeId, wallName: on.name, timeZone: member.timeZone, today: dayIn(member.timeZone, now), item } : null;
}

/** As `linkedWork`; throws `Refused` where that is null. */
export function workToDo(link: MailLink, now: Date): LinkedWork {
  const work = linkedWork(link, now);
  if (!work) throw new Refused('not found', 'That work');
  return work;
}

/** No more reminders of this piece of work for this person; twice is once. */
export function stopWork({ actor, homeId, item }: LinkedWork): void {
  database().insert(reminderStop).values({ userId: actor.id, homeId, wallId: item.wallId, kind: item.kind, workKey: workKey(item) }).onConflictDoNothing().run();
}

/** Whether the person has put this piece of work off since the link was made: it moves on once, not with every press. */
export function isPutOff({ userId, homeId, workKey: key, expiresAt }: MailLink): boolean {
  const madeAt = new Date(expiresAt ? expiresAt.getTime() - linkDays * 86_400_000 : 0);
  const same = and(eq(deferral.homeId, homeId), eq(deferral.workKey, key), eq(deferral.createdBy, userId), gte(deferral.createdAt, madeAt));
  return database().select({ id: deferral.id }).from(deferral).where(same).get() !== undefined;
}
