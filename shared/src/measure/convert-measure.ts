import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, type Decimal, type DecimalInput } from './decimal.js';
import type { Unit } from './unit.js';

/**
 * Converts a value from one unit to another of the same dimension. Temperatures convert as points on the scale, not as
 * differences.
 *
 * @param value in `from`
 * @param from unit of the value
 * @param to wanted unit
 * @returns the value in `to`, exact unless it has no end as a decimal; then to 40 significant digits
 * @throws ArithmeticError `measure_wrong_dimension`; `measure_not_a_number`, `measure_not_exact`
 */
export function convertMeasure(value: DecimalInput, from: Unit, to: Unit): Decimal {
  if (from.dimension !== to.dimension) {
    throw new ArithmeticError('measure_wrong_dimension', { unit: from.code, wanted: to.code });
  }
  const base = decimal(value).times(from.factor).plus(from.offset);
  return base.minus(to.offset).div(to.factor).toSignificantDigits(40);
}
