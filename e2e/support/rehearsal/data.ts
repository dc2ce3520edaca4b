import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse } from 'csv-parse/sync';
import { irons } from '@emberlot/db/demo/irons';
import { kits } from '@emberlot/db/demo/offers';
import type { DemoContentsLine, DemoMadePart } from '@emberlot/db/demo/scenario.types';
import { subAssemblies } from '@emberlot/db/demo/sub-assemblies';

/** Where the three files of the story lie. */
export const dataFile = (name: 'parts' | 'bill' | 'opening-stock'): string =>
  join(import.meta.dirname, '../../data', `${name}.csv`);

export const tool = 'WREN-60';
export const kit = 'KIT-W60';

export interface BillLine {
  readonly position: string;
  readonly part: string;
  readonly quantity: string;
  readonly scrap: string;
  readonly marks: string;
  readonly alternates: string;
}

type Row = Readonly<Record<string, string>>;

export function readRows(name: 'parts' | 'bill' | 'opening-stock'): readonly Row[] {
  return parse(readFileSync(dataFile(name)), { columns: true, bom: true });
}

/** The lines of each part that is made, the parts that go into others first. */
export function readBills(): ReadonlyMap<string, readonly BillLine[]> {
  const bills = new Map<string, BillLine[]>();
  for (const row of readRows('bill')) {
    const made = cell(row, 'Made part');
    bills.set(made, [...(bills.get(made) ?? []), lineOf(row)]);
  }
  return new Map([...bills].toSorted(([one], [other]) => depth(one, bills) - depth(other, bills)));
}

/** How many levels of made parts lie below. */
export function depth(code: string, bills: ReadonlyMap<string, readonly BillLine[]>): number {
  const lines = bills.get(code);
  return lines ? 1 + Math.max(...lines.map(({ part }) => depth(part, bills))) : 0;
}

function lineOf(row: Row): BillLine {
  return {
    position: cell(row, 'Position'),
    part: cell(row, 'Component'),
    quantity: cell(row, 'Quantity for one'),
    scrap: cell(row, 'Scrap %'),
    marks: cell(row, 'Marks'),
    alternates: cell(row, 'May be replaced by'),
  };
}

export function cell(row: Row, title: string): string {
  const value = row[title];
  if (value === undefined) throw new Error(`The file has no column ${title}`);
  return value;
}

/** How a part is built, as far as the demo's scenario says. */
export function designOf(code: string): Pick<DemoMadePart, 'steps' | 'plan'> {
  return [...irons, ...subAssemblies].find((made) => made.code === code) ?? { steps: [], plan: [] };
}

export function contentsOf(code: string): readonly DemoContentsLine[] {
  const found = kits.find((candidate) => candidate.code === code);
  if (!found) throw new Error(`The scenario has no kit ${code}`);
  return found.contents;
}
