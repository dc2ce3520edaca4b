// Finds PostgreSQL's programs where Debian puts them, or installs them where that is allowed. Node alone.
import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

const home = '/usr/lib/postgresql';
const advice =
  'PostgreSQL is missing. Run: sudo apt-get update && sudo apt-get install -y --no-install-recommends postgresql';

/**
 * @param {string} [version] only this major version, as an existing data folder needs
 * @returns {string | undefined} the newest folder that holds the server's and the client's programs
 */
function lookForBinaries(version) {
  if (!existsSync(home)) return undefined;
  const versions = readdirSync(home)
    .filter((name) => /^\d+$/.test(name) && (!version || name === version))
    .toSorted((one, other) => Number(other) - Number(one));
  return versions
    .map((name) => join(home, name, 'bin'))
    .find((folder) =>
      ['postgres', 'initdb', 'pg_ctl', 'psql', 'pg_dump'].every((name) => existsSync(join(folder, name))),
    );
}

/** @returns {string} @throws {Error} one sentence that says which command to run */
export function findBinaries(version) {
  const found = lookForBinaries(version);
  if (found) return found;
  if (version && lookForBinaries()) {
    throw new Error(
      `The data were made by PostgreSQL ${version}, which is not installed. Run: sudo apt-get install -y postgresql-${version}`,
    );
  }
  throw new Error(advice);
}

/**
 * As findBinaries, but installs Debian's package when nothing is there and this is root.
 * @param {(text: string) => void} report
 * @returns {string}
 */
export function ensureBinaries(report, version) {
  if (lookForBinaries()) return findBinaries(version);
  if (process.getuid?.() !== 0) throw new Error(advice);
  report('installing PostgreSQL from Debian (about a minute)');
  installPackages(['postgresql']);
  return findBinaries(version);
}

/**
 * Installs Debian packages as root.
 * @param {string[]} names
 * @throws {Error} with apt's last lines when it fails
 */
export function installPackages(names) {
  const apt = (args) =>
    spawnSync('apt-get', ['-o', 'DPkg::Lock::Timeout=300', '-q', ...args], {
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
      encoding: 'utf8',
      stdio: ['ignore', 'pipe', 'pipe'],
      maxBuffer: 1 << 26,
    });
  apt(['update']);
  const run = apt(['install', '-y', '--no-install-recommends', ...names]);
  if (run.status === 0) return;
  const last = `${run.stdout ?? ''}${run.stderr ?? run.error?.message ?? ''}`.trim().split('\n').slice(-5).join('\n');
  throw new Error(`apt-get could not install ${names.join(', ')}:\n${last}`);
}
