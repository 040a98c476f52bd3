// Builds the application unless the last build was made from the same sources. Plain Node, no packages.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';

const root = path.resolve(import.meta.dirname, '..');
const sources = ['app', 'components', 'db', 'jobs', 'lib', 'public', 'package-lock.json', 'next.config.mjs', 'tailwind.config.ts', 'postcss.config.mjs', 'tsconfig.json', 'instrumentation.ts', 'proxy.ts'];
const stamp = path.join(root, '.next', 'built-from');

function* filesBelow(entry) {
  const full = path.join(root, entry);
  if (!existsSync(full)) return;
  const children = readdirSync(full, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1));
  for (const child of children) {
    const inner = path.join(entry, child.name);
    if (child.isDirectory()) yield* filesBelow(inner);
    else yield inner;
  }
}

function fingerprint() {
  const hash = createHash('sha256');
  for (const source of sources) {
    const isFile = path.extname(source) !== '';
    for (const file of isFile ? [source] : filesBelow(source)) {
      if (existsSync(path.join(root, file))) hash.update(file).update('\0').update(readFileSync(path.join(root, file))).update('\0');
    }
  }
  return hash.digest('hex');
}

/** Returns false when the build failed. */
export function buildIfChanged(env = process.env) {
  const wanted = fingerprint();
  const isBuilt = existsSync(path.join(root, '.next', 'BUILD_ID')) && existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted;
  if (isBuilt) {
    console.log('The application is built already.');
    return true;
  }
  const next = path.join(root, 'node_modules', 'next', 'dist', 'bin', 'next');
  const built = spawnSync(process.execPath, [next, 'build'], { cwd: root, stdio: ['ignore', 'inherit', 'inherit'], env: { ...env, NEXT_TELEMETRY_DISABLED: '1' } });
  if (built.status !== 0) return false;
  mkdirSync(path.dirname(stamp), { recursive: true });
  writeFileSync(stamp, wanted);
  return true;
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) process.exit(buildIfChanged() ? 0 : 1);
