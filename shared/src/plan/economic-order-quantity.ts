import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { LotCosts, LotRule } from './lot-rule.js';

/**
 * The lot at which ordering and holding cost the same and together least: Q = √(2·D·S/H).
 *
 * @param demand D, units per period (any period)
 * @param costs S per order; H per unit and the same period
 * @returns Q in units, not rounded; zero without demand
 * @throws ArithmeticError `plan_lot_costs` unless S ≥ 0 and H > 0; `plan_demand_negative`
 * Source: F. W. Harris, How Many Parts to Make at Once, Factory 10 (2), February 1913, 135-136, 152.
 */
export function economicOrderQuantity(demand: number, { order, holding }: LotCosts): number {
  checkLotCosts({ order, holding });
  if (holding === 0) throw new ArithmeticError('plan_lot_costs', { order, holding });
  if (!(demand >= 0)) throw new ArithmeticError('plan_demand_negative', { demand });
  return Math.sqrt((2 * demand * order) / holding);
}

/**
 * Orders the economic quantity for the mean need of the periods ahead, or what the first period needs if that is more.
 * Of the two whole numbers beside the formula's value the cheaper one is taken.
 *
 * @param costs per order; per unit and period
 * @throws ArithmeticError as `economicOrderQuantity`
 */
export function economicLot(costs: LotCosts): LotRule {
  economicOrderQuantity(0, costs);
  return (need) => {
    const mean = need.reduce((sum, amount) => sum + amount, 0) / need.length;
    return Math.max(need[0] ?? 0, wholeQuantity(mean, costs));
  };
}

function wholeQuantity(demand: number, costs: LotCosts): number {
  const below = Math.floor(economicOrderQuantity(demand, costs));
  const cost = (lot: number): number => (demand * costs.order) / lot + (lot * costs.holding) / 2;
  return below > 0 && cost(below) <= cost(below + 1) ? below : below + 1;
}

/**
 * Refuses costs that no rule can use.
 *
 * @throws ArithmeticError `plan_lot_costs` unless both are finite and not negative
 */
export function checkLotCosts({ order, holding }: LotCosts): void {
  if (!(order >= 0 && holding >= 0 && Number.isFinite(order + holding))) {
    throw new ArithmeticError('plan_lot_costs', { order, holding });
  }
}
