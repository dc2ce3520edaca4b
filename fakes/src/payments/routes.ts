import type Stripe from 'stripe';
import { noSuch } from './api-error.js';
import { balance, settleAvailability } from './balance.js';
import { createSession, expireSession } from './checkout-sessions.js';
import { Collection } from './collection.js';
import { createdWithin, listOf } from './listing.js';
import type { Parameters } from './parameters.js';
import { createRefund } from './refunds.js';
import type { PaymentsState } from './state.js';
import type { WireEvent, WireLineItem } from './wire.js';
import type { Cause, World } from './world.js';

export type Call = { readonly id: string; readonly given: Parameters; readonly cause: Cause; readonly path: string };

export type Route = {
  readonly method: 'GET' | 'POST';
  /** Path below /v1, with `:id` for the thing's own id. */
  readonly path: string;
  readonly run: (world: World, call: Call) => unknown;
};

type Shown = keyof Pick<
  PaymentsState,
  'sessions' | 'intents' | 'charges' | 'transactions' | 'refunds' | 'payouts' | 'disputes' | 'events'
>;

type Dated = { readonly id: string; readonly created: number };

/** Reads the filters of a list and answers whether a thing passes them all. */
type Filter<T> = (given: Parameters, world: World) => (thing: T) => boolean;

function retrieve(path: string, shown: Shown, kind: string): Route {
  const run = (world: World, { id, given }: Call) => {
    given.refuseUnknown();
    const thing = world.state[shown].find(id);
    if (!thing) throw noSuch(kind, id);
    return thing;
  };
  return { method: 'GET', path: `${path}/:id`, run };
}

function list<T extends Dated>(
  path: string,
  kind: string,
  all: (state: PaymentsState) => Collection<T>,
  filter: Filter<T>,
): Route {
  const run = (world: World, call: Call) => {
    const within = createdWithin(call.given);
    const passes = filter(call.given, world);
    const things = all(world.state)
      .newestFirst()
      .filter((thing) => within(thing) && passes(thing));
    return listOf(things, all(world.state), call.given, call.path, kind);
  };
  return { method: 'GET', path, run };
}

/** Filters by fields that must equal the parameter of the same name. */
function equal<T>(...fields: readonly (keyof T & string)[]): Filter<T> {
  return (given) => {
    const wanted = fields.map((field) => [field, given.text(field)] as const);
    return (thing) => wanted.every(([field, value]) => value === undefined || thing[field] === value);
  };
}

const transactionFilter: Filter<Stripe.BalanceTransaction> = (given, world) => {
  settleAvailability(world);
  const same = equal<Stripe.BalanceTransaction>('currency', 'source', 'type')(given, world);
  const payout = given.text('payout');
  return (thing) => same(thing) && (payout === undefined || world.state.paidOut.find(thing.id)?.payout === payout);
};

const eventFilter: Filter<WireEvent> = (given) => {
  const type = given.text('type');
  const types = given.texts('types');
  const delivered = given.boolean('delivery_success');
  return (event) =>
    (type === undefined || fits(type, event.type)) &&
    (types.length === 0 || types.includes(event.type)) &&
    (delivered === undefined || (event.pending_webhooks === 0) === delivered);
};

/** `charge.*` stands for all events of charges. */
function fits(pattern: string, type: string): boolean {
  return pattern.endsWith('.*') ? type.startsWith(pattern.slice(0, -1)) : pattern === type;
}

function listLines(world: World, { id, given, path }: Call) {
  if (!world.state.sessions.find(id)) throw noSuch('checkout.session', id, 'session');
  const lines = new Collection<WireLineItem>();
  // Lines stand in the order they were given; a list answers the last one added first.
  lines.replaceAll(world.state.sessionPrivates.get(id).lines.toReversed());
  return listOf(lines.newestFirst(), lines, given, path, 'item');
}

function expire(world: World, { id, given, cause }: Call) {
  given.refuseUnknown();
  if (!world.state.sessions.find(id)) throw noSuch('checkout.session', id, 'session');
  return expireSession(world, id, cause);
}

function refundsOfCharge(world: World, { id, given, path }: Call) {
  if (!world.state.charges.find(id)) throw noSuch('charge', id);
  const refunds = world.state.refunds.newestFirst().filter((refund) => refund.charge === id);
  return listOf(refunds, world.state.refunds, given, path, 'refund');
}

export const ROUTES: readonly Route[] = [
  { method: 'POST', path: '/checkout/sessions', run: (world, { given }) => createSession(world, given) },
  list('/checkout/sessions', 'checkout.session', (state) => state.sessions, equal('payment_intent', 'status')),
  retrieve('/checkout/sessions', 'sessions', 'checkout.session'),
  { method: 'GET', path: '/checkout/sessions/:id/line_items', run: listLines },
  { method: 'POST', path: '/checkout/sessions/:id/expire', run: expire },
  list('/payment_intents', 'payment_intent', (state) => state.intents, equal()),
  retrieve('/payment_intents', 'intents', 'payment_intent'),
  list('/charges', 'charge', (state) => state.charges, equal('payment_intent')),
  retrieve('/charges', 'charges', 'charge'),
  { method: 'GET', path: '/charges/:id/refunds', run: refundsOfCharge },
  list('/balance_transactions', 'balance_transaction', (state) => state.transactions, transactionFilter),
  retrieve('/balance_transactions', 'transactions', 'balance_transaction'),
  { method: 'GET', path: '/balance', run: (world, { given }) => (given.refuseUnknown(), balance(world)) },
  { method: 'POST', path: '/refunds', run: (world, { given, cause }) => createRefund(world, given, cause) },
  list('/refunds', 'refund', (state) => state.refunds, equal('charge', 'payment_intent')),
  retrieve('/refunds', 'refunds', 'refund'),
  list('/payouts', 'payout', (state) => state.payouts, equal('status')),
  retrieve('/payouts', 'payouts', 'payout'),
  list('/disputes', 'dispute', (state) => state.disputes, equal('charge', 'payment_intent')),
  retrieve('/disputes', 'disputes', 'dispute'),
  list('/events', 'event', (state) => state.events, eventFilter),
  retrieve('/events', 'events', 'event'),
];

/** @returns the route and the thing's id of a path below /v1, or undefined */
export function findRoute(method: string, path: string): { readonly route: Route; readonly id: string } | undefined {
  const actual = path.split('/');
  for (const route of ROUTES) {
    const wanted = route.path.split('/');
    if (route.method !== method || wanted.length !== actual.length) continue;
    if (!wanted.every((part, index) => part === ':id' || part === actual[index])) continue;
    const position = wanted.indexOf(':id');
    return { route, id: position < 0 ? '' : decodeURIComponent(actual[position] ?? '') };
  }
  return undefined;
}
