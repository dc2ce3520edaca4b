import type { Tone } from '../../../components/flag';
import type { OrderRow, ParcelRow } from '../api/counter';

export const orderStates: readonly { value: OrderRow['state']; label: string; tone: Tone }[] = [
  { value: 'review', label: 'payment in doubt', tone: 'hot' },
  { value: 'short', label: 'short of parts', tone: 'hot' },
  { value: 'ready', label: 'ready to pack', tone: 'tape' },
  { value: 'packing', label: 'being packed', tone: 'cool' },
  { value: 'packed', label: 'packed', tone: 'tape' },
  { value: 'building', label: 'waits for the bench', tone: 'cool' },
  { value: 'shipped', label: 'sent', tone: 'sound' },
  { value: 'paying', label: 'being paid', tone: 'cool' },
  { value: 'unpaid', label: 'not paid', tone: 'cool' },
  { value: 'cancelled', label: 'cancelled', tone: 'cool' },
];

export const parcelStates: readonly { value: ParcelRow['state']; label: string; tone: Tone }[] = [
  { value: 'packing', label: 'being packed', tone: 'cool' },
  { value: 'packed', label: 'packed', tone: 'tape' },
  { value: 'shipped', label: 'sent', tone: 'sound' },
  { value: 'dissolved', label: 'taken apart', tone: 'cool' },
];

/** Where an order is, in two or three words with their tone. */
export function orderState(state: OrderRow['state']): { label: string; tone: Tone } {
  return orderStates.find(({ value }) => value === state) ?? { label: state, tone: 'cool' };
}

export function parcelState(state: ParcelRow['state']): { label: string; tone: Tone } {
  return parcelStates.find(({ value }) => value === state) ?? { label: state, tone: 'cool' };
}
