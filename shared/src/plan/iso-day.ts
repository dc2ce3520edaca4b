import { ArithmeticError } from '../errors/arithmetic-error.js';

declare const isoDayBrand: unique symbol;

/** A calendar day in the shop's own zone, written `YYYY-MM-DD` (ISO 8601); it sorts as text. */
export type IsoDay = string & { readonly [isoDayBrand]: true };

const millisecondsPerDay = 86_400_000;

/**
 * Reads a calendar day.
 *
 * @param text `YYYY-MM-DD`, years 0001 to 9999, Gregorian calendar
 * @returns the same text as a day
 * @throws ArithmeticError `plan_not_a_day` if the form is another or the day does not exist
 */
export function isoDay(text: string): IsoDay {
  const number = /^\d{4}-\d{2}-\d{2}$/.test(text) ? Date.parse(`${text}T00:00:00Z`) : NaN;
  // Date.parse carries 30 February over into March, so the day is written back and compared.
  if (Number.isNaN(number) || text < '0001' || new Date(number).toISOString().slice(0, 10) !== text) {
    throw new ArithmeticError('plan_not_a_day', { text });
  }
  return text as IsoDay;
}

/**
 * Number of a day, counted from 1970-01-01.
 *
 * @param day the day
 * @returns whole days, negative before 1970
 */
export function dayNumber(day: IsoDay): number {
  return Math.round(Date.parse(`${day}T00:00:00Z`) / millisecondsPerDay);
}

/**
 * The day of a number; the inverse of {@link dayNumber}.
 *
 * @param number whole days from 1970-01-01
 * @returns the day
 * @throws ArithmeticError `plan_not_a_day` outside of the years 0001 to 9999 or for a fraction
 */
export function dayOfNumber(number: number): IsoDay {
  const instant = new Date(number * millisecondsPerDay);
  if (!Number.isSafeInteger(number) || Number.isNaN(instant.getTime())) {
    throw new ArithmeticError('plan_not_a_day', { text: String(number) });
  }
  return isoDay(instant.toISOString().slice(0, 10));
}

/**
 * A day some days later.
 *
 * @param day the day
 * @param days whole calendar days to add; negative goes back
 * @returns the other day
 * @throws ArithmeticError `plan_not_a_day` as {@link dayOfNumber}
 */
export function addDays(day: IsoDay, days: number): IsoDay {
  return dayOfNumber(dayNumber(day) + days);
}

/**
 * Calendar days between two days.
 *
 * @param from the first day
 * @param to the other day
 * @returns whole days, positive if `to` is later
 */
export function daysBetween(from: IsoDay, to: IsoDay): number {
  return dayNumber(to) - dayNumber(from);
}
