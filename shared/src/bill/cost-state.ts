import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal } from '../measure/decimal.js';
import { type BillLine, type Bills, type PartKey, checkBillLines } from './bill-lines.js';
import { rollUp } from './roll-up.js';

/** Everything that decides what parts cost at one moment. Costs are in major units of one currency. */
export interface CostState {
  readonly bills: Bills;
  /** Of bought parts, per stock unit. A part with a bill costs what its bill says, whatever stands here. */
  readonly purchaseCost: ReadonlyMap<PartKey, Decimal>;
  /** Of made parts: minutes at the bench per stock unit; none where a part is not named. */
  readonly minutes: ReadonlyMap<PartKey, Decimal>;
  /** Per hour at the bench. */
  readonly labourRate: Decimal;
  /** Overhead per hour at the bench, on top of labour. */
  readonly overheadRate: Decimal;
}

/** What a part and everything below it costs, not rounded. */
export interface ExactCosts {
  /** The lines of each made part. */
  readonly made: ReadonlyMap<PartKey, readonly BillLine[]>;
  /** Cost of one stock unit, by part. */
  readonly exact: ReadonlyMap<PartKey, Decimal>;
}

/**
 * Rolls the costs of one part up (`rollUp`), refusing what a table or a comparison could not stand on.
 *
 * @throws ArithmeticError `bill_cost_missing` (a bought part without cost) | `bill_cost_negative` | `bill_cycle`, and as
 *   `checkBillLines`
 */
export function exactCosts(state: CostState, part: PartKey): ExactCosts {
  const made = ownLinesBelow(state, part);
  for (const key of made.keys()) hoursOf(state, key);
  notNegative(state.labourRate, part, 'labour rate');
  notNegative(state.overheadRate, part, 'overhead rate');
  if (made.size === 0) return { made, exact: new Map([[part, purchaseCostOf(state, part)]]) };
  const rolled = rollUp({
    bills: made,
    unitCost: (key) => purchaseCostOf(state, key),
    minutes: (key) => state.minutes.get(key) ?? 0,
    labourPerHour: state.labourRate,
    overheadPerHour: state.overheadRate,
  });
  return { made, exact: new Map([...rolled].map(([key, { total }]) => [key, total])) };
}

/** Hours at the bench for one stock unit, lower levels left out. @throws ArithmeticError `bill_cost_negative` */
export function hoursOf(state: CostState, part: PartKey): Decimal {
  return notNegative(state.minutes.get(part) ?? new Decimal(0), part, 'time').div(60);
}

function purchaseCostOf(state: CostState, part: PartKey): Decimal {
  const cost = state.purchaseCost.get(part);
  if (cost === undefined) throw new ArithmeticError('bill_cost_missing', { part });
  return notNegative(cost, part, 'cost');
}

function notNegative(value: Decimal, part: PartKey, what: string): Decimal {
  if (!value.isFinite() || value.lessThan(0)) {
    throw new ArithmeticError('bill_cost_negative', { part, what, value: value.toFixed() });
  }
  return value;
}

/** The bills that can be reached from a part by the lines' own parts, that part first; each checked. */
function ownLinesBelow(state: CostState, part: PartKey): Map<PartKey, BillLine[]> {
  const below = new Map<PartKey, BillLine[]>();
  const open = [part];
  for (const key of open) {
    const lines = state.bills.get(key);
    if (lines === undefined || lines.length === 0 || below.has(key)) continue;
    checkBillLines(key, lines);
    below.set(
      key,
      lines.map((line) => ({ ...line, alternates: [] })),
    );
    open.push(...lines.map((line) => line.part));
  }
  return below;
}
