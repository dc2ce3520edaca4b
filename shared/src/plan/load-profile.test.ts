import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import { isoDay } from './iso-day.js';
import { type BenchWork, loadProfile, weeklyCapacity } from './load-profile.js';

const work = (id: string, from: number, until: number, minutes: number | string): BenchWork => ({
  part: 'iron',
  id,
  from,
  until,
  minutes,
});
const text = (rows: ReturnType<typeof loadProfile>): string[] =>
  rows.map(({ load, over, share }) => [load.toFixed(), over.toFixed(), share?.toFixed() ?? '-'].join(' '));

describe('load profile', () => {
  test('work is spread in proportion to the capacity of its periods', () => {
    expect(text(loadProfile([work('b1', 0, 2, 300)], [480, 240, 480]))).toEqual([
      '120 0 0.25',
      '60 0 0.25',
      '120 0 0.25',
    ]);
  });

  test('too much shows as over, a closed week takes nothing', () => {
    expect(text(loadProfile([work('b1', 0, 1, 500), work('b2', 1, 1, 30)], [400, 0]))).toEqual([
      '500 100 1.25',
      '30 30 -',
    ]);
  });

  test('work outside the profile counts at its ends', () => {
    expect(text(loadProfile([work('b1', -5, -2, 10), work('b2', 9, 12, 20)], [60, 60]))).toEqual([
      '10 0 0.1667',
      '20 0 0.3333',
    ]);
  });

  test('no work, no load; no periods, no profile', () => {
    expect(text(loadProfile([], [60]))).toEqual(['0 0 0']);
    expect(() => loadProfile([], [])).toThrow('A plan of 0 periods');
    expect(() => loadProfile([work('b1', 0, 0, -1)], [60])).toThrow('b1');
    expect(() => loadProfile([], [-1])).toThrow('capacity');
  });

  test('the load adds up to the work', () => {
    const rows = fc.array(fc.tuple(fc.integer({ min: -1, max: 6 }), fc.nat(4), fc.nat(100_000)), { maxLength: 6 });
    fc.assert(
      fc.property(rows, fc.array(fc.nat(500), { minLength: 1, maxLength: 6 }), (list, capacity) => {
        const all = list.map(([from, more, hundredths], index) =>
          work(`b${index}`, from, from + more, new Decimal(hundredths).div(100).toFixed()),
        );
        const profile = loadProfile(all, capacity);
        const total = profile.reduce((sum, { load }) => sum.plus(load), new Decimal(0));
        expect(total.toFixed()).toBe(all.reduce((sum, { minutes }) => sum.plus(minutes), new Decimal(0)).toFixed());
        for (const { load, work: own } of profile) {
          expect(own.reduce((sum, { minutes }) => sum.plus(minutes), new Decimal(0)).toFixed()).toBe(load.toFixed());
        }
      }),
    );
  });
});

test('weekly capacity leaves out closed days and what is past', () => {
  const calendar = { weekdays: [1, 2, 3, 4, 5], closedDays: new Set([isoDay('2026-12-25')]) };
  const minutes = new Map([1, 2, 3, 4, 5].map((weekday) => [weekday, weekday === 5 ? 240 : 450]));
  const mondays = ['2026-12-14', '2026-12-21'].map(isoDay);
  expect(weeklyCapacity(mondays, isoDay('2026-12-17'), calendar, minutes).map(Number)).toEqual([690, 1800]);
});
