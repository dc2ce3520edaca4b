/**
 * A way to size an order: how much to order for the first period of need, given the needs from then on.
 *
 * @param need net needs per period from the period of the order onward, none negative, the first above zero
 * @returns at least the first need
 */
export type LotRule = (need: readonly number[]) => number;

/** What sizing a lot costs: in any one currency, since only proportions count. Plain numbers: they are never booked. */
export interface LotCosts {
  /** For one order or set-up. */
  readonly order: number;
  /** For holding one unit over one period. */
  readonly holding: number;
}

/**
 * Plans a whole horizon by a rule: an order in every period whose need is not covered by what earlier orders left over.
 *
 * @param need net needs per period
 * @param rule sizes each order
 * @returns what is ordered for each period
 */
export function planLots(need: readonly number[], rule: LotRule): number[] {
  let left = 0;
  return need.map((amount, period) => {
    const short = amount - left;
    if (short <= 0) {
      left -= amount;
      return 0;
    }
    const lot = rule(needFrom(need, period, left));
    left += lot - amount;
    return lot;
  });
}

/** The needs from a period on, less what is left over of earlier orders, which the earliest needs take. */
function needFrom(need: readonly number[], period: number, left: number): number[] {
  let over = left;
  return need.slice(period).map((amount) => {
    const covered = Math.min(over, amount);
    over -= covered;
    return amount - covered;
  });
}

/**
 * What a plan of lots costs: every order, and holding what is there at the end of each period.
 *
 * @param need net needs per period
 * @param lots what arrives at the start of each period
 */
export function lotPlanCost(need: readonly number[], lots: readonly number[], { order, holding }: LotCosts): number {
  let [stock, cost] = [0, 0];
  need.forEach((amount, period) => {
    const lot = lots[period] ?? 0;
    stock += lot - amount;
    cost += (lot > 0 ? order : 0) + stock * holding;
  });
  return cost;
}
