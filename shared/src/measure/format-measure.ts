import { Decimal, decimal, type DecimalInput } from './decimal.js';
import type { DecimalMark } from './parse-measure.js';
import { units, type Unit } from './unit.js';

/** How to write a number. */
export interface NumberStyle {
  readonly decimalMark: DecimalMark;
  /** Narrow no-break spaces between groups of three, from five digits on (SI brochure, 5.4.4). */
  readonly grouped?: boolean;
}

const plain: NumberStyle = { decimalMark: '.' };
const narrowSpace = '\u202F';
const noBreakSpace = '\u00A0';

/**
 * Writes a number.
 *
 * @param value the number
 * @param style decimal mark and grouping
 * @param decimals digits behind the mark, rounded half to even; all there are if left out
 * @returns the number without exponent, with a proper minus sign (U+2212)
 * @throws ArithmeticError `measure_not_a_number`, `measure_not_exact`
 */
export function formatNumber(value: DecimalInput, style: NumberStyle = plain, decimals?: number): string {
  const number = decimal(value);
  const text = decimals === undefined ? number.toFixed() : number.toFixed(decimals, Decimal.ROUND_HALF_EVEN);
  const [whole = '', fraction] = text.replace('-', '').split('.');
  const grouped = style.grouped && whole.length > 4 ? whole.replace(/\B(?=(?:\d{3})+$)/g, narrowSpace) : whole;
  const negative = text.startsWith('-') && /[1-9]/.test(text);
  return `${negative ? '\u2212' : ''}${grouped}${fraction === undefined ? '' : style.decimalMark + fraction}`;
}

/**
 * Writes a measure in engineering notation: the prefix is chosen so that the number lies from 1 to below 1000.
 *
 * @param value in `unit`
 * @param unit any unit; one without prefixes stays as it is
 * @param significantDigits digits kept, rounded half to even; zeros at the end stay, they say how exact it is
 * @param style decimal mark and grouping
 * @returns for example "47.0 kHz", "2.50 mΩ", "999 mA", "1.00 A"
 * @throws ArithmeticError `measure_not_a_number`, `measure_not_exact`
 */
export function formatEngineering(
  value: DecimalInput,
  unit: Unit,
  significantDigits: number,
  style: NumberStyle = plain,
): string {
  const rounded = decimal(value).toSignificantDigits(significantDigits, Decimal.ROUND_HALF_EVEN);
  const shown = bestPrefix(rounded, unit);
  const number = rounded.times(unit.factor).div(shown.factor);
  const digitsBefore = number.isZero() ? 1 : number.e + 1;
  const decimals = Math.max(0, significantDigits - digitsBefore);
  return `${formatNumber(number, style, decimals)}${noBreakSpace}${shown.code}`;
}

/** The unit of the same stem whose prefix is a power of 1000 and brings the value to 1 … 1000, or as near as there is. */
function bestPrefix(value: Decimal, unit: Unit): Unit {
  if (unit.stem === undefined || value.isZero()) return unit;
  const family = [...units.values()]
    .filter((other) => other.stem === unit.stem && other.prefixPower % 3 === 0)
    .sort((one, other) => one.factor.comparedTo(other.factor));
  const size = value.abs().times(unit.factor);
  const fitting = family.filter((other) => other.factor.lessThanOrEqualTo(size));
  return fitting.at(-1) ?? family[0] ?? unit;
}
