import { createHash } from 'node:crypto';
import { and, eq, inArray, lte } from 'drizzle-orm';
import { type CalendarDay, dayIn, hourIn } from '@/lib/calendar';
import { deliveryKey, nextStageDay, stageOn } from '@/lib/care/stages';
import { workKey } from '@/lib/care/work-key';
import { database, transaction } from '../client';
import { delivery, home, wall, workItem } from '../schema';
import { toWorkItem } from './home-view';
import { enqueueMail } from './mail';
import { type Recipient, recipientsOf } from './reminder-people';
import { stoppedWork } from './reminder-stops';

export type ReminderCounts = { items: number; deliveries: number; mails: number };

/** The latest calendar day anywhere on Earth at an instant (UTC+14). */
const latestDay = (now: Date) => dayIn('Etc/GMT-14', now);

/** Work whose day has come at least somewhere on Earth; read from the index on remind_on. */
export const itemsNearlyDue = (now: Date) =>
  database()
    .select({ homeId: workItem.homeId, remindOn: workItem.remindOn, timeZone: home.timeZone })
    .from(workItem)
    .innerJoin(home, eq(home.id, workItem.homeId))
    .where(lte(workItem.remindOn, latestDay(now)));

/** Nobody is written to at night: from this hour on at the home. Our rule. */
const morningHour = 7;

/** Homes where the day of a reminder and its morning have come, by their own calendar and clock. The cost follows what is due, not how many homes there are. */
export function homesToRemind(now: Date): { homeId: string; today: CalendarDay }[] {
  const due = new Map<string, CalendarDay>();
  const days = new Map<string, CalendarDay | null>();
  for (const { homeId, remindOn, timeZone } of itemsNearlyDue(now).all()) {
    if (!days.has(timeZone)) days.set(timeZone, hourIn(timeZone, now) >= morningHour ? dayIn(timeZone, now) : null);
    const today = days.get(timeZone);
    if (today && remindOn !== null && remindOn <= today) due.set(homeId, today);
  }
  return [...due].map(([homeId, today]) => ({ homeId, today }));
}

type ItemRow = typeof workItem.$inferSelect;
type Wanted = { key: string; item: ItemRow; stage: string };

/**
 * Queues the reminders of one home for one day, in one immediate transaction: a delivery row with a unique key for each
 * person and stage, new ones gathered into one mail per person, and the day of each item's next stage.
 */
export function remindHome(homeId: string, today: CalendarDay, now: Date): ReminderCounts {
  return transaction(() => {
    const rows = database()
      .select({ item: workItem, removedAt: wall.removedAt })
      .from(workItem)
      .innerJoin(wall, eq(wall.id, workItem.wallId))
      .where(and(eq(workItem.homeId, homeId), lte(workItem.remindOn, today)))
      .orderBy(wall.position, workItem.kind)
      .all();
    const standing = rows.filter((row) => row.removedAt === null).map((row) => row.item);
    const counts: ReminderCounts = { items: rows.length, deliveries: 0, mails: 0 };
    for (const recipient of recipientsOf(homeId)) {
      const added = remindPerson(recipient, homeId, standing, today, now);
      counts.deliveries += added;
      counts.mails += added > 0 ? 1 : 0;
    }
    for (const { item } of rows) {
      database()
        .update(workItem)
        .set({ remindOn: nextStageDay(toWorkItem(item), today) })
        .where(and(eq(workItem.wallId, item.wallId), eq(workItem.kind, item.kind)))
        .run();
    }
    return counts;
  });
}

/** Returns how many deliveries are new. */
function remindPerson(recipient: Recipient, homeId: string, items: ItemRow[], today: CalendarDay, now: Date): number {
  const stopped = stoppedWork(recipient.userId, homeId);
  const wanted = items.filter((item) => !stopped.has(workKey(item))).flatMap((item): Wanted[] => {
    const reached = stageOn(toWorkItem(item), today);
    return reached ? [{ key: deliveryKey(toWorkItem(item), reached, recipient.userId), item, stage: reached.stage }] : [];
  });
  const known = new Set(existingKeys(wanted.map((one) => one.key)));
  const fresh = wanted.filter((one) => !known.has(one.key));
  if (fresh.length === 0) return 0;
  const digest = createHash('sha256').update(fresh.map((one) => one.key).sort().join('\n')).digest('hex').slice(0, 24);
  const mailId = enqueueMail({
    kind: 'reminder',
    idempotencyKey: `reminder:${homeId}:${recipient.userId}:${today}:${digest}`,
    toAddress: recipient.email,
    userId: recipient.userId,
    homeId,
    props: {},
    now,
  });
  const values = fresh.map(({ key, stage, item }) => ({ key, stage, homeId, userId: recipient.userId, wallId: item.wallId, kind: item.kind, dueOn: item.dueOn, workKey: workKey(item), mailId }));
  return database().insert(delivery).values(values).onConflictDoNothing({ target: delivery.key }).run().changes;
}

const existingKeys = (keys: string[]): string[] =>
  keys.length === 0 ? [] : database().select({ key: delivery.key }).from(delivery).where(inArray(delivery.key, keys)).all().map((row) => row.key);
