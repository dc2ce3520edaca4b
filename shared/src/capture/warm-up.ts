import { ArithmeticError } from '../errors/arithmetic-error.js';
import { fitExponential } from './exponential-fit.js';
import { type Measure, type Measured, refuse } from './measure.js';
import { at, crossingInstant, firstReach, requireSeries, type Series } from './series.js';

export interface WarmUpOptions {
  /** Working temperature (°C) that the tool is set to. */
  readonly target: number;
  /** Half the width of the band about the settled level (K). */
  readonly band: number;
  /** Last part of the record that counts as settled, as a share of its length; 0.25 unless told otherwise. */
  readonly settledShare?: number | undefined;
}

export interface WarmUpMeasures {
  /** From the first reading to the target (s). */
  readonly timeToTarget: Measure;
  /** From 10 to 90 percent of the way to the target (s). */
  readonly riseTime: Measure;
  /** Highest temperature (°C), and how far it lies above the target (K). */
  readonly peak: Measure;
  readonly overshoot: Measure;
  /** Overshoot as a share of the step from the start to the target. */
  readonly overshootShare: Measure;
  /** From the first reading to the last instant outside the band about the target (s). */
  readonly settlingTime: Measure;
  /** Mean (°C), and peak-to-peak and effective ripple (K), of the settled part. */
  readonly settled: Measure;
  readonly ripple: Measure;
  readonly rippleEffective: Measure;
  /** Of the exponential through the rise (s). */
  readonly timeConstant: Measure;
}

const single = (value: number, uncertainty: number): Measured => ({
  measured: true,
  value,
  least: value,
  greatest: value,
  count: 1,
  uncertainty,
});

/** A fit that explains less than this is no exponential. Common practice, no source. */
const leastExplained = 0.98;

const part = ({ times, values }: Series, from: number, to: number): Series => ({
  times: Array.from({ length: to - from }, (_, index) => at(times, from + index)),
  values: Array.from({ length: to - from }, (_, index) => at(values, from + index)),
});

function indexOfExtreme(values: ArrayLike<number>, sign: 1 | -1): number {
  let best = 0;
  for (let index = 1; index < values.length; index += 1) {
    if (sign * at(values, index) > sign * at(values, best)) best = index;
  }
  return best;
}

/** The last instant outside the band; the straight line between the last reading outside and the next decides. */
function settlingInstant(series: Series, centre: number, band: number): number | undefined {
  const { times, values } = series;
  for (let index = times.length - 1; index >= 0; index -= 1) {
    const away = at(values, index) - centre;
    if (Math.abs(away) <= band) continue;
    if (index === times.length - 1) return undefined;
    return crossingInstant(series, index + 1, centre + Math.sign(away) * band);
  }
  return at(times, 0);
}

function settledFigures(series: Series, share: number): Pick<WarmUpMeasures, 'settled' | 'ripple' | 'rippleEffective'> {
  const { times, values } = series;
  const end = at(times, times.length - 1);
  const begin = end - share * (end - at(times, 0));
  const kept = Array.from({ length: times.length }, (_, index) => index).filter((index) => at(times, index) >= begin);
  const tail = kept.map((index) => at(values, index));
  const mean = tail.reduce((sum, value) => sum + value / tail.length, 0);
  const squares = tail.reduce((sum, value) => sum + (value - mean) ** 2 / tail.length, 0);
  const least = Math.min(...tail);
  const greatest = Math.max(...tail);
  return {
    settled: { measured: true, value: mean, least, greatest, count: tail.length, uncertainty: 0 },
    ripple: { ...single(greatest - least, 0), count: tail.length },
    rippleEffective: { ...single(Math.sqrt(squares), 0), count: tail.length },
  };
}

function riseFigures(
  series: Series,
  target: number,
  interval: number,
): Pick<WarmUpMeasures, 'riseTime' | 'timeConstant'> {
  const start = at(series.values, 0);
  const low = firstReach(series, start + 0.1 * (target - start));
  const high = firstReach(series, start + 0.9 * (target - start));
  const rise = low === undefined || high === undefined ? refuse('target_not_reached') : single(high - low, interval);
  // Past the first peak the controller, not the tool, shapes the curve.
  const peak = indexOfExtreme(series.values, target >= start ? 1 : -1);
  const rising = part(series, 0, peak + 1);
  const fit = rising.times.length < 4 ? undefined : fitExponential(rising);
  const constant =
    fit === undefined || fit.explained < leastExplained ? refuse('poor_fit') : single(fit.timeConstant, interval);
  return { riseTime: rise, timeConstant: constant };
}

