// Builds the application if its sources changed, then serves it with a fresh seeded database and the mail fake, until it is told to stop.
import { spawn, spawnSync } from 'node:child_process';
import { mkdirSync, rmSync } from 'node:fs';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '..', '..');
const folder = path.join(root, 'tests', '.out', 'e2e');
const port = process.env.E2E_PORT ?? '3199';
const bin = (name) => path.join(root, 'node_modules', '.bin', name);

const env = {
  ...process.env,
  NODE_ENV: 'production',
  NEXT_TELEMETRY_DISABLED: '1',
  DATABASE_FILE: path.join(folder, 'e2e.db'),
  MAILBOX_DIR: path.join(folder, 'mailbox'),
  NEXTAUTH_URL: `http://localhost:${port}`,
  NEXTAUTH_SECRET: 'a secret that only the browser tests ever use',
  CRON_SECRET: 'cron secret of the browser tests',
  SMTP_URL: `smtp://127.0.0.1:${Number(port) + 1}`,
  MAIL_FROM: '"Eavewright" <reminders@eavewright.example>',
};

rmSync(folder, { recursive: true, force: true });
mkdirSync(env.MAILBOX_DIR, { recursive: true });

const must = (command, args) => {
  const done = spawnSync(command, args, { cwd: root, env, stdio: ['ignore', 'inherit', 'inherit'] });
  if (done.status !== 0) process.exit(done.status ?? 1);
};

must(process.execPath, ['jobs/build-if-changed.mjs']);
must(bin('tsx'), ['db/migrate.ts']);
must(bin('tsx'), ['db/seed.ts']);

const children = [
  spawn(bin('tsx'), ['jobs/mailbox.ts'], { cwd: root, env, stdio: 'inherit' }),
  spawn(process.execPath, ['node_modules/next/dist/bin/next', 'start', '--port', port], { cwd: root, env, stdio: 'inherit' }),
];
const stop = () => {
  for (const child of children) child.kill('SIGTERM');
  setTimeout(() => process.exit(0), 1500).unref();
};
process.on('SIGTERM', stop);
process.on('SIGINT', stop);
