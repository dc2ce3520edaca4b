import { requireOpenShare } from './checks.js';

/** Lanczos coefficients, g = 7, nine terms. */
const lanczosFirst = 0.99999999999980993;
const lanczosRest: readonly number[] = [
  676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059, 12.507343278686905,
  -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
];

/**
 * Natural logarithm of the gamma function.
 *
 * @param x positive
 * @returns ln Γ(x), relative error about 1e-15
 * @source C. Lanczos, SIAM Journal on Numerical Analysis B 1 (1964); coefficients after P. Godfrey (2001)
 */
export function logGamma(x: number): number {
  if (x < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * x)) - logGamma(1 - x);
  const sum = lanczosRest.reduce((total, coefficient, index) => total + coefficient / (x + index), lanczosFirst);
  const t = x + 6.5;
  return 0.5 * Math.log(2 * Math.PI) + (x - 0.5) * Math.log(t) - t + Math.log(sum);
}

/** Power series of the lower function, best below the mean. */
function lowerBySeries(shape: number, x: number): number {
  let term = 1 / shape;
  let sum = term;
  for (let n = 1; n < 10_000 && Math.abs(term) > Math.abs(sum) * 1e-17; n += 1) {
    term *= x / (shape + n);
    sum += term;
  }
  return sum * Math.exp(-x + shape * Math.log(x) - logGamma(shape));
}

/** Continued fraction of the upper function, best above the mean; evaluated by Lentz's method. */
function upperByFraction(shape: number, x: number): number {
  const tiny = 1e-300;
  let b = x + 1 - shape;
  let c = 1 / tiny;
  let d = 1 / b;
  let value = d;
  for (let i = 1; i < 10_000; i += 1) {
    const a = -i * (i - shape);
    b += 2;
    d = a * d + b;
    if (Math.abs(d) < tiny) d = tiny;
    c = b + a / c;
    if (Math.abs(c) < tiny) c = tiny;
    d = 1 / d;
    const step = d * c;
    value *= step;
    if (Math.abs(step - 1) < 1e-16) break;
  }
  return value * Math.exp(-x + shape * Math.log(x) - logGamma(shape));
}

/**
 * Regularised lower incomplete gamma function P(a, x).
 *
 * @param shape a, positive
 * @param x from 0 on
 * @returns a share from 0 to 1
 * @source M. Abramowitz, I. Stegun, Handbook of Mathematical Functions, 6.5.29 and 6.5.31
 */
export function lowerGammaShare(shape: number, x: number): number {
  if (x <= 0) return 0;
  if (x === Number.POSITIVE_INFINITY) return 1;
  return x < shape + 1 ? lowerBySeries(shape, x) : 1 - upperByFraction(shape, x);
}

/**
 * Regularised upper incomplete gamma function Q(a, x) = 1 − P(a, x), without cancellation in the tail.
 *
 * @param shape a, positive
 * @param x from 0 on
 * @returns a share from 0 to 1
 * @source as {@link lowerGammaShare}
 */
export function upperGammaShare(shape: number, x: number): number {
  if (x <= 0) return 1;
  if (x === Number.POSITIVE_INFINITY) return 0;
  return x < shape + 1 ? 1 - lowerBySeries(shape, x) : upperByFraction(shape, x);
}

/**
 * Quantile of the chi-square distribution.
 *
 * @param share probability below the result, strictly between 0 and 1
 * @param degrees degrees of freedom, positive
 * @returns the quantile, relative error about 1e-13
 * @throws ArithmeticError `statistics_out_of_range`
 * @source inverse of {@link lowerGammaShare} by bisection, which cannot fail to converge
 */
export function chiSquareQuantile(share: number, degrees: number): number {
  requireOpenShare('share', share);
  const below = (x: number): boolean =>
    share < 0.5 ? lowerGammaShare(degrees / 2, x / 2) < share : upperGammaShare(degrees / 2, x / 2) > 1 - share;
  let low = 0;
  let high = Math.max(1, degrees);
  while (below(high)) high *= 2;
  for (let step = 0; step < 1100; step += 1) {
    const middle = low + (high - low) / 2;
    if (middle === low || middle === high) break;
    if (below(middle)) low = middle;
    else high = middle;
  }
  return high;
}
