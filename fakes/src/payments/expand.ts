import { badParameter } from './api-error.js';
import type { PaymentsState } from './state.js';

type Thing = { [name: string]: unknown };

const DEEPEST = 4;

/**
 * Puts whole things where an answer holds ids only (docs.stripe.com/api/expanding_objects).
 *
 * @param answer the answer as kept; it is left as it is
 * @param paths such as `payment_intent.latest_charge`, in lists `data.payment_intent`
 */
export function expand(state: PaymentsState, answer: unknown, paths: readonly string[]): unknown {
  const copy: unknown = structuredClone(answer);
  for (const path of paths) {
    const steps = path.split('.');
    if (steps.length > DEEPEST) {
      throw badParameter('expand', `You cannot expand more than ${DEEPEST} levels of a property: ${path}`);
    }
    walk(state, copy, steps, path);
  }
  return copy;
}

function walk(state: PaymentsState, at: unknown, steps: readonly string[], path: string): void {
  const [step, ...rest] = steps;
  if (step === undefined) return;
  if (Array.isArray(at)) {
    for (const item of at) walk(state, item, steps, path);
    return;
  }
  if (typeof at !== 'object' || at === null) throw cannot(path);
  const thing = at as Thing;
  const next = reach(state, thing, step, path);
  if (next === null) return;
  if (rest.length > 0) walk(state, next, rest, path);
}

function reach(state: PaymentsState, thing: Thing, step: string, path: string): unknown {
  const side = sideList(state, thing, step);
  if (side) thing[step] = side;
  const value = thing[step];
  if (value === null) return null;
  if (typeof value === 'object') return value;
  if (typeof value !== 'string') throw cannot(path);
  const found = lookUp(state, value);
  if (!found) throw cannot(path);
  const copy: unknown = structuredClone(found);
  thing[step] = copy;
  return copy;
}

/** Lists that an answer shows only when asked to. */
function sideList(state: PaymentsState, thing: Thing, step: string): object | undefined {
  const id = String(thing['id']);
  if (thing['object'] === 'checkout.session' && step === 'line_items' && thing[step] === undefined) {
    const data = structuredClone(state.sessionPrivates.get(id).lines);
    return { object: 'list', data, has_more: false, url: `/v1/checkout/sessions/${id}/line_items` };
  }
  if (thing['object'] === 'charge' && step === 'refunds' && thing[step] === undefined) {
    const data = structuredClone(state.refunds.newestFirst().filter((refund) => refund.charge === id));
    return { object: 'list', data, has_more: false, url: `/v1/charges/${id}/refunds` };
  }
  return undefined;
}

function lookUp(state: PaymentsState, id: string): object | undefined {
  const places: Readonly<Record<string, (id: string) => object | undefined>> = {
    cs: (key) => state.sessions.find(key),
    pi: (key) => state.intents.find(key),
    ch: (key) => state.charges.find(key),
    txn: (key) => state.transactions.find(key),
    re: (key) => state.refunds.find(key),
    po: (key) => state.payouts.find(key),
    dp: (key) => state.disputes.find(key),
  };
  return places[id.split('_')[0] ?? '']?.(id);
}

function cannot(path: string) {
  return badParameter('expand', `This property cannot be expanded (${path}).`);
}
