import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { quantile, median } from './quantile.js';
import { joinMoments, noMoments, runningDeviation, withValue } from './running-moments.js';
import { compensatedSum, lagOneAutocorrelation, mean, standardDeviation, summarise } from './summary.js';

const codeOf = (compute: () => unknown): string => {
  try {
    compute();
  } catch (error) {
    if (error instanceof ArithmeticError) return error.code;
    throw error;
  }
  return 'no fault';
};
const values = fc.array(fc.integer({ min: -1_000_000, max: 1_000_000 }), { minLength: 2, maxLength: 60 });

/** Exact mean and sum of squared deviations in whole numbers: n² var = n Σx² − (Σx)². */
function exactVariance(sample: readonly number[]): number {
  const n = BigInt(sample.length);
  const sum = sample.reduce((total, value) => total + BigInt(value), 0n);
  const squares = sample.reduce((total, value) => total + BigInt(value) * BigInt(value), 0n);
  return Number(n * squares - sum * sum) / Number(n * (n - 1n));
}

describe('mean and standard deviation', () => {
  test('agree with whole-number arithmetic', () => {
    fc.assert(
      fc.property(values, (sample) => {
        const exact = exactVariance(sample);
        expect(Math.abs(standardDeviation(sample) ** 2 - exact)).toBeLessThanOrEqual(1e-12 * exact + 1e-12);
      }),
    );
  });

  test('shifting by a power of two moves the mean and leaves the deviation', () => {
    fc.assert(
      fc.property(values, (sample) => {
        const shifted = sample.map((value) => value + 2 ** 40);
        expect(mean(shifted) - 2 ** 40).toBeCloseTo(mean(sample), 3);
        expect(standardDeviation(shifted)).toBeCloseTo(standardDeviation(sample), 3);
      }),
    );
  });

  test('enormous values do not overflow the mean', () => {
    expect(mean([1.7e308, 1.7e308, 1.7e308]) / 1.7e308).toBeCloseTo(1, 14);
    expect(compensatedSum([1e100, 1, -1e100])).toBe(1);
  });

  test('one value has a mean and no deviation; none has neither', () => {
    expect(summarise([4.2])).toEqual({ count: 1, mean: 4.2, standardDeviation: undefined, least: 4.2, greatest: 4.2 });
    expect(codeOf(() => summarise([]))).toBe('statistics_too_few');
    expect(codeOf(() => standardDeviation([1]))).toBe('statistics_too_few');
    expect(codeOf(() => mean([1, Number.NaN]))).toBe('statistics_not_a_number');
    expect(codeOf(() => mean([1, Number.POSITIVE_INFINITY]))).toBe('statistics_not_a_number');
  });

  test('equal values have no spread', () => {
    expect(standardDeviation([0.1, 0.1, 0.1])).toBe(0);
    expect(codeOf(() => lagOneAutocorrelation([0.1, 0.1, 0.1]))).toBe('statistics_no_spread');
  });
});

test('running moments joined in any cut agree with the whole', () => {
  fc.assert(
    fc.property(values, fc.nat(), (sample, at) => {
      const cut = at % sample.length;
      const left = sample.slice(0, cut).reduce(withValue, noMoments);
      const right = sample.slice(cut).reduce(withValue, noMoments);
      const joined = joinMoments(left, right);
      expect(joined.count).toBe(sample.length);
      expect(joined.mean).toBeCloseTo(mean(sample), 6);
      expect(runningDeviation(joined) ?? Number.NaN).toBeCloseTo(standardDeviation(sample), 6);
    }),
  );
  expect(runningDeviation(noMoments)).toBeUndefined();
  expect(joinMoments(noMoments, noMoments)).toEqual(noMoments);
});

describe('quantiles', () => {
  test('lie between the extremes, rise with the share, and meet both ends', () => {
    fc.assert(
      fc.property(
        values,
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (sample, a, b) => {
          for (const rule of ['inclusive', 'exclusive'] as const) {
            const low = quantile(sample, Math.min(a, b), rule);
            const high = quantile(sample, Math.max(a, b), rule);
            expect(low).toBeLessThanOrEqual(high + 1e-9);
            expect(quantile(sample, 0, rule)).toBe(Math.min(...sample));
            expect(quantile(sample, 1, rule)).toBe(Math.max(...sample));
          }
        },
      ),
    );
  });

  test('the median of an even number is half-way', () => {
    expect(median([4, 1, 3, 2])).toBe(2.5);
    expect(median([7])).toBe(7);
    expect(codeOf(() => quantile([1], 1.5))).toBe('statistics_out_of_range');
  });
});
