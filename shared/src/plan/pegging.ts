import type { PartKey } from '../bill/bill-lines.js';
import { roundToTotal } from '../money/apportion.js';
import type { PartPlan, RequirementCause } from './netting.js';
import { type Steps, toSteps } from './planned-part.js';

export type Supply =
  | { readonly kind: 'on_hand'; readonly lot: number }
  | { readonly kind: 'receipt'; readonly id: string }
  | { readonly kind: 'order'; readonly index: number };

/** What a quantity is for. */
export type PegTarget =
  | RequirementCause
  /** It keeps the safety stock. */
  | { readonly kind: 'safety_stock' }
  /** The lot was larger than what is wanted within the horizon. */
  | { readonly kind: 'left_over' }
  /** It can no longer be used when it would be wanted. */
  | { readonly kind: 'expired' }
  /** It is normally lost before it is good. */
  | { readonly kind: 'loss' };

export interface Peg {
  readonly target: PegTarget;
  /** When it is wanted; for what nobody wants, when that shows. */
  readonly period: number;
  readonly quantity: Steps;
}

/** A supply with everything it is for; the pegs add up to its quantity. */
export interface PeggedSupply {
  readonly supply: Supply;
  /** When it is there; 0 for what lies on the shelf. */
  readonly period: number;
  /** What is on the shelf, on its way, or started. */
  readonly quantity: Steps;
  readonly pegs: readonly Peg[];
}

interface OpenSupply extends PeggedSupply {
  readonly expires: number;
  readonly pegs: Peg[];
  left: Steps;
}

/**
 * Says what every supply of a part is for. Period by period, each requirement takes what expires first and among that
 * what came first; so nothing is promised twice, the pegs of a supply add up to it, and the pegs to a requirement add up
 * to that.
 *
 * @param plan the plan of one part
 * @returns on-hand lots, receipts and planned orders, in order of arrival
 * Source: common practice, no source.
 */
export function pegPart(plan: PartPlan): PeggedSupply[] {
  const supplies = suppliesOf(plan);
  const horizon = plan.gross.length;
  const open: OpenSupply[] = [];
  let [arrived, wanted] = [0, 0];
  for (let period = 0; period < horizon; period += 1) {
    expire(open, period);
    for (; (supplies[arrived]?.period ?? horizon) <= period; arrived += 1)
      insert(open, supplies[arrived] as OpenSupply);
    for (; (plan.requirements[wanted]?.period ?? horizon) <= period; wanted += 1) {
      const { cause, quantity } = plan.requirements[wanted] as PartPlan['requirements'][number];
      take(open, { target: cause, period, quantity });
    }
  }
  const { part, decimals, safetyStock } = plan.part;
  take(open, { target: { kind: 'safety_stock' }, period: horizon, quantity: toSteps(safetyStock, decimals, part) });
  take(open, { target: { kind: 'left_over' }, period: horizon, quantity: Infinity });
  return supplies.map(({ supply, period, quantity, pegs }) => ({ supply, period, quantity, pegs }));
}

function suppliesOf({ part, orders, gross }: PartPlan): OpenSupply[] {
  const expiryOf = (period: number): number => (part.shelfLife === undefined ? Infinity : period + part.shelfLife);
  const opened = (supply: Supply, period: number, good: Steps, expires: number, started = good): OpenSupply => ({
    supply,
    period,
    quantity: started,
    pegs: started > good ? [{ target: { kind: 'loss' }, period, quantity: started - good }] : [],
    left: good,
    expires,
  });
  const steps = (quantity: Parameters<typeof toSteps>[0]): Steps => toSteps(quantity, part.decimals, part.part);
  const onHand = part.onHand.map(({ quantity, expires }, lot) =>
    opened({ kind: 'on_hand', lot }, 0, steps(quantity), expires ?? Infinity),
  );
  const receipts = part.receipts.map(({ id, period, quantity }) => {
    const at = Math.max(0, period);
    return opened({ kind: 'receipt', id }, at, steps(quantity), expiryOf(at));
  });
  const planned = orders.map(({ index, due, good, started }) =>
    opened({ kind: 'order', index }, due, good, expiryOf(due), started),
  );
  return [...onHand, ...receipts, ...planned]
    .filter(({ quantity, period }) => quantity > 0 && period < gross.length)
    .toSorted((a, b) => a.period - b.period);
}

