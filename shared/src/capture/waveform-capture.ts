import type { CaptureLayout, LayoutHints } from './capture-layout.js';
import { CaptureParser } from './capture-parser.js';
import type { Polarity } from './channel-measures.js';
import { type Trace, TraceDecimator } from './decimate.js';
import type { RowCounts } from './row-reader.js';
import { WaveformAnalyser, type WaveformMeasures } from './waveform.js';

export interface WaveformCaptureOptions {
  /** Where the file needs help: sample interval, which columns (the first two are measured). */
  readonly hints?: LayoutHints | undefined;
  readonly polarity?: Polarity | undefined;
  /** Half the hysteresis band as a share of the amplitude; 0.1 unless told otherwise. */
  readonly hysteresis?: number | undefined;
  /** Stretches of the drawn trace; it has up to twice as many points per channel. */
  readonly traceStretches?: number | undefined;
}

export interface WaveformCaptureReport {
  readonly layout: CaptureLayout;
  readonly counts: RowCounts;
  readonly measures: WaveformMeasures;
  /** One per measured channel, of the whole capture. */
  readonly traces: readonly Trace[];
  /** The first samples one by one, to show single edges: up to the number of `closeUpSamples`. */
  readonly closeUps: readonly Trace[];
}

/** Samples of the close-up: a few periods of a well-sampled capture. */
export const closeUpSamples = 2000;

/** Reads an oscilloscope export in pieces and measures it in one pass; what it holds does not grow with the file. */
export class WaveformCapture {
  private readonly parser: CaptureParser;
  private analyser: WaveformAnalyser | undefined;
  private decimators: readonly TraceDecimator[] = [];
  private closeUpTimes: readonly number[] = [];
  private closeUpValues: readonly (readonly number[])[] = [];

  /** @param options hints, polarity, hysteresis, size of the trace */
  constructor(private readonly options: WaveformCaptureOptions = {}) {
    this.parser = new CaptureParser({
      hints: options.hints,
      onLayout: (layout) => this.begin(layout),
      onRows: (columns, count) => this.take(columns, count),
    });
  }

  /**
   * Takes the next piece of the file.
   *
   * @param chunk bytes or text, cut anywhere
   * @throws ArithmeticError as `CaptureParser.push`
   */
  push(chunk: Uint8Array | string): void {
    this.parser.push(chunk);
  }

  /**
   * Closes the capture.
   *
   * @returns layout, measures and traces
   * @throws ArithmeticError as `CaptureParser.finish`
   */
  finish(): WaveformCaptureReport {
    const { layout, counts } = this.parser.finish();
    const analyser = this.analyser ?? new WaveformAnalyser({ channels: 1 });
    return {
      layout,
      counts,
      measures: analyser.finish(),
      traces: this.decimators.map((decimator) => decimator.trace()),
      closeUps: this.closeUpValues.map((values) => ({ times: this.closeUpTimes, values })),
    };
  }

  private begin(layout: CaptureLayout): void {
    const channels = layout.channels.length > 1 ? 2 : 1;
    const { polarity, hysteresis, traceStretches } = this.options;
    this.analyser = new WaveformAnalyser({ channels, polarity, hysteresis });
    this.decimators = Array.from({ length: channels }, () => new TraceDecimator(traceStretches));
    this.closeUpValues = this.decimators.map(() => []);
  }

  private take(columns: readonly Float64Array[], count: number): void {
    const [times] = columns;
    if (times === undefined) return;
    const measured = columns.slice(0, this.decimators.length + 1);
    this.analyser?.push(measured, count);
    this.decimators.forEach((decimator, index) => {
      const values = columns[index + 1];
      if (values !== undefined) decimator.push(times, values, count);
    });
    this.takeCloseUp(times, measured, count);
  }

  private takeCloseUp(times: Float64Array, columns: readonly Float64Array[], count: number): void {
    const wanted = Math.min(count, closeUpSamples - this.closeUpTimes.length);
    if (wanted <= 0) return;
    this.closeUpTimes = [...this.closeUpTimes, ...times.subarray(0, wanted)];
    this.closeUpValues = this.closeUpValues.map((values, index) => [
      ...values,
      ...(columns[index + 1] ?? new Float64Array(0)).subarray(0, wanted),
    ]);
  }
}
