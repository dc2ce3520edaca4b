import { requireOpenShare } from './checks.js';
import { lowerGammaShare, upperGammaShare } from './gamma-distribution.js';

/**
 * Share of the standard normal distribution below a value.
 *
 * @param z standard deviations from the mean
 * @returns a share from 0 to 1, exact also far in the lower tail
 * @source Φ(z) = Q(½, z²/2) / 2 below the mean (Abramowitz, Stegun 26.2.30)
 */
export function normalShareBelow(z: number): number {
  const half = (z * z) / 2;
  return z < 0 ? upperGammaShare(0.5, half) / 2 : 0.5 + lowerGammaShare(0.5, half) / 2;
}

/** Rational approximation by P. Acklam, relative error 1.15e-9; only the start for the refinement. */
function roughQuantile(share: number): number {
  const a = [
    -3.969683028665376e1, 2.209460984245205e2, -2.759285104469687e2, 1.38357751867269e2, -3.066479806614716e1,
    2.506628277459239,
  ];
  const b = [
    -5.447609879822406e1, 1.615858368580409e2, -1.556989798598866e2, 6.680131188771972e1, -1.328068155288572e1, 1,
  ];
  const c = [
    -7.784894002430293e-3, -3.223964580411365e-1, -2.400758277161838, -2.549732539343734, 4.374664141464968,
    2.938163982698783,
  ];
  const d = [7.784695709041462e-3, 3.224671290700398e-1, 2.445134137142996, 3.754408661907416, 1];
  const polynomial = (coefficients: readonly number[], x: number): number =>
    coefficients.reduce((sum, coefficient) => sum * x + coefficient, 0);
  if (share < 0.02425) {
    const q = Math.sqrt(-2 * Math.log(share));
    return polynomial(c, q) / polynomial(d, q);
  }
  const q = share - 0.5;
  return (q * polynomial(a, q * q)) / polynomial(b, q * q);
}

/**
 * Quantile of the standard normal distribution.
 *
 * @param share probability below the result, strictly between 0 and 1
 * @returns standard deviations from the mean
 * @throws ArithmeticError `statistics_out_of_range`
 * @source P. J. Acklam's approximation, refined by two steps of Halley's method against {@link normalShareBelow}
 */
export function normalQuantile(share: number): number {
  requireOpenShare('share', share);
  if (share > 0.5) return -normalQuantile(1 - share);
  let z = roughQuantile(share);
  for (let step = 0; step < 2; step += 1) {
    const error = (normalShareBelow(z) - share) * Math.sqrt(2 * Math.PI) * Math.exp((z * z) / 2);
    z -= error / (1 + (z * error) / 2);
  }
  return z;
}

/**
 * How many standard deviations a two-sided interval reaches.
 *
 * @param confidence strictly between 0 and 1, for example 0.95
 * @returns for example 1.959964
 * @throws ArithmeticError `statistics_out_of_range`
 */
export function twoSidedReach(confidence: number): number {
  requireOpenShare('confidence', confidence);
  return -normalQuantile((1 - confidence) / 2);
}
