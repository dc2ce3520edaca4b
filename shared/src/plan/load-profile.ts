import type { PartKey } from '../bill/bill-lines.js';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import { roundToTotal } from '../money/apportion.js';
import { type IsoDay, addDays } from './iso-day.js';
import { isoWeekday } from './iso-week.js';
import { type WorkingCalendar, isWorkingDay } from './working-calendar.js';

/** Work that takes bench time: a batch or a planned order. */
export interface BenchWork {
  readonly part: PartKey;
  /** Which batch or order. */
  readonly id: string;
  /** First and last period in which it can be worked on. */
  readonly from: number;
  readonly until: number;
  readonly minutes: DecimalInput;
}

export interface LoadPeriod {
  readonly capacity: Decimal;
  readonly load: Decimal;
  /** Load above capacity; zero if it fits. */
  readonly over: Decimal;
  /** Load / capacity with four decimals; undefined without capacity. */
  readonly share: Decimal | undefined;
  /** What makes up the load. */
  readonly work: readonly { readonly part: PartKey; readonly id: string; readonly minutes: Decimal }[];
}

/** Bench time is kept with two decimals of a minute. */
const minuteDecimals = 2;

/**
 * Spreads work over the bench. A piece of work is spread over its periods in proportion to their capacity (evenly where
 * they have none), in hundredths of a minute by the largest remainder, so that the load adds up to the work. Capacity
 * does not limit it: this shows where there is too much.
 *
 * @param work batches and orders; periods outside the profile count as its first and last
 * @param capacity minutes per period, at least one period
 * @throws ArithmeticError `plan_periods`, `plan_load`
 * Source: common practice, no source (load against unlimited capacity).
 */
export function loadProfile(work: readonly BenchWork[], capacity: readonly DecimalInput[]): LoadPeriod[] {
  if (capacity.length === 0) throw new ArithmeticError('plan_periods', { count: 0 });
  const room = capacity.map((minutes) => hundredths(minutes, 'capacity'));
  const parts: { part: PartKey; id: string; minutes: Decimal }[][] = room.map(() => []);
  for (const { part, id, from, until, minutes } of work) {
    const [first, last] = [within(from, room.length), within(Math.max(from, until), room.length)];
    const shares = spread(hundredths(minutes, id), room.slice(first, last + 1));
    shares.forEach((share, index) => {
      if (share > 0n) parts[first + index]?.push({ part, id, minutes: asMinutes(share) });
    });
  }
  return room.map((free, period) => {
    const own = parts[period] ?? [];
    const load = own.reduce((sum, { minutes }) => sum.plus(minutes), new Decimal(0));
    const there = asMinutes(free);
    const share = there.isZero() ? undefined : load.div(there).toDecimalPlaces(4, Decimal.ROUND_HALF_UP);
    return { capacity: there, load, over: Decimal.max(0, load.minus(there)), share, work: own };
  });
}

function spread(minutes: bigint, room: readonly bigint[]): readonly bigint[] {
  const all = room.reduce((sum, free) => sum + free, 0n);
  const weights = all === 0n ? room.map(() => 1n) : room;
  const whole = weights.reduce((sum, weight) => sum + weight, 0n);
  return roundToTotal(
    weights.map((weight) => weight * minutes),
    whole,
    minutes,
  );
}

function within(period: number, count: number): number {
  return Math.min(Math.max(0, period), count - 1);
}

function hundredths(minutes: DecimalInput, id: string): bigint {
  const exact = decimal(minutes).times(10 ** minuteDecimals);
  if (exact.lessThan(0)) throw new ArithmeticError('plan_load', { id, minutes: decimal(minutes).toFixed() });
  return BigInt(exact.toFixed(0, Decimal.ROUND_CEIL));
}

function asMinutes(count: bigint): Decimal {
  return new Decimal(count.toString()).div(10 ** minuteDecimals);
}

/**
 * Minutes at the bench per week of a calendar.
 *
 * @param mondays of the weeks
 * @param today the first day that can still be used
 * @param calendar the shop's
 * @param minutesByWeekday minutes worked on each ISO weekday, by its number; none where it is missing
 * @returns one figure per week
 * Source: ISO 8601-1:2019 (weeks begin on Monday).
 */
export function weeklyCapacity(
  mondays: readonly IsoDay[],
  today: IsoDay,
  calendar: WorkingCalendar,
  minutesByWeekday: ReadonlyMap<number, DecimalInput>,
): Decimal[] {
  return mondays.map((monday) => {
    const days = [0, 1, 2, 3, 4, 5, 6].map((later) => addDays(monday, later));
    return days
      .filter((day) => day >= today && isWorkingDay(day, calendar))
      .reduce((sum, day) => sum.plus(decimal(minutesByWeekday.get(isoWeekday(day)) ?? 0)), new Decimal(0));
  });
}
