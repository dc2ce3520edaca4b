import { describe, expect, test } from '@jest/globals';
import { cumulativeAvailable, discreteAvailable, firstPeriodFor } from './available-to-promise.js';
import { scheduleLots } from './lot-schedule.js';

describe('available to promise against published figures', () => {
  test('industrial pumps: 11 free in the first week, lots of 70', () => {
    // W. J. Stevenson, Operations Management, section on master scheduling: stock 64, lot 70; the orders of weeks 3 to 5
    // are from memory, the rest recomputed.
    const forecast = [30, 30, 30, 30, 40, 40, 40, 40];
    const promised = [33, 20, 10, 4, 2, 0, 0, 0];
    const schedule = scheduleLots(64, forecast, promised, 70);
    expect(schedule.lots).toEqual([0, 0, 70, 0, 70, 0, 70, 70]);
    expect(schedule.projected).toEqual([31, 1, 41, 11, 41, 1, 31, 61]);
    const input = { onHand: 64, supply: schedule.lots, promised };
    expect(discreteAvailable(input)).toEqual([11, undefined, 56, undefined, 68, undefined, 70, 70]);
    expect(cumulativeAvailable(input)).toEqual([11, 11, 67, 67, 135, 135, 205, 275]);
  });

  test('eight weeks with three arrivals: constructed, no published source', () => {
    const input = { onHand: 20, supply: [100, 0, 0, 100, 0, 100, 0, 0], promised: [60, 25, 30, 20, 55, 40, 0, 10] };
    expect(discreteAvailable(input)).toEqual([5, undefined, undefined, 25, undefined, 50, undefined, undefined]);
    const cumulative = cumulativeAvailable(input);
    expect(cumulative).toEqual([5, 5, 5, 30, 30, 80, 80, 80]);
    expect([firstPeriodFor(25, cumulative), firstPeriodFor(31, cumulative)]).toEqual([3, 5]);
  });

  test('an overbooked arrival takes from the one before: constructed, no published source', () => {
    const input = { onHand: 10, supply: [50, 0, 40, 0, 60, 0], promised: [30, 5, 55, 10, 20, 0] };
    expect(discreteAvailable(input)).toEqual([25, undefined, -25, undefined, 40, undefined]);
    expect(discreteAvailable(input, true)).toEqual([0, undefined, 0, undefined, 40, undefined]);
  });
});
