// The private cluster that keeps a shop's data between starts. Node alone.
import { spawnSync } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import {
  asClusterUser,
  connectionUrl,
  ensureRoles,
  initialise,
  isRoot,
  roles,
  runningPort,
  runSql,
  startServer,
  stopServer,
} from './cluster.mjs';
import { ensureBinaries } from './cluster-binaries.mjs';
import { withLock } from './lock.mjs';

/** The passwords of the three roles, made once and kept beside the data; readable by the one who made them alone. */
function readSecrets(folder) {
  const file = `${folder}.json`;
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const names = [roles.admin, roles.owner, roles.server];
  const secrets = Object.fromEntries(names.map((name) => [name, randomBytes(18).toString('base64url')]));
  writeFileSync(file, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  return secrets;
}

/** Makes the folder and lends it to the account PostgreSQL runs as; false when that account cannot get there. */
function usable(folder) {
  mkdirSync(folder, { recursive: true });
  if (!isRoot) return true;
  spawnSync('chown', ['postgres:postgres', folder]);
  return spawnSync(...asClusterUser('test', ['-w', folder]), { cwd: '/' }).status === 0;
}

function chooseFolder(root, report) {
  const usual = join(root, '.local/postgres');
  if (usable(usual)) return usual;
  const other = join('/var/lib/emberlot', createHash('sha256').update(root).digest('hex').slice(0, 12));
  report(`the data are kept in ${other}, since the account postgres cannot reach ${usual}`);
  if (usable(other)) return other;
  throw new Error(`The account postgres can write neither ${usual} nor ${other}.`);
}

/** @returns {string} the programs that fit the data, which are made if there are none */
function prepareData(data, password, report) {
  const version = join(data, 'PG_VERSION');
  if (existsSync(version)) return ensureBinaries(report, readFileSync(version, 'utf8').trim());
  const binaries = ensureBinaries(report);
  // Made beside and renamed when whole, so that an interrupted first start leaves nothing half-made.
  const draft = `${data}-draft`;
  rmSync(draft, { recursive: true, force: true });
  initialise({ binaries, data: draft, password, settings: ["shared_buffers = '256MB'"] });
  renameSync(draft, data);
  return binaries;
}

/**
 * Opens the cluster of this checkout: makes it if need be, starts it if it is not running.
 * @param {{ root: string, report: (text: string) => void }} options `root` is the top of the checkout
 */
export async function openLastingCluster({ root, report }) {
  mkdirSync(join(root, '.local'), { recursive: true });
  // The package makes the account that the folder is lent to.
  ensureBinaries(report);
  return withLock(join(root, '.local/cluster.lock'), async () => {
    const folder = chooseFolder(root, report);
    const secrets = readSecrets(folder);
    const data = join(folder, 'data');
    const password = secrets[roles.admin];
    const binaries = prepareData(data, password, report);
    const running = runningPort({ binaries, data });
    const port = running ?? (await startServer({ binaries, data, log: join(folder, 'log') }));
    ensureRoles({ binaries, port, password, rolePasswords: secrets });
    return {
      /** Whether this call started it; who did, stops it. */
      started: running === undefined,
      settings: { binaries, data, mode: 'fast' },
      folder,
      sql: (sql, database = 'postgres') => runSql({ binaries, port, password, sql, database }),
      ownerUrl: (database) => connectionUrl({ user: roles.owner, password: secrets[roles.owner], port, database }),
      serverUrl: (database) => connectionUrl({ user: roles.server, password: secrets[roles.server], port, database }),
      stop: () => stopServer({ binaries, data }),
    };
  });
}
