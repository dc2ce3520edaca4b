import { ArithmeticError } from '../errors/arithmetic-error.js';
import { twoSidedReach } from './normal-distribution.js';

/** One unit: how long it was watched, and whether that ended with the event or only with the watching. */
export interface WatchedUnit {
  /** In any unit of time, from 0 on. */
  readonly time: number;
  /** True for an event (a confirmed fault); false where the unit was still well when last seen. */
  readonly event: boolean;
}

export interface SurvivalStep {
  readonly time: number;
  readonly atRisk: number;
  readonly events: number;
  /** Share still without event just after this time. */
  readonly survival: number;
  /** Greenwood's standard error. */
  readonly standardError: number;
  /** Confidence limits on the scale of log(−log S), so that they stay from 0 to 1. */
  readonly low: number;
  readonly high: number;
}

export interface SurvivalCurve {
  /** One step per time at which events fell, in order. */
  readonly steps: readonly SurvivalStep[];
  /** First time at which half or fewer are without event; undefined if it never falls so far. */
  readonly median: number | undefined;
  readonly units: number;
  readonly events: number;
}

function checkUnits(units: readonly WatchedUnit[]): void {
  const bad = units.findIndex((unit) => !Number.isFinite(unit.time) || unit.time < 0);
  if (bad >= 0) throw new ArithmeticError('statistics_not_a_number', { position: bad + 1 });
}

/** Limits are pinned where S is 0 or 1: there the scale has no value. */
function limitsOf(survival: number, greenwood: number, reach: number): { readonly low: number; readonly high: number } {
  if (survival <= 0) return { low: 0, high: 0 };
  if (survival >= 1) return { low: 1, high: 1 };
  const centre = Math.log(-Math.log(survival));
  const half = (reach * Math.sqrt(greenwood)) / Math.abs(Math.log(survival));
  return { low: Math.exp(-Math.exp(centre + half)), high: Math.exp(-Math.exp(centre - half)) };
}

/**
 * Share of units without event over time, units of unequal age counted rightly.
 *
 * A unit that leaves at the very time of an event was still at risk at it.
 *
 * @param units any number; times in one unit
 * @param confidence of the band
 * @returns the steps of the curve with Greenwood's error and band, and the median
 * @throws ArithmeticError `statistics_not_a_number`, `statistics_out_of_range`
 * @source E. Kaplan, P. Meier, Journal of the American Statistical Association 53 (1958); M. Greenwood (1926); J. Klein,
 * M. Moeschberger, Survival Analysis, chapter 4
 */
export function survivalCurve(units: readonly WatchedUnit[], confidence = 0.95): SurvivalCurve {
  checkUnits(units);
  const reach = twoSidedReach(confidence);
  const ordered = units.toSorted((left, right) => left.time - right.time);
  const steps: SurvivalStep[] = [];
  let survival = 1;
  let greenwood = 0;
  for (let first = 0; first < ordered.length;) {
    const time = ordered[first]?.time ?? 0;
    let next = first;
    let events = 0;
    for (let unit = ordered[next]; unit !== undefined && unit.time === time; unit = ordered[next]) {
      events += unit.event ? 1 : 0;
      next += 1;
    }
    const atRisk = ordered.length - first;
    if (events > 0) {
      survival *= (atRisk - events) / atRisk;
      greenwood += atRisk === events ? 0 : events / (atRisk * (atRisk - events));
      const standardError = survival * Math.sqrt(greenwood);
      steps.push({ time, atRisk, events, survival, standardError, ...limitsOf(survival, greenwood, reach) });
    }
    first = next;
  }
  const half = steps.find((step) => step.survival <= 0.5 + 1e-12);
  return {
    steps,
    median: half?.time,
    units: units.length,
    events: steps.reduce((sum, step) => sum + step.events, 0),
  };
}

/**
 * The curve read at one time.
 *
 * @param curve from {@link survivalCurve}
 * @param time in its unit
 * @returns share still without event just after that time
 */
export const survivalAt = (curve: SurvivalCurve, time: number): number =>
  curve.steps.findLast((step) => step.time <= time)?.survival ?? 1;
