import { spawn } from 'node:child_process';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';

const root = path.resolve(import.meta.dirname, '..', '..');
const script = path.join('tests', 'fixtures', 'fault-run.ts');

export type ChildRun = { at: Date; killAfterMs?: number; jumpMs?: number; largestFileKb?: number };

/** A reminder run in a process of its own; killed (SIGKILL) some time after it has begun, or short of disk, if so told. */
export async function childRun({ at, killAfterMs, jumpMs = 0, largestFileKb }: ChildRun): Promise<void> {
  const node = [process.execPath, '--import', 'tsx', script, at.toISOString(), String(jumpMs)];
  const [command = '', ...args] = largestFileKb === undefined ? node : ['bash', '-c', `ulimit -f ${largestFileKb}; exec "$@"`, 'bash', ...node];
  const child = spawn(command, args, { cwd: root, env: process.env, stdio: ['ignore', 'pipe', 'ignore'] });
  const ended = new Promise<void>((resolve) => child.once('close', () => resolve()));
  if (killAfterMs !== undefined) {
    await Promise.race([new Promise<void>((resolve) => child.stdout.once('data', () => resolve())), ended]);
    await pause(killAfterMs);
    child.kill('SIGKILL');
  } else {
    child.stdout.resume();
  }
  await ended;
}
