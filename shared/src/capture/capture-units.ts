/** What a column holds. */
export type ColumnKind = 'time' | 'index' | 'voltage' | 'temperature' | 'current' | 'other';

/** A unit and how its figures become seconds, volts, amperes or degrees Celsius: (value × factor / divisor) + offset. */
export interface CaptureUnit {
  readonly symbol: string;
  readonly kind: ColumnKind;
  readonly factor: number;
  /** Divided by rather than multiplied with 0.001, so that decimals stay the nearest doubles. */
  readonly divisor: number;
  readonly offset: number;
}

const unit = (symbol: string, kind: ColumnKind, factor = 1, divisor = 1, offset = 0): CaptureUnit => ({
  symbol,
  kind,
  factor,
  divisor,
  offset,
});

const units = new Map<string, CaptureUnit>([
  ...['s', 'sec', 'secs', 'second', 'seconds'].map((name) => [name, unit('s', 'time')] as const),
  ...['ms', 'msec', 'millisecond', 'milliseconds'].map((name) => [name, unit('ms', 'time', 1, 1e3)] as const),
  ...['us', 'µs', 'μs', 'usec', 'microsecond', 'microseconds'].map(
    (name) => [name, unit('µs', 'time', 1, 1e6)] as const,
  ),
  ...['ns', 'nsec', 'nanosecond', 'nanoseconds'].map((name) => [name, unit('ns', 'time', 1, 1e9)] as const),
  ...['min', 'mins', 'minute', 'minutes'].map((name) => [name, unit('min', 'time', 60)] as const),
  ...['h', 'hr', 'hour', 'hours'].map((name) => [name, unit('h', 'time', 3600)] as const),
  ...['v', 'volt', 'volts'].map((name) => [name, unit('V', 'voltage')] as const),
  ...['mv', 'millivolt', 'millivolts'].map((name) => [name, unit('mV', 'voltage', 1, 1e3)] as const),
  ...['uv', 'µv', 'μv', 'microvolt', 'microvolts'].map((name) => [name, unit('µV', 'voltage', 1, 1e6)] as const),
  ...['kv'].map((name) => [name, unit('kV', 'voltage', 1e3)] as const),
  ...['a', 'amp', 'amps', 'ampere', 'amperes'].map((name) => [name, unit('A', 'current')] as const),
  ...['ma'].map((name) => [name, unit('mA', 'current', 1, 1e3)] as const),
  ...['°c', 'degc', 'deg c', 'c', '℃', 'celsius', 'ºc'].map((name) => [name, unit('°C', 'temperature')] as const),
  ...['°f', 'degf', 'deg f', 'f', '℉', 'fahrenheit', 'ºf'].map(
    (name) => [name, unit('°F', 'temperature', 5, 9, -160 / 9)] as const,
  ),
  ...['k', 'kelvin'].map((name) => [name, unit('K', 'temperature', 1, 1, -273.15)] as const),
]);

/**
 * The unit that a word means.
 *
 * @param word for example "ms", "µV" or "degC", in any case, with or without brackets
 * @returns the unit, or undefined
 */
export function findUnit(word: string): CaptureUnit | undefined {
  const bare = word
    .trim()
    .replace(/^[([{]\s*|\s*[)\]}]$/g, '')
    .trim();
  // The one pair that case tells apart in this list: milli and mega are not mixed up, since mega is not offered.
  return units.get(bare.toLowerCase());
}

/**
 * A unit at the end of a column's name.
 *
 * @param name for example "Time (ms)", "CH1 [V]", "t/s" or "Temp in °C"
 * @returns the unit and the name without it
 */
export function splitUnit(name: string): { readonly name: string; readonly unit: CaptureUnit | undefined } {
  const patterns = [
    /^(.*?)\s*[([{]\s*([^)\]}]+?)\s*[)\]}]\s*$/,
    /^(.+?)\s*\/\s*([^/]+)$/,
    /^(.+?)\s+in\s+(\S+)$/i,
    /^(.+?)_(\w+)$/,
  ];
  for (const pattern of patterns) {
    const [, rest, word] = pattern.exec(name) ?? [];
    const found = word === undefined ? undefined : findUnit(word);
    if (found !== undefined) return { name: (rest ?? '').trim(), unit: found };
  }
  return { name: name.trim(), unit: undefined };
}

/**
 * What a column's name says about its kind.
 *
 * @param name without unit
 * @returns the kind, or undefined
 */
export function kindOfName(name: string): ColumnKind | undefined {
  const lower = name.toLowerCase();
  if (/^(#|n|no\.?|nr\.?|x)$|index|sequence|^samples?$|sample (no|number|#)|^points?$|record/.test(lower))
    return 'index';
  if (/^t$|time|elapsed|second|date|timestamp/.test(lower)) return 'time';
  if (/temp|°c|thermo|celsius|junction|ambient/.test(lower)) return 'temperature';
  if (/volt|^v$|ch(annel)?\s*\d/.test(lower)) return 'voltage';
  if (/current|amp/.test(lower)) return 'current';
  return undefined;
}
