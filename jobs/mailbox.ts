import { randomBytes } from 'node:crypto';
import { mkdirSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { SMTPServer } from 'smtp-server';
import { environment } from './environment';

const loopback = ['127.0.0.1', 'localhost', '[::1]', '::1'];
let kept = 0;

/** Keeps one message: written beside its place first, so that a reader never sees half of it. Names sort by time. */
export function keepMessage(folder: string, message: Buffer, at: Date): string {
  const name = `${at.toISOString().replace(/[:.]/g, '-')}-${String((kept += 1) % 1_000_000).padStart(6, '0')}-${randomBytes(3).toString('hex')}.eml`;
  const unfinished = path.join(folder, `.${name}.part`);
  writeFileSync(unfinished, message);
  renameSync(unfinished, path.join(folder, name));
  return name;
}

/** The local mail fake: takes every message on the loopback address and keeps it as an .eml file. Resolves when it listens. */
export function startMailbox(options: { host: string; port: number; folder: string }): Promise<{ port: number; stop: () => Promise<void> }> {
  if (!loopback.includes(options.host)) throw new Error(`The mail fake listens on this machine only, not on ${options.host}.`);
  mkdirSync(options.folder, { recursive: true });
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: 10_000_000,
    onData(stream, _session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        try {
          if (stream.sizeExceeded) return done(Object.assign(new Error('Message too large'), { responseCode: 552 }));
          keepMessage(options.folder, Buffer.concat(chunks), new Date());
          done();
        } catch (error) {
          done(Object.assign(new Error(`Not kept: ${String(error)}`), { responseCode: 451 }));
        }
      });
    },
  });
  // A client that drops its connection is no fault of ours; trouble with listening rejects below.
  server.on('error', () => undefined);
  return new Promise((resolve, reject) => {
    server.server.once('error', reject);
    const listening = server.listen(options.port, options.host.replace(/[[\]]/g, ''), () => {
      const address = listening.address();
      resolve({
        port: typeof address === 'object' && address ? address.port : options.port,
        stop: () => new Promise((stopped) => server.close(() => stopped())),
      });
    });
  });
}

async function main() {
  const { SMTP_URL, MAILBOX_DIR } = environment();
  if (!MAILBOX_DIR) throw new Error('MAILBOX_DIR is not set: there is no folder to keep mail in.');
  const url = new URL(SMTP_URL);
  const { port, stop } = await startMailbox({ host: url.hostname, port: Number(url.port || 25), folder: path.resolve(MAILBOX_DIR) });
  console.log(`Mail fake: smtp://${url.hostname}:${port}, keeping messages in ${MAILBOX_DIR}`);
  const end = () => void stop().then(() => process.exit(0));
  process.on('SIGTERM', end);
  process.on('SIGINT', end);
}

if (process.argv[1]?.endsWith('jobs/mailbox.ts')) {
  main().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}
