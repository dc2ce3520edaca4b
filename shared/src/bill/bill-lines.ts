import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, type DecimalInput, decimal } from '../measure/decimal.js';

/** Whatever names a part: its code or its identity in the store. The arithmetic only compares it. */
export type PartKey = string;

/** A part that may be fitted instead of the one that the line names. */
export interface NamedAlternate {
  readonly part: PartKey;
  /** How many of it (its own stock unit) stand in for one of the line's part. Above zero; usually 1. */
  readonly factor: Decimal;
  /** Lower is tried first; the line's own part comes before all of them. */
  readonly priority: number;
}

/** One line of a bill: what goes into ONE stock unit of the bill's part. */
export interface BillLine {
  /** Names the line within its bill; unique there. */
  readonly position: string;
  readonly part: PartKey;
  /** What stays in: in the component's stock unit per stock unit of the bill's part. Above zero. */
  readonly quantityPer: Decimal;
  /** Share of what is taken that is normally lost: 0.05 means that of 100 taken, 95 go in. From 0 to below 1. */
  readonly scrapShare: Decimal;
  readonly alternates: readonly NamedAlternate[];
  /** Whether one unit may hold the line's part and its alternate side by side. By default each unit holds one kind. */
  readonly alternatesMix?: boolean;
}

/** The bills in force, by the part they build. A part without a bill is bought. */
export type Bills = ReadonlyMap<PartKey, readonly BillLine[]>;

/**
 * How finely each part is taken from the shelf: the number of decimals of its stock unit (0 for pieces).
 * The ledger keeps six.
 */
export type IssueDecimals = (part: PartKey) => number;

export const ledgerDecimals: IssueDecimals = () => 6;

/**
 * What is taken from the shelf for one stock unit of the bill's part: quantity per / (1 − scrap share), not rounded.
 *
 * @returns in the component's stock unit; a division that does not end keeps 60 digits
 * Source: scrap factor and yield factor add up to one; common practice, no source.
 */
export function takenPerUnit(line: BillLine): Decimal {
  return line.quantityPer.div(new Decimal(1).minus(line.scrapShare));
}

/** The line's alternates, lower priority number first; equal ones in the order written. */
export function alternatesInOrder(line: BillLine): NamedAlternate[] {
  return line.alternates.toSorted((a, b) => a.priority - b.priority);
}

/**
 * Takes a quantity into exact arithmetic.
 *
 * @param what names it in the fault's sentence
 * @throws ArithmeticError `bill_quantity_negative`, and as `decimal`
 */
export function quantityFrom(value: DecimalInput, what: string): Decimal {
  const quantity = decimal(value);
  if (quantity.lessThan(0)) throw new ArithmeticError('bill_quantity_negative', { what, value: quantity.toFixed() });
  return quantity;
}

/**
 * Refuses a bill whose lines cannot be computed with.
 *
 * @throws ArithmeticError `bill_line_without_quantity` | `bill_line_all_scrap` | `bill_line_factor` |
 *   `bill_line_repeated` (a position twice, or an alternate twice on a line)
 */
export function checkBillLines(part: PartKey, lines: readonly BillLine[]): void {
  const positions = new Set<string>();
  for (const line of lines) {
    const place = { part, position: line.position };
    if (positions.has(line.position))
      throw new ArithmeticError('bill_line_repeated', { ...place, what: 'the position' });
    positions.add(line.position);
    if (!isAboveZero(line.quantityPer)) throw new ArithmeticError('bill_line_without_quantity', place);
    if (!(line.scrapShare.greaterThanOrEqualTo(0) && line.scrapShare.lessThan(1))) {
      throw new ArithmeticError('bill_line_all_scrap', { ...place, share: line.scrapShare.toString() });
    }
    checkAlternates(line, place);
  }
}

function checkAlternates(line: BillLine, place: { part: PartKey; position: string }): void {
  const seen = new Set([line.part]);
  for (const { part, factor } of line.alternates) {
    if (seen.has(part)) throw new ArithmeticError('bill_line_repeated', { ...place, what: part });
    seen.add(part);
    if (!isAboveZero(factor)) throw new ArithmeticError('bill_line_factor', { ...place, alternate: part });
  }
}

function isAboveZero(value: Decimal): boolean {
  return value.isFinite() && value.greaterThan(0);
}
