import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createTransport } from 'nodemailer';
import { closeDatabase, database } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { enqueueMail } from '@/db/queries/mail';
import { transaction } from '@/db/queries/transaction';
import { mail } from '@/db/schema';
import { deliverDue } from '@/jobs/deliver';
import { connections } from '@/jobs/transport';
import { renderMail } from '@/lib/mail/registry';
import { setEnvironment } from '@/tests/fixtures/environment';
import { startHarshSmtp } from '@/tests/fixtures/harsh-smtp';

const n = 2000;
const from = '"Eavewright" <reminders@eavewright.example>';
const props = { homeName: 'Cabin', place: null, byName: 'Ada', membership: 'caretaker' as const, url: 'https://eavewright.example/homes/h1' };
const at = new Date('2027-05-15T18:00:00Z');

/** A pool of the mail library by itself, handed the same messages. */
async function bare(url: string): Promise<number> {
  const rows = database().select().from(mail).all();
  const pool = createTransport({ pool: true, maxConnections: connections, maxMessages: Infinity, url });
  const start = performance.now();
  await Promise.all(rows.map((row) => pool.sendMail({ from, to: row.toAddress, messageId: row.messageId, headers: { 'Auto-Submitted': 'auto-generated' }, ...renderMail(row.kind, row.props) })));
  pool.close();
  return performance.now() - start;
}

async function ours(): Promise<number> {
  const start = performance.now();
  const { sent } = await deliverDue(at);
  if (sent !== n) throw new Error(`${sent} sent`);
  return performance.now() - start;
}

function refill() {
  transaction(() => {
    database().delete(mail).run();
    for (let i = 0; i < n; i += 1) enqueueMail({ kind: 'shared', idempotencyKey: `m${i}`, toAddress: `m${i}@example.test`, props, now: at });
  });
}

async function main() {
  if (process.argv[2] === 'serve') {
    const smtp = await startHarshSmtp();
    return void process.stdout.write(smtp.url);
  }
  const server = spawn(process.execPath, ['--import', 'tsx', import.meta.filename, 'serve'], { stdio: ['ignore', 'pipe', 'inherit'] });
  const url = await new Promise<string>((resolve) => server.stdout.once('data', (said) => resolve(String(said))));
  const folder = mkdtempSync(path.join(tmpdir(), 'eavewright-bench-'));
  process.env.DATABASE_FILE = path.join(folder, 'mail.db');
  await migrateDatabase(process.env.DATABASE_FILE);
  setEnvironment({ SMTP_URL: url, MAIL_PER_RUN: '1000000', MAIL_PER_SECOND: '10000' });
  const times: { bare: number[]; ours: number[] } = { bare: [], ours: [] };
  for (let round = 0; round < 3; round += 1) {
    refill();
    times.bare.push(await bare(url));
    times.ours.push(await ours());
  }
  const best = { bare: Math.min(...times.bare), ours: Math.min(...times.ours) };
  process.stdout.write(`${JSON.stringify(times)}\nmails a second: outbox ${Math.round((n / best.ours) * 1000)}, the mail library by itself ${Math.round((n / best.bare) * 1000)}; ratio ${(best.bare / best.ours).toFixed(2)} (at least 0.8)\n`);
  closeDatabase();
  rmSync(folder, { recursive: true, force: true });
  server.kill();
}

void main();
