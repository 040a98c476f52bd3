import { beforeEach, describe, expect, it, vi } from 'vitest';
import { homeView } from '@/db/queries/home-view';
import { recordsOfHome } from '@/db/queries/work';
import { type Actor } from '@/lib/permissions';
import { setEnvironment } from '@/tests/fixtures/environment';
import { send } from '@/tests/fixtures/form';
import { actorOf, insertMember, insertUser } from '@/tests/fixtures/home';
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

const actions = {
  new: () => import('@/app/(home)/homes/new/actions'),
  walkaround: () => import('@/app/(home)/homes/[homeId]/walkaround/actions'),
  putOff: () => import('@/app/(home)/homes/[homeId]/put-off/actions'),
  log: () => import('@/app/(home)/homes/[homeId]/log/actions'),
  record: () => import('@/app/(home)/homes/[homeId]/record/actions'),
};

let owner: Actor;
let homeId: string;
const view = () => homeView(owner, homeId);
const front = () => {
  const wall = view().walls.find(({ wall: { name } }) => name === 'Front');
  if (!wall) throw new Error('no front');
  return wall;
};
const restain = () => front().items.find(({ kind }) => kind === 'restain');
const walked = (answers: Record<string, string>, values: Record<string, string> = {}) => ({
  homeId,
  submissionKey: crypto.randomUUID(),
  doneOn: '2026-11-28',
  note: '',
  ...Object.fromEntries(Object.entries(answers).map(([name, value]) => [`walls.${front().wall.id}.${name}`, value])),
  ...values,
});
const walk = async (form: Record<string, string>) => send((await actions.walkaround()).keepWalkaround, form);

beforeEach(async () => {
  setEnvironment({});
  vi.useFakeTimers({ now: new Date('2026-12-01T18:00:00Z'), toFake: ['Date'] });
  request.said = [];
  request.actor = owner = actorOf(insertUser());
  const { to } = await send((await actions.new()).create, newHomeForm({ 'stained.on': '2022-06-15', finish: 'solid-color' }));
  homeId = to?.split('/')[2] ?? '';
  return () => void vi.useRealTimers();
});

