import { beforeEach, describe, expect, test, vi } from 'vitest';
import { renderToStaticMarkup } from 'react-dom/server';
import { costsOf, costsSetAt } from '@/db/queries/costs';
import { homeOf } from '@/db/queries/homes';
import { homeYearsAhead } from '@/db/queries/years-ahead';
import { exampleCosts } from '@/lib/care/costs';
import { type Actor, Refused } from '@/lib/permissions';
import { send } from '@/tests/fixtures/form';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, insertMember, insertUser } from '@/tests/fixtures/home';
import { newHomeForm } from '@/tests/fixtures/home-forms';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ actor: null as Actor | null, said: [] as string[] }));
vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor), requireActor: () => Promise.resolve(request.actor) }));
vi.mock('next/headers', () => ({
  headers: () => Promise.resolve(new Headers()),
  cookies: () => Promise.resolve({ set: (_name: string, words: string) => void request.said.push(words), get: () => undefined }),
}));
vi.mock('next/cache', () => ({ revalidatePath: () => undefined }));
vi.mock('next/server', () => ({ after: () => undefined }));

useFreshDatabase();

let owner: Actor;
let homeId: string;
const now = new Date('2026-12-01T18:00:00Z');
const as = (actor: Actor) => (request.actor = actor);
const member = (membership: 'co-owner' | 'caretaker' | 'contractor') => {
  const actor = actorOf(insertUser(membership === 'contractor' ? { role: 'contractor' } : {}));
  insertMember({ id: homeId }, actor, membership);
  return actor;
};
const prices = { units: 'metric', doer: 'hired', trip: '700', restain: '20', strip: '50', recaulk: '10', wash: '4' };
const save = async (values: Record<string, string> = {}) => send((await import('@/app/(home)/homes/[homeId]/budget/actions')).saveCosts, { homeId, ...prices, ...values });
const page = async () => {
  const { default: Page } = await import('@/app/(home)/homes/[homeId]/budget/page');
  return renderToStaticMarkup(await Page({ params: Promise.resolve({ homeId }) }));
};

beforeEach(async () => {
  setEnvironment({});
  vi.useFakeTimers({ now, toFake: ['Date'] });
  request.said = [];
  owner = actorOf(insertUser());
  as(owner);
  const { to } = await send((await import('@/app/(home)/homes/new/actions')).create, newHomeForm());
  homeId = to?.split('/')[2] ?? '';
  return () => void vi.useRealTimers();
});

describe('what work costs at a home', () => {
  test('is our example until somebody says so; then what was said, and the years go by it', async () => {
    expect([costsOf(homeId), costsSetAt(homeId)]).toEqual([exampleCosts.self, null]);
    const before = homeYearsAhead(owner, homeId, now);
    const { to } = await save();
    expect(to).toBe(`/homes/${homeId}/budget`);
    expect([costsOf(homeId), costsSetAt(homeId)]).toEqual([{ doer: 'hired', tripCents: 70_000, restainCentsPerM2: 2000, stripCentsPerM2: 5000, recaulkCentsPerM: 1000, washCentsPerM2: 400 }, now]);
    const after = homeYearsAhead(owner, homeId, now);
    expect(after.pricesSetAt).toEqual(now);
    expect(after.budget.cents).toBeGreaterThan(before.budget.cents);
    // Every restain of the years, at the flat area of its wall.
    for (const item of after.budget.years.flatMap(({ trips }) => trips).flatMap(({ items }) => items)) {
      const wall = after.home.walls.find(({ id }) => id === item.wallId);
      expect(item.cents).toBe(Math.round(item.kind === 'restain' ? (wall?.areaM2 ?? 0) * 2000 : (wall?.jointM ?? 0) * 1000));
    }
  });

  test('said again takes the place of what was said', async () => {
    await save();
    await save({ trip: '650' });
    expect(costsOf(homeId).tripCents).toBe(65_000);
  });

  test('a fault stands at its field, nothing is kept, and what was typed comes back', async () => {
    const { state } = await save({ restain: 'a lot' });
    expect(state).toMatchObject({ ok: false, errors: { restain: 'This could not be read: write it like 2.50.' }, values: { restain: 'a lot', trip: '700' } });
    expect(costsSetAt(homeId)).toBeNull();
  });

  test('the answer says what changed in the plan, and the stored choice is the one that costs least', async () => {
    await save();
    expect(request.said.at(-1)).toMatch(/^The prices are saved\. \S/);
    const { grouping } = homeYearsAhead(owner, homeId, now);
    expect(homeOf(owner, homeId, 'home.view').home.grouping).toEqual(grouping);
    expect(Math.min(...grouping.choices.map(({ yearlyCents }) => yearlyCents))).toBe(grouping.choices.find(({ months }) => months === grouping.months)?.yearlyCents);
  });
});

describe('who', () => {
  test.each(['co-owner', 'caretaker', 'contractor'] as const)('a %s sees the years; only who may change the home sets prices', async (membership) => {
    const actor = member(membership);
    as(actor);
    expect(homeYearsAhead(actor, homeId, now).budget.years).toHaveLength(15);
    const { to, state } = await save();
    expect(membership === 'co-owner' ? to : state).toEqual(membership === 'co-owner' ? `/homes/${homeId}/budget` : expect.objectContaining({ ok: false, message: 'You may look at this home but not change this.' }));
    expect(costsSetAt(homeId) !== null).toBe(membership === 'co-owner');
  });

  test('for a stranger the home is not found', async () => {
    const stranger = as(actorOf(insertUser()));
    expect(() => homeYearsAhead(stranger, homeId, now)).toThrow(Refused);
    expect((await save()).state).toMatchObject({ ok: false, message: 'That home was not found. It may have been removed.' });
  });
});

describe('the page', () => {
  test('has the years as a table, the choices with the one taken in words, and the prices to fill in', async () => {
    const html = await page();
    for (const year of [2026, 2033, 2040]) expect(html).toContain(`>${year}</th>`);
    expect(html.match(/the plan goes by this/g)).toHaveLength(1);
    expect(html).toContain('These are example prices that we made up: put in what you pay.');
    expect(html).toMatch(/name="restain"[^>]*value="0\.511"/);
  });

  test('shows a caretaker no form', async () => {
    as(member('caretaker'));
    const html = await page();
    expect(html).not.toContain('name="restain"');
    expect(html).toContain('Only an owner or co-owner changes the prices.');
  });
});
