import { describe, expect, it } from '@jest/globals';
import type { TodayItem } from '../api/today';
import { headline, standing } from './today-words';

const due = (day: string | null): TodayItem => ({
  key: String(day),
  due: day,
  late: false,
  signal: false,
  sentence: '',
  because: null,
  action: null,
});
const day = '2026-12-01';

describe('the headline of Today', () => {
  it.each([
    [[], 'Nothing needs you just now'],
    [['2026-12-01'], 'One thing needs you today'],
    [['2026-12-02', '2026-12-03', '2026-12-02', '2026-12-03'], 'Four things need you by Thursday'],
    [['2026-12-02', null], 'Two things need you'],
    [['2026-12-02', '2026-12-20'], 'Two things need you'],
    [['2026-11-28'], 'One thing needs you'],
  ])('for %j is: %s', (days, words) => {
    expect(headline({ day, queue: days.map(due) })).toBe(words);
  });
});

describe('how things stand', () => {
  it.each([
    [null, 'Tuesday 1 December.'],
    [{ thisWeek: 0, safe: 0 }, 'Tuesday 1 December. No order is promised this week.'],
    [{ thisWeek: 9, safe: 7 }, 'Tuesday 1 December. Nine orders are promised this week; seven are safe.'],
    [{ thisWeek: 1, safe: 1 }, 'Tuesday 1 December. One order is promised this week; it is safe.'],
    [{ thisWeek: 1, safe: 0 }, 'Tuesday 1 December. One order is promised this week; it is not safe.'],
    [{ thisWeek: 14, safe: 14 }, 'Tuesday 1 December. 14 orders are promised this week; all are safe.'],
    [{ thisWeek: 3, safe: 1 }, 'Tuesday 1 December. Three orders are promised this week; one is safe.'],
  ])('with %j is: %s', (promises, words) => {
    expect(standing({ day, promises })).toBe(words);
  });
});
