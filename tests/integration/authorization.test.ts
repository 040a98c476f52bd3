import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import { setCosts } from '@/db/queries/costs';
import { homesWithWork } from '@/db/queries/home-list';
import { homeView } from '@/db/queries/home-view';
import { archiveHome, createHome, homeOf, listHomes, restoreHome, updateHome } from '@/db/queries/homes';
import { upcomingJobs } from '@/db/queries/job-list';
import { recentJobRuns } from '@/db/queries/job-runs';
import { listDeliveries, listMails, oneMail, retryMail } from '@/db/queries/mail-view';
import { removeOwnRule, setOwnRule } from '@/db/queries/own-rules';
import { takeUpWork } from '@/db/queries/put-off';
import { membersOf, shareHome, withdrawShare } from '@/db/queries/sharing';
import { siteFor } from '@/db/queries/site';
import { addWall, removeWall, restoreWall, turnWalls, updateWall, wallOf, wallsOfHome } from '@/db/queries/walls';
import { logWork, removeRecord, restoreRecord } from '@/db/queries/work';
import { exampleCosts } from '@/lib/care/costs';
import { type Actor, can, homeVerbs, Refused, roleVerbs } from '@/lib/permissions';
import { keysOf, memberships, roles } from '@/lib/schemas/vocabulary';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, insertFourWalls, insertHome, insertMember, insertUser } from '@/tests/fixtures/home';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

const request = vi.hoisted(() => ({ actor: null as Actor | null }));
vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(request.actor) }));

useFreshDatabase();
beforeEach(() => setEnvironment());

/** Who may do what, written out by hand: the policy's tables must agree with it, cell by cell. */
const homeRights: Record<(typeof homeVerbs)[number], string> = {
  'home.view': 'owner co-owner caretaker contractor',
  'home.edit': 'owner co-owner',
  'work.log': 'owner co-owner caretaker contractor',
  'work.remove': 'owner co-owner',
  'work.putOff': 'owner co-owner',
  'home.share': 'owner',
  'home.archive': 'owner',
};
const roleRights: Record<(typeof roleVerbs)[number], string> = { 'home.create': 'homeowner', 'job.view': 'contractor', 'mail.view': 'operator', 'mail.retry': 'operator' };

const anybody: Actor = { id: 'somebody', role: 'homeowner', email: 'somebody@example.test', name: null };

describe('the policy', () => {
  test('every verb on a home, for every membership and none', () => {
    expect(homeVerbs.sort()).toEqual(Object.keys(homeRights).sort());
    for (const verb of homeVerbs) {
      for (const membership of keysOf(memberships)) expect([verb, membership, can(anybody, verb, { membership })]).toEqual([verb, membership, homeRights[verb].split(' ').includes(membership)]);
      expect(can(anybody, verb)).toBe(false);
      expect(can({ ...anybody, role: 'operator' }, verb)).toBe(false);
    }
  });

  test('every verb of a role', () => {
    expect(roleVerbs.sort()).toEqual(Object.keys(roleRights).sort());
    for (const verb of roleVerbs) for (const role of keysOf(roles)) expect([verb, role, can({ ...anybody, role }, verb)]).toEqual([verb, role, roleRights[verb] === role]);
  });

  test('who logged a piece of work may take it back, if still a member', () => {
    expect(can(anybody, 'work.remove', { membership: 'caretaker', createdBy: anybody.id })).toBe(true);
    expect(can(anybody, 'work.remove', { membership: 'caretaker', createdBy: 'another' })).toBe(false);
    expect(can(anybody, 'work.remove', { createdBy: anybody.id })).toBe(false);
  });
});

type Scene = { homeId: string; wallId: string; recordId: string; removedId: string; people: Record<string, Actor> };

function scene(): Scene {
  const people: Record<string, Actor> = {
    owner: actorOf(insertUser()),
    'co-owner': actorOf(insertUser()),
    caretaker: actorOf(insertUser()),
    contractor: actorOf(insertUser({ role: 'contractor' })),
    stranger: actorOf(insertUser()),
    'other contractor': actorOf(insertUser({ role: 'contractor' })),
    operator: actorOf(insertUser({ role: 'operator' })),
  };
  const owner = people.owner as Actor;
  const home = insertHome({}, owner);
  for (const membership of ['co-owner', 'caretaker', 'contractor'] as const) insertMember(home, people[membership] as Actor, membership);
  insertHome({ name: 'Another home' }, people.stranger);
  const [wall] = insertFourWalls(home);
  const wallId = wall?.id ?? '';
  const log = (submissionKey: string) => logWork(owner, { ...work(home.id, wallId), submissionKey }).record.id;
  const recordId = log('kept');
  const removedId = log('removed');
  removeRecord(owner, removedId, new Date());
  return { homeId: home.id, wallId, recordId, removedId, people };
}

