import { ArithmeticError } from '../errors/arithmetic-error.js';
import { type IsoDay, addDays, daysBetween } from './iso-day.js';
import { isoWeekday } from './iso-week.js';
import { type WorkingCalendar, isWorkingDay, workingDayFrom } from './working-calendar.js';

/** The periods of a plan, counted from 0, which is the one we are in. */
export interface Timeline {
  readonly count: number;
  /**
   * When something must be started to be there at the start of a period.
   *
   * @param period when it is needed
   * @param leadTime how long it takes, in the timeline's own measure
   * @returns the period of the start, 0 at the earliest, and by how much the right start is already past
   */
  startFor(period: number, leadTime: number): { readonly period: number; readonly late: number };
}

/**
 * Periods as such, with lead times in periods, as textbooks have it.
 *
 * @param count how many
 * @throws ArithmeticError `plan_periods` | `plan_lead_time`
 */
export function plainPeriods(count: number): Timeline {
  if (!Number.isInteger(count) || count < 1) throw new ArithmeticError('plan_periods', { count });
  return {
    count,
    startFor: (period, leadTime) => {
      checkLeadTime(leadTime);
      return { period: Math.max(0, period - leadTime), late: Math.max(0, leadTime - period) };
    },
  };
}

/** Weeks of the shop's calendar, with lead times in working days. */
export interface WeekTimeline extends Timeline {
  /** Monday of each week. */
  readonly mondays: readonly IsoDay[];
  /** The day on which what a week needs must be there: its first working day from today on. */
  readonly dueDays: readonly IsoDay[];
  /** The week of a day; below 0 for the past, `count` and more beyond the horizon. */
  weekOf(day: IsoDay): number;
  /** The day on which something must be started to be there on the due day of a week; undefined if that is past. */
  startDay(week: number, leadTime: number): IsoDay | undefined;
}

/**
 * Weeks from the one of today on. A lead time of n working days means that work begins n working days before the due
 * day. A week without a working day is due on the next one that there is.
 *
 * @param today the first day that can still be used
 * @param count weeks
 * @param calendar the shop's
 * @throws ArithmeticError `plan_periods`, `plan_never_working`; `plan_lead_time` for a lead time that is no whole number
 * Source: ISO 8601-1:2019 (weeks begin on Monday); the offset is common practice, no source.
 */
export function weeksFrom(today: IsoDay, count: number, calendar: WorkingCalendar): WeekTimeline {
  if (!Number.isInteger(count) || count < 1) throw new ArithmeticError('plan_periods', { count });
  const monday = addDays(today, 1 - isoWeekday(today));
  const mondays = Array.from({ length: count }, (_, week) => addDays(monday, 7 * week));
  const dueDays = mondays.map((day) => workingDayFrom(day < today ? today : day, calendar));
  const lastDay = dueDays.at(-1) ?? today;
  const workingDays: IsoDay[] = [];
  for (let day = today; day <= lastDay; day = addDays(day, 1)) if (isWorkingDay(day, calendar)) workingDays.push(day);
  const indexOf = new Map(workingDays.map((day, index) => [day, index]));
  const weekOf = (day: IsoDay): number => Math.floor(daysBetween(monday, day) / 7);
  const startIndex = (week: number, leadTime: number): number => {
    checkLeadTime(leadTime);
    return (indexOf.get(dueDays[week] ?? lastDay) ?? 0) - leadTime;
  };
  return {
    count,
    mondays,
    dueDays,
    weekOf,
    startDay: (week, leadTime) => workingDays[startIndex(week, leadTime)],
    startFor: (week, leadTime) => {
      const index = startIndex(week, leadTime);
      return { period: Math.max(0, weekOf(workingDays[Math.max(0, index)] ?? today)), late: Math.max(0, -index) };
    },
  };
}

function checkLeadTime(leadTime: number): void {
  if (!Number.isInteger(leadTime) || leadTime < 0) throw new ArithmeticError('plan_lead_time', { leadTime });
}
