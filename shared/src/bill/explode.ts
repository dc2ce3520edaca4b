import type { Decimal } from 'decimal.js';
import { CalculationError } from '../errors/calculation-error.js';
import { Exact, nonNegativeQuantity } from '../measure/exact.js';
import { type Bills, type BillLine, type PartKey, checkBillLines, takenPerUnit } from './bill-lines.js';
import { lowLevelCodes } from './low-level-codes.js';
import { type IssueDecimals, issueQuantity } from './requirement.js';

export interface Requirement {
  readonly part: PartKey;
  /** Longest path below the exploded part; it is itself 0. */
  readonly level: number;
  /** In the part's stock unit, summed over every line that asks for it. */
  readonly quantity: Decimal;
  readonly made: boolean;
}

/**
 * Explodes a bill over all levels: how much of each part goes into a quantity of one part when every made part is made
 * for it and nothing is taken from the shelf. A part that occurs several times is summed once, and each made part is
 * rounded as one batch. Lines are filled with their own part; alternates play no role here.
 *
 * @param bills the bills in force
 * @param part what is built
 * @param quantity of it, in its stock unit
 * @param decimals how finely each part is taken; by default nothing is rounded
 * @returns one row per part, in order of level, the exploded part left out
 * @throws CalculationError `bill_cycle` | `bill_line_invalid` | `bill_line_repeated` | `not_a_number` |
 *   `negative_quantity`
 * Source: common practice, no source (explosion in order of low-level codes).
 */
export function explode(
  bills: Bills,
  part: PartKey,
  quantity: Decimal.Value,
  decimals: IssueDecimals = () => undefined,
): Requirement[] {
  const below = billsBelow(bills, part);
  const need = new Map<PartKey, Decimal>([[part, nonNegativeQuantity(quantity, 'quantity')]]);
  const levels = lowLevelCodes(below);
  for (const parent of levels.keys()) {
    for (const line of below.get(parent) ?? []) {
      const taken = issueQuantity(need.get(parent) ?? 0, takenPerUnit(line), decimals(line.part));
      need.set(line.part, taken.plus(need.get(line.part) ?? 0));
    }
  }
  return [...levels]
    .filter(([key]) => key !== part)
    .map(([key, level]) => ({ part: key, level, quantity: need.get(key) ?? new Exact(0), made: below.has(key) }));
}

/** The bills that can be reached from a part, alternates left aside; each checked. */
function billsBelow(bills: Bills, part: PartKey): Map<PartKey, BillLine[]> {
  const below = new Map<PartKey, BillLine[]>();
  const open = [part];
  for (const key of open) {
    const lines = bills.get(key);
    if (lines === undefined || below.has(key)) continue;
    checkBillLines(key, lines);
    below.set(
      key,
      lines.map((line) => ({ ...line, alternates: [] })),
    );
    open.push(...lines.map((line) => line.part));
  }
  return below;
}

export interface IndentedRow {
  /** Positions from the exploded part down to this line. */
  readonly path: readonly string[];
  readonly level: number;
  readonly parent: PartKey;
  readonly part: PartKey;
  readonly quantityPer: Decimal;
  /** What this one place takes, not rounded (roundings belong to whole batches). In the part's stock unit. */
  readonly quantity: Decimal;
}

/**
 * Explodes a bill as an indented list: one row per place, in the order in which the lines are written.
 *
 * @param rowLimit refuses to write out more rows than this, since shared sub-assemblies multiply
 * @throws CalculationError as `explode`, and `explosion_too_large`
 */
export function explodeIndented(
  bills: Bills,
  part: PartKey,
  quantity: Decimal.Value,
  rowLimit = 20_000,
): IndentedRow[] {
  const below = billsBelow(bills, part);
  lowLevelCodes(below);
  const rows: IndentedRow[] = [];
  const walk = (parent: PartKey, amount: Decimal, path: readonly string[]): void => {
    for (const line of below.get(parent) ?? []) {
      if (rows.length >= rowLimit) {
        throw new CalculationError('explosion_too_large', `The bill of ${part} has more than ${rowLimit} places.`, {
          part,
          limit: rowLimit,
        });
      }
      const here = [...path, line.position];
      const taken = amount.times(takenPerUnit(line));
      const { part: component, quantityPer } = line;
      rows.push({ path: here, level: here.length, parent, part: component, quantityPer, quantity: taken });
      walk(component, taken, here);
    }
  };
  walk(part, nonNegativeQuantity(quantity, 'quantity'), []);
  return rows;
}
