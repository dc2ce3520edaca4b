import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireCount } from './checks.js';
import { chiSquareQuantile } from './gamma-distribution.js';
import { individualsChart } from './individuals-chart.js';
import { twoSidedReach } from './normal-distribution.js';
import { mean, standardDeviation } from './summary.js';

/** Limits in the unit of the values; leave one out where there is none. */
export interface CapabilityLimits {
  readonly lower?: number | undefined;
  readonly upper?: number | undefined;
}

export interface CapabilityIndex {
  readonly value: number;
  /** Two-sided confidence interval. */
  readonly low: number;
  readonly high: number;
}

export interface Capability {
  /** Spread against the width of the limits; undefined with one limit only. */
  readonly spread: CapabilityIndex | undefined;
  /** Distance of the mean to the nearer limit. */
  readonly nearer: CapabilityIndex;
  /** Distance of the mean to each limit over three standard deviations. */
  readonly toLower: number | undefined;
  readonly toUpper: number | undefined;
  readonly confidence: number;
}

export interface CapabilityStudy {
  readonly count: number;
  readonly mean: number;
  /** Short-term standard deviation from moving ranges, and that of all values. */
  readonly withinDeviation: number;
  readonly overallDeviation: number;
  /** Cp and Cpk: what the process does in the short term. */
  readonly capability: Capability;
  /** Pp and Ppk: what it did over the whole time. */
  readonly performance: Capability;
}

interface Estimate {
  readonly mean: number;
  readonly deviation: number;
  readonly count: number;
  /** Degrees of freedom of the deviation. */
  readonly degrees: number;
}

function checkLimits({ lower, upper }: CapabilityLimits): void {
  if (lower === undefined && upper === undefined) throw new ArithmeticError('statistics_no_limit');
  if (lower !== undefined && upper !== undefined && !(lower < upper)) {
    throw new ArithmeticError('statistics_limits_crossed', { lower: String(lower), upper: String(upper) });
  }
}

/**
 * Capability indices of a mean and a standard deviation against limits.
 *
 * @param estimate mean and standard deviation in the unit of the limits, how many values they rest on, and the degrees
 * of freedom of the deviation
 * @param limits at least one
 * @param confidence of the two-sided intervals
 * @returns the indices with their intervals; the interval of the nearer one is an approximation for normal values
 * @throws ArithmeticError `statistics_no_limit`, `statistics_limits_crossed`, `statistics_no_spread`,
 * `statistics_not_a_count`, `statistics_out_of_range`
 * @source NIST/SEMATECH e-Handbook 6.1.6; A. F. Bissell, Applied Statistics 39 (1990), for the interval of Cpk
 */
export function capabilityOf(estimate: Estimate, limits: CapabilityLimits, confidence = 0.95): Capability {
  checkLimits(limits);
  requireCount('number of values', estimate.count, 2);
  if (!(estimate.deviation > 0)) throw new ArithmeticError('statistics_no_spread');
  const { lower, upper } = limits;
  const reach = 3 * estimate.deviation;
  const toLower = lower === undefined ? undefined : (estimate.mean - lower) / reach;
  const toUpper = upper === undefined ? undefined : (upper - estimate.mean) / reach;
  const value = Math.min(toLower ?? Number.POSITIVE_INFINITY, toUpper ?? Number.POSITIVE_INFINITY);
  const z = twoSidedReach(confidence);
  const half = z * Math.sqrt(1 / (9 * estimate.count) + (value * value) / (2 * estimate.degrees));
  return {
    spread:
      lower === undefined || upper === undefined
        ? undefined
        : spreadIndex((upper - lower) / (2 * reach), estimate, confidence),
    nearer: { value, low: value - half, high: value + half },
    toLower,
    toUpper,
    confidence,
  };
}

/** The interval of Cp follows exactly from that of the standard deviation. */
function spreadIndex(value: number, { degrees }: Estimate, confidence: number): CapabilityIndex {
  const tail = (1 - confidence) / 2;
  return {
    value,
    low: value * Math.sqrt(chiSquareQuantile(tail, degrees) / degrees),
    high: value * Math.sqrt(chiSquareQuantile(1 - tail, degrees) / degrees),
  };
}

/**
 * Capability (short term) and performance (all values) of one characteristic.
 *
 * @param values in the order of measuring, at least two, not all equal, in the unit of the limits
 * @param limits at least one
 * @param confidence of the intervals
 * @returns both sets of indices. Moving ranges overlap, so their deviation is given 0.62 (n − 1) degrees of freedom
 * @throws ArithmeticError as {@link capabilityOf}, `statistics_too_few`, `statistics_not_a_number`
 * @source NIST/SEMATECH e-Handbook 6.1.6 and 6.3.2.2; degrees of freedom of the mean moving range: common practice, no
 * source
 */
export function capabilityStudy(
  values: readonly number[],
  limits: CapabilityLimits,
  confidence = 0.95,
): CapabilityStudy {
  checkLimits(limits);
  const { withinDeviation } = individualsChart(values);
  const overallDeviation = standardDeviation(values);
  const count = values.length;
  const centre = mean(values);
  const of = (deviation: number, degrees: number): Capability =>
    capabilityOf({ mean: centre, deviation, count, degrees }, limits, confidence);
  return {
    count,
    mean: centre,
    withinDeviation,
    overallDeviation,
    capability: of(withinDeviation, Math.max(1, 0.62 * (count - 1))),
    performance: of(overallDeviation, count - 1),
  };
}
