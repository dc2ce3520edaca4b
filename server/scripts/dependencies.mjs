// Whether node_modules holds what the lock file asks for, and putting it there. Node alone.
import { spawn } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './root.mjs';

const readPackages = (file) => JSON.parse(readFileSync(join(root, file), 'utf8')).packages;

/**
 * Whether something that is wanted is missing or another version; packages for other machines may be missing.
 * @param {Record<string, { version?: string, integrity?: string, link?: boolean, optional?: boolean }>} wanted
 *   the packages of package-lock.json
 * @param {typeof wanted} installed the same, as npm notes them when it has installed everything
 */
export function isStale(wanted, installed) {
  return Object.entries(wanted).some(([path, entry]) => {
    if (!path.includes('node_modules/') || entry.link) return false;
    const found = installed[path];
    if (!found) return !entry.optional;
    return found.version !== entry.version || found.integrity !== entry.integrity;
  });
}

function installedAsLocked() {
  const noted = 'node_modules/.package-lock.json';
  return existsSync(join(root, noted)) && !isStale(readPackages('package-lock.json'), readPackages(noted));
}

function install(guard) {
  const args = ['ci', '--no-audit', '--no-fund', '--no-progress', '--prefer-offline'];
  return new Promise((resolve, reject) => {
    const child = spawn('npm', args, { cwd: root, stdio: ['ignore', 'pipe', 'pipe'], detached: true });
    const takeBack = child.pid ? guard.entrust({ process: child.pid }) : () => {};
    let output = '';
    for (const stream of [child.stdout, child.stderr]) stream.on('data', (chunk) => (output += chunk));
    child.once('error', reject);
    child.once('close', (code) => {
      takeBack();
      if (code === 0) resolve();
      else reject(new Error(`npm ci failed:\n${output.trim()}`));
    });
  });
}

/**
 * @param {(text: string) => void} report
 * @param {import('../../db/scripts/guard.mjs').Guard} guard ends the installation should this process end first
 * @returns {Promise<string>} the outcome in words
 */
export async function ensureDependencies(report, guard) {
  if (installedAsLocked()) return 'up to date';
  report('installing the dependencies (about a minute)');
  await install(guard);
  return 'installed';
}
