// Finds Debian's Chromium, or installs it where that is allowed. Node alone.
import { existsSync } from 'node:fs';
import { installPackages } from '../../db/scripts/cluster-binaries.mjs';

const path = '/usr/bin/chromium';

/**
 * @param {(text: string) => void} report
 * @returns {string} the browser's program
 */
export function ensureBrowser(report) {
  const given = process.env.CHROMIUM_PATH;
  if (given) return given;
  if (existsSync(path)) return path;
  if (process.getuid?.() !== 0) {
    throw new Error(
      'Chromium is missing. Run: sudo apt-get update && sudo apt-get install -y --no-install-recommends chromium',
    );
  }
  report('installing Chromium from Debian (a minute or two)');
  installPackages(['chromium', 'fonts-liberation']);
  return path;
}
