import { beforeEach, describe, expect, it, vi } from 'vitest';
import { homeView } from '@/db/queries/home-view';
import { listHomes } from '@/db/queries/homes';
import { upcomingJobs } from '@/db/queries/job-list';
import { wallsOfHome } from '@/db/queries/walls';
import { recordsOfHome } from '@/db/queries/work';
import { workAhead } from '@/lib/jobs/work-ahead';
import { type Actor, Refused } from '@/lib/permissions';
import { setEnvironment } from '@/tests/fixtures/environment';
import { send } from '@/tests/fixtures/form';
import { actorOf, allWorkItems, insertFourWalls, insertHome, insertUser, insertWorkItem } from '@/tests/fixtures/home';
import { logForm, newHomeForm, wallForm } from '@/tests/fixtures/home-forms';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ actor: null as Actor | null }));
vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor), requireActor: () => Promise.resolve(request.actor) }));
vi.mock('next/headers', () => ({ headers: () => Promise.resolve(new Headers()), cookies: () => Promise.resolve({ set: () => undefined, get: () => undefined }) }));
vi.mock('next/cache', () => ({ revalidatePath: () => undefined }));
vi.mock('next/server', () => ({ after: () => undefined }));

useFreshDatabase();

const now = new Date('2026-12-01T18:00:00Z');
let owner: Actor;
let crew: Actor;
let sharedId: string;
let otherId: string;

const as = (actor: Actor) => (request.actor = actor);
const homes = () => import('@/app/(home)/homes/actions');
const sharing = () => import('@/app/(home)/homes/[homeId]/share/actions');
const logging = () => import('@/app/(home)/homes/[homeId]/log/actions');
const recording = () => import('@/app/(home)/homes/[homeId]/record/actions');
const wallIds = (homeId: string) => wallsOfHome(homeId).map(({ wall }) => wall.id);

async function makeHome(name: string): Promise<string> {
  const { create } = await import('@/app/(home)/homes/new/actions');
  return (await send(create, newHomeForm({ name }))).to?.split('/')[2] ?? '';
}

/** A home of the same owner with work to do, shared with nobody. */
function unsharedHome(): string {
  const home = insertHome({ name: 'Agate Point' }, owner);
  for (const wall of insertFourWalls(home)) insertWorkItem(wall);
  return home.id;
}

/** What the owner sees of the plan. */
const ownersPlan = () => homeView(owner, sharedId).walls.flatMap(({ items }) => items);
const nextRestain = (wallId: string) => ownersPlan().find((item) => item.wallId === wallId && item.kind === 'restain');

beforeEach(async () => {
  setEnvironment({});
  vi.useFakeTimers({ now, toFake: ['Date'] });
  owner = actorOf(insertUser({ name: 'Ada Owner', email: 'ada@example.test' }));
  crew = actorOf(insertUser({ name: 'Bo Crew', email: 'bo@example.test', role: 'contractor' }));
  as(owner);
  sharedId = await makeHome('Larch Ridge');
  otherId = unsharedHome();
  const { to } = await send((await sharing()).share, { homeId: sharedId, email: crew.email, membership: 'contractor' });
  expect(to).toBe(`/homes/${sharedId}/share`);
  as(crew);
  return () => void vi.useRealTimers();
});

