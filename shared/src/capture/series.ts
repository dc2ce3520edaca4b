import { ArithmeticError } from '../errors/arithmetic-error.js';

/** Readings over time, as a temperature log has them. */
export interface Series {
  /** Seconds, rising. */
  readonly times: ArrayLike<number>;
  readonly values: ArrayLike<number>;
}

/**
 * Holds that a series has readings at rising times.
 *
 * @param series times (s) and values
 * @param needed how many readings there have to be
 * @throws ArithmeticError `capture_no_samples`, `capture_lengths_differ`, `capture_not_ordered`
 */
export function requireSeries({ times, values }: Series, needed = 1): void {
  if (times.length !== values.length) {
    throw new ArithmeticError('capture_lengths_differ', { times: times.length, values: values.length });
  }
  if (times.length < needed) throw new ArithmeticError('capture_no_samples');
  for (let index = 1; index < times.length; index += 1) {
    if (!((times[index] ?? Number.NaN) > (times[index - 1] ?? Number.NaN))) {
      throw new ArithmeticError('capture_not_ordered', { position: index + 1 });
    }
  }
}

/** Value at an index; the index has to be inside. */
export const at = (values: ArrayLike<number>, index: number): number => values[index] ?? Number.NaN;

/**
 * The instant at which the straight line between two readings meets a level.
 *
 * @param series times (s) and values
 * @param index of the second of the two
 * @param level between their values
 * @returns seconds
 */
export function crossingInstant({ times, values }: Series, index: number, level: number): number {
  const before = at(values, index - 1);
  const rise = at(values, index) - before;
  const start = at(times, index - 1);
  return rise === 0 ? start : start + ((at(times, index) - start) * (level - before)) / rise;
}

/**
 * First instant from which on a level is reached.
 *
 * @param series times (s) and values
 * @param level to reach from below, or from above where the series begins above it
 * @param from index to begin at
 * @returns seconds, or undefined
 */
export function firstReach(series: Series, level: number, from = 0): number | undefined {
  const { times, values } = series;
  const upwards = at(values, from) <= level;
  for (let index = from; index < times.length; index += 1) {
    const value = at(values, index);
    if (upwards ? value >= level : value <= level) {
      return index === from ? at(times, index) : crossingInstant(series, index, level);
    }
  }
  return undefined;
}
