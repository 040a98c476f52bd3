import { eq, sql } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { database } from '@/db/client';
import { homesToRemind, itemsNearlyDue, remindHome } from '@/db/queries/reminders';
import { delivery, home, jobRun, mail, user, wall, workItem } from '@/db/schema';
import { deliverDue } from '@/jobs/deliver';
import { runReminders } from '@/jobs/reminders';
import { type Membership } from '@/lib/schemas/vocabulary';
import { setEnvironment } from '@/tests/fixtures/environment';
import { allDeliveries, allMail, allWorkItems, insertFourWalls, insertHome, insertMember, insertUser, insertWorkItem } from '@/tests/fixtures/home';
import { runScript } from '@/tests/fixtures/run-script';
import { addresseeOf, startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

setEnvironment();
useFreshDatabase();

/** Noon in Montana on the day the fixture's window opens. */
const now = new Date('2027-05-15T18:00:00Z');

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => smtp.received.splice(0));

const run = (at = now) => runReminders(at, { transport: smtp.transport });
const queue = (at = now) => runReminders(at, { deliver: false });

/** A home whose south and west walls have a restain that opens on May 15, 2027; the day of the reminder is that day. */
function springHome(values: Parameters<typeof insertHome>[0] = {}, owner = insertUser({ name: 'Ada' })) {
  const place = insertHome({ name: 'Spring Creek', ...values }, owner);
  const walls = insertFourWalls(place);
  const items = walls.slice(2).map((one) => insertWorkItem(one, { remindOn: '2027-05-15' }));
  return { place, walls, items, owner };
}

describe('a reminder run', () => {
  it('sends one mail for a home and person, with every wall in plan order', async () => {
    const { owner } = springHome();
    expect(await run()).toMatchObject({ homes: 1, items: 2, deliveries: 2, mails: 1, sent: 1 });
    const [got] = smtp.received;
    expect(smtp.received).toHaveLength(1);
    expect(addresseeOf(got)).toBe(owner.email);
    expect(got?.subject).toBe('Spring Creek: time to restain (South) and 1 more');
    const at = ['North (', 'East (', 'South (', 'West ('].map((title) => got?.text?.indexOf(`\n${title}`) ?? -1);
    expect(at.every((position, i) => position > (at[i - 1] ?? 0))).toBe(true);
    expect(got?.text).toContain('When: mid-May to early August 2027 (May 15 – August 9, 2027)');
    expect(got?.text).toContain('https://eavewright.example/homes/');
  });

  it('sends nothing when it runs again, and sets each item to the day of its next stage', async () => {
    springHome();
    await run();
    expect(await run()).toMatchObject({ homes: 0, items: 0, mails: 0, sent: 0 });
    expect(smtp.received).toHaveLength(1);
    for (const item of allWorkItems()) expect(item.remindOn === null || item.remindOn > '2027-05-15').toBe(true);
  });

  it('sends nothing twice even when the items are due again for the same stage', async () => {
    springHome();
    await run();
    database().update(workItem).set({ remindOn: '2027-05-15' }).run();
    expect(await run()).toMatchObject({ items: 2, deliveries: 0, mails: 0, sent: 0 });
    expect([smtp.received.length, allDeliveries().length]).toEqual([1, 2]);
  });

  it('goes on to the next stages as the days pass', async () => {
    springHome();
    await run();
    expect(await run(new Date('2028-01-15T18:00:00Z'))).toMatchObject({ mails: 1, sent: 1 });
    expect(smtp.received[1]?.subject).toBe('Spring Creek: restain is overdue (South) and 1 more');
  });

  it('writes what it did into job_run, and the error when it fails', async () => {
    springHome();
    await run();
    expect(database().select().from(jobRun).all()).toMatchObject([{ job: 'reminders', startedAt: now, outcome: { mails: 1, sent: 1 }, error: null }]);
    database().run('alter table delivery rename to delivery_elsewhere');
    database().update(workItem).set({ remindOn: '2027-05-15' }).run();
    await expect(run()).rejects.toThrow('delivery');
    const [, failed] = database().select().from(jobRun).all();
    expect(failed?.outcome).toMatchObject({ homes: 0, mails: 0 });
    expect(failed?.error).toContain('delivery');
    expect(failed?.finishedAt).not.toBeNull();
  });

  it('goes on with the other homes when one fails', async () => {
    const { place } = springHome({ name: 'Bad' });
    springHome({ name: 'Good' });
    database().run(sql.raw(`create trigger no_delivery before insert on delivery when new.home_id = '${place.id}' begin select raise(abort, 'disk trouble'); end`));
    await expect(run()).rejects.toThrow();
    expect(smtp.received.map((got) => got.subject)).toEqual(['Good: time to restain (South) and 1 more']);
    expect(database().select().from(jobRun).all()).toMatchObject([{ outcome: { homes: 1, mails: 1, sent: 1 }, error: expect.stringContaining('disk trouble') as string }]);
  });

  it('leaves no trace of a home whose transaction fails', async () => {
    springHome();
    database().run(`create trigger no_delivery before insert on delivery begin select raise(abort, 'disk trouble'); end`);
    await expect(run()).rejects.toThrow();
    expect([allMail().length, allDeliveries().length]).toEqual([0, 0]);
    expect(allWorkItems().map((item) => item.remindOn)).toEqual(['2027-05-15', '2027-05-15']);
  });
});

