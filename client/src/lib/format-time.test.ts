import { beforeEach, describe, expect, it } from '@jest/globals';
import {
  formatDay,
  formatDayShort,
  formatInstant,
  formatPromise,
  formatRelative,
  setShopZone,
  shopDay,
} from './format-time';

beforeEach(() => setShopZone('Europe/Dublin'));

describe('a day', () => {
  it('is the same in every zone', () => {
    setShopZone('Pacific/Kiritimati');
    expect(formatDayShort('2026-12-03')).toBe('Thu 3 Dec');
    setShopZone('Pacific/Pago_Pago');
    expect(formatDayShort('2026-12-03')).toBe('Thu 3 Dec');
  });

  it('is written out where it is a promise', () => {
    expect(formatPromise('2026-12-10')).toBe('Thursday 10 December');
    expect(formatDay('2026-12-10')).toBe('10 December 2026');
  });
});

describe('an instant', () => {
  it('is shown in the zone of the shop', () => {
    expect(formatInstant('2026-07-01T12:00:00Z')).toContain('13:00:00');
    expect(formatInstant('2026-12-01T12:00:00Z')).toContain('12:00:00');
  });

  it('belongs to the day that the shop has then', () => {
    expect(shopDay('2026-06-30T23:30:00Z')).toBe('2026-07-01');
    expect(shopDay('2026-12-31T23:30:00Z')).toBe('2026-12-31');
  });

  it.each([
    ['2026-12-01T11:59:40Z', 'just now'],
    ['2026-12-01T11:56:00Z', '4 minutes ago'],
    ['2026-12-04T12:00:00Z', 'in 3 days'],
    ['2026-11-30T12:00:00Z', 'yesterday'],
  ])('%s is %s', (instant, words) => {
    expect(formatRelative(instant, '2026-12-01T12:00:00Z')).toBe(words);
  });
});
