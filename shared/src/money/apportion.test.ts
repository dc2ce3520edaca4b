import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { apportion } from './apportion.js';
import { minorAmount, sumMinor } from './minor-units.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

/** The same method told differently: hand out the units one by one, each to the share furthest below its due. */
function handOutOneByOne(total: number, weights: readonly number[]): readonly number[] {
  const all = BigInt(weights.reduce((sum, weight) => sum + weight, 0));
  const shares = weights.map((weight) => (BigInt(weight) * BigInt(total)) / all);
  for (let left = BigInt(total) - shares.reduce((sum, share) => sum + share, 0n); left > 0n; left -= 1n) {
    const short = shares.map((share, index) => BigInt(weights[index] ?? 0) * BigInt(total) - share * all);
    const most = short.reduce((best, value, index) => (value > (short[best] ?? 0n) ? index : best), 0);
    shares[most] = (shares[most] ?? 0n) + 1n;
  }
  return shares.map(Number);
}

describe('splitting an amount', () => {
  it('gives what is left over to the earlier share on a tie', () => {
    expect(apportion(minorAmount(100), [1, 1, 1])).toEqual([34, 33, 33]);
    expect(apportion(minorAmount(2), [1, 1, 1])).toEqual([1, 1, 0]);
  });

  it('splits a negative amount like its opposite', () => {
    expect(apportion(minorAmount(-100), [1, 1, 1])).toEqual([-34, -33, -33]);
  });

  it('gives nothing to a share of weight zero', () => {
    expect(apportion(minorAmount(7), [0, '0.3', 0])).toEqual([0, 7, 0]);
    expect(apportion(minorAmount(-1), ['0', 2])).toEqual([0, -1]);
  });

  it('splits nothing over anything, even over nothing', () => {
    expect(apportion(minorAmount(0), [3, 2])).toEqual([0, 0]);
    expect(apportion(minorAmount(0), [0, 0])).toEqual([0, 0]);
    expect(apportion(minorAmount(0), [])).toEqual([]);
    expect(apportion(minorAmount(9), ['0.000001'])).toEqual([9]);
  });

  it.each([
    [[], 'money_no_weight'],
    [[0, '0.00'], 'money_no_weight'],
    [[1, -1], 'money_weight_negative'],
    [['x'], 'measure_not_a_number'],
    [[0.5], 'measure_not_exact'],
  ])('refuses weights %p', (weights, code) => {
    expect(codeOf(() => apportion(minorAmount(5), weights))).toBe(code);
  });

  it('splits the largest amount there is', () => {
    const shares = apportion(minorAmount(Number.MAX_SAFE_INTEGER), ['1', '0.0000000001', '3']);
    expect(sumMinor(shares)).toBe(Number.MAX_SAFE_INTEGER);
  });

  it('adds up, stays within one unit of the exact share, and agrees with handing out one by one', () => {
    const weights = fc
      .array(fc.integer({ min: 0, max: 1_000_000 }), { minLength: 1, maxLength: 30 })
      .filter((list) => list.some((weight) => weight > 0));
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1_000_000_000 }), weights, (total, list) => {
        const shares = apportion(minorAmount(total), list);
        expect(sumMinor(shares)).toBe(total);
        expect(shares).toEqual(handOutOneByOne(total, list));
        const all = list.reduce((sum, weight) => sum + weight, 0);
        shares.forEach((share, index) => expect(Math.abs(share - ((list[index] ?? 0) * total) / all)).toBeLessThan(1));
      }),
    );
  });
});
