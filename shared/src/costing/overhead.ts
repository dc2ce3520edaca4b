import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, sumDecimals, type DecimalInput } from '../measure/decimal.js';
import { apportion } from '../money/apportion.js';
import type { MinorAmount } from '../money/minor-units.js';

/** How a period's fixed overhead is borne. */
export interface OverheadAbsorption {
  /** Minor units per job, in the order given. */
  readonly perJob: readonly MinorAmount[];
  /** What idle capacity costs: an expense of the period, minor units. */
  readonly unabsorbed: MinorAmount;
}

/**
 * Spreads a period's fixed overhead over the jobs of the bench at normal capacity. Low activity does not make the jobs
 * dearer (the idle share is an expense); high activity makes them cheaper, so that stock is never above cost.
 *
 * @param overhead minor units of the period, not negative
 * @param normalHours hours of the bench in a normal period, more than zero
 * @param jobHours hours of each job, none negative
 * @returns amount per job and the unabsorbed rest, adding up to the overhead
 * @throws ArithmeticError `costing_capacity_not_positive`, `costing_value_negative`, `money_weight_negative`
 * @source IAS 2, paragraph 13.
 */
export function absorbOverhead(
  overhead: MinorAmount,
  normalHours: DecimalInput,
  jobHours: readonly DecimalInput[],
): OverheadAbsorption {
  const normal = decimal(normalHours);
  if (normal.lessThanOrEqualTo(0)) {
    throw new ArithmeticError('costing_capacity_not_positive', { capacity: normal.toFixed() });
  }
  if (overhead < 0) throw new ArithmeticError('costing_value_negative', { value: overhead });
  const idle = Decimal.max(0, normal.minus(sumDecimals(jobHours)));
  const shares = apportion(overhead, [...jobHours, idle]);
  return { perJob: shares.slice(0, -1), unabsorbed: shares.at(-1) ?? overhead };
}
