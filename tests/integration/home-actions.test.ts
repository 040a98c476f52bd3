import { beforeEach, describe, expect, it, vi } from 'vitest';
import { homeView } from '@/db/queries/home-view';
import { listHomes } from '@/db/queries/homes';
import { wallsOfHome } from '@/db/queries/walls';
import { recordsOfHome } from '@/db/queries/work';
import { type Actor } from '@/lib/permissions';
import { send } from '@/tests/fixtures/form';
import { actorOf, allMail, allWorkItems, insertMember, insertUser } from '@/tests/fixtures/home';
import { logForm, newHomeForm, wallForm } from '@/tests/fixtures/home-forms';
import { setEnvironment } from '@/tests/fixtures/environment';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ actor: null as Actor | null, said: [] as string[], later: [] as (() => unknown)[] }));

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor) }));
vi.mock('next/headers', () => ({
  headers: () => Promise.resolve(new Headers()),
  cookies: () => Promise.resolve({ set: (_name: string, words: string) => void request.said.push(words), get: () => undefined }),
}));
vi.mock('next/cache', () => ({ revalidatePath: () => undefined }));
vi.mock('next/server', () => ({ after: (work: () => unknown) => void request.later.push(work) }));

useFreshDatabase();

let owner: Actor;
let homeId: string;

const as = (actor: Actor | null) => (request.actor = actor);
const person = (values: Parameters<typeof insertUser>[0] = {}) => actorOf(insertUser(values));
const actions = {
  new: () => import('@/app/(home)/homes/new/actions'),
  homes: () => import('@/app/(home)/homes/actions'),
  edit: () => import('@/app/(home)/homes/[homeId]/edit/actions'),
  walls: () => import('@/app/(home)/homes/[homeId]/walls/actions'),
  log: () => import('@/app/(home)/homes/[homeId]/log/actions'),
  record: () => import('@/app/(home)/homes/[homeId]/record/actions'),
  share: () => import('@/app/(home)/homes/[homeId]/share/actions'),
};

beforeEach(async () => {
  setEnvironment({});
  vi.useFakeTimers({ now: new Date('2026-12-01T18:00:00Z'), toFake: ['Date'] });
  request.said = [];
  request.later = [];
  owner = person();
  as(owner);
  const { to } = await send((await actions.new()).create, newHomeForm());
  homeId = to?.split('/')[2] ?? '';
  return () => void vi.useRealTimers();
});

const walls = () => wallsOfHome(homeId).map(({ wall }) => wall);
const wallId = (name: string) => walls().find((wall) => wall.name === name)?.id ?? '';
const nextRestain = (name: string) => allWorkItems().find((item) => item.wallId === wallId(name) && item.kind === 'restain');
/** What the plan says, without the order and ids of rows. */
const planned = () => allWorkItems().map(({ wallId: id, kind, rule, startOn, dueOn, opensOn, closesOn }) => ({ name: walls().find((wall) => wall.id === id)?.name, kind, rule, startOn, dueOn, opensOn, closesOn }));

