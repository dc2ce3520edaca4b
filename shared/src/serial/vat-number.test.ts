import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { readVatNumber, vatNumberPrefixes } from './vat-number.js';

const codeOf = (typed: string) => {
  const result = attempt(() => readVatNumber(typed));
  return result.ok ? undefined : result.fault.code;
};

describe('reading a VAT number', () => {
  it('gives its one written form and its country as tax rules name it', () => {
    expect(readVatNumber(' gr 094012834 ')).toEqual({
      text: 'EL094012834',
      prefix: 'EL',
      country: 'GR',
      number: '094012834',
    });
    expect(readVatNumber('BE 444.503.092').text).toBe('BE0444503092');
    expect(readVatNumber('ie 6433435-oa').country).toBe('IE');
  });

  it('takes Northern Ireland, but not the rest of the kingdom', () => {
    expect(readVatNumber('XI 980 7806 84').country).toBe('XI');
    expect(codeOf('GB980780684')).toBe('serial_vat_country');
  });

  it('takes Belgian numbers that begin with 1', () => {
    // Constructed: 10000004 mod 97 = 80, and 97 − 80 = 17.
    expect(readVatNumber('BE1000000417').text).toBe('BE1000000417');
    expect(codeOf('BE1000000418')).toBe('serial_vat_number');
    expect(codeOf('BE2000000834')).toBe('serial_vat_number');
    expect(codeOf('BE0000000097')).toBe('serial_vat_number');
  });

  it.each([
    ['', 'serial_vat_unreadable'],
    ['136695976', 'serial_vat_unreadable'],
    ['DE', 'serial_vat_unreadable'],
    ['DE13669597600000000', 'serial_vat_unreadable'],
    ['US123456789', 'serial_vat_country'],
    ['toString', 'serial_vat_country'],
    ['DE136695978', 'serial_vat_number'],
    ['DE1366959760', 'serial_vat_number'],
  ])('refuses %p', (typed, code) => {
    expect(codeOf(typed)).toBe(code);
  });

  it('knows the prefixes of the 27 states and of Northern Ireland', () => {
    expect(vatNumberPrefixes).toHaveLength(28);
  });

  it('never breaks on any text', () => {
    fc.assert(
      fc.property(fc.constantFrom(...vatNumberPrefixes), fc.string({ maxLength: 15 }), (prefix, rest) => {
        expect([undefined, 'serial_vat_unreadable', 'serial_vat_number']).toContain(codeOf(prefix + rest));
      }),
    );
  });
});
