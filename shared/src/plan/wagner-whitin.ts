import { ArithmeticError } from '../errors/arithmetic-error.js';
import { checkLotCosts } from './economic-order-quantity.js';
import type { LotCosts, LotRule } from './lot-rule.js';

export interface LotPlan {
  /** What is ordered for each period. */
  readonly lots: readonly number[];
  /** Least cost of the first 1, 2, 3 … periods. */
  readonly leastCost: readonly number[];
}

/**
 * The cheapest plan of lots: F(t) = min over j ≤ t of F(j−1) + K_j + cost of holding in j what the periods up to t need.
 * Holding is charged on the stock at the end of each period, nothing on what is used in the period in which it arrives.
 * Of equally cheap plans the one with the later orders is taken. Time grows with the square of the periods.
 *
 * @param need net needs per period, none negative; zero needs no order
 * @param orderCosts per order, by period
 * @param holdingCosts per unit held from each period to the next; the last one is not used
 * @throws ArithmeticError `plan_lot_costs` for costs below zero or too few of them; `plan_demand_negative`
 * Source: H. M. Wagner and T. M. Whitin, Dynamic Version of the Economic Lot Size Model, Management Science 5 (1), 1958,
 *   89-96.
 */
export function wagnerWhitin(
  need: readonly number[],
  orderCosts: readonly number[],
  holdingCosts: readonly number[],
): LotPlan {
  checkInput(need, orderCosts, holdingCosts);
  const least = new Float64Array(need.length + 1);
  const orderedIn = new Int32Array(need.length + 1);
  for (let t = 1; t <= need.length; t += 1) {
    if (need[t - 1] === 0) {
      least[t] = least[t - 1] as number;
      continue;
    }
    let [best, from, later, held] = [Infinity, t, 0, 0];
    for (let j = t; j >= 1; j -= 1) {
      held += (holdingCosts[j - 1] as number) * later;
      later += need[j - 1] as number;
      // Holding only grows further back, and F never falls below zero.
      if (held >= best) break;
      const cost = (least[j - 1] as number) + (orderCosts[j - 1] as number) + held;
      if (cost < best) [best, from] = [cost, j];
    }
    [least[t], orderedIn[t]] = [best, from];
  }
  return { lots: readLots(need, orderedIn), leastCost: [...least.subarray(1)] };
}

function readLots(need: readonly number[], orderedIn: Int32Array): number[] {
  const lots = need.map(() => 0);
  let t = need.length;
  while (t >= 1) {
    if (need[t - 1] === 0) {
      t -= 1;
      continue;
    }
    const from = orderedIn[t] as number;
    lots[from - 1] = need.slice(from - 1, t).reduce((sum, amount) => sum + amount, 0);
    t = from - 1;
  }
  return lots;
}

function checkInput(need: readonly number[], orders: readonly number[], holdings: readonly number[]): void {
  need.forEach((demand, period) => {
    if (!(demand >= 0)) throw new ArithmeticError('plan_demand_negative', { demand });
    checkLotCosts({ order: orders[period] ?? NaN, holding: holdings[period] ?? NaN });
  });
}

/**
 * Orders the first lot of the cheapest plan for the periods ahead, with costs that do not change.
 *
 * @throws ArithmeticError `plan_lot_costs`
 */
export function wagnerWhitinLot(costs: LotCosts): LotRule {
  checkLotCosts(costs);
  return (need) => {
    const orderCosts = need.map(() => costs.order);
    const holdingCosts = need.map(() => costs.holding);
    return wagnerWhitin(need, orderCosts, holdingCosts).lots[0] ?? 0;
  };
}
