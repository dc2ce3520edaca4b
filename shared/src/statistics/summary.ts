import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireSample } from './checks.js';

export interface Summary {
  readonly count: number;
  /** In the unit of the values. */
  readonly mean: number;
  /** Sample standard deviation, divisor n − 1, in the unit of the values; undefined for one value. */
  readonly standardDeviation: number | undefined;
  readonly least: number;
  readonly greatest: number;
}

/**
 * Adds doubles with the rounding error of each step carried along.
 *
 * @param values any numbers
 * @returns their sum, correct to about the last place even where large terms cancel; 0 for none
 * @source A. Neumaier, "Rundungsfehleranalyse einiger Verfahren zur Summation endlicher Summen", ZAMM 54 (1974)
 */
export function compensatedSum(values: Iterable<number>): number {
  let sum = 0;
  let lost = 0;
  for (const value of values) {
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}

/**
 * Arithmetic mean.
 *
 * @param values at least one, in any unit
 * @returns the mean in that unit
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`
 * @source definition; the second pass corrects the first (T. Chan, G. Golub, R. LeVeque, The American Statistician 37
 * (1983), "Algorithms for computing the sample variance")
 */
export function mean(values: readonly number[]): number {
  requireSample(values, 1);
  const first = scaledMean(values);
  return first + compensatedSum(values.map((value) => (value - first) / values.length));
}

/** Dividing before adding keeps the sum of enormous values from overflowing. */
function scaledMean(values: readonly number[]): number {
  const sum = compensatedSum(values);
  return Number.isFinite(sum) ? sum / values.length : compensatedSum(values.map((value) => value / values.length));
}

/**
 * Sample variance, divisor n − 1, by two passes with the residual of the first taken out.
 *
 * @param values at least two, in any unit
 * @returns the variance in that unit squared
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`
 * @source Chan, Golub, LeVeque (1983), corrected two-pass algorithm
 */
export function variance(values: readonly number[]): number {
  requireSample(values, 2);
  const centre = mean(values);
  const residual = compensatedSum(values.map((value) => value - centre));
  const squares = compensatedSum(values.map((value) => (value - centre) ** 2));
  return Math.max(0, (squares - (residual * residual) / values.length) / (values.length - 1));
}

/**
 * Sample standard deviation, divisor n − 1.
 *
 * @param values at least two, in any unit
 * @returns the standard deviation in that unit
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`
 */
export const standardDeviation = (values: readonly number[]): number => Math.sqrt(variance(values));

/**
 * Count, mean, standard deviation, least and greatest of a sample.
 *
 * @param values at least one, in any unit
 * @returns the summary in that unit
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`
 */
export function summarise(values: readonly number[]): Summary {
  requireSample(values, 1);
  return {
    count: values.length,
    mean: mean(values),
    standardDeviation: values.length < 2 ? undefined : standardDeviation(values),
    least: values.reduce((least, value) => Math.min(least, value)),
    greatest: values.reduce((greatest, value) => Math.max(greatest, value)),
  };
}

/**
 * Lag-one autocorrelation: how much each value resembles the one before it. Control limits from moving ranges are too
 * narrow where it is clearly positive.
 *
 * @param values in the order of measuring, at least two, not all equal
 * @returns a number from −1 to 1
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`, `statistics_no_spread`
 * @source NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.5.12
 */
export function lagOneAutocorrelation(values: readonly number[]): number {
  requireSample(values, 2);
  const centre = mean(values);
  const deviations = values.map((value) => value - centre);
  const squares = compensatedSum(deviations.map((deviation) => deviation * deviation));
  if (squares === 0) throw new ArithmeticError('statistics_no_spread');
  return compensatedSum(deviations.slice(1).map((deviation, index) => deviation * (deviations[index] ?? 0))) / squares;
}
