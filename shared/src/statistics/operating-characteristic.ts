import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireCount, requireOpenShare, requireShare } from './checks.js';
import { logGamma } from './gamma-distribution.js';

const logChoose = (n: number, k: number): number => logGamma(n + 1) - logGamma(k + 1) - logGamma(n - k + 1);

function checkPlan(sample: number, accept: number): void {
  requireCount('sample size', sample, 1);
  requireCount('acceptance number', accept, 0);
}

/**
 * Chance that a plan accepts when each piece is nonconforming with one probability (a running process).
 *
 * @param sample pieces inspected
 * @param accept most nonconforming pieces accepted
 * @param share nonconforming in the process, from 0 to 1
 * @returns probability of acceptance
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_out_of_range`
 * @source binomial distribution; ISO 2859-1:1999, clause 12 (type B)
 */
export function acceptanceOfProcess(sample: number, accept: number, share: number): number {
  checkPlan(sample, accept);
  requireShare('share nonconforming', share);
  if (accept >= sample || share === 0) return 1;
  if (share === 1) return 0;
  let sum = 0;
  for (let found = 0; found <= accept; found += 1) {
    sum += Math.exp(logChoose(sample, found) + found * Math.log(share) + (sample - found) * Math.log1p(-share));
  }
  return Math.min(1, sum);
}

/**
 * Chance that a plan accepts a lot by itself with a known number of nonconforming pieces.
 *
 * @param lot pieces in the lot
 * @param nonconforming of these
 * @param sample pieces inspected, at most the lot
 * @param accept most nonconforming pieces accepted
 * @returns probability of acceptance
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_more_than_all`
 * @source hypergeometric distribution (type A)
 */
export function acceptanceOfLot(lot: number, nonconforming: number, sample: number, accept: number): number {
  requireCount('lot size', lot, 1);
  requireCount('number of nonconforming pieces', nonconforming, 0);
  checkPlan(sample, accept);
  if (nonconforming > lot || sample > lot) {
    const name = sample > lot ? 'pieces in the sample' : 'nonconforming pieces';
    throw new ArithmeticError('statistics_more_than_all', { name, found: Math.max(nonconforming, sample), most: lot });
  }
  const least = Math.max(0, sample - (lot - nonconforming));
  let sum = 0;
  for (let found = least; found <= Math.min(accept, nonconforming, sample); found += 1) {
    sum += Math.exp(
      logChoose(nonconforming, found) + logChoose(lot - nonconforming, sample - found) - logChoose(lot, sample),
    );
  }
  return Math.min(1, sum);
}

/**
 * Share nonconforming at which a plan accepts with a given chance: the points of the operating characteristic.
 *
 * @param sample pieces inspected
 * @param accept most nonconforming pieces accepted, fewer than the sample
 * @param probability of acceptance, strictly between 0 and 1
 * @returns share from 0 to 1, found by bisection
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_out_of_range`
 * @source inverse of {@link acceptanceOfProcess}
 */
export function shareAtAcceptance(sample: number, accept: number, probability: number): number {
  checkPlan(sample, accept);
  requireOpenShare('probability', probability);
  if (accept >= sample) return 1;
  let low = 0;
  let high = 1;
  for (let step = 0; step < 200 && high - low > 1e-15; step += 1) {
    const middle = (low + high) / 2;
    if (acceptanceOfProcess(sample, accept, middle) > probability) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
