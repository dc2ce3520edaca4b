import type { EvalFunction, Unit as MathUnit } from 'mathjs';
import { ArithmeticError, attempt } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from '../measure/decimal.js';
import type { Dimension } from '../measure/dimension.js';
import { unitOf, type Unit } from '../measure/unit.js';
import { checkFormula, namesIn } from './formula-grammar.js';
import { math } from './formula-library.js';

/** A characteristic that is worked out from others, for example power from voltage and current. */
export interface Formula {
  /** As it was written. */
  readonly text: string;
  /** Readings it needs, each with its unit. */
  readonly readings: ReadonlyMap<string, Unit>;
  /** Unit of the result. */
  readonly unit: Unit;
  /** Names in the text: readings, units, pi. */
  readonly names: readonly string[];
  /** The library's compiled form. */
  readonly compiled: EvalFunction;
}

/** Coherent units under the names of the library; what has no dimension is a plain number there. */
const coherent: Readonly<Record<Dimension, string | undefined>> = {
  count: undefined,
  ratio: undefined,
  length: 'm',
  area: 'm^2',
  volume: 'm^3',
  mass: 'kg',
  time: 's',
  frequency: 'Hz',
  temperature: 'K',
  voltage: 'V',
  current: 'A',
  resistance: 'ohm',
  capacitance: 'F',
  inductance: 'H',
  charge: 'C',
  power: 'W',
  energy: 'J',
  fluxDensity: 'T',
  flux: 'Wb',
  massPerLength: 'kg/m',
  resistancePerLength: 'ohm/m',
  force: 'N',
  torque: 'N m',
};

/**
 * Reads a formula and checks it: only numbers, readings, units, + − * / ^, brackets, pi, and the functions sqrt, abs,
 * min, max, exp, ln and log10; and units that fit together and give the unit of the result.
 *
 * @param text for example "100 * (tip_voltage * tip_current) / (pack_voltage * pack_current)"; a unit may stand behind a
 *   number ("0.5 mΩ")
 * @param readings names (letters, digits, underscore) with the unit each reading is given in
 * @param unit unit of the result
 * @returns the formula, ready for {@link evaluateFormula}
 * @throws ArithmeticError `judge_formula_unreadable`, `judge_formula_too_long`, `judge_formula_forbidden`,
 *   `judge_formula_unknown_name`, `judge_formula_units`, `measure_unknown_unit`
 */
export function readFormula(text: string, readings: Readonly<Record<string, string>>, unit: string): Formula {
  const node = checkFormula(text);
  const formula: Formula = {
    text,
    readings: new Map(Object.entries(readings).map(([name, code]) => [name, unitOf(code)])),
    unit: unitOf(unit),
    names: namesIn(node),
    compiled: node.compile(),
  };
  // Odd values, so that no difference is zero by chance; only the units matter in this trial.
  const trial = [...formula.readings.keys()].map((name, index) => [name, new Decimal(index + 2).sqrt()] as const);
  const result = attempt(() => evaluateFormula(formula, Object.fromEntries(trial)));
  if (!result.ok && result.fault.code !== 'judge_formula_no_result') throw result.fault;
  return formula;
}

/**
 * Works out a formula. Temperatures enter and leave as points on the scale (their differences are kelvin).
 *
 * @param formula from {@link readFormula}
 * @param values readings by name, each in its unit
 * @returns the result in the formula's unit, to 12 significant digits, which leaves binary noise out
 * @throws ArithmeticError `judge_formula_missing_reading`, `judge_formula_no_result`; as {@link readFormula}
 */
export function evaluateFormula(formula: Formula, values: Readonly<Record<string, DecimalInput>>): Decimal {
  // The natural logarithm, which the library calls log.
  const scope = new Map<string, unknown>([['ln', (value: number) => math.log(value)]]);
  for (const name of formula.names) scope.set(name, valueOfName(name, formula, values));
  const result = numberInUnit(evaluated(formula, scope), formula);
  if (!Number.isFinite(result)) throw new ArithmeticError('judge_formula_no_result');
  const base = new Decimal(result);
  const target = formula.unit;
  return base.minus(target.offset).div(target.factor).toSignificantDigits(12);
}

function valueOfName(name: string, formula: Formula, values: Readonly<Record<string, DecimalInput>>): unknown {
  const unit = formula.readings.get(name);
  if (unit) {
    const value = Object.hasOwn(values, name) ? values[name] : undefined;
    if (value === undefined) throw new ArithmeticError('judge_formula_missing_reading', { name });
    return inCoherentUnit(decimal(value), unit);
  }
  if (name === 'pi') return Math.PI;
  const written = attempt(() => unitOf(name));
  // A temperature behind a number would be a point or a difference; nobody can tell which.
  if (!written.ok || written.value.code === '°C') throw new ArithmeticError('judge_formula_unknown_name', { name });
  return inCoherentUnit(new Decimal(1), written.value);
}

function inCoherentUnit(value: Decimal, unit: Unit): number | MathUnit {
  const base = value.times(unit.factor).plus(unit.offset).toNumber();
  const name = coherent[unit.dimension];
  return name === undefined ? base : math.unit(base, name);
}

function evaluated(formula: Formula, scope: Map<string, unknown>): unknown {
  try {
    return formula.compiled.evaluate(scope) as unknown;
  } catch (error) {
    // The library throws on units that do not add up, and on nothing else that the grammar lets through.
    if (error instanceof Error) throw new ArithmeticError('judge_formula_units', { unit: formula.unit.code });
    throw error;
  }
}

function numberInUnit(result: unknown, formula: Formula): number {
  const name = coherent[formula.unit.dimension];
  if (typeof result === 'number' && name === undefined) return result;
  const isUnit = math.typeOf(result) === 'Unit';
  if (isUnit && name !== undefined) {
    const unit = result as MathUnit;
    if (!unit.equalBase(math.unit(name))) throw new ArithmeticError('judge_formula_units', { unit: formula.unit.code });
    const number: unknown = unit.toNumeric(name);
    return typeof number === 'number' ? number : NaN;
  }
  if (math.typeOf(result) === 'Complex') return NaN;
  throw new ArithmeticError('judge_formula_units', { unit: formula.unit.code });
}
