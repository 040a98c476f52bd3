import { beforeEach, describe, expect, test, vi } from 'vitest';
import { activePerson, hasConfirmedAddress, personById } from '@/db/queries/people';
import { issueToken, tokenHolder } from '@/db/queries/account-tokens';
import { shareHome } from '@/db/queries/sharing';
import { type Actor } from '@/lib/permissions';
import { send } from '@/tests/fixtures/form';
import { actorOf, insertHome, insertUser } from '@/tests/fixtures/home';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ actor: null as Actor | null }));
vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor) }));
vi.mock('next/headers', () => ({ headers: () => Promise.resolve(new Headers()) }));
vi.mock('next/cache', () => ({ revalidatePath: () => undefined }));
vi.mock('next/server', () => ({ after: () => undefined }));

useFreshDatabase();

beforeEach(() => {
  delete (globalThis as { eavewrightLimits?: unknown }).eavewrightLimits;
});

const actions = () => import('@/app/(account)/account/actions');
const hashed = async (password: string) => (await import('@/app/_server/password')).hashPassword(password);
const matches = async (password: string, id: string) => (await import('@/app/_server/password')).passwordMatches(password, personById(id)?.passwordHash);
const signedInAs = (person: ReturnType<typeof insertUser>) => {
  request.actor = actorOf(person);
  return person;
};

describe('one’s own profile', () => {
  test('keeps name, units and reminders; the role and the address cannot be changed by a form', async () => {
    const person = signedInAs(insertUser());
    const other = insertUser();
    const { saveProfile } = await actions();
    const { state } = await send(saveProfile, { name: ' Nils ', units: 'metric', role: 'operator', email: 'new@example.test', id: other.id });
    expect(state).toMatchObject({ ok: true });
    expect(personById(person.id)).toEqual({ ...person, name: 'Nils', units: 'metric', remindersOn: false });
    expect(personById(other.id)).toEqual(other);
    await send(saveProfile, { name: 'Nils', units: 'us', remindersOn: 'on' });
    expect(personById(person.id)).toMatchObject({ units: 'us', remindersOn: true });
  });

  test('a contractor keeps a company, and reminders are not theirs to change', async () => {
    const person = signedInAs(insertUser({ role: 'contractor', company: 'Ridge Finishing' }));
    const { saveProfile } = await actions();
    expect((await send(saveProfile, { name: 'Nils', units: 'us', company: ' ' })).state).toMatchObject({ ok: false, errors: { company: expect.any(String) as string } });
    expect((await send(saveProfile, { name: 'Nils', units: 'us', company: 'Larch Finishing' })).state).toMatchObject({ ok: true });
    expect(personById(person.id)).toMatchObject({ company: 'Larch Finishing', remindersOn: true });
  });

  test.each([[{ units: 'furlongs' }, 'units'], [{ name: '' }, 'name'], [{ name: 'x'.repeat(81) }, 'name']])('%j is refused beside its field', async (wrong, field) => {
    signedInAs(insertUser());
    const { saveProfile } = await actions();
    expect((await send(saveProfile, { name: 'Nils', units: 'us', ...wrong })).state).toMatchObject({ ok: false, errors: { [field]: expect.any(String) as string } });
  });

  test('is closed to whoever is signed out', async () => {
    request.actor = null;
    const all = await actions();
    for (const action of Object.values(all)) expect((await send(action, { name: 'Nils', units: 'us', password: 'three words in a row' })).state).toMatchObject({ ok: false });
  });
});

describe('changing the password', () => {
  test('needs the one of today, ends earlier sessions and open links', async () => {
    const person = signedInAs(insertUser({ passwordHash: await hashed('words of today') }));
    const link = issueToken(person.id, 'reset', new Date());
    const { changePassword } = await actions();
    for (const current of ['wrong words', '']) {
      expect((await send(changePassword, { current, password: 'words of tomorrow' })).state).toMatchObject({ ok: false, errors: { current: expect.any(String) as string } });
    }
    expect((await send(changePassword, { password: 'words of tomorrow' })).state).toMatchObject({ ok: false });
    expect(await matches('words of today', person.id)).toBe(true);
    const before = Date.now() - 1000;
    expect(await send(changePassword, { current: 'words of today', password: 'words of tomorrow' })).toEqual({ to: '/sign-in?said=password-set' });
    expect(await matches('words of tomorrow', person.id)).toBe(true);
    expect(activePerson(person.id, before)).toBeNull();
    expect(tokenHolder(link, 'reset', new Date())).toBeUndefined();
  });

  test('whoever came by a link sets a first one without another', async () => {
    const person = signedInAs(insertUser());
    const { changePassword } = await actions();
    expect((await send(changePassword, { password: person.email })).state).toMatchObject({ ok: false, errors: { password: expect.any(String) as string } });
    expect(await send(changePassword, { password: 'words of tomorrow' })).toEqual({ to: '/sign-in?said=password-set' });
    expect(await matches('words of tomorrow', person.id)).toBe(true);
  });

  test('guessing the one of today is limited', async () => {
    signedInAs(insertUser({ passwordHash: await hashed('words of today') }));
    const { changePassword } = await actions();
    for (let n = 0; n < 10; n += 1) await send(changePassword, { current: `guess ${n}`, password: 'words of tomorrow' });
    expect((await send(changePassword, { current: 'words of today', password: 'words of tomorrow' })).state).toMatchObject({ ok: false, message: expect.stringContaining('Wait') as string });
  });
});

test('signing out everywhere ends the sessions of this person only', async () => {
  const person = signedInAs(insertUser());
  const other = insertUser();
  const before = Date.now() - 1000;
  expect(await send((await actions()).signOutEverywhere, {})).toEqual({ to: '/sign-in?said=signed-out' });
  expect(activePerson(person.id, before)).toBeNull();
  expect(activePerson(person.id, Date.now() + 1000)).not.toBeNull();
  expect(activePerson(other.id, before)).not.toBeNull();
});

test('a home cannot be shared with an address that nobody has confirmed', () => {
  const owner = insertUser();
  const home = insertHome({}, owner);
  const waiting = insertUser({ role: 'contractor', emailVerified: null });
  expect(hasConfirmedAddress(actorOf(waiting))).toBe(false);
  expect(shareHome(actorOf(owner), home.id, waiting.email, 'contractor')).toEqual({ shared: false, why: 'no account' });
  const confirmed = insertUser({ role: 'contractor' });
  expect(shareHome(actorOf(owner), home.id, confirmed.email, 'contractor')).toMatchObject({ shared: true, userId: confirmed.id });
});
