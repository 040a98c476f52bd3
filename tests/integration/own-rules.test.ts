import { beforeEach, describe, expect, it, vi } from 'vitest';
import { listHomes } from '@/db/queries/homes';
import { ownRulesOf, removeOwnRule, setOwnRule } from '@/db/queries/own-rules';
import { wallsOfHome } from '@/db/queries/walls';
import { type Actor, Refused } from '@/lib/permissions';
import { setEnvironment } from '@/tests/fixtures/environment';
import { send } from '@/tests/fixtures/form';
import { actorOf, allWorkItems, insertMember, insertUser } from '@/tests/fixtures/home';
import { logForm, newHomeForm } from '@/tests/fixtures/home-forms';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ actor: null as Actor | null, said: [] as string[] }));

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor) }));
vi.mock('next/headers', () => ({
  headers: () => Promise.resolve(new Headers()),
  cookies: () => Promise.resolve({ set: (_name: string, words: string) => void request.said.push(words), get: () => undefined }),
}));
vi.mock('next/cache', () => ({ revalidatePath: () => undefined }));

useFreshDatabase();

let owner: Actor;
let homeId: string;

const as = (actor: Actor | null) => (request.actor = actor);
const person = (values: Parameters<typeof insertUser>[0] = {}) => actorOf(insertUser(values));
const actions = () => import('@/app/(home)/homes/[homeId]/walls/[wallId]/rule/actions');
const newHome = async (values = {}) => {
  const { create } = await import('@/app/(home)/homes/new/actions');
  return (await send(create, newHomeForm(values))).to?.split('/')[2] ?? '';
};

beforeEach(async () => {
  setEnvironment({});
  vi.useFakeTimers({ now: new Date('2026-12-01T18:00:00Z'), toFake: ['Date'] });
  request.said = [];
  owner = person();
  as(owner);
  homeId = await newHome();
  return () => void vi.useRealTimers();
});

const wallId = (name = 'Front', of = homeId) => wallsOfHome(of).find(({ wall }) => wall.name === name)?.wall.id ?? '';
const planned = () => allWorkItems().map(({ wallId: id, kind, rule, startOn, dueOn, opensOn, closesOn, basis }) => ({ id, kind, rule, startOn, dueOn, opensOn, closesOn, basis })).toSorted((a, b) => (a.id + a.kind < b.id + b.kind ? -1 : 1));
const next = (kind = 'restain', name = 'Front') => allWorkItems().find((item) => item.wallId === wallId(name) && item.kind === kind);
const ruleForm = (values = {}) => ({ homeId, wallId: wallId(), kind: 'restain', how: 'simple', every: '3', unit: 'years', 'months[]': ['6'], rule: '', startOn: '2029-01-01', ...values });

describe('an owner’s own rule', () => {
  it('moves the plan of its wall and work only, and says what moved', async () => {
    const before = planned();
    const { to } = await send((await actions()).saveRule, ruleForm());
    expect(to).toBe(`/homes/${homeId}/walls/${wallId()}`);
    // June 15, 2029, in Bozeman's season, at most 60 days late.
    expect(next()).toMatchObject({ rule: 'FREQ=YEARLY;INTERVAL=3;BYMONTH=6;BYMONTHDAY=15', startOn: '2029-01-01', dueOn: '2029-06-15', closesOn: '2029-08-14', basis: 'own rule' });
    expect(next()?.because).toContain('own rule');
    expect(request.said.at(-1)).toMatch(/^Your rule is saved\. .*Front: next restain moves from \w+ \d{4} to \w+ 2029\./);
    // Other walls may share other trips from now on; what they are due and by which rule stays.
    const others = (items: ReturnType<typeof planned>) => items.filter(({ id }) => id !== wallId()).map(({ id, kind, rule, startOn, dueOn }) => ({ id, kind, rule, startOn, dueOn }));
    expect(others(planned())).toEqual(others(before));
    expect(ownRulesOf(homeId)).toEqual([{ wallId: wallId(), kind: 'restain', rule: 'FREQ=YEARLY;INTERVAL=3;BYMONTH=6;BYMONTHDAY=15', startOn: '2029-01-01' }]);
  });

  it('takes the place of an earlier one, and going back restores the computed plan', async () => {
    const before = planned();
    const { saveRule, dropRule } = await actions();
    await send(saveRule, ruleForm());
    await send(saveRule, ruleForm({ how: 'written', rule: 'rrule:freq=yearly;interval=2;bymonth=7;byday=1mo' }));
    expect(ownRulesOf(homeId).map(({ rule }) => rule)).toEqual(['FREQ=YEARLY;INTERVAL=2;BYMONTH=7;BYDAY=1MO']);
    expect(next()?.dueOn).toBe('2029-07-02');
    const target = { homeId, wallId: wallId(), kind: 'restain' };
    expect((await send(dropRule, target)).to).toBe(`/homes/${homeId}/walls/${wallId()}`);
    expect(planned()).toEqual(before);
    expect(ownRulesOf(homeId)).toEqual([]);
    expect((await send(dropRule, target)).to).toBeDefined();
    expect(request.said.at(-1)).toContain('Nothing in the plan moves.');
  });

  it('restarts with logged work', async () => {
    await send((await actions()).saveRule, ruleForm({ startOn: '2026-01-01', every: '60', unit: 'months' }));
    const { log } = await import('@/app/(home)/homes/[homeId]/log/actions');
    await send(log, logForm({ homeId, 'wallIds[]': [wallId()], doneOn: '2026-08-31' }));
    expect(next()).toMatchObject({ startOn: '2026-08-31', dueOn: '2031-08-31', basis: 'own rule' });
  });

  it.each([
    ['no answer', { every: '' }, 'every', 'whole number'],
    ['no start', { startOn: '' }, 'startOn', 'from which day'],
    ['a wrong text', { how: 'written', rule: 'every spring' }, 'rule', 'a name and a value'],
    ['too often', { how: 'written', rule: 'FREQ=WEEKLY' }, 'rule', 'too often'],
    ['ended', { how: 'written', rule: 'FREQ=YEARLY;COUNT=2', startOn: '2020-05-01', kind: 'wash' }, 'rule', 'no day left: its last one was May 1, 2021'],
    ['a start too far off', { startOn: '2090-01-01' }, 'startOn', 'within 50 years'],
  ])('is refused and kept in the form: %s', async (_what, values, field, words) => {
    const before = planned();
    const { state } = await send((await actions()).saveRule, ruleForm(values));
    expect(state?.ok).toBe(false);
    expect(Object.keys(state?.errors ?? {})).toEqual([field]);
    expect(state?.errors?.[field]).toContain(words);
    expect(state?.values).toMatchObject({ months: ['6'], ...values });
    expect(planned()).toEqual(before);
    expect(ownRulesOf(homeId)).toEqual([]);
  });
});

