import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from '../measure/decimal.js';
import { negateMinor, subtractMinor, type MinorAmount } from '../money/minor-units.js';
import { costPool, issueFromPool } from '../money/movement-value.js';
import type { RoundingMode } from '../money/round.js';

/** A quantity and the cost it carries, both without sign. */
export interface CostedQuantity {
  readonly quantity: DecimalInput;
  /** Minor units. */
  readonly value: MinorAmount;
}

/**
 * Value at which goods come back: what they were issued at, whatever the average is today. The return that completes
 * the issue takes what is left of its value, so that issue and returns cancel.
 *
 * @param issue what was issued, and its cost
 * @param returnedBefore what has come back of it, and the value it came back at
 * @param quantity coming back now, stock unit, more than zero
 * @param mode the way to round
 * @returns minor units, not negative
 * @throws ArithmeticError `costing_return_too_large`, `costing_quantity_not_positive`, `money_pool_broken` if the
 *   records do not fit each other
 * @source IAS 2, paragraph 34 (cost of sales follows the cost of the goods); the remainder rule is common practice, no
 *   source.
 */
export function returnValue(
  issue: CostedQuantity,
  returnedBefore: CostedQuantity,
  quantity: DecimalInput,
  mode: RoundingMode = 'half-even',
): MinorAmount {
  const out = costPool(
    Decimal.sub(decimal(issue.quantity), decimal(returnedBefore.quantity)),
    subtractMinor(issue.value, returnedBefore.value),
  );
  const back = decimal(quantity);
  if (back.lessThanOrEqualTo(0)) {
    throw new ArithmeticError('costing_quantity_not_positive', { quantity: back.toFixed() });
  }
  if (back.greaterThan(out.quantity)) {
    throw new ArithmeticError('costing_return_too_large', { left: out.quantity.toFixed(), asked: back.toFixed() });
  }
  return negateMinor(issueFromPool(out, back, mode).value);
}
