import type { CaptureUnit, ColumnKind } from './capture-units.js';

export type Delimiter = ',' | ';' | '\t' | '|' | ' ';

export interface LayoutColumn {
  /** Position in the row, from 0. */
  readonly index: number;
  readonly name: string;
  readonly kind: ColumnKind;
  readonly unit: CaptureUnit | undefined;
}

/** Where the instant of each row comes from. */
export type TimeSource =
  | { readonly from: 'column'; readonly column: LayoutColumn }
  | { readonly from: 'interval'; readonly startSeconds: number; readonly intervalSeconds: number };

/** Things that were taken for granted and belong beside the result. */
export type LayoutNote = 'time_in_seconds_assumed' | 'volts_assumed' | 'interval_from_header' | 'interval_given';

export interface CaptureLayout {
  readonly delimiter: Delimiter;
  readonly decimalMark: '.' | ',';
  /** Byte that ends a row: 10, or 13 in files of old. */
  readonly newline: 10 | 13;
  /** Lines before the first row of data. */
  readonly preambleLines: number;
  /** Byte at which that row begins. */
  readonly bodyOffset: number;
  readonly time: TimeSource;
  /** Every column of numbers but the time, in order. */
  readonly channels: readonly LayoutColumn[];
  readonly notes: readonly LayoutNote[];
}

/** What the person who brings the file may say about it. */
export interface LayoutHints {
  /** Seconds between samples, where the file does not say or its time column is too coarse. */
  readonly sampleIntervalSeconds?: number | undefined;
  /** Columns to read, by position from 0; otherwise all. */
  readonly channels?: readonly number[] | undefined;
}
