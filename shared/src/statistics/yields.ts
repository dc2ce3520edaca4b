import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireCount } from './checks.js';

/** What went through one step for the first time; second tries do not count. */
export interface StepFirstRuns {
  /** Units that were tried. */
  readonly tried: number;
  /** Of these, units that passed without rework. */
  readonly passedFirst: number;
}

export interface RolledYield {
  /** First-pass yield per step, from 0 to 1, in the order given. */
  readonly firstPass: readonly number[];
  /** Share of units that pass every step the first time: the product. */
  readonly rolledThroughput: number;
  /** The yield that every step would have if all were alike: the geometric mean. */
  readonly perStep: number;
}

/**
 * Share of units that passed a step the first time.
 *
 * @param step units tried and passed, counted from first runs only
 * @returns a share from 0 to 1
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_more_than_all`
 * @source common practice, no source
 */
export function firstPassYield(step: StepFirstRuns): number {
  requireCount('number of units tried', step.tried, 1);
  requireCount('number of units passed', step.passedFirst, 0);
  if (step.passedFirst > step.tried) {
    throw new ArithmeticError('statistics_more_than_all', {
      name: 'passed units',
      found: step.passedFirst,
      most: step.tried,
    });
  }
  return step.passedFirst / step.tried;
}

/**
 * First-pass yield of each step and what comes of them together.
 *
 * @param steps at least one
 * @returns the yields, from 0 to 1
 * @throws ArithmeticError `statistics_too_few`, `statistics_not_a_count`, `statistics_more_than_all`
 * @source common practice, no source
 */
export function rolledThroughputYield(steps: readonly StepFirstRuns[]): RolledYield {
  if (steps.length === 0) throw new ArithmeticError('statistics_too_few', { needed: 1, found: 0 });
  const firstPass = steps.map(firstPassYield);
  const rolledThroughput = firstPass.reduce((product, share) => product * share, 1);
  return { firstPass, rolledThroughput, perStep: rolledThroughput ** (1 / steps.length) };
}