function insert(open: OpenSupply[], supply: OpenSupply): void {
  let at = open.length;
  while (at > 0 && (open[at - 1]?.expires ?? 0) > supply.expires) at -= 1;
  open.splice(at, 0, supply);
}

function expire(open: OpenSupply[], period: number): void {
  while ((open[0]?.expires ?? Infinity) <= period) {
    const supply = open.shift();
    if (supply !== undefined) supply.pegs.push({ target: { kind: 'expired' }, period, quantity: supply.left });
  }
}

function take(open: OpenSupply[], { target, period, quantity }: Peg): void {
  let short = quantity;
  while (short > 0 && open[0] !== undefined) {
    const supply = open[0];
    const taken = Math.min(short, supply.left);
    supply.pegs.push({ target, period, quantity: taken });
    supply.left -= taken;
    short -= taken;
    if (supply.left === 0) open.shift();
  }
}

/** What an order serves in the end: demands as such, or, at some level, what nobody asked for. */
export type FinalTarget =
  | { readonly kind: 'demand'; readonly part: PartKey; readonly id: string }
  | { readonly kind: 'safety_stock' | 'left_over' | 'expired' | 'loss'; readonly part: PartKey };

export interface FinalPeg {
  readonly target: FinalTarget;
  readonly quantity: Steps;
}

/**
 * Follows pegs upward through all levels. What an order takes for another order is divided as that order is, by the
 * largest remainder, so that the answer adds up to the order.
 *
 * @param plans the whole plan
 * @returns a function from an order (part and index) to what it serves, quantities in steps of that part
 */
export function finalPegs(
  plans: ReadonlyMap<PartKey, PartPlan>,
): (part: PartKey, index: number) => readonly FinalPeg[] {
  const pegged = new Map<PartKey, readonly (readonly Peg[])[]>();
  const known = new Map<string, readonly FinalPeg[]>();
  const pegsOf = (part: PartKey, index: number): readonly Peg[] => {
    const plan = plans.get(part);
    if (plan === undefined) return [];
    const orders =
      pegged.get(part) ?? pegPart(plan).flatMap(({ supply, pegs }) => (supply.kind === 'order' ? [pegs] : []));
    pegged.set(part, orders);
    return orders[index] ?? [];
  };
  const follow = (part: PartKey, index: number): readonly FinalPeg[] => {
    const key = JSON.stringify([part, index]);
    const found = known.get(key) ?? merged(pegsOf(part, index).flatMap((peg) => lifted(peg, part)));
    known.set(key, found);
    return found;
  };
  const lifted = ({ target, quantity }: Peg, part: PartKey): readonly FinalPeg[] => {
    if (target.kind === 'demand') return [{ target: { kind: 'demand', part, id: target.id }, quantity }];
    if (target.kind !== 'order') return [{ target: { kind: target.kind, part }, quantity }];
    return divided(quantity, follow(target.part, target.index));
  };
  return follow;
}

function divided(quantity: Steps, like: readonly FinalPeg[]): FinalPeg[] {
  const whole = like.reduce((sum, peg) => sum + BigInt(peg.quantity), 0n);
  const numerators = like.map((peg) => BigInt(peg.quantity) * BigInt(quantity));
  const shares = roundToTotal(numerators, whole, BigInt(quantity));
  return like.map(({ target }, at) => ({ target, quantity: Number(shares[at] ?? 0n) }));
}

function merged(pegs: readonly FinalPeg[]): FinalPeg[] {
  const sums = new Map<string, FinalPeg>();
  for (const { target, quantity } of pegs) {
    if (quantity === 0) continue;
    const key = JSON.stringify(target);
    sums.set(key, { target, quantity: quantity + (sums.get(key)?.quantity ?? 0) });
  }
  return [...sums.values()];
}
