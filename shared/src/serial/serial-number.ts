import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { IsoDay } from '../plan/iso-day.js';
import { isoWeek, weeksInYear } from '../plan/iso-week.js';
import { hasMod97CheckDigits, mod97CheckDigits } from './mod-97-10.js';

declare const serialNumberBrand: unique symbol;

/**
 * Serial number of a unit: the product's letters, ISO year and week of issue, a running number, two check digits, for
 * example `WR-2648-0093-06`. It is issued once and never again.
 *
 * The check digits are ISO/IEC 7064 MOD 97-10 over all digits before them. Caught: every single wrong digit, every swap
 * of two digits, every wrong pair of like digits. Not caught: about one in 97 of other faults with several wrong
 * digits, and a wrong product letter, which the check digits do not cover; the record then knows no such unit, or
 * shows one of another product.
 */
export type SerialNumber = string & { readonly [serialNumberBrand]: true };

/** What a serial number says. */
export interface SerialNumberParts {
  /** Two or three capital letters A to Z. */
  readonly product: string;
  /** ISO year of the week, 2000 to 2099. */
  readonly year: number;
  /** ISO week, 1 to 53. */
  readonly week: number;
  /** 1 to 9,999,999; how far it counts before it starts again is the shop's number series' matter. */
  readonly running: number;
}

const form = /^([A-Z]{2,3})(\d{2})(\d{2})(\d{4}|[1-9]\d{4,6})(\d{2})$/;

/**
 * Writes a serial number.
 *
 * @param parts product letters, ISO year and week, running number
 * @returns the serial number with its check digits
 * @throws ArithmeticError `serial_product_letters`, `serial_year`, `serial_no_such_week`, `serial_running_number`
 */
export function serialNumber(parts: SerialNumberParts): SerialNumber {
  const { product, year, week, running } = parts;
  if (!/^[A-Z]{2,3}$/.test(product)) throw new ArithmeticError('serial_product_letters', { letters: product });
  if (!Number.isSafeInteger(year) || year < 2000 || year > 2099) throw new ArithmeticError('serial_year', { year });
  if (!Number.isSafeInteger(running) || running < 1 || running > 9_999_999) {
    throw new ArithmeticError('serial_running_number', { number: running });
  }
  if (!Number.isSafeInteger(week) || week < 1 || week > weeksInYear(year)) {
    throw new ArithmeticError('serial_no_such_week', { text: product, year, week });
  }
  const weekText = String(year % 100).padStart(2, '0') + String(week).padStart(2, '0');
  const runningText = String(running).padStart(4, '0');
  return `${product}-${weekText}-${runningText}-${mod97CheckDigits(weekText + runningText)}` as SerialNumber;
}

/**
 * Writes the serial number of a unit issued on a day.
 *
 * @param product two or three capital letters
 * @param day the day of issue, whose ISO week counts
 * @param running 1 to 9,999,999
 * @returns the serial number
 * @throws ArithmeticError as {@link serialNumber}
 */
export function serialNumberOn(product: string, day: IsoDay, running: number): SerialNumber {
  return serialNumber({ product, ...isoWeek(day), running });
}

/** A serial number that was read, with what it says. */
export interface ReadSerialNumber extends SerialNumberParts {
  /** In its one written form. */
  readonly text: SerialNumber;
}

/**
 * Reads a serial number as it is typed or scanned: capital or small letters, with or without hyphens (of any length)
 * and spaces.
 *
 * @param typed what was typed
 * @returns the serial number and its parts
 * @throws ArithmeticError `serial_unreadable` if it has another form, `serial_check_digits` if a digit is wrong,
 *   `serial_no_such_week` if the digits agree but the week does not exist, `serial_running_number` for a running
 *   number of zero
 */
export function readSerialNumber(typed: string): ReadSerialNumber {
  const parts = form.exec(typed.replace(/[\s\-\u2010-\u2015\u2212]/g, '').toUpperCase());
  if (!parts) throw new ArithmeticError('serial_unreadable', { text: typed });
  const [, product = '', years = '', weeks = '', runningText = '', check = ''] = parts;
  if (!hasMod97CheckDigits(years + weeks + runningText + check)) {
    throw new ArithmeticError('serial_check_digits', { text: typed });
  }
  const year = 2000 + Number(years);
  const week = Number(weeks);
  if (week < 1 || week > weeksInYear(year)) {
    throw new ArithmeticError('serial_no_such_week', { text: typed, year, week });
  }
  const read = { product, year, week, running: Number(runningText) };
  return { ...read, text: serialNumber(read) };
}
