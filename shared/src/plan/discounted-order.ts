import { ArithmeticError } from '../errors/arithmetic-error.js';
import { economicOrderQuantity } from './economic-order-quantity.js';

/** A price that holds for all units from a quantity on. */
export interface DiscountBand {
  readonly from: number;
  readonly price: number;
}

export interface DiscountRow extends DiscountBand {
  /** The economic order quantity at this price, whatever band it falls into. */
  readonly economic: number;
  /** The best order within the band. */
  readonly order: number;
  /** Ordering, holding and buying, per period. */
  readonly total: number;
}

/**
 * The order size that costs least when all units get cheaper from certain quantities on and holding costs a share of
 * the price: in each band the economic order quantity, or the edge of the band nearest to it.
 *
 * @param demand units per period
 * @param orderCost per order
 * @param holdingShare share of the price that holding one unit over the period costs
 * @param bands in any order; at least one, prices above zero
 * @returns a row per band by quantity, and the cheapest of them (the smaller order if equal)
 * @throws ArithmeticError `plan_discount_bands`, and as `economicOrderQuantity`
 * Source: J. Heizer and B. Render, Operations Management, quantity discount model (from memory).
 */
export function discountedOrder(
  demand: number,
  orderCost: number,
  holdingShare: number,
  bands: readonly DiscountBand[],
): { readonly rows: readonly DiscountRow[]; readonly best: DiscountRow } {
  const sorted = bands.toSorted((a, b) => a.from - b.from);
  if (sorted.some(({ from, price }) => !(from >= 0 && price > 0 && Number.isFinite(from + price)))) {
    throw new ArithmeticError('plan_discount_bands');
  }
  const rows = sorted.map(({ from, price }, index): DiscountRow => {
    const economic = economicOrderQuantity(demand, { order: orderCost, holding: holdingShare * price });
    const order = Math.max(from, Math.min(economic, sorted[index + 1]?.from ?? Infinity));
    const total = order === 0 ? 0 : (demand / order) * orderCost + (order / 2) * holdingShare * price + demand * price;
    return { from, price, economic, order, total };
  });
  const [first, ...others] = rows;
  if (first === undefined) throw new ArithmeticError('plan_discount_bands');
  return { rows, best: others.reduce((best, row) => (row.total < best.total ? row : best), first) };
}
