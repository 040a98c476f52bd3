import { beforeEach, describe, expect, it, vi } from 'vitest';
import { doIt } from '@/app/(public)/do/[token]/actions';
import { database } from '@/db/client';
import { linkedWork } from '@/db/queries/linked-work';
import { type MailAction, readLink, signLink } from '@/db/queries/mail-links';
import { deferral, homeMember, reminderStop, workRecord } from '@/db/schema';
import { workKey } from '@/lib/care/work-key';
import { untouched } from '@/lib/schemas/action-state';
import { setEnvironment } from '@/tests/fixtures/environment';
import { insertFourWalls, insertHome, insertMember, insertUser, insertWorkItem } from '@/tests/fixtures/home';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));
vi.mock('next/headers', () => ({ headers: () => Promise.resolve(new Headers()), cookies: () => Promise.resolve({ set: () => undefined }) }));

setEnvironment();
useFreshDatabase();

function planned(membership: 'owner' | 'caretaker' = 'owner') {
  const owner = insertUser({ name: 'Marit' });
  const place = insertHome({ stationId: 'USW00024132' }, owner);
  const [, , south] = insertFourWalls(place);
  if (!south) throw new Error('no south wall');
  const person = membership === 'owner' ? owner : insertUser({ name: 'Care' });
  if (person !== owner) insertMember(place, person, membership);
  const item = insertWorkItem(south);
  const token = (action: MailAction, expiresAt: Date | null = null) => signLink({ action, userId: person.id, homeId: place.id, workKey: workKey(item), expiresAt });
  return { place, person, item, token };
}

const send = (token: string, values: Record<string, string> = {}) => {
  const form = new FormData();
  for (const [name, value] of Object.entries({ token, ...values })) form.set(name, value);
  return doIt(untouched, form);
};
const rows = () => [workRecord, deferral, reminderStop].map((table) => database().select().from(table).all().length);

describe('a link from a reminder, without sign-in', () => {
  let of: ReturnType<typeof planned>;
  beforeEach(() => void (of = planned()));

  it('logs its piece of work once, in the name of the person', async () => {
    for (let i = 0; i < 2; i += 1) expect(await send(of.token('log'))).toEqual({ ok: true, message: null });
    expect(database().select().from(workRecord).all()).toMatchObject([{ kind: 'restain', createdBy: of.person.id, homeId: of.place.id }]);
  });

  it('puts it off once, and stops its reminders once', async () => {
    for (let i = 0; i < 2; i += 1) expect((await send(of.token('stop'))).ok).toBe(true);
    for (let i = 0; i < 2; i += 1) expect((await send(of.token('put off'))).ok).toBe(true);
    expect(rows()).toEqual([0, 1, 1]);
  });

  it('does nothing with a day to come, when it has run out, or changed', async () => {
    expect((await send(of.token('log'), { doneOn: '2999-01-01' })).errors).toHaveProperty('doneOn');
    expect((await send(of.token('log', new Date(0)))).ok).toBe(false);
    expect((await send(`${of.token('log')}x`)).ok).toBe(false);
    expect(rows()).toEqual([0, 0, 0]);
  });

  it('does nothing for whoever is no member any more', async () => {
    database().delete(homeMember).run();
    expect((await send(of.token('log'))).ok).toBe(false);
    expect(rows()).toEqual([0, 0, 0]);
  });

  it('is of no use for work that was done in the meantime', async () => {
    await send(of.token('log'));
    const link = readLink(of.token('stop'), new Date());
    expect(typeof link === 'string' ? link : linkedWork(link, new Date())).toBeNull();
  });
});

it('a caretaker may log by link but not put off', async () => {
  const of = planned('caretaker');
  expect((await send(of.token('put off'))).ok).toBe(false);
  expect((await send(of.token('log'))).ok).toBe(true);
  expect(rows()).toEqual([1, 0, 0]);
});
