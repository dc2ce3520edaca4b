import { ArithmeticError } from '../errors/arithmetic-error.js';

/**
 * Holds that there are enough values and that each is a finite number.
 *
 * @param values the sample
 * @param needed how many there have to be
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_number` (position counted from 1)
 */
export function requireSample(values: readonly number[], needed: number): void {
  if (values.length < needed) throw new ArithmeticError('statistics_too_few', { needed, found: values.length });
  const bad = values.findIndex((value) => !Number.isFinite(value));
  if (bad >= 0) throw new ArithmeticError('statistics_not_a_number', { position: bad + 1 });
}

/**
 * Holds that a number is whole, safe and not below a bound.
 *
 * @param name what it is, for the sentence
 * @param value the number
 * @param low the least allowed
 * @throws ArithmeticError `statistics_not_a_count`
 */
export function requireCount(name: string, value: number, low: number): void {
  if (!Number.isSafeInteger(value) || value < low) {
    throw new ArithmeticError('statistics_not_a_count', { name, low, value: String(value) });
  }
}

/**
 * Holds that a share lies strictly between 0 and 1.
 *
 * @param name what it is, for the sentence
 * @param value the share, for example a confidence of 0.95
 * @throws ArithmeticError `statistics_out_of_range`
 */
export function requireOpenShare(name: string, value: number): void {
  if (!(value > 0 && value < 1)) {
    throw new ArithmeticError('statistics_out_of_range', {
      name,
      low: 'above 0',
      high: 'below 1',
      value: String(value),
    });
  }
}

/**
 * Holds that a share lies from 0 to 1, both included.
 *
 * @param name what it is, for the sentence
 * @param value the share
 * @throws ArithmeticError `statistics_out_of_range`
 */
export function requireShare(name: string, value: number): void {
  if (!(value >= 0 && value <= 1)) {
    throw new ArithmeticError('statistics_out_of_range', { name, low: 0, high: 1, value: String(value) });
  }
}
