import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { RoundingMode } from '../money/round.js';
import { roundDecimal } from '../money/round.js';
import { convertMeasure } from './convert-measure.js';
import { Decimal, decimal, type DecimalInput } from './decimal.js';
import { stockMeasures, type StockMeasure } from './stock-measures.js';
import { unitOf } from './unit.js';
import { gramsOfLength, metresOfMass, type Wire } from './wire.js';

/** The measures of one part: what it is kept in, and what else it may be bought or used in. */
export interface PartMeasures {
  readonly stock: StockMeasure;
  /** Names of the part's own packings or measures and how many of the stock measure one of them is. */
  readonly factors: Readonly<Record<string, DecimalInput>>;
  /** For a wire that is weighed and measured: its geometry. */
  readonly wire?: Wire;
}

/** A quantity brought to the stock measure. */
export interface StockEquivalent {
  /** In the stock measure, with as many decimals as it may have. */
  readonly quantity: Decimal;
  /** What rounding added (positive) or took away, in the stock measure. */
  readonly roundedBy: Decimal;
}

/**
 * Brings a quantity of a part to its stock measure: by the part's own factor if it has one, else by the units' sizes
 * (kg to g), else by the wire's geometry (kg to m).
 *
 * @param quantity in `measure`
 * @param measure a name among the part's factors, or a unit
 * @param part the part's measures
 * @param mode the way to round to the decimals of the stock measure
 * @returns the quantity in the stock measure and what rounding did
 * @throws ArithmeticError `measure_no_conversion`, `measure_factor_not_positive`, `measure_wire_size`;
 *   `measure_not_a_number`, `measure_not_exact`
 */
export function toStockMeasure(
  quantity: DecimalInput,
  measure: string,
  part: PartMeasures,
  mode: RoundingMode = 'half-even',
): StockEquivalent {
  const exact = exactStock(decimal(quantity), measure, part);
  const rounded = roundDecimal(exact, stockMeasures[part.stock].decimals, mode);
  return { quantity: rounded, roundedBy: rounded.minus(exact) };
}

/**
 * How many of the stock measure one of another measure is, for showing and for prices per unit.
 *
 * @param measure as for {@link toStockMeasure}
 * @param part the part's measures
 * @returns the factor, unrounded (40 significant digits)
 * @throws ArithmeticError as {@link toStockMeasure}
 */
export function stockPerMeasure(measure: string, part: PartMeasures): Decimal {
  return exactStock(new Decimal(1), measure, part);
}

function exactStock(quantity: Decimal, measure: string, part: PartMeasures): Decimal {
  const own = Object.hasOwn(part.factors, measure) ? part.factors[measure] : undefined;
  if (own !== undefined) {
    const factor = decimal(own);
    if (factor.lessThanOrEqualTo(0)) {
      throw new ArithmeticError('measure_factor_not_positive', { factor: factor.toFixed() });
    }
    return quantity.times(factor);
  }
  if (measure === part.stock) return quantity;
  const from = unitOf(measure);
  const to = unitOf(part.stock);
  // A set or a pair of pieces is a matter of the part's own factors, never of the table.
  if (from.dimension === to.dimension && to.dimension !== 'count') return convertMeasure(quantity, from, to);
  if (part.wire && from.dimension === 'mass' && to.dimension === 'length') {
    const metres = metresOfMass(convertMeasure(quantity, from, unitOf('g')), part.wire);
    return convertMeasure(metres, unitOf('m'), to);
  }
  if (part.wire && from.dimension === 'length' && to.dimension === 'mass') {
    const grams = gramsOfLength(convertMeasure(quantity, from, unitOf('m')), part.wire);
    return convertMeasure(grams, unitOf('g'), to);
  }
  throw new ArithmeticError('measure_no_conversion', { from: measure, to: part.stock });
}
