import { expect, test } from '@jest/globals';
import { survivalCurve } from './survival.js';

test('weeks in remission, 6-MP arm', () => {
  // E. Freireich et al. (1963), in J. Klein, M. Moeschberger, Survival Analysis, chapter 4; log-log limits as R survfit.
  const times = [6, 6, 6, 6, 7, 9, 10, 10, 11, 13, 16, 17, 19, 20, 22, 23, 25, 32, 32, 34, 35];
  const events = [1, 1, 1, 0, 1, 0, 1, 0, 0, 1, 1, 0, 0, 0, 1, 1, 0, 0, 0, 0, 0];
  const curve = survivalCurve(times.map((time, index) => ({ time, event: events[index] === 1 })));
  const published = [
    [6, 21, 3, 0.857143, 0.07636, 0.619718, 0.951552],
    [7, 17, 1, 0.806723, 0.086935, 0.563147, 0.922809],
    [10, 15, 1, 0.752941, 0.09635, 0.5032, 0.889362],
    [13, 12, 1, 0.690196, 0.106815, 0.43161, 0.849066],
    [16, 11, 1, 0.627451, 0.114054, 0.367511, 0.804912],
    [22, 7, 1, 0.537815, 0.128234, 0.267779, 0.746791],
    [23, 6, 1, 0.448179, 0.134591, 0.188052, 0.680143],
  ] as const;
  expect(curve.steps).toHaveLength(published.length);
  published.forEach(([time, atRisk, count, survival, error, low, high], index) => {
    const step = curve.steps[index];
    expect(step).toMatchObject({ time, atRisk, events: count });
    expect(step?.survival).toBeCloseTo(survival, 6);
    expect(step?.standardError).toBeCloseTo(error, 6);
    expect(step?.low).toBeCloseTo(low, 5);
    expect(step?.high).toBeCloseTo(high, 5);
  });
  expect(curve.median).toBe(23);
});
