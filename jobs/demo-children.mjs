// Processes of the demo. Each leads its own process group, so that stopping one also stops what it started.
import { spawn } from 'node:child_process';
import path from 'node:path';
import { createInterface } from 'node:readline';

const running = new Map();
let stopping = false;
let watch;

const signalGroup = (pid, signal) => {
  try {
    process.kill(-pid, signal);
  } catch {
    // Already gone.
  }
};

function tellWatch(line) {
  if (!watch) {
    watch = spawn(process.execPath, [path.join(import.meta.dirname, 'demo-watch.mjs')], { detached: true, stdio: ['pipe', 'ignore', 'ignore'] });
    for (const end of [watch, watch.stdin]) end.on('error', () => undefined);
  }
  watch.stdin.write(`${line}\n`);
}

/** Starts a process; resolves `ended` with the words for how it ended, null when all went well. */
function start(args, { cwd, env }, output) {
  const child = spawn(process.execPath, args, { cwd, env, detached: true, stdio: ['ignore', ...output] });
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message));
    child.once('close', (code, signal) => resolve(code === 0 ? null : (signal ?? `code ${code}`)));
  });
  if (child.pid) {
    const { pid } = child;
    running.set(pid, ended);
    tellWatch(`+${pid}`);
    child.once('exit', () => {
      signalGroup(pid, 'SIGTERM');
      tellWatch(`-${pid}`);
      running.delete(pid);
    });
  }
  return { child, ended };
}

/** Runs one step to its end and returns what it printed when `capture` is set. Throws when it fails. */
export async function step(name, args, { capture = false, ...options }) {
  const { child, ended } = start(args, options, [capture ? 'pipe' : 'inherit', 'inherit']);
  let printed = '';
  child.stdout?.on('data', (chunk) => (printed += chunk));
  const fault = await ended;
  if (fault) throw new Error(`${name} failed (${fault}).`);
  return printed;
}

/** Starts a process that is meant to stay; `onEnd` hears when it ends by itself. */
export function keep(name, args, options, onEnd) {
  const { child } = start(args, options, ['pipe', 'pipe']);
  for (const stream of [child.stdout, child.stderr]) createInterface({ input: stream }).on('line', (line) => console.log(`[${name}] ${line}`));
  child.once('exit', (code, signal) => {
    if (!stopping) onEnd(`${name} stopped by itself (${signal ?? `code ${code}`}).`);
  });
}

/** Ends every child and what it started: politely, and after eight seconds by force. */
export async function stopAll() {
  stopping = true;
  const children = [...running];
  for (const [pid] of children) signalGroup(pid, 'SIGTERM');
  const force = setTimeout(() => children.forEach(([pid]) => signalGroup(pid, 'SIGKILL')), 8000);
  await Promise.all(children.map(([, ended]) => ended));
  clearTimeout(force);
  for (const [pid] of children) signalGroup(pid, 'SIGKILL');
}
