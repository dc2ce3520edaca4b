import { type DecimalInput } from '../measure/decimal.js';
import { subtractMinor, zeroAmount, type MinorAmount } from './minor-units.js';
import { issueFromPool, type CostPool, type PoolMovement } from './movement-value.js';

/**
 * Takes back out of a pool what a wrong receipt brought into it. It leaves at the value it came with, so that the pool
 * is as if it had never come; where the pool cannot give that value any more, because some of what was averaged with it
 * has left since, it leaves at the pool's average instead, and the difference is the caller's to book.
 *
 * @param pool before
 * @param quantity to take back, stock unit, more than zero, at most what is held
 * @param brought value it came with, minor units, not negative
 * @returns the movement's value (zero or negative) and the pool after it
 * @throws ArithmeticError `money_quantity_not_positive`, `money_more_than_held`
 * @source common practice, no source.
 */
export function takeBackFromPool(pool: CostPool, quantity: DecimalInput, brought: MinorAmount): PoolMovement {
  const averaged = issueFromPool(pool, quantity);
  const left = averaged.pool.quantity;
  if (left.isZero() || brought > pool.value) return averaged;
  return {
    value: subtractMinor(zeroAmount, brought),
    pool: { quantity: left, value: subtractMinor(pool.value, brought) },
  };
}
