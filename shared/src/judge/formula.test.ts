import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import type { DecimalInput } from '../measure/decimal.js';
import { evaluateFormula, readFormula } from './formula.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};
const result = (
  text: string,
  readings: Readonly<Record<string, readonly [DecimalInput, string]>>,
  unit: string,
): string => {
  const unitOf = Object.fromEntries(Object.entries(readings).map(([name, [, code]]) => [name, code]));
  const values = Object.fromEntries(Object.entries(readings).map(([name, [value]]) => [name, value]));
  return evaluateFormula(readFormula(text, unitOf, unit), values).toFixed();
};

describe('a characteristic worked out from others', () => {
  it.each<[string, Record<string, readonly [DecimalInput, string]>, string, string]>([
    ['u * i', { u: ['11.1', 'V'], i: ['1500', 'mA'] }, 'W', '16.65'],
    ['u / i', { u: ['59.3', 'mV'], i: [60, 'A'] }, 'mΩ', '0.988333333333'],
    [
      '100 * (ut * it) / (up * ip)',
      { ut: ['0.2', 'V'], it: [60, 'A'], up: ['11.1', 'V'], ip: ['1.5', 'A'] },
      '1',
      '72.0720720721',
    ],
    [
      '(ut * it) / (up * ip)',
      { ut: ['0.2', 'V'], it: [60, 'A'], up: ['11.1', 'V'], ip: ['1.5', 'A'] },
      '%',
      '72.0720720721',
    ],
    ['on * f', { on: ['5.3', 'µs'], f: [47, 'kHz'] }, '%', '24.91'],
    ['t2 - t1', { t2: [350, '°C'], t1: ['21.5', '°C'] }, 'K', '328.5'],
    ['max(a, b) - min(a, b)', { a: ['4.12', 'V'], b: ['4120', 'mV'] }, 'mV', '0'],
    ['abs(a - b)', { a: ['4.1', 'V'], b: ['4.12', 'V'] }, 'mV', '20'],
    ['u^2 / (r + 0.5 mΩ)', { u: ['0.1', 'V'], r: ['0.5', 'mΩ'] }, 'W', '10'],
    ['sqrt(p * r)', { p: [9, 'W'], r: [4, 'Ω'] }, 'V', '6'],
    ['20 log10(a / b)', { a: [10, 'V'], b: [1, 'V'] }, '1', '20'],
    ['-ln(exp(2)) + pi - pi', {}, '1', '-2'],
    ['1 / (2 pi f c)', { f: [50, 'Hz'], c: [1, 'µF'] }, 'kΩ', '3.18309886184'],
    ['c × t − 0.1 Ah', { c: ['2.5', 'A'], t: [1, 'h'] }, 'mAh', '2400'],
    ['m / n', { m: ['12.6', 'g'], n: [3, 'piece'] }, 'g', '4.2'],
    ['0.1 + 0.2', {}, '1', '0.3'],
    ['10% * a', { a: [5, 'V'] }, 'V', '0.5'],
    ['3', {}, '1', '3'],
  ])('%s', (text, readings, unit, expected) => {
    expect(result(text, readings, unit)).toBe(expected);
  });

  it('lets a reading’s name go before a unit of that name', () => {
    expect(result('V * A', { V: [2, 'V'], A: [3, 'A'] }, 'W')).toBe('6');
  });

  it.each<[string, string]>([
    ['', 'judge_formula_unreadable'],
    ['a +', 'judge_formula_unreadable'],
    ['(a', 'judge_formula_unreadable'],
    ['a b c +', 'judge_formula_unreadable'],
    ['a'.repeat(501), 'judge_formula_too_long'],
    ['x = a', 'judge_formula_forbidden'],
    ['f(x) = x', 'judge_formula_forbidden'],
    ['a.constructor', 'judge_formula_forbidden'],
    ['a["constructor"]', 'judge_formula_forbidden'],
    ['"text"', 'judge_formula_forbidden'],
    ['[1, 2]', 'judge_formula_forbidden'],
    ['{x: 1}', 'judge_formula_forbidden'],
    ['1:3', 'judge_formula_forbidden'],
    ['a ? 1 : 2', 'judge_formula_forbidden'],
    ['a; a', 'judge_formula_forbidden'],
    ['a == 1', 'judge_formula_forbidden'],
    ['a to mV', 'judge_formula_forbidden'],
    ['5!', 'judge_formula_forbidden'],
    ['5 mod 3', 'judge_formula_forbidden'],
    ['true', 'judge_formula_forbidden'],
    ['null', 'judge_formula_forbidden'],
    ['import(a)', 'judge_formula_forbidden'],
    ['evaluate("1")', 'judge_formula_forbidden'],
    ['random()', 'judge_formula_forbidden'],
    ['sqrt.constructor("return 1")', 'judge_formula_forbidden'],
    ['sqrt.constructor("return 1")()', 'judge_formula_unreadable'],
    ['b', 'judge_formula_unknown_name'],
    ['i', 'judge_formula_unknown_name'],
    ['e', 'judge_formula_unknown_name'],
    ['sqrt', 'judge_formula_unknown_name'],
    ['toString', 'judge_formula_unknown_name'],
    ['20 °C', 'judge_formula_unreadable'],
    ['20 degC', 'judge_formula_unknown_name'],
    ['a + 1', 'judge_formula_units'],
    ['a + 1 A', 'judge_formula_units'],
    ['a * 1 A', 'judge_formula_units'],
    ['5', 'judge_formula_units'],
    ['ln(a)', 'judge_formula_units'],
    ['2 ^ a', 'judge_formula_units'],
    ['max(a, 1)', 'judge_formula_units'],
    ['sqrt(a, a)', 'judge_formula_units'],
  ])('is refused as %p', (text, code) => {
    expect(codeOf(() => readFormula(text, { a: 'V' }, 'V'))).toBe(code);
  });

  it.each<[string, string, DecimalInput]>([
    ['1 / a', '1', 0],
    ['sqrt(a)', '1', -1],
    ['a ^ 0.5', '1', -1],
    ['ln(a)', '1', -1],
    ['ln(a)', '1', 0],
    ['10 ^ a', '1', 400],
    ['0 / a', '1', 0],
  ])('has no result: %s with %3$p', (text, unit, value) => {
    expect(codeOf(() => evaluateFormula(readFormula(text, { a: unit }, unit), { a: value }))).toBe(
      'judge_formula_no_result',
    );
  });

  it('has no result under a root of a negative voltage', () => {
    const formula = readFormula('sqrt(a) ^ 2', { a: 'V' }, 'V');
    expect(
      codeOf(() => evaluateFormula(readFormula('(a * a * a) ^ 0.5 / a ^ 0.5', { a: 'V' }, 'V'), { a: -4 })),
    ).toMatch(/^judge_formula/);
    expect(evaluateFormula(formula, { a: 4 }).toFixed()).toBe('4');
  });

  it('needs each of its readings, but no other', () => {
    const formula = readFormula('a * 2', { a: 'V', b: 'A' }, 'V');
    expect(codeOf(() => evaluateFormula(formula, { b: 1 }))).toBe('judge_formula_missing_reading');
    expect(evaluateFormula(formula, { a: '1.5', b: 1 }).toFixed()).toBe('3');
  });

  it('agrees with ordinary arithmetic, whatever the prefixes', () => {
    const volts = fc.double({ min: 0.001, max: 1000, noNaN: true });
    fc.assert(
      fc.property(
        volts,
        volts,
        fc.constantFrom('mV', 'V', 'kV'),
        fc.constantFrom('mA', 'A', 'µA'),
        (u, i, uUnit, iUnit) => {
          const scale: Readonly<Record<string, number>> = { mV: 1e-3, V: 1, kV: 1e3, mA: 1e-3, A: 1, µA: 1e-6 };
          const got = evaluateFormula(readFormula('u * i / 2 + u * i / 2', { u: uUnit, i: iUnit }, 'W'), {
            u: u.toFixed(6),
            i: i.toFixed(6),
          }).toNumber();
          const expected = Number(u.toFixed(6)) * (scale[uUnit] ?? 0) * Number(i.toFixed(6)) * (scale[iUnit] ?? 0);
          expect(Math.abs(got - expected)).toBeLessThanOrEqual(Math.abs(expected) * 1e-11);
        },
      ),
    );
  });

  it('never lets anything but an arithmetic fault out of any text', () => {
    const pieces = fc.array(
      fc.constantFrom(
        'a',
        '1',
        '2',
        '+',
        '-',
        '*',
        '/',
        '^',
        '(',
        ')',
        ',',
        'sqrt',
        'max',
        '.',
        '=',
        '"',
        '[',
        ']',
        'mV',
        ' ',
        'ln',
        'pi',
        ';',
        '{',
        '}',
        ':',
        '?',
        '!',
        "'",
      ),
      { maxLength: 12 },
    );
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string(),
          pieces.map((list) => list.join('')),
        ),
        (text) => {
          const read = attempt(() => evaluateFormula(readFormula(text, { a: 'V' }, 'V'), { a: 2 }));
          if (read.ok) expect(read.value.isFinite()).toBe(true);
          else expect(read.fault.code).toMatch(/^judge_formula_|^measure_/);
        },
      ),
      { numRuns: 500 },
    );
  });
});
