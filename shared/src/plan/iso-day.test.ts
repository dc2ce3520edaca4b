import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { addDays, dayNumber, dayOfNumber, daysBetween, isoDay } from './iso-day.js';

const faultOf = (text: string) => {
  const result = attempt(() => isoDay(text));
  return result.ok ? undefined : result.fault.code;
};

describe('calendar days', () => {
  it.each(['2024-02-29', '2000-02-29', '0001-01-01', '9999-12-31'])('takes %s', (text) => {
    expect(isoDay(text)).toBe(text);
  });

  it.each(['2023-02-29', '1900-02-29', '2024-13-01', '2024-00-10', '2024-04-31', '0000-01-01', '24-01-01', '', 'x'])(
    'refuses %p',
    (text) => {
      expect(faultOf(text)).toBe('plan_not_a_day');
    },
  );

  it('counts over a leap day and over the turn of a century', () => {
    expect(daysBetween(isoDay('2024-02-28'), isoDay('2024-03-01'))).toBe(2);
    expect(daysBetween(isoDay('2100-02-28'), isoDay('2100-03-01'))).toBe(1);
    expect(addDays(isoDay('2026-12-31'), 1)).toBe('2027-01-01');
    expect(addDays(isoDay('2026-03-01'), -1)).toBe('2026-02-28');
  });

  it('refuses a day before the first and after the last year', () => {
    expect(attempt(() => addDays(isoDay('9999-12-31'), 1)).ok).toBe(false);
    expect(attempt(() => addDays(isoDay('0001-01-01'), -1)).ok).toBe(false);
    expect(attempt(() => addDays(isoDay('2026-01-01'), 0.5)).ok).toBe(false);
  });

  it('goes to its number and back, and sorts as text as it does as number', () => {
    const days = fc.integer({ min: -719_162, max: 2_932_896 });
    fc.assert(
      fc.property(days, days, (first, second) => {
        expect(dayNumber(dayOfNumber(first))).toBe(first);
        expect(dayOfNumber(first) < dayOfNumber(second)).toBe(first < second);
      }),
    );
  });
});
