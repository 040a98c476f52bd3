import { sql } from 'drizzle-orm';
import { database, transaction } from '@/db/client';
import { delivery, mail } from '@/db/schema';
import { runReminders } from '@/jobs/reminders';
import { smtpPool } from '@/jobs/transport';
import { insertHome, insertUser, insertWall, insertWorkItem } from '@/tests/fixtures/home';
import { type HarshSmtp } from '@/tests/fixtures/harsh-smtp';

/** Noon in Montana on the day on which every home's reminder is due. */
export const start = new Date('2027-05-15T18:00:00Z');
export const minutes = (n: number, from = start) => new Date(from.getTime() + n * 60_000);

/** Homes of one owner each, with one restain to be reminded of: so many mails are due. */
export function homesDue(n: number, values: { timeZone?: string; remindOn?: string } = {}): void {
  transaction(() => {
    for (let i = 0; i < n; i += 1) {
      const home = insertHome(values.timeZone ? { timeZone: values.timeZone } : {}, insertUser({ email: `owner${i}@example.test` }));
      insertWorkItem(insertWall(home), { remindOn: values.remindOn ?? '2027-05-15' });
    }
  });
}

const openMails = () => database().select({ n: sql<number>`count(*)` }).from(mail).where(sql`state in ('queued', 'sending')`).get()?.n ?? 0;

/** Runs on, ten minutes apart, until nothing waits. */
export async function settle(smtp: HarshSmtp, from: Date): Promise<void> {
  const pool = smtpPool(smtp.url);
  try {
    for (let turn = 0; turn < 200; turn += 1) {
      await runReminders(minutes(10 * turn, from), { transport: pool });
      if (openMails() === 0) return;
    }
  } finally {
    pool.close?.();
  }
}

export type Outcome = { fault: string; mails: number; sent: number; refused: number; duplicates: number; lost: number; strange: string[] };

/** What came of it: `duplicates` are copies with the same Message-ID; anything that must not be stands in `strange`. */
export function outcomeOf(fault: string, expected: number, smtp: HarshSmtp, refusedForGood: (address: string) => boolean = () => false): Outcome {
  const rows = database().select().from(mail).all();
  const arrived = [...smtp.mailboxes.values()];
  const inBox = (address: string) => smtp.mailboxes.get(address) ?? [];
  const keys = database().select({ n: sql<number>`count(*)`, different: sql<number>`count(distinct ${delivery.workKey} || ${delivery.userId} || ${delivery.stage})` }).from(delivery).get();
  const strange = [
    ...(rows.length === expected ? [] : [`${rows.length} mails instead of ${expected}`]),
    ...(keys?.n === expected && keys.different === expected ? [] : [`${keys?.n} deliveries, ${keys?.different} different`]),
    ...arrived.filter((ids) => new Set(ids).size > 1).map((ids) => `one mailbox has ${ids.join(', ')}`),
    ...rows.filter((row) => row.state === 'sent' && !inBox(row.toAddress).includes(row.messageId)).map((row) => `${row.toAddress} is said to have been sent`),
    ...rows.filter((row) => (row.state === 'refused') !== refusedForGood(row.toAddress)).map((row) => `${row.toAddress} is ${row.state}: ${row.lastError}`),
  ];
  return {
    fault,
    mails: expected,
    sent: rows.filter((row) => row.state === 'sent').length,
    refused: rows.filter((row) => row.state === 'refused').length,
    duplicates: arrived.reduce((sum, ids) => sum + ids.length - new Set(ids).size, 0),
    lost: expected - rows.filter((row) => inBox(row.toAddress).length > 0 || (row.state === 'refused' && refusedForGood(row.toAddress))).length,
    strange,
  };
}
