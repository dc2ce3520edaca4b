import { ArithmeticError } from '../errors/arithmetic-error.js';
import { normalQuantile, normalShareBelow } from '../statistics/normal-distribution.js';
import type { Limits } from './limits.js';

/**
 * What can be said of a reading when its uncertainty is counted.
 *
 * - `conforms`: proven to be within the limits
 * - `does-not-conform`: proven to be outside
 * - `undecided`: too close to a limit to prove either
 */
export type GuardedVerdict = 'conforms' | 'undecided' | 'does-not-conform';

/** A guarded judgement. */
export interface GuardedJudgement {
  readonly verdict: GuardedVerdict;
  /** Width of the guard band, in the characteristic's unit. */
  readonly guardBand: number;
  /** Lowest reading that proves conformity; above `acceptUpTo` if none can. */
  readonly acceptFrom?: number;
  /** Highest reading that proves conformity. */
  readonly acceptUpTo?: number;
  /** Probability that the true value is within the limits, 0 to 1. */
  readonly conformanceProbability: number;
}

/**
 * Judges a reading with its uncertainty: conformity is proven inside the limits less the guard band, nonconformity
 * outside the limits plus it.
 *
 * @param reading in the characteristic's unit
 * @param allowed the limits
 * @param standardUncertainty of the measurement, same unit, more than zero (the expanded one with k = 2 halved)
 * @param confidence probability a decision must have at a single limit; 0.95 is the standard's default
 * @returns verdict, guard band, acceptance range and conformance probability
 * @throws ArithmeticError `judge_uncertainty_not_positive`, `judge_confidence`, `measure_not_a_number`
 * @source ISO 14253-1:2017, 5.2 and 5.3 and its default of 95 % (the guard band is then 1.645 standard uncertainties);
 *   from memory. The normal distribution is presumed.
 */
export function judgeGuarded(
  reading: number,
  allowed: Limits,
  standardUncertainty: number,
  confidence = 0.95,
): GuardedJudgement {
  if (!(confidence > 0.5 && confidence < 1)) throw new ArithmeticError('judge_confidence', { confidence });
  const conformance = conformanceProbability(reading, allowed, standardUncertainty);
  const guardBand = normalQuantile(confidence) * standardUncertainty;
  const lower = allowed.lower?.toNumber();
  const upper = allowed.upper?.toNumber();
  const acceptFrom = lower === undefined ? undefined : lower + guardBand;
  const acceptUpTo = upper === undefined ? undefined : upper - guardBand;
  const conforms = reading >= (acceptFrom ?? -Infinity) && reading <= (acceptUpTo ?? Infinity);
  const fails = reading < (lower ?? -Infinity) - guardBand || reading > (upper ?? Infinity) + guardBand;
  return {
    verdict: conforms ? 'conforms' : fails ? 'does-not-conform' : 'undecided',
    guardBand,
    ...(acceptFrom !== undefined && { acceptFrom }),
    ...(acceptUpTo !== undefined && { acceptUpTo }),
    conformanceProbability: conformance,
  };
}

/**
 * Probability that the true value lies within the limits.
 *
 * @param reading in the characteristic's unit
 * @param allowed the limits
 * @param standardUncertainty same unit, more than zero
 * @returns 0 to 1, for a normal distribution around the reading
 * @throws ArithmeticError `judge_uncertainty_not_positive`, `measure_not_a_number`
 * @source JCGM 106:2012, 7.2 to 7.4.
 */
export function conformanceProbability(reading: number, allowed: Limits, standardUncertainty: number): number {
  if (!Number.isFinite(reading)) throw new ArithmeticError('measure_not_a_number', { value: String(reading) });
  if (!(standardUncertainty > 0) || !Number.isFinite(standardUncertainty)) {
    throw new ArithmeticError('judge_uncertainty_not_positive', { uncertainty: standardUncertainty });
  }
  const z = (limit: number) => (limit - reading) / standardUncertainty;
  const belowLower = allowed.lower === undefined ? 0 : normalShareBelow(z(allowed.lower.toNumber()));
  const aboveUpper = allowed.upper === undefined ? 0 : normalShareBelow(-z(allowed.upper.toNumber()));
  return Math.max(0, 1 - belowLower - aboveUpper);
}
