import { execFileSync } from 'node:child_process';
import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { closeDatabase } from '@/db/client';
import { homeView } from '@/db/queries/home-view';
import { listHomes } from '@/db/queries/homes';
import { runReminders } from '@/jobs/reminders';
import { type Actor } from '@/lib/permissions';
import { setEnvironment } from '@/tests/fixtures/environment';
import { days, duePerDay, manyHomes } from './many-homes';

type Measured = { queued: number[]; runMs: number; viewMs: number; listMs: number; peakMb: number };

const median = (values: number[]) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? NaN;

function timesOf(n: number, work: () => unknown): number {
  const once = () => {
    const from = performance.now();
    work();
    return performance.now() - from;
  };
  for (let i = 0; i < 20; i += 1) once();
  return median(Array.from({ length: n }, once));
}

/** In a process of its own: pages of one owner, then one reminder run for each of three days. */
async function measure(file: string): Promise<Measured> {
  const folder = mkdtempSync(path.join(tmpdir(), 'eavewright-bench-'));
  process.env.DATABASE_FILE = path.join(folder, 'homes.db');
  copyFileSync(file, process.env.DATABASE_FILE);
  const owner: Actor = { id: 'u50', role: 'homeowner', email: 'owner50@example.test', name: null };
  const viewMs = timesOf(200, () => homeView(owner, 'h50'));
  const listMs = timesOf(200, () => listHomes(owner));
  const runs: number[] = [];
  const queued: number[] = [];
  for (const day of days) {
    const from = performance.now();
    const { mails } = await runReminders(new Date(`${day}T18:00:00Z`), { deliver: false });
    runs.push(performance.now() - from);
    queued.push(mails);
  }
  closeDatabase();
  rmSync(folder, { recursive: true, force: true });
  return { queued, runMs: Math.min(...runs), viewMs, listMs, peakMb: process.resourceUsage().maxRSS / 1024 };
}

const inChild = (file: string): Measured =>
  JSON.parse(execFileSync(process.execPath, ['--import', 'tsx', import.meta.filename, file], { encoding: 'utf8', env: process.env })) as Measured;

async function main() {
  setEnvironment();
  const file = process.argv[2];
  if (file) return void process.stdout.write(JSON.stringify(await measure(file)));
  const files = [await manyHomes(100), await manyHomes(10_000), await manyHomes(100_000)];
  const [few, some, many] = files.map(inChild);
  if (!few || !some || !many) throw new Error('nothing measured');
  if (some.queued.join() !== many.queued.join() || !some.queued.includes(duePerDay)) throw new Error(`not the same number due: ${JSON.stringify([some, many])}`);
  const line = (what: string, value: number, most: string) => process.stdout.write(`${what}: ${value.toFixed(2)} (${most})\n`);
  process.stdout.write(`${JSON.stringify({ few, some, many }, null, 1)}\n`);
  line('reminder run, 100,000 homes against 10,000, the same number due', many.runMs / some.runMs, 'at most 1.5');
  line('peak memory of it in MB, difference', many.peakMb - some.peakMb, 'flat');
  line('one home, 100,000 homes against 100', many.viewMs / few.viewMs, 'at most 1.5');
  line('list of one owner’s homes, 100,000 homes against 100', many.listMs / few.listMs, 'at most 1.5');
}

void main();
