import { describe, expect, it } from '@jest/globals';
import { isoDay } from '../plan/iso-day.js';
import { unionVatAreas } from './vat-area.js';
import { holdsOn } from './vat-rules.js';

describe('the member states', () => {
  const count = (day: string) =>
    unionVatAreas.filter(
      (row) => row.area === 'union' && !['MC', 'XI'].includes(row.country) && holdsOn(row, isoDay(day)),
    ).length;

  // Number of member states after each enlargement and the withdrawal: europa.eu, country profiles; from memory.
  it.each([
    ['1994-12-31', 12],
    ['1995-01-01', 15],
    ['2004-05-01', 25],
    ['2007-01-01', 27],
    ['2013-07-01', 28],
    ['2020-12-31', 28],
    ['2021-01-01', 27],
    ['2026-01-01', 27],
  ])('on %s are %i, as far as VAT goes', (day, number) => {
    expect(count(day)).toBe(number);
  });
});
