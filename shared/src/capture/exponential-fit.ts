import { at, requireSeries, type Series } from './series.js';

export interface ExponentialFit {
  /** Time constant (s). */
  readonly timeConstant: number;
  /** Value that it tends to, and value at the first reading. */
  readonly final: number;
  readonly initial: number;
  /** Share of the scatter that the curve explains, up to 1. */
  readonly explained: number;
}

interface Line {
  readonly offset: number;
  readonly slope: number;
  readonly residual: number;
  /** Sum of squares of the values about their mean. */
  readonly scatter: number;
}

/** Best offset and slope of the values against exp(−t/τ) for one τ, by least squares about the means. */
function fitLine({ times, values }: Series, timeConstant: number): Line {
  const count = times.length;
  const start = at(times, 0);
  let meanX = 0;
  let meanY = 0;
  for (let index = 0; index < count; index += 1) {
    meanX += Math.exp((start - at(times, index)) / timeConstant) / count;
    meanY += at(values, index) / count;
  }
  let xx = 0;
  let xy = 0;
  let yy = 0;
  for (let index = 0; index < count; index += 1) {
    const x = Math.exp((start - at(times, index)) / timeConstant) - meanX;
    const y = at(values, index) - meanY;
    xx += x * x;
    xy += x * y;
    yy += y * y;
  }
  const slope = xx === 0 ? 0 : xy / xx;
  return { offset: meanY - slope * meanX, slope, residual: Math.max(0, yy - slope * xy), scatter: yy };
}

/** Golden-section search on the logarithm of τ, after a coarse scan has found the valley. */
function bestTimeConstant(series: Series, shortest: number, longest: number): number {
  const misfit = (logarithm: number): number => fitLine(series, Math.exp(logarithm)).residual;
  const steps = 60;
  const width = (Math.log(longest) - Math.log(shortest)) / steps;
  const grid = Array.from({ length: steps + 1 }, (_, step) => Math.log(shortest) + step * width);
  const best = grid.reduce((least, each) => (misfit(each) < misfit(least) ? each : least), grid[0] ?? 0);
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = best - width;
  let high = best + width;
  let left = high - golden * (high - low);
  let right = low + golden * (high - low);
  let atLeft = misfit(left);
  let atRight = misfit(right);
  while (high - low > 1e-9) {
    if (atLeft <= atRight) {
      high = right;
      right = left;
      atRight = atLeft;
      left = high - golden * (high - low);
      atLeft = misfit(left);
    } else {
      low = left;
      left = right;
      atLeft = atRight;
      right = low + golden * (high - low);
      atRight = misfit(right);
    }
  }
  return Math.exp((low + high) / 2);
}

/**
 * Fits T(t) = final + (initial − final) exp(−t/τ): offset and size by linear least squares for each τ, τ by search.
 *
 * @param series at least four readings at rising times (s)
 * @returns time constant and levels, or undefined where the values do not change
 * @throws ArithmeticError `capture_no_samples`, `capture_lengths_differ`, `capture_not_ordered`
 * @source G. Golub, V. Pereyra, SIAM Journal on Numerical Analysis 10 (1973): separable least squares
 */
export function fitExponential(series: Series): ExponentialFit | undefined {
  requireSeries(series, 4);
  const { times } = series;
  const span = at(times, times.length - 1) - at(times, 0);
  const timeConstant = bestTimeConstant(series, span / (10 * times.length), span * 20);
  const { offset, slope, residual, scatter } = fitLine(series, timeConstant);
  if (slope === 0 || scatter === 0) return undefined;
  return { timeConstant, final: offset, initial: offset + slope, explained: 1 - residual / scatter };
}
