import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireSample } from './checks.js';
import { normalShareBelow } from './normal-distribution.js';
import { mean, standardDeviation } from './summary.js';

export interface NormalityCheck {
  /** Anderson–Darling statistic A², without unit. */
  readonly statistic: number;
  /** A² corrected for mean and deviation being estimated. */
  readonly corrected: number;
  /** Chance of a statistic at least this large if the values are normal. */
  readonly probability: number;
}

/**
 * Chance of a corrected statistic at least this large if the values are normal, in four pieces.
 *
 * @param a the corrected statistic
 * @returns a probability; the pieces are fits, good to about three digits
 * @source R. D'Agostino, M. Stephens, Goodness-of-Fit Techniques (1986), table 4.9
 */
export function normalityProbability(a: number): number {
  if (a >= 0.6) return Math.exp(1.2937 - 5.709 * a + 0.0186 * a * a);
  if (a >= 0.34) return Math.exp(0.9177 - 4.279 * a - 1.38 * a * a);
  if (a >= 0.2) return 1 - Math.exp(-8.318 + 42.796 * a - 59.938 * a * a);
  return 1 - Math.exp(-13.436 + 101.14 * a - 223.73 * a * a);
}

/**
 * Whether values may come from a normal distribution, by the test of Anderson and Darling.
 *
 * @param values at least eight, not all equal, in any unit
 * @returns statistic and probability; a small probability (below 0.05, say) speaks against normal
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`, `statistics_no_spread`
 * @source NIST/SEMATECH e-Handbook 1.3.5.14; probability after R. D'Agostino, M. Stephens, Goodness-of-Fit Techniques
 * (1986), table 4.9
 */
export function checkNormality(values: readonly number[]): NormalityCheck {
  requireSample(values, 8);
  const centre = mean(values);
  const deviation = standardDeviation(values);
  if (!(deviation > 0)) throw new ArithmeticError('statistics_no_spread');
  const n = values.length;
  const z = values.map((value) => (value - centre) / deviation).sort((left, right) => left - right);
  const sum = z.reduce((total, low, index) => {
    const high = z[n - 1 - index] ?? low;
    return total + (2 * index + 1) * (Math.log(normalShareBelow(low)) + Math.log(normalShareBelow(-high)));
  }, 0);
  const statistic = -n - sum / n;
  const corrected = statistic * (1 + 0.75 / n + 2.25 / (n * n));
  return { statistic, corrected, probability: Math.min(1, Math.max(0, normalityProbability(corrected))) };
}
