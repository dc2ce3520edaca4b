import { ArithmeticError } from '../errors/arithmetic-error.js';
import { expectedWeight, type ExpectedWeight, type KitLine, type WeighingRule } from './kit-weight.js';

export type WeighVerdict = 'complete' | 'too-light' | 'too-heavy';

/** A single piece that would explain a weight. */
export interface WeightExplanation {
  readonly part: string;
  readonly what: 'missing' | 'too-many';
  /** What is left unexplained, g. */
  readonly differenceGrams: number;
}

/** What a weighing says. */
export interface WeighCheck {
  readonly verdict: WeighVerdict;
  readonly expected: ExpectedWeight;
  /** Weight less the expected one, g. */
  readonly differenceGrams: number;
  /** Single pieces that would explain it, best first; empty for a complete kit. */
  readonly explanations: readonly WeightExplanation[];
}

/**
 * Judges a weighed kit.
 *
 * @param grams what the scale shows
 * @param lines contents
 * @param rule scale and false alarms
 * @returns verdict, and which single missing or surplus piece would explain a wrong weight
 * @throws ArithmeticError `kit_reading`, and as `expectedWeight`
 * @source the test is two-sided at the rule's share of false alarms; common practice, no source.
 */
export function weighCheck(grams: number, lines: readonly KitLine[], rule: WeighingRule): WeighCheck {
  if (!Number.isFinite(grams)) throw new ArithmeticError('kit_reading', { grams: String(grams) });
  const expected = expectedWeight(lines, rule);
  const differenceGrams = grams - expected.grams;
  const reach = expected.highest - expected.grams;
  if (Math.abs(differenceGrams) <= reach) {
    return { verdict: 'complete', expected, differenceGrams, explanations: [] };
  }
  const light = differenceGrams < 0;
  const explanations = lines
    .map((line): WeightExplanation => ({
      part: line.part,
      what: light ? 'missing' : 'too-many',
      differenceGrams: differenceGrams + (light ? line.grams : -line.grams),
    }))
    .filter((explanation) => Math.abs(explanation.differenceGrams) <= reach)
    .sort((one, other) => Math.abs(one.differenceGrams) - Math.abs(other.differenceGrams));
  return { verdict: light ? 'too-light' : 'too-heavy', expected, differenceGrams, explanations };
}
