import type Stripe from 'stripe';

// The SDK turns decimal texts of the answer into its own Decimal; on the wire they are texts.
export type WirePrice = Omit<Stripe.Price, 'unit_amount_decimal' | 'product'> & {
  readonly unit_amount_decimal: string | null;
  readonly product: string;
};
export type WireLineItem = Omit<Stripe.LineItem, 'price'> & { readonly price: WirePrice };

/** An event before it is one of the SDK's several hundred event types; the compiler holds its frame to theirs. */
export type WireEvent = {
  readonly id: string;
  readonly object: 'event';
  readonly api_version: string;
  readonly created: number;
  readonly data: { readonly object: unknown; readonly previous_attributes?: Readonly<Record<string, unknown>> };
  readonly livemode: boolean;
  readonly pending_webhooks: number;
  readonly request: { readonly id: string | null; readonly idempotency_key: string | null };
  readonly type: Stripe.Event['type'];
};

/** The processor's public API version that SDK 23.1.0 is typed against. */
export const API_VERSION = '2026-10-28.endive';

/** The id of a reference, expanded or not. */
export function idOf(reference: string | { readonly id: string } | null): string {
  if (reference === null) return '';
  return typeof reference === 'string' ? reference : reference.id;
}
