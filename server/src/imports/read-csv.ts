import { Readable } from 'node:stream';
import { CsvError, parse } from 'csv-parse';
import { csvLimit } from '@emberlot/shared/limits/imports';
import { decodeCsv, unreadable } from './decode-csv.js';

/** One line of the table below the header. */
export interface CsvRow {
  /** Where it begins in the file, the header being line 1. */
  readonly line: number;
  readonly cells: readonly string[];
}

export interface CsvTable {
  readonly separator: string;
  readonly headers: readonly string[];
  readonly rows: readonly CsvRow[];
}

const separators = [',', ';', '\t'] as const;

/**
 * Reads a CSV file (RFC 4180, with any of the usual separators and line ends).
 *
 * @param bytes the file
 * @param isKnown whether a header is one that the import looks for; decides between separators
 * @throws AppError `invalid_input` with a sentence that names the line, for what cannot be read as a table
 */
export async function readCsv(bytes: Buffer, isKnown: (header: string) => boolean): Promise<CsvTable> {
  if (bytes.length > csvLimit.bytes) throw unreadable(`The file is larger than ${csvLimit.bytes / 1_048_576} MB.`);
  const text = decodeCsv(bytes);
  const separator = separatorOf(text, isKnown);
  const [header, ...rows] = await readRows(text, separator);
  if (!header) throw unreadable('The file holds no line of text.');
  if (header.cells.length > csvLimit.columns) {
    throw unreadable(`The file has ${header.cells.length} columns; at most ${csvLimit.columns} are taken.`);
  }
  if (rows.length === 0) throw unreadable('The file holds a header and nothing below it.');
  return { separator, headers: header.cells, rows };
}

async function readRows(text: string, separator: string): Promise<CsvRow[]> {
  const rows: CsvRow[] = [];
  let lastLine = 0;
  const parser = Readable.from([text]).pipe(
    parse({
      delimiter: separator,
      record_delimiter: ['\r\n', '\n', '\r'],
      info: true,
      // On a fault the records before it are not handed out any more, so what was read is noted here.
      on_record: (record: string[], { lines }) => {
        lastLine = lines;
        return record;
      },
      trim: true,
      relax_column_count: true,
      // A length in inches is written with a quotation mark, and need not be quoted itself.
      relax_quotes: true,
      skip_records_with_empty_values: true,
      skip_empty_lines: true,
      max_record_size: csvLimit.columns * csvLimit.cell,
    }),
  );
  try {
    for await (const { info, record } of parser as AsyncIterable<{ info: { lines: number }; record: string[] }>) {
      const row = { line: info.lines - lineBreaksIn(record), cells: record.map((cell) => cell.normalize('NFC')) };
      if (record.some((cell) => cell.length > csvLimit.cell)) {
        throw unreadable(`Line ${row.line} holds a cell of more than ${csvLimit.cell} characters.`);
      }
      if (rows.length > csvLimit.rows) throw unreadable(`The file has more than ${csvLimit.rows} lines. Split it.`);
      rows.push(row);
    }
  } catch (error) {
    if (error instanceof CsvError) throw unreadable(sentenceOf(error, lastLine + 1));
    throw error;
  }
  return rows;
}

function sentenceOf(error: CsvError, line: number): string {
  if (error.code === 'CSV_QUOTE_NOT_CLOSED')
    return `A quotation mark opened in line ${line} or after it is never closed.`;
  if (error.code === 'CSV_MAX_RECORD_SIZE')
    return `Line ${line} is too long, or a quotation mark in it is never closed.`;
  return `Line ${line} cannot be read as a line of a table.`;
}

function lineBreaksIn(cells: readonly string[]): number {
  return cells.reduce((sum, cell) => sum + (cell.includes('\n') || cell.includes('\r') ? breaks(cell) : 0), 0);
}

function breaks(cell: string): number {
  return cell.split(/\r\n|\n|\r/).length - 1;
}

/** The separator that finds most of the headers looked for, and among equals the one that cuts most. */
function separatorOf(text: string, isKnown: (header: string) => boolean): string {
  const firstLine = /^\s*(.*)/.exec(text)?.[1] ?? '';
  const candidates = separators.map((separator) => {
    const headers = firstLine.split(separator).map((header) => header.trim().replaceAll(/^"|"$/g, ''));
    return { separator, known: headers.filter(isKnown).length, cut: headers.length };
  });
  const [best] = candidates.toSorted((left, right) => right.known - left.known || right.cut - left.cut);
  return best?.separator ?? ',';
}
