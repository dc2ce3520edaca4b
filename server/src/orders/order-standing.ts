import { longDay } from './long-day.js';
import type { OrderFacts } from './buyer-orders.repository.js';

/** Where an order stands, for its buyer; `now` decides whether a payment page can still be open. */
export function standingOf(order: OrderFacts, promisedOn: string, now: Date): string {
  if (order.cancelledAt) {
    if (order.refundedAt) return 'Cancelled. Your money is on its way back.';
    return order.paidAt ? 'Cancelled. Your money will be sent back.' : 'Cancelled. Nothing was charged.';
  }
  if (order.shippedAt) {
    const way = order.trackingCode ? ` ${order.carrier ?? 'The carrier'} has it under ${order.trackingCode}.` : '';
    return `It has left the shop.${way}`;
  }
  if (order.packedAt) return 'Packed. The carrier collects it next.';
  if (order.paidAt) return `Paid. It leaves the shop by ${longDay(promisedOn)}.`;
  if (order.waitingForBank) return 'Your bank is working on the payment. The goods are kept for you meanwhile.';
  if (order.pageOpenUntil && order.pageOpenUntil > now)
    return 'Not paid yet. The goods are kept for you for a short while.';
  return 'Not paid, and no longer kept for you. You can pay now if everything is still there.';
}

/** What happened, oldest first. */
export function eventsOf(order: OrderFacts & { placed_at: Date }): readonly { at: Date; what: string }[] {
  const events: readonly (readonly [Date | null, string])[] = [
    [order.placed_at, 'Ordered.'],
    [order.paidAt, 'Paid, and invoiced.'],
    [order.packedAt, 'Packed.'],
    [order.shippedAt, 'Left the shop.'],
    [order.cancelledAt, 'Cancelled.'],
    [order.refundedAt, 'Money sent back.'],
  ];
  return events.flatMap(([at, what]) => (at ? [{ at, what }] : [])).toSorted((a, b) => a.at.getTime() - b.at.getTime());
}
