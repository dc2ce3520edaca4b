import { ArithmeticError } from '../errors/arithmetic-error.js';
import { addDays, dayNumber, isoDay, type IsoDay } from './iso-day.js';

/** A week of ISO 8601: Monday to Sunday, the first of a year being the one with its first Thursday. */
export interface IsoWeek {
  readonly year: number;
  readonly week: number;
}

/**
 * Day of the week.
 *
 * @param day the day
 * @returns 1 for Monday to 7 for Sunday (ISO 8601-1:2019, 3.1.2.19)
 */
export function isoWeekday(day: IsoDay): number {
  // 1970-01-01 was a Thursday.
  return ((((dayNumber(day) + 3) % 7) + 7) % 7) + 1;
}

/**
 * The week a day lies in. Its year may differ from the day's own in the days around New Year.
 *
 * @param day the day
 * @returns year and week by ISO 8601-1:2019, 4.2.2
 */
export function isoWeek(day: IsoDay): IsoWeek {
  const thursday = addDays(day, 4 - isoWeekday(day));
  const year = Number(thursday.slice(0, 4));
  const newYear = isoDay(`${thursday.slice(0, 4)}-01-01`);
  return { year, week: Math.floor((dayNumber(thursday) - dayNumber(newYear)) / 7) + 1 };
}

/**
 * How many weeks a year has.
 *
 * @param year Gregorian year, 1 to 9999
 * @returns 52 or 53: the week of 28 December is always the last (ISO 8601)
 * @throws ArithmeticError `plan_not_a_day` for another year
 */
export function weeksInYear(year: number): number {
  return isoWeek(isoDay(`${String(year).padStart(4, '0')}-12-28`)).week;
}

/**
 * First day of a week.
 *
 * @param week year and number of the week
 * @returns its Monday
 * @throws ArithmeticError `plan_no_such_week` if the year has no week of that number
 */
export function mondayOf(week: IsoWeek): IsoDay {
  if (!Number.isSafeInteger(week.week) || week.week < 1 || week.week > weeksInYear(week.year)) {
    throw new ArithmeticError('plan_no_such_week', { year: week.year, week: week.week });
  }
  const fourth = isoDay(`${String(week.year).padStart(4, '0')}-01-04`);
  return addDays(fourth, 1 - isoWeekday(fourth) + 7 * (week.week - 1));
}
