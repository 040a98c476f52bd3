// Runs the project's checks in order and closes with "N passed, N failed". Plain Node: it must start before anything is installed.
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import { createServer } from 'node:net';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '..', '..');
const out = path.join(root, 'tests', '.out');
const withBrowser = !process.argv.includes('--without-browser');
process.env.NEXT_TELEMETRY_DISABLED = '1';

const run = (command, args, env = {}) =>
  spawnSync(command, args, { cwd: root, stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, ...env } }).status ?? 1;
const bin = (name) => path.join(root, 'node_modules', '.bin', name);

function installWhatIsMissing() {
  const mark = path.join(root, 'node_modules', '.package-lock.json');
  const fresh = existsSync(mark) && statSync(mark).mtimeMs >= statSync(path.join(root, 'package-lock.json')).mtimeMs;
  if (!fresh && run('npm', ['ci', '--no-audit', '--no-fund']) !== 0) {
    console.error('npm ci failed: nothing was tested.');
    process.exit(1);
  }
}

const totals = { passed: 0, failed: 0 };
const count = (passed, failed) => {
  totals.passed += passed;
  totals.failed += failed;
};

function check(name, command, args, env) {
  console.log(`\n── ${name}`);
  const status = run(command, args, env);
  count(status === 0 ? 1 : 0, status === 0 ? 0 : 1);
}

/** A runner that writes a JSON report; without one, or with an exit code that its counts do not explain, the step itself has failed. */
function suite(name, command, args, reportName, read, env = {}) {
  console.log(`\n── ${name}`);
  const report = path.join(out, reportName);
  const status = run(command, args, { ...env, VITEST_JSON: report, PLAYWRIGHT_JSON_OUTPUT_NAME: report });
  const counted = existsSync(report) ? read(JSON.parse(readFileSync(report, 'utf8'))) : { passed: 0, failed: 0 };
  count(counted.passed, counted.failed);
  if ((status !== 0 && counted.failed === 0) || counted.passed + counted.failed === 0) count(0, 1);
}

const vitestCounts = (json) => ({ passed: json.numPassedTests, failed: json.numFailedTests });
const playwrightCounts = ({ stats }) => ({ passed: stats.expected, failed: stats.unexpected + stats.flaky });

const isFree = (port) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(false));
    server.listen(port, () => server.close(() => resolve(true)));
  });

/** The first port from `from` on that is free together with the next one (application and mail server). */
async function freePair(from) {
  for (let port = from; port < from + 200; port += 2) if ((await isFree(port)) && (await isFree(port + 1))) return port;
  throw new Error(`no two free ports from ${from} on`);
}

installWhatIsMissing();
rmSync(out, { recursive: true, force: true });
mkdirSync(out, { recursive: true });

check('lint', bin('eslint'), ['.', '--max-warnings', '0']);
check('types of routes', bin('next'), ['typegen']);
check('types', bin('tsc'), ['--noEmit']);
suite('unit, reference and integration tests', bin('vitest'), ['run', '--config', 'tests/vitest.config.ts'], 'vitest.json', vitestCounts);
if (withBrowser) {
  suite('browser tests', bin('playwright'), ['test', '--config', 'tests/playwright.config.ts'], 'playwright.json', playwrightCounts, { E2E_PORT: String(await freePair(3199)) });
}

console.log(`\n${totals.passed} passed, ${totals.failed} failed`);
process.exit(totals.failed === 0 ? 0 : 1);
