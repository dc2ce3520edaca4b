import { Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import { type Bills, type PartKey, checkBillLines, takenPerUnit } from './bill-lines.js';
import { lowLevelCodes } from './low-level-codes.js';

/** What a cost roll-up needs to know. */
export interface RollUpQuestion {
  /** The bills in force. A part without a bill is bought. */
  readonly bills: Bills;
  /** Cost of one stock unit of a bought part, major units; undefined where nothing is known. */
  readonly unitCost: (part: PartKey) => DecimalInput | undefined;
  /** Minutes of work in the bill's own steps, for one stock unit made. */
  readonly minutes: (part: PartKey) => DecimalInput;
  /** Major units per hour of work. */
  readonly labourPerHour: DecimalInput;
  /** Major units of overhead per hour of work, on top of labour; none by default. */
  readonly overheadPerHour?: DecimalInput;
}

/** What one stock unit costs, not rounded, major units. */
export interface RolledUpCost {
  readonly material: Decimal;
  readonly labour: Decimal;
  readonly overhead: Decimal;
  /** Material, labour and overhead together. */
  readonly total: Decimal;
  /** Minutes of work on all levels. */
  readonly minutes: Decimal;
  /** Bought parts in it whose cost is not known and counts as nothing, each once. */
  readonly unknown: readonly PartKey[];
}

/**
 * Rolls costs up over all levels: what a made part takes, with its allowance for scrap, at the cost of a bought part or
 * at the rolled-up cost of a made one, and its own minutes at the rate. Nothing is rounded, and alternates play no role.
 *
 * @returns cost of one stock unit, by part: every part of the bills and every component
 * @throws ArithmeticError `bill_cycle`; `checkBillLines`' faults; as `decimal`
 * Source: common practice, no source (costs added level by level from the lowest up).
 */
export function rollUp(question: RollUpQuestion): ReadonlyMap<PartKey, RolledUpCost> {
  const costs = new Map<PartKey, RolledUpCost>();
  for (const part of [...lowLevelCodes(question.bills).keys()].toReversed()) {
    costs.set(part, question.bills.has(part) ? madeCost(question, part, costs) : boughtCost(question, part));
  }
  return costs;
}

function boughtCost({ unitCost }: RollUpQuestion, part: PartKey): RolledUpCost {
  const known = unitCost(part);
  const material = decimal(known ?? 0);
  const nothing = new Decimal(0);
  const unknown = known === undefined ? [part] : [];
  return { material, labour: nothing, overhead: nothing, total: material, minutes: nothing, unknown };
}

function madeCost(question: RollUpQuestion, part: PartKey, costs: ReadonlyMap<PartKey, RolledUpCost>): RolledUpCost {
  const lines = question.bills.get(part) ?? [];
  checkBillLines(part, lines);
  let material = new Decimal(0);
  let minutes = decimal(question.minutes(part));
  const unknown = new Set<PartKey>();
  for (const line of lines) {
    const cost = costs.get(line.part);
    if (cost === undefined) continue;
    const taken = takenPerUnit(line);
    material = material.plus(taken.times(cost.material));
    minutes = minutes.plus(taken.times(cost.minutes));
    for (const key of cost.unknown) unknown.add(key);
  }
  const labour = minutes.times(question.labourPerHour).div(60);
  const overhead = minutes.times(question.overheadPerHour ?? 0).div(60);
  return { material, labour, overhead, total: material.plus(labour).plus(overhead), minutes, unknown: [...unknown] };
}
