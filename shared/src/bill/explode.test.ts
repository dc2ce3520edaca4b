import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import type { BillLine, Bills } from './bill-lines.js';
import { alternate, bills, line } from './bill.builders.js';
import { explode, explodeIndented } from './explode.js';
import { issueQuantity } from './requirement.js';

const pieces = (): number => 0;

function firstQuantity(rows: Bills, quantity: string | number, decimals = pieces): string | undefined {
  return explode(rows, 'iron', quantity, decimals)[0]?.quantity.toFixed();
}

describe('explosion', () => {
  test('a part without a bill explodes to nothing', () => {
    expect(explode(new Map(), 'screw', 10)).toEqual([]);
  });

  test('normal loss is reckoned on the whole batch and rounded up once', () => {
    const rows: Bills = new Map([['iron', [line('1', 'screw', 4, { scrap: '0.02' })]]]);
    expect(firstQuantity(rows, 40)).toBe('164');
    expect(firstQuantity(rows, 1)).toBe('5');
  });

  test('a quotient that comes out even is not pushed up a piece', () => {
    const rows: Bills = new Map([['iron', [line('1', 'sleeve', '0.9', { scrap: '0.1' })]]]);
    expect(firstQuantity(rows, 100)).toBe('100');
    expect(firstQuantity(rows, 3)).toBe('3');
  });

  test('zero takes zero, however small the quantity per', () => {
    const rows: Bills = new Map([['iron', [line('1', 'flux', '0.000001', { scrap: '0.3' })]]]);
    expect(firstQuantity(rows, 0)).toBe('0');
    expect(firstQuantity(rows, 1)).toBe('1');
  });

  test('large figures stay exact', () => {
    const rows: Bills = new Map([['iron', [line('1', 'wire', '123456789.123456')]]]);
    const scaled = 123456789123456n * 123456789012n;
    expect(new Decimal(firstQuantity(rows, '123456789012', () => 6) ?? 0).times(1_000_000).toFixed()).toBe(`${scaled}`);
  });

  test.each(['NaN', 'Infinity', 'four', ''])('a quantity of "%s" is refused', (quantity) => {
    expect(() => explode(new Map(), 'iron', quantity)).toThrow();
  });

  test('a quantity below zero is refused', () => {
    expect(() => explode(new Map(), 'iron', '-1')).toThrow('The quantity of -1 is below zero.');
  });

  test.each<[BillLine, string]>([
    [line('1', 'screw', 0), 'the quantity must be above zero'],
    [line('1', 'screw', '-2'), 'the quantity must be above zero'],
    [line('1', 'screw', 'NaN'), 'the quantity must be above zero'],
    [line('1', 'screw', 1, { scrap: '-0.1' }), 'is not from 0 to below 1'],
    [line('1', 'screw', 1, { scrap: '1' }), 'is not from 0 to below 1'],
    [line('1', 'screw', 1, { scrap: 'NaN' }), 'is not from 0 to below 1'],
    [line('1', 'screw', 1, { alternates: [alternate('bolt', 1, 0)] }), 'factor of alternate bolt'],
    [line('1', 'screw', 1, { alternates: [alternate('screw')] }), 'screw stands there twice'],
  ])('a line that cannot be computed with is refused (%#)', (bad, reason) => {
    expect(() => explode(new Map([['iron', [bad]]]), 'iron', 1)).toThrow(reason);
  });

  test('a position twice is refused', () => {
    const rows: Bills = new Map([['iron', [line('1', 'screw', 1), line('1', 'nut', 1)]]]);
    expect(() => explode(rows, 'iron', 1)).toThrow('the position stands there twice');
  });

  test('the same part on two lines is summed', () => {
    const twice: [string, number][] = [
      ['screw', 2],
      ['screw', 3],
    ];
    expect(explode(bills({ iron: twice }), 'iron', 2)).toHaveLength(1);
    expect(firstQuantity(bills({ iron: twice }), 2)).toBe('10');
  });

  test('the indented list, summed by part, agrees with the explosion', () => {
    const edge = fc.tuple(fc.nat(6), fc.nat(6), fc.integer({ min: 1, max: 9 }), fc.constantFrom('0', '0.2', '0.5'));
    fc.assert(
      fc.property(fc.array(edge, { maxLength: 15 }), fc.nat(50), (pairs, quantity) => {
        const rows = new Map<string, BillLine[]>();
        for (const [a, b, per, scrap] of pairs) {
          if (a === b) continue;
          const [parent, component] = [`p${Math.min(a, b)}`, `p${Math.max(a, b)}`];
          const lines = rows.get(parent) ?? [];
          rows.set(parent, [...lines, line(String(lines.length), component, per, { scrap })]);
        }
        const sums = new Map<string, Decimal>();
        for (const row of explodeIndented(rows, 'p0', quantity)) {
          sums.set(row.part, row.quantity.plus(sums.get(row.part) ?? 0));
        }
        const totals = explode(rows, 'p0', quantity, () => 20);
        expect(sums.size).toBe(totals.length);
        for (const { part, quantity: total } of totals) expect(sums.get(part)?.toFixed()).toBe(total.toFixed());
      }),
    );
  });

  test('an indented list that would run away is refused', () => {
    const doubling: Bills = new Map(
      Array.from({ length: 40 }, (_, n) => [`p${n}`, [line('1', `p${n + 1}`, 1), line('2', `p${n + 1}`, 1)]]),
    );
    expect(() => explodeIndented(doubling, 'p0', 1)).toThrow('more than 20000 places');
    expect(explode(doubling, 'p0', 1).at(-1)?.quantity.toFixed()).toBe((2n ** 40n).toString());
  });
});

describe('issue quantity', () => {
  test.each([
    ['40', '4', '0.02', 0, '164'],
    ['3', '0.3333', '0', 2, '1'],
    ['3', '0.3334', '0', 2, '1.01'],
    ['0', '5', '0.5', 0, '0'],
    ['7', '1', '0.3', 0, '10'],
    ['1', '1', '0.0001', 0, '2'],
  ])('%s × %s with %s lost, at %s decimals, takes %s', (batch, per, scrap, decimals, expected) => {
    expect(issueQuantity(batch, line('1', 'screw', per, { scrap }), decimals).toFixed()).toBe(expected);
  });

  test('what is left after the loss is enough, and one step less would not be', () => {
    const milli = (most: number): fc.Arbitrary<Decimal> =>
      fc.integer({ min: 1, max: most }).map((n) => new Decimal(n).div(1000));
    fc.assert(
      fc.property(milli(1e7), milli(1e7), milli(999), fc.integer({ min: 0, max: 4 }), (batch, per, scrap, decimals) => {
        const taken = issueQuantity(batch, { quantityPer: per, scrapShare: scrap }, decimals);
        const need = batch.times(per);
        const left = (amount: Decimal): Decimal => amount.times(new Decimal(1).minus(scrap));
        expect(left(taken).greaterThanOrEqualTo(need)).toBe(true);
        expect(left(taken.minus(new Decimal(10).pow(-decimals))).lessThan(need)).toBe(true);
      }),
    );
  });
});