function checkOptions({ target, band, settledShare = 0.25 }: WarmUpOptions): void {
  const refuseRange = (name: string, value: number, low: number, high: number): void => {
    if (!(value >= low && value <= high)) {
      throw new ArithmeticError('capture_out_of_range', { name, low, high, value: String(value) });
    }
  };
  refuseRange('target', target, -273.15, 5000);
  refuseRange('band', band, 0, 5000);
  refuseRange('settled share', settledShare, 0, 1);
}

/**
 * What a temperature log of a tool warming up shows.
 *
 * @param series times (s) and temperatures (°C), gaps taken out, at least two readings
 * @param options target (°C), band (K), settled share
 * @returns the measures, each with its value or why it is refused; times are from the first reading, overshoot and
 * settling are about the target
 * @throws ArithmeticError `capture_no_samples`, `capture_lengths_differ`, `capture_not_ordered`, `capture_out_of_range`
 * @source step-response terms of IEC 60050-351 (control technology), straight lines between readings
 */
export function measureWarmUp(series: Series, options: WarmUpOptions): WarmUpMeasures {
  requireSeries(series, 2);
  checkOptions(options);
  const { times, values } = series;
  const { target, band } = options;
  const begin = at(times, 0);
  const interval = (at(times, times.length - 1) - begin) / (times.length - 1);
  const start = at(values, 0);
  if (Math.abs(target - start) <= band) return refusedWarmUp(settledFigures(series, options.settledShare ?? 0.25));
  const reached = firstReach(series, target);
  const peak = at(values, indexOfExtreme(values, target >= start ? 1 : -1));
  const over = Math.max(0, Math.sign(target - start) * (peak - target));
  const settling = settlingInstant(series, target, band);
  return {
    timeToTarget: reached === undefined ? refuse('target_not_reached') : single(reached - begin, interval),
    peak: single(peak, 0),
    overshoot: single(over, 0),
    overshootShare: single(over / Math.abs(target - start), 0),
    settlingTime: settling === undefined ? refuse('not_settled') : single(settling - begin, interval),
    ...settledFigures(series, options.settledShare ?? 0.25),
    ...riseFigures(series, target, interval),
  };
}

/** A record that begins at its target shows no warming up. */
function refusedWarmUp(settled: Pick<WarmUpMeasures, 'settled' | 'ripple' | 'rippleEffective'>): WarmUpMeasures {
  const refused = refuse('no_step');
  return {
    timeToTarget: refused,
    riseTime: refused,
    peak: refused,
    overshoot: refused,
    overshootShare: refused,
    settlingTime: refused,
    timeConstant: refused,
    ...settled,
  };
}

/**
 * Time constant of a tool cooling down after its highest temperature.
 *
 * @param series times (s) and temperatures (°C)
 * @returns the time constant (s), or why it is refused
 * @throws ArithmeticError `capture_no_samples`, `capture_lengths_differ`, `capture_not_ordered`
 * @source exponential through the readings from the last one within 1 K of the highest
 */
export function coolingTimeConstant(series: Series): Measure {
  requireSeries(series, 2);
  const { times, values } = series;
  const peak = at(values, indexOfExtreme(values, 1));
  let from = values.length - 1;
  while (from > 0 && at(values, from) < peak - 1) from -= 1;
  const falling = part(series, from, times.length);
  const fall = peak - at(values, values.length - 1);
  if (falling.times.length < 8 || fall < 5) return refuse('no_cooling');
  const fit = fitExponential(falling);
  if (fit === undefined || fit.explained < leastExplained) return refuse('poor_fit');
  const interval = (at(times, times.length - 1) - at(times, from)) / (falling.times.length - 1);
  return single(fit.timeConstant, interval);
}
