import { Decimal } from 'decimal.js';
import { CalculationError } from '../errors/calculation-error.js';

/**
 * Decimal arithmetic wide enough that no sum or product of the shop's quantities is ever rounded silently
 * (the library's default of 20 digits is not: a quantity of 12 digits times a factor of 12 digits needs 24).
 * A division keeps 60 significant digits; where its result must be exact, round it on purpose.
 */
export const Exact: typeof Decimal = Decimal.clone({ precision: 60, toExpNeg: -30, toExpPos: 30 });

/**
 * Takes a quantity into exact decimal arithmetic.
 *
 * @param value a decimal string, a number that is exact as written, or a Decimal; in the part's stock unit
 * @param what names the quantity in the fault's sentence
 * @returns the same value, finite and not negative
 * @throws CalculationError `not_a_number` | `negative_quantity`
 */
export function nonNegativeQuantity(value: Decimal.Value, what: string): Decimal {
  const quantity = parse(value);
  if (quantity === undefined || !quantity.isFinite()) {
    throw new CalculationError('not_a_number', `${what} is not a finite number.`, { what, value: String(value) });
  }
  if (quantity.isNegative() && !quantity.isZero()) {
    throw new CalculationError('negative_quantity', `${what} is below zero.`, { what, value: String(value) });
  }
  return quantity;
}

function parse(value: Decimal.Value): Decimal | undefined {
  try {
    return new Exact(value);
  } catch {
    // The library throws a plain Error for text that is no number; the caller names the quantity.
    return undefined;
  }
}
