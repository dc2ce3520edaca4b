import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { Decimal } from '../measure/decimal.js';
import { minorAmount, sumMinor, type MinorAmount } from './minor-units.js';
import { averageUnitCost, costPool, emptyPool, issueFromPool, receiveIntoPool, revaluePool } from './movement-value.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('the value a stock movement carries', () => {
  it('gives three issues of a third their cents, the last taking the remainder', () => {
    const start = costPool(3, minorAmount(100));
    const first = issueFromPool(start, 1);
    const second = issueFromPool(first.pool, 1);
    const third = issueFromPool(second.pool, 1);
    expect([first.value, second.value, third.value]).toEqual([-33, -34, -33]);
    expect(third.pool).toEqual(emptyPool);
  });

  it('rounds a half cent to even, or up when asked', () => {
    expect(issueFromPool(costPool(2, minorAmount(5)), 1).value).toBe(-2);
    expect(issueFromPool(costPool(2, minorAmount(5)), 1, 'half-up').value).toBe(-3);
  });

  it('averages a second receipt in', () => {
    const pool = receiveIntoPool(costPool('10', minorAmount(2500)), '4', minorAmount(1240)).pool;
    expect(pool.value).toBe(3740);
    expect(averageUnitCost(pool, 2)?.toFixed()).toBe('2.671429');
    expect(averageUnitCost(emptyPool, 2)).toBeUndefined();
  });

  it('takes what is free for nothing', () => {
    expect(Object.is(issueFromPool(costPool(5, minorAmount(0)), 2).value, 0)).toBe(true);
  });

  it('changes a value only while something is held, and never below zero', () => {
    expect(revaluePool(costPool(5, minorAmount(100)), minorAmount(-100)).pool.value).toBe(0);
    expect(codeOf(() => revaluePool(emptyPool, minorAmount(1)))).toBe('money_pool_empty');
    expect(codeOf(() => revaluePool(costPool(5, minorAmount(100)), minorAmount(-101)))).toBe('money_pool_broken');
  });

  it.each<[string, () => unknown, string]>([
    [
      'an issue of more than is held',
      () => issueFromPool(costPool('1.5', minorAmount(9)), '1.500001'),
      'more_than_held',
    ],
    ['an issue of nothing', () => issueFromPool(costPool(1, minorAmount(9)), 0), 'quantity_not_positive'],
    ['a negative issue', () => issueFromPool(costPool(1, minorAmount(9)), -1), 'quantity_not_positive'],
    ['a receipt of nothing', () => receiveIntoPool(emptyPool, '0.000', minorAmount(5)), 'quantity_not_positive'],
    ['a receipt of negative value', () => receiveIntoPool(emptyPool, 1, minorAmount(-5)), 'value_negative'],
    ['a value without a quantity', () => costPool(0, minorAmount(1)), 'pool_broken'],
    ['a negative quantity', () => costPool(-1, minorAmount(0)), 'pool_broken'],
  ])('refuses %s', (_what, compute, code) => {
    expect(codeOf(compute)).toBe(`money_${code}`);
  });

  const step = fc.record({
    kind: fc.constantFrom('in', 'out'),
    quantity: fc.integer({ min: 1, max: 5_000_000 }),
    value: fc.integer({ min: 0, max: 10_000_000 }),
  });

  it('keeps pool value = sum of movements, within what was paid, and zero at zero, over any history', () => {
    fc.assert(
      fc.property(fc.array(step, { maxLength: 60 }), fc.constantFrom('half-even', 'half-up'), (steps, mode) => {
        let pool = emptyPool;
        const values: MinorAmount[] = [];
        for (const { kind, quantity, value } of steps) {
          const millionths = new Decimal(quantity).div(1_000_000);
          if (kind === 'out' && pool.quantity.isZero()) continue;
          const taken = Decimal.min(millionths, pool.quantity);
          const moved =
            kind === 'in' ? receiveIntoPool(pool, millionths, minorAmount(value)) : issueFromPool(pool, taken, mode);
          if (kind === 'out') {
            const exact = new Decimal(pool.value).times(taken).div(pool.quantity);
            expect(exact.plus(moved.value).abs().lessThanOrEqualTo(0.5)).toBe(true);
          }
          values.push(moved.value);
          pool = moved.pool;
          expect(pool.value).toBe(sumMinor(values));
          expect(pool.value).toBeGreaterThanOrEqual(0);
          if (pool.quantity.isZero()) expect(pool.value).toBe(0);
        }
      }),
    );
  });
});
