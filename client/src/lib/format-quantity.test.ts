import { describe, expect, it } from '@jest/globals';
import { formatCount, formatQuantity, formatReading } from './format-quantity';

const plain = (text: string): string => text.replaceAll('\u00a0', ' ');

describe('a quantity', () => {
  it('is shown without idle zeros, with its unit', () => {
    expect(plain(formatQuantity('41.200000', 'm'))).toBe('41.2 m');
    expect(plain(formatQuantity('81.000000', 'pair'))).toBe('81 pair');
  });

  it('is filled up where figures line up, and never rounded', () => {
    expect(plain(formatQuantity('41.2', 'm', 2))).toBe('41.20 m');
    expect(plain(formatQuantity('41.234567', 'm', 2))).toBe('41.234567 m');
  });
});

describe('a reading', () => {
  it('keeps the digits its instrument gave', () => {
    expect(plain(formatReading('1.040', 'mΩ'))).toBe('1.040 mΩ');
  });
});

describe('a count', () => {
  it('is said in words that fit', () => {
    expect(formatCount(0, 'part')).toBe('no parts');
    expect(plain(formatCount(1, 'part'))).toBe('1 part');
    expect(plain(formatCount(1240, 'entry', 'entries'))).toBe('1,240 entries');
  });
});
