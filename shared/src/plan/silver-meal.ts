import { checkLotCosts } from './economic-order-quantity.js';
import type { LotCosts, LotRule } from './lot-rule.js';

/**
 * Orders for as many periods as lower the mean cost per period; stops at the first period that raises it:
 * C(T) = (K + h·Σ (j−1)·d_j) / T. Quick and usually near the optimum, not the optimum. Periods without need at the end
 * of the cover are not counted against it.
 *
 * @param costs K per order; h per unit held over one period
 * @throws ArithmeticError `plan_lot_costs`
 * Source: E. A. Silver and H. C. Meal, Production and Inventory Management 14 (2), 1973, 64-74 (from memory).
 */
export function silverMeal(costs: LotCosts): LotRule {
  checkLotCosts(costs);
  return (need) => {
    let [total, lot, mean] = [costs.order, need[0] ?? 0, costs.order];
    for (let period = 1; period < need.length; period += 1) {
      const amount = need[period] ?? 0;
      total += costs.holding * period * amount;
      const next = total / (period + 1);
      if (next > mean) return lot;
      mean = next;
      lot += amount;
    }
    return lot;
  };
}

/**
 * The mean costs per period that `silverMeal` compares, from a period of order on, up to the first that is higher.
 *
 * @returns C(1), C(2), …
 */
export function silverMealMeans(need: readonly number[], costs: LotCosts): number[] {
  const means: number[] = [];
  let total = costs.order;
  for (const [period, amount] of need.entries()) {
    total += costs.holding * period * amount;
    means.push(total / (period + 1));
    if ((means.at(-1) ?? 0) > (means.at(-2) ?? Infinity)) break;
  }
  return means;
}
