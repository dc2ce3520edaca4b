import { describe, expect, test } from '@jest/globals';
import { acceptanceOfLot, acceptanceOfProcess, shareAtAcceptance } from './operating-characteristic.js';
import { codeLetterOf, samplingPlan, tightenedAfter } from './sampling-plan.js';
import { inspectionLevels } from './sampling-tables.js';

describe('ISO 2859-1:1999', () => {
  // Table 1 (identical to IS 2500 Part 1:2000, page 19).
  test.each([
    [2, 'AAAAAAB'],
    [15, 'AAAAABC'],
    [25, 'AABBBCD'],
    [50, 'ABBCCDE'],
    [90, 'BBCCCEF'],
    [150, 'BBCDDFG'],
    [280, 'BCDEEGH'],
    [500, 'BCDEFHJ'],
    [1200, 'CCEFGJK'],
  ])('code letters of a lot of %d', (lot, letters) => {
    expect(inspectionLevels.map((level) => codeLetterOf(lot, level)).join('')).toBe(letters);
  });

  // Table 2-A (IS 2500 Part 1:2000, page 20), level II: letter of the plan, its sample size, acceptance number.
  const limits = [0.65, 1, 1.5, 2.5, 4];
  test.each([
    [5, 'F5/0 E5/0 D5/0 C5/0 B3/0'],
    [12, 'F12/0 E12/0 D8/0 C5/0 B3/0'],
    [40, 'F20/0 E13/0 D8/0 C5/0 E13/1'],
    [75, 'F20/0 E13/0 D8/0 F20/1 E13/1'],
    [120, 'F20/0 E13/0 G32/1 F20/1 F20/2'],
    [400, 'J80/1 H50/1 H50/2 H50/3 H50/5'],
    [1000, 'J80/1 J80/2 J80/3 J80/5 J80/7'],
    [5000, 'L200/3 L200/5 L200/7 L200/10 L200/14'],
    [20000, 'M315/5 M315/7 M315/10 M315/14 M315/21'],
  ])('plans of a lot of %d; the sample size moves with the arrow', (lot, plans) => {
    const found = limits.map((limit) => samplingPlan(lot, limit));
    expect(found.map((plan) => `${plan.planLetter}${plan.sample}/${plan.accept}`).join(' ')).toBe(plans);
    for (const plan of found) {
      expect(plan.reject).toBe(plan.accept + 1);
      expect(plan.inspectAll).toBe(plan.sample === lot);
    }
  });

  test('tightened inspection begins when two of five or fewer lots in a row are not accepted', () => {
    // Clause 9.3.1; lots 3 and 8 lie too far apart, lots 8 and 10 do not.
    expect(tightenedAfter('AANAAAANAN'.split('').map((result) => result === 'A'))).toBe(10);
    expect(tightenedAfter([true, true, false, true, true])).toBeUndefined();
  });
});

describe('operating characteristic', () => {
  // Binomial, recomputed; for n = 80, Ac = 2 MIL-STD-105E table X-J prints 0.550, 1.03, 1.38, 3.33, 6.52, 7.66 percent.
  test.each([
    [13, 0, [0.936915, 0.877521, 0.719548, 0.513342, 0.254187]],
    [50, 1, [0.973868, 0.910565, 0.643511, 0.279432, 0.033786]],
    [80, 2, [0.992288, 0.953447, 0.676691, 0.230621, 0.010684]],
    [125, 3, [0.996252, 0.962551, 0.618906, 0.123785, 0.001042]],
  ])('sample %d, accept %d', (sample, accept, expected) => {
    [0.005, 0.01, 0.025, 0.05, 0.1].forEach((share, index) => {
      expect(acceptanceOfProcess(sample, accept, share)).toBeCloseTo(expected[index] ?? Number.NaN, 6);
    });
  });

  test('shares at given chances of acceptance', () => {
    const percent = [0.99, 0.95, 0.9, 0.5, 0.1, 0.05].map((chance) => 100 * shareAtAcceptance(80, 2, chance));
    [0.55, 1.03, 1.38, 3.33, 6.52, 7.66].forEach((printed, index) => {
      expect(Math.abs((percent[index] ?? 0) - printed)).toBeLessThan(0.006);
    });
  });

  test('a lot by itself: 40 pieces, 13 inspected', () => {
    // Hypergeometric, exact: one nonconforming is missed with 27/40.
    expect(acceptanceOfLot(40, 1, 13, 0)).toBeCloseTo(27 / 40, 10);
    expect(acceptanceOfLot(40, 2, 13, 0)).toBeCloseTo(0.45, 10);
    expect(acceptanceOfLot(40, 4, 13, 0)).toBeCloseTo(0.192034, 6);
  });
});
