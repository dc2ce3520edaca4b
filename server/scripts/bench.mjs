// Measures and prints one table: the arithmetic's rows, and the bytes of script before a first page is usable.
// Never part of the tests: times depend on the machine, so read ratios within one run.
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { gzipSync } from 'node:zlib';
import { buildClient, buildNode } from './build.mjs';
import { root } from './root.mjs';

const bench = join(root, 'shared/bench');

async function arithmetic() {
  const files = readdirSync(bench).filter((name) => name.endsWith('.bench.mjs'));
  const rows = [];
  for (const file of files) {
    process.stderr.write(`measuring ${file}\n`);
    const { rows: measure } = await import(pathToFileURL(join(bench, file)).href);
    rows.push(...(await measure()));
  }
  return rows;
}

/** Every chunk that a page's entry brings in before it can be used: its own and those it imports, each once. */
function scriptOf(manifest, entries) {
  const seen = new Set();
  const visit = (key) => {
    const chunk = manifest[key];
    if (!chunk || seen.has(chunk.file)) return;
    seen.add(chunk.file);
    (chunk.imports ?? []).forEach(visit);
  };
  entries.forEach(visit);
  return [...seen].filter((file) => file.endsWith('.js'));
}

function firstLoads() {
  const dist = join(root, 'client/dist');
  const manifest = JSON.parse(readFileSync(join(dist, '.vite/manifest.json'), 'utf8'));
  const bytes = (entries) =>
    scriptOf(manifest, entries).reduce((sum, file) => sum + gzipSync(readFileSync(join(dist, file))).length, 0);
  const page = (what, entries, goal) => ({
    subject: 'client',
    what: `${what}: gzipped script before it is usable`,
    value: bytes(['index.html', ...entries]) / 1000,
    unit: 'kB',
    ...(goal ? { goal } : {}),
  });
  const shop = ['src/app/shell/shop-shell.tsx', 'src/features/shop/pages/front-page.tsx'];
  const today = ['src/app/shell/staff-shell.tsx', 'src/features/today/pages/today-page.tsx'];
  return [page('storefront', shop, '< 170'), page('Today', today)];
}

if (!buildNode() || !buildClient()) process.exit(1);
const rows = [...(await arithmetic()), ...firstLoads()];
console.table(
  rows.map(({ subject, what, value, unit, goal }) => ({
    subject,
    what,
    value: typeof value === 'number' ? Number(value.toPrecision(4)) : value,
    unit,
    goal: goal ?? '',
  })),
);