describe('a contractor', () => {
  it('sees the restains and recaulks of homes shared with them, and whose they are', () => {
    const { jobs, owners } = upcomingJobs(crew);
    expect(new Set(jobs.map(({ home }) => home.id))).toEqual(new Set([sharedId]));
    expect(jobs.map(({ wall, item }) => `${wall.id} ${item.kind}`).sort()).toEqual(wallIds(sharedId).flatMap((id) => [`${id} recaulk`, `${id} restain`]).sort());
    expect([...owners]).toEqual([[sharedId, { name: 'Ada Owner', email: 'ada@example.test' }]]);
  });

  it('finds every piece of that work once in the work ahead, with stain for each wall to be stained', () => {
    const { jobs } = upcomingJobs(crew);
    const { overdue, seasons } = workAhead(jobs, now, 'us');
    const visits = [...(overdue?.visits ?? []), ...seasons.flatMap((season) => season.visits)];
    const found = visits.flatMap(({ rows }) => rows.flatMap(({ works }) => works.map((work) => `${work.wallId} ${work.kind}`)));
    expect(found.sort()).toEqual(jobs.map(({ wall, item }) => `${wall.id} ${item.kind}`).sort());
    for (const { rows, stain } of visits) expect(stain !== null).toBe(rows.some(({ works }) => works.some(({ kind }) => kind === 'restain')));
  });

  it('sees nothing of other homes', () => {
    expect(listHomes(crew).map(({ home }) => home.id)).toEqual([sharedId]);
    expect(homeView(crew, sharedId).membership).toBe('contractor');
    expect(() => homeView(crew, otherId)).toThrow(new Refused('not found', 'That home'));
  });

  it('gets the not-found page for a home that is not shared, the home for one that is', async () => {
    const { sharedHome } = await import('@/app/(contractor)/work/shared-home');
    expect((await sharedHome(sharedId)).view.home.name).toBe('Larch Ridge');
    await expect(sharedHome(otherId)).rejects.toMatchObject({ digest: 'NEXT_HTTP_ERROR_FALLBACK;404' });
    await expect(sharedHome('no-such-home')).rejects.toMatchObject({ digest: 'NEXT_HTTP_ERROR_FALLBACK;404' });
  });

  it('may not log on a home that is not shared, nor on its walls through one that is', async () => {
    const { log } = await logging();
    const before = allWorkItems();
    const foreign = await send(log, logForm({ homeId: otherId, 'wallIds[]': wallIds(otherId) }));
    expect(foreign.state?.message).toContain('That home was not found');
    const smuggled = await send(log, logForm({ homeId: sharedId, 'wallIds[]': wallIds(otherId) }));
    expect(smuggled.state?.message).toContain('was not found');
    expect(allWorkItems()).toEqual(before);
    expect(recordsOfHome(otherId).filter(({ origin }) => origin === 'logged')).toEqual([]);
  });

  it('may not change the home, its walls or who sees it', async () => {
    const before = homeView(owner, sharedId);
    const { saveWall, addWallToHome, takeOutWall } = await import('@/app/(home)/homes/[homeId]/walls/actions');
    const { turnHome } = await import('@/app/(home)/homes/[homeId]/edit/actions');
    const [wallId = ''] = wallIds(sharedId);
    const { share, withdraw } = await sharing();
    const refused = await Promise.all([
      send(saveWall, wallForm({ homeId: sharedId, wallId })),
      send(addWallToHome, wallForm({ homeId: sharedId })),
      send(takeOutWall, { homeId: sharedId, wallId }),
      send(turnHome, { homeId: sharedId, compassDeg: '10' }),
      send(share, { homeId: sharedId, email: 'ada@example.test', membership: 'caretaker' }),
      send(withdraw, { homeId: sharedId, userId: owner.id }),
      send((await homes()).archive, { homeId: sharedId }),
    ]);
    expect(refused.map(({ state }) => state?.message)).toEqual(refused.map(() => 'You may look at this home but not change this.'));
    expect(homeView(owner, sharedId)).toEqual(before);
  });

  it('may not make a home of their own', async () => {
    const { create } = await import('@/app/(home)/homes/new/actions');
    expect((await send(create, newHomeForm({ name: 'Mine' }))).state?.message).toBe('Your account may not do this.');
  });
});

