import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireSample } from './checks.js';
import type { ControlLimits } from './control-limits.js';

/** `needed` of the last `span` points beyond `reach` standard deviations, all on one side. */
export interface RunRule {
  readonly id: 'one_beyond_three' | 'two_of_three_beyond_two' | 'four_of_five_beyond_one' | 'eight_on_one_side';
  readonly needed: number;
  readonly span: number;
  readonly reach: number;
}

/** The four rules of the Western Electric handbook, in its order. */
export const runRules: readonly RunRule[] = [
  { id: 'one_beyond_three', needed: 1, span: 1, reach: 3 },
  { id: 'two_of_three_beyond_two', needed: 2, span: 3, reach: 2 },
  { id: 'four_of_five_beyond_one', needed: 4, span: 5, reach: 1 },
  { id: 'eight_on_one_side', needed: 8, span: 8, reach: 0 },
];

export interface RunSignal {
  readonly rule: RunRule['id'];
  /** Position from 0 of the point that completes the pattern. */
  readonly point: number;
  readonly side: 'above' | 'below';
}

function completes(rule: RunRule, points: readonly number[], index: number, sign: 1 | -1): boolean {
  const isBeyond = (point: number): boolean => sign * point > rule.reach;
  if (!isBeyond(points[index] ?? 0)) return false;
  const span = points.slice(Math.max(0, index - rule.span + 1), index + 1);
  return span.filter(isBeyond).length >= rule.needed;
}

/**
 * Patterns in a chart that chance seldom makes.
 *
 * Beyond is strict: a point on the line does not count. A pattern is reported at the point that completes it, and that
 * point itself lies in the zone.
 *
 * @param standardised points as standard deviations from the centre, in the order of measuring
 * @param rules those to look for; the four of the handbook unless told otherwise
 * @returns every signal, by point and then by rule
 * @throws ArithmeticError `statistics_not_a_number`
 * @source Western Electric, Statistical Quality Control Handbook (1956); NIST/SEMATECH e-Handbook 6.3.2
 */
export function runSignals(
  standardised: readonly number[],
  rules: readonly RunRule[] = runRules,
): readonly RunSignal[] {
  requireSample(standardised, 0);
  return standardised.flatMap((_point, index) =>
    rules.flatMap((rule) =>
      (['above', 'below'] as const)
        .filter((side) => completes(rule, standardised, index, side === 'above' ? 1 : -1))
        .map((side) => ({ rule: rule.id, point: index, side })),
    ),
  );
}

/**
 * Points as standard deviations from the centre of a chart.
 *
 * @param points what is charted
 * @param limits centre and upper limit three standard deviations above it
 * @returns one number per point, without unit
 * @throws ArithmeticError `statistics_no_spread` where the limits lie on the centre
 */
export function standardise(points: readonly number[], limits: ControlLimits): readonly number[] {
  const deviation = (limits.upper - limits.centre) / 3;
  if (!(deviation > 0)) throw new ArithmeticError('statistics_no_spread');
  return points.map((point) => (point - limits.centre) / deviation);
}
