import { and, count, desc, eq, gt, inArray, isNotNull, notInArray, sql } from 'drizzle-orm';
import { type BounceReport, temporaryBounces } from '@/lib/mail/bounce-rules';
import { awaitedKinds } from '@/lib/mail/registry';
import { type Actor, Refused } from '@/lib/permissions';
import { database, transaction } from '../client';
import { bounce, mail, user } from '../schema';
import { demand } from '../scope';

export type BounceOutcome = 'known' | 'nobody' | 'noted' | 'stopped';

/** Keeps a report. For good, or too often for now: nothing more is sent to the address until that is lifted. The same report twice is one. */
export function recordBounce(report: BounceReport, now: Date): BounceOutcome {
  return transaction(() => {
    const of = report.messageId ? database().select({ id: mail.id, to: mail.toAddress }).from(mail).where(eq(mail.messageId, report.messageId)).get() : undefined;
    const addresses = [report.address, of?.to].flatMap((one) => one?.trim().toLowerCase() ?? []);
    // A mail that was passed on comes back from an address that we do not know: then the one that we sent it to counts.
    const person = addresses.map(personAt).find((one) => one !== undefined);
    const address = person?.email ?? addresses[0];
    if (!address) return 'nobody';
    const { key, permanent, status, detail } = report;
    const made = database()
      .insert(bounce)
      .values({ mailId: of?.id ?? null, address, isPermanent: permanent, status, detail, reportKey: key, createdAt: now })
      .onConflictDoNothing({ target: bounce.reportKey })
      .run().changes;
    if (made === 0) return 'known';
    if (!person) return 'nobody';
    if (!permanent && !isTooOften(address, now)) return 'noted';
    if (!person.bouncedAt) database().update(user).set({ bouncedAt: now }).where(eq(user.id, person.id)).run();
    cancelQueued(address);
    return 'stopped';
  });
}

const personAt = (address: string) => database().select({ id: user.id, email: user.email, bouncedAt: user.bouncedAt }).from(user).where(eq(user.email, address)).get();

function isTooOften(address: string, now: Date): boolean {
  const since = new Date(now.getTime() - temporaryBounces.withinDays * 86_400_000);
  const lately = and(eq(bounce.address, address), eq(bounce.isPermanent, false), gt(bounce.createdAt, since));
  return (database().select({ n: count() }).from(bounce).where(lately).get()?.n ?? 0) >= temporaryBounces.most;
}

/** What still waits for the address, but for links that the person asked for. */
function cancelQueued(address: string): void {
  database()
    .update(mail)
    .set({ state: 'cancelled', lastError: 'Mail to this address comes back.' })
    .where(and(sql`${mail.state} in ('queued', 'sending')`, eq(mail.state, 'queued'), eq(sql`lower(${mail.toAddress})`, address), notInArray(mail.kind, [...awaitedKinds])))
    .run();
}

export type BouncedPerson = { userId: string; name: string | null; email: string; bouncedAt: Date; status: string | null; detail: string | null };

/** Addresses that mail comes back from, newest first, with what was said last. */
export function bouncedPeople(actor: Actor, most = 20): { people: BouncedPerson[]; total: number } {
  demand(actor, 'mail.view');
  const isBounced = isNotNull(user.bouncedAt);
  const rows = database().select({ userId: user.id, name: user.name, email: user.email, bouncedAt: user.bouncedAt }).from(user).where(isBounced).orderBy(desc(user.bouncedAt)).limit(most).all();
  const said = rows.length === 0 ? [] : database().select().from(bounce).where(inArray(bounce.address, rows.map((row) => row.email))).orderBy(desc(bounce.createdAt)).all();
  const people = rows.flatMap(({ bouncedAt, ...row }): BouncedPerson[] => {
    const last = said.find((one) => one.address === row.email);
    return bouncedAt ? [{ ...row, bouncedAt, status: last?.status ?? null, detail: last?.detail ?? null }] : [];
  });
  return { people, total: database().select({ n: count() }).from(user).where(isBounced).get()?.n ?? 0 };
}

/** The operator has reason to think that the address works again. */
export function sendAgain(actor: Actor, userId: string): void {
  demand(actor, 'mail.retry');
  const row = database().select({ email: user.email }).from(user).where(eq(user.id, userId)).get();
  if (!row) throw new Refused('not found', 'That person');
  liftBounce(userId);
}

/** Mail may go to the person's address again: it was changed or shown to work. */
export function liftBounce(userId: string): void {
  database().update(user).set({ bouncedAt: null }).where(and(eq(user.id, userId), isNotNull(user.bouncedAt))).run();
}
