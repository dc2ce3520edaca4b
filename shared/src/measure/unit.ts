import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal } from './decimal.js';
import type { Dimension } from './dimension.js';

declare const unitCodeBrand: unique symbol;

/** A unit as it is written and stored: its symbol, with µ (U+00B5) and Ω (U+03A9), for example "mΩ" or "mm²". */
export type UnitCode = string & { readonly [unitCodeBrand]: true };

/** A unit of measure. */
export interface Unit {
  readonly code: UnitCode;
  readonly dimension: Dimension;
  /** One unit in coherent units of the SI (metre, kilogram, second …); exact. */
  readonly factor: Decimal;
  /** Kelvin at zero of the unit, for temperatures; zero for all others. */
  readonly offset: Decimal;
  /** The unit without its prefix, if it takes prefixes. */
  readonly stem?: UnitCode;
  /** Power of ten of the prefix; zero without one. */
  readonly prefixPower: number;
}

const prefixPowers = { p: -12, n: -9, µ: -6, m: -3, c: -2, '': 0, k: 3, M: 6, G: 9 } as const;

type Prefix = keyof typeof prefixPowers;

interface Stem {
  readonly symbol: string;
  readonly dimension: Dimension;
  readonly factor: string;
  readonly prefixes: readonly Prefix[];
  /** Power that the prefix is raised to: 2 for areas. */
  readonly power?: number;
  readonly offset?: string;
}

const none: readonly Prefix[] = [''];
const electric: readonly Prefix[] = ['p', 'n', 'µ', 'm', '', 'k', 'M', 'G'];

/** Every unit with the prefixes it is used with. Sources: SI brochure, 9th edition, 2019, tables 2, 4, 7 and 8. */
const stems: readonly Stem[] = [
  { symbol: 'piece', dimension: 'count', factor: '1', prefixes: none },
  { symbol: 'set', dimension: 'count', factor: '1', prefixes: none },
  { symbol: 'pair', dimension: 'count', factor: '2', prefixes: none },
  { symbol: '1', dimension: 'ratio', factor: '1', prefixes: none },
  { symbol: '%', dimension: 'ratio', factor: '0.01', prefixes: none },
  { symbol: 'ppm', dimension: 'ratio', factor: '0.000001', prefixes: none },
  { symbol: 'm', dimension: 'length', factor: '1', prefixes: ['n', 'µ', 'm', 'c', '', 'k'] },
  { symbol: 'in', dimension: 'length', factor: '0.0254', prefixes: none },
  { symbol: 'mil', dimension: 'length', factor: '0.0000254', prefixes: none },
  { symbol: 'm²', dimension: 'area', factor: '1', prefixes: ['m', 'c', ''], power: 2 },
  { symbol: 'm³', dimension: 'volume', factor: '1', prefixes: ['m', 'c', ''], power: 3 },
  { symbol: 'l', dimension: 'volume', factor: '0.001', prefixes: ['µ', 'm', 'c', ''] },
  { symbol: 'g', dimension: 'mass', factor: '0.001', prefixes: ['µ', 'm', '', 'k'] },
  { symbol: 't', dimension: 'mass', factor: '1000', prefixes: none },
  { symbol: 's', dimension: 'time', factor: '1', prefixes: ['p', 'n', 'µ', 'm', ''] },
  { symbol: 'min', dimension: 'time', factor: '60', prefixes: none },
  { symbol: 'h', dimension: 'time', factor: '3600', prefixes: none },
  { symbol: 'd', dimension: 'time', factor: '86400', prefixes: none },
  { symbol: 'Hz', dimension: 'frequency', factor: '1', prefixes: ['m', '', 'k', 'M', 'G'] },
  { symbol: 'K', dimension: 'temperature', factor: '1', prefixes: ['m', ''] },
  { symbol: '°C', dimension: 'temperature', factor: '1', prefixes: none, offset: '273.15' },
  { symbol: 'V', dimension: 'voltage', factor: '1', prefixes: electric },
  { symbol: 'A', dimension: 'current', factor: '1', prefixes: electric },
  { symbol: 'Ω', dimension: 'resistance', factor: '1', prefixes: electric },
  { symbol: 'F', dimension: 'capacitance', factor: '1', prefixes: electric },
  { symbol: 'H', dimension: 'inductance', factor: '1', prefixes: electric },
  { symbol: 'C', dimension: 'charge', factor: '1', prefixes: electric },
  { symbol: 'Ah', dimension: 'charge', factor: '3600', prefixes: ['m', ''] },
  { symbol: 'W', dimension: 'power', factor: '1', prefixes: electric },
  { symbol: 'J', dimension: 'energy', factor: '1', prefixes: electric },
  { symbol: 'Wh', dimension: 'energy', factor: '3600', prefixes: ['m', '', 'k'] },
  { symbol: 'T', dimension: 'fluxDensity', factor: '1', prefixes: ['µ', 'm', ''] },
  { symbol: 'Wb', dimension: 'flux', factor: '1', prefixes: ['n', 'µ', 'm', ''] },
  { symbol: 'g/m', dimension: 'massPerLength', factor: '0.001', prefixes: none },
  { symbol: 'kg/km', dimension: 'massPerLength', factor: '0.001', prefixes: none },
  { symbol: 'Ω/m', dimension: 'resistancePerLength', factor: '1', prefixes: ['m', ''] },
  { symbol: 'Ω/km', dimension: 'resistancePerLength', factor: '0.001', prefixes: none },
  { symbol: 'N', dimension: 'force', factor: '1', prefixes: ['m', '', 'k'] },
  { symbol: 'Nm', dimension: 'torque', factor: '1', prefixes: ['m', 'c', ''] },
];

