import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { CaptureLayout, LayoutColumn, LayoutHints } from './capture-layout.js';
import { CaptureParser } from './capture-parser.js';
import type { RowCounts } from './row-reader.js';
import { typeKCelsius } from './type-k.js';

export interface TemperatureCaptureOptions {
  readonly hints?: LayoutHints | undefined;
  /** Temperature of the cold junction (°C), where the log holds voltages and no column of its own for it. */
  readonly coldJunctionCelsius?: number | undefined;
}

export interface TemperatureLog {
  readonly layout: CaptureLayout;
  readonly counts: RowCounts;
  /** Seconds from the first reading. */
  readonly times: Float64Array;
  /** Degrees Celsius, gaps left out. */
  readonly values: Float64Array;
  /** The column that was read, and whether its voltages were turned into temperatures. */
  readonly column: LayoutColumn;
  readonly fromThermocouple: boolean;
}

/** A day at ten readings a second; a longer log is a mistake. */
export const mostReadings = 1_000_000;

const coldJunctionName = /cold|junction|ambient|\bcj\b/i;

interface Chosen {
  readonly hot: number;
  readonly cold: number | undefined;
  readonly column: LayoutColumn;
  readonly voltages: boolean;
}

/** The first column of temperatures that is not the cold junction's; without one, the first of voltages. */
function chooseColumn({ channels }: CaptureLayout): Chosen {
  const cold = channels.findIndex((column) => coldJunctionName.test(column.name));
  const others = channels.map((column, index) => ({ column, index })).filter(({ index }) => index !== cold);
  const found =
    others.find(({ column }) => column.kind === 'temperature' && column.unit?.kind !== 'voltage') ??
    others.find(({ column }) => column.unit?.kind === 'voltage') ??
    others[0];
  if (found === undefined) throw new ArithmeticError('capture_no_channel');
  return {
    hot: found.index + 1,
    cold: cold < 0 ? undefined : cold + 1,
    column: found.column,
    voltages: found.column.unit?.kind === 'voltage',
  };
}

/** Reads a temperature log in pieces: degrees as they are, type K voltages with their cold junction. */
export class TemperatureCapture {
  private readonly parser: CaptureParser;
  private chosen: Chosen | undefined;
  private readonly times: number[] = [];
  private readonly values: number[] = [];

  /** @param options hints and cold junction */
  constructor(private readonly options: TemperatureCaptureOptions = {}) {
    this.parser = new CaptureParser({
      hints: options.hints,
      onLayout: (layout) => {
        this.chosen = chooseColumn(layout);
      },
      onRows: (columns, count) => this.take(columns, count),
    });
  }

  /**
   * Takes the next piece of the file.
   *
   * @param chunk bytes or text, cut anywhere
   * @throws ArithmeticError as `CaptureParser.push`, `capture_too_many_readings`, `capture_no_cold_junction`,
   * `capture_thermocouple_range`
   */
  push(chunk: Uint8Array | string): void {
    this.parser.push(chunk);
  }

  /**
   * Closes the log.
   *
   * @returns times (s from the first reading) and temperatures (°C)
   * @throws ArithmeticError as {@link push}, `capture_no_samples`
   */
  finish(): TemperatureLog {
    const { layout, counts } = this.parser.finish();
    const { chosen } = this;
    if (chosen === undefined || this.times.length === 0) throw new ArithmeticError('capture_no_samples');
    const begin = this.times[0] ?? 0;
    return {
      layout,
      counts,
      times: Float64Array.from(this.times, (time) => time - begin),
      values: Float64Array.from(this.values),
      column: chosen.column,
      fromThermocouple: chosen.voltages,
    };
  }

  private take(columns: readonly Float64Array[], count: number): void {
    const { chosen } = this;
    const [times] = columns;
    if (chosen === undefined || times === undefined) return;
    const hot = columns[chosen.hot];
    const cold = chosen.cold === undefined ? undefined : columns[chosen.cold];
    for (let index = 0; index < count; index += 1) {
      const value = this.toCelsius(hot?.[index] ?? Number.NaN, cold?.[index], chosen.voltages);
      if (!Number.isFinite(value)) continue;
      this.times.push(times[index] ?? Number.NaN);
      this.values.push(value);
    }
    if (this.values.length > mostReadings) {
      throw new ArithmeticError('capture_too_many_readings', { most: mostReadings });
    }
  }

  /** Voltages arrive in volts, whatever the file had. */
  private toCelsius(value: number, cold: number | undefined, voltages: boolean): number {
    if (!voltages || !Number.isFinite(value)) return value;
    const junction = cold ?? this.options.coldJunctionCelsius;
    if (junction === undefined) throw new ArithmeticError('capture_no_cold_junction');
    return Number.isFinite(junction) ? typeKCelsius(value * 1e3, junction) : Number.NaN;
  }
}
