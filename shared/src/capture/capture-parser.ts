import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { CaptureLayout, LayoutHints } from './capture-layout.js';
import { detectLayout } from './detect-layout.js';
import { type RowCounts, RowReader, type RowSink } from './row-reader.js';
import { createUnicodeFilter, encodeUtf8 } from './text-bytes.js';

export interface ParsedCapture {
  readonly layout: CaptureLayout;
  readonly counts: RowCounts;
}

export interface CaptureParserOptions {
  readonly hints?: LayoutHints | undefined;
  /** Called once, before the first rows. */
  readonly onLayout?: ((layout: CaptureLayout) => void) | undefined;
  readonly onRows: RowSink;
}

/** Bytes looked at before the layout is settled. */
const headBytes = 65_536;
const longestLine = 1_048_576;

/** Seconds. */
const halfDay = 43_200;

/** Takes a capture in pieces of any size and hands rows on in blocks; what it holds does not grow with the file. */
export class CaptureParser {
  private readonly toUtf8 = createUnicodeFilter();
  private rest: Uint8Array = new Uint8Array(0);
  private reader: RowReader | undefined;
  private layout: CaptureLayout | undefined;
  private finished = false;
  private lastTime = Number.NEGATIVE_INFINITY;
  private rows = 0;
  private dayOffset = 0;

  /** @param options what is known of the layout, and who takes the rows */
  constructor(private readonly options: CaptureParserOptions) {}

  /**
   * Takes the next piece of the file, wherever it is cut.
   *
   * @param chunk bytes, or text
   * @throws ArithmeticError those of `detectLayout`, `capture_line_too_long`, `capture_time_not_increasing`,
   * `capture_finished`
   */
  push(chunk: Uint8Array | string): void {
    if (this.finished) throw new ArithmeticError('capture_finished');
    const bytes = this.toUtf8(typeof chunk === 'string' ? encodeUtf8(chunk) : chunk);
    const whole = this.rest.length === 0 ? bytes : joinBytes(this.rest, bytes);
    if (this.reader === undefined && whole.length < headBytes) {
      this.rest = whole === bytes ? bytes.slice() : whole;
      return;
    }
    this.readLines(whole, false);
  }

  /**
   * Reads what is left and closes the capture.
   *
   * @returns layout and counts
   * @throws ArithmeticError as {@link push}, `capture_no_samples`
   */
  finish(): ParsedCapture {
    if (this.finished) throw new ArithmeticError('capture_finished');
    this.finished = true;
    this.readLines(this.rest, true);
    this.reader?.flush();
    if (this.layout === undefined || this.reader === undefined || this.reader.counts.rows === 0) {
      throw new ArithmeticError('capture_no_samples');
    }
    return { layout: this.layout, counts: this.reader.counts };
  }

  private readLines(bytes: Uint8Array, complete: boolean): void {
    const from = this.reader === undefined ? this.begin(bytes, complete) : 0;
    const { reader, layout } = this;
    if (reader === undefined || layout === undefined) return;
    const last = bytes.lastIndexOf(layout.newline);
    const to = complete ? bytes.length : Math.max(from, last + 1);
    reader.read(bytes, from, to);
    this.rest = bytes.slice(to);
    if (this.rest.length > longestLine) {
      throw new ArithmeticError('capture_line_too_long', { line: layout.preambleLines + reader.counts.rows + 1 });
    }
  }

  private begin(bytes: Uint8Array, complete: boolean): number {
    const layout = detectLayout(complete ? bytes : bytes.subarray(0, headBytes), complete, this.options.hints);
    this.layout = layout;
    this.options.onLayout?.(layout);
    this.reader = new RowReader(layout, (columns, count) => {
      this.checkTime(columns[0], count);
      this.options.onRows(columns, count);
    });
    return layout.bodyOffset;
  }

  private checkTime(time: Float64Array | undefined, count: number): void {
    if (time === undefined) return;
    let last = this.lastTime;
    for (let index = 0; index < count; index += 1) {
      let now = (time[index] ?? Number.NaN) + this.dayOffset;
      // A log that tells the time of day runs past midnight.
      if (now < last - halfDay) {
        this.dayOffset += 2 * halfDay;
        now += 2 * halfDay;
      }
      time[index] = now;
      if (!(now > last)) throw new ArithmeticError('capture_time_not_increasing', { row: this.rows + index + 1 });
      last = now;
    }
    this.lastTime = last;
    this.rows += count;
  }
}

function joinBytes(left: Uint8Array, right: Uint8Array): Uint8Array {
  const joined = new Uint8Array(left.length + right.length);
  joined.set(left);
  joined.set(right, left.length);
  return joined;
}
