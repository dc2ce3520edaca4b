import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { LotRule } from './lot-rule.js';

/**
 * Orders what a number of periods need together.
 *
 * @param periods whole number, at least one
 * @throws ArithmeticError `plan_lot_periods`
 * Source: common practice, no source (fixed period requirements).
 */
export function periodLot(periods: number): LotRule {
  if (!Number.isInteger(periods) || periods < 1) throw new ArithmeticError('plan_lot_periods', { periods });
  return (need) => need.slice(0, periods).reduce((sum, amount) => sum + amount, 0);
}
