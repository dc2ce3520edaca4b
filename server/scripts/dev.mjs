// The product for those who change it: compiles on each change, restarts the server, and serves the client with Vite.
// The data are those of npm start.
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { freePort } from '../../db/scripts/cluster.mjs';
import { startGuard } from '../../db/scripts/guard.mjs';
import { tryLock } from '../../db/scripts/lock.mjs';
import { loadDemo, logFile, runNode, startFakes, startServer, untilStopped, waysIn } from './bring-up.mjs';
import { ensureDependencies } from './dependencies.mjs';
import { openDatabase } from './local-database.mjs';
import { choosePorts, localSecrets, serverEnvironment } from './local-settings.mjs';
import { startProcess, untilAnswers } from './processes.mjs';
import { remark, step } from './progress.mjs';
import { root } from './root.mjs';

function startCompiler(guard) {
  return startProcess({
    name: 'The compiler',
    args: [join(root, 'server/scripts/build.mjs'), '--watch'],
    cwd: root,
    env: process.env,
    log: logFile('compiler'),
    guard,
  });
}

async function startVite({ port, ports, guard }) {
  const vite = startProcess({
    name: 'Vite',
    args: [join(root, 'node_modules/vite/bin/vite.js'), '--host', '127.0.0.1', '--port', String(port), '--strictPort'],
    cwd: join(root, 'client'),
    env: { ...process.env, API_URL: `http://127.0.0.1:${ports.server}` },
    log: logFile('vite'),
    guard,
  });
  await untilAnswers(`http://127.0.0.1:${port}/`, vite);
  return vite;
}

async function bringUp(guard) {
  await step('Dependencies', () => ensureDependencies(remark, guard));
  const database = await step('Database server', () => openDatabase({ report: remark, guard }));
  await step('Build', () => runNode([join(root, 'server/scripts/build.mjs'), '--node-only'], { guard, quiet: true }));
  const ports = await choosePorts();
  const secrets = localSecrets();
  const page = await freePort(5173);
  const baseUrl = `http://127.0.0.1:${page}`;
  const env = serverEnvironment({ ports, secrets, databaseUrl: database.serverUrl, baseUrl });
  const fakes = await step('Payments and mail stand-ins', () => startFakes({ ports, secrets, guard }));
  await step('Database', () => database.prepare((url) => loadDemo(url, { env, guard })).then(() => 'ready'));
  const compiler = startCompiler(guard);
  const server = await step('Server', () =>
    startServer({ env, guard, options: ['--watch', '--watch-preserve-output'] }),
  );
  const vite = await step('Client', () => startVite({ port: page, ports, guard }));
  const lines = [
    '',
    `  Emberlot        ${baseUrl}`,
    `  Server          http://127.0.0.1:${ports.server}`,
    `  Caught mail     http://127.0.0.1:${ports.mailPage}`,
    `  Payments (test) http://127.0.0.1:${ports.payments}`,
    ...(await waysIn({ database, baseUrl, setUpCode: secrets.setUp })),
    `  Logs: ${['compiler', 'server', 'vite', 'fakes'].map(logFile).join(' ')}`,
    '',
  ];
  process.stdout.write(`${lines.join('\n')}\n`);
  return [fakes, compiler, server, vite];
}

async function main() {
  const lock = tryLock(join(root, '.local/start.lock'));
  if ('heldBy' in lock) throw new Error(`Emberlot already runs from this folder (process ${lock.heldBy}).`);
  const guard = startGuard();
  try {
    process.exitCode = await untilStopped(bringUp(guard));
  } finally {
    process.stdout.write('  Stopping … ');
    await guard.end();
    lock.release();
    process.stdout.write('stopped\n');
  }
}

try {
  if (!existsSync(join(root, 'package-lock.json'))) throw new Error(`${root} is no checkout of Emberlot.`);
  await main();
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
process.exit();
