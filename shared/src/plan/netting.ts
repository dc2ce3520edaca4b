import { type Bills, type PartKey, checkBillLines } from '../bill/bill-lines.js';
import { lowLevelCodes } from '../bill/low-level-codes.js';
import { type Ratio, lineRatio, timesRoundedUp } from '../bill/ratio.js';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { type PartRecord, netPart } from './net-part.js';
import { type PlannedPart, type Steps, toSteps } from './planned-part.js';
import type { Timeline } from './timeline.js';

/** Why something is wanted. */
export type RequirementCause =
  | { readonly kind: 'demand'; readonly id: string }
  /** A planned order of another part takes it, on a line of that part's bill. */
  | { readonly kind: 'order'; readonly part: PartKey; readonly index: number; readonly position: string };

/** A quantity that is wanted in a period, in steps. */
export interface Requirement {
  readonly period: number;
  readonly quantity: Steps;
  readonly cause: RequirementCause;
}

export interface PartPlan extends PartRecord {
  readonly part: PlannedPart;
  readonly lowLevelCode: number;
  /** Everything that is wanted of it within the horizon; adds up to `gross`. */
  readonly requirements: readonly Requirement[];
}

/**
 * Time-phased netting over all levels: parts are taken in order of their low-level codes, so that everything that can
 * ask for a part has been planned before it is. What an order takes is wanted when the order starts, rounded up once per
 * order and line; lines are filled with their own part.
 *
 * @param bills the bills in force
 * @param parts every part that is in a bill or wanted
 * @param timeline the periods
 * @returns the plan by part, in order of low-level code; what is wanted beyond the horizon is left out
 * @throws ArithmeticError `bill_cycle`, `plan_part_unknown` for a component that is not among the parts, and as
 *   `checkBillLines` and `netPart`
 * Source: J. Orlicky, Material Requirements Planning, 1975 (from memory).
 */
export function planRequirements(
  bills: Bills,
  parts: readonly PlannedPart[],
  timeline: Timeline,
): ReadonlyMap<PartKey, PartPlan> {
  const codes = lowLevelCodes(bills);
  const wanted = new Map(parts.map((part) => [part.part, ownRequirements(part, timeline.count)]));
  const decimals = new Map(parts.map((part) => [part.part, part.decimals]));
  const inOrder = parts.toSorted((a, b) => (codes.get(a.part) ?? 0) - (codes.get(b.part) ?? 0));
  const plans = new Map<PartKey, PartPlan>();
  for (const part of inOrder) {
    const requirements = (wanted.get(part.part) ?? []).toSorted((a, b) => a.period - b.period);
    const record = netPart(part, grossOf(requirements, timeline.count, part.part), timeline);
    plans.set(part.part, { ...record, part, lowLevelCode: codes.get(part.part) ?? 0, requirements });
    addDependent(bills, part, record, wanted, decimals);
  }
  return plans;
}

function ownRequirements({ part, decimals, demands }: PlannedPart, count: number): Requirement[] {
  return demands
    .map(({ id, period, quantity }): Requirement => ({
      period: Math.max(0, period),
      quantity: toSteps(quantity, decimals, part),
      cause: { kind: 'demand', id },
    }))
    .filter(({ period, quantity }) => period < count && quantity > 0);
}

function grossOf(requirements: readonly Requirement[], count: number, part: PartKey): Steps[] {
  const gross = Array.from({ length: count }, () => 0);
  let total = 0;
  for (const { period, quantity } of requirements) {
    gross[period] = (gross[period] ?? 0) + quantity;
    total += quantity;
  }
  if (!Number.isSafeInteger(total)) throw new ArithmeticError('plan_quantity', { part, quantity: String(total) });
  return gross;
}

function addDependent(
  bills: Bills,
  { part, decimals }: PlannedPart,
  { orders }: PartRecord,
  wanted: ReadonlyMap<PartKey, Requirement[]>,
  decimalsOf: ReadonlyMap<PartKey, number>,
): void {
  const lines = bills.get(part) ?? [];
  if (lines.length === 0 || orders.length === 0) return;
  checkBillLines(part, lines);
  for (const line of lines) {
    const list = wanted.get(line.part);
    const componentDecimals = decimalsOf.get(line.part);
    if (list === undefined || componentDecimals === undefined) {
      throw new ArithmeticError('plan_part_unknown', { part: line.part, usedIn: part });
    }
    const ratio = lineRatio(line, decimals, componentDecimals);
    for (const { index, start, started } of orders) {
      const cause = { kind: 'order', part, index, position: line.position } as const;
      list.push({ period: start, quantity: timesExactly(started, ratio, line.part), cause });
    }
  }
}

/** amount × ratio, rounded up; by way of long integers only where plain ones could lose a digit. */
function timesExactly(amount: Steps, ratio: Ratio, part: PartKey): Steps {
  const [numerator, denominator] = [Number(ratio.numerator), Number(ratio.denominator)];
  const product = amount * numerator;
  if (product <= Number.MAX_SAFE_INTEGER && denominator <= Number.MAX_SAFE_INTEGER) {
    const rest = product % denominator;
    return (product - rest) / denominator + (rest > 0 ? 1 : 0);
  }
  const exact = timesRoundedUp(BigInt(amount), ratio);
  if (exact > BigInt(Number.MAX_SAFE_INTEGER)) {
    throw new ArithmeticError('plan_quantity', { part, quantity: exact.toString() });
  }
  return Number(exact);
}
