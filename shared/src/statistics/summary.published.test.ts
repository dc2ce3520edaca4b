import { describe, expect, test } from '@jest/globals';
import { lagOneAutocorrelation, mean, standardDeviation } from './summary.js';
import { noMoments, runningDeviation, withValue } from './running-moments.js';

// NIST Statistical Reference Datasets, univariate summary statistics: data and certified values.
const michelson = [
  299.85, 299.74, 299.9, 300.07, 299.93, 299.85, 299.95, 299.98, 299.98, 299.88, 300.0, 299.98, 299.93, 299.65, 299.76,
  299.81, 300.0, 300.0, 299.96, 299.96, 299.96, 299.94, 299.96, 299.94, 299.88, 299.8, 299.85, 299.88, 299.9, 299.84,
  299.83, 299.79, 299.81, 299.88, 299.88, 299.83, 299.8, 299.79, 299.76, 299.8, 299.88, 299.88, 299.88, 299.86, 299.72,
  299.72, 299.62, 299.86, 299.97, 299.95, 299.88, 299.91, 299.85, 299.87, 299.84, 299.84, 299.85, 299.84, 299.84,
  299.84, 299.89, 299.81, 299.81, 299.82, 299.8, 299.77, 299.76, 299.74, 299.75, 299.76, 299.91, 299.92, 299.89, 299.86,
  299.88, 299.72, 299.84, 299.85, 299.85, 299.78, 299.89, 299.84, 299.78, 299.81, 299.76, 299.81, 299.79, 299.81,
  299.82, 299.85, 299.87, 299.87, 299.81, 299.74, 299.81, 299.94, 299.95, 299.8, 299.81, 299.87,
];
const alternating = (base: number): number[] => [
  base + 0.2,
  ...Array.from({ length: 1000 }, (_, index) => (index % 2 === 0 ? base + 0.1 : base + 0.3)),
];

/** Digits that agree, as the data sets count them. */
const agreeingDigits = (found: number, certified: number): number =>
  found === certified ? 15 : -Math.log10(Math.abs(found - certified) / Math.abs(certified));

describe('NIST StRD univariate', () => {
  test.each([
    ['Michelso', michelson, 299.8524, 0.0790105478190518, 0.535199668621283, 13, 13, 12],
    ['NumAcc1', [10000001, 10000003, 10000002], 10000002, 1, -0.5, 15, 15, 15],
    ['NumAcc2', alternating(1), 1.2, 0.1, -0.999, 14, 13, 13],
    // The data themselves, as doubles, are off by up to 6e-11 of their spread, so no method has more than nine digits.
    ['NumAcc3', alternating(1_000_000), 1000000.2, 0.1, -0.999, 15, 9, 9],
    // As doubles NumAcc4 has a spacing of 1.9e-9: eight digits of the standard deviation are all that is in them.
    ['NumAcc4', alternating(10_000_000), 10000000.2, 0.1, -0.999, 15, 8, 8],
  ] as const)('%s', (_name, values, average, deviation, lagOne, averageDigits, deviationDigits, lagDigits) => {
    expect(agreeingDigits(mean(values), average)).toBeGreaterThanOrEqual(averageDigits);
    expect(agreeingDigits(standardDeviation(values), deviation)).toBeGreaterThanOrEqual(deviationDigits);
    expect(agreeingDigits(lagOneAutocorrelation(values), lagOne)).toBeGreaterThanOrEqual(lagDigits);
  });

  test('the running form keeps up', () => {
    const moments = alternating(1_000_000).reduce(withValue, noMoments);
    expect(agreeingDigits(runningDeviation(moments) ?? 0, 0.1)).toBeGreaterThanOrEqual(8);
  });
});
