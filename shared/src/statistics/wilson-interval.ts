import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireCount } from './checks.js';
import { twoSidedReach } from './normal-distribution.js';

export interface ShareInterval {
  readonly share: number;
  readonly low: number;
  readonly high: number;
}

/**
 * Confidence interval of a share seen in a sample, right also for few trials and for none or all.
 *
 * @param successes how many of them
 * @param trials out of how many, at least 1
 * @param confidence two-sided, for example 0.95
 * @returns the share seen and its interval, all from 0 to 1
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_more_than_all`, `statistics_out_of_range`
 * @source E. B. Wilson, Journal of the American Statistical Association 22 (1927); R. G. Newcombe, Statistics in
 * Medicine 17 (1998), method 3 (no continuity correction)
 */
export function wilsonInterval(successes: number, trials: number, confidence = 0.95): ShareInterval {
  requireCount('number of trials', trials, 1);
  requireCount('number of successes', successes, 0);
  if (successes > trials) {
    throw new ArithmeticError('statistics_more_than_all', { name: 'successes', found: successes, most: trials });
  }
  const z = twoSidedReach(confidence);
  const share = successes / trials;
  const widening = 1 + (z * z) / trials;
  const centre = share + (z * z) / (2 * trials);
  const reach = z * Math.sqrt((share * (1 - share)) / trials + (z * z) / (4 * trials * trials));
  return {
    share,
    low: successes === 0 ? 0 : Math.max(0, (centre - reach) / widening),
    high: successes === trials ? 1 : Math.min(1, (centre + reach) / widening),
  };
}
