import { hash } from '@node-rs/argon2';
import { count } from 'drizzle-orm';
import { addDays, type CalendarDay, fromUtcDate, yearOf } from '../lib/calendar';
import { coatFound, sealFound } from '../lib/home/walkaround';
import { type Actor } from '../lib/permissions';
import { closeDatabase, database, transaction } from './client';
import { loadDotEnv } from './dot-env';
import { createHome } from './queries/homes';
import { replanHome } from './queries/replan';
import { shareHome } from './queries/sharing';
import { siteFor } from './queries/site';
import { addWall } from './queries/walls';
import { logWork } from './queries/work';
import { user } from './schema';
import { demoHomes, type SeedHome, type SeedWork } from './seed-homes';
import { demoPassword, demoPeople, demoSignIns } from './seed-people';

/** Fills an empty database with the invented scenario, through the same queries that the application uses. */
export async function seed(now: Date): Promise<void> {
  const passwordHash = await hash(demoPassword, { memoryCost: 19_456, timeCost: 2, parallelism: 1 });
  transaction(() => {
    const people = insertPeople(passwordHash, now);
    for (const home of demoHomes) seedHome(home, people, now);
  });
}

type People = Map<string, Actor>;

function insertPeople(passwordHash: string, now: Date): People {
  const rows = demoPeople.map(({ key, name, email, role, units, company }) => {
    const row = database().insert(user).values({ name, email, role, units, company: company ?? null, passwordHash, emailVerified: now }).returning().get();
    return [key, { id: row.id, role: row.role, email: row.email, name: row.name }] as const;
  });
  return new Map(rows);
}

const personIn = (people: People, key: string): Actor => {
  const actor = people.get(key);
  if (!actor) throw new Error(`the seed names nobody called ${key}`);
  return actor;
};

function seedHome(plan: SeedHome, people: People, now: Date) {
  const owner = personIn(people, plan.owner);
  const site = siteFor({ postalCode: plan.postalCode, elevationM: plan.elevationM });
  if (!site.found) throw new Error(`the seed's postal code ${plan.postalCode} has no place`);
  const { name, postalCode, elevationM, compassDeg, wood, sidingNominalIn, yearBuilt } = plan;
  const home = createHome(owner, { name, postalCode, elevationM, compassDeg, wood, sidingNominalIn, yearBuilt, ...site.site });
  const wallIds = plan.walls.map((wall, position) => addWall(owner, home.id, wall, position).id);
  for (const { who, membership } of plan.members) shareHome(owner, home.id, personIn(people, who).email, membership);
  const today = fromUtcDate(now);
  plan.work.forEach((work, index) => seedWork(work, index, home.id, wallIds, personIn(people, work.by), today));
  replanHome(home.id, now);
}

function seedWork(work: SeedWork, index: number, homeId: string, wallIds: string[], by: Actor, today: CalendarDay) {
  const planned: CalendarDay = `${yearOf(today) - work.yearsAgo}-${work.monthDay}`;
  const wallAt = (position: number) => wallIds[position] ?? [];
  const { kind, product, note, oldFilm } = work;
  const findings = Object.entries(work.seen ?? {}).flatMap(([position, answers]) => [wallAt(Number(position))].flat().map((wallId) => ({ wallId, answers, coat: coatFound(answers), seal: sealFound(answers) })));
  const done = {
    homeId,
    kind,
    doneOn: planned < today ? planned : addDays(today, -1),
    wallIds: work.walls.flatMap(wallAt),
    product,
    note,
    oldFilm,
    costCents: work.dollars === undefined ? undefined : work.dollars * 100,
    amountL: work.gallons === undefined ? undefined : work.gallons * 3.785411784,
    submissionKey: `seed:${homeId}:${index}`,
  };
  logWork(by, done, findings);
}

async function main() {
  loadDotEnv();
  const people = database().select({ people: count() }).from(user).get()?.people ?? 0;
  if (people > 0) {
    console.log('The database has people already: nothing was seeded.');
  } else {
    await seed(new Date());
    console.log(`Seeded. Everybody's password is ${demoPassword}`);
    for (const { who, email } of demoSignIns) console.log(`  ${email.padEnd(22)} ${who}`);
  }
  closeDatabase();
}

if (process.argv[1]?.endsWith('db/seed.ts')) {
  main().catch((error: unknown) => {
    console.error(error);
    process.exitCode = 1;
  });
}
