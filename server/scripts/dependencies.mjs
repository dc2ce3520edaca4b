// Whether node_modules holds what the lock file asks for, and putting it there. Node alone.
import { spawn } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './root.mjs';

const read = (file) => JSON.parse(readFileSync(join(root, file), 'utf8')).packages;

/** npm notes what it installed in a lock file of its own, written last; packages for other machines are left out. */
function stale() {
  const installedFile = 'node_modules/.package-lock.json';
  if (!existsSync(join(root, installedFile))) return true;
  const wanted = read('package-lock.json');
  const installed = read(installedFile);
  return Object.entries(wanted).some(([path, entry]) => {
    if (!path.includes('node_modules/') || entry.link) return false;
    const found = installed[path];
    if (!found) return !entry.optional;
    return found.version !== entry.version || found.integrity !== entry.integrity;
  });
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
  if (!stale()) return 'up to date';
  report('installing the dependencies (about a minute)');
  await run('npm', ['ci', '--no-audit', '--no-fund', '--no-progress', '--prefer-offline']);
  return 'installed';
}
