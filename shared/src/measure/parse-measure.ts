import { ArithmeticError, attempt } from '../errors/arithmetic-error.js';
import { Decimal } from './decimal.js';
import type { Dimension } from './dimension.js';
import { unitOf, units, type Unit } from './unit.js';

/** The sign between whole part and decimals: a point, or a comma where that is the custom. */
export type DecimalMark = '.' | ',';

/** A value with its unit, as it was written. */
export interface Measure {
  readonly value: Decimal;
  readonly unit: Unit;
}

/** How to read what was typed. */
export interface MeasureReading {
  readonly decimalMark: DecimalMark;
  /** What must have been measured; it also gives a bare number its unit. */
  readonly dimension?: Dimension | undefined;
  /** The unit of a number without one, if it is not the coherent unit of the dimension. */
  readonly unit?: Unit | undefined;
}

const coherentUnits: Readonly<Partial<Record<Dimension, string>>> = {
  count: 'piece',
  ratio: '1',
  length: 'm',
  area: 'm²',
  volume: 'm³',
  mass: 'kg',
  time: 's',
  frequency: 'Hz',
  temperature: 'K',
  voltage: 'V',
  current: 'A',
  resistance: 'Ω',
  capacitance: 'F',
  inductance: 'H',
  charge: 'C',
  power: 'W',
  energy: 'J',
  fluxDensity: 'T',
  flux: 'Wb',
  massPerLength: 'g/m',
  resistancePerLength: 'Ω/m',
  force: 'N',
  torque: 'Nm',
};

/**
 * Reads a number as people write it.
 *
 * @param text digits with the decimal mark; groups of three by the other mark, a space or an apostrophe let pass; a
 *   power of ten behind an e
 * @param decimalMark which mark separates the decimals
 * @returns the exact value
 * @throws ArithmeticError `measure_unreadable`
 */
export function parseNumber(text: string, decimalMark: DecimalMark): Decimal {
  const other = decimalMark === '.' ? ',' : '.';
  const group = `[${other}\\s\\u00A0\\u2009\\u202F'’]`;
  const form = new RegExp(
    `^([+\\-−]?)((?:\\d{1,3}(?:${group}\\d{3})+|\\d+)?)(?:[${decimalMark}](\\d*))?(?:[eE]([+\\-−]?\\d{1,2}))?$`,
  );
  const parts = form.exec(text.trim());
  const whole = parts?.[2]?.replace(/\D/g, '') ?? '';
  const decimals = parts?.[3] ?? '';
  if (!parts || whole + decimals === '') throw new ArithmeticError('measure_unreadable', { text });
  const sign = parts[1] === '' || parts[1] === '+' ? '' : '-';
  const power = Number((parts[4] ?? '0').replace('−', '-'));
  return new Decimal(`${sign}${whole || '0'}.${decimals || '0'}`).times(new Decimal(10).pow(power));
}

/**
 * Reads a measure: "2.5 mm²", "0.1 µF", "47k", "4k7", "R47", "1,5 kΩ".
 *
 * @param text number and unit, with or without a space; a letter may stand for the decimal mark (IEC 60062)
 * @param reading decimal mark, and what is expected
 * @returns value and unit as written, unconverted
 * @throws ArithmeticError `measure_unreadable`, `measure_unknown_unit`, `measure_unit_missing`,
 *   `measure_wrong_dimension`
 * Source of the letter code: IEC 60062:2016, clause 5.
 */
export function parseMeasure(text: string, reading: MeasureReading): Measure {
  const parts =
    /^\s*([+\-−]?(?:[\d.,\s\u00A0\u2009\u202F'’]*\d[eE][+\-−]?\d+|[\d.,\s\u00A0\u2009\u202F'’]*))(.*?)\s*$/su.exec(
      text,
    );
  const [, number = '', rest = ''] = parts ?? [];
  const measure = readCode(text, number, rest, reading) ?? {
    value: parseNumber(number, reading.decimalMark),
    unit: rest === '' ? bareUnit(text, reading) : unitOrPrefix(rest, reading),
  };
  const wanted = reading.dimension ?? reading.unit?.dimension;
  if (wanted !== undefined && measure.unit.dimension !== wanted) {
    throw new ArithmeticError('measure_wrong_dimension', { unit: measure.unit.code, wanted });
  }
  return measure;
}

/** "47k" where a resistance is expected is 47 kΩ; a lone m is a metre unless a thousandth of something is expected. */
function unitOrPrefix(rest: string, reading: MeasureReading): Unit {
  const wanted = reading.dimension ?? reading.unit?.dimension;
  const written = attempt(() => unitOf(rest));
  if (written.ok && (wanted === undefined || written.value.dimension === wanted)) return written.value;
  const bare = coherentUnit(reading);
  const prefix = rest.replace(/^[u\u03BC]$/, 'µ');
  return (bare && /^[pnµmkMG]$/.test(prefix) ? units.get(prefix + bare.code) : undefined) ?? unitOf(rest);
}

/** "4k7", "4R7", "R47", "1µ5F": the letter stands where the decimal mark would. */
function readCode(text: string, number: string, rest: string, reading: MeasureReading): Measure | undefined {
  const parts = /^([RpnuµmkMGVAFHL])(\d+)(\D*)$/u.exec(rest);
  if (!parts || !/^[+\-−]?\d*$/.test(number.trim())) return undefined;
  const [, letter = '', decimals = '', behind = ''] = parts;
  const sign = /^[-−]/.test(number) ? '-' : '';
  const value = new Decimal(`${sign}${number.replace(/\D/g, '') || '0'}.${decimals}`);
  if (letter === 'R') return { value, unit: unitOf('Ω') };
  if (/[VAFHL]/.test(letter)) return behind === '' ? { value, unit: unitOf(letter === 'L' ? 'H' : letter) } : undefined;
  const stem = behind === '' ? coherentUnit(reading) : unitOf(behind);
  if (!stem) throw new ArithmeticError('measure_unit_missing', { text });
  return { value, unit: unitOf(letter + stem.code) };
}

function bareUnit(text: string, reading: MeasureReading): Unit {
  const unit = reading.unit ?? coherentUnit(reading);
  if (!unit) throw new ArithmeticError('measure_unit_missing', { text });
  return unit;
}

function coherentUnit(reading: MeasureReading): Unit | undefined {
  const dimension = reading.dimension ?? reading.unit?.dimension;
  return dimension === undefined ? undefined : units.get(coherentUnits[dimension] ?? '');
}
