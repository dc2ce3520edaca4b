import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { Decimal } from './decimal.js';
import type { Dimension } from './dimension.js';
import { formatEngineering, formatNumber } from './format-measure.js';
import { parseMeasure, parseNumber, type DecimalMark } from './parse-measure.js';
import { unitOf } from './unit.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};
const read = (text: string, decimalMark: DecimalMark = '.', dimension?: Dimension) => {
  const { value, unit } = parseMeasure(text, { decimalMark, dimension });
  return `${value.toFixed()} ${unit.code}`;
};

describe('reading a number', () => {
  it.each<[string, DecimalMark, string]>([
    ['1234.5', '.', '1234.5'],
    ['1,234.5', '.', '1234.5'],
    ['1.234,5', ',', '1234.5'],
    ['1 234 567', '.', '1234567'],
    ['1\u202F234,50', ',', '1234.5'],
    ["1'234.5", '.', '1234.5'],
    ['-0,5', ',', '-0.5'],
    ['−3', '.', '-3'],
    ['+.5', '.', '0.5'],
    ['5.', '.', '5'],
    ['1.5e-3', '.', '0.0015'],
    ['0', '.', '0'],
  ])('%p with %p is %s', (text, mark, value) => {
    expect(parseNumber(text, mark).toFixed()).toBe(value);
  });

  it.each<[string, DecimalMark]>([
    ['', '.'],
    ['.', '.'],
    ['-', '.'],
    ['1,5', '.'],
    ['1.5', ','],
    ['1,23,456', '.'],
    ['12,3456', '.'],
    ['1.2.3', '.'],
    ['--1', '.'],
    ['1e999', '.'],
    ['0x10', '.'],
    ['NaN', '.'],
  ])('%p with %p is none', (text, mark) => {
    expect(codeOf(() => parseNumber(text, mark))).toBe('measure_unreadable');
  });
});

describe('reading a measure', () => {
  it.each<[string, string]>([
    ['2.5 mm²', '2.5 mm²'],
    ['0.1 µF', '0.1 µF'],
    ['0.1uF', '0.1 µF'],
    ['1 000 V', '1000 V'],
    ['-40°C', '-40 °C'],
    ['12', ''],
    ['4R7', '4.7 Ω'],
    ['R47', '0.47 Ω'],
    ['3V3', '3.3 V'],
    ['2m', '2 m'],
    ['1e3 Hz', '1000 Hz'],
    ['4k7 ohm', '4.7 kΩ'],
    ['1µ5F', '1.5 µF'],
    ['10 %', '10 %'],
  ])('%p is %p', (text, expected) => {
    if (expected === '') expect(codeOf(() => read(text))).toBe('measure_unit_missing');
    else expect(read(text)).toBe(expected);
  });

  it.each<[string, Dimension, string]>([
    ['47k', 'resistance', '47 kΩ'],
    ['4k7', 'resistance', '4.7 kΩ'],
    ['-4k7', 'resistance', '-4.7 kΩ'],
    ['100n', 'capacitance', '100 nF'],
    ['2u2', 'capacitance', '2.2 µF'],
    ['5m', 'length', '5 m'],
    ['5m', 'resistance', '5 mΩ'],
    ['47', 'frequency', '47 Hz'],
    ['12', 'mass', '12 kg'],
  ])('%p where a %s is expected is %s', (text, dimension, expected) => {
    expect(read(text, '.', dimension)).toBe(expected);
  });

  it('takes a decimal comma where that is the custom', () => {
    expect(read('1,5 kΩ', ',')).toBe('1.5 kΩ');
    expect(read('1.500 kΩ', ',')).toBe('1500 kΩ');
    expect(codeOf(() => read('1,5 kΩ'))).toBe('measure_unreadable');
  });

  it('gives a bare number the unit of its field', () => {
    const { value, unit } = parseMeasure('46.5', { decimalMark: '.', unit: unitOf('kHz') });
    expect([value.toFixed(), unit.code]).toEqual(['46.5', 'kHz']);
    expect(codeOf(() => parseMeasure('46.5 V', { decimalMark: '.', unit: unitOf('kHz') }))).toBe(
      'measure_wrong_dimension',
    );
  });

  it.each<[string, Dimension | undefined, string]>([
    ['', undefined, 'measure_unreadable'],
    ['V', undefined, 'measure_unreadable'],
    ['5 foo', undefined, 'measure_unknown_unit'],
    ['4k7', undefined, 'measure_unit_missing'],
    ['5 V', 'current', 'measure_wrong_dimension'],
    ['5 V V', undefined, 'measure_unknown_unit'],
    ['OL', 'resistance', 'measure_unreadable'],
  ])('refuses %p', (text, dimension, code) => {
    expect(codeOf(() => read(text, '.', dimension))).toBe(code);
  });

  it('never breaks on any text', () => {
    fc.assert(
      fc.property(fc.string(), fc.constantFrom('.', ','), (text, mark) => {
        const result = attempt(() => parseMeasure(text, { decimalMark: mark }));
        if (result.ok) expect(result.value.value.isFinite()).toBe(true);
        else expect(result.fault.code).toMatch(/^measure_/);
      }),
    );
  });
});

