import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { convertMeasure } from './convert-measure.js';
import { Decimal } from './decimal.js';
import { dimensions, type Dimension, type Exponents } from './dimension.js';
import { stockMeasureCodes } from './stock-measures.js';
import { unitOf, units } from './unit.js';

const convert = (value: string, from: string, to: string) => convertMeasure(value, unitOf(from), unitOf(to)).toFixed();
const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('units', () => {
  it.each([
    ['uF', 'µF'],
    ['μF', 'µF'],
    ['mm2', 'mm²'],
    ['mm^2', 'mm²'],
    ['kohm', 'kΩ'],
    ['M\u2126', 'MΩ'],
    ['mOhm', 'mΩ'],
    ['degC', '°C'],
    ['pcs', 'piece'],
    [' mAh ', 'mAh'],
    ['us', 'µs'],
    ['u\u03A9', 'µΩ'],
    ['um', 'µm'],
  ])('%p is %s', (written, code) => {
    expect(unitOf(written).code).toBe(code);
  });

  it.each(['', 'foo', 'kpiece', 'MHZ', 'toString', 'mmm', 'm4'])('%p is none', (written) => {
    expect(codeOf(() => unitOf(written))).toBe('measure_unknown_unit');
  });

  it('keep capital and small letters apart', () => {
    expect(convert('1', 'MΩ', 'mΩ')).toBe('1000000000');
    expect(unitOf('MW').factor.div(unitOf('mW').factor).toFixed()).toBe('1000000000');
  });

  it('hold every stock measure and every reading unit of the shop', () => {
    for (const code of stockMeasureCodes) expect(unitOf(code).code).toBe(code);
    const readings = 'V mV A mA Ω mΩ MΩ Hz kHz °C s ms µs ns H µH W Wh % K min h mm g kg mAh Ah F nF T mT';
    for (const code of readings.split(' ')) expect(unitOf(code).code).toBe(code);
  });

  it('are each written in one way only', () => {
    for (const unit of units.values()) expect(unitOf(unit.code)).toBe(unit);
  });
});

describe('dimensions', () => {
  const product = (...names: readonly Dimension[]) =>
    names
      .map((name): Exponents => dimensions[name])
      .reduce((left, right) => ({
        length: left.length + right.length,
        mass: left.mass + right.mass,
        time: left.time + right.time,
        current: left.current + right.current,
        temperature: left.temperature + right.temperature,
        count: left.count + right.count,
      }));

  it('hang together as physics says', () => {
    expect(product('voltage', 'current')).toEqual(dimensions.power);
    expect(product('resistance', 'current')).toEqual(dimensions.voltage);
    expect(product('power', 'time')).toEqual(dimensions.energy);
    expect(product('current', 'time')).toEqual(dimensions.charge);
    expect(product('capacitance', 'voltage')).toEqual(dimensions.charge);
    expect(product('inductance', 'current')).toEqual(dimensions.flux);
    expect(product('fluxDensity', 'area')).toEqual(dimensions.flux);
    expect(product('frequency', 'time')).toEqual(dimensions.ratio);
    expect(product('force', 'length')).toEqual(dimensions.torque);
    expect(product('voltage', 'time')).toEqual(dimensions.flux);
    expect(product('resistancePerLength', 'length')).toEqual(dimensions.resistance);
    expect(product('massPerLength', 'length')).toEqual(dimensions.mass);
    expect(product('area', 'length')).toEqual(dimensions.volume);
  });
});

describe('conversion', () => {
  it.each([
    ['2.5', 'mm²', 'm²', '0.0000025'],
    ['1', 'l', 'cm³', '1000'],
    ['3.6', 'Wh', 'J', '12960'],
    ['2500', 'mAh', 'Ah', '2.5'],
    ['1', 'Ah', 'C', '3600'],
    ['350', '°C', 'K', '623.15'],
    ['-273.15', '°C', 'K', '0'],
    ['1', 'in', 'mm', '25.4'],
    ['40', 'mil', 'mm', '1.016'],
    ['25', '%', '1', '0.25'],
    ['90', 'min', 'h', '1.5'],
    ['1', 'pair', 'piece', '2'],
    ['20.95', 'Ω/km', 'mΩ/m', '20.95'],
  ])('%s %s is %4$s %3$s', (value, from, to, expected) => {
    expect(convert(value, from, to)).toBe(expected);
  });

  it('refuses another dimension, even one of equal exponents', () => {
    expect(codeOf(() => convert('1', 'V', 'A'))).toBe('measure_wrong_dimension');
    expect(codeOf(() => convert('1', 'J', 'Nm'))).toBe('measure_wrong_dimension');
  });

  it('comes back exactly, through any unit of the same dimension', () => {
    const all = [...units.values()];
    const pairs = all.flatMap((from) =>
      all.filter((to) => to.dimension === from.dimension).map((to) => [from, to] as const),
    );
    fc.assert(
      fc.property(
        fc.constantFrom(...pairs),
        fc.integer(),
        fc.integer({ min: 0, max: 6 }),
        ([from, to], digits, places) => {
          const value = new Decimal(digits).div(new Decimal(10).pow(places));
          expect(
            convertMeasure(convertMeasure(value, from, to), to, from)
              .minus(value)
              .abs()
              .lessThan('1e-20'),
          ).toBe(true);
        },
      ),
    );
  });
});
