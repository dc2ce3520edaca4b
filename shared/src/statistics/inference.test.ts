import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { meanTimeInterval, rateInterval } from './failure-rate.js';
import { acceptanceOfLot, acceptanceOfProcess, shareAtAcceptance } from './operating-characteristic.js';
import { codeLetterOf, samplingPlan } from './sampling-plan.js';
import { acceptanceQualityLimits, codeLetters, inspectionLevels, lotBands, sampleSizes } from './sampling-tables.js';
import { survivalAt, survivalCurve, type WatchedUnit } from './survival.js';
import { wilsonInterval } from './wilson-interval.js';
import { firstPassYield, rolledThroughputYield } from './yields.js';

const codeOf = (compute: () => unknown): string => {
  try {
    compute();
  } catch (error) {
    if (error instanceof ArithmeticError) return error.code;
    throw error;
  }
  return 'no fault';
};

describe('Wilson intervals', () => {
  test('hold the share, stay from 0 to 1, and mirror', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 500 }), fc.nat(500), (trials, some) => {
        const successes = some % (trials + 1);
        const found = wilsonInterval(successes, trials);
        const mirrored = wilsonInterval(trials - successes, trials);
        expect(found.low >= 0 && found.low <= found.share && found.share <= found.high && found.high <= 1).toBe(true);
        expect(mirrored.low).toBeCloseTo(1 - found.high, 12);
      }),
    );
  });

  test('refuse nonsense', () => {
    expect(codeOf(() => wilsonInterval(3, 2))).toBe('statistics_more_than_all');
    expect(codeOf(() => wilsonInterval(0, 0))).toBe('statistics_not_a_count');
    expect(codeOf(() => wilsonInterval(1, 2, 1))).toBe('statistics_out_of_range');
  });
});

describe('yields', () => {
  test('need somebody to have tried', () => {
    expect(codeOf(() => firstPassYield({ tried: 0, passedFirst: 0 }))).toBe('statistics_not_a_count');
    expect(codeOf(() => firstPassYield({ tried: 2, passedFirst: 3 }))).toBe('statistics_more_than_all');
    expect(codeOf(() => rolledThroughputYield([]))).toBe('statistics_too_few');
  });
});

/** The product-limit estimate straight from its definition: at each event time, over everyone still watched. */
function survivalByDefinition(units: readonly WatchedUnit[], time: number): number {
  const eventTimes = [...new Set(units.filter((unit) => unit.event).map((unit) => unit.time))];
  return eventTimes
    .filter((each) => each <= time)
    .reduce((product, each) => {
      const atRisk = units.filter((unit) => unit.time >= each).length;
      const events = units.filter((unit) => unit.event && unit.time === each).length;
      return product * (1 - events / atRisk);
    }, 1);
}

describe('survival curves', () => {
  const units = fc.array(fc.record({ time: fc.integer({ min: 0, max: 20 }), event: fc.boolean() }), { maxLength: 40 });

  test('agree with the definition at every time, in any order of units', () => {
    fc.assert(
      fc.property(units, fc.integer({ min: 0, max: 22 }), (watched, time) => {
        const curve = survivalCurve(watched);
        expect(survivalAt(curve, time)).toBeCloseTo(survivalByDefinition(watched, time), 12);
        expect(survivalCurve(watched.toReversed())).toEqual(curve);
        for (const step of curve.steps) {
          expect(step.low <= step.survival + 1e-12 && step.survival <= step.high + 1e-12).toBe(true);
        }
      }),
    );
  });

  test('without units or without events stay at one', () => {
    expect(survivalCurve([])).toEqual({ steps: [], median: undefined, units: 0, events: 0 });
    expect(survivalAt(survivalCurve([{ time: 3, event: false }]), 5)).toBe(1);
  });

  test('end at zero when the last one fails', () => {
    const curve = survivalCurve([{ time: 3, event: true }]);
    expect(curve.steps[0]).toMatchObject({ survival: 0, low: 0, high: 0, standardError: 0 });
    expect(curve.median).toBe(3);
  });

  test('refuse times that are not numbers', () => {
    expect(codeOf(() => survivalCurve([{ time: Number.NaN, event: true }]))).toBe('statistics_not_a_number');
    expect(codeOf(() => survivalCurve([{ time: -1, event: true }]))).toBe('statistics_not_a_number');
  });
});

describe('rates', () => {
  test('the interval narrows as the watching grows and holds the rate', () => {
    fc.assert(
      fc.property(fc.nat(30), fc.double({ min: 0.1, max: 1e6, noNaN: true }), (events, total) => {
        const found = rateInterval(events, total);
        expect(found.low <= found.rate && found.rate < found.high).toBe(true);
        expect(rateInterval(events, total * 2).high).toBeCloseTo(found.high / 2, 9);
        expect(1 / meanTimeInterval(events + 1, total, 0.95).low).toBeCloseTo(rateInterval(events + 1, total).high, 9);
      }),
    );
    expect(codeOf(() => rateInterval(1, 0))).toBe('statistics_out_of_range');
    expect(codeOf(() => rateInterval(-1, 5))).toBe('statistics_not_a_count');
  });
});

describe('sampling plans', () => {
  test('every lot and limit has a plan, and no plan lets a perfect lot fail or asks for more than the lot', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 2_000_000 }),
        fc.constantFrom(...acceptanceQualityLimits),
        fc.constantFrom(...inspectionLevels),
        (lot, limit, level) => {
          const plan = samplingPlan(lot, limit, level);
          expect(plan.sample).toBeGreaterThan(0);
          expect(plan.sample).toBeLessThanOrEqual(lot);
          expect(acceptanceOfLot(lot, 0, plan.sample, plan.accept)).toBeCloseTo(1, 6);
          const size = sampleSizes[codeLetters.indexOf(plan.planLetter)] ?? 0;
          expect(plan.sample === size || plan.inspectAll).toBe(true);
          // A lot at the quality limit is accepted far more often than not: the producer's side of the standard.
          expect(acceptanceOfProcess(size, plan.accept, limit / 100)).toBeGreaterThan(0.8);
        },
      ),
    );
  });

  test('levels only grow the letter', () => {
    for (const [upTo] of lotBands) {
      const lot = Number.isFinite(upTo) ? upTo : 600_000;
      const letters = inspectionLevels.map((level) => codeLetters.indexOf(codeLetterOf(lot, level)));
      expect(letters).toEqual(letters.toSorted((left, right) => left - right));
    }
  });

  test('a limit between the preferred values is refused', () => {
    expect(codeOf(() => samplingPlan(100, 2))).toBe('statistics_no_such_aql');
    expect(codeOf(() => samplingPlan(0, 1))).toBe('statistics_not_a_count');
  });

  test('the chance of acceptance falls with the share, and its inverse finds it back', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 300 }),
        fc.nat(10),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (sample, accept, chance) => {
          if (accept >= sample) return;
          const share = shareAtAcceptance(sample, accept, chance);
          expect(acceptanceOfProcess(sample, accept, share)).toBeCloseTo(chance, 8);
        },
      ),
    );
    expect(codeOf(() => acceptanceOfLot(5, 6, 2, 0))).toBe('statistics_more_than_all');
    expect(codeOf(() => acceptanceOfLot(5, 1, 6, 0))).toBe('statistics_more_than_all');
  });
});
