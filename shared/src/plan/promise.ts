import { type Bills, type PartKey, checkBillLines } from '../bill/bill-lines.js';
import { lowLevelCodes } from '../bill/low-level-codes.js';
import { issueQuantity } from '../bill/requirement.js';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { type Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import { afterPromise } from './available-to-promise.js';
import { type Steps, fromSteps, toSteps } from './planned-part.js';

/** What a promise may count on for one part. */
export interface PromisePart {
  readonly decimals: number;
  /** Cumulative available to promise per period (`cumulativeAvailable`), in steps of the stock unit. */
  readonly available: readonly Steps[];
  /** Periods until more of it can be bought; undefined where it cannot be bought. */
  readonly buyingTime?: number;
  /** Minutes at the bench for one stock unit, if it is made. */
  readonly minutes?: DecimalInput;
  /** Periods that pass between the start of making it and its being there, besides the work. */
  readonly makingTime?: number;
}

export interface PromiseQuestion {
  readonly bills: Bills;
  readonly parts: ReadonlyMap<PartKey, PromisePart>;
  /** Minutes at the bench that are not yet taken, per period. */
  readonly freeMinutes: readonly number[];
  readonly part: PartKey;
  readonly quantity: DecimalInput;
}

export interface PromiseStep {
  readonly part: PartKey;
  readonly kind: 'take' | 'buy' | 'make';
  /** In the part's stock unit. */
  readonly quantity: Decimal;
  /** When it starts; for what is taken, when it is taken. */
  readonly from: number;
  /** When it must be there. */
  readonly until: number;
}

/** What keeps a promise from being earlier. */
export type PromiseHindrance =
  { readonly kind: 'bench'; readonly part: PartKey } | { readonly kind: 'part'; readonly part: PartKey };

export interface PromiseAnswer {
  /** The first period for which the quantity can be promised; undefined if none within the horizon. */
  readonly period: number | undefined;
  /** How it comes about. */
  readonly steps: readonly PromiseStep[];
  /** Why not one period earlier (or, if there is no period, not at all). */
  readonly hindrance: PromiseHindrance | undefined;
}

/**
 * The first period for which a quantity can be promised, though not all of it is there: what is free is taken, the rest
 * is made from components and free bench hours, or bought. Reckoned backward from each period in turn: work is put as
 * late as it can be, a batch starts when all its components are there, and what one component takes is not there for
 * another. The answer can be kept; by starting work on half a batch a shop may now and then be earlier.
 *
 * @param question bills, parts, bench and what is asked for
 * @throws ArithmeticError `plan_part_unknown`, `bill_cycle`, and as `checkBillLines` and `toSteps`
 * Source: common practice, no source (capable to promise).
 */
export function earliestPromise(question: PromiseQuestion): PromiseAnswer {
  lowLevelCodes(question.bills);
  const asked = partOf(question, question.part);
  const quantity = toSteps(question.quantity, asked.decimals, question.part);
  let hindrance: PromiseHindrance | undefined;
  for (let period = 0; period < question.freeMinutes.length; period += 1) {
    const attempt = new PromiseAttempt(question);
    const failure = attempt.provide(question.part, quantity, period);
    if (failure === undefined) return { period, steps: attempt.steps, hindrance };
    hindrance = failure;
  }
  return { period: undefined, steps: [], hindrance };
}

class PromiseAttempt {
  readonly steps: PromiseStep[] = [];
  private readonly available = new Map<PartKey, readonly Steps[]>();
  private readonly freeMinutes: Decimal[];

  constructor(private readonly question: PromiseQuestion) {
    this.freeMinutes = question.freeMinutes.map((minutes) => decimal(String(minutes)));
  }

  /** Makes sure that a quantity is there in a period; answers what is in the way if that cannot be. */
  provide(key: PartKey, quantity: Steps, period: number): PromiseHindrance | undefined {
    const part = partOf(this.question, key);
    const rest = quantity - this.takeAvailable(key, part, quantity, period);
    if (rest === 0) return undefined;
    if ((this.question.bills.get(key) ?? []).length > 0) return this.make(key, part, rest, period);
    if (part.buyingTime === undefined || part.buyingTime > period) return { kind: 'part', part: key };
    this.note(key, part, 'buy', rest, period - part.buyingTime, period);
    return undefined;
  }

  private takeAvailable(key: PartKey, part: PromisePart, quantity: Steps, period: number): Steps {
    const available = this.available.get(key) ?? part.available;
    const taken = Math.max(0, Math.min(quantity, available[period] ?? 0));
    if (taken === 0) return 0;
    this.available.set(key, afterPromise(available, period, taken));
    this.note(key, part, 'take', taken, period, period);
    return taken;
  }

  private make(key: PartKey, part: PromisePart, quantity: Steps, period: number): PromiseHindrance | undefined {
    const end = period - (part.makingTime ?? 0);
    const batch = fromSteps(quantity, part.decimals);
    const start = end < 0 ? undefined : this.work(batch.times(part.minutes ?? 0), end);
    if (start === undefined) return { kind: 'bench', part: key };
    const lines = this.question.bills.get(key) ?? [];
    checkBillLines(key, lines);
    this.note(key, part, 'make', quantity, start, period);
    for (const line of lines) {
      const { decimals } = partOf(this.question, line.part);
      const need = toSteps(issueQuantity(batch, line, decimals), decimals, line.part);
      const failure = this.provide(line.part, need, start);
      if (failure !== undefined) return failure;
    }
    return undefined;
  }

  /** Takes minutes from the latest periods that have some. Answers the first period that is used. */
  private work(minutes: Decimal, end: number): number | undefined {
    let left = minutes;
    for (let period = end; period >= 0; period -= 1) {
      if (left.lessThanOrEqualTo(0)) return Math.min(end, period + 1);
      const free = this.freeMinutes[period] ?? decimal(0);
      const used = free.lessThan(left) ? free : left;
      if (used.greaterThan(0)) this.freeMinutes[period] = free.minus(used);
      if (used.greaterThan(0)) left = left.minus(used);
    }
    return left.lessThanOrEqualTo(0) ? 0 : undefined;
  }

  private note(
    key: PartKey,
    part: PromisePart,
    kind: PromiseStep['kind'],
    quantity: Steps,
    from: number,
    until: number,
  ): void {
    this.steps.push({ part: key, kind, quantity: fromSteps(quantity, part.decimals), from, until });
  }
}

function partOf({ parts, part: usedIn }: PromiseQuestion, key: PartKey): PromisePart {
  const part = parts.get(key);
  if (part === undefined) throw new ArithmeticError('plan_part_unknown', { part: key, usedIn });
  return part;
}
