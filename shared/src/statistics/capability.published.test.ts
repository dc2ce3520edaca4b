import { expect, test } from '@jest/globals';
import { capabilityOf } from './capability.js';

test('the handbook’s example: mean 16, deviation 2, limits 8 and 20', () => {
  // NIST/SEMATECH e-Handbook 6.1.6: Cp 1.0, Cpk 0.6667, Cpu 0.6667, Cpl 1.3333.
  const found = capabilityOf({ mean: 16, deviation: 2, count: 50, degrees: 49 }, { lower: 8, upper: 20 });
  expect(found.spread?.value).toBe(1);
  expect(found.nearer.value).toBeCloseTo(0.6667, 4);
  expect(found.toUpper).toBeCloseTo(0.6667, 4);
  expect(found.toLower).toBeCloseTo(1.3333, 4);
});

test('the piston rings: Cp 1.70 and Cpk 1.66 against 73.95 and 74.05', () => {
  // D. C. Montgomery, Introduction to Statistical Quality Control: Cp and Cpk, rounded; deviation from the mean range.
  const found = capabilityOf(
    { mean: 74.001176, deviation: 0.02276 / 2.326, count: 125, degrees: 100 },
    { lower: 73.95, upper: 74.05 },
  );
  expect(found.spread?.value).toBeCloseTo(1.7033, 3);
  expect(found.nearer.value).toBeCloseTo(1.6632, 3);
});

test('intervals of Cp from chi-square', () => {
  // NIST/SEMATECH e-Handbook 6.1.6, formula of the interval; chi-square at 49 degrees 31.5549 and 70.2224 (A/S table 26.8).
  const found = capabilityOf({ mean: 14, deviation: 2, count: 50, degrees: 49 }, { lower: 8, upper: 20 });
  expect(found.spread?.low).toBeCloseTo(Math.sqrt(31.5549 / 49), 5);
  expect(found.spread?.high).toBeCloseTo(Math.sqrt(70.2224 / 49), 5);
  const half = 1.959964 * Math.sqrt(1 / (9 * 50) + 1 / (2 * 49));
  expect(found.nearer.low).toBeCloseTo(1 - half, 6);
  expect(found.nearer.high).toBeCloseTo(1 + half, 6);
});
