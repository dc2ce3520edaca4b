import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { CaptureLayout, LayoutColumn, LayoutHints, LayoutNote, TimeSource } from './capture-layout.js';
import { readOddCell, splitCells } from './cells.js';
import { type PreambleTiming, describeColumns, readTiming } from './detect-header.js';
import { type TableShape, detectTable } from './detect-table.js';
import { decodeText } from './text-bytes.js';

interface HeadLine {
  readonly text: string;
  readonly offset: number;
}

/** Lines of the head with the byte at which each begins; the last may be cut off and is left out unless the file ends. */
function headLines(head: Uint8Array, newline: number, complete: boolean): readonly HeadLine[] {
  const lines: HeadLine[] = [];
  const start = head[0] === 0xef && head[1] === 0xbb && head[2] === 0xbf ? 3 : 0;
  for (let offset = start; offset < head.length;) {
    const end = head.indexOf(newline, offset);
    if (end < 0 && !complete) break;
    const stop = end < 0 ? head.length : end;
    const cut = stop > offset && head[stop - 1] === 13 ? stop - 1 : stop;
    lines.push({ text: decodeText(head, offset, cut), offset });
    offset = stop + 1;
  }
  return lines;
}

function valuesOf(lines: readonly string[], shape: TableShape, column: number): readonly number[] {
  return lines
    .slice(shape.firstRow)
    .filter((line) => line.trim() !== '')
    .map((line) => readOddCell(splitCells(line, shape.delimiter)[column] ?? '', shape.decimalMark) ?? Number.NaN);
}

const rises = (values: readonly number[]): boolean =>
  values.length > 1 &&
  values.every((value, index) => index === 0 || value >= (values[index - 1] ?? value)) &&
  (values.at(-1) ?? 0) > (values[0] ?? 0);

const countsByOne = (values: readonly number[]): boolean =>
  values.every((value, index) => Number.isInteger(value) && (index === 0 || value === (values[index - 1] ?? 0) + 1));

interface FoundTime {
  readonly time: TimeSource;
  /** The column that only counts or tells the time, so that it is no channel. */
  readonly used: readonly LayoutColumn[];
  readonly notes: readonly LayoutNote[];
}

function findTime(
  columns: readonly LayoutColumn[],
  timing: PreambleTiming,
  hints: LayoutHints,
  values: (column: number) => readonly number[],
): FoundTime {
  const timed = columns.filter((column) => column.kind === 'time');
  const indexed = columns.filter((column) => column.kind === 'index');
  const given = hints.sampleIntervalSeconds;
  if (given !== undefined && given > 0) {
    const time: TimeSource = { from: 'interval', startSeconds: 0, intervalSeconds: given };
    const [first] = columns;
    const plain = timed.length === 0 && indexed.length === 0 && first !== undefined && columns.length > 1;
    const counting = plain && rises(values(first.index)) ? [first] : [];
    return { time, used: [...timed, ...indexed, ...counting], notes: ['interval_given'] };
  }
  const [column] = timed;
  if (column !== undefined) {
    const notes: readonly LayoutNote[] = column.unit === undefined ? ['time_in_seconds_assumed'] : [];
    return { time: { from: 'column', column }, used: [...timed, ...indexed], notes };
  }
  const [first] = columns;
  const counter = indexed[0] ?? (first !== undefined && countsByOne(values(first.index)) ? first : undefined);
  if (timing.intervalSeconds !== undefined) {
    const { startSeconds, intervalSeconds } = timing;
    const rising =
      counter ?? (first !== undefined && columns.length > 1 && rises(values(first.index)) ? first : undefined);
    return {
      time: { from: 'interval', startSeconds, intervalSeconds },
      used: rising === undefined ? [] : [rising],
      notes: ['interval_from_header'],
    };
  }
  if (indexed.length > 0 || first === undefined || columns.length < 2 || !rises(values(first.index))) {
    throw new ArithmeticError('capture_no_time');
  }
  return { time: { from: 'column', column: first }, used: [first], notes: ['time_in_seconds_assumed'] };
}

function chooseChannels(
  columns: readonly LayoutColumn[],
  used: readonly LayoutColumn[],
  hints: LayoutHints,
): readonly LayoutColumn[] {
  const wanted = hints.channels;
  if (wanted === undefined) return columns.filter((column) => !used.includes(column));
  return wanted.map((index) => {
    const column = columns.find((each) => each.index === index);
    if (column === undefined) throw new ArithmeticError('capture_no_such_column', { column: index + 1 });
    return column;
  });
}

/**
 * Works out how a capture is laid out from its first bytes.
 *
 * Tolerates a byte-order mark, any of five delimiters, decimal comma, preambles of any length, units in the names or in a
 * row of their own, settings in columns beside the data, a counter instead of a time with the interval in the preamble.
 *
 * @param head first bytes of the file, as UTF-8
 * @param complete whether that is the whole file
 * @param hints what the person who brings it says
 * @returns the layout
 * @throws ArithmeticError `capture_empty`, `capture_binary`, `capture_no_numbers`, `capture_no_time`,
 * `capture_no_channel`, `capture_no_such_column`
 */
export function detectLayout(head: Uint8Array, complete: boolean, hints: LayoutHints = {}): CaptureLayout {
  if (head.length === 0) throw new ArithmeticError('capture_empty');
  if (head.includes(0)) throw new ArithmeticError('capture_binary');
  const newline = head.includes(10) || !head.includes(13) ? 10 : 13;
  const lines = headLines(head, newline, complete);
  const texts = lines.map((line) => line.text);
  if (texts.every((text) => text.trim() === '')) throw new ArithmeticError('capture_empty');
  const shape = detectTable(texts);
  if (shape === undefined) throw new ArithmeticError('capture_no_numbers');
  const columns = describeColumns(texts, shape);
  const found = findTime(columns, readTiming(texts, shape), hints, (column) => valuesOf(texts, shape, column));
  const channels = chooseChannels(columns, found.used, hints);
  if (channels.length === 0) throw new ArithmeticError('capture_no_channel');
  const assumed: readonly LayoutNote[] = channels.some((each) => each.unit === undefined) ? ['volts_assumed'] : [];
  return {
    delimiter: shape.delimiter,
    decimalMark: shape.decimalMark,
    newline,
    preambleLines: shape.firstRow,
    bodyOffset: lines[shape.firstRow]?.offset ?? 0,
    time: found.time,
    channels,
    notes: [...found.notes, ...assumed],
  };
}
