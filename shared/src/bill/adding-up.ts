import { Decimal } from '../measure/decimal.js';
import { roundToTotal } from '../money/apportion.js';

/** Unit costs are kept with six decimals. */
export const costDecimals = 6;

const guardDigits = 30;

/** Rounds a cost half up to the decimals in which costs are kept. */
export function asCost(value: Decimal): Decimal {
  return value.toDecimalPlaces(costDecimals, Decimal.ROUND_HALF_UP);
}

/**
 * Rounds costs to six decimals so that they add up to a total that is their sum but for rounding: each is cut, and what
 * is left goes to those with the largest remainder.
 *
 * @param values exact costs, of either sign
 * @param total with six decimals, less than one millionth from their sum
 * @returns one cost per value, each at most one millionth from it
 */
export function addingUp(values: readonly Decimal[], total: Decimal): Decimal[] {
  const unit = new Decimal(10).pow(costDecimals);
  const fine = new Decimal(10).pow(guardDigits);
  const numerators = values.map((value) => BigInt(value.times(unit).times(fine).toFixed(0)));
  const whole = BigInt(total.times(unit).toFixed(0));
  return roundToTotal(numerators, BigInt(fine.toFixed(0)), whole).map((part) => new Decimal(part.toString()).div(unit));
}
