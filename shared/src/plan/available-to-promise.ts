import { ArithmeticError } from '../errors/arithmetic-error.js';

/** What is there, what comes and what is already promised, per period, in one unit. */
export interface PromiseInput {
  readonly onHand: number;
  /** What arrives at the start of each period: batches that finish, purchase lines. */
  readonly supply: readonly number[];
  /** What is promised for each period; overdue promises stand in the first. */
  readonly promised: readonly number[];
}

/**
 * Discrete available to promise: what each arrival leaves free until the next one. The first period counts what is on
 * hand; periods without an arrival have no figure of their own.
 *
 * @param input quantities per period
 * @param lookBack whether promises that exceed an arrival are covered from the nearest earlier figure that is free
 * @returns one figure per period, undefined where nothing arrives; without look-back a figure may be below zero
 * @throws ArithmeticError `plan_promise_input`
 * Source: discrete available-to-promise as in the APICS Dictionary (in paraphrase).
 */
export function discreteAvailable(input: PromiseInput, lookBack = false): (number | undefined)[] {
  checkInput(input);
  const free: (number | undefined)[] = [];
  let current = 0;
  input.supply.forEach((arriving, period) => {
    const opens = period === 0 || arriving > 0;
    if (opens) current = period;
    free.push(opens ? arriving + (period === 0 ? input.onHand : 0) : undefined);
    free[current] = (free[current] ?? 0) - (input.promised[period] ?? 0);
  });
  if (lookBack) coverFromEarlier(free);
  return free;
}

function coverFromEarlier(free: (number | undefined)[]): void {
  free.forEach((figure, period) => {
    let short = figure === undefined ? 0 : -figure;
    for (let earlier = period - 1; earlier >= 0 && short > 0; earlier -= 1) {
      const there = Math.max(0, free[earlier] ?? 0);
      const used = Math.min(short, there);
      if (used > 0) free[earlier] = there - used;
      short -= used;
    }
    if (figure !== undefined && figure < 0) free[period] = 0 - short;
  });
}

/**
 * Cumulative available to promise: how much more can be promised for each period so that every promise, the later ones
 * too, can still be kept. It is the least balance from that period on.
 *
 * @param input quantities per period
 * @returns one figure per period, never falling; below zero where promises already exceed what there will be
 * @throws ArithmeticError `plan_promise_input`
 * Source: cumulative available-to-promise with look-ahead; common practice, no source.
 */
export function cumulativeAvailable(input: PromiseInput): number[] {
  checkInput(input);
  let balance = input.onHand;
  const balances = input.supply.map((arriving, period) => (balance += arriving - (input.promised[period] ?? 0)));
  let least = Infinity;
  return balances
    .toReversed()
    .map((there) => (least = Math.min(least, there)))
    .toReversed();
}

/**
 * The first period for which a quantity can be promised.
 *
 * @param cumulative as by `cumulativeAvailable`
 * @returns the period, or undefined if not within the horizon
 */
export function firstPeriodFor(quantity: number, cumulative: readonly number[]): number | undefined {
  const period = cumulative.findIndex((free) => free >= quantity);
  return period < 0 ? undefined : period;
}

/**
 * What remains after promising a quantity for a period.
 *
 * @param cumulative as by `cumulativeAvailable`
 * @throws ArithmeticError `plan_not_available` if that much is not free then
 */
export function afterPromise(cumulative: readonly number[], period: number, quantity: number): number[] {
  const there = cumulative[period] ?? 0;
  if (quantity > there) throw new ArithmeticError('plan_not_available', { quantity, period, free: there });
  return cumulative.map((free, at) => (at < period ? Math.min(free, there - quantity) : free - quantity));
}

function checkInput({ onHand, supply, promised }: PromiseInput): void {
  const amounts = [onHand, ...supply, ...promised];
  if (supply.length !== promised.length || amounts.some((amount) => !(amount >= 0 && Number.isFinite(amount)))) {
    throw new ArithmeticError('plan_promise_input');
  }
}