describe('writing a number', () => {
  it.each<[string, number | undefined, string]>([
    ['1234.5', undefined, '1234.5'],
    ['12345.678', 2, '12\u202F345.68'],
    ['1234567', 0, '1\u202F234\u202F567'],
    ['-0.004', 2, '0.00'],
    ['-0.5', 1, '−0.5'],
    ['0.125', 2, '0.12'],
    ['0.135', 2, '0.14'],
  ])('%s with %p decimals', (value, decimals, text) => {
    expect(formatNumber(value, { decimalMark: '.', grouped: true }, decimals)).toBe(text);
  });

  it('with a comma', () => {
    expect(formatNumber('12345.6', { decimalMark: ',' })).toBe('12345,6');
  });
});

describe('writing in engineering notation', () => {
  it.each<[string, string, number, string]>([
    ['47000', 'Hz', 3, '47.0 kHz'],
    ['0.0025', 'Ω', 3, '2.50 mΩ'],
    ['999.4', 'mA', 3, '999 mA'],
    ['999.6', 'mA', 3, '1.00 A'],
    ['0.00000022', 'F', 2, '220 nF'],
    ['0', 'V', 3, '0.00 V'],
    ['-12.345', 'V', 4, '−12.34 V'],
    ['350', '°C', 3, '350 °C'],
    ['1500', 'g', 2, '1.5 kg'],
    ['1500000', 'g', 3, '1500 kg'],
    ['0.0000000000000005', 'F', 2, '0.00050 pF'],
    ['3', 'cm', 2, '30 mm'],
    ['95', '%', 3, '95.0 %'],
    ['123456', 'Hz', 2, '120 kHz'],
  ])('%s %s with %i digits is %s', (value, unit, digits, text) => {
    expect(formatEngineering(value, unitOf(unit), digits).replace('\u00A0', ' ')).toBe(text);
  });

  it('is read back as the value rounded to its digits', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -999_999, max: 999_999 }),
        fc.integer({ min: -9, max: 6 }),
        fc.constantFrom('V', 'mΩ', 'kHz', 'µF', 'mAh', '°C', 'g', 'cm'),
        fc.integer({ min: 1, max: 6 }),
        (digits, power, code, significant) => {
          const value = new Decimal(digits).times(new Decimal(10).pow(power));
          const unit = unitOf(code);
          const back = parseMeasure(formatEngineering(value, unit, significant), { decimalMark: '.', unit });
          const rounded = value.toSignificantDigits(significant, Decimal.ROUND_HALF_EVEN);
          expect(back.value.times(back.unit.factor).equals(rounded.times(unit.factor))).toBe(true);
        },
      ),
    );
  });
});