describe('a walkaround', () => {
  it('moves the plan by what was seen, says by how much, and stands in the record', async () => {
    const before = restain();
    expect(before?.missedOn).toBeNull();
    const { to } = await walk(walked({ water: 'soaks', color: 'faded', caulk: 'holds', 'also.mildew': 'on' }, { doneOn: '2026-08-20' }));
    expect(to).toBe(`/homes/${homeId}`);
    expect(restain()).toMatchObject({ dueOn: '2026-08-20', basis: 'found' });
    const { coat } = front();
    expect(coat.found).toEqual({ state: 'due', on: '2026-08-20' });
    expect(coat.factor).toBeLessThan(1);
    // A normal-normal update by one film found due: k = (age / modelled life)^0.735.
    const [step] = coat.learned;
    expect(step && coat.factor).toBeCloseTo(((step?.ageYears ?? 0) / (step?.modelYears ?? 1)) ** ((1 / 0.15 ** 2) / (1 / 0.15 ** 2 + 1 / 0.25 ** 2)), 6);
    expect(request.said.join(' ')).toMatch(/^.*Walkaround kept\. Front: next restain moves from .* Front: this wall’s coat has worn \d+ % faster than the model since \d{4}\.$/s);
    const [record] = recordsOfHome(homeId);
    expect(record).toMatchObject({ kind: 'walkaround', doneOn: '2026-08-20', findings: [{ coat: 'due', seal: 'sound', answers: { water: 'soaks', color: 'faded', caulk: 'holds', also: ['mildew'] } }] });
    expect(record?.wallIds).toEqual([front().wall.id]);
  });

  it('is one walkaround when it arrives twice, and gives the old plan back when it is taken back', async () => {
    const before = restain();
    const form = walked({ color: 'gray' });
    await walk(form);
    await walk(form);
    expect(recordsOfHome(homeId).filter(({ kind }) => kind === 'walkaround')).toHaveLength(1);
    expect(restain()?.missedOn).toBe('2026-11-28');
    await send((await actions.record()).takeBack, { recordId: recordsOfHome(homeId)[0]?.id ?? '' });
    expect(restain()).toEqual(before);
    expect(front().coat).toMatchObject({ factor: 1, learned: [], found: null });
  });

  it('refuses an empty one, a day to come and a wall of another home, and keeps what was entered', async () => {
    const empty = await walk(walked({ water: '' }));
    expect(empty.state).toMatchObject({ ok: false, message: expect.stringMatching(/Nothing is answered yet/) as string });
    const tomorrow = await walk(walked({ water: 'soaks' }, { doneOn: '2026-12-02' }));
    expect(tomorrow.state?.errors).toHaveProperty('doneOn');
    expect(tomorrow.state?.values).toMatchObject({ walls: { [front().wall.id]: { water: 'soaks' } } });
    const foreign = await walk({ homeId, submissionKey: crypto.randomUUID(), doneOn: '2026-11-28', 'walls.another.water': 'soaks' });
    expect(foreign.state?.ok).toBe(false);
    expect((await walk(walked({ water: 'drips' }))).state?.ok).toBe(false);
    expect(recordsOfHome(homeId).some(({ kind }) => kind === 'walkaround')).toBe(false);
  });

  it('is for everybody who may log, and for nobody else', async () => {
    const caretaker = actorOf(insertUser());
    insertMember({ id: homeId }, caretaker, 'caretaker');
    const form = walked({ water: 'beads' });
    request.actor = actorOf(insertUser());
    expect((await walk(form)).state?.ok).toBe(false);
    request.actor = caretaker;
    expect((await walk(form)).to).toBe(`/homes/${homeId}`);
  });
});

describe('a logged restain', () => {
  it('teaches from how the old coat was found', async () => {
    const { coat } = front();
    await send((await actions.log()).log, logForm({ homeId, 'wallIds[]': front().wall.id, doneOn: '2026-11-20', oldFilm: 'past due' }));
    const now = front().coat;
    expect(now.learned).toHaveLength(1);
    expect(now.learned[0]).toMatchObject({ startedOn: coat.startedOn, on: '2026-11-20', state: 'past due' });
    expect(now.found).toBeNull();
    expect(now.startedOn).toBe('2026-11-20');
  });
});

describe('putting off', () => {
  const form = () => ({ homeId, kind: 'restain', 'wallIds[]': front().wall.id });

  it('moves the work to the next season, once, and can be undone', async () => {
    const before = restain();
    expect((await send((await actions.putOff()).putOff, form())).to).toBe(`/homes/${homeId}/plan?kind=restain&wall=${front().wall.id}`);
    const later = restain();
    expect(later).toMatchObject({ dueOn: before?.dueOn, missedOn: null });
    expect((later?.window.opensOn ?? '') > (before?.window.closesOn ?? '9999')).toBe(true);
    await send((await actions.putOff()).takeUp, form());
    expect(restain()).toEqual(before);
  });

  it('says so when there is nothing to put off', async () => {
    expect((await send((await actions.putOff()).putOff, { ...form(), 'wallIds[]': 'nothing' })).state?.message).toMatch(/holds no such work/);
  });

  it('is for the owners, not for who only helps, nor for strangers', async () => {
    const contractor = actorOf(insertUser({ role: 'contractor' }));
    insertMember({ id: homeId }, contractor, 'contractor');
    const before = restain();
    for (const actor of [contractor, actorOf(insertUser())]) {
      const wish = form();
      request.actor = actor;
      expect((await send((await actions.putOff()).putOff, wish)).state?.ok).toBe(false);
      request.actor = owner;
    }
    expect(restain()).toEqual(before);
  });
});
