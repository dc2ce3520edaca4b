import { describe, expect, it } from '@jest/globals';
import { safeReturnPath } from './return-path';

describe('the way back after signing in', () => {
  it.each([
    '/today',
    '/shelf/parts?q=a&page=2',
    '/bench/units/WR-2648-0093-41',
    '/u/WR-2648-0093-41#readings',
    '/profile',
  ])('leads to %s', (path) => {
    expect(safeReturnPath(path)).toBe(path);
  });

  it.each([
    null,
    undefined,
    '',
    'today',
    '//evil.example/today',
    '/\\evil.example/today',
    '\\\\evil.example',
    'https://evil.example/today',
    'javascript:alert(1)',
    '/%2f/evil.example',
    '/sign-in',
    '/todayish',
    '/shelf/../..//evil.example',
    '/today/../sign-in',
    '\t//evil.example',
    '/\t/evil.example/today',
  ])('does not lead to %s', (path) => {
    expect(safeReturnPath(path)).toBeUndefined();
  });
});
