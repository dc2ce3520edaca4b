import type { TodayItemDto } from './today.dto.js';
import type { WaitingOrderRow } from './today.repository.js';

/** A paid order that has not left, as what it asks of somebody. */
export function orderItem(order: WaitingOrderRow, today: string): TodayItemDto {
  const base = { key: `order ${order.number}`, due: order.promisedOn, late: order.promisedOn < today, signal: false };
  const tag = `{order:${order.number}}`;
  const page = `/counter/orders/${order.number}`;
  if (order.review !== null) {
    const action = { label: 'Look at it', to: page };
    return { ...base, sentence: `The payment of ${tag} does not fit.`, because: order.review, action };
  }
  if (order.packed) {
    const action = { label: 'Send it off', to: `/counter/parcels/${order.parcel}` };
    return { ...base, sentence: `${tag} is packed in ${order.parcel}.`, because: null, action };
  }
  if (order.short.length > 0) {
    const parts = order.short.map((code) => `{part:${code}}`).join(', ');
    const action = { label: 'See what is missing', to: page };
    return { ...base, sentence: `${tag} is promised and short of ${parts}.`, because: null, action };
  }
  if (order.batches.length > 0) return waitingItem(order, today);
  const action = order.parcel
    ? { label: 'Go on packing', to: `/counter/parcels/${order.parcel}` }
    : { label: 'Pack it', to: page };
  return {
    ...base,
    sentence: order.parcel ? `${tag} is half packed.` : `${tag} can be packed.`,
    because: null,
    action,
  };
}

/** Waits for a batch: in danger when that is due after the promise, else only a signal. */
function waitingItem(order: WaitingOrderRow, today: string): TodayItemDto {
  const batches = order.batches.map((code) => `{batch:${code}}`).join(', ');
  const danger = order.batchDueOn !== null && order.batchDueOn > order.promisedOn;
  return {
    key: `order ${order.number}`,
    due: order.promisedOn,
    late: order.promisedOn < today,
    signal: !danger,
    sentence: `{order:${order.number}} waits for ${batches}.`,
    because: danger ? `The batch is due on ${order.batchDueOn}, after the promise.` : null,
    action: { label: 'Open the batch', to: `/bench/batches/${order.batches[0]}` },
  };
}

/** Whether a promise is safe: everything is there, or comes in time. */
export function isSafe(order: WaitingOrderRow): boolean {
  if (order.review !== null || order.short.length > 0) return false;
  return order.batchDueOn === null || order.batchDueOn <= order.promisedOn;
}

/** What is due first stands first; what is due on no day comes after all that is. */
export function byDue(items: readonly TodayItemDto[]): TodayItemDto[] {
  return items.toSorted((one, other) => {
    const [first, second] = [one.due ?? '9999', other.due ?? '9999'];
    return first < second ? -1 : first > second ? 1 : 0;
  });
}
