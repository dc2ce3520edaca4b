import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import { bills, line } from './bill.builders.js';
import { explodeIndented } from './explode.js';
import { rollUp, type RollUpQuestion } from './roll-up.js';

const prices: Readonly<Record<string, string>> = { cell: '3.20', core: '0.95', screw: '0.04' };
const question = (more: Partial<RollUpQuestion> & Pick<RollUpQuestion, 'bills'>): RollUpQuestion => ({
  unitCost: (part) => prices[part],
  minutes: () => 0,
  labourPerHour: '36',
  ...more,
});

describe('rolling costs up', () => {
  test('materials with their scrap, and minutes at the rate', () => {
    // By hand: 4 × 0.04 / (1 − 0.2) = 0.20; 10 min at 36 an hour = 6.00.
    const costs = rollUp(
      question({
        bills: new Map([['lid', [line('1', 'screw', 4, { scrap: '0.2' })]]]),
        minutes: () => 10,
      }),
    );
    const lid = costs.get('lid');
    expect([lid?.material.toFixed(), lid?.labour.toFixed(), lid?.total.toFixed()]).toEqual(['0.2', '6', '6.2']);
  });

  test('a made part carries its own materials and minutes upward', () => {
    const minutes: Readonly<Record<string, number>> = { iron: 20, pack: 5 };
    const costs = rollUp(
      question({
        bills: bills({
          iron: [
            ['pack', 2],
            ['core', 1],
          ],
          pack: [['cell', 3]],
        }),
        minutes: (part) => minutes[part] ?? 0,
      }),
    );
    // By hand: 2 × 3 × 3.20 + 0.95 = 20.15; 20 + 2 × 5 = 30 min = 18.00.
    const iron = costs.get('iron');
    expect([iron?.material.toFixed(), iron?.minutes.toFixed(), iron?.total.toFixed()]).toEqual([
      '20.15',
      '30',
      '38.15',
    ]);
    expect(costs.get('cell')?.total.toFixed()).toBe('3.2');
  });

  test('what has no cost is named once, however often it occurs', () => {
    const rows = bills({
      iron: [
        ['pack', 1],
        ['label', 2],
        ['core', 1],
      ],
      pack: [['label', 1]],
    });
    const iron = rollUp(question({ bills: rows })).get('iron');
    expect([iron?.unknown, iron?.total.toFixed()]).toEqual([['label'], '0.95']);
  });

  test('a cost of zero is known', () => {
    const rows = bills({ iron: [['gift', 1]] });
    expect(rollUp(question({ bills: rows, unitCost: () => 0 })).get('iron')?.unknown).toEqual([]);
  });

  test('equals the sum over every place of the indented list', () => {
    const edges = fc.uniqueArray(fc.tuple(fc.nat(5), fc.nat(5), fc.integer({ min: 1, max: 4 })), {
      selector: ([a, b]) => `${Math.min(a, b)} ${Math.max(a, b)}`,
      maxLength: 12,
    });
    fc.assert(
      fc.property(edges, (pairs) => {
        const rows: Record<string, [string, number][]> = {};
        for (const [a, b, quantity] of pairs) {
          if (a !== b) (rows[`p${Math.min(a, b)}`] ??= []).push([`p${Math.max(a, b)}`, quantity]);
        }
        const all = bills(rows);
        const priceOf = (part: string) => Number(part.slice(1)) + 1;
        for (const [part, cost] of rollUp(question({ bills: all, unitCost: priceOf }))) {
          const bought = explodeIndented(all, part, 1).filter((row) => !all.has(row.part));
          const own = all.has(part) ? 0 : priceOf(part);
          const sum = bought.reduce(
            (total, row) => total.plus(row.quantity.times(priceOf(row.part))),
            new Decimal(own),
          );
          expect(cost.total.toFixed()).toBe(sum.toFixed());
        }
      }),
    );
  });
});