describe('work that a contractor logs', () => {
  const logOn = async (...ids: string[]) => send((await logging()).log, logForm({ homeId: sharedId, 'wallIds[]': ids, doneOn: '2026-08-10', note: 'Two coats.' }));

  it('moves the owner’s plan at once, and no other wall’s', async () => {
    const [front = '', left = ''] = wallIds(sharedId);
    const before = { front: nextRestain(front), left: nextRestain(left) };
    expect((await logOn(front)).to).toBe(`/work/${sharedId}`);
    const after = nextRestain(front);
    expect(after?.startOn).toBe('2026-08-10');
    expect((after?.dueOn ?? '') > (before.front?.dueOn ?? '9')).toBe(true);
    expect(nextRestain(left)).toEqual(before.left);
    expect(homeView(owner, sharedId).records[0]).toMatchObject({ kind: 'restain', doneOn: '2026-08-10', note: 'Two coats.', byName: 'Bo Crew', wallIds: [front] });
    const job = upcomingJobs(crew).jobs.find(({ wall, item }) => wall.id === front && item.kind === 'restain');
    expect(job?.item).toEqual(after);
  });

  it('can be taken back by them and put back; what the owner logged cannot', async () => {
    const [front = ''] = wallIds(sharedId);
    const before = nextRestain(front);
    await logOn(front);
    const after = nextRestain(front);
    const mine = recordsOfHome(sharedId).find(({ createdBy }) => createdBy === crew.id)?.id ?? '';
    const { takeBack, putBack } = await recording();
    expect((await send(takeBack, { recordId: mine })).to).toBe(`/work/${sharedId}?removed=${mine}`);
    expect(nextRestain(front)).toEqual(before);
    expect((await send(putBack, { recordId: mine })).to).toBe(`/work/${sharedId}`);
    expect(nextRestain(front)).toEqual(after);
    const owners = recordsOfHome(sharedId).find(({ createdBy }) => createdBy === owner.id)?.id ?? '';
    expect((await send(takeBack, { recordId: owners })).state?.message).toBe('You may look at this home but not change this.');
    expect(recordsOfHome(sharedId).map(({ id }) => id)).toContain(owners);
  });
});

describe('after the owner ends the access', () => {
  it('nothing of the home is seen or changed any more, and what was logged stays with the owner', async () => {
    const { log } = await logging();
    const [front = ''] = wallIds(sharedId);
    await send(log, logForm({ homeId: sharedId, 'wallIds[]': [front], doneOn: '2026-08-10' }));
    const mine = recordsOfHome(sharedId).find(({ createdBy }) => createdBy === crew.id)?.id ?? '';
    as(owner);
    expect((await send((await sharing()).withdraw, { homeId: sharedId, userId: crew.id })).state?.ok).toBe(true);
    as(crew);
    const { jobs, owners } = upcomingJobs(crew);
    expect([jobs, [...owners], listHomes(crew)]).toEqual([[], [], []]);
    expect(() => homeView(crew, sharedId)).toThrow(Refused);
    expect((await send(log, logForm({ homeId: sharedId, 'wallIds[]': [front] }))).state?.message).toContain('not found');
    expect((await send((await recording()).takeBack, { recordId: mine })).state?.message).toContain('not found');
    const { GET } = await import('@/app/api/homes/[homeId]/plan/route');
    expect((await GET(new Request(`https://eavewright.example/api/homes/${sharedId}/plan`), { params: Promise.resolve({ homeId: sharedId }) })).status).toBe(404);
    expect(homeView(owner, sharedId).records.map(({ id }) => id)).toContain(mine);
  });

  it('an archived home is gone from the list too', async () => {
    as(owner);
    await send((await homes()).archive, { homeId: sharedId });
    expect(upcomingJobs(crew).jobs).toEqual([]);
  });
});

describe('the list of jobs', () => {
  it('is refused to homeowners and operators', () => {
    const operator = actorOf(insertUser({ role: 'operator' }));
    for (const actor of [owner, operator]) expect(() => upcomingJobs(actor)).toThrow(new Refused('not allowed', 'job.view'));
  });
});