const work = (homeId: string, wallId: string) => ({
  homeId, wallIds: [wallId], kind: 'wash' as const, doneOn: '2026-05-01', submissionKey: crypto.randomUUID(), product: undefined, amountL: undefined, costCents: undefined, note: undefined,
  finish: undefined, stainBase: undefined, colorHex: undefined, sealant: undefined,
});
const wallChange = { name: 'New', azimuthDeg: 10, widthM: 5, heightM: 3, openings: [], stained: null, caulked: null };
const now = new Date('2026-12-01T12:00:00Z');

/** Every query on a home or its parts, the verb that it asks for, and a call of it. A foreign home is not found, a right that lacks is refused. */
const homeQueries: [name: string, verb: keyof typeof homeRights, call: (actor: Actor, at: Scene) => unknown][] = [
  ['homeView', 'home.view', (actor, { homeId }) => homeView(actor, homeId)],
  ['homeOf', 'home.view', (actor, { homeId }) => homeOf(actor, homeId, 'home.view')],
  ['membersOf', 'home.view', (actor, { homeId }) => membersOf(actor, homeId)],
  ['wallOf', 'home.view', (actor, { homeId, wallId }) => wallOf(actor, homeId, wallId, 'home.view')],
  ['updateHome', 'home.edit', (actor, { homeId }) => updateHome(actor, homeId, { name: 'Renamed' })],
  ['addWall', 'home.edit', (actor, { homeId }) => addWall(actor, homeId, wallChange)],
  ['updateWall', 'home.edit', (actor, { wallId }) => updateWall(actor, wallId, wallChange)],
  ['removeWall', 'home.edit', (actor, { wallId }) => removeWall(actor, wallId, now)],
  ['restoreWall', 'home.edit', (actor, { homeId, wallId }) => restoreWall(actor, homeId, wallId)],
  ['setCosts', 'home.edit', (actor, { homeId }) => setCosts(actor, homeId, exampleCosts.hired, now)],
  ['turnWalls', 'home.edit', (actor, { homeId }) => turnWalls(actor, homeId, 10)],
  ['setOwnRule', 'home.edit', (actor, { homeId, wallId }) => setOwnRule(actor, homeId, wallId, 'wash', { rule: 'FREQ=YEARLY', startOn: '2027-05-01' })],
  ['removeOwnRule', 'home.edit', (actor, { homeId, wallId }) => removeOwnRule(actor, homeId, wallId, 'wash')],
  ['logWork', 'work.log', (actor, { homeId, wallId }) => logWork(actor, work(homeId, wallId))],
  ['removeRecord', 'work.remove', (actor, { recordId }) => removeRecord(actor, recordId, now)],
  ['restoreRecord', 'work.remove', (actor, { removedId }) => restoreRecord(actor, removedId)],
  ['takeUpWork', 'work.putOff', (actor, { homeId, wallId }) => takeUpWork(actor, homeId, 'restain', [wallId], now)],
  ['shareHome', 'home.share', (actor, { homeId }) => shareHome(actor, homeId, 'nobody@example.test', 'caretaker')],
  ['withdrawShare', 'home.share', (actor, { homeId }) => withdrawShare(actor, homeId, 'nobody')],
  ['archiveHome', 'home.archive', (actor, { homeId }) => archiveHome(actor, homeId, now)],
];

const outcome = (call: () => unknown): string => {
  try {
    call();
    return 'done';
  } catch (error) {
    if (error instanceof Refused) return error.reason;
    throw error;
  }
};

describe.each(homeQueries)('%s', (_name, verb, call) => {
  test.each(['owner', 'co-owner', 'caretaker', 'contractor'])('by the %s of the home', (who) => {
    const at = scene();
    expect(outcome(() => call(at.people[who] as Actor, at))).toBe(homeRights[verb].split(' ').includes(who) ? 'done' : 'not allowed');
  });

  test.each(['stranger', 'other contractor', 'operator'])('by a %s the home is not found', (who) => {
    const at = scene();
    expect(outcome(() => call(at.people[who] as Actor, at))).toBe('not found');
  });

  test('an archived home is not found, even by its owner', () => {
    const at = scene();
    archiveHome(at.people.owner as Actor, at.homeId, now);
    expect(outcome(() => call(at.people.owner as Actor, at))).toBe('not found');
  });
});

