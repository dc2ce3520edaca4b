import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { addDays, dayOfNumber, isoDay } from './iso-day.js';
import { isoWeekday } from './iso-week.js';
import { addWorkingDays, isWorkingDay, workingDayFrom, type WorkingCalendar } from './working-calendar.js';

const calendar: WorkingCalendar = {
  weekdays: [1, 2, 3, 4, 5],
  closedDays: new Set([isoDay('2026-12-25'), isoDay('2026-12-28')]),
};

describe('A working calendar', () => {
  it('knows the weekday of a day as JavaScript does', () => {
    fc.assert(
      fc.property(fc.integer({ min: -100_000, max: 100_000 }), (number) => {
        const day = dayOfNumber(number);
        expect(isoWeekday(day) % 7).toBe(new Date(`${day}T00:00:00Z`).getUTCDay());
      }),
    );
  });

  it('passes over weekends and closed days', () => {
    expect(addWorkingDays(isoDay('2026-12-24'), 1, calendar)).toBe('2026-12-29');
    expect(addWorkingDays(isoDay('2026-12-05'), 1, calendar)).toBe('2026-12-08');
    expect(addWorkingDays(isoDay('2026-12-05'), 0, calendar)).toBe('2026-12-07');
  });

  it('counts as many working days as were asked for', () => {
    fc.assert(
      fc.property(fc.integer({ min: 20_000, max: 21_000 }), fc.integer({ min: 0, max: 40 }), (number, count) => {
        const from = workingDayFrom(dayOfNumber(number), calendar);
        const to = addWorkingDays(from, count, calendar);
        let passed = 0;
        for (let day = from; day < to; day = addDays(day, 1)) if (isWorkingDay(day, calendar)) passed += 1;
        expect(passed).toBe(count);
        expect(isWorkingDay(to, calendar)).toBe(true);
      }),
    );
  });

  it('refuses a calendar without a working day and a count that is none', () => {
    const never: WorkingCalendar = { weekdays: [], closedDays: new Set() };
    expect(() => workingDayFrom(isoDay('2026-12-01'), never)).toThrow(
      expect.objectContaining({ code: 'plan_never_working' }),
    );
    for (const count of [-1, 0.5, Number.NaN]) {
      expect(() => addWorkingDays(isoDay('2026-12-01'), count, calendar)).toThrow(
        expect.objectContaining({ code: 'plan_days_negative' }),
      );
    }
  });
});
