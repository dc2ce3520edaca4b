import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import type { BillLine } from './bill-lines.js';
import { alternate, line } from './bill.builders.js';
import type { BuildQuestion } from './build-network.js';
import type { PlannedQuantity } from './build-plan.js';
import { buildable } from './buildable.js';
import { nextUnit } from './next-unit.js';

function question(bills: Record<string, BillLine[]>, onHand: Record<string, number>): BuildQuestion {
  return {
    bills: new Map(Object.entries(bills)),
    part: 'iron',
    onHand: new Map(Object.entries(onHand)),
    decimals: () => 0,
  };
}

const text = (rows: readonly PlannedQuantity[]): string[] =>
  rows.map(({ part, quantity }) => `${quantity.toFixed()} ${part}`);

function next(asked: BuildQuestion, cost?: (part: string) => number | undefined): ReturnType<typeof nextUnit> {
  return nextUnit(asked, buildable(asked).quantity, cost);
}

describe('what stops the next one', () => {
  test('the missing part and how much of it', () => {
    const asked = question({ iron: [line('1', 'cell', 6), line('2', 'core', 1)] }, { cell: 20, core: 9 });
    expect(text(next(asked).missing)).toEqual(['4 cell']);
    expect(text(next(asked).aloneEnough)).toEqual(['4 cell']);
  });

  test('two parts that run out together are both named, and neither is enough alone', () => {
    const asked = question({ iron: [line('1', 'cell', 6), line('2', 'core', 1)] }, { cell: 18, core: 3 });
    expect(text(next(asked).missing)).toEqual(['6 cell', '1 core']);
    expect(next(asked).aloneEnough).toEqual([]);
  });

  test('what lies deeper is named, not the sub-assembly that could be made from it', () => {
    const asked = question({ iron: [line('1', 'pack', 1)], pack: [line('1', 'cell', 3)] }, { pack: 1, cell: 4 });
    expect(text(next(asked).missing)).toEqual(['2 cell']);
  });

  test('either of two alternates is enough; the cheaper one is advised', () => {
    const bills = { iron: [line('1', 'a', 1, { alternates: [alternate('b')] })] };
    const asked = question(bills, { a: 1, b: 1 });
    expect(text(next(asked, (part) => (part === 'b' ? 2 : 3)).missing)).toEqual(['1 b']);
    expect(text(next(asked, (part) => (part === 'b' ? 4 : 3)).missing)).toEqual(['1 a']);
    expect(text(next(asked).aloneEnough).toSorted()).toEqual(['1 a', '1 b']);
  });

  test('freeing a shared part through another one’s alternate counts as enough alone', () => {
    const bills = { iron: [line('1', 'a', 1), line('2', 'a', 1, { alternates: [alternate('c')] })] };
    expect(text(next(question(bills, { a: 4, c: 0 })).aloneEnough).toSorted()).toEqual(['2 a', '2 c']);
    expect(text(next(question(bills, { a: 2, c: 9 })).aloneEnough)).toEqual(['1 a']);
    expect(text(next(question(bills, { a: 3, c: 0 })).aloneEnough).toSorted()).toEqual(['1 a', '1 c']);
  });

  test('adding what is missing lets exactly one more be built', () => {
    const lines = fc.array(
      fc.record({
        parts: fc.uniqueArray(fc.constantFrom('a', 'b', 'c', 'd'), { minLength: 1, maxLength: 3 }),
        per: fc.integer({ min: 1, max: 4 }),
      }),
      { minLength: 1, maxLength: 5 },
    );
    const stock = fc.record({ a: fc.nat(20), b: fc.nat(20), c: fc.nat(20), d: fc.nat(20) });
    fc.assert(
      fc.property(lines, stock, (rows, onHand) => {
        const bill = rows.map(({ parts: [own = 'a', ...others], per }, index) =>
          line(`${index}`, own, per, { alternates: others.map((part, rank) => alternate(part, rank)) }),
        );
        const asked = question({ iron: bill }, onHand);
        const now = buildable(asked).quantity;
        const answer = nextUnit(asked, now);
        const withMore = (more: readonly PlannedQuantity[]): BuildQuestion => ({
          ...asked,
          onHand: new Map([
            ...asked.onHand,
            ...more.map(({ part, quantity }) => [part, quantity.plus(asked.onHand.get(part) ?? 0)] as const),
          ]),
        });
        expect(answer.proven).toBe(true);
        expect(buildable(withMore(answer.missing)).quantity.minus(now).toNumber()).toBeGreaterThanOrEqual(1);
        for (const remedy of answer.aloneEnough) {
          expect(
            buildable(withMore([remedy]))
              .quantity.minus(now)
              .toNumber(),
          ).toBeGreaterThanOrEqual(1);
          const less = { part: remedy.part, quantity: remedy.quantity.minus(1) };
          expect(buildable(withMore([less])).quantity.toFixed()).toBe(now.toFixed());
        }
        expect(answer.missing.length === 1 ? answer.aloneEnough.length > 0 : true).toBe(true);
      }),
      { numRuns: 200 },
    );
  });
});
