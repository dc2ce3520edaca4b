// Checks the rules of the shop on the database of this checkout, or on that of DATABASE_URL, and prints what it found.
// Works while npm start runs and while it does not.
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { startGuard } from '../../db/scripts/guard.mjs';
import { ensureDependencies } from './dependencies.mjs';
import { openDatabase } from './local-database.mjs';
import { root } from './root.mjs';

const report = (text) => process.stderr.write(`${text}\n`);

function runNode(args, env = process.env) {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, args, { cwd: root, env, stdio: 'inherit' });
    child.once('error', reject);
    child.once('exit', (code) => resolve(code ?? 1));
  });
}

async function examine(guard) {
  await ensureDependencies(report, guard);
  const built = await runNode([join(root, 'server/scripts/build.mjs'), '--node-only']);
  if (built !== 0) return built;
  const { serverUrl } = await openDatabase({ report, guard });
  const args = [join(root, 'server/dist/doctor.js'), ...process.argv.slice(2)];
  return runNode(args, { ...process.env, DATABASE_URL: serverUrl });
}

const guard = startGuard();
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => {});
try {
  process.exitCode = await examine(guard);
} catch (error) {
  report(error instanceof Error ? error.message : String(error));
  process.exitCode = 1;
} finally {
  await guard.end();
}
