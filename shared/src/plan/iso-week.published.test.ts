import { describe, expect, it } from '@jest/globals';
import { isoDay } from './iso-day.js';
import { isoWeek, isoWeekday, mondayOf, weeksInYear } from './iso-week.js';

describe('weeks of ISO 8601', () => {
  // ISO 8601:2004, 2.2.10 and the table of examples around New Year in the encyclopaedia article "ISO week date"; from memory.
  it.each([
    ['1977-01-01', 1976, 53, 6],
    ['1977-01-02', 1976, 53, 7],
    ['1977-12-31', 1977, 52, 6],
    ['1978-01-01', 1977, 52, 7],
    ['1978-01-02', 1978, 1, 1],
    ['1979-12-30', 1979, 52, 7],
    ['1979-12-31', 1980, 1, 1],
    ['1980-12-28', 1980, 52, 7],
    ['1980-12-29', 1981, 1, 1],
    ['1981-12-31', 1981, 53, 4],
    ['1982-01-03', 1981, 53, 7],
    ['2008-12-29', 2009, 1, 1],
    ['2010-01-03', 2009, 53, 7],
  ])('%s is week %i-W%i-%i', (text, year, week, weekday) => {
    const day = isoDay(text);
    expect(isoWeek(day)).toEqual({ year, week });
    expect(isoWeekday(day)).toBe(weekday);
  });

  // Years with 53 weeks in one 28-year cycle; encyclopaedia article "ISO week date", from memory.
  it('gives 53 weeks to 71 years in 400', () => {
    const long = Array.from({ length: 400 }, (_, index) => 2000 + index).filter((year) => weeksInYear(year) === 53);
    expect(long).toHaveLength(71);
    expect(long.slice(0, 6)).toEqual([2004, 2009, 2015, 2020, 2026, 2032]);
  });

  it('finds the Monday of each week again', () => {
    for (let year = 1999; year < 2040; year += 1) {
      for (let week = 1; week <= weeksInYear(year); week += 1) {
        const monday = mondayOf({ year, week });
        expect(isoWeekday(monday)).toBe(1);
        expect(isoWeek(monday)).toEqual({ year, week });
      }
    }
  });

  it('refuses a week that the year does not have', () => {
    expect(() => mondayOf({ year: 2025, week: 53 })).toThrow('The year 2025 has no week 53.');
    expect(() => mondayOf({ year: 2025, week: 0 })).toThrow();
  });
});
