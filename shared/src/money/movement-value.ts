import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, onCommonScale, type DecimalInput } from '../measure/decimal.js';
import { addMinor, minorAmountOf, subtractMinor, zeroAmount, type MinorAmount } from './minor-units.js';
import { roundQuotient, type RoundingMode } from './round.js';

/** What is held of one thing at one cost: a lot, or a part under a moving average. Value zero at quantity zero. */
export interface CostPool {
  /** In the part's stock unit; never negative. */
  readonly quantity: Decimal;
  /** Minor units; never negative. */
  readonly value: MinorAmount;
}

/** A pool after a movement, and the value the movement carries. */
export interface PoolMovement {
  /** Signed as the stock sees it: positive in, negative out. */
  readonly value: MinorAmount;
  readonly pool: CostPool;
}

/** Nothing held. */
export const emptyPool: CostPool = { quantity: new Decimal(0), value: zeroAmount };

/**
 * Checks a pool as it comes from a record.
 *
 * @param quantity stock unit
 * @param value minor units
 * @returns the pool
 * @throws ArithmeticError `money_pool_broken` if either is negative or a value stands without a quantity
 */
export function costPool(quantity: DecimalInput, value: MinorAmount): CostPool {
  const held = decimal(quantity);
  const broken = held.lessThan(0) || value < 0 || (held.isZero() && value !== 0);
  if (broken) throw new ArithmeticError('money_pool_broken', { quantity: held.toFixed(), value });
  return { quantity: held, value };
}

/**
 * Takes a receipt into a pool.
 *
 * @param pool before
 * @param quantity received, stock unit, more than zero
 * @param value of the receipt, minor units, not negative
 * @returns the movement's value and the pool after it
 * @throws ArithmeticError `money_quantity_not_positive`, `money_value_negative`, `money_too_large`
 */
export function receiveIntoPool(pool: CostPool, quantity: DecimalInput, value: MinorAmount): PoolMovement {
  const received = positive(quantity);
  if (value < 0) throw new ArithmeticError('money_value_negative', { value });
  return { value, pool: { quantity: pool.quantity.plus(received), value: addMinor(pool.value, value) } };
}

/**
 * Takes a quantity out of a pool at its average cost. The value is the pool's share, rounded; what empties the pool
 * takes all that is left, so that nothing stays behind and nothing is lost, whatever was rounded before.
 *
 * @param pool before
 * @param quantity issued, stock unit, more than zero, at most what is held
 * @param mode the way to round the share; `half-even` so that many issues do not drift
 * @returns the movement's value (zero or negative) and the pool after it
 * @throws ArithmeticError `money_quantity_not_positive`, `money_more_than_held`
 * @source IAS 2, paragraphs 25 and 27 (weighted average); the remainder rule is common practice, no source.
 */
export function issueFromPool(pool: CostPool, quantity: DecimalInput, mode: RoundingMode = 'half-even'): PoolMovement {
  const issued = positive(quantity);
  if (issued.greaterThan(pool.quantity)) {
    throw new ArithmeticError('money_more_than_held', { asked: issued.toFixed(), held: pool.quantity.toFixed() });
  }
  const left = pool.quantity.minus(issued);
  // The share is rounded from the exact fraction; what empties the pool is the whole of it and needs no rule of its own.
  const [part = 0n, whole = 1n] = onCommonScale([issued, pool.quantity]).integers;
  const value = minorAmountOf(roundQuotient(BigInt(pool.value) * part, whole, mode));
  return {
    value: subtractMinor(zeroAmount, value),
    pool: { quantity: left, value: subtractMinor(pool.value, value) },
  };
}

/**
 * Changes the value of what is held without moving anything: late freight, write-down, reversal.
 *
 * @param pool before
 * @param change minor units, either sign
 * @returns the movement's value and the pool after it
 * @throws ArithmeticError `money_pool_empty` if nothing is held, `money_pool_broken` if the value would turn negative
 */
export function revaluePool(pool: CostPool, change: MinorAmount): PoolMovement {
  if (pool.quantity.isZero() && change !== 0) throw new ArithmeticError('money_pool_empty');
  return { value: change, pool: costPool(pool.quantity, addMinor(pool.value, change)) };
}

/**
 * Average cost of one unit in a pool, for showing; values are never worked out from it.
 *
 * @param pool the pool
 * @param exponent digits of the currency's minor unit
 * @returns major units per stock unit with six places (half up), or nothing for an empty pool
 */
export function averageUnitCost(pool: CostPool, exponent: number): Decimal | undefined {
  if (pool.quantity.isZero()) return undefined;
  const major = new Decimal(pool.value).div(new Decimal(10).pow(exponent));
  return major.div(pool.quantity).toDecimalPlaces(6, 4);
}

function positive(quantity: DecimalInput): Decimal {
  const value = decimal(quantity);
  if (value.lessThanOrEqualTo(0))
    throw new ArithmeticError('money_quantity_not_positive', { quantity: value.toFixed() });
  return value;
}
