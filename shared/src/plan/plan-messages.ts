import type { PartPlan } from './netting.js';
import { type PeggedSupply, pegPart } from './pegging.js';
import { type Steps, toSteps } from './planned-part.js';

/** Something that asks for a hand. Periods of the timeline, quantities in steps. */
export type PlanMessage =
  /** An order whose start is in the present period. */
  | { readonly kind: 'start_now'; readonly order: number; readonly quantity: Steps }
  /** An order that should have been started earlier, by so much. */
  | { readonly kind: 'start_is_late'; readonly order: number; readonly quantity: Steps; readonly late: number }
  /** A receipt that would spare an order if it came earlier. */
  | {
      readonly kind: 'bring_forward';
      readonly receipt: string;
      readonly from: number;
      readonly to: number;
      readonly quantity: Steps;
    }
  /** A receipt that is not wanted before a later period, this much of it. */
  | {
      readonly kind: 'put_off';
      readonly receipt: string;
      readonly from: number;
      readonly to: number;
      readonly quantity: Steps;
    }
  /** A receipt that is not wanted within the horizon, this much of it. */
  | { readonly kind: 'not_needed'; readonly receipt: string; readonly quantity: Steps }
  | { readonly kind: 'receipt_overdue' | 'demand_overdue'; readonly id: string; readonly quantity: Steps }
  | { readonly kind: 'expires_unused'; readonly period: number; readonly quantity: Steps }
  /** What lies there now is less than the safety stock. */
  | { readonly kind: 'below_safety_stock'; readonly quantity: Steps };

/**
 * The exceptions of one part's plan, what is most urgent first.
 *
 * @param plan the plan of the part
 * @returns messages; none when all runs by itself
 * Source: common practice, no source (rescheduling and release messages).
 */
export function planMessages(plan: PartPlan): PlanMessage[] {
  const receipts = pegPart(plan).filter(({ supply }) => supply.kind === 'receipt');
  return [
    ...overdue(plan),
    ...startMessages(plan),
    ...belowSafety(plan),
    ...bringForward(plan, receipts),
    ...putOffOrCancel(plan, receipts),
    ...plan.expired.flatMap((quantity, period): PlanMessage[] =>
      quantity > 0 ? [{ kind: 'expires_unused', period, quantity }] : [],
    ),
  ];
}

function overdue({ part }: PartPlan): PlanMessage[] {
  const past = (kind: 'receipt_overdue' | 'demand_overdue', rows: typeof part.receipts): PlanMessage[] =>
    rows
      .filter(({ period }) => period < 0)
      .map(({ id, quantity }) => ({ kind, id, quantity: toSteps(quantity, part.decimals, part.part) }));
  return [...past('demand_overdue', part.demands), ...past('receipt_overdue', part.receipts)];
}

function startMessages({ orders }: PartPlan): PlanMessage[] {
  return orders.flatMap(({ index, start, late, started }): PlanMessage[] => {
    if (late > 0) return [{ kind: 'start_is_late', order: index, quantity: started, late }];
    return start === 0 ? [{ kind: 'start_now', order: index, quantity: started }] : [];
  });
}

function belowSafety({ part }: PartPlan): PlanMessage[] {
  const steps = (quantity: Parameters<typeof toSteps>[0]): Steps => toSteps(quantity, part.decimals, part.part);
  const usable = part.onHand.filter(({ expires }) => (expires ?? Infinity) > 0);
  const quantity = steps(part.safetyStock) - usable.reduce((sum, lot) => sum + steps(lot.quantity), 0);
  return quantity > 0 ? [{ kind: 'below_safety_stock', quantity }] : [];
}

/** Receipts, the earliest first, are matched with planned orders that are due before them, the earliest first. */
function bringForward({ orders }: PartPlan, receipts: readonly PeggedSupply[]): PlanMessage[] {
  const open = orders.map(({ due, good }) => ({ due, good }));
  return receipts.flatMap(({ supply, period, quantity }) => {
    const messages: PlanMessage[] = [];
    let left = quantity;
    for (const order of open) {
      if (order.due >= period || left === 0 || supply.kind !== 'receipt') break;
      const moved = Math.min(left, order.good);
      if (moved > 0)
        messages.push({ kind: 'bring_forward', receipt: supply.id, from: period, to: order.due, quantity: moved });
      order.good -= moved;
      left -= moved;
    }
    return messages;
  });
}

/**
 * What of the receipts could come later or not at all while the plan still keeps the safety stock. The latest receipts
 * are looked at first, and what is moved counts for those before, so that all messages can be followed together.
 */
function putOffOrCancel(plan: PartPlan, receipts: readonly PeggedSupply[]): PlanMessage[] {
  const { decimals, part, safetyStock } = plan.part;
  const safety = toSteps(safetyStock, decimals, part);
  const spare = plan.projected.map((stock) => stock - safety);
  const horizon = spare.length;
  const messages = receipts.toReversed().map(({ supply, period: from, quantity }): PlanMessage[] => {
    if (supply.kind !== 'receipt') return [];
    const surplus = Math.min(quantity, Math.max(0, Math.min(...spare.slice(from))));
    move(spare, from, horizon, surplus);
    const left = quantity - surplus;
    const needed = spare.findIndex((free, period) => period >= from && free < left);
    const to = left === 0 || needed < 0 ? from : needed;
    move(spare, from, to, left);
    const receipt = supply.id;
    return [
      ...(to > from ? [{ kind: 'put_off', receipt, from, to, quantity: left } as const] : []),
      ...(surplus > 0 ? [{ kind: 'not_needed', receipt, quantity: surplus } as const] : []),
    ];
  });
  return messages.toReversed().flat();
}

function move(spare: Steps[], from: number, to: number, quantity: Steps): void {
  for (let period = from; period < to; period += 1) spare[period] = (spare[period] ?? 0) - quantity;
}
