import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal } from '../measure/decimal.js';
import { type LotPolicy, type PlannedPart, type Steps, lotRuleOf, toSteps } from './planned-part.js';
import { ShelfLayers } from './shelf-layers.js';
import type { Timeline } from './timeline.js';

/** An order that the plan suggests. Periods of the timeline, quantities in steps. */
export interface PlannedOrder {
  readonly part: string;
  /** Counts the part's orders in order of time, from 0. */
  readonly index: number;
  /** When it must be there. */
  readonly due: number;
  /** When it must be started or placed. */
  readonly start: number;
  /** By how much the right start is already past, in the timeline's measure of lead times; else 0. */
  readonly late: number;
  /** Good pieces it brings. */
  readonly good: Steps;
  /** What must be started or bought for that: good / (1 − loss share), rounded up. */
  readonly started: Steps;
}

/** The record of one part, one figure per period, in steps. */
export interface PartRecord {
  readonly gross: readonly Steps[];
  readonly scheduled: readonly Steps[];
  /** What is missing to the safety stock before an order is planned for the period. */
  readonly net: readonly Steps[];
  /** What planned orders bring, good. */
  readonly planned: readonly Steps[];
  /** At the end of the period, planned orders included. */
  readonly projected: readonly Steps[];
  /** What can no longer be used from the period on and is left. */
  readonly expired: readonly Steps[];
  readonly orders: readonly PlannedOrder[];
}

/**
 * Nets one part: period by period, what is there plus what arrives minus what is wanted; where that falls below the
 * safety stock an order is planned, as large as the part's lot rule says for the needs ahead, started earlier by the
 * lead time. What expires first is used first. An order whose start is already past is planned all the same and says
 * by how much it is late.
 *
 * @param part what is known of it
 * @param gross what is wanted per period, in steps: own demands and what orders of other parts take
 * @param timeline the periods
 * @throws ArithmeticError `plan_quantity`, `plan_all_lost`, and as the lot rules and the timeline
 * Source: gross to net with shortfall to the safety stock; J. Orlicky, Material Requirements Planning, 1975 (from
 *   memory).
 */
export function netPart(part: PlannedPart, gross: readonly Steps[], timeline: Timeline): PartRecord {
  return new PartNetting(part, gross, timeline).run();
}

/** Rules that want to know more than what is short now. */
const looksAhead: ReadonlySet<LotPolicy['kind']> = new Set(['period', 'economic', 'silver_meal', 'wagner_whitin']);

class PartNetting {
  private readonly shelf = new ShelfLayers();
  private readonly scheduled: Steps[];
  private readonly safety: Steps;
  private readonly orders: PlannedOrder[] = [];

  constructor(
    private readonly part: PlannedPart,
    private readonly gross: readonly Steps[],
    private readonly timeline: Timeline,
  ) {
    this.scheduled = gross.map(() => 0);
    for (const { period, quantity } of part.receipts) {
      const at = Math.max(0, period);
      if (at < this.scheduled.length) this.scheduled[at] = (this.scheduled[at] ?? 0) + this.steps(quantity);
    }
    for (const { quantity, expires } of part.onHand) this.shelf.add(this.steps(quantity), expires ?? Infinity);
    this.safety = this.steps(part.safetyStock);
  }

  run(): PartRecord {
    const record = { net: [] as Steps[], planned: [] as Steps[], projected: [] as Steps[], expired: [] as Steps[] };
    const rule = lotRuleOf(this.part);
    for (let period = 0; period < this.gross.length; period += 1) {
      record.expired.push(this.shelf.expire(period));
      this.pass(this.shelf, period);
      const short = this.safety - this.shelf.balance;
      const lot = short > 0 ? rule(this.needsFrom(period, short)) : 0;
      if (lot > 0) this.order(period, lot);
      record.net.push(Math.max(0, short));
      record.planned.push(lot);
      record.projected.push(this.shelf.balance);
    }
    return { gross: this.gross, scheduled: this.scheduled, ...record, orders: this.orders };
  }

  private steps(quantity: Parameters<typeof toSteps>[0]): Steps {
    return toSteps(quantity, this.part.decimals, this.part.part);
  }

  private expiryOf(period: number): number {
    return this.part.shelfLife === undefined ? Infinity : period + this.part.shelfLife;
  }

  /** What arrives and what is wanted in a period. */
  private pass(shelf: ShelfLayers, period: number): void {
    const arriving = this.scheduled[period] ?? 0;
    if (arriving > 0) shelf.add(arriving, this.expiryOf(period));
    const wanted = this.gross[period] ?? 0;
    if (wanted > 0) shelf.take(wanted);
  }

  /** Net needs from a period on if each were covered as it comes; no farther than what arrives now can be used. */
  private needsFrom(period: number, short: Steps): Steps[] {
    const needs = [short];
    if (!looksAhead.has(this.part.lot.kind)) return needs;
    const shelf = this.shelf.copy();
    shelf.add(short, Infinity);
    const end = Math.min(this.gross.length, this.expiryOf(period));
    for (let later = period + 1; later < end; later += 1) {
      shelf.expire(later);
      this.pass(shelf, later);
      const need = Math.max(0, this.safety - shelf.balance);
      if (need > 0) shelf.add(need, Infinity);
      needs.push(need);
    }
    return needs;
  }

  private order(period: number, good: Steps): void {
    const { part, leadTime } = this.part;
    const { period: start, late } = this.timeline.startFor(period, leadTime);
    const started = this.startedFor(good);
    if (!Number.isSafeInteger(started) || !Number.isSafeInteger(good)) {
      throw new ArithmeticError('plan_quantity', { part, quantity: String(started) });
    }
    this.orders.push({ part, index: this.orders.length, due: period, start, late, good, started });
    this.shelf.add(good, this.expiryOf(period));
  }

  private startedFor(good: Steps): Steps {
    const loss = decimal(this.part.lossShare ?? 0);
    if (loss.isZero()) return good;
    if (loss.lessThan(0) || loss.greaterThanOrEqualTo(1)) {
      throw new ArithmeticError('plan_all_lost', { part: this.part.part, share: loss.toFixed() });
    }
    return decimal(good).div(loss.negated().plus(1)).ceil().toNumber();
  }
}
