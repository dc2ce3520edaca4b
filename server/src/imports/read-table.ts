import { decimalSignOf, type DecimalSign } from './decimal-sign.js';
import type { FoundColumn } from './find-columns.js';
import type { ImportColumn, RowFault } from './import-kind.js';
import { ImportRow, type CellValue } from './import-row.js';
import { readCell } from './read-cell.js';
import type { CsvRow, CsvTable } from './read-csv.js';

export interface ReadTable {
  readonly rows: readonly ImportRow[];
  readonly faults: readonly RowFault[];
  readonly decimalSign: DecimalSign | undefined;
}

type Bound = FoundColumn & { readonly column: ImportColumn };

/**
 * Reads every cell of the table by its column's type. Rows with a fault are left out of what is read, so that the
 * checks over all rows see whole ones only.
 *
 * @param chosenSign the decimal sign that a person chose; otherwise the file's numbers show it
 */
export function readTable(
  table: CsvTable,
  found: readonly FoundColumn[],
  chosenSign: DecimalSign | undefined,
): ReadTable {
  const bound = found.filter((column): column is Bound => column.column !== undefined);
  const signs = decimalSignOf(numbersIn(table, bound));
  if (chosenSign === undefined && signs.mixed) return { rows: [], faults: [mixedSigns()], decimalSign: undefined };
  const decimalSign = chosenSign ?? signs.sign;
  const faults: RowFault[] = [];
  const rows: ImportRow[] = [];
  for (const row of table.rows) {
    const own = faultsOfShape(row, table.headers.length);
    const cells = new Map<string, CellValue>();
    for (const { index, column } of bound) {
      const text = row.cells[index] ?? '';
      const read = cellOf(text, column, decimalSign);
      if ('fault' in read) own.push({ line: row.line, column: column.title, sentence: read.fault });
      else cells.set(column.key, read.value);
    }
    if (own.length === 0) rows.push(new ImportRow(row.line, cells));
    faults.push(...own);
  }
  return { rows, faults, decimalSign };
}

function cellOf(text: string, column: ImportColumn, sign: DecimalSign | undefined) {
  if (text !== '') return readCell(text, column.cell, sign);
  return column.required ? { fault: `${column.title} is needed in every line.` } : { value: null };
}

function faultsOfShape(row: CsvRow, width: number): RowFault[] {
  const over = row.cells.slice(width).some((cell) => cell !== '');
  if (!over) return [];
  const sentence = `The line has ${row.cells.length} cells where the header has ${width}. Put quotation marks round a cell that holds the separator.`;
  return [{ line: row.line, column: null, sentence }];
}

function* numbersIn(table: CsvTable, bound: readonly Bound[]): Iterable<string> {
  const numeric = bound.filter(({ column }) => column.cell.type === 'number' || column.cell.type === 'whole');
  for (const row of table.rows) {
    for (const { index } of numeric) {
      const text = row.cells[index];
      if (text !== undefined && /^[-\u2212]?[\d.,\s\u00a0\u202f']+$/.test(text)) yield text;
    }
  }
}

function mixedSigns(): RowFault {
  return {
    line: 1,
    column: null,
    sentence:
      'Some numbers of the file have a comma before their decimals and some a point. Write them one way, or say which sign holds.',
  };
}
