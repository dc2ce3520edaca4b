// Everything that is tested, on a bare machine: format, lint and types, then unit and API tests, then the browser's.
// The last line is `N passed, N failed`, and the exit code says the same. Node alone.
//   npm test             files come in an order drawn anew; EMBERLOT_TEST_SEED=N repeats one
import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startThrowAwayCluster } from '../../db/scripts/cluster.mjs';
import { startGuard } from '../../db/scripts/guard.mjs';
import { ensureDependencies } from '../../server/scripts/dependencies.mjs';
import { root } from '../../server/scripts/root.mjs';
import { ensureBrowser } from './browser.mjs';
import { sumCounts } from './counts.mjs';
import { givenSeed } from './shuffle.mjs';

const report = (text) => process.stdout.write(`${text}\n`);
/** Both cores; a worker that has grown large is replaced, since modules of a finished file stay in its memory. */
const jestOptions = ['--maxWorkers=2', '--workerIdleMemoryLimit=1GB'];
const jest = ['--experimental-vm-modules', '--no-warnings', 'node_modules/jest/bin/jest.js', ...jestOptions];
const playwright = ['node_modules/@playwright/test/cli.js', 'test', '--config', 'e2e/playwright.config.ts'];

let interrupted = false;

/**
 * Runs one step in a process group of its own, which the guard ends should this process end first.
 * @returns {Promise<{ passed: number, failed: number }>} a step that fails without a failed test is one failure
 */
async function run(name, args, { env, guard, folder }) {
  if (interrupted) return { passed: 0, failed: 0 };
  const started = Date.now();
  const counts = join(folder, name);
  report(`\n=== ${name}`);
  return new Promise((resolve) => {
    const child = spawn(process.execPath, args, {
      cwd: root,
      env: { ...env, EMBERLOT_COUNT_FILE: counts },
      stdio: ['ignore', 'inherit', 'inherit'],
      detached: true,
    });
    const takeBack = guard.entrust({ process: child.pid });
    child.once('exit', (code) => {
      takeBack();
      report(`=== ${name} ${code === 0 ? 'passed' : 'FAILED'} (${((Date.now() - started) / 1000).toFixed(0)} s)`);
      const { passed, failed } = sumCounts(counts);
      resolve({ passed, failed: code === 0 ? failed : Math.max(failed, 1) });
    });
  });
}

/** The steps in turn; what stands on a build that failed is not tried. */
async function runSteps(context) {
  const check = await run('Format, lint, types, generated files', ['e2e/scripts/check.mjs'], context);
  const build = await run('Build', ['server/scripts/build.mjs'], context);
  if (build.failed > 0) return [check, build];
  const unit = await run('Unit and API tests', jest, context);
  return [check, build, unit, await run('Browser tests', playwright, context)];
}

async function prepare(guard) {
  report(`Dependencies: ${await ensureDependencies(report, guard)}`);
  const chromium = ensureBrowser(report);
  const cluster = await startThrowAwayCluster(report);
  const seed = givenSeed() ?? Math.floor(Math.random() * 1_000_000);
  report(`Order of test files: EMBERLOT_TEST_SEED=${seed}`);
  const env = {
    ...process.env,
    TEST_DATABASE_ADMIN_URL: cluster.adminUrl,
    EMBERLOT_TEST_SEED: String(seed),
    CHROMIUM_PATH: chromium,
    CI: 'true',
  };
  return { cluster, env };
}

async function main() {
  const folder = mkdtempSync(join(tmpdir(), 'emberlot-counts-'));
  const guard = startGuard();
  guard.entrust({ folder });
  const stopped = new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
      process.on(signal, () => {
        interrupted = true;
        resolve([{ passed: 0, failed: 1 }]);
      });
    }
  });
  let cluster;
  try {
    const prepared = await prepare(guard);
    cluster = prepared.cluster;
    const counts = await Promise.race([runSteps({ env: prepared.env, guard, folder }), stopped]);
    return {
      passed: counts.reduce((sum, each) => sum + each.passed, 0),
      failed: counts.reduce((sum, each) => sum + each.failed, 0),
    };
  } finally {
    await guard.end();
    await cluster?.stop();
    rmSync(folder, { recursive: true, force: true });
  }
}

let outcome = { passed: 0, failed: 1 };
try {
  outcome = await main();
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
}
if (interrupted) report('Interrupted.');
report(`${outcome.passed} passed, ${outcome.failed} failed`);
process.exit(outcome.failed === 0 && outcome.passed > 0 ? 0 : 1);