describe('two runs at the same time, in two processes', () => {
  it('send each reminder once between them', async () => {
    for (let i = 0; i < 12; i += 1) springHome({ name: `Home ${i}` });
    setEnvironment({ SMTP_URL: smtp.url });
    const printed = await Promise.all([runScript('remind-process.ts', now.toISOString()), runScript('remind-process.ts', now.toISOString())]);
    const runs = printed.map((text) => JSON.parse(text) as Record<string, number>);
    const sum = (name: string) => runs.reduce((total, one) => total + (one[name] ?? 0), 0);
    expect([sum('mails'), sum('deliveries'), sum('sent')]).toEqual([12, 24, 12]);
    const addressees = smtp.received.map(addresseeOf);
    expect([addressees.length, new Set(addressees).size]).toEqual([12, 12]);
  });
});

describe('who is reminded', () => {
  const reached = async () => {
    await run();
    return smtp.received.map(addresseeOf).sort();
  };

  it('is every owner, co-owner and caretaker, not a contractor', async () => {
    const { place, owner } = springHome();
    const others = (['co-owner', 'caretaker', 'contractor'] as Membership[]).map((membership) => {
      const person = insertUser();
      insertMember(place, person, membership);
      return person.email;
    });
    expect(await reached()).toEqual([owner.email, ...others.slice(0, 2)].sort());
  });

  it('is nobody whose address is not confirmed or who turned reminders off', async () => {
    springHome({}, insertUser({ emailVerified: null }));
    springHome({}, insertUser({ remindersOn: false }));
    expect(await reached()).toEqual([]);
    expect(allMail()).toEqual([]);
  });

  it('is nobody for a home that was archived or a wall that was removed, and such items do not come up again', async () => {
    springHome({ archivedAt: now });
    const { walls } = springHome({ name: 'Second' });
    database().update(wall).set({ removedAt: now }).where(eq(wall.id, walls[2]?.id ?? '')).run();
    expect(await reached()).toHaveLength(1);
    expect(smtp.received[0]?.subject).toBe('Second: time to restain (West)');
    expect(homesToRemind(now)).toEqual([]);
  });
});

describe('between queueing and sending', () => {
  it('work that was logged is left out, because it counts from another day; work whose date merely moved is not', async () => {
    const { items } = springHome();
    await queue();
    database().update(workItem).set({ startOn: '2027-05-14', dueOn: '2031-05-20' }).where(eq(workItem.wallId, items[0]?.wallId ?? '')).run();
    database().update(workItem).set({ dueOn: '2027-06-28' }).where(eq(workItem.wallId, items[1]?.wallId ?? '')).run();
    await deliverDue(now, smtp.transport);
    expect(smtp.received.map((got) => got.subject)).toEqual(['Spring Creek: time to restain (West)']);
  });

  it('a mail with nothing left is cancelled', async () => {
    springHome();
    await queue();
    database().delete(workItem).run();
    expect(await deliverDue(now, smtp.transport)).toMatchObject({ sent: 0, cancelled: 1 });
    expect(allMail()[0]).toMatchObject({ state: 'cancelled', lastError: 'Everything in it was done or moved before it was sent.' });
    expect(smtp.received).toEqual([]);
  });

  it('a person who turned reminders off, or a home that was archived, is left alone', async () => {
    const { owner } = springHome();
    const second = springHome({ name: 'Second' });
    await queue();
    database().update(user).set({ remindersOn: false }).where(eq(user.id, owner.id)).run();
    database().update(home).set({ archivedAt: now }).where(eq(home.id, second.place.id)).run();
    expect(await deliverDue(now, smtp.transport)).toMatchObject({ sent: 0, cancelled: 2 });
  });

  it('a person who has moved to another confirmed address gets it there', async () => {
    const { owner } = springHome();
    await queue();
    database().update(user).set({ email: 'new@example.test' }).where(eq(user.id, owner.id)).run();
    expect(await deliverDue(now, smtp.transport)).toMatchObject({ sent: 1 });
    expect(addresseeOf(smtp.received[0])).toBe('new@example.test');
  });

  it('a plan that cannot be read for a moment is tried again, not given up', async () => {
    springHome();
    await queue();
    database().run('alter table opening rename to opening_elsewhere');
    expect(await deliverDue(now, smtp.transport)).toMatchObject({ retried: 1, refused: 0 });
    database().run('alter table opening_elsewhere rename to opening');
    expect(await deliverDue(new Date(now.getTime() + 120_000), smtp.transport)).toMatchObject({ sent: 1 });
  });

  it('a deleted person takes the mail along', async () => {
    const { owner } = springHome();
    await queue();
    database().delete(user).where(eq(user.id, owner.id)).run();
    expect([database().select().from(mail).all(), database().select().from(delivery).all()]).toEqual([[], []]);
  });
});

