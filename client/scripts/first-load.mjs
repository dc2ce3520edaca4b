// Prints what a browser must load before each entry route is usable, and fails where that is more than allowed.
//   npm run build && node client/scripts/first-load.mjs
import { existsSync, readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';

const dist = resolve(fileURLToPath(import.meta.url), '../../dist');
const manifestFile = resolve(dist, '.vite/manifest.json');
if (!existsSync(manifestFile)) {
  console.error('The client is not built: npm run build');
  process.exit(1);
}
const manifest = JSON.parse(readFileSync(manifestFile, 'utf8'));

/** Gzipped kilobytes of script allowed; the storefront's is the one that is promised. */
const routes = [
  {
    name: 'storefront',
    modules: ['src/app/shell/shop-shell.tsx', 'src/features/shop/pages/front-page.tsx'],
    limit: 170,
  },
  {
    name: 'sign-in',
    modules: ['src/app/shell/shop-shell.tsx', 'src/features/account/pages/sign-in-page.tsx'],
    limit: 210,
  },
  { name: 'Today', modules: ['src/app/shell/staff-shell.tsx', 'src/features/today/pages/today-page.tsx'], limit: 260 },
];

function needed(key, found = new Set()) {
  if (found.has(key)) return found;
  found.add(key);
  for (const other of manifest[key]?.imports ?? []) needed(other, found);
  return found;
}

const weights = new Map();
function weight(file) {
  if (!weights.has(file)) weights.set(file, gzipSync(readFileSync(resolve(dist, file)), { level: 9 }).length);
  return weights.get(file);
}

let ok = true;
for (const { name, modules, limit } of routes) {
  const missing = modules.filter((module) => !manifest[module]);
  if (missing.length > 0) throw new Error(`not in the build: ${missing.join(', ')}`);
  const keys = new Set(['index.html', ...modules].flatMap((module) => [...needed(module)]));
  const scripts = [...keys].map((key) => manifest[key].file);
  const styles = [...keys].flatMap((key) => manifest[key].css ?? []);
  const bytes = scripts.reduce((sum, file) => sum + weight(file), 0);
  const within = bytes <= limit * 1000;
  ok &&= within;
  const css = styles.reduce((sum, file) => sum + weight(file), 0);
  console.log(
    `${name.padEnd(12)} ${(bytes / 1000).toFixed(1).padStart(6)} kB script, ${(css / 1000).toFixed(1)} kB style, limit ${limit} kB ${within ? '' : ' TOO MUCH'}`,
  );
  if (process.argv.includes('--parts')) {
    for (const file of scripts.toSorted((a, b) => weight(b) - weight(a)))
      console.log(`    ${(weight(file) / 1000).toFixed(1).padStart(6)} ${file}`);
  }
  if (name === 'storefront' && scripts.some((file) => /grid|chart/i.test(file))) {
    ok = false;
    console.log('  the storefront loads a grid or a chart');
  }
}
process.exit(ok ? 0 : 1);