describe('who may write a rule', () => {
  const outcomes = async (form = ruleForm()) => {
    const { saveRule, dropRule } = await actions();
    return Promise.all([send(saveRule, form), send(dropRule, { homeId: form.homeId, wallId: form.wallId, kind: form.kind })]).then((all) => all.map(({ to, state }) => (to ? 'done' : (state?.message ?? ''))));
  };

  it('owners and co-owners; others are refused or find nothing', async () => {
    for (const [membership, role, words] of [['co-owner', 'homeowner', 'done'], ['caretaker', 'homeowner', 'not change'], ['contractor', 'contractor', 'not change'], [null, 'homeowner', 'not found']] as const) {
      const member = person({ role });
      if (membership) insertMember({ id: homeId }, member, membership);
      as(member);
      for (const said of await outcomes()) expect([membership, said]).toEqual([membership, expect.stringContaining(words)]);
    }
    as(null);
    for (const said of await outcomes()) expect(said).toContain('signed out');
    expect(ownRulesOf(homeId)).toEqual([]);
  });

  it('not through another home of the same owner', async () => {
    const second = await newHome({ name: 'Second' });
    expect(listHomes(owner)).toHaveLength(2);
    for (const said of await outcomes(ruleForm({ homeId: second }))) expect(said).toContain('not found');
    expect(() => setOwnRule(owner, second, wallId(), 'wash', { rule: 'FREQ=YEARLY', startOn: '2027-01-01' })).toThrow(Refused);
    expect(() => removeOwnRule(owner, second, wallId(), 'wash')).toThrow(Refused);
    expect([ownRulesOf(homeId), ownRulesOf(second)]).toEqual([[], []]);
  });
});

describe('the preview', () => {
  const preview = async (values = {}, of = homeId) => {
    const { POST } = await import('@/app/api/homes/[homeId]/rule-preview/route');
    const { 'months[]': months, ...form } = ruleForm(values);
    const body = JSON.stringify({ ...form, months });
    const response = await POST(new Request(`https://eavewright.example/api/homes/${of}/rule-preview`, { method: 'POST', body }), { params: Promise.resolve({ homeId: of }) });
    return { status: response.status, json: (await response.json()) as Record<string, unknown> };
  };

  it('shows the days that the plan then takes, and keeps nothing', async () => {
    const { status, json } = await preview();
    expect([status, ownRulesOf(homeId)]).toEqual([200, []]);
    await send((await actions()).saveRule, ruleForm());
    const { dueOn, opensOn, closesOn } = next() ?? {};
    expect(json).toMatchObject({ ok: true, words: 'every 3 years, on June 15', days: [{ dueOn, opensOn, closesOn }, { dueOn: '2032-06-15' }, {}, {}, {}, {}, {}, {}] });
  });

  it('refuses in the words of the action', async () => {
    const rule = { how: 'written', rule: 'FREQ=MONTHLY;BYMONTHDAY=1,15' };
    const { state } = await send((await actions()).saveRule, ruleForm(rule));
    expect((await preview(rule)).json).toEqual({ ok: false, about: 'rule', error: state?.errors?.rule });
    const text = { how: 'written', rule: 'FREQ=NEVER' };
    const typed = await send((await actions()).saveRule, ruleForm(text));
    expect(await preview(text)).toMatchObject({ status: 422, json: { errors: typed.state?.errors } });
  });

  it('is for who may change the home', async () => {
    for (const [membership, role, status] of [['co-owner', 'homeowner', 200], ['caretaker', 'homeowner', 403], ['contractor', 'contractor', 403], [null, 'homeowner', 404], [null, 'operator', 404]] as const) {
      const member = person({ role });
      if (membership) insertMember({ id: homeId }, member, membership);
      as(member);
      expect([membership, (await preview()).status]).toEqual([membership, status]);
    }
    as(null);
    expect((await preview()).status).toBe(401);
  });

  it('keeps to the home of its address', async () => {
    const second = await newHome({ name: 'Second' });
    expect((await preview({}, second)).status).toBe(404);
  });
});
