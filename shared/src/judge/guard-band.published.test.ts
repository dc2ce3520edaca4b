import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { conformanceProbability, judgeGuarded } from './guard-band.js';
import { limits } from './limits.js';
import { judgeReading } from './verdict.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('the probability that the true value is within', () => {
  // JCGM 106:2012, section 7, the examples of a diode's breakdown voltage, a container's bursting strength and an oil's
  // viscosity; from memory, recomputed.
  it.each([
    ['a diode at −5.47 V of at most −5.40 V', '-5.47', { upper: '-5.40' }, 0.05, 0.92],
    ['a container at 509.7 kPa of at least 490 kPa', '509.7', { lower: '490' }, 8.6, 0.99],
    ['an oil at 13.6 mm²/s between 12.5 and 16.3', '13.6', { lower: '12.5', upper: '16.3' }, 1.8, 0.66],
  ])('%s', (_what, reading, range, uncertainty, expected) => {
    expect(conformanceProbability(Number(reading), limits(range), uncertainty)).toBeCloseTo(expected, 2);
  });

  // JCGM 106:2012, table 1: probability by distance to a single limit in standard uncertainties; from memory.
  it.each([
    [0.84, 0.8],
    [1.28, 0.9],
    [1.64, 0.95],
    [2.33, 0.99],
    [3.09, 0.999],
  ])('%f standard uncertainties inside is %f', (distance, probability) => {
    const inside = conformanceProbability(10 - distance, limits({ upper: 10 }), 1);
    expect(Math.abs(inside - probability)).toBeLessThan(0.001);
  });
});

describe('guarded limits', () => {
  // ISO 14253-1:2017: 95 % at a single limit, so 1.645 standard uncertainties; from memory.
  const range = limits({ lower: '46.5', upper: '47.5' });

  it.each([
    [47.0, 'conforms'],
    [46.66, 'undecided'],
    [46.67, 'conforms'],
    [47.33, 'conforms'],
    [47.34, 'undecided'],
    [47.5, 'undecided'],
    [47.66, 'undecided'],
    [47.67, 'does-not-conform'],
    [46.33, 'does-not-conform'],
  ])('%f kHz with 0.1 kHz %s', (reading, verdict) => {
    const judged = judgeGuarded(reading, range, 0.1);
    expect(judged.verdict).toBe(verdict);
    expect(judged.guardBand).toBeCloseTo(0.16449, 5);
    expect([judged.acceptFrom, judged.acceptUpTo].map((limit) => limit?.toFixed(3))).toEqual(['46.664', '47.336']);
  });

  it('leave no reading that proves conformity when the measurement is too coarse', () => {
    const judged = judgeGuarded(47, range, 0.5);
    expect(judged.verdict).toBe('undecided');
    expect(judged.acceptFrom).toBeGreaterThan(judged.acceptUpTo ?? Infinity);
  });

  it('with one limit have one', () => {
    const judged = judgeGuarded(58, limits({ upper: 60 }), 1);
    expect(judged).toMatchObject({ verdict: 'conforms' });
    expect(judged.acceptFrom).toBeUndefined();
  });

  it.each<[number, number, number, string]>([
    [47, 0, 0.95, 'judge_uncertainty_not_positive'],
    [47, -1, 0.95, 'judge_uncertainty_not_positive'],
    [47, NaN, 0.95, 'judge_uncertainty_not_positive'],
    [47, Infinity, 0.95, 'judge_uncertainty_not_positive'],
    [NaN, 0.1, 0.95, 'measure_not_a_number'],
    [47, 0.1, 0.5, 'judge_confidence'],
    [47, 0.1, 1, 'judge_confidence'],
  ])('refuse %f with %f at %f', (reading, uncertainty, confidence, code) => {
    expect(codeOf(() => judgeGuarded(reading, range, uncertainty, confidence))).toBe(code);
  });

  it('never prove what the plain limits deny, and shrink to them with the uncertainty', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 45_000, max: 49_000 }),
        fc.integer({ min: 1, max: 500 }),
        (reading, uncertainty) => {
          const plain = judgeReading((reading / 1000).toFixed(3), range).verdict;
          const { verdict } = judgeGuarded(reading / 1000, range, uncertainty / 1000);
          if (verdict === 'conforms') expect(plain).toBe('within');
          if (verdict === 'does-not-conform') expect(plain).toBe('outside');
          const sharp = judgeGuarded(reading / 1000 + 0.0005, range, 1e-9).verdict;
          expect(sharp).toBe(reading >= 46_500 && reading < 47_500 ? 'conforms' : 'does-not-conform');
        },
      ),
    );
  });
});
