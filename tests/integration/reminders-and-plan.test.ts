import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { createHome } from '@/db/queries/homes';
import { changeHome, replanHome } from '@/db/queries/replan';
import { siteFor } from '@/db/queries/site';
import { logWork, removeRecord } from '@/db/queries/work';
import { runReminders } from '@/jobs/reminders';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { setEnvironment } from '@/tests/fixtures/environment';
import { actorOf, allWorkItems, insertFourWalls, insertUser } from '@/tests/fixtures/home';
import { startSmtp, type TestSmtp } from '@/tests/fixtures/smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

setEnvironment();
useFreshDatabase();

let smtp: TestSmtp;
beforeAll(async () => void (smtp = await startSmtp()));
afterAll(() => smtp.stop());
beforeEach(() => smtp.received.splice(0));

const noon = (day: string) => new Date(`${day}T18:00:00Z`);
const run = (day: string) => runReminders(noon(day), { transport: smtp.transport });

/** A real home in Montana whose coat of 2024 is used up on every wall by the summer of 2027; the plan itself is checked elsewhere. */
function oldHome() {
  const owner = actorOf(insertUser({ name: 'Ada' }));
  const site = siteFor({ postalCode: '59715' });
  if (!site.found) throw new Error('the postal code of the test has no place');
  const home = createHome(owner, { name: 'Spring Creek', postalCode: '59715', ...site.site });
  const wallIds = insertFourWalls(home).map((one) => one.id);
  const log = (kind: WorkKind, doneOn: string, walls = wallIds) =>
    logWork(owner, { homeId: home.id, kind, doneOn, wallIds: walls, submissionKey: `${kind} ${doneOn} ${walls.join()}` } as Parameters<typeof logWork>[1]).record;
  log('restain', '2024-06-15');
  log('recaulk', '2024-06-10');
  replanHome(home.id, noon('2027-05-20'));
  const logged = (kind: WorkKind, doneOn: string, walls?: string[]) => changeHome(home.id, noon(doneOn), () => log(kind, doneOn, walls));
  return { owner, home, wallIds, logged };
}

/** Kinds of work that the last mail speaks of, with the walls it names under each. */
const said = () => smtp.received.at(-1)?.text ?? '';

describe('reminders on a real plan', () => {
  it('speak of every wall of an old coat, once', async () => {
    oldHome();
    expect(await run('2027-05-20')).toMatchObject({ mails: 1, sent: 1 });
    expect(said().match(/^Restain: /gm)).toHaveLength(4);
    expect(await run('2027-05-20')).toMatchObject({ mails: 0, sent: 0 });
    expect(await run('2027-05-21')).toMatchObject({ mails: 0, sent: 0 });
  });

  it('fall silent about a wall whose work was logged', async () => {
    const { wallIds, logged } = oldHome();
    logged('restain', '2027-05-20', wallIds.slice(0, 3));
    await run('2027-05-20');
    expect(said().match(/^Restain: /gm)).toHaveLength(1);
    expect(said().slice(said().indexOf('\nWest (')).startsWith('\nWest (270 ft²)\n')).toBe(true);
    expect(said().indexOf('Restain: ')).toBeGreaterThan(said().indexOf('\nWest ('));
  });

  it('fall silent about a home where everything was logged, for months', async () => {
    const { logged } = oldHome();
    await run('2027-05-20');
    for (const kind of ['recaulk', 'restain', 'wash', 'walkaround'] as const) logged(kind, '2027-05-21');
    const before = smtp.received.length;
    for (const day of ['2027-05-21', '2027-05-22', '2027-06-30', '2027-08-15']) expect(await run(day)).toMatchObject({ mails: 0 });
    expect(smtp.received).toHaveLength(before);
    for (const item of allWorkItems()) expect(item.dueOn > '2027-08-15').toBe(true);
  });

  it('come back when the logged work is taken back, without saying again what was said', async () => {
    const { owner, home, logged } = oldHome();
    await run('2027-05-20');
    const record = logged('restain', '2027-05-21');
    await run('2027-05-21');
    changeHome(home.id, noon('2027-05-22'), () => removeRecord(owner, record.id, noon('2027-05-22')));
    expect(await run('2027-05-22')).toMatchObject({ mails: 0, deliveries: 0 });
    expect(smtp.received).toHaveLength(1);
    expect((await run('2028-01-15')).deliveries).toBeGreaterThan(0);
  });
});
