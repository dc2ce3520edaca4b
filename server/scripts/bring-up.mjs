// The programs that npm start and npm run dev both run. Node alone.
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { fakesEnvironment } from './local-settings.mjs';
import { startProcess, untilAnswers } from './processes.mjs';
import { remark } from './progress.mjs';
import { root } from './root.mjs';

const demoLoader = join(root, 'server/dist/demo/load.js');
const demoPeople = join(root, 'server/dist/demo/sign-ins.js');

export const logFile = (name) => join(root, '.local/log', `${name}.log`);

/**
 * Runs a program of ours to its end.
 * @param {string[]} args
 * @param {{ guard: import('../../db/scripts/guard.mjs').Guard, env?: NodeJS.ProcessEnv, quiet?: boolean }} options
 *   with `quiet`, what it writes is shown only if it fails; else as it comes
 */
export function runNode(args, { guard, env = process.env, quiet = false }) {
  return new Promise((resolve, reject) => {
    const output = quiet ? 'pipe' : 'inherit';
    const child = spawn(process.execPath, args, { cwd: root, env, stdio: ['ignore', output, output], detached: true });
    const takeBack = child.pid ? guard.entrust({ process: child.pid }) : () => {};
    let written = '';
    for (const stream of [child.stdout, child.stderr]) stream?.on('data', (chunk) => (written += chunk));
    child.once('error', reject);
    child.once('close', (code) => {
      takeBack();
      if (code === 0) resolve();
      else reject(new Error(`${written}${args[0]} failed.`));
    });
  });
}

export async function startFakes({ ports, secrets, guard }) {
  const fakes = startProcess({
    name: 'The stand-ins for payments and mail',
    args: [join(root, 'fakes/dist/main.js')],
    cwd: root,
    env: fakesEnvironment({ ports, secrets, state: join(root, '.local/fakes') }),
    log: logFile('fakes'),
    guard,
  });
  await untilAnswers(`http://127.0.0.1:${ports.mailPage}/`, fakes);
  return fakes;
}

export async function startServer({ env, guard, options = [] }) {
  const server = startProcess({
    name: 'The server',
    args: ['--enable-source-maps', ...options, join(root, 'server/dist/main.js')],
    cwd: root,
    env,
    log: logFile('server'),
    guard,
  });
  await untilAnswers(`http://127.0.0.1:${env.PORT}/api/health/ready`, server);
  return server;
}

export async function loadDemo(serverUrl, { env, guard }) {
  remark('loading the demo: six months of a small shop');
  await runNode([demoLoader], { guard, env: { ...env, DATABASE_URL: serverUrl } });
}

/**
 * How to get in: the code for the first owner of an empty shop, or the demo's people if this is the demo's shop.
 * @returns {Promise<string[]>} lines to show
 */
export async function waysIn({ database, baseUrl, setUpCode }) {
  if (await database.isEmpty()) {
    return [`  An empty shop. Its owner signs up at ${baseUrl}/first-owner with the code ${setUpCode}`];
  }
  const { demoSignIns } = await import(pathToFileURL(demoPeople).href);
  if (!(await database.hasPerson(demoSignIns[0].email))) return [];
  const lines = demoSignIns.map(
    ({ role, email, password }) => `    ${role.padEnd(11)} ${email.padEnd(36)} ${password}`,
  );
  return ['  Sign in as', ...lines];
}

/** Resolves when the person at the terminal, or whoever runs this, asks for the end. */
export const askedToStop = new Promise((resolve) => {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => resolve('stopped'));
});

/**
 * Waits for the end: asked for, or because a program ended by itself.
 * @returns {Promise<number>} exit code
 */
export async function untilStopped(bringingUp) {
  const children = await Promise.race([bringingUp, askedToStop]);
  if (children === 'stopped') {
    // What it was doing is being taken away beneath it; its fault tells nothing.
    bringingUp.catch(() => {});
    return 0;
  }
  const ends = children.map((child) => child.exited.then((outcome) => ({ child, outcome })));
  const first = await Promise.race([...ends, askedToStop]);
  if (first === 'stopped') return 0;
  const { child, outcome } = first;
  console.error(`${child.name} ended by itself (${outcome}). The end of ${child.log}:\n${child.tail()}`);
  return 1;
}
