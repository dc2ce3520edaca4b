import { describe, expect, test } from '@jest/globals';
import { meanTimeInterval, rateInterval, rateUpperBound } from './failure-rate.js';
import { quantile } from './quantile.js';
import { wilsonInterval } from './wilson-interval.js';
import { rolledThroughputYield } from './yields.js';

describe('Wilson intervals at 95 percent', () => {
  // R. G. Newcombe, Statistics in Medicine 17 (1998) 857-872, table I, method 3; from memory, recomputed.
  test.each([
    [81, 263, 0.2553, 0.3662],
    [1, 29, 0.0061, 0.1718],
    [0, 20, 0, 0.1611],
  ])('%d of %d', (successes, trials, low, high) => {
    const found = wilsonInterval(successes, trials);
    expect(found.low).toBeCloseTo(low, 4);
    expect(found.high).toBeCloseTo(high, 4);
  });
});

describe('mean time between failures', () => {
  // NIST/SEMATECH e-Handbook 8.4.5.1: 800 h, 2 failures, 90 percent: 127 to 2251 h with factors 0.3177 and 5.6281.
  test('800 hours with two failures', () => {
    const found = meanTimeInterval(2, 800, 0.9);
    expect(found.meanTime).toBe(400);
    expect(found.low / 400).toBeCloseTo(0.3177, 4);
    expect((found.high ?? 0) / 400).toBeCloseTo(5.6281, 4);
    expect(found.low).toBeCloseTo(127.069, 3);
    expect(found.high).toBeCloseTo(2251.2286, 3);
  });

  test('no failure in 1000 hours', () => {
    // NIST/SEMATECH e-Handbook 8.4.5.1, zero failures: T / (-ln a).
    expect(meanTimeInterval(0, 1000, 0.9)).toEqual({
      meanTime: undefined,
      low: expect.closeTo(434.2945, 4),
      high: undefined,
    });
    expect(1 / rateUpperBound(0, 1000, 0.9)).toBeCloseTo(434.2945, 4);
  });

  test('one failure in a year, 60 percent', () => {
    const found = meanTimeInterval(1, 8760, 0.6);
    expect(found.low).toBeCloseTo(2925.5504, 3);
    expect(found.high).toBeCloseTo(39257.2402, 2);
  });
});

test('exact limits of a rate: four returns in 720 unit-months', () => {
  // F. Garwood, Biometrika 28 (1936), limits of a Poisson mean by chi-square; cohorts constructed.
  const found = rateInterval(4, 720);
  expect(found.rate).toBeCloseTo(0.00555556, 8);
  expect(found.low).toBeCloseTo(0.0015137, 7);
  expect(found.high).toBeCloseTo(0.01422443, 8);
});

test('the ninetieth percentile of twelve gauge readings', () => {
  // NIST/SEMATECH e-Handbook 7.2.6.2: 95.1981; data and result from memory.
  const readings = [
    95.1772, 95.1567, 95.1937, 95.1959, 95.1442, 95.061, 95.1591, 95.1195, 95.1065, 95.0925, 95.199, 95.1682,
  ];
  expect(quantile(readings, 0.9, 'exclusive')).toBeCloseTo(95.1981, 4);
});

test('first-pass and rolled throughput yield', () => {
  // Common practice, no source: the product of the steps' first-pass yields.
  const found = rolledThroughputYield([
    { tried: 50, passedFirst: 47 },
    { tried: 50, passedFirst: 49 },
    { tried: 50, passedFirst: 45 },
  ]);
  expect(found.firstPass).toEqual([0.94, 0.98, 0.9]);
  expect(found.rolledThroughput).toBeCloseTo(0.82908, 10);
  expect(found.perStep).toBeCloseTo(0.939432, 6);
});
