import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import type { Bills } from './bill-lines.js';
import { alternate, bills, line } from './bill.builders.js';
import { lowLevelCodes } from './low-level-codes.js';

/** Independent model: the longest path by plain recursion upward. */
function longestPathAbove(rows: Bills, part: string): number {
  const parents = [...rows].filter(([, lines]) => lines.some((row) => row.part === part)).map(([parent]) => parent);
  return parents.length === 0 ? 0 : 1 + Math.max(...parents.map((parent) => longestPathAbove(rows, parent)));
}

function cycleOf(rows: Bills): string | undefined {
  const result = attempt(() => lowLevelCodes(rows));
  if (result.ok) return undefined;
  expect(result.fault.code).toBe('bill_cycle');
  return String(result.fault.details['cycle']);
}

describe('low-level codes', () => {
  test('no bills, no codes', () => {
    expect(lowLevelCodes(new Map())).toEqual(new Map());
  });

  test('an alternate lies below the part that may use it', () => {
    const rows: Bills = new Map([
      ['iron', [line('1', 'switch', 1, { alternates: [alternate('board')] })]],
      ['board', [line('1', 'switch', 1)]],
    ]);
    expect(Object.fromEntries(lowLevelCodes(rows))).toEqual({ iron: 0, board: 1, switch: 2 });
  });

  test('a bill that names itself is refused by name', () => {
    expect(cycleOf(bills({ A: [['A', 1]] }))).toBe('A → A');
  });

  test('a cycle below innocent parts names only the cycle', () => {
    const rows = bills({ top: [['P', 1]], P: [['Q', 1]], Q: [['R', 1]], R: [['P', 1]], S: [['R', 1]] });
    expect(cycleOf(rows)).toBe('P → Q → R → P');
  });

  test('a chain of 20,000 levels does not exhaust the stack', () => {
    const chain: Bills = new Map(
      Array.from({ length: 20_000 }, (_, index) => [`p${index}`, [line('1', `p${index + 1}`, 1)]]),
    );
    expect(lowLevelCodes(chain).get('p20000')).toBe(20_000);
  });

  test('equal the longest path on random acyclic structures, in ascending order', () => {
    const edges = fc.uniqueArray(fc.tuple(fc.nat(7), fc.nat(7)), { selector: ([a, b]) => `${a}-${b}`, maxLength: 20 });
    fc.assert(
      fc.property(edges, (pairs) => {
        const rows: Record<string, [string, number][]> = {};
        for (const [a, b] of pairs) if (a !== b) (rows[`p${Math.min(a, b)}`] ??= []).push([`p${Math.max(a, b)}`, 1]);
        const codes = lowLevelCodes(bills(rows));
        for (const [part, code] of codes) expect(code).toBe(longestPathAbove(bills(rows), part));
        expect([...codes.values()]).toEqual([...codes.values()].toSorted((a, b) => a - b));
      }),
    );
  });

  test('a random structure either has codes or a true cycle, never both', () => {
    const edges = fc.array(fc.tuple(fc.nat(5), fc.nat(5)), { maxLength: 12 });
    fc.assert(
      fc.property(edges, (pairs) => {
        const rows: Record<string, [string, number][]> = {};
        for (const [a, b] of pairs) (rows[`p${a}`] ??= []).push([`p${b}`, 1]);
        const cycle = cycleOf(bills(rows));
        if (cycle === undefined) return;
        const path = cycle.split(' → ');
        expect(path.length >= 2 && path[0] === path.at(-1)).toBe(true);
        path.slice(1).forEach((part, index) => {
          expect(rows[path[index] ?? '']?.some(([component]) => component === part)).toBe(true);
        });
      }),
    );
  });
});
