import type { Delimiter } from './capture-layout.js';
import { type CellKind, kindOfCell, splitCells } from './cells.js';

/** How the lines of a file fall into columns. */
export interface TableShape {
  readonly delimiter: Delimiter;
  readonly decimalMark: '.' | ',';
  /** Positions of the columns of numbers (or instants), from 0. */
  readonly columns: readonly number[];
  /** Index of the first line of data. */
  readonly firstRow: number;
}

interface Candidate extends Omit<TableShape, 'firstRow'> {
  readonly score: number;
}

const delimiters: readonly Delimiter[] = [';', '\t', ',', '|', ' '];
const marks = ['.', ','] as const;

/** Lines looked at for the columns: from the end of the head, where the preamble is behind us. */
const tailLines = 60;

const isFigure = (kind: CellKind): boolean => kind === 'number' || kind === 'instant';

function tryCandidate(
  tail: readonly string[],
  judged: number,
  delimiter: Delimiter,
  decimalMark: '.' | ',',
): Candidate {
  const kinds = tail.map((line) => splitCells(line, delimiter).map((cell) => kindOfCell(cell, decimalMark)));
  const rows = kinds.slice(-judged);
  const width = rows.reduce((most, row) => Math.max(most, row.length), 0);
  const columns = Array.from({ length: width }, (_, column) => column).filter((column) => {
    const figures = rows.filter((row) => isFigure(row[column] ?? 'gap')).length;
    const texts = rows.filter((row) => row[column] === 'text').length;
    return figures >= 0.5 * rows.length && texts <= 0.4 * rows.length;
  });
  const full = kinds.filter((row) => columns.every((column) => isFigure(row[column] ?? 'gap'))).length;
  const texts = kinds.reduce((sum, row) => sum + row.filter((kind) => kind === 'text').length, 0);
  return { delimiter, decimalMark, columns, score: columns.length * full - texts };
}

/** A row of data has figures or gaps in its columns, and at least one figure. */
function isRow(line: string, { delimiter, decimalMark, columns }: Omit<TableShape, 'firstRow'>): boolean {
  const cells = splitCells(line, delimiter);
  const kinds = columns.map((column) => (column < cells.length ? kindOfCell(cells[column] ?? '', decimalMark) : 'gap'));
  return kinds.every((kind) => kind !== 'text') && kinds.some(isFigure) && isFigure(kinds[0] ?? 'gap');
}

/** The first line from which five in a row (or all that are left) are data. */
function findFirstRow(lines: readonly string[], shape: Omit<TableShape, 'firstRow'>): number | undefined {
  const checked = lines.map((line) => ({ blank: line.trim() === '', row: isRow(line, shape) }));
  const first = checked.findIndex(({ row }, index) => {
    if (!row) return false;
    return checked
      .slice(index)
      .filter(({ blank }) => !blank)
      .slice(0, 5)
      .every((each) => each.row);
  });
  return first < 0 ? undefined : first;
}

/**
 * Finds delimiter, decimal mark, columns of numbers and first row of data.
 *
 * Each pair of delimiter and decimal mark is tried on the last lines of the head; the one that makes the most numbers
 * and the fewest leftovers wins, so a decimal comma is not taken for a delimiter where the other reading fits better.
 *
 * @param lines the first lines of the file, without their ends
 * @returns the shape, or undefined where no columns of numbers are found
 */
export function detectTable(lines: readonly string[]): TableShape | undefined {
  const tail = lines.filter((line) => line.trim() !== '').slice(-tailLines);
  // The columns are those of the second half: the preamble of a short file must not outvote its few rows.
  const judged = Math.ceil(tail.length / 2);
  const candidates = delimiters.flatMap((delimiter) =>
    marks
      .filter((mark) => mark !== delimiter)
      .map((mark) => tryCandidate(tail, judged, delimiter, mark))
      .filter((candidate) => candidate.columns.length > 0),
  );
  const best = candidates.reduce<Candidate | undefined>(
    (winner, candidate) => (winner === undefined || candidate.score > winner.score ? candidate : winner),
    undefined,
  );
  if (best === undefined) return undefined;
  const firstRow = findFirstRow(lines, best);
  if (firstRow === undefined) return undefined;
  const { delimiter, decimalMark, columns } = best;
  return { delimiter, decimalMark, columns, firstRow };
}
