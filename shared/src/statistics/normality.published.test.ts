import { expect, test } from '@jest/globals';
import { checkNormality, normalityProbability } from './normality.js';

test('percentage points of the corrected statistic', () => {
  // R. D'Agostino, M. Stephens, Goodness-of-Fit Techniques (1986), table 4.7, mean and deviation estimated; from memory.
  for (const [point, level] of [
    [0.631, 0.1],
    [0.752, 0.05],
    [0.873, 0.025],
    [1.035, 0.01],
  ] as const) {
    expect(Math.abs(normalityProbability(point) / level - 1)).toBeLessThan(0.02);
  }
});

test('the statistic of a skewed sample', () => {
  // Independent implementation: SciPy 1.17, scipy.stats.anderson(x, 'norm').statistic.
  const found = checkNormality([0.1, 0.2, 0.2, 0.3, 0.4, 0.5, 0.7, 1.1, 1.9, 3.2, 5.5, 9.0]);
  expect(found.statistic).toBeCloseTo(1.4671311083234286, 12);
  expect(found.probability).toBeLessThan(0.001);
});
