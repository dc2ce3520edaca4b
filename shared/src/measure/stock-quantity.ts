import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, type Decimal, type DecimalInput } from './decimal.js';
import { stockMeasures, type StockMeasure } from './stock-measures.js';

/** No stock movement is larger than this, in any measure. */
export const largestQuantity = 999_999_999;

/**
 * Checks a quantity that is received, issued, ordered or counted.
 *
 * @param quantity in `measure`, not negative
 * @param measure the part's stock measure
 * @returns the quantity
 * @throws ArithmeticError `measure_quantity_negative`, `measure_quantity_too_large`, `measure_too_many_decimals` (a
 *   piece cannot be halved); `measure_not_a_number`, `measure_not_exact`
 */
export function stockQuantity(quantity: DecimalInput, measure: StockMeasure): Decimal {
  const value = decimal(quantity);
  const { decimals } = stockMeasures[measure];
  const shown = value.toFixed();
  if (value.lessThan(0)) throw new ArithmeticError('measure_quantity_negative', { quantity: shown });
  if (value.greaterThan(largestQuantity)) {
    throw new ArithmeticError('measure_quantity_too_large', { quantity: shown, largest: largestQuantity });
  }
  if (value.decimalPlaces() > decimals) {
    throw new ArithmeticError('measure_too_many_decimals', { quantity: shown, measure, decimals });
  }
  return value;
}

/**
 * Checks a quantity that must be more than zero.
 *
 * @param quantity in `measure`
 * @param measure the part's stock measure
 * @returns the quantity
 * @throws ArithmeticError `measure_quantity_not_positive`, and as {@link stockQuantity}
 */
export function positiveStockQuantity(quantity: DecimalInput, measure: StockMeasure): Decimal {
  const value = stockQuantity(quantity, measure);
  if (value.isZero()) throw new ArithmeticError('measure_quantity_not_positive', { quantity: value.toFixed() });
  return value;
}
