import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';
import { database } from '@/db/client';
import { homeView } from '@/db/queries/home-view';
import { createHome } from '@/db/queries/homes';
import { changeHome, replanHome, replanLapsed } from '@/db/queries/replan';
import { siteFor } from '@/db/queries/site';
import { addWall, updateWall } from '@/db/queries/walls';
import { home, wallExposure } from '@/db/schema';
import { type Actor } from '@/lib/permissions';
import { actorOf, insertUser } from '../fixtures/home';
import { useFreshDatabase } from '../setup/fresh-database';

useFreshDatabase();

const wall = { name: 'South', azimuthDeg: 180, widthM: 9, heightM: 2.7, openings: [], stained: '2024-06-10', caulked: '2024-06-10' };
const now = new Date('2026-12-01T18:00:00Z');

function newHome(owner: Actor, name: string): { homeId: string; wallId: string } {
  const site = siteFor({ postalCode: '59715' });
  if (!site.found) throw new Error('no place');
  const row = createHome(owner, { name, postalCode: '59715', ...site.site });
  const { id } = addWall(owner, row.id, wall);
  replanHome(row.id, now);
  return { homeId: row.id, wallId: id };
}

const exposureOf = (wallId: string) => database().select().from(wallExposure).where(eq(wallExposure.wallId, wallId)).get();
const revisionOf = (homeId: string) => database().select().from(home).where(eq(home.id, homeId)).get()?.revision;

test('the sun is worked out when what it depends on changes, and only then', () => {
  const owner = actorOf(insertUser());
  const { homeId, wallId } = newHome(owner, 'One');
  const before = exposureOf(wallId);
  const later = new Date('2026-12-02T18:00:00Z');
  changeHome(homeId, later, () => updateWall(owner, wallId, { ...wall, name: 'Renamed' }));
  expect(exposureOf(wallId)).toEqual(before);
  changeHome(homeId, later, () => updateWall(owner, wallId, { ...wall, eaveDepthM: 2 }));
  expect(exposureOf(wallId)?.doseKwhM2).toBeLessThan(before?.doseKwhM2 ?? 0);
  expect(exposureOf(wallId)?.computedAt).toEqual(later);
  expect(revisionOf(homeId)).toBe(3);
});

test('a change that fails leaves nothing behind', () => {
  const owner = actorOf(insertUser());
  const { homeId, wallId } = newHome(owner, 'One');
  const before = homeView(owner, homeId);
  expect(() =>
    changeHome(homeId, now, () => {
      updateWall(owner, wallId, { ...wall, widthM: 20 });
      throw new Error('half way');
    }),
  ).toThrow('half way');
  expect(homeView(owner, homeId)).toEqual(before);
});

test('a lapsed plan is made anew, and one home that cannot be planned does not hold up the next', () => {
  const owner = actorOf(insertUser());
  const broken = newHome(owner, 'Broken');
  const sound = newHome(owner, 'Sound');
  database().update(home).set({ stationId: 'none' }).where(eq(home.id, broken.homeId)).run();
  const muchLater = new Date('2033-03-01T18:00:00Z');
  const before = homeView(owner, sound.homeId).walls[0]?.items;
  expect(() => replanLapsed(muchLater)).toThrow(/1 of 2 homes/);
  const after = homeView(owner, sound.homeId).walls[0]?.items;
  expect(after).not.toEqual(before);
  for (const item of after ?? []) expect(item.lapsesOn === null || item.lapsesOn > '2033-03-01').toBe(true);
  database().update(home).set({ archivedAt: muchLater }).where(eq(home.id, broken.homeId)).run();
  expect(replanLapsed(muchLater)).toBe(0);
});
