import { normalQuantile, normalShareBelow } from '../statistics/normal-distribution.js';
import { alarmReach, expectedWeight, lineVariance, type KitLine, type WeighingRule } from './kit-weight.js';

/** How surely the scale notices one missing piece of a line. */
export interface Omission {
  readonly part: string;
  /** Probability that the weighing says "too light", 0 to 1. */
  readonly probability: number;
  readonly noticeable: boolean;
}

/**
 * How surely one missing piece of each line is noticed when the whole kit is weighed.
 *
 * @param lines contents
 * @param rule scale, false alarms and wanted confidence
 * @returns one answer per line, in order; a piece counts as noticeable if its weight is at least the spread times the
 *   sum of both reaches, which is on the safe side: the probability is then at least the confidence
 * @throws ArithmeticError as `expectedWeight`
 * @source power of a one-sided test against a shift; JCGM 106:2012, 9.5 gives the same form for risks.
 */
export function omissions(lines: readonly KitLine[], rule: WeighingRule): readonly Omission[] {
  const { spreadGrams } = expectedWeight(lines, rule);
  return lines.map((line) => {
    const without = line.pieces > 1 ? lineVariance({ ...line, pieces: line.pieces - 1 }) : 0;
    const spreadWithout = Math.sqrt(Math.max(0, spreadGrams ** 2 - lineVariance(line) + without));
    return {
      part: line.part,
      probability: normalShareBelow((line.grams - alarmReach(rule) * spreadGrams) / spreadWithout),
      noticeable: line.grams >= noticeableFrom(spreadGrams, rule),
    };
  });
}

/**
 * The parts of which one missing piece could slip through a single weighing of the whole kit.
 *
 * @param lines contents
 * @param rule scale, false alarms and wanted confidence
 * @returns parts, in the order of the lines
 * @throws ArithmeticError as `expectedWeight`
 */
export function unnoticeable(lines: readonly KitLine[], rule: WeighingRule): readonly string[] {
  return omissions(lines, rule).flatMap(({ part, noticeable }) => (noticeable ? [] : [part]));
}

/**
 * The lightest piece whose omission a weighing of a given spread notices surely enough.
 *
 * @param spreadGrams standard deviation of the weighing, g
 * @param rule false alarms and wanted confidence
 * @returns g
 * @throws ArithmeticError `kit_scale`, `kit_share`
 */
export function noticeableFrom(spreadGrams: number, rule: WeighingRule): number {
  return (alarmReach(rule) + Math.max(0, normalQuantile(rule.confidence))) * spreadGrams;
}
