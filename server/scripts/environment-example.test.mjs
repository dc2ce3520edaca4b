import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from '@jest/globals';
import { root } from './root.mjs';

const read = (file) => readFileSync(join(root, file), 'utf8');

/** Names the server reads, as its settings' reader is asked for them: env.text('NAME'). */
function namesRead() {
  const folder = 'server/src/platform/config';
  const sources = readdirSync(join(root, folder)).filter(
    (name) => name.endsWith('.ts') && !/\.(test|spec)\.ts$/.test(name),
  );
  const calls = sources.flatMap((name) => [
    ...read(join(folder, name)).matchAll(/\benv\s*\.\w+\(\s*'([A-Z][A-Z0-9_]+)'/g),
  ]);
  return [...new Set(calls.map((call) => call[1]))].toSorted();
}

test('every setting of the server is described in .env.example', () => {
  const described = new Set([...read('.env.example').matchAll(/^#? ?([A-Z][A-Z0-9_]+)=/gm)].map((line) => line[1]));
  const names = namesRead();
  expect(names).toContain('DATABASE_URL');
  expect(names.filter((name) => !described.has(name))).toEqual([]);
});
