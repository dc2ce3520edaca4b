import { describe, expect, test } from '@jest/globals';
import { chiSquareQuantile, logGamma, lowerGammaShare, upperGammaShare } from './gamma-distribution.js';
import { normalQuantile, normalShareBelow, twoSidedReach } from './normal-distribution.js';

const close = (found: number, expected: number, relative: number) =>
  expect(Math.abs(found - expected)).toBeLessThanOrEqual(relative * Math.abs(expected));

// Values of an independent implementation: SciPy 1.17, scipy.stats.chi2.ppf, norm.ppf, norm.cdf, scipy.special.gammaln.
describe('distributions agree with SciPy', () => {
  test.each([
    [0.05, 1, 0.003932140000019522],
    [0.95, 1, 3.841458820694124],
    [0.025, 4, 0.4844185570879299],
    [0.975, 10, 20.483177350807388],
    [0.5, 30, 29.336031516661585],
    [0.99, 200, 249.4451229814416],
    [1e-6, 3, 0.00024181048720124264],
    [0.999999, 2, 27.631021115871036],
  ])('chi-square: %d at %d degrees', (share, degrees, expected) => {
    close(chiSquareQuantile(share, degrees), expected, 1e-11);
  });

  test.each([
    [1e-10, -6.361340902404056],
    [0.001, -3.090232306167813],
    [0.025, -1.9599639845400545],
    [0.3, -0.5244005127080409],
    [0.5, 0.0],
    [0.9, 1.2815515655446004],
    [0.999999, 4.753424308817087],
  ])('normal quantile of %d', (share, expected) => {
    if (expected === 0) expect(normalQuantile(share)).toBeCloseTo(0, 15);
    else close(normalQuantile(share), expected, 1e-13);
  });

  test.each([
    [-8, 6.22096057427174e-16],
    [-3, 0.0013498980316300933],
    [-0.5, 0.3085375387259869],
    [0, 0.5],
    [1, 0.8413447460685429],
    [2.5, 0.9937903346742238],
  ])('normal share below %d', (z, expected) => {
    close(normalShareBelow(z), expected, 1e-13);
  });

  test.each([
    [0.1, 2.252712651734206],
    [0.5, 0.5723649429247],
    [1, 0.0],
    [3.7, 1.428072326665388],
    [50, 144.56574394634487],
    [10000.0, 82099.71749644238],
  ])('log gamma of %d', (x, expected) => {
    if (expected === 0) expect(Math.abs(logGamma(x))).toBeLessThan(1e-14);
    else close(logGamma(x), expected, 1e-13);
  });
});

test('the usual reach of 95 percent is 1.959964', () => {
  // Abramowitz, Stegun, Handbook of Mathematical Functions, table 26.5.
  expect(twoSidedReach(0.95)).toBeCloseTo(1.959964, 6);
});

test('both tails of the gamma function add up to one', () => {
  for (const shape of [0.5, 1, 7.3, 120]) {
    for (const x of [0, 0.01, 1, 7, 119, 400]) {
      expect(lowerGammaShare(shape, x) + upperGammaShare(shape, x)).toBeCloseTo(1, 14);
    }
  }
});
