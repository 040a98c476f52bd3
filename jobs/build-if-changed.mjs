// Builds the application when its sources changed since the last build. Plain Node; needs the packages to be installed.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '..');
const mark = path.join(root, '.next', 'built-from');
const folders = ['app', 'components', 'lib', 'db', 'jobs', 'public'];

function* filesUnder(folder) {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const full = path.join(folder, entry.name);
    if (entry.isDirectory()) yield* filesUnder(full);
    else if (entry.isFile()) yield full;
  }
}

function fingerprint() {
  const loose = readdirSync(root, { withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.(m?[jt]s|json)$/.test(entry.name) && entry.name !== 'next-env.d.ts')
    .map((entry) => path.join(root, entry.name));
  const files = [...loose, ...folders.map((name) => path.join(root, name)).filter((full) => existsSync(full)).flatMap((full) => [...filesUnder(full)])];
  const hash = createHash('sha256').update(process.version);
  for (const file of files.sort()) hash.update(`\0${path.relative(root, file)}\0`).update(readFileSync(file));
  return hash.digest('hex');
}

const now = fingerprint();
const built = existsSync(path.join(root, '.next', 'BUILD_ID')) && existsSync(mark) ? readFileSync(mark, 'utf8') : '';
if (built === now) {
  console.log('Build: nothing changed since the last one.');
} else {
  console.log('Build: sources changed, building (about half a minute)…');
  const done = spawnSync(process.execPath, [path.join('node_modules', 'next', 'dist', 'bin', 'next'), 'build'], {
    cwd: root,
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
  });
  if (done.status !== 0) process.exit(done.status ?? 1);
  writeFileSync(mark, now);
}
