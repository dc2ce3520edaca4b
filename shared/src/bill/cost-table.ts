import { Decimal } from '../measure/decimal.js';
import { addingUp, asCost } from './adding-up.js';
import { type PartKey, takenPerUnit } from './bill-lines.js';
import { type CostState, exactCosts, hoursOf } from './cost-state.js';

/** The cost of one stock unit of a made part, with six decimals; the figures of each table add up to its total. */
export interface CostTable {
  readonly part: PartKey;
  readonly lines: readonly CostTableLine[];
  /** The sum of the lines; what made components cost in labour is in it. */
  readonly material: Decimal;
  /** Of this part's own steps. */
  readonly labour: Decimal;
  readonly overhead: Decimal;
  readonly total: Decimal;
}

export interface CostTableLine {
  readonly position: string;
  readonly part: PartKey;
  /** What one stock unit of the component costs: bought, or the total of its own table. */
  readonly unitCost: Decimal;
  /** Quantity per / (1 − scrap share) × unit cost. */
  readonly cost: Decimal;
}

/**
 * Rolls costs up and writes them out, level by level, for printing: nothing is rounded on the way up; each total is
 * rounded half up to six decimals and its lines by the largest remainder, so that every table adds up.
 *
 * @param state bills, costs, minutes and rates
 * @param part what to cost
 * @returns the tables of the part and of all made parts below it, the part itself first; none for a bought part
 * @throws ArithmeticError as `exactCosts`
 * Source: common practice, no source.
 */
export function costTables(state: CostState, part: PartKey): CostTable[] {
  const { made, exact } = exactCosts(state, part);
  const costOf = (key: PartKey): Decimal => exact.get(key) ?? new Decimal(0);
  return [...made].map(([key, lines]) => {
    const hours = hoursOf(state, key);
    const total = asCost(costOf(key));
    const lineCosts = lines.map((line) => takenPerUnit(line).times(costOf(line.part)));
    const figures = addingUp([...lineCosts, hours.times(state.labourRate), hours.times(state.overheadRate)], total);
    const printed = lines.map((line, index) => ({
      position: line.position,
      part: line.part,
      unitCost: asCost(costOf(line.part)),
      cost: figures[index] ?? new Decimal(0),
    }));
    return {
      part: key,
      lines: printed,
      material: printed.reduce((sum, { cost }) => sum.plus(cost), new Decimal(0)),
      labour: figures[lines.length] ?? new Decimal(0),
      overhead: figures[lines.length + 1] ?? new Decimal(0),
      total,
    };
  });
}
