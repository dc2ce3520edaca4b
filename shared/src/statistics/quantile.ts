import { requireSample, requireShare } from './checks.js';

/**
 * Where the quantile lies between the ordered values. Both are in use: `exclusive` counts (n + 1) gaps, as handbooks of
 * quality control do; `inclusive` counts (n − 1), as spreadsheets and most software do.
 */
export type QuantileRule = 'exclusive' | 'inclusive';

/**
 * Quantile of a sample, interpolated between the two neighbours.
 *
 * @param values at least one, in any unit and order
 * @param share from 0 (least) to 1 (greatest); 0.5 is the median
 * @param rule how positions are counted; `inclusive` unless told otherwise
 * @returns the quantile in the unit of the values
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`, `statistics_out_of_range`
 * @source R. J. Hyndman, Y. Fan, "Sample quantiles in statistical packages", The American Statistician 50 (1996), types
 * 6 and 7; NIST/SEMATECH e-Handbook 7.2.6.2 (type 6)
 */
export function quantile(values: readonly number[], share: number, rule: QuantileRule = 'inclusive'): number {
  requireSample(values, 1);
  requireShare('share', share);
  const ordered = values.toSorted((left, right) => left - right);
  const position = rule === 'inclusive' ? 1 + (ordered.length - 1) * share : (ordered.length + 1) * share;
  const held = Math.min(Math.max(position, 1), ordered.length);
  const below = Math.floor(held);
  const low = ordered[below - 1] ?? 0;
  const high = ordered[Math.min(below, ordered.length - 1)] ?? low;
  return low + (high - low) * (held - below);
}

/**
 * Median: half the values lie on either side.
 *
 * @param values at least one, in any unit
 * @returns the median in that unit
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number`
 */
export const median = (values: readonly number[]): number => quantile(values, 0.5);
