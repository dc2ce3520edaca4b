import type { CaptureLayout, LayoutColumn } from './capture-layout.js';
import { readOddCell } from './cells.js';
import { decodeText } from './text-bytes.js';

/**
 * Takes a block of rows: one array per column, time (s) first; only the first `count` entries are of this block, and the
 * arrays are used again for the next one.
 */
export type RowSink = (columns: readonly Float64Array[], count: number) => void;

/** Powers of ten that a double holds exactly. */
const powersOfTen = Float64Array.from({ length: 23 }, (_, power) => Number(`1e${power}`));

/** Above this a further digit could be lost in a double. */
const lastExactMantissa = 900_719_925_474_098;

const blank = 32;
const tab = 9;
const quote = 34;
const carriageReturn = 13;

export interface RowCounts {
  /** Rows of data handed on. */
  readonly rows: number;
  /** Lines after the first row of data that hold no figures (remarks, footers). */
  readonly unreadable: number;
  /** Cells that should hold a figure and do not. */
  readonly gaps: number;
}

const isPlain = (column: LayoutColumn): boolean =>
  column.unit === undefined || (column.unit.factor === 1 && column.unit.divisor === 1 && column.unit.offset === 0);

/**
 * Reads rows of numbers straight from bytes.
 *
 * A figure of up to 15 digits with a power of ten from −22 to 22 is exact as whole number and power, so their one product
 * or quotient is the nearest double (W. Clinger, "How to read floating point numbers accurately", 1990); any other cell
 * takes the slow way through text. Only the columns asked for are read.
 */
export class RowReader {
  private readonly blocks: readonly Float64Array[];
  private readonly slots: Int16Array;
  private readonly columns: readonly (LayoutColumn | undefined)[];
  private readonly delimiter: number;
  private readonly mark: number;
  private filled = 0;
  private handedOn = 0;
  private unreadable = 0;
  private gaps = 0;
  /** Where the cell just read ended. */
  private cursor = 0;

  constructor(
    private readonly layout: CaptureLayout,
    private readonly sink: RowSink,
    private readonly blockRows = 8192,
  ) {
    const timeColumn = layout.time.from === 'column' ? layout.time.column : undefined;
    this.columns = [timeColumn, ...layout.channels];
    this.blocks = this.columns.map(() => new Float64Array(blockRows));
    const last = this.columns.reduce((most, column) => Math.max(most, column?.index ?? 0), 0);
    this.slots = new Int16Array(last + 1).fill(-1);
    this.columns.forEach((column, slot) => {
      if (column !== undefined) this.slots[column.index] = slot;
    });
    this.delimiter = layout.delimiter.charCodeAt(0);
    this.mark = layout.decimalMark.charCodeAt(0);
  }

  get counts(): RowCounts {
    return { rows: this.handedOn + this.filled, unreadable: this.unreadable, gaps: this.gaps };
  }

  /**
   * Reads whole lines.
   *
   * @param bytes that hold them
   * @param from first byte of a line
   * @param to one past the last line's end
   */
  read(bytes: Uint8Array, from: number, to: number): void {
    const { newline } = this.layout;
    let at = from;
    while (at < to) {
      const end = this.readRow(bytes, at, to);
      const next = bytes[end] === newline ? end : bytes.indexOf(newline, end);
      at = next < 0 || next >= to ? to : next + 1;
    }
  }

  /** Hands the rest on. */
  flush(): void {
    if (this.filled > 0) this.sink(this.blocks, this.filled);
    this.handedOn += this.filled;
    this.filled = 0;
  }

  /** Reads the wanted cells of one row and returns where it stopped, which is at or before the row's end. */
  private readRow(bytes: Uint8Array, from: number, to: number): number {
    const { slots, blocks, delimiter, filled } = this;
    const { newline } = this.layout;
    let at = from;
    let figures = 0;
    let asked = 0;
    for (let column = 0; column < slots.length; column += 1) {
      const slot = slots[column] ?? -1;
      if (slot < 0) {
        at = this.skipCell(bytes, at, to);
      } else {
        const value = this.readCell(bytes, at, to, slot);
        at = this.cursor;
        asked += 1;
        const block = blocks[slot];
        if (block !== undefined) block[filled] = value;
        // NaN is the only value that differs from itself.
        if (value === value) figures += 1;
      }
      if (bytes[at] !== delimiter || at >= to) {
        if (column < slots.length - 1) asked += this.missingAfter(column);
        break;
      }
      at += 1;
    }
    this.closeRow(bytes, from, at >= to ? to : at, newline, figures, asked);
    return at;
  }

  /** Cells that a short row does not have are gaps. */
  private missingAfter(column: number): number {
    let missing = 0;
    for (let next = column + 1; next < this.slots.length; next += 1) {
      const slot = this.slots[next] ?? -1;
      if (slot < 0) continue;
      const block = this.blocks[slot];
      if (block !== undefined) block[this.filled] = Number.NaN;
      missing += 1;
    }
    return missing;
  }

