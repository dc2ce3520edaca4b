import { describe, expect, test } from '@jest/globals';
import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import type { Bills } from './bill-lines.js';
import { bills, line } from './bill.builders.js';
import { explode, explodeIndented } from './explode.js';
import { issueQuantity } from './requirement.js';

const pieces = (): number => 0;

describe('explosion', () => {
  test('a part without a bill explodes to nothing', () => {
    expect(explode(new Map(), 'screw', 10)).toEqual([]);
  });

  test('an allowance is added to the whole batch and rounded up once', () => {
    const rows: Bills = new Map([['iron', [line('1', 'screw', 4, { scrap: '0.02' })]]]);
    expect(explode(rows, 'iron', 40, pieces)[0]?.quantity.toString()).toBe('164');
    expect(explode(rows, 'iron', 1, pieces)[0]?.quantity.toString()).toBe('5');
  });

  test('an exact product is not pushed up a piece by binary fractions', () => {
    const rows: Bills = new Map([['iron', [line('1', 'sleeve', '0.1', { scrap: '0.1' })]]]);
    expect(explode(rows, 'iron', 100, pieces)[0]?.quantity.toString()).toBe('11');
  });

  test('zero takes zero, however small the quantity per', () => {
    const rows: Bills = new Map([['iron', [line('1', 'flux', '0.000001', { scrap: '0.3' })]]]);
    expect(explode(rows, 'iron', 0, pieces)[0]?.quantity.toString()).toBe('0');
  });

  test('large figures stay exact', () => {
    const rows: Bills = new Map([['iron', [line('1', 'wire', '123456789.123456', { scrap: '0.123456' })]]]);
    const scaled = 123456789123456n * 1123456n * 123456789012n;
    const quantity = explode(rows, 'iron', '123456789012')[0]?.quantity;
    expect(quantity?.times('1e12').toFixed()).toBe(scaled.toString());
  });

  test.each(['-1', 'NaN', 'Infinity', 'four'])('a quantity of %s is refused', (quantity) => {
    expect(() => explode(new Map(), 'iron', quantity)).toThrow(/quantity is/);
  });

  test.each([
    [line('1', 'screw', 0), 'quantity per must be above zero'],
    [line('1', 'screw', '-2'), 'quantity per must be above zero'],
    [line('1', 'screw', 'NaN'), 'quantity per must be above zero'],
    [line('1', 'screw', 1, { scrap: '-0.1' }), 'scrap allowance must not be negative'],
  ])('a line that cannot be computed with is refused (%#)', (bad, reason) => {
    expect(() => explode(new Map([['iron', [bad]]]), 'iron', 1)).toThrow(reason);
  });

  test('a position twice is refused', () => {
    const rows: Bills = new Map([['iron', [line('1', 'screw', 1), line('1', 'nut', 1)]]]);
    expect(() => explode(rows, 'iron', 1)).toThrow('1 stands twice');
  });

  test('the same part on two lines is summed', () => {
    const rows = bills({
      iron: [
        ['screw', 2],
        ['screw', 3],
      ],
    });
    expect(explode(rows, 'iron', 2)).toHaveLength(1);
    expect(explode(rows, 'iron', 2)[0]?.quantity.toString()).toBe('10');
  });

  test('the indented list, summed by part, agrees with the explosion', () => {
    const edges = fc.array(fc.tuple(fc.nat(6), fc.nat(6), fc.integer({ min: 1, max: 9 }), fc.nat(20)), {
      maxLength: 15,
    });
    fc.assert(
      fc.property(edges, fc.nat(50), (pairs, quantity) => {
        const rows = new Map<string, ReturnType<typeof line>[]>();
        for (const [a, b, per, scrap] of pairs) {
          if (a === b) continue;
          const [parent, component] = [`p${Math.min(a, b)}`, `p${Math.max(a, b)}`];
          const lines = rows.get(parent) ?? [];
          lines.push(line(String(lines.length), component, per, { scrap: new Decimal(scrap).div(100).toString() }));
          rows.set(parent, lines);
        }
        const sums = new Map<string, Decimal>();
        for (const row of explodeIndented(rows, 'p0', quantity)) {
          sums.set(row.part, row.quantity.plus(sums.get(row.part) ?? 0));
        }
        for (const { part, quantity: total } of explode(rows, 'p0', quantity)) {
          expect(sums.get(part)?.toString()).toBe(total.toString());
        }
        expect(sums.size).toBe(explode(rows, 'p0', quantity).length);
      }),
    );
  });

  test('an indented list that would run away is refused', () => {
    const doubling: Bills = new Map(
      Array.from({ length: 40 }, (_, n) => [`p${n}`, [line('1', `p${n + 1}`, 1), line('2', `p${n + 1}`, 1)]]),
    );
    expect(() => explodeIndented(doubling, 'p0', 1)).toThrow('more than 20000 places');
    expect(explode(doubling, 'p0', 1).at(-1)?.quantity.toString()).toBe((2n ** 40n).toString());
  });
});

describe('issue quantity', () => {
  test.each([
    ['40', '1.02', 0, '41'],
    ['3', '0.3333', 2, '1'],
    ['3', '0.3334', 2, '1.01'],
    ['0', '5', 0, '0'],
    ['7', '1.25', undefined, '8.75'],
  ])('%s × %s at %s decimals takes %s', (batch, per, decimals, expected) => {
    expect(issueQuantity(batch, per, decimals).toString()).toBe(expected);
  });

  test('never below the exact need, and less than one step above it', () => {
    const part = fc.integer({ min: 0, max: 10_000_000 });
    fc.assert(
      fc.property(part, part, fc.integer({ min: 0, max: 4 }), (a, b, decimals) => {
        const [batch, per] = [new Decimal(a).div(1000), new Decimal(b).div(1000)];
        const over = issueQuantity(batch, per, decimals).minus(batch.times(per));
        expect(over.greaterThanOrEqualTo(0) && over.lessThan(new Decimal(10).pow(-decimals))).toBe(true);
      }),
    );
  });
});
