import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { LotRule } from './lot-rule.js';

/**
 * Orders what the period needs, but at least a minimum, and rounded up to a multiple.
 *
 * @param minimum least order, in the unit of the needs; zero for none
 * @param multiple orders are multiples of it
 * @throws ArithmeticError `plan_lot_size`
 * Source: common practice, no source.
 */
export function minimumAndMultiple(minimum: number, multiple: number): LotRule {
  if (!(minimum >= 0) || !Number.isFinite(minimum)) throw new ArithmeticError('plan_lot_size', { size: minimum });
  if (!(multiple > 0) || !Number.isFinite(multiple)) throw new ArithmeticError('plan_lot_size', { size: multiple });
  return ([first = 0]) => Math.ceil(Math.max(first, minimum) / multiple) * multiple;
}
