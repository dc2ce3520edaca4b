import { requireSample } from './checks.js';
import { controlConstants } from './control-constants.js';
import { type ControlLimits, pointsBeyond } from './control-limits.js';
import { mean } from './summary.js';

export interface IndividualsChart {
  /** Limits of the single values. */
  readonly individuals: ControlLimits;
  /** Limits of the moving ranges; `movingRanges[i]` is between values i and i + 1. */
  readonly ranges: ControlLimits;
  readonly movingRanges: readonly number[];
  /** Short-term standard deviation: mean moving range over d2. */
  readonly withinDeviation: number;
  /** Positions from 0. */
  readonly beyond: readonly number[];
  readonly rangesBeyond: readonly number[];
}

/**
 * Chart of single values with moving ranges of two.
 *
 * d2 of two is used exactly, 2/√π; handbooks round it to 1.128, which widens the limits by 0.03 percent.
 *
 * @param values in the order of measuring, at least two, in any unit
 * @returns limits and the points beyond them, in that unit
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`
 * @source NIST/SEMATECH e-Handbook 6.3.2.2
 */
export function individualsChart(values: readonly number[]): IndividualsChart {
  requireSample(values, 2);
  const movingRanges = values.slice(1).map((value, index) => Math.abs(value - (values[index] ?? value)));
  const centre = mean(values);
  const meanRange = mean(movingRanges);
  const withinDeviation = (meanRange * Math.sqrt(Math.PI)) / 2;
  const individuals = { centre, lower: centre - 3 * withinDeviation, upper: centre + 3 * withinDeviation };
  const { D3, D4 } = controlConstants(2);
  const ranges = { centre: meanRange, lower: D3 * meanRange, upper: D4 * meanRange };
  return {
    individuals,
    ranges,
    movingRanges,
    withinDeviation,
    beyond: pointsBeyond(values, individuals),
    rangesBeyond: pointsBeyond(movingRanges, ranges),
  };
}