  private closeRow(bytes: Uint8Array, from: number, to: number, newline: number, figures: number, asked: number): void {
    const [time] = this.blocks;
    const { time: source } = this.layout;
    const timed = source.from === 'interval' || !Number.isNaN(time?.[this.filled] ?? Number.NaN);
    if (figures === 0 || !timed) {
      const first = bytes[from];
      const empty = to === from || first === newline || (first === carriageReturn && to <= from + 1);
      if (!empty) this.unreadable += 1;
      return;
    }
    this.gaps += asked - figures;
    if (source.from === 'interval' && time !== undefined) {
      time[this.filled] = source.startSeconds + (this.handedOn + this.filled) * source.intervalSeconds;
    }
    this.filled += 1;
    if (this.filled === this.blockRows) this.flush();
  }

  /** The end of the cell at a position: its delimiter, the row's end, or the end of the bytes. */
  private skipCell(bytes: Uint8Array, from: number, to: number): number {
    const { delimiter } = this;
    const { newline } = this.layout;
    let at = from;
    let quoted = false;
    if (delimiter === blank) while (at < to && bytes[at] === blank) at += 1;
    for (; at < to; at += 1) {
      const code = bytes[at];
      if (code === newline) break;
      if (code === quote) quoted = !quoted;
      else if (code === delimiter && !quoted) break;
    }
    return this.settle(bytes, at, to);
  }

  /** Between cells that are parted by blanks, a run of them is one delimiter: stops at its last. */
  private settle(bytes: Uint8Array, from: number, to: number): number {
    if (this.delimiter !== blank) return from;
    let at = from;
    while (at + 1 < to && bytes[at] === blank && bytes[at + 1] === blank) at += 1;
    return at;
  }

  private isPadding(code: number): boolean {
    return code === blank || code === quote || (code === tab && this.delimiter !== tab);
  }

  /** The figure of a cell in seconds, volts or whatever its column means; NaN for a gap. Leaves the cursor at its end. */
  private readCell(bytes: Uint8Array, from: number, to: number, slot: number): number {
    const { delimiter, mark } = this;
    const { newline } = this.layout;
    let at = from;
    let code = bytes[at] ?? newline;
    while (at < to && this.isPadding(code)) {
      at += 1;
      code = bytes[at] ?? newline;
    }
    const negative = code === 45;
    if (negative || code === 43) {
      at += 1;
      code = bytes[at] ?? newline;
    }
    let mantissa = 0;
    let digits = 0;
    let power = 0;
    let digit = code - 48;
    while (digit >= 0 && digit <= 9) {
      mantissa = mantissa * 10 + digit;
      digits += 1;
      at += 1;
      code = bytes[at] ?? newline;
      digit = code - 48;
    }
    if (code === mark) {
      at += 1;
      const start = at;
      code = bytes[at] ?? newline;
      digit = code - 48;
      while (digit >= 0 && digit <= 9) {
        mantissa = mantissa * 10 + digit;
        at += 1;
        code = bytes[at] ?? newline;
        digit = code - 48;
      }
      digits += at - start;
      power = start - at;
    }
    if (code === 69 || code === 101) {
      at += 1;
      code = bytes[at] ?? newline;
      const down = code === 45;
      if (down || code === 43) {
        at += 1;
        code = bytes[at] ?? newline;
      }
      let exponent = 0;
      const start = at;
      digit = code - 48;
      while (digit >= 0 && digit <= 9) {
        exponent = exponent * 10 + digit;
        at += 1;
        code = bytes[at] ?? newline;
        digit = code - 48;
      }
      if (at === start) digits = 0;
      power += down ? -exponent : exponent;
    }
    const exact = digits > 0 && mantissa <= lastExactMantissa && power >= -22 && power <= 22;
    const ended = at >= to || code === delimiter || code === newline || code === carriageReturn;
    if (!exact || !ended) return this.readSlowly(bytes, from, to, slot);
    this.cursor = delimiter === blank ? this.settle(bytes, at, to) : at;
    const size = power < 0 ? mantissa / (powersOfTen[-power] ?? 1) : mantissa * (powersOfTen[power] ?? 1);
    return this.scale(negative ? -size : size, slot);
  }

  private readSlowly(bytes: Uint8Array, from: number, to: number, slot: number): number {
    const end = this.skipCell(bytes, from, to);
    this.cursor = end;
    const text = decodeText(bytes, from, end).replaceAll('"', '').trim();
    const { decimalMark } = this.layout;
    const plain = Number(decimalMark === ',' ? text.replace(',', '.') : text);
    const value = text === '' || Number.isNaN(plain) ? readOddCell(text, decimalMark) : plain;
    return this.scale(value ?? Number.NaN, slot);
  }

  private scale(value: number, slot: number): number {
    const column = this.columns[slot];
    if (column?.unit === undefined || isPlain(column)) return value;
    const { factor, divisor, offset } = column.unit;
    return (value * factor) / divisor + offset;
  }
}
