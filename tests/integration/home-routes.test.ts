import { beforeEach, describe, expect, it, vi } from 'vitest';
import { GET as planRoute } from '@/app/api/homes/[homeId]/plan/route';
import { GET as placeRoute } from '@/app/api/places/[postalCode]/route';
import { homesWithWork } from '@/db/queries/home-list';
import { archiveHome } from '@/db/queries/homes';
import { changeHome, replanHome } from '@/db/queries/replan';
import { siteFor } from '@/db/queries/site';
import { logWork } from '@/db/queries/work';
import { database } from '@/db/client';
import { postalCode } from '@/db/schema';
import { type PlanView } from '@/lib/home/plan-view';
import { type Actor } from '@/lib/permissions';
import { actorOf, insertFourWalls, insertHome, insertMember, insertUser } from '@/tests/fixtures/home';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ actor: null as Actor | null }));
vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor) }));

useFreshDatabase();

const now = new Date('2026-12-01T18:00:00Z');
let owner: Actor;
let homeId: string;
let wallIds: string[];

beforeEach(() => {
  vi.useFakeTimers({ now, toFake: ['Date'] });
  owner = actorOf(insertUser());
  const site = siteFor({ postalCode: '59715' });
  if (!site.found) throw new Error(site.why);
  const home = insertHome(site.site, owner);
  homeId = home.id;
  wallIds = insertFourWalls(home).map(({ id }) => id);
  replanHome(homeId, now);
  request.actor = owner;
  return () => void vi.useRealTimers();
});

const get = (path: string) => new Request(`https://eavewright.example${path}`);
const plan = (id = homeId) => planRoute(get(`/api/homes/${id}/plan`), { params: Promise.resolve({ homeId: id }) });
const place = (code: string, query = '') => placeRoute(get(`/api/places/${code}${query}`), { params: Promise.resolve({ postalCode: code }) });

describe('GET /api/homes/[homeId]/plan', () => {
  it('answers with visits whose items name their rule in the words of RFC 5545, and a revision that goes up', async () => {
    const before = (await (await plan()).json()) as PlanView;
    expect(before).toMatchObject({ homeId, today: '2026-12-01', wallCount: 4 });
    changeHome(homeId, now, () => logWork(owner, { homeId, submissionKey: crypto.randomUUID(), kind: 'restain', doneOn: '2026-07-02', wallIds, product: undefined, note: undefined, costCents: undefined, amountL: undefined, finish: undefined, stainBase: undefined, colorHex: undefined, sealant: undefined }));
    const after = (await (await plan()).json()) as PlanView;
    expect(after.revision).toBe(before.revision + 1);
    const restains = after.visits.flatMap(({ items }) => items).filter(({ kind }) => kind === 'restain');
    expect(restains.map(({ wallName }) => wallName).sort()).toEqual(['East', 'North', 'South', 'West']);
    for (const { explanation } of restains) expect(JSON.stringify(explanation.inputs)).toMatch(/FREQ=MONTHLY;INTERVAL=\d+/);
    for (const visit of after.visits) for (const item of visit.items) expect(item.opensOn <= visit.opensOn && visit.closesOn <= item.closesOn).toBe(true);
  });

  it('is not found for a stranger, for an archived home and for none; 401 for nobody', async () => {
    expect((await plan('no-such-home')).status).toBe(404);
    request.actor = actorOf(insertUser());
    const foreign = await plan();
    expect([foreign.status, foreign.headers.get('content-type')]).toEqual([404, 'application/problem+json']);
    request.actor = null;
    expect((await plan()).status).toBe(401);
    request.actor = owner;
    archiveHome(owner, homeId, now);
    expect((await plan()).status).toBe(404);
  });

  it('is open to a caretaker and to a contractor with whom the home is shared', async () => {
    for (const [membership, role] of [['caretaker', 'homeowner'], ['contractor', 'contractor']] as const) {
      const member = insertUser({ role });
      insertMember({ id: homeId }, member, membership);
      request.actor = actorOf(member);
      expect((await plan()).status).toBe(200);
    }
  });
});

describe('GET /api/places/[postalCode]', () => {
  it('says where a code is, asks where it does not know, and refuses what is no code', async () => {
    expect(await (await place('59715')).json()).toMatchObject({ found: true, site: { place: 'Bozeman', climateZone: '6B', timeZone: 'America/Denver' } });
    expect(await (await place('00000')).json()).toMatchObject({ found: false, ask: 'coordinates' });
    expect(await (await place('00000', '?latitude=45.7&longitude=-111')).json()).toMatchObject({ found: false, ask: 'zone' });
    expect(await (await place('00000', '?latitude=45.7&longitude=-111&climateZoneOverride=6B')).json()).toMatchObject({ found: true, site: { climateZone: null } });
    expect((await place('5971')).status).toBe(422);
    expect((await place('59715', '?latitude=north')).status).toBe(422);
    request.actor = null;
    expect((await place('59715')).status).toBe(401);
  });

  it('ends every postal code in a place with a zone, or in a question', () => {
    const rows = database().select({ code: postalCode.code, state: postalCode.state }).from(postalCode).all();
    expect(rows.length).toBeGreaterThan(41_000);
    // Every thirtieth code, and all of the states where the table of counties has gaps.
    const asked = rows.filter(({ state }, i) => i % 30 === 0 || ['', 'MH', 'AK', 'HI', 'DC', 'CT'].includes(state));
    const questions = asked.filter(({ code }) => {
      const answer = siteFor({ postalCode: code });
      return answer.found ? !answer.site.climateZone || !answer.site.timeZone : !answer.why;
    });
    expect(questions).toEqual([]);
    expect(asked.filter(({ code }) => !siteFor({ postalCode: code }).found).every(({ state }) => state === '' || state === 'MH')).toBe(true);
  });
});

describe('the list of homes', () => {
  it('carries walls in plan order and their work, of one’s own homes only', () => {
    const other = insertHome({ stationId: 'test-station' }, insertUser());
    insertFourWalls(other);
    const [home, ...more] = homesWithWork(owner);
    expect(more).toEqual([]);
    expect(home?.walls.map(({ name }) => name)).toEqual(['North', 'East', 'South', 'West']);
    expect(new Set(home?.items.map(({ wallId }) => wallId))).toEqual(new Set(wallIds));
    expect(homesWithWork(actorOf(insertUser()))).toEqual([]);
  });
});
