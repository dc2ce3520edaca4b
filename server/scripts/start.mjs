// Runs the product on this machine: from a fresh clone to a page in the browser, and again in seconds.
//   npm start -- [--empty] [--port N] [--reset [--yes]]
// Node alone, since the dependencies may not be there yet.
import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { createInterface } from 'node:readline/promises';
import { parseArgs } from 'node:util';
import { startGuard } from '../../db/scripts/guard.mjs';
import { tryLock } from '../../db/scripts/lock.mjs';
import { loadDemo, runNode, startFakes, startServer, untilStopped, waysIn } from './bring-up.mjs';
import { ensureDependencies } from './dependencies.mjs';
import { openDatabase } from './local-database.mjs';
import { choosePorts, localSecrets, serverEnvironment } from './local-settings.mjs';
import { remark, step } from './progress.mjs';
import { root } from './root.mjs';

const help = `npm start -- [options]
  --empty     no demo: an empty shop that waits for its owner
  --port N    the port of the server (usually 4310)
  --reset     delete this checkout's data and begin again; asks first
  --yes       answer yes to that question
With DATABASE_URL and DATABASE_MIGRATION_URL set, that database is used instead of a private one.`;

function readOptions() {
  const { values } = parseArgs({
    options: {
      empty: { type: 'boolean', default: false },
      port: { type: 'string' },
      reset: { type: 'boolean', default: false },
      yes: { type: 'boolean', default: false },
      help: { type: 'boolean', default: false },
    },
  });
  const port = values.port === undefined ? undefined : Number(values.port);
  if (port !== undefined && !(Number.isInteger(port) && port > 0 && port < 65_536)) {
    throw new Error('--port must be a whole number from 1 to 65535.');
  }
  return { ...values, port };
}

async function confirmReset() {
  if (!process.stdin.isTTY) throw new Error('--reset deletes all data; without a terminal to ask on, add --yes.');
  const terminal = createInterface({ input: process.stdin, output: process.stdout });
  const answer = await terminal.question('This deletes all data of this checkout. Type yes to go on: ');
  terminal.close();
  return answer.trim().toLowerCase() === 'yes';
}

/** The stand-ins' memory goes with the database whose orders and mails it is about. */
function deleteData(database) {
  database.reset();
  rmSync(join(root, '.local/fakes'), { recursive: true, force: true });
}

async function showAddresses({ env, ports, secrets, database }) {
  const lines = [
    '',
    `  Emberlot        ${env.BASE_URL}`,
    `  Caught mail     http://127.0.0.1:${ports.mailPage}`,
    `  Payments (test) http://127.0.0.1:${ports.payments}`,
    '',
    ...(await waysIn({ database, baseUrl: env.BASE_URL, setUpCode: secrets.setUp })),
    '',
    `  Logs are in ${join(root, '.local/log')}. Ctrl-C stops everything.`,
    '',
  ];
  process.stdout.write(`${lines.join('\n')}\n`);
}

async function bringUp(options, guard) {
  await step('Dependencies', () => ensureDependencies(remark, guard));
  const database = await step('Database server', () => openDatabase({ report: remark, guard }));
  remark(database.description);
  await step('Build', () => runNode([join(root, 'server/scripts/build.mjs')], { guard, quiet: true }));
  if (options.reset) await step('Deleting the old data', () => deleteData(database));
  const ports = await choosePorts(options.port);
  const secrets = localSecrets();
  const env = serverEnvironment({ ports, secrets, databaseUrl: database.serverUrl });
  const fakes = await step('Payments and mail stand-ins', () => startFakes({ ports, secrets, guard }));
  await step('Database', async () => {
    const applied = await database.prepare(options.empty ? undefined : (url) => loadDemo(url, { env, guard }));
    return applied === 0 ? 'up to date' : `${applied} migrations applied`;
  });
  const server = await step('Server', () => startServer({ env, guard }));
  await showAddresses({ env, ports, secrets, database });
  return [fakes, server];
}

async function main() {
  const options = readOptions();
  if (options.help) return console.log(help);
  if (options.reset && !options.yes && !(await confirmReset())) return console.log('Nothing was deleted.');
  const lock = tryLock(join(root, '.local/start.lock'));
  if ('heldBy' in lock) throw new Error(`Emberlot already runs from this folder (process ${lock.heldBy}).`);
  const guard = startGuard();
  try {
    process.exitCode = await untilStopped(bringUp(options, guard));
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
