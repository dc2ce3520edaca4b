import type { Delimiter } from './capture-layout.js';

/**
 * Splits a line into cells.
 *
 * @param line without its end
 * @param delimiter between cells; a run of blanks counts as one
 * @returns cells without surrounding blanks and quotation marks
 */
export function splitCells(line: string, delimiter: Delimiter): readonly string[] {
  if (delimiter === ' ') return line.trim() === '' ? [] : line.trim().split(/\s+/).map(unquote);
  if (!line.includes('"')) return line.split(delimiter).map((cell) => cell.trim());
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (const character of line) {
    if (character === '"') quoted = !quoted;
    if (character === delimiter && !quoted) {
      cells.push(unquote(cell));
      cell = '';
    } else cell += character;
  }
  return [...cells, unquote(cell)];
}

const unquote = (cell: string): string => cell.trim().replace(/^"|"$/g, '').trim();

const gaps = new Set([
  '',
  '-',
  '--',
  '---',
  'nan',
  'n/a',
  'na',
  'null',
  '***',
  '****',
  '*****',
  'ol',
  'open',
  'error',
  '#n/a',
]);
const plusOverflow = new Set(['inf', '+inf', 'infinity', '+infinity', 'overflow', '+ol']);
const minusOverflow = new Set(['-inf', '-infinity', '-overflow', '-ol']);

/**
 * What a cell that is not a plain number says.
 *
 * @param text of the cell
 * @param decimalMark of the file
 * @returns a number (infinite for an overflow), NaN for a known sign of a gap, undefined for any other text
 */
export function readOddCell(text: string, decimalMark: '.' | ','): number | undefined {
  const lower = text.trim().toLowerCase();
  if (gaps.has(lower)) return Number.NaN;
  if (plusOverflow.has(lower)) return Number.POSITIVE_INFINITY;
  if (minusOverflow.has(lower)) return Number.NEGATIVE_INFINITY;
  const plain = decimalMark === ',' ? lower.replace(',', '.') : lower;
  const [, digits] = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)\s*[a-zµμ°ºω%]*$/.exec(plain) ?? [];
  return digits === undefined ? readInstant(text) : Number(digits);
}

const clock = /^(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,](\d+))?)?$/;
const dated = /^(?:(\d{4})-(\d{2})-(\d{2})|(\d{1,2})\.(\d{1,2})\.(\d{4}))[T ]+(.+?)Z?$/;

/**
 * Seconds of a time of day or of a date with time.
 *
 * @param text "12:03:04.5", "2026-03-01 12:03:04" or "1.3.2026 12:03:04"
 * @returns seconds since midnight, or since 1970-01-01 of the same unnamed zone; undefined for other text
 */
export function readInstant(text: string): number | undefined {
  const whole = dated.exec(text.trim());
  const [, hours, minutes, seconds = '0', fraction = ''] = clock.exec((whole?.[7] ?? text).trim()) ?? [];
  if (hours === undefined || minutes === undefined) return undefined;
  const ofDay = Number(hours) * 3600 + Number(minutes) * 60 + Number(`${seconds}.${fraction || '0'}`);
  if (whole === null) return ofDay;
  const [, year, month, day, dayFirst, monthSecond, yearLast] = whole;
  const days =
    Date.UTC(Number(year ?? yearLast), Number(month ?? monthSecond) - 1, Number(day ?? dayFirst)) / 86_400_000;
  return days * 86_400 + ofDay;
}

const numberWith = {
  '.': /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i,
  ',': /^[+-]?(\d+,?\d*|,\d+)(e[+-]?\d+)?$/i,
} as const;

export type CellKind = 'number' | 'gap' | 'instant' | 'text';

/**
 * What a cell looks like.
 *
 * @param cell without surrounding blanks
 * @param decimalMark to try
 * @returns number, gap (empty or a sign of no reading), instant (clock or date) or text
 */
export function kindOfCell(cell: string, decimalMark: '.' | ','): CellKind {
  if (numberWith[decimalMark].test(cell)) return 'number';
  const odd = readOddCell(cell, decimalMark);
  if (odd === undefined) return 'text';
  if (Number.isNaN(odd)) return 'gap';
  return readInstant(cell) === undefined ? 'number' : 'instant';
}