describe('lists', () => {
  test('hold the homes of their reader and no other', () => {
    const { homeId, people } = scene();
    for (const [who, actor] of Object.entries(people)) {
      const member = who in memberships;
      expect([who, listHomes(actor).some(({ home }) => home.id === homeId)]).toEqual([who, member]);
      expect([who, homesWithWork(actor).some(({ home }) => home.id === homeId)]).toEqual([who, member]);
    }
  });

  test('of jobs are for contractors', () => {
    const { people } = scene();
    for (const actor of Object.values(people)) expect(outcome(() => upcomingJobs(actor))).toBe(actor.role === 'contractor' ? 'done' : 'not allowed');
  });

  test('of mails and runs are for the operator', () => {
    const { people } = scene();
    for (const actor of Object.values(people)) {
      const expected = actor.role === 'operator' ? 'done' : 'not allowed';
      expect(outcome(() => listMails(actor, 1))).toBe(expected);
      expect(outcome(() => listDeliveries(actor, []))).toBe(expected);
      expect(outcome(() => recentJobRuns(actor, 5))).toBe(expected);
      expect(outcome(() => oneMail(actor, 'none'))).toBe(expected === 'done' ? 'not found' : expected);
      expect(outcome(() => retryMail(actor, 'none', now))).toBe(expected === 'done' ? 'not found' : expected);
    }
  });

  test('only a homeowner makes a home; only its owner brings it back', () => {
    const { homeId, people } = scene();
    const site = siteFor({ postalCode: '59715' });
    if (!site.found) throw new Error('no place');
    for (const actor of Object.values(people)) expect(outcome(() => createHome(actor, { name: 'Mine', postalCode: '59715', ...site.site }))).toBe(actor.role === 'homeowner' ? 'done' : 'not allowed');
    archiveHome(people.owner as Actor, homeId, now);
    for (const [who, actor] of Object.entries(people)) if (who !== 'owner') expect(restoreHome(actor, homeId)).toBe(false);
    expect(restoreHome(people.owner as Actor, homeId)).toBe(true);
  });

  test('walls of a foreign home stay as they are', () => {
    const { homeId, people } = scene();
    const before = wallsOfHome(homeId);
    expect(outcome(() => turnWalls(people.stranger as Actor, homeId, 90))).toBe('not found');
    expect(wallsOfHome(homeId)).toEqual(before);
  });
});

const root = path.resolve(import.meta.dirname, '..', '..');
const filesNamed = (name: string) => readdirSync(path.join(root, 'app'), { recursive: true, encoding: 'utf8' }).filter((file) => path.basename(file) === name);

describe('declarations', () => {
  test('every server action is made by defineAction', () => {
    const files = readdirSync(path.join(root, 'app'), { recursive: true, encoding: 'utf8' }).filter((file) => /\.tsx?$/.test(file));
    const withActions = files.filter((file) => /['"]use server['"]/.test(readFileSync(path.join(root, 'app', file), 'utf8')));
    expect(withActions.length).toBeGreaterThan(8);
    for (const file of withActions) {
      const code = readFileSync(path.join(root, 'app', file), 'utf8');
      expect([file, code.startsWith("'use server';")]).toEqual([file, true]);
      const exported = [...code.matchAll(/^export (?:async )?(?:const|function|default) ?(\w*)(?: = (\w+))?/gm)];
      expect(exported.length).toBeGreaterThan(0);
      for (const [line, , maker] of exported) expect([file, line, maker]).toEqual([file, line, 'defineAction']);
    }
  });

  test('every route handler is made by defineHandler, but for next-auth’s own', () => {
    const routes = filesNamed('route.ts').filter((file) => !file.includes('[...nextauth]'));
    expect(routes.length).toBeGreaterThan(5);
    for (const file of routes) {
      const code = readFileSync(path.join(root, 'app', file), 'utf8');
      const exported = [...code.matchAll(/^export const (GET|POST|PUT|PATCH|DELETE)\b(?: = (\w+))?/gm)];
      expect([file, exported.length > 0]).toEqual([file, true]);
      for (const [line, , maker] of exported) expect([file, line, maker]).toEqual([file, line, 'defineHandler']);
      expect([file, /export (async )?function/.test(code)]).toEqual([file, false]);
    }
  });
});

describe('handlers', () => {
  const planOf = async (homeId: string) => {
    const { GET } = await import('@/app/api/homes/[homeId]/plan/route');
    return GET(new Request(`https://eavewright.example/api/homes/${homeId}/plan`), { params: Promise.resolve({ homeId }) });
  };

  test('answer 401 to whoever is signed out, 404 for a foreign home, the plan to a member', async () => {
    const { homeId, people } = scene();
    for (const [who, actor] of [['nobody', null], ...Object.entries(people)] as [string, Actor | null][]) {
      request.actor = actor;
      const response = await planOf(homeId);
      expect([who, response.status]).toEqual([who, actor === null ? 401 : who in memberships ? 200 : 404]);
      if (response.status !== 200) expect(response.headers.get('content-type')).toBe('application/problem+json');
    }
  });
});