describe('the day of a reminder', () => {
  const dueAt = (at: string) => homesToRemind(new Date(at)).length;

  it.each([
    // Seven in the morning at the home in UTC: Honolulu −10, Denver −6 (summer), New York −4 (summer); IANA time zone data.
    ['Pacific/Honolulu', '2027-05-15T16:59:00Z', '2027-05-15T17:00:00Z'],
    ['America/Denver', '2027-05-15T12:59:00Z', '2027-05-15T13:00:00Z'],
    ['America/New_York', '2027-05-15T10:59:00Z', '2027-05-15T11:00:00Z'],
    // East of Greenwich the day begins on the UTC day before: Guam +10.
    ['Pacific/Guam', '2027-05-14T20:59:00Z', '2027-05-14T21:00:00Z'],
  ])('begins at seven in the morning in %s', (timeZone, before, from) => {
    springHome({ timeZone });
    expect([dueAt(before), dueAt(from)]).toEqual([0, 1]);
  });

  it('begins at seven also on the days the clocks change and at the end of a month', () => {
    const { items } = springHome({ timeZone: 'America/New_York' });
    const dueOn = (day: string) => database().update(workItem).set({ remindOn: day }).run();
    expect(items).toHaveLength(2);
    // Clocks go forward on March 14, 2027 (summer time −4 from 2:00) and back on November 7, 2027 (standard time −5).
    dueOn('2027-03-14');
    expect([dueAt('2027-03-14T10:59:00Z'), dueAt('2027-03-14T11:00:00Z')]).toEqual([0, 1]);
    dueOn('2027-11-07');
    expect([dueAt('2027-11-07T11:59:00Z'), dueAt('2027-11-07T12:00:00Z')]).toEqual([0, 1]);
    dueOn('2028-02-29');
    expect([dueAt('2028-02-29T11:59:00Z'), dueAt('2028-02-29T12:00:00Z')]).toEqual([0, 1]);
    dueOn('2028-03-01');
    expect([dueAt('2028-02-29T12:00:00Z'), dueAt('2028-03-01T11:59:00Z'), dueAt('2028-03-01T12:00:00Z')]).toEqual([0, 0, 1]);
    dueOn('2027-12-31');
    expect([dueAt('2027-12-31T11:59:00Z'), dueAt('2027-12-31T12:00:00Z')]).toEqual([0, 1]);
  });

  it('that was missed is caught up with', async () => {
    springHome();
    expect(await run(new Date('2027-05-18T18:00:00Z'))).toMatchObject({ mails: 1, sent: 1 });
  });

  it('is read from the index: the search looks at what is due, not at every home', () => {
    const { sql: query } = itemsNearlyDue(now).toSQL();
    const plan = database().all<{ detail: string }>(`explain query plan ${query.replace('?', "'2027-05-16'")}`);
    const details = plan.map((line) => line.detail);
    expect(details.some((detail) => /SEARCH work_item USING INDEX work_item_remind/.test(detail))).toBe(true);
    expect(details.filter((detail) => detail.startsWith('SCAN'))).toEqual([]);
  });

  it('comes for a home only by its own calendar when two homes share the run', () => {
    const east = springHome({ timeZone: 'America/New_York' });
    springHome({ timeZone: 'Pacific/Honolulu' });
    const due = homesToRemind(new Date('2027-05-15T12:00:00Z'));
    expect(due).toEqual([{ homeId: east.place.id, today: '2027-05-15' }]);
    expect(remindHome(east.place.id, '2027-05-15', now)).toEqual({ items: 2, deliveries: 2, mails: 1 });
  });
});
