import { expect, test } from '@jest/globals';
import { isStale } from './dependencies.mjs';

const pg = { version: '8.23.1', integrity: 'sha512-a' };

test('what is installed as locked is not stale', () => {
  const wanted = { '': {}, server: {}, 'node_modules/pg': pg, 'node_modules/@emberlot/db': { link: true } };
  expect(isStale(wanted, { 'node_modules/pg': pg })).toBe(false);
});

test('a missing package, another version and another content are stale', () => {
  const wanted = { 'node_modules/pg': pg };
  expect(isStale(wanted, {})).toBe(true);
  expect(isStale(wanted, { 'node_modules/pg': { ...pg, version: '8.23.0' } })).toBe(true);
  expect(isStale(wanted, { 'node_modules/pg': { ...pg, integrity: 'sha512-b' } })).toBe(true);
});

test('a package for another kind of machine may be missing', () => {
  expect(isStale({ 'node_modules/fsevents': { version: '2.3.3', optional: true } }, {})).toBe(false);
});
