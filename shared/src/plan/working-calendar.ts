import { ArithmeticError } from '../errors/arithmetic-error.js';
import { addDays, type IsoDay } from './iso-day.js';
import { isoWeekday } from './iso-week.js';

/** The days on which a shop works. */
export interface WorkingCalendar {
  /** ISO weekdays that are worked, Monday 1 to Sunday 7; at least one. */
  readonly weekdays: readonly number[];
  /** Days that are not worked although their weekday is. */
  readonly closedDays: ReadonlySet<IsoDay>;
}

/** Longer than any run of closed days a shop has; past it a calendar is taken to be wrong. */
const longestClosure = 366;

/**
 * Whether a day is worked.
 *
 * @param day the day
 * @param calendar the shop's
 */
export function isWorkingDay(day: IsoDay, calendar: WorkingCalendar): boolean {
  return calendar.weekdays.includes(isoWeekday(day)) && !calendar.closedDays.has(day);
}

/**
 * The day itself if it is worked, else the next one that is.
 *
 * @param day the day
 * @param calendar the shop's
 * @returns a working day, not before `day`
 * @throws ArithmeticError `plan_never_working` if none of the next 366 days is worked
 */
export function workingDayFrom(day: IsoDay, calendar: WorkingCalendar): IsoDay {
  for (let later = 0; later <= longestClosure; later += 1) {
    const candidate = addDays(day, later);
    if (isWorkingDay(candidate, calendar)) return candidate;
  }
  throw new ArithmeticError('plan_never_working', { day });
}

/**
 * The day some working days later. Counting begins at the first working day not before `day`: what is ready on a
 * Saturday and takes one working day leaves on Tuesday, since Monday is the day on which work on it begins.
 *
 * @param day the day from which it is ready
 * @param workingDays how many working days it takes; zero gives the first working day itself
 * @param calendar the shop's
 * @returns a working day
 * @throws ArithmeticError `plan_never_working`; `plan_days_negative` for a negative or broken count
 * Source: common practice, no source.
 */
export function addWorkingDays(day: IsoDay, workingDays: number, calendar: WorkingCalendar): IsoDay {
  if (!Number.isInteger(workingDays) || workingDays < 0)
    throw new ArithmeticError('plan_days_negative', { workingDays });
  let reached = workingDayFrom(day, calendar);
  for (let done = 0; done < workingDays; done += 1) reached = workingDayFrom(addDays(reached, 1), calendar);
  return reached;
}
