import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireCount, requireOpenShare } from './checks.js';
import { chiSquareQuantile } from './gamma-distribution.js';

export interface RateInterval {
  /** Events per unit of time. */
  readonly rate: number;
  readonly low: number;
  readonly high: number;
}

export interface MeanTimeInterval {
  /** Mean time between failures; undefined without a failure. */
  readonly meanTime: number | undefined;
  /** Two-sided limits; without a failure the lower one is one-sided and there is no upper. */
  readonly low: number;
  readonly high: number | undefined;
}

function checkTime(total: number): void {
  if (!(total > 0) || !Number.isFinite(total)) {
    throw new ArithmeticError('statistics_out_of_range', {
      name: 'total time',
      low: 'above 0',
      high: 'any finite time',
      value: String(total),
    });
  }
}

/**
 * Exact confidence limits of a rate of rare events.
 *
 * @param events how many there were
 * @param total time that all units together were watched, in any unit
 * @param confidence two-sided
 * @returns events per that unit of time; the lower limit is 0 without an event
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_out_of_range`
 * @source F. Garwood, Biometrika 28 (1936): limits of a Poisson mean by chi-square
 */
export function rateInterval(events: number, total: number, confidence = 0.95): RateInterval {
  requireCount('number of events', events, 0);
  requireOpenShare('confidence', confidence);
  checkTime(total);
  const tail = (1 - confidence) / 2;
  return {
    rate: events / total,
    low: events === 0 ? 0 : chiSquareQuantile(tail, 2 * events) / (2 * total),
    high: chiSquareQuantile(1 - tail, 2 * events + 2) / (2 * total),
  };
}

/**
 * Mean time between failures where the watching ended at a set time.
 *
 * @param failures how many there were
 * @param total time that all units together ran, in any unit
 * @param confidence two-sided; one-sided where there was no failure
 * @returns mean time and its limits in that unit
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_out_of_range`
 * @source NIST/SEMATECH e-Handbook 8.4.5.1
 */
export function meanTimeInterval(failures: number, total: number, confidence = 0.9): MeanTimeInterval {
  requireCount('number of failures', failures, 0);
  requireOpenShare('confidence', confidence);
  checkTime(total);
  if (failures === 0) return { meanTime: undefined, low: total / -Math.log(1 - confidence), high: undefined };
  const tail = (1 - confidence) / 2;
  return {
    meanTime: total / failures,
    low: (2 * total) / chiSquareQuantile(1 - tail, 2 * failures + 2),
    high: (2 * total) / chiSquareQuantile(tail, 2 * failures),
  };
}

/**
 * Largest rate that still fits with having seen this few events: one-sided.
 *
 * @param events how many there were
 * @param total time that all units together were watched, in any unit
 * @param confidence one-sided
 * @returns upper limit in events per that unit of time
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_out_of_range`
 * @source F. Garwood, Biometrika 28 (1936)
 */
export function rateUpperBound(events: number, total: number, confidence = 0.95): number {
  requireCount('number of events', events, 0);
  requireOpenShare('confidence', confidence);
  checkTime(total);
  return chiSquareQuantile(confidence, 2 * events + 2) / (2 * total);
}
