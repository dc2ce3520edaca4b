import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from './decimal.js';

/** How a supplier sells a part. */
export interface PurchaseRule {
  /** Least that can be ordered; nothing if any. */
  readonly minimum?: DecimalInput | undefined;
  /** Orders must be whole numbers of this; nothing if any quantity can be cut. */
  readonly multiple?: DecimalInput | undefined;
}

/** What to order for a need. */
export interface PurchasableQuantity {
  readonly order: Decimal;
  /** `order` − need. */
  readonly leftOver: Decimal;
}

/**
 * Smallest quantity that can be ordered and covers a need.
 *
 * @param need quantity wanted; zero or less orders nothing
 * @param rule minimum and multiple in the same measure
 * @returns what to order, and what is left over
 * @throws ArithmeticError `measure_pack_size` for a multiple or minimum that is not above zero; `measure_not_a_number`,
 *   `measure_not_exact`
 */
export function purchasableQuantity(need: DecimalInput, rule: PurchaseRule): PurchasableQuantity {
  const wanted = decimal(need);
  const minimum = rule.minimum === undefined ? undefined : positiveSize(rule.minimum);
  const multiple = rule.multiple === undefined ? undefined : positiveSize(rule.multiple);
  if (wanted.lessThanOrEqualTo(0)) return { order: new Decimal(0), leftOver: wanted.negated().plus(0) };
  const least = minimum ? Decimal.max(wanted, minimum) : wanted;
  const order = multiple ? wholePacks(least, multiple).times(multiple) : least;
  return { order, leftOver: order.minus(wanted) };
}

function wholePacks(quantity: Decimal, pack: Decimal): Decimal {
  const whole = quantity.divToInt(pack);
  return whole.times(pack).lessThan(quantity) ? whole.plus(1) : whole;
}

function positiveSize(size: DecimalInput): Decimal {
  const value = decimal(size);
  if (value.lessThanOrEqualTo(0)) throw new ArithmeticError('measure_pack_size', { size: value.toFixed() });
  return value;
}
