import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import type { BillLine, Bills } from './bill-lines.js';
import { alternate, bills, line } from './bill.builders.js';
import { explode } from './explode.js';
import { alternateUses, implode, implodeIndented } from './implode.js';

const text = (rows: ReturnType<typeof implode>): string[] =>
  rows.map((row) => `${row.part} ${row.nearest}-${row.farthest} ${row.quantity.toFixed()}${row.isTop ? ' top' : ''}`);

describe('where-used', () => {
  test('a part in no bill is used nowhere', () => {
    expect(implode(bills({ iron: [['core', 1]] }), 'screw')).toEqual([]);
    expect(implode(new Map(), 'screw')).toEqual([]);
  });

  test('direct and deeper uses of one parent are one row, with both distances', () => {
    const rows: Bills = new Map([
      ['iron', [line('1', 'board', 1), line('2', 'screw', 2)]],
      ['board', [line('1', 'screw', 4)]],
      ['kit', [line('1', 'iron', 1), line('2', 'screw', 1)]],
    ]);
    expect(text(implode(rows, 'screw'))).toEqual(['iron 1-2 6', 'board 1-1 4', 'kit 1-3 7 top']);
  });

  test('parts beside the way play no role, even a cycle there', () => {
    const rows = bills({
      iron: [
        ['core', 1],
        ['P', 1],
      ],
      P: [['Q', 1]],
      Q: [['P', 1]],
    });
    expect(text(implode(rows, 'core'))).toEqual(['iron 1-1 1 top']);
    expect(() => implode(rows, 'Q')).toThrow('contains itself');
  });

  test('every way upward is one row of the indented list', () => {
    const rows = bills({
      iron: [
        ['board', 1],
        ['screw', 2],
      ],
      board: [['screw', 4]],
    });
    const ways = implodeIndented(rows, 'screw').map(({ path, quantity }) =>
      [...path.map((step) => step.parent), quantity.toFixed()].join(' '),
    );
    expect(ways).toEqual(['iron 2', 'board 4', 'board iron 4']);
    expect(() => implodeIndented(rows, 'screw', 2)).toThrow('more than 2 places');
  });

  test('a part that may stand in is listed apart', () => {
    const rows: Bills = new Map([['iron', [line('7', 'switch', 1, { alternates: [alternate('relay')] })]]]);
    expect(implode(rows, 'relay')).toEqual([]);
    expect(alternateUses(rows, 'relay')).toEqual([{ parent: 'iron', position: '7', insteadOf: 'switch' }]);
  });

  test('agrees with exploding every parent', () => {
    const edge = fc.tuple(fc.nat(6), fc.nat(6), fc.integer({ min: 1, max: 9 }), fc.constantFrom('0', '0.2', '0.5'));
    fc.assert(
      fc.property(fc.array(edge, { maxLength: 15 }), (pairs) => {
        const rows = new Map<string, BillLine[]>();
        for (const [a, b, per, scrap] of pairs) {
          if (a === b) continue;
          const parent = `p${Math.min(a, b)}`;
          const lines = rows.get(parent) ?? [];
          rows.set(parent, [...lines, line(`${lines.length}`, `p${Math.max(a, b)}`, per, { scrap })]);
        }
        const found = new Map(implode(rows, 'p6').map((row) => [row.part, row.quantity]));
        for (const parent of rows.keys()) {
          const need = explode(rows, parent, 1, () => 30).find((row) => row.part === 'p6')?.quantity;
          expect(found.get(parent)?.toFixed()).toBe(need?.toFixed());
        }
        const sums = new Map<string, Decimal>();
        for (const { path, quantity } of implodeIndented(rows, 'p6')) {
          const parent = path.at(-1)?.parent ?? '';
          sums.set(parent, quantity.plus(sums.get(parent) ?? 0));
        }
        expect([...sums].map(([part, sum]) => `${part} ${sum.toFixed()}`).toSorted()).toEqual(
          [...found].map(([part, sum]) => `${part} ${sum.toFixed()}`).toSorted(),
        );
      }),
    );
  });
});
