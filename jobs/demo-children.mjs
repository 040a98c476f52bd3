// Processes of the demo. Each leads its own process group, so that stopping one also stops what it started.
import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';

const running = new Map();
let stopping = false;

function start(name, args, { cwd, env, prefix }) {
  const child = spawn(process.execPath, args, { cwd, env, detached: true, stdio: ['ignore', prefix ? 'pipe' : 'inherit', prefix ? 'pipe' : 'inherit'] });
  running.set(child, name);
  child.once('exit', () => running.delete(child));
  if (prefix) {
    for (const stream of [child.stdout, child.stderr]) createInterface({ input: stream }).on('line', (line) => console.log(`[${name}] ${line}`));
  }
  return child;
}

/** Runs one step to its end; rejects when it fails. Resolves to what it printed when `capture` is set. */
export function step(name, args, { cwd, env, capture = false }) {
  return new Promise((resolve, reject) => {
    const child = capture
      ? spawn(process.execPath, args, { cwd, env, detached: true, stdio: ['ignore', 'pipe', 'inherit'] })
      : start(name, args, { cwd, env });
    running.set(child, name);
    let printed = '';
    child.stdout?.on('data', (chunk) => (printed += chunk));
    child.once('error', reject);
    child.once('close', (code, signal) => {
      running.delete(child);
      if (code === 0) resolve(printed);
      else reject(new Error(`${name} failed (${signal ?? `code ${code}`}).`));
    });
  });
}

/** Starts a process that is meant to stay; `onEnd` hears when it ends by itself. */
export function keep(name, args, options, onEnd) {
  const child = start(name, args, { ...options, prefix: true });
  child.once('error', (error) => onEnd(`${name} did not start: ${error.message}`));
  child.once('exit', (code, signal) => {
    if (!stopping) onEnd(`${name} stopped by itself (${signal ?? `code ${code}`}).`);
  });
}

const signalGroup = (child, signal) => {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // Already gone.
  }
};

/** Ends every child and what it started: politely, and after eight seconds by force. */
export async function stopAll() {
  stopping = true;
  const children = [...running.keys()];
  const ended = Promise.all(children.map((child) => new Promise((resolve) => (child.exitCode !== null || child.signalCode ? resolve() : child.once('exit', resolve)))));
  for (const child of children) signalGroup(child, 'SIGTERM');
  const force = setTimeout(() => children.forEach((child) => signalGroup(child, 'SIGKILL')), 8000);
  await ended;
  clearTimeout(force);
  for (const child of children) signalGroup(child, 'SIGKILL');
}
