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

function run(command, args) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd: root, stdio: ['ignore', 'pipe', 'pipe'] });
    let output = '';
    for (const stream of [child.stdout, child.stderr]) stream.on('data', (chunk) => (output += chunk));
    child.once('error', reject);
    child.once('close', (code) => (code === 0 ? resolve() : reject(new Error(`${command} failed:\n${output.trim()}`))));
  });
}

/**
 * @param {(text: string) => void} report
 * @returns {Promise<string>} the outcome in words
 */
export async function ensureDependencies(report) {
  if (installedAsLocked()) return 'up to date';
  report('installing the dependencies (about a minute)');
  await run('npm', ['ci', '--no-audit', '--no-fund', '--no-progress', '--prefer-offline']);
  return 'installed';
}