describe('setting up a home', () => {
  it('makes four planned walls at right angles with the sun on each', () => {
    const view = homeView(owner, homeId);
    expect(view.home).toMatchObject({ name: 'Larch Ridge', place: 'Bozeman', state: 'MT', timeZone: 'America/Denver', climateZone: '6B' });
    expect(view.walls.map(({ wall }) => [wall.name, wall.azimuthDeg, Number(wall.widthM.toFixed(3)), wall.gableHeightM > 0])).toEqual([
      ['Front', 180, 12.192, false],
      ['Left side', 270, 8.534, true],
      ['Back', 0, 12.192, false],
      ['Right side', 90, 8.534, true],
    ]);
    for (const wall of view.walls) expect(wall.items.map(({ kind }) => kind).sort()).toEqual(['recaulk', 'restain', 'walkaround', 'wash']);
    const [front, , back] = view.walls;
    // In the United States the south wall of a house gets 2.3 to 3.2 times the sun of its north wall (eaves and place move it a little).
    expect((front?.exposure?.doseKwhM2 ?? 0) / (back?.exposure?.doseKwhM2 ?? 1)).toBeGreaterThan(1.8);
  });

  it('keeps what was typed and marks each wrong field', async () => {
    const { state } = await send((await actions.new()).create, newHomeForm({ name: '', frontWidth: 'forty', latitude: '45', postalCode: '597', 'stained.on': '2022-02-30' }));
    expect(state?.ok).toBe(false);
    expect(Object.keys(state?.errors ?? {}).sort()).toEqual(['frontWidth', 'longitude', 'name', 'postalCode', 'stained.on']);
    expect(state?.values).toMatchObject({ frontWidth: 'forty', postalCode: '597', stained: { on: '2022-02-30' }, sideWidth: '28' });
    expect(listHomes(owner)).toHaveLength(1);
  });

  it('asks where an unknown postal code is, and takes the answer', async () => {
    const { create } = await actions.new();
    const asked = await send(create, newHomeForm({ postalCode: '00000' }));
    expect(asked.state?.errors?.latitude).toContain('00000');
    const zone = await send(create, newHomeForm({ postalCode: '00000', latitude: '45.7', longitude: '-111' }));
    expect(Object.keys(zone.state?.errors ?? {})).toEqual(['climateZoneOverride']);
    const done = await send(create, newHomeForm({ name: 'Far Cabin', postalCode: '00000', latitude: '45.7', longitude: '-111', climateZoneOverride: '6B' }));
    expect(done.to).toMatch(/^\/homes\//);
    expect(listHomes(owner).map(({ home }) => [home.name, home.timeZone])).toContainEqual(['Far Cabin', 'America/Denver']);
  });

  it('refuses a coat from the future', async () => {
    const { state } = await send((await actions.new()).create, newHomeForm({ 'stained.on': '2026-12-02' }));
    expect(state?.errors?.['stained.on']).toContain('not come yet');
  });

  it('is for homeowners, and asks who is signed out to sign in', async () => {
    const { create } = await actions.new();
    as(person({ role: 'contractor' }));
    expect((await send(create, newHomeForm())).state?.message).toContain('may not');
    as(null);
    const { state } = await send(create, newHomeForm());
    expect(state?.message).toContain('signed out');
    expect(state?.values?.name).toBe('Larch Ridge');
  });
});

describe('who may do what', () => {
  const tries = async () => ({
    edit: await send((await actions.edit()).turnHome, { homeId, compassDeg: '90' }),
    wall: await send((await actions.walls()).saveWall, wallForm({ homeId, wallId: wallId('Front'), name: 'Changed' })),
    takeOut: await send((await actions.walls()).takeOutWall, { homeId, wallId: wallId('Front') }),
    share: await send((await actions.share()).share, { homeId, email: 'x@example.com', membership: 'caretaker' }),
    archive: await send((await actions.homes()).archive, { homeId }),
    log: await send((await actions.log()).log, logForm({ homeId, 'wallIds[]': [wallId('Front')] })),
  });
  const said = (outcomes: Awaited<ReturnType<typeof tries>>) => Object.fromEntries(Object.entries(outcomes).map(([verb, { to, state }]) => [verb, to ? 'done' : state?.message?.includes('not found') ? 'not found' : state?.message?.includes('not change') ? 'not allowed' : state?.message]));

  it('lets a stranger find nothing', async () => {
    as(person());
    expect(said(await tries())).toEqual({ edit: 'not found', wall: 'not found', takeOut: 'not found', share: 'not found', archive: 'not found', log: 'not found' });
    expect(recordsOfHome(homeId).filter(({ origin }) => origin === 'logged')).toEqual([]);
    expect(walls().map(({ azimuthDeg }) => azimuthDeg)).toEqual([180, 270, 0, 90]);
  });

  it('lets a caretaker and a contractor log work, and change nothing', async () => {
    for (const [membership, role] of [['caretaker', 'homeowner'], ['contractor', 'contractor']] as const) {
      const member = person({ role });
      insertMember({ id: homeId }, member, membership);
      as(member);
      expect(said(await tries())).toEqual({ edit: 'not allowed', wall: 'not allowed', takeOut: 'not allowed', share: 'not allowed', archive: 'not allowed', log: 'done' });
    }
    expect(walls().map(({ name }) => name)).toEqual(['Front', 'Left side', 'Back', 'Right side']);
  });

  it('lets a co-owner change walls, but neither share nor archive', async () => {
    const member = person();
    insertMember({ id: homeId }, member, 'co-owner');
    as(member);
    expect(said(await tries())).toMatchObject({ edit: 'done', wall: 'done', share: 'not allowed', archive: 'not allowed' });
  });

  it('does not touch a wall through another home of the same owner', async () => {
    const { to } = await send((await actions.new()).create, newHomeForm({ name: 'Second' }));
    const other = to?.split('/')[2] ?? '';
    const { state } = await send((await actions.walls()).saveWall, wallForm({ homeId: other, wallId: wallId('Front'), name: 'Changed' }));
    expect(state?.message).toContain('not found');
    expect(walls().map(({ name }) => name)).not.toContain('Changed');
  });
});

describe('logging work', () => {
  it('restarts the clock of the chosen walls and says what moved', async () => {
    const before = { front: nextRestain('Front'), back: nextRestain('Back') };
    const { to } = await send((await actions.log()).log, logForm({ homeId, 'wallIds[]': [wallId('Front')], amount: '3.5', cost: '$1,240.50' }));
    expect(to).toBe(`/homes/${homeId}`);
    expect(nextRestain('Front')?.startOn).toBe('2026-08-10');
    expect((nextRestain('Front')?.dueOn ?? '') > (before.front?.dueOn ?? '')).toBe(true);
    expect(nextRestain('Back')).toEqual(before.back);
    expect(request.said.at(-1)).toMatch(/^Logged\. .*Front: next restain moves from [A-Z][a-z]+ \d{4} to [A-Z][a-z]+ \d{4}\./);
    // 1 US gallon is 3.785411784 L exactly.
    expect(recordsOfHome(homeId)[0]).toMatchObject({ amountL: expect.closeTo(13.2489, 4) as number, costCents: 124050 });
  });

  it('makes one record of a form that arrives twice', async () => {
    const form = logForm({ homeId, 'wallIds[]': [wallId('Front')] });
    const { log } = await actions.log();
    const both = await Promise.all([send(log, form), send(log, form)]);
    expect(both.map(({ to }) => to)).toEqual([`/homes/${homeId}`, `/homes/${homeId}`]);
    expect(recordsOfHome(homeId).filter(({ origin }) => origin === 'logged')).toHaveLength(1);
  });

  it('gives the same plan whatever the order in which work is logged', async () => {
    const jobs = [
      { kind: 'restain', doneOn: '2026-08-10' },
      { kind: 'restain', doneOn: '2024-05-02' },
      { kind: 'wash', doneOn: '2026-05-04' },
      { kind: 'recaulk', doneOn: '2026-08-08' },
    ];
    const { log } = await actions.log();
    const outcomes = [];
    for (const order of [[0, 1, 2, 3], [1, 3, 2, 0], [3, 2, 1, 0]]) {
      const ids = await Promise.all(order.map(async (n) => send(log, logForm({ homeId, 'wallIds[]': walls().map(({ id }) => id), ...jobs[n] }))));
      expect(ids.every(({ to }) => to !== undefined)).toBe(true);
      outcomes.push(planned());
      const { takeBack } = await actions.record();
      for (const record of recordsOfHome(homeId).filter(({ origin }) => origin === 'logged')) await send(takeBack, { recordId: record.id });
    }
    expect(outcomes[1]).toEqual(outcomes[0]);
    expect(outcomes[2]).toEqual(outcomes[0]);
  });

  it('refuses tomorrow by the clock at the home, and an unknown wall', async () => {
    vi.setSystemTime(new Date('2026-12-02T05:00:00Z')); // still December 1 in Montana
    const { log } = await actions.log();
    const tomorrow = await send(log, logForm({ homeId, 'wallIds[]': [wallId('Front')], doneOn: '2026-12-02' }));
    expect(tomorrow.state?.errors?.doneOn).toContain('not come yet');
    expect((await send(log, logForm({ homeId, 'wallIds[]': [wallId('Front')], doneOn: '2026-12-01' }))).to).toBeDefined();
    const unknown = await send(log, logForm({ homeId, 'wallIds[]': [wallId('Front'), 'no-such-wall'] }));
    expect(unknown.state?.message).toContain('A wall that you chose was not found');
    const none = await send(log, logForm({ homeId, kind: 'paint', amount: 'some', cost: 'much' }));
    expect(Object.keys(none.state?.errors ?? {}).sort()).toEqual(['amount', 'cost', 'kind', 'wallIds']);
    expect(none.state?.values).toMatchObject({ cost: 'much' });
  });

  it('takes a record back and puts it back', async () => {
    const before = planned();
    await send((await actions.log()).log, logForm({ homeId, 'wallIds[]': [wallId('Front')] }));
    const after = planned();
    const record = recordsOfHome(homeId).find(({ origin }) => origin === 'logged')?.id ?? '';
    const { takeBack, putBack } = await actions.record();
    expect((await send(takeBack, { recordId: record })).to).toBe(`/homes/${homeId}/record?removed=${record}`);
    expect(planned()).toEqual(before);
    expect((await send(putBack, { recordId: record })).to).toBe(`/homes/${homeId}/record`);
    expect(planned()).toEqual(after);
    as(person());
    expect((await send(takeBack, { recordId: record })).state?.message).toContain('not found');
  });
});

describe('changing a home', () => {
  it('turns every wall by the same angle and works its sun out anew', async () => {
    const dose = wallsOfHome(homeId).map(({ exposure }) => exposure?.doseKwhM2);
    await send((await actions.edit()).turnHome, { homeId, compassDeg: '90' });
    expect(walls().map(({ azimuthDeg }) => azimuthDeg)).toEqual([90, 180, 270, 0]);
    expect(wallsOfHome(homeId).map(({ exposure }) => exposure?.doseKwhM2)).not.toEqual(dose);
    await send((await actions.edit()).turnHome, { homeId, compassDeg: '180' });
    expect(wallsOfHome(homeId).map(({ exposure }) => exposure?.doseKwhM2)).toEqual(dose);
  });

  it('saves a wall with its openings, and marks the rows that are wrong', async () => {
    const { saveWall } = await actions.walls();
    const target = { homeId, wallId: wallId('Front') };
    const rows = { 'openings.0.kind': 'window', 'openings.0.width': '3', 'openings.0.height': '4', 'openings.0.count': '2', 'openings.4.kind': 'door', 'openings.4.width': '3', 'openings.4.height': '6 ft 8 in', 'openings.4.count': '1' };
    expect((await send(saveWall, wallForm({ ...target, ...rows }))).to).toBe(`/homes/${homeId}/walls/${target.wallId}`);
    const saved = wallsOfHome(homeId)[0]?.openings.map(({ kind, widthM, heightM, count }) => [kind, widthM, heightM, count]);
    expect(saved).toEqual([['window', expect.closeTo(0.9144, 6), expect.closeTo(1.2192, 6), 2], ['door', expect.closeTo(0.9144, 6), expect.closeTo(2.032, 6), 1]]);
    const { state } = await send(saveWall, wallForm({ ...target, ...rows, 'openings.4.height': 'tall', name: '' }));
    expect(Object.keys(state?.errors ?? {}).sort()).toEqual(['name', 'openings.4.height']);
    expect(state?.values).toMatchObject({ openings: { 4: { height: 'tall' } } });
    const larger = await send(saveWall, wallForm({ ...target, ...rows, 'openings.0.count': '40' }));
    expect(larger.state?.errors?.openings).toContain('larger than the wall');
  });

  it('saves a wall with a porch roof, which takes sun and rain off it, and keeps the porch when it is not chosen', async () => {
    const { saveWall } = await actions.walls();
    const target = { homeId, wallId: wallId('Front') };
    const front = () => homeView(owner, homeId).walls.find(({ wall }) => wall.id === target.wallId);
    const porch = { cover: 'porch', coverDepth: '8', coverHeight: '8', coverShare: '0.75', corners: '1', pipes: '4' };
    await send(saveWall, wallForm(target));
    const before = front();
    expect((await send(saveWall, wallForm({ ...target, ...porch }))).to).toBe(`/homes/${homeId}/walls/${target.wallId}`);
    const after = front();
    expect(after?.wall).toMatchObject({ cover: 'porch', coverDepthM: expect.closeTo(2.4384, 6) as number, coverHeightM: expect.closeTo(2.4384, 6) as number, coverShare: 0.75, corners: 1, pipes: 4 });
    expect(after?.exposure?.doseKwhM2).toBeLessThan((before?.exposure?.doseKwhM2 ?? 0) * 0.8);
    expect(after?.exposure?.sunHours).toBeLessThan((before?.exposure?.sunHours ?? 0) * 0.8);
    expect(after?.coat.lifeMonths).toBeGreaterThan(before?.coat.lifeMonths ?? Infinity);
    expect(after?.coat.explanation.inputs).toContainEqual({ label: 'Porch roof or deck', value: 'over 75 % of the width, 100 % as deep as the wall under it is high' });
    await send(saveWall, wallForm({ ...target, ...porch, cover: 'none', corners: '2', pipes: '0' }));
    expect(front()?.wall).toMatchObject({ cover: 'none', coverDepthM: after?.wall.coverDepthM, coverHeightM: after?.wall.coverHeightM, coverShare: 0.75 });
    expect(front()?.exposure?.doseKwhM2).toBe(before?.exposure?.doseKwhM2);
  });

  it('refuses a porch roof that is far over the wall, marks its field and keeps what was typed', async () => {
    const { saveWall } = await actions.walls();
    const target = { homeId, wallId: wallId('Front') };
    const porch = { cover: 'deck', coverDepth: '8', coverHeight: '20', coverShare: '0.25', pipes: '7' };
    const { state } = await send(saveWall, wallForm({ ...target, ...porch }));
    expect(state?.errors).toEqual({ coverHeight: expect.stringContaining('between 3.3 ft and 12.3 ft') as string });
    expect(state?.values).toMatchObject(porch);
    expect(walls().find(({ id }) => id === target.wallId)).toMatchObject({ cover: 'none', pipes: 0 });
  });

  it('takes a wall out of the plan and brings it back as it was', async () => {
    const before = planned();
    const target = { homeId, wallId: wallId('Back') };
    const { takeOutWall, bringBackWall } = await actions.walls();
    expect((await send(takeOutWall, target)).to).toBe(`/homes/${homeId}?removed=${target.wallId}`);
    expect(planned().map(({ name }) => name)).not.toContain('Back');
    await send(bringBackWall, target);
    expect(planned()).toEqual(before);
    expect((await send(bringBackWall, { homeId, wallId: 'none' })).state?.message).toContain('not found');
  });

  it('archives a home out of every list and brings it back', async () => {
    const member = person();
    insertMember({ id: homeId }, member, 'caretaker');
    const { archive, restore } = await actions.homes();
    expect((await send(archive, { homeId })).to).toBe(`/homes?archived=${homeId}`);
    expect(listHomes(owner)).toEqual([]);
    expect(listHomes(member)).toEqual([]);
    expect((await send((await actions.log()).log, logForm({ homeId, 'wallIds[]': [wallId('Front')] }))).state?.message).toContain('not found');
    as(member);
    expect((await send(restore, { homeId })).state?.ok).toBe(false);
    as(owner);
    expect((await send(restore, { homeId })).to).toBe(`/homes/${homeId}`);
    expect(listHomes(owner)).toHaveLength(1);
  });
});

describe('sharing', () => {
  it('says why an address cannot be shared with', async () => {
    const { share } = await actions.share();
    insertUser({ email: 'harlan@example.org', role: 'contractor' });
    const fault = async (email: string, membership: string) => (await send(share, { homeId, email, membership })).state?.errors?.email;
    expect(await fault('nobody@example.org', 'contractor')).toContain('has an account yet');
    expect(await fault('harlan@example.org', 'caretaker')).toContain('Share as contractor');
    expect(await fault('not an address', 'contractor')).toContain('e-mail address');
    expect((await send(share, { homeId, email: ' Harlan@Example.org ', membership: 'contractor' })).to).toBe(`/homes/${homeId}/share`);
    expect(await fault('harlan@example.org', 'contractor')).toContain('can see the home already');
    expect(allMail().map(({ kind, toAddress }) => [kind, toAddress])).toEqual([['shared', 'harlan@example.org']]);
    expect(request.later).toHaveLength(1);
  });

  it('ends access at once, but not the owner’s', async () => {
    const member = person();
    insertMember({ id: homeId }, member, 'caretaker');
    const { withdraw } = await actions.share();
    expect((await send(withdraw, { homeId, userId: owner.id })).state?.ok).toBe(false);
    expect((await send(withdraw, { homeId, userId: member.id })).state?.ok).toBe(true);
    expect(listHomes(member)).toEqual([]);
    expect(listHomes(owner)).toHaveLength(1);
  });
});
