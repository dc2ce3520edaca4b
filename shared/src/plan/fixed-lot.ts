import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { LotRule } from './lot-rule.js';

/**
 * Orders as many lots of one size as the period needs.
 *
 * @param size of a lot, in the unit of the needs
 * @throws ArithmeticError `plan_lot_size`
 * Source: common practice, no source.
 */
export function fixedLot(size: number): LotRule {
  if (!(size > 0) || !Number.isFinite(size)) throw new ArithmeticError('plan_lot_size', { size });
  return ([first = 0]) => Math.ceil(first / size) * size;
}
