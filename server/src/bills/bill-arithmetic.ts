import type { BillLine, Bills, IssueDecimals } from '@emberlot/shared/bill/bill-lines';
import { Decimal, decimal, decimalText, sumDecimals } from '@emberlot/shared/measure/decimal';
import { isStockMeasure, stockMeasures } from '@emberlot/shared/measure/stock-measures';
import type { BillPart, BillRevision, RevisionLine } from './bill-revision.js';

/** A line as the arithmetic reads it; parts are named by their codes, so that its faults can be read by a person. */
export function arithmeticLine(line: RevisionLine): BillLine {
  return {
    position: String(line.position),
    part: line.part.code,
    quantityPer: decimal(line.quantityPer),
    scrapShare: decimal(line.scrapPercent).div(100),
    alternates: line.alternates.map((part, index) => ({
      part: part.code,
      factor: new Decimal(1),
      priority: index + 1,
    })),
  };
}

/** Revisions as the arithmetic reads them, by the code of the part they make. */
export function billsOf(revisions: Iterable<BillRevision>): Bills {
  return new Map([...revisions].map((revision) => [revision.part.code, revision.lines.map(arithmeticLine)]));
}

/** Every part that occurs in the revisions, by its code: made ones, components and alternates. */
export function partsOf(revisions: Iterable<BillRevision>): ReadonlyMap<string, BillPart> {
  const parts = new Map<string, BillPart>();
  for (const revision of revisions) {
    parts.set(revision.part.code, revision.part);
    for (const line of revision.lines) {
      for (const part of [line.part, ...line.alternates]) parts.set(part.code, part);
    }
  }
  return parts;
}

/** Pieces are taken whole, wire by the micrometre: as finely as the measure of each part says. */
export function issueDecimalsOf(parts: ReadonlyMap<string, Pick<BillPart, 'measure'>>): IssueDecimals {
  return (code) => {
    const measure = parts.get(code)?.measure;
    return measure !== undefined && isStockMeasure(measure) ? stockMeasures[measure].decimals : 6;
  };
}

/** Minutes of all steps, for one made. */
export function minutesOf(revision: Pick<BillRevision, 'steps'>): string {
  return decimalText(sumDecimals(revision.steps.map(({ minutes }) => minutes)));
}
