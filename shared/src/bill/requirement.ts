import { Decimal } from 'decimal.js';
import { nonNegativeQuantity } from '../measure/exact.js';

/**
 * How finely each part is taken from the shelf: the number of decimals of its stock unit (0 for pieces).
 * Undefined means: not rounded.
 */
export type IssueDecimals = (part: string) => number | undefined;

/**
 * What is taken from the shelf for a whole batch of one line: batch size × taken per unit, rounded UP once to what can
 * be handed out. Rounding the whole batch, not each unit, is what keeps a 2 % allowance on forty units at one piece
 * and not forty.
 *
 * @param batchSize in the stock unit of the built part
 * @param takenPer per stock unit of the built part, allowance included (`takenPerUnit`), in the component's stock unit
 * @param decimals decimals of the component's stock unit; undefined leaves the product as it is
 * @returns in the component's stock unit
 * @throws CalculationError `not_a_number` | `negative_quantity`
 * Source: common practice, no source.
 */
export function issueQuantity(batchSize: Decimal.Value, takenPer: Decimal.Value, decimals?: number): Decimal {
  const exactly = nonNegativeQuantity(batchSize, 'batch size').times(nonNegativeQuantity(takenPer, 'quantity per'));
  return decimals === undefined ? exactly : exactly.toDecimalPlaces(decimals, Decimal.ROUND_CEIL);
}
