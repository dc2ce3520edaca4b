import type Stripe from 'stripe';
import { identifier } from './identifier.js';
import type { PaymentsState } from './state.js';
import { API_VERSION, type WireEvent } from './wire.js';

/** How the next payment is to differ from what was asked for. */
export type Surprise = {
  readonly amount?: number;
  readonly currency?: string;
  readonly livemode?: boolean;
  readonly client_reference_id?: string;
  readonly metadata?: Readonly<Record<string, string>>;
};

export type Cause = { readonly request: string | null; readonly idempotencyKey: string | null };

export const NO_CAUSE: Cause = { request: null, idempotencyKey: null };

/** What every use case of the payments stand-in works on. */
export type World = {
  readonly state: PaymentsState;
  readonly shopName: string;
  /** The address the hosted page is reached at. */
  publicAddress(): string;
  /** Whole seconds since 1970. */
  now(): number;
  /** Hands an event to the webhooks. */
  deliver(event: WireEvent): void;
  /** How many endpoints an event will be sent to. */
  listeners(type: string): number;
  takeSurprise(): Surprise | undefined;
  takeRefundStatus(): 'succeeded' | 'pending';
};

export function emit(
  world: World,
  type: Stripe.Event['type'],
  object: unknown,
  cause: Cause = NO_CAUSE,
  previous?: Readonly<Record<string, unknown>>,
): WireEvent {
  const snapshot = structuredClone(object);
  const event = {
    id: identifier('evt_'),
    object: 'event',
    api_version: API_VERSION,
    created: world.now(),
    data: previous ? { object: snapshot, previous_attributes: previous } : { object: snapshot },
    livemode: livemodeOf(snapshot),
    pending_webhooks: world.listeners(type),
    request: { id: cause.request, idempotency_key: cause.idempotencyKey },
    type,
  } satisfies WireEvent & Omit<Stripe.EventBase, 'data' | 'type'>;
  world.state.events.add(event);
  world.deliver(event);
  return event;
}

function livemodeOf(object: unknown): boolean {
  return typeof object === 'object' && object !== null && 'livemode' in object && object.livemode === true;
}
