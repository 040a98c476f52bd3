import { and, eq } from 'drizzle-orm';
import { dayIn } from '@/lib/calendar';
import { workKey } from '@/lib/care/work-key';
import { type ReminderItem, type ReminderProps } from '@/lib/mail/kinds/reminder';
import { isReminderStage } from '@/lib/mail/kinds/reminder-stages';
import { accountUrl, doUrl, planUrl } from '@/lib/mail/links';
import { can } from '@/lib/permissions';
import { type Membership } from '@/lib/schemas/vocabulary';
import { wallAreaM2 } from '@/lib/takeoff';
import { database } from '../client';
import { delivery, home, homeMember, user, workItem } from '../schema';
import { type MailRow } from './mail';
import { linkDays, type MailAction, signLink } from './mail-links';
import { wantsReminders } from './reminder-people';
import { stoppedWork } from './reminder-stops';
import { wallsOfHome } from './walls';

type Of = Pick<MailRow, 'id' | 'userId' | 'homeId'>;

/**
 * What a reminder says, from the plan as it stands now: work that was logged or moved since the mail was queued is left out.
 * `to` is the person's address now. `nothing` (with the reason) when nobody should get it any more.
 */
export function reminderPropsOf(mail: Of, site: string, now: Date): { to: string; props: ReminderProps } | { nothing: string } {
  const { userId, homeId } = mail;
  if (!userId || !homeId) return { nothing: 'The person or the home is gone.' };
  const who = database()
    .select({ home, membership: homeMember.membership, personName: user.name, units: user.units, to: user.email })
    .from(homeMember)
    .innerJoin(home, eq(home.id, homeMember.homeId))
    .innerJoin(user, eq(user.id, homeMember.userId))
    .where(and(eq(homeMember.homeId, homeId), eq(homeMember.userId, userId), wantsReminders()))
    .get();
  if (!who) return { nothing: 'The person no longer gets reminders for this home.' };
  const items = standingItems(mail.id, stoppedWork(userId, homeId), linksFor(site, { userId, homeId, membership: who.membership }, now));
  const details = wallsOfHome(homeId);
  const concerned = details.filter(({ wall }) => items.some((item) => item.wallId === wall.id));
  if (concerned.length === 0) return { nothing: 'Everything in it was done or moved before it was sent.' };
  const props = {
    homeName: who.home.name,
    personName: who.personName,
    membership: who.membership,
    units: who.units,
    today: dayIn(who.home.timeZone, now),
    yearBuilt: who.home.yearBuilt,
    stainBases: [...new Set(concerned.map(({ wall }) => wall.stainBase))],
    sealants: [...new Set(concerned.map(({ wall }) => wall.sealant))],
    walls: details.map((detail) => ({
      name: detail.wall.name,
      areaM2: wallAreaM2({ ...detail.wall, openings: detail.openings }),
      items: items.filter((item) => item.wallId === detail.wall.id).map(({ wallId: _, ...item }) => item),
    })),
    planUrl: planUrl(site, homeId),
    accountUrl: accountUrl(site),
  };
  return { to: who.to, props };
}

/** The mail's work that still stands: not logged since, and not stopped by the person. Its date may have moved; the mail says the new one. */
function standingItems(mailId: string, stopped: Set<string>, links: (key: string) => Links): (ReminderItem & { wallId: string })[] {
  const rows = database()
    .select({ stage: delivery.stage, key: delivery.workKey, item: workItem })
    .from(delivery)
    .innerJoin(workItem, and(eq(workItem.wallId, delivery.wallId), eq(workItem.kind, delivery.kind)))
    .where(eq(delivery.mailId, mailId))
    .orderBy(workItem.dueOn, workItem.kind)
    .all();
  return rows
    .filter(({ key, item }) => key === workKey(item) && !stopped.has(key))
    .flatMap(({ stage, key, item: { wallId, kind, dueOn, opensOn, closesOn, because, basis } }) =>
      isReminderStage(stage) ? [{ wallId, kind, stage, dueOn, opensOn, closesOn, because, ownRule: basis === 'own rule', ...links(key) }] : [],
    );
}

type Links = Pick<ReminderItem, 'logUrl' | 'putOffUrl' | 'stopUrl'>;

/** The links of one piece of work, signed for one person; putting off only for whoever may. */
function linksFor(site: string, { userId, homeId, membership }: { userId: string; homeId: string; membership: Membership }, now: Date): (key: string) => Links {
  const expiresAt = new Date(now.getTime() + linkDays * 86_400_000);
  const mayPutOff = can({ id: userId, role: 'homeowner', email: '', name: null }, 'work.putOff', { membership });
  return (key) => {
    const url = (action: MailAction) => doUrl(site, signLink({ action, userId, homeId, workKey: key, expiresAt }));
    return { logUrl: url('log'), putOffUrl: mayPutOff ? url('put off') : null, stopUrl: url('stop') };
  };
}
