import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireSample } from './checks.js';
import { controlConstants } from './control-constants.js';
import { type ControlLimits, pointsBeyond } from './control-limits.js';
import { mean } from './summary.js';

export interface SubgroupChart {
  readonly means: readonly number[];
  readonly ranges: readonly number[];
  readonly meanLimits: ControlLimits;
  readonly rangeLimits: ControlLimits;
  /** Short-term standard deviation: mean range over d2. */
  readonly withinDeviation: number;
  /** Positions from 0. */
  readonly meansBeyond: readonly number[];
  readonly rangesBeyond: readonly number[];
}

function checkSubgroups(subgroups: readonly (readonly number[])[]): number {
  const size = subgroups[0]?.length ?? 0;
  if (subgroups.length < 2) throw new ArithmeticError('statistics_too_few', { needed: 2, found: subgroups.length });
  subgroups.forEach((subgroup, index) => {
    if (subgroup.length !== size || size < 2 || size > 25) {
      throw new ArithmeticError('statistics_subgroup_size', { position: index + 1, found: subgroup.length });
    }
  });
  requireSample(subgroups.flat(), 2);
  return size;
}

/**
 * Chart of means and ranges of equal subgroups.
 *
 * @param subgroups at least two, each of the same 2 to 25 values, in any unit
 * @returns limits and the points beyond them, in that unit
 * @throws ArithmeticError `statistics_too_few`, `statistics_subgroup_size`, `statistics_not_a_number`
 * @source NIST/SEMATECH e-Handbook 6.3.2.1
 */
export function subgroupChart(subgroups: readonly (readonly number[])[]): SubgroupChart {
  const { d2, A2, D3, D4 } = controlConstants(checkSubgroups(subgroups));
  const means = subgroups.map((subgroup) => mean(subgroup));
  const ranges = subgroups.map((subgroup) => Math.max(...subgroup) - Math.min(...subgroup));
  const grandMean = mean(means);
  const meanRange = mean(ranges);
  const meanLimits = { centre: grandMean, lower: grandMean - A2 * meanRange, upper: grandMean + A2 * meanRange };
  const rangeLimits = { centre: meanRange, lower: D3 * meanRange, upper: D4 * meanRange };
  return {
    means,
    ranges,
    meanLimits,
    rangeLimits,
    withinDeviation: meanRange / d2,
    meansBeyond: pointsBeyond(means, meanLimits),
    rangesBeyond: pointsBeyond(ranges, rangeLimits),
  };
}
