import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { isoDay } from '../plan/iso-day.js';
import { weeksInYear } from '../plan/iso-week.js';
import { readSerialNumber, serialNumber, serialNumberOn } from './serial-number.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

const parts = fc
  .record({
    product: fc.stringMatching(/^[A-Z]{2,3}$/),
    year: fc.integer({ min: 2000, max: 2099 }),
    week: fc.integer({ min: 1, max: 53 }),
    running: fc.oneof(fc.integer({ min: 1, max: 9999 }), fc.integer({ min: 10_000, max: 9_999_999 })),
  })
  .filter(({ year, week }) => week <= weeksInYear(year));

/** The digits of a serial number with their places, so that a test can spoil them. */
const digitPlaces = (text: string) =>
  Array.from(text).flatMap((character, place) => (/\d/.test(character) ? [place] : []));
const withDigits = (text: string, changes: Readonly<Record<number, string>>) =>
  Array.from(text)
    .map((character, place) => changes[place] ?? character)
    .join('');

describe('serial numbers', () => {
  it('are written with the ISO week of their day and two check digits', () => {
    // 26480093 × 100 mod 97 = 92, and 98 − 92 = 06: worked out by hand.
    expect(serialNumberOn('WR', isoDay('2026-11-27'), 93)).toBe('WR-2648-0093-06');
    expect(serialNumberOn('HRN', isoDay('2027-01-01'), 12_345)).toMatch(/^HRN-2653-12345-\d\d$/);
  });

  it.each(['WR-2648-0093-06', 'wr-2648-0093-06', ' WR 2648 0093 06 ', 'wr2648009306', 'WR–2648—0093‑06'])(
    'are read from %p',
    (typed) => {
      expect(readSerialNumber(typed)).toEqual({
        text: 'WR-2648-0093-06',
        product: 'WR',
        year: 2026,
        week: 48,
        running: 93,
      });
    },
  );

  it.each([
    ['', 'serial_unreadable'],
    ['W-2648-0093-06', 'serial_unreadable'],
    ['WREN-2648-0093-06', 'serial_unreadable'],
    ['WR-2648-093-06', 'serial_unreadable'],
    ['WR-2648-00093-06', 'serial_unreadable'],
    ['WR-2648-0093-0O', 'serial_unreadable'],
    ['WR/2648/0093/06', 'serial_unreadable'],
    ['ÄR-2648-0093-06', 'serial_unreadable'],
    ['WR-2648-0093-07', 'serial_check_digits'],
    ['WR-2648-0039-06', 'serial_check_digits'],
    ['WR-2684-0093-06', 'serial_check_digits'],
    // The right check digits for a week and a running number that do not exist: 97-10 worked out by hand.
    ['WR-2554-0001-07', 'serial_no_such_week'],
    ['WR-2648-0000-91', 'serial_running_number'],
  ])('refuse %p', (typed, code) => {
    expect(codeOf(() => readSerialNumber(typed))).toBe(code);
  });

  it.each([
    [{ product: 'wr' }, 'serial_product_letters'],
    [{ product: 'WRAB' }, 'serial_product_letters'],
    [{ year: 1999 }, 'serial_year'],
    [{ year: 2100 }, 'serial_year'],
    [{ week: 0 }, 'serial_no_such_week'],
    [{ year: 2025, week: 53 }, 'serial_no_such_week'],
    [{ week: 1.5 }, 'serial_no_such_week'],
    [{ running: 0 }, 'serial_running_number'],
    [{ running: 10_000_000 }, 'serial_running_number'],
    [{ running: NaN }, 'serial_running_number'],
  ])('cannot be written with %p', (wrong, code) => {
    expect(codeOf(() => serialNumber({ product: 'WR', year: 2026, week: 48, running: 93, ...wrong }))).toBe(code);
  });

  it('read back what was written', () => {
    fc.assert(
      fc.property(parts, (given) => {
        const text = serialNumber(given);
        expect(readSerialNumber(text)).toEqual({ ...given, text });
      }),
    );
  });

  it('refuse every single wrong digit', () => {
    fc.assert(
      fc.property(parts, (given) => {
        const text = serialNumber(given);
        for (const place of digitPlaces(text)) {
          for (const digit of '0123456789') {
            if (digit === text[place]) continue;
            expect(codeOf(() => readSerialNumber(withDigits(text, { [place]: digit })))).toBeDefined();
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  it('refuse every swap of two digits, neighbours or not', () => {
    fc.assert(
      fc.property(parts, (given) => {
        const text = serialNumber(given);
        const places = digitPlaces(text);
        for (const first of places) {
          for (const second of places.filter((place) => place > first && text[place] !== text[first])) {
            const swapped = withDigits(text, { [first]: text[second] ?? '', [second]: text[first] ?? '' });
            expect(codeOf(() => readSerialNumber(swapped))).toBeDefined();
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  it('do not notice a wrong product letter, nor every fault in several digits', () => {
    expect(readSerialNumber('HR-2648-0093-06').product).toBe('HR');
    const others = Array.from({ length: 9999 }, (_, index) => String(index + 1).padStart(4, '0')).filter(
      (running) => running !== '0093' && codeOf(() => readSerialNumber(`WR-2648-${running}-06`)) === undefined,
    );
    expect(others).toHaveLength(102);
  });
});
