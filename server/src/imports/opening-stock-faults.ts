import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { isStockMeasure } from '@emberlot/shared/measure/stock-measures';
import { positiveStockQuantity } from '@emberlot/shared/measure/stock-quantity';
import type { StockBin, StockPart } from '../stock/opening-stock.service.js';
import type { RowFault } from './import-kind.js';
import type { ImportRow } from './import-row.js';
import { lotKeys, openingStockColumns } from './opening-stock-columns.js';

/** What the file names, as far as the shelf knows it. */
export interface ShelfSeen {
  readonly parts: ReadonlyMap<string, StockPart>;
  readonly bins: ReadonlyMap<string, StockBin>;
  /** Codes of lots that are there already. */
  readonly lots: ReadonlySet<string>;
  /** `part id/bin code` of parts followed by count whose opening stock there has been taken in. */
  readonly counted: ReadonlySet<string>;
}

interface Place {
  readonly line: number;
  readonly row: ImportRow;
}

type At = (row: ImportRow, key: string, sentence: string) => void;

export function openingFaults(rows: readonly ImportRow[], seen: ShelfSeen, today: string): RowFault[] {
  const faults: RowFault[] = [];
  const at: At = (row, key, sentence) => {
    faults.push({ line: row.line, column: titleOf(key), sentence });
  };
  const lots = new Map<string, Place>();
  const places = new Map<string, number>();
  for (const row of rows) {
    const part = seen.parts.get(row.required('part'));
    checkBin(row, seen, at);
    if (!part) {
      at(row, 'part', `There is no part ${row.required('part')}. Take in the parts first.`);
      continue;
    }
    checkPart(row, part, at);
    checkDays(row, today, at);
    if (part.traced === 'count') checkCounted(row, part, seen, places, at);
    else checkLot(row, seen, lots, at);
  }
  return faults;
}

function checkBin(row: ImportRow, seen: ShelfSeen, at: At): void {
  const bin = seen.bins.get(row.required('bin'));
  if (bin && bin.retiredAt !== null) at(row, 'bin', `Bin ${bin.code} is no longer in use.`);
}

function checkPart(row: ImportRow, part: StockPart, at: At): void {
  const { measure } = part;
  if (part.retiredOn !== null) at(row, 'part', `${part.code} is retired.`);
  if (part.traced === 'single') {
    at(row, 'part', `${part.code} is followed one by one: its units come onto the shelf from a batch.`);
  }
  if (!isStockMeasure(measure)) return;
  const read = attempt(() => positiveStockQuantity(row.required('quantity'), measure));
  if (!read.ok) at(row, 'quantity', read.fault.message);
}

function checkDays(row: ImportRow, today: string, at: At): void {
  const received = row.text('receivedOn');
  const expires = row.text('expiresOn');
  if (received !== null && received > today) at(row, 'receivedOn', 'This day is still to come.');
  if (received !== null && expires !== null && expires < received) {
    at(row, 'expiresOn', 'It would have expired before it came.');
  }
}

function checkCounted(row: ImportRow, part: StockPart, seen: ShelfSeen, places: Map<string, number>, at: At): void {
  const stray = lotKeys.find((key) => row.text(key) !== null);
  if (stray) at(row, stray, `${part.code} is followed by count and has no lots: leave this empty.`);
  const place = `${part.id}/${row.required('bin')}`;
  const before = places.get(place);
  if (before !== undefined) at(row, 'bin', `${part.code} in this bin stands in line ${before} already.`);
  else places.set(place, row.line);
  if (seen.counted.has(place)) {
    at(row, 'bin', `The opening stock of ${part.code} in this bin is on record already. Adjust what differs.`);
  }
}

function checkLot(row: ImportRow, seen: ShelfSeen, lots: Map<string, Place>, at: At): void {
  const code = row.text('lot');
  if (code === null) return;
  if (seen.lots.has(code)) at(row, 'lot', `Lot ${code} is on record already.`);
  const first = lots.get(code);
  if (!first) {
    lots.set(code, { line: row.line, row });
    return;
  }
  const keys = ['part', 'unitCost', ...lotKeys];
  const different = keys.find((key) => row.text(key) !== first.row.text(key));
  if (different) {
    at(row, different, `Lot ${code} stands in line ${first.line} with another value here.`);
  } else if (row.text('bin') === first.row.text('bin')) {
    at(row, 'bin', `Lot ${code} in this bin stands in line ${first.line} already.`);
  }
}

function titleOf(key: string): string {
  return openingStockColumns.find((column) => column.key === key)?.title ?? key;
}
