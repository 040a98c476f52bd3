// npm run demo: installs, migrates, seeds, builds and runs the application with a mail fake and the scheduler. Plain Node.
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, realpathSync, statSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import net from 'node:net';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { keep, step, stopAll } from './demo-children.mjs';
import { releaseLock, takeLock, writeAddress } from './demo-lock.mjs';

const root = path.resolve(import.meta.dirname, '..');
const data = path.join(root, 'data');
const lock = path.join(data, 'demo.lock');
const tsx = path.join('node_modules', 'tsx', 'dist', 'cli.mjs');
const next = path.join('node_modules', 'next', 'dist', 'bin', 'next');

let ending = false;
async function end(code, words) {
  if (ending) return;
  ending = true;
  if (words) console.log(`\n${words}`);
  await stopAll();
  releaseLock(lock);
  process.exit(code);
}

/** A signal sent to npm alone does not reach this process: notice that the parent is gone. */
function endWithNpm() {
  const parent = process.ppid;
  if (!process.env.npm_lifecycle_event) return;
  setInterval(() => {
    if (process.ppid !== parent) void end(0, 'npm was stopped: stopping the demo.');
  }, 500).unref();
}

const isFree = (port, host) =>
  new Promise((resolve) => {
    const probe = net.createServer().once('error', () => resolve(false));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)));
  });

async function freePort(wanted, what) {
  for (let port = wanted; port < wanted + 100; port += 1) {
    if ((await isFree(port, undefined)) && (await isFree(port, '127.0.0.1'))) {
      if (port !== wanted) console.log(`Port ${wanted} is taken: ${what} uses ${port}.`);
      return port;
    }
  }
  throw new Error(`No free port between ${wanted} and ${wanted + 99} for ${what}.`);
}

async function install() {
  const mark = path.join(root, 'node_modules', '.package-lock.json');
  if (existsSync(mark) && statSync(mark).mtimeMs >= statSync(path.join(root, 'package-lock.json')).mtimeMs) return;
  console.log('Installing packages (about a minute)…');
  const npm = process.env.npm_execpath ?? (process.env.PATH ?? '').split(path.delimiter).map((folder) => path.join(folder, 'npm')).find((file) => existsSync(file));
  if (!npm) throw new Error('npm was not found; it comes with Node.js.');
  await step('Installing packages', [realpathSync(npm), 'ci', '--no-audit', '--no-fund'], { cwd: root, env: process.env });
}

/** Secrets are made once and kept in data/demo.env; addresses are decided at each start. */
function demoEnvironment(appPort, mailPort) {
  const file = path.join(data, 'demo.env');
  if (!existsSync(file)) {
    const secret = () => randomBytes(32).toString('base64url');
    const lines = [`NEXTAUTH_SECRET=${secret()}`, `CRON_SECRET=${secret()}`, 'DATABASE_FILE=data/demo.db', 'MAILBOX_DIR=data/mailbox', 'MAIL_FROM=Eavewright <reminders@eavewright.example>'];
    writeFileSync(file, `${lines.join('\n')}\n`, { mode: 0o600 });
  }
  const kept = readFileSync(file, 'utf8').split('\n').flatMap((line) => (/^[A-Z_]+=/.test(line) ? [[line.slice(0, line.indexOf('=')), line.slice(line.indexOf('=') + 1).trim()]] : []));
  return {
    ...process.env,
    ...Object.fromEntries(kept),
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    NEXTAUTH_URL: `http://localhost:${appPort}`,
    SMTP_URL: `smtp://127.0.0.1:${mailPort}`,
  };
}

function hasUser(env) {
  const Database = createRequire(import.meta.url)('better-sqlite3');
  const db = new Database(path.resolve(root, env.DATABASE_FILE), { readonly: true });
  try {
    return db.prepare('select exists (select 1 from user)').pluck().get() === 1;
  } finally {
    db.close();
  }
}

async function answers(address) {
  for (let tries = 0; tries < 240 && !ending; tries += 1) {
    const response = await fetch(address, { redirect: 'manual' }).catch(() => null);
    if (response && response.status < 500) return;
    if (response) throw new Error(`The application answers with ${response.status}.`);
    await pause(250);
  }
  if (!ending) throw new Error('The application did not answer within a minute.');
}

const print = (address, mailPort, people) => {
  const width = Math.max(...people.map(({ email }) => email.length));
  console.log(`\nEavewright runs at ${address}\n\nSign in as`);
  for (const { who, email, password } of people) console.log(`  ${email.padEnd(width)}  ${password}  ${who}`);
  console.log(`\nMail goes to the mail fake (port ${mailPort}); read it as the operator at ${address}/operator/mailbox.`);
  console.log('Ctrl-C ends everything.\n');
};

async function main() {
  mkdirSync(data, { recursive: true });
  const other = takeLock(lock);
  if (other) {
    console.log(other.address ? `The demo is already running at ${other.address}.` : `The demo is already starting (process ${other.pid}).`);
    process.exit(0);
  }
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0, 'Stopping the demo.'));
  endWithNpm();
  await install();
  const appPort = await freePort(Number(process.env.PORT) || 3000, 'the application');
  const mailPort = await freePort(2525, 'the mail fake');
  const env = demoEnvironment(appPort, mailPort);
  const at = { cwd: root, env };
  await step('Migrating the database', [tsx, 'db/migrate.ts'], at);
  if (!hasUser(env)) await step('Filling in the demo', [tsx, 'db/seed.ts'], at);
  await step('Building', ['jobs/build-if-changed.mjs'], at);
  const people = JSON.parse(await step('Reading the sign-ins', [tsx, '--eval', "import { demoSignIns } from './db/seed-people'; console.log(JSON.stringify(demoSignIns));"], { ...at, capture: true }));
  const onEnd = (words) => void end(1, `${words} Stopping everything.`);
  keep('mail', [tsx, 'jobs/mailbox.ts'], at, onEnd);
  keep('app', [next, 'start', '--hostname', 'localhost', '--port', String(appPort)], at, onEnd);
  await answers(env.NEXTAUTH_URL);
  if (ending) return;
  keep('scheduler', [tsx, 'jobs/scheduler.ts'], at, onEnd);
  writeAddress(lock, env.NEXTAUTH_URL);
  print(env.NEXTAUTH_URL, mailPort, people);
}

main().catch((error) => end(1, error instanceof Error ? error.message : String(error)));
