// Private PostgreSQL clusters on the loopback address. Node alone: this runs before the dependencies are installed.
import { spawn, spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureBinaries, findBinaries } from './cluster-binaries.mjs';

export { ensureBinaries, findBinaries };

const adminRole = 'emberlot_admin';
/** The same names as in db/src/roles.ts, which cannot be read before it is built. */
const productRoles = ['emberlot_owner', 'emberlot_server'];

const isRoot = process.getuid?.() === 0;

/** PostgreSQL refuses to run as root, so root lends it the account that Debian's package makes. */
function asClusterUser(command, args) {
  return isRoot
    ? ['setpriv', ['--reuid=postgres', '--regid=postgres', '--init-groups', '--', command, ...args]]
    : [command, args];
}

/** Runs to its end; nothing is inherited, so a server that is left running holds no terminal and no pipe. */
function run(command, args, options = {}) {
  const result = spawnSync(...asClusterUser(command, args), { stdio: 'ignore', cwd: '/', ...options });
  if (result.error) throw result.error;
  return result;
}

/** Settings of every cluster: loopback only, no socket files. */
const commonSettings = ["listen_addresses = '127.0.0.1'", "unix_socket_directories = ''", "timezone = 'UTC'"];

/** Fast and careless: only for data that may vanish. */
const throwAwaySettings = [
  'fsync = off',
  'synchronous_commit = off',
  'full_page_writes = off',
  'wal_level = minimal',
  'max_wal_senders = 0',
  'jit = off',
  'max_connections = 200',
  "shared_buffers = '128MB'",
];

/** @returns {Promise<number>} a port nobody listens on at this moment; the preferred one if that is free */
export async function freePort(preferred = 0) {
  const listen = (port) =>
    new Promise((resolve, reject) => {
      const server = createServer();
      server.once('error', reject);
      server.listen(port, '127.0.0.1', () => {
        const address = server.address();
        server.close(() => resolve(address.port));
      });
    });
  if (preferred === 0) return listen(0);
  return listen(preferred).catch(() => listen(0));
}

/** Makes the data folder. With a password, that is asked of everyone who connects; without, anyone on the machine may. */
export function initialise({ binaries, data, password, settings }) {
  const access = password ? ['-A', 'scram-sha-256', '--pwfile=/dev/stdin'] : ['-A', 'trust'];
  const args = ['-D', data, '-U', adminRole, ...access, '-E', 'UTF8', '--locale=C.UTF-8', '--no-instructions'];
  const result = run(join(binaries, 'initdb'), args, {
    stdio: [password ? 'pipe' : 'ignore', 'ignore', 'pipe'],
    input: password,
    encoding: 'utf8',
  });
  if (result.status !== 0) throw new Error(`PostgreSQL could not make its data folder ${data}: ${result.stderr}`);
  const lines = [...commonSettings, ...settings].join('\n');
  appendAsClusterUser(join(data, 'postgresql.conf'), `\n# Emberlot\n${lines}\n`);
}

function appendAsClusterUser(file, text) {
  const result = run('tee', ['-a', file], { stdio: ['pipe', 'ignore', 'ignore'], input: text });
  if (result.status !== 0) throw new Error(`${file} could not be written`);
}

/** @returns {Promise<number>} the port it listens on */
export async function startServer({ binaries, data, log, preferredPort = 0 }) {
  for (let attempt = 1; ; attempt += 1) {
    const port = await freePort(attempt === 1 ? preferredPort : 0);
    const args = ['-D', data, '-l', log, '-w', '-t', '60', '-o', `-p ${port}`, 'start'];
    if (run(join(binaries, 'pg_ctl'), args).status === 0) return port;
    // Someone else may have taken the port between looking and starting.
    if (attempt === 3) throw new Error(`PostgreSQL did not start; its log is ${log}`);
  }
}

/** The port of the server that runs on this data folder, or undefined when none does. */
export function runningPort({ binaries, data }) {
  if (run(join(binaries, 'pg_ctl'), ['-D', data, 'status']).status !== 0) return undefined;
  const { stdout } = run('cat', [join(data, 'postmaster.pid')], {
    stdio: ['ignore', 'pipe', 'ignore'],
    encoding: 'utf8',
  });
  const port = Number(stdout.split('\n')[3]);
  return Number.isInteger(port) && port > 0 ? port : undefined;
}

/** @param {{ binaries: string, data: string, mode?: 'fast' | 'immediate' }} cluster */
export function stopServer({ binaries, data, mode = 'fast' }) {
  run(join(binaries, 'pg_ctl'), ['-D', data, '-w', '-t', '60', '-m', mode, 'stop']);
}

/** Sends statements as the cluster's administrator; answers what they return, a line a row. */
export function runSql({ binaries, port, password, sql, database = 'postgres' }) {
  const args = ['-X', '-q', '-A', '-t', '-v', 'ON_ERROR_STOP=1', '-h', '127.0.0.1', '-p', String(port)];
  const result = spawnSync(join(binaries, 'psql'), [...args, '-U', adminRole, '-d', database], {
    input: sql,
    encoding: 'utf8',
    env: { ...process.env, PGPASSWORD: password ?? '' },
  });
  if (result.status !== 0) throw new Error(`PostgreSQL refused: ${result.stderr || result.error?.message}`);
  return result.stdout.trim();
}

/** Creates the product's two roles where they are missing. */
export function ensureRoles({ binaries, port, password, rolePasswords = {} }) {
  const statements = productRoles.map((role) => {
    const secret = rolePasswords[role] ? ` password '${rolePasswords[role]}'` : '';
    return `select 'create role ${role} login' where not exists (select from pg_roles where rolname = '${role}') \\gexec
alter role ${role} login${secret};`;
  });
  runSql({ binaries, port, password, sql: statements.join('\n') });
}

export function connectionUrl({ user, password, port, database }) {
  const secret = password ? `:${password}` : '';
  return `postgres://${user}${secret}@127.0.0.1:${port}/${database}`;
}

/**
 * A cluster for tests. A guard process of its own removes it when this process ends, however that comes about.
 * @param {(text: string) => void} [report]
 * @returns {Promise<{ adminUrl: string, stop: () => Promise<void> }>}
 */
export async function startThrowAwayCluster(report = () => {}) {
  const binaries = ensureBinaries(report);
  const folder = mkdtempSync(join(existsSync('/var/tmp') ? '/var/tmp' : tmpdir(), 'emberlot-test-'));
  if (isRoot) spawnSync('chown', ['postgres:postgres', folder]);
  const data = join(folder, 'data');
  const guard = spawn(
    process.execPath,
    [fileURLToPath(new URL('cluster-guard.mjs', import.meta.url)), binaries, folder],
    {
      stdio: ['pipe', 'ignore', 'inherit'],
      detached: true,
      cwd: '/',
    },
  );
  const ended = new Promise((resolve) => guard.once('exit', resolve));
  guard.unref();
  guard.stdin.unref?.();
  const stop = async () => {
    guard.ref();
    guard.stdin.end();
    await ended;
  };
  try {
    initialise({ binaries, data, settings: throwAwaySettings });
    const port = await startServer({ binaries, data, log: join(folder, 'log') });
    ensureRoles({ binaries, port });
    return { adminUrl: connectionUrl({ user: adminRole, port, database: 'postgres' }), stop };
  } catch (error) {
    await stop();
    throw error;
  }
}
