import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireCount } from './checks.js';
import { type ControlLimits, pointsBeyond } from './control-limits.js';

/** One inspected group: units looked at and units found nonconforming. */
export interface InspectedGroup {
  readonly inspected: number;
  readonly nonconforming: number;
}

export interface ShareChart {
  readonly shares: readonly number[];
  readonly centre: number;
  /** One pair per group, since groups may differ in size. */
  readonly limits: readonly ControlLimits[];
  /** Positions from 0. */
  readonly beyond: readonly number[];
}

export interface FaultChart {
  readonly limits: ControlLimits;
  readonly beyond: readonly number[];
}

/**
 * Chart of the share nonconforming (p chart), for groups of any size.
 *
 * @param groups at least one, each with at least one unit inspected
 * @returns shares from 0 to 1 with limits cut at 0 and 1
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_count`, `statistics_more_than_all`
 * @source NIST/SEMATECH e-Handbook 6.3.3.2
 */
export function shareChart(groups: readonly InspectedGroup[]): ShareChart {
  if (groups.length === 0) throw new ArithmeticError('statistics_too_few', { needed: 1, found: 0 });
  for (const { inspected, nonconforming } of groups) {
    requireCount('number of units inspected', inspected, 1);
    requireCount('number of nonconforming units', nonconforming, 0);
    if (nonconforming > inspected) {
      throw new ArithmeticError('statistics_more_than_all', {
        name: 'nonconforming units',
        found: nonconforming,
        most: inspected,
      });
    }
  }
  const total = groups.reduce((sum, group) => sum + group.inspected, 0);
  const centre = groups.reduce((sum, group) => sum + group.nonconforming, 0) / total;
  const shares = groups.map((group) => group.nonconforming / group.inspected);
  const limits = groups.map(({ inspected }) => {
    const reach = 3 * Math.sqrt((centre * (1 - centre)) / inspected);
    return { centre, lower: Math.max(0, centre - reach), upper: Math.min(1, centre + reach) };
  });
  return { shares, centre, limits, beyond: pointsBeyond(shares, limits) };
}

/**
 * Chart of the number of faults in groups of equal size (c chart).
 *
 * @param counts faults per group, at least one group
 * @returns limits in faults, the lower one cut at 0
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_count`
 * @source NIST/SEMATECH e-Handbook 6.3.3.1
 */
export function faultChart(counts: readonly number[]): FaultChart {
  if (counts.length === 0) throw new ArithmeticError('statistics_too_few', { needed: 1, found: 0 });
  counts.forEach((count) => requireCount('number of faults', count, 0));
  const centre = counts.reduce((sum, count) => sum + count, 0) / counts.length;
  const reach = 3 * Math.sqrt(centre);
  const limits = { centre, lower: Math.max(0, centre - reach), upper: centre + reach };
  return { limits, beyond: pointsBeyond(counts, limits) };
}
