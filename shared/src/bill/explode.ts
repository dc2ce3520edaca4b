import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, type DecimalInput } from '../measure/decimal.js';
import {
  type BillLine,
  type Bills,
  type IssueDecimals,
  type PartKey,
  checkBillLines,
  ledgerDecimals,
  quantityFrom,
  takenPerUnit,
} from './bill-lines.js';
import { lowLevelCodes } from './low-level-codes.js';
import { issueQuantity } from './requirement.js';

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
 * @param decimals how finely each part is taken; by default to the six decimals of the ledger
 * @returns one row per part, in order of level, the exploded part left out
 * @throws ArithmeticError `bill_cycle` | `bill_quantity_negative`, and as `checkBillLines` and `decimal`
 * Source: common practice, no source (explosion in order of low-level codes).
 */
export function explode(
  bills: Bills,
  part: PartKey,
  quantity: DecimalInput,
  decimals: IssueDecimals = ledgerDecimals,
): Requirement[] {
  const below = billsBelow(bills, part);
  const need = new Map<PartKey, Decimal>([[part, quantityFrom(quantity, 'quantity')]]);
  const levels = lowLevelCodes(below);
  for (const parent of levels.keys()) {
    for (const line of below.get(parent) ?? []) {
      const taken = issueQuantity(need.get(parent) ?? 0, line, decimals(line.part));
      need.set(line.part, taken.plus(need.get(line.part) ?? 0));
    }
  }
  return [...levels]
    .filter(([key]) => key !== part)
    .map(([key, level]) => ({ part: key, level, quantity: need.get(key) ?? new Decimal(0), made: below.has(key) }));
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
 * @throws ArithmeticError as `explode`, and `bill_too_many_places`
 */
export function explodeIndented(bills: Bills, part: PartKey, quantity: DecimalInput, rowLimit = 20_000): IndentedRow[] {
  const below = billsBelow(bills, part);
  lowLevelCodes(below);
  const rows: IndentedRow[] = [];
  const walk = (parent: PartKey, amount: Decimal, path: readonly string[]): void => {
    for (const line of below.get(parent) ?? []) {
      if (rows.length >= rowLimit) {
        throw new ArithmeticError('bill_too_many_places', { part, limit: rowLimit });
      }
      const here = [...path, line.position];
      const taken = amount.times(takenPerUnit(line));
      const { part: component, quantityPer } = line;
      rows.push({ path: here, level: here.length, parent, part: component, quantityPer, quantity: taken });
      walk(component, taken, here);
    }
  };
  walk(part, quantityFrom(quantity, 'quantity'), []);
  return rows;
}
