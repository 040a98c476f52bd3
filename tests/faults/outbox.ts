import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { closeDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { setEnvironment } from '@/tests/fixtures/environment';
import { startHarshSmtp } from '@/tests/fixtures/harsh-smtp';
import { fullSize, outboxFaults } from './outbox-faults';
import { type Outcome } from './outbox-scene';

/** Tries every fault of the outbox in full and prints what came of it. Ends with an error when a mail was lost or anything is strange. */
async function main() {
  const folder = mkdtempSync(path.join(tmpdir(), 'eavewright-faults-'));
  const base = path.join(folder, 'base.db');
  await migrateDatabase(base);
  setEnvironment({ MAIL_PER_RUN: '2000', MAIL_PER_SECOND: '400' });
  const bad: Outcome[] = [];
  process.stdout.write(`${'| fault | mails | sent | refused for good | copies with the same Message-ID | lost |\n| --- | --- | --- | --- | --- | --- |'}\n`);
  for (const [i, { name, duplicatesAllowed, run }] of outboxFaults.entries()) {
    if (process.argv[2] && !name.includes(process.argv[2])) continue;
    closeDatabase();
    process.env.DATABASE_FILE = path.join(folder, `${i}.db`);
    copyFileSync(base, process.env.DATABASE_FILE);
    const smtp = await startHarshSmtp();
    process.env.SMTP_URL = smtp.url;
    const outcome = await run(smtp, fullSize);
    await smtp.stop();
    process.stdout.write(`${`| ${name} | ${outcome.mails} | ${outcome.sent} | ${outcome.refused} | ${outcome.duplicates} | ${outcome.lost} |`}\n`);
    if (outcome.lost > 0 || outcome.strange.length > 0 || (outcome.duplicates > 0 && !duplicatesAllowed)) bad.push(outcome);
  }
  closeDatabase();
  rmSync(folder, { recursive: true, force: true });
  for (const { fault, strange } of bad) console.error(`${fault}: ${strange.slice(0, 5).join('; ') || 'lost or doubled'}`);
  process.exitCode = bad.length > 0 ? 1 : 0;
}

void main();
