// One demo at a time: a lock file that names the process and, once it answers, its address.
import { execFileSync } from 'node:child_process';
import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';

const read = (file) => {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
};

/** True when the process of the lock still runs and is a demo: a process number may have been given to something else since. */
function isRunning({ pid }) {
  try {
    process.kill(pid, 0);
    return execFileSync('ps', ['-p', String(pid), '-o', 'command='], { encoding: 'utf8', stdio: ['ignore', 'pipe', 'ignore'] }).includes('demo.mjs');
  } catch (error) {
    // Without `ps` the process number alone decides.
    return error.code === 'ENOENT' || error.code === 'EPERM';
  }
}

/** Takes the lock and returns null, or returns what the running demo wrote into it. A lock left by a process that is gone is cleared away. */
export function takeLock(file) {
  const own = `${file}.${process.pid}`;
  writeFileSync(own, JSON.stringify({ pid: process.pid, address: null }));
  try {
    for (let attempt = 0; attempt < 5; attempt += 1) {
      try {
        linkSync(own, file);
        return null;
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const holder = read(file);
      if (holder && isRunning(holder)) return holder;
      clearStale(file, holder, own);
    }
    throw new Error(`The lock ${file} could not be taken. Delete it when no demo runs.`);
  } finally {
    rmSync(own, { force: true });
  }
}

/** Moves the stale lock away first: if somebody took the lock in between, theirs is put back. */
function clearStale(file, holder, own) {
  const aside = `${own}.stale`;
  try {
    renameSync(file, aside);
  } catch {
    return;
  }
  const moved = read(aside);
  if (moved && moved.pid !== holder?.pid) {
    try {
      linkSync(aside, file);
    } catch {
      // A third process has taken it: its lock stands.
    }
  }
  rmSync(aside, { force: true });
}

export function writeAddress(file, address) {
  const next = `${file}.${process.pid}`;
  writeFileSync(next, JSON.stringify({ pid: process.pid, address }));
  renameSync(next, file);
}

export function releaseLock(file) {
  if (read(file)?.pid === process.pid) rmSync(file, { force: true });
}
