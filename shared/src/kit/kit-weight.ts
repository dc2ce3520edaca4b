import { ArithmeticError } from '../errors/arithmetic-error.js';
import { normalQuantile } from '../statistics/normal-distribution.js';

/** A line of a kit's contents list, or a bag of it. */
export interface KitLine {
  readonly part: string;
  /** Whole, at least one. */
  readonly pieces: number;
  /** Mean weight of one piece, g, more than zero. */
  readonly grams: number;
  /** Standard deviation from piece to piece, g. */
  readonly spreadGrams: number;
  /** Standard uncertainty of the mean itself, g; it is the same for all pieces and so adds up. */
  readonly meanUncertaintyGrams?: number | undefined;
}

/** How weighing decides. */
export interface WeighingRule {
  /** Standard uncertainty of the scale in one weighing, g, more than zero. */
  readonly scaleGrams: number;
  /** Share of complete kits that may be stopped without cause, for example 0.01. */
  readonly falseAlarmShare: number;
  /** Probability with which a missing piece must be noticed, for example 0.99. */
  readonly confidence: number;
}

/** What a kit should weigh. */
export interface ExpectedWeight {
  /** g */
  readonly grams: number;
  /** Standard deviation of what the scale will show, g. */
  readonly spreadGrams: number;
  /** Lightest complete kit that is let pass, g. */
  readonly lowest: number;
  /** Heaviest complete kit that is let pass, g. */
  readonly highest: number;
}

/**
 * What a kit should weigh and how far a complete one may be off.
 *
 * @param lines contents, packing material included
 * @param rule scale and false alarms
 * @returns mean, spread and limits
 * @throws ArithmeticError `kit_empty`, `kit_pieces`, `kit_weight`, `kit_spread`, `kit_scale`, `kit_share`
 * @source variances of independent pieces add, the uncertainty of a shared mean adds linearly (JCGM 100:2008, 5.1 and
 *   5.2); the normal distribution is presumed.
 */
export function expectedWeight(lines: readonly KitLine[], rule: WeighingRule): ExpectedWeight {
  if (lines.length === 0) throw new ArithmeticError('kit_empty');
  checkRule(rule);
  const grams = lines.reduce((sum, line) => sum + line.pieces * line.grams, 0);
  const variance = lines.reduce((sum, line) => sum + lineVariance(line), rule.scaleGrams ** 2);
  const spreadGrams = Math.sqrt(variance);
  const reach = alarmReach(rule) * spreadGrams;
  return { grams, spreadGrams, lowest: grams - reach, highest: grams + reach };
}

/**
 * Variance that a line brings to a weighing.
 *
 * @param line the line
 * @returns g²
 * @throws ArithmeticError `kit_pieces`, `kit_weight`, `kit_spread`
 */
export function lineVariance(line: KitLine): number {
  const { part, pieces, grams, spreadGrams, meanUncertaintyGrams = 0 } = line;
  if (!Number.isSafeInteger(pieces) || pieces < 1) throw new ArithmeticError('kit_pieces', { part, pieces });
  if (!(grams > 0) || !Number.isFinite(grams)) throw new ArithmeticError('kit_weight', { part, grams });
  for (const spread of [spreadGrams, meanUncertaintyGrams]) {
    if (!(spread >= 0) || !Number.isFinite(spread)) throw new ArithmeticError('kit_spread', { part, spread });
  }
  return pieces * spreadGrams ** 2 + (pieces * meanUncertaintyGrams) ** 2;
}

/**
 * How many spreads a complete kit may be off.
 *
 * @param rule false alarms, half of them on either side
 * @returns standard deviations, for example 2.576 for one false alarm in a hundred
 * @throws ArithmeticError as {@link checkRule}
 */
export function alarmReach(rule: WeighingRule): number {
  checkRule(rule);
  return -normalQuantile(rule.falseAlarmShare / 2);
}

/**
 * Checks how weighing decides.
 *
 * @param rule the rule
 * @throws ArithmeticError `kit_scale`, `kit_share`
 */
export function checkRule(rule: WeighingRule): void {
  const { scaleGrams, falseAlarmShare, confidence } = rule;
  if (!(scaleGrams > 0) || !Number.isFinite(scaleGrams)) {
    throw new ArithmeticError('kit_scale', { uncertainty: scaleGrams });
  }
  const isShare = (share: number) => share > 0 && share < 1;
  if (!isShare(falseAlarmShare))
    throw new ArithmeticError('kit_share', { what: 'false alarms', share: falseAlarmShare });
  if (!isShare(confidence)) throw new ArithmeticError('kit_share', { what: 'confidence', share: confidence });
}
