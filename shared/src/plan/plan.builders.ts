import type { PlannedPart, Timed } from './planned-part.js';

/** A bought or made part with nothing on the shelf, no lead time and lot-for-lot orders, unless said otherwise. */
export function plannedPart(part: string, more: Partial<PlannedPart> & { stock?: number | string } = {}): PlannedPart {
  const { stock, ...rest } = more;
  return {
    part,
    decimals: 0,
    onHand: stock === undefined ? [] : [{ quantity: stock }],
    safetyStock: 0,
    leadTime: 0,
    lot: { kind: 'lot_for_lot' },
    receipts: [],
    demands: [],
    ...rest,
  };
}

/** Quantities by period: `timed('order', { 3: 10 })` is one named `order 3`. */
export function timed(name: string, rows: Readonly<Record<number, number | string>>): Timed[] {
  return Object.entries(rows).map(([period, quantity]) => ({
    id: `${name} ${period}`,
    period: Number(period),
    quantity,
  }));
}
