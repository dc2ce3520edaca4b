import type { TableFault, SectionKey } from '../bills/bill-table-faults.js';
import type { TableCheck } from '../bills/bill-tables.service.js';
import { counted, listed } from './counted.js';
import type { ImportCheck, ImportColumn, RowFault } from './import-kind.js';
import type { ImportRow } from './import-row.js';

/** Rows of a bill's table in the order of a column, where they give one; otherwise as they stand. */
export function inOrder(rows: readonly ImportRow[]): readonly ImportRow[] {
  return rows
    .map((row, place) => ({ row, place, order: row.whole('order') }))
    .toSorted((a, b) => (a.order ?? a.place) - (b.order ?? b.place) || a.place - b.place)
    .map(({ row }) => row);
}

/** Two rows of one bill that claim the same place. */
export function repeatedOrders(rows: readonly ImportRow[], title: string): RowFault[] {
  const seen = new Map<string, number>();
  return rows.flatMap((row) => {
    const order = row.whole('order');
    if (order === null) return [];
    const key = JSON.stringify([row.required('owner'), order]);
    const before = seen.get(key);
    seen.set(key, before ?? row.line);
    if (before === undefined) return [];
    return [{ line: row.line, column: title, sentence: `${order} stands in line ${before} already.` }];
  });
}

/** What the check of the bills found, in the words and lines of the file. */
export function importCheck<Key extends SectionKey>(
  check: TableCheck<Key>,
  rows: readonly ImportRow[],
  columns: readonly ImportColumn[],
  what: string,
): ImportCheck<TableCheck<Key>['sections']> {
  return {
    faults: check.faults.map((fault) => rowFault(fault, rows, columns)),
    notes: notesOn(check, what),
    additions: check.begun.length + check.replaced.length,
    plan: check.sections,
  };
}

function rowFault(
  { row, field, sentence }: TableFault,
  rows: readonly ImportRow[],
  columns: readonly ImportColumn[],
): RowFault {
  const column = columns.find(({ key }) => key === field)?.title ?? null;
  return { line: rows[row]?.line ?? 1, column, sentence };
}

function notesOn<Key extends SectionKey>({ begun, replaced, same }: TableCheck<Key>, what: string): string[] {
  const stay = same.length === 1 ? 'says' : 'say';
  return [
    ...(begun.length > 0 ? [`${counted(begun.length, 'draft')} will be begun: ${listed(begun)}.`] : []),
    ...(replaced.length > 0
      ? [`The ${what} of ${counted(replaced.length, 'draft')} will be put in place: ${listed(replaced)}.`]
      : []),
    ...(same.length > 0 ? [`${counted(same.length, 'bill')} ${stay} this already: ${listed(same)}.`] : []),
  ];
}
