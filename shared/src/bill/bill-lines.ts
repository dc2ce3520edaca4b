import type { Decimal } from 'decimal.js';
import { CalculationError } from '../errors/calculation-error.js';

/** Whatever names a part: its code or its identity in the store. The arithmetic only compares it. */
export type PartKey = string;

/** A part that may be fitted instead of the one that the line names. */
export interface NamedAlternate {
  readonly part: PartKey;
  /** How many of it (its own stock unit) stand in for one of the line's part. Above zero. */
  readonly factor: Decimal;
  /** Lower is tried first; the line's own part comes before all of them. */
  readonly priority: number;
}

/** One line of a bill: what goes into ONE stock unit of the bill's part. */
export interface BillLine {
  /** Names the line within its bill, for instance its position mark; unique there. */
  readonly position: string;
  readonly part: PartKey;
  /** In the component's stock unit per stock unit of the bill's part. Above zero. */
  readonly quantityPer: Decimal;
  /**
   * The share taken from the shelf on top of what goes in: 0.05 means that for 100 fitted, 105 are taken.
   * At least zero.
   */
  readonly scrapAllowance: Decimal;
  readonly alternates: readonly NamedAlternate[];
}

/** The bills in force, by the part they build. A part without a bill is bought. */
export type Bills = ReadonlyMap<PartKey, readonly BillLine[]>;

/** A way to fill a line: its own part or one of its alternates. */
export interface LineOption {
  readonly part: PartKey;
  /** Taken from the shelf per stock unit of the bill's part, allowance included. In the option's stock unit. */
  readonly takenPer: Decimal;
}

/**
 * What is taken from the shelf for one stock unit of the bill's part: quantity per × (1 + scrap allowance).
 *
 * @returns in the component's stock unit, not rounded
 */
export function takenPerUnit(line: BillLine): Decimal {
  return line.quantityPer.times(line.scrapAllowance.plus(1));
}

/**
 * The ways to fill a line, in the order in which they are tried: the line's own part, then its alternates by priority
 * (equal priorities in the order written).
 */
export function lineOptions(line: BillLine): LineOption[] {
  const own = takenPerUnit(line);
  const alternates = line.alternates.toSorted((a, b) => a.priority - b.priority);
  return [
    { part: line.part, takenPer: own },
    ...alternates.map(({ part, factor }) => ({ part, takenPer: own.times(factor) })),
  ];
}

/**
 * Refuses a bill whose lines cannot be computed with.
 *
 * @throws CalculationError `bill_line_invalid` (quantity or factor not above zero, allowance negative, not finite) |
 *   `bill_line_repeated` (a position or an alternate twice)
 */
export function checkBillLines(part: PartKey, lines: readonly BillLine[]): void {
  const positions = new Set<string>();
  for (const line of lines) {
    if (positions.has(line.position)) throw repeated(part, line, line.position);
    positions.add(line.position);
    if (!isAboveZero(line.quantityPer)) throw invalid(part, line, 'quantity per must be above zero');
    if (!line.scrapAllowance.isFinite() || line.scrapAllowance.lessThan(0)) {
      throw invalid(part, line, 'scrap allowance must not be negative');
    }
    const seen = new Set([line.part]);
    for (const alternate of line.alternates) {
      if (seen.has(alternate.part)) throw repeated(part, line, alternate.part);
      seen.add(alternate.part);
      if (!isAboveZero(alternate.factor)) throw invalid(part, line, 'factor of an alternate must be above zero');
    }
  }
}

function isAboveZero(value: Decimal): boolean {
  return value.isFinite() && value.greaterThan(0);
}

function invalid(part: PartKey, line: BillLine, reason: string): CalculationError {
  return new CalculationError('bill_line_invalid', `Bill of ${part}, line ${line.position}: ${reason}.`, {
    part,
    position: line.position,
    reason,
  });
}

function repeated(part: PartKey, line: BillLine, what: string): CalculationError {
  return new CalculationError('bill_line_repeated', `Bill of ${part}, line ${line.position}: ${what} stands twice.`, {
    part,
    position: line.position,
    what,
  });
}