function unitsOf(stem: Stem): readonly Unit[] {
  return stem.prefixes.map((prefix): Unit => {
    const prefixPower = prefixPowers[prefix];
    return {
      code: (prefix + stem.symbol) as UnitCode,
      dimension: stem.dimension,
      factor: new Decimal(10).pow(prefixPower * (stem.power ?? 1)).times(stem.factor),
      offset: new Decimal(stem.offset ?? 0),
      ...(stem.prefixes.length > 1 && { stem: stem.symbol as UnitCode }),
      prefixPower,
    };
  });
}

/** Every unit by its code. */
export const units: ReadonlyMap<string, Unit> = new Map(stems.flatMap(unitsOf).map((unit) => [unit.code, unit]));

/** Other ways to write a unit: after letters that look alike, powers and words were brought to one form. */
const otherNames: Readonly<Record<string, string>> = {
  ohm: 'Ω',
  Ohm: 'Ω',
  ohms: 'Ω',
  R: 'Ω',
  mohm: 'mΩ',
  mOhm: 'mΩ',
  kohm: 'kΩ',
  kOhm: 'kΩ',
  Mohm: 'MΩ',
  MOhm: 'MΩ',
  degC: '°C',
  '℃': '°C',
  ºC: '°C',
  L: 'l',
  mL: 'ml',
  µL: 'µl',
  pcs: 'piece',
  pc: 'piece',
  pieces: 'piece',
  sets: 'set',
  pairs: 'pair',
  hr: 'h',
  sec: 's',
  '"': 'in',
  inch: 'in',
  inches: 'in',
  khz: 'kHz',
  KHz: 'kHz',
  hz: 'Hz',
  'N·m': 'Nm',
  'A·h': 'Ah',
  'W·h': 'Wh',
};

/**
 * Finds a unit by what somebody wrote. Capital and small letters matter (mΩ is not MΩ); a u for µ, the sign for micro
 * or omega from another block, `^2` for ² and the usual words let pass.
 *
 * @param text the unit alone, for example "uF", "mm2", "kohm"
 * @returns the unit
 * @throws ArithmeticError `measure_unknown_unit`
 */
export function unitOf(text: string): Unit {
  const written = text
    .trim()
    .replace(/\u03BC/g, '\u00B5')
    .replace(/\u2126/g, '\u03A9')
    .replace(/\^?([23])$/, (_whole, power: string) => (power === '2' ? '²' : '³'))
    .replace(/^u(?=[A-Za-z\u03A9])/, '\u00B5');
  const unit = units.get(written) ?? units.get(Object.hasOwn(otherNames, written) ? (otherNames[written] ?? '') : '');
  if (!unit) throw new ArithmeticError('measure_unknown_unit', { unit: text });
  return unit;
}
