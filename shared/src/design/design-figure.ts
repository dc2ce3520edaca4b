import { ArithmeticError } from '../errors/arithmetic-error.js';
import { type DesignWarningCode, designWarningSentences } from './design-warnings.js';

export type DesignUnit = 'Hz' | 's' | 'h' | 'Ω' | 'V' | 'A' | 'W' | 'Wh' | 'T' | 'mm' | 'mm²' | 'turns' | 'ratio';

/** The formula behind a figure, shown beside it. */
export interface DesignMethod {
  readonly name: string;
  readonly formula: string;
  readonly source: string;
  readonly validRange: string;
}

export interface DesignWarning {
  readonly code: DesignWarningCode;
  readonly sentence: string;
}

/** One result of a design sheet. */
export interface DesignFigure {
  readonly value: number;
  readonly unit: DesignUnit;
  readonly method: DesignMethod;
  readonly warnings: readonly DesignWarning[];
}

/**
 * A warning with its details filled in.
 *
 * @param code which
 * @param details values for the `{names}` of its sentence
 * @returns code and sentence
 */
export function warn(code: DesignWarningCode, details: Readonly<Record<string, string>> = {}): DesignWarning {
  const sentence = designWarningSentences[code].replace(/\{(\w+)\}/g, (whole, name: string) => details[name] ?? whole);
  return { code, sentence };
}

/**
 * A warning where a value lies outside a range, else none.
 *
 * @param code which
 * @param value compared
 * @param low least value without warning
 * @param high greatest value without warning
 * @param details for the sentence
 * @returns none or one
 */
export function warnOutside(
  code: DesignWarningCode,
  value: number,
  low: number,
  high: number,
  details: Readonly<Record<string, string>> = {},
): readonly DesignWarning[] {
  return value < low || value > high ? [warn(code, details)] : [];
}

/**
 * Holds that a figure is a positive finite number.
 *
 * @param name what it is, for the sentence
 * @param value in its unit
 * @throws ArithmeticError `design_not_positive`
 */
export function requirePositive(name: string, value: number): void {
  if (!(value > 0) || !Number.isFinite(value)) {
    throw new ArithmeticError('design_not_positive', { name, value: String(value) });
  }
}

/**
 * Holds that a figure is a finite number and not negative.
 *
 * @param name what it is, for the sentence
 * @param value in its unit
 * @throws ArithmeticError `design_negative`
 */
export function requireNotNegative(name: string, value: number): void {
  if (!(value >= 0) || !Number.isFinite(value)) {
    throw new ArithmeticError('design_negative', { name, value: String(value) });
  }
}

/**
 * Holds that a figure lies from one bound to another, both included.
 *
 * @param name what it is, for the sentence
 * @param value in its unit
 * @param low the least allowed
 * @param high the greatest allowed
 * @throws ArithmeticError `design_out_of_range`
 */
export function requireWithin(name: string, value: number, low: number, high: number): void {
  if (!(value >= low && value <= high)) {
    throw new ArithmeticError('design_out_of_range', { name, low, high, value: String(value) });
  }
}

/**
 * Holds that a figure is a whole number of at least one.
 *
 * @param name what it is, for the sentence
 * @param value the count
 * @throws ArithmeticError `design_not_a_count`
 */
export function requireWhole(name: string, value: number): void {
  if (!Number.isSafeInteger(value) || value < 1) {
    throw new ArithmeticError('design_not_a_count', { name, value: String(value) });
  }
}
