// Private PostgreSQL clusters on the loopback address. Node alone: this runs before the dependencies are installed.
import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureBinaries } from './cluster-binaries.mjs';
import { startGuard } from './guard.mjs';

/** The product's two are named as in db/src/roles.ts, which cannot be read before it is built. */
export const roles = { admin: 'emberlot_admin', owner: 'emberlot_owner', server: 'emberlot_server' };

export const isRoot = process.getuid?.() === 0;

/** PostgreSQL refuses to run as root, so root lends it the account that Debian's package makes. */
export function asClusterUser(command, args) {
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

/** Writes a file as the account PostgreSQL runs as, for that account's eyes only. */
function writeAsClusterUser(file, text, mode = '>') {
  const script = `umask 077; cat ${mode} "$0"`;
  const result = run('sh', ['-c', script, file], { stdio: ['pipe', 'ignore', 'ignore'], input: text });
  if (result.status !== 0) throw new Error(`${file} could not be written`);
}

/** Makes the data folder. With a password, that is asked of everyone who connects; without, anyone on the machine may. */
export function initialise({ binaries, data, password, settings }) {
  const passwordFile = `${data}.password`;
  if (password) writeAsClusterUser(passwordFile, password);
  const access = password ? ['-A', 'scram-sha-256', `--pwfile=${passwordFile}`] : ['-A', 'trust'];
  const args = ['-D', data, '-U', roles.admin, ...access, '-E', 'UTF8', '--locale=C.UTF-8', '--no-instructions'];
  const result = run(join(binaries, 'initdb'), args, { stdio: ['ignore', 'ignore', 'pipe'], encoding: 'utf8' });
  rmSync(passwordFile, { force: true });
  if (result.status !== 0) throw new Error(`PostgreSQL could not make its data folder ${data}: ${result.stderr}`);
  const lines = [...commonSettings, ...settings].join('\n');
  writeAsClusterUser(join(data, 'postgresql.conf'), `\n# Emberlot\n${lines}\n`, '>>');
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
  const result = spawnSync(join(binaries, 'psql'), [...args, '-U', roles.admin, '-d', database], {
    input: sql,
    encoding: 'utf8',
    env: { ...process.env, PGPASSWORD: password ?? '' },
  });
  if (result.status !== 0) throw new Error(`PostgreSQL refused: ${result.stderr || result.error?.message}`);
  return result.stdout.trim();
}

/** Creates the product's two roles where they are missing. */
export function ensureRoles({ binaries, port, password, rolePasswords = {} }) {
  const statements = [roles.owner, roles.server].map((role) => {
    const secret = rolePasswords[role] ? ` with login password '${rolePasswords[role]}'` : ' with login';
    return `select 'create role ${role} login' where not exists (select from pg_roles where rolname = '${role}') \\gexec
alter role ${role}${secret};`;
  });
  runSql({ binaries, port, password, sql: statements.join('\n') });
}

export function connectionUrl({ user, password, port, database }) {
  const secret = password ? `:${password}` : '';
  return `postgres://${user}${secret}@127.0.0.1:${port}/${database}`;
}

/**
 * A cluster for tests; it is removed when this process ends, however that comes about.
 * @param {(text: string) => void} [report]
 * @returns {Promise<{ adminUrl: string, stop: () => Promise<void> }>}
 */
export async function startThrowAwayCluster(report = () => {}) {
  const binaries = ensureBinaries(report);
  const folder = mkdtempSync(join(existsSync('/var/tmp') ? '/var/tmp' : tmpdir(), 'emberlot-test-'));
  const data = join(folder, 'data');
  const guard = startGuard();
  guard.entrust({ folder });
  guard.entrust({ cluster: { binaries, data, mode: 'immediate' } });
  try {
    if (isRoot) spawnSync('chown', ['postgres:postgres', folder]);
    initialise({ binaries, data, settings: throwAwaySettings });
    const port = await startServer({ binaries, data, log: join(folder, 'log') });
    ensureRoles({ binaries, port });
    return { adminUrl: connectionUrl({ user: roles.admin, port, database: 'postgres' }), stop: () => guard.end() };
  } catch (error) {
    await guard.end();
    throw error;
  }
}
