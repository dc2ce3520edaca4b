import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { economicLot, economicOrderQuantity } from './economic-order-quantity.js';
import { fixedLot } from './fixed-lot.js';
import { lotForLot } from './lot-for-lot.js';
import { type LotRule, lotPlanCost, planLots } from './lot-rule.js';
import { minimumAndMultiple } from './minimum-and-multiple.js';
import { periodLot } from './period-lot.js';
import { silverMeal } from './silver-meal.js';
import { wagnerWhitin, wagnerWhitinLot } from './wagner-whitin.js';

const costs = { order: 60, holding: 1 };
const rules: [string, LotRule][] = [
  ['lot for lot', lotForLot],
  ['fixed lot', fixedLot(25)],
  ['minimum and multiple', minimumAndMultiple(30, 7)],
  ['period', periodLot(3)],
  ['economic', economicLot(costs)],
  ['Silver and Meal', silverMeal(costs)],
  ['Wagner and Whitin', wagnerWhitinLot(costs)],
];

const needs = fc.array(fc.oneof(fc.constant(0), fc.nat(60)), { maxLength: 12 });

describe.each(rules)('%s', (_, rule) => {
  test('covers every need in time, and orders only where something is short', () => {
    fc.assert(
      fc.property(needs, (need) => {
        let stock = 0;
        planLots(need, rule).forEach((lot, period) => {
          if (lot > 0) expect(stock).toBeLessThan(need[period] ?? 0);
          stock += lot - (need[period] ?? 0);
          expect(stock).toBeGreaterThanOrEqual(0);
        });
      }),
    );
  });

  test('orders nothing for no need', () => {
    expect(planLots([], rule)).toEqual([]);
    expect(planLots([0, 0, 0], rule)).toEqual([0, 0, 0]);
  });
});

describe('lots', () => {
  test.each<[string, LotRule, number[]]>([
    ['lot for lot', lotForLot, [10, 0, 25, 5, 0, 40]],
    ['fixed lots of 20', fixedLot(20), [20, 0, 20, 0, 0, 40]],
    ['at least 15, by sixes', minimumAndMultiple(15, 6), [18, 0, 18, 18, 0, 30]],
    ['three periods at a time', periodLot(3), [35, 0, 0, 45, 0, 0]],
  ])('%s', (_, rule, lots) => {
    expect(planLots([10, 0, 25, 5, 0, 40], rule)).toEqual(lots);
  });

  test('fixed lots are whole lots, period lots leave nothing over', () => {
    fc.assert(
      fc.property(needs, (need) => {
        for (const lot of planLots(need, fixedLot(7))) expect(lot % 7).toBe(0);
        const total = planLots(need, periodLot(4)).reduce((sum, lot) => sum + lot, 0);
        expect(total).toBe(need.reduce((sum, amount) => sum + amount, 0));
      }),
    );
  });

  test.each([0, -1, NaN, Infinity])('a lot size or multiple of %p is refused', (size) => {
    expect(() => fixedLot(size)).toThrow('cannot be ordered');
    expect(() => minimumAndMultiple(0, size)).toThrow('cannot be ordered');
  });

  test.each([0, 1.5, -2, NaN])('a cover of %p periods is refused', (periods) => {
    expect(() => periodLot(periods)).toThrow('cannot cover');
  });

  test.each([
    { order: -1, holding: 1 },
    { order: 1, holding: -1 },
    { order: NaN, holding: 1 },
    { order: Infinity, holding: 1 },
  ])('costs of %p are refused', (bad) => {
    for (const rule of [economicLot, silverMeal, wagnerWhitinLot]) expect(() => rule(bad)).toThrow('cannot be planned');
  });

  test('an economic lot with free holding is refused, since it has no end', () => {
    expect(() => economicLot({ order: 1, holding: 0 })).toThrow('cannot be planned');
  });
});

describe('the cheapest plan', () => {
  /** Independent model: every choice of the periods in which something is ordered. */
  function cheapestOfAll(need: number[], order: number[], holding: number[]): number {
    let best = Infinity;
    for (let pattern = 0; pattern < 2 ** need.length; pattern += 1) {
      const orders = need.map((_, period) => (pattern & (1 << period)) !== 0);
      let [cost, from, possible] = [0, -1, true];
      need.forEach((amount, period) => {
        if (orders[period]) [from, cost] = [period, cost + (order[period] ?? 0)];
        if (amount > 0 && from < 0) possible = false;
        for (let held = from; held < period; held += 1) cost += amount * (holding[held] ?? 0);
      });
      if (possible) best = Math.min(best, cost);
    }
    return best;
  }

  const money = fc.array(fc.nat(100), { minLength: 8, maxLength: 8 });
  const prices = fc.array(fc.nat(5), { minLength: 8, maxLength: 8 });
  const eight = fc.array(fc.oneof(fc.constant(0), fc.nat(60)), { maxLength: 8 });

  test('costs what the best of all choices of order periods costs', () => {
    fc.assert(
      fc.property(eight, money, prices, (need, order, holding) => {
        const plan = wagnerWhitin(need, order, holding);
        expect(plan.leastCost.at(-1) ?? 0).toBe(need.length === 0 ? 0 : cheapestOfAll(need, order, holding));
      }),
    );
  });

  test('the plan costs what it says, and no other rule is cheaper', () => {
    fc.assert(
      fc.property(needs, (need) => {
        const plan = wagnerWhitin(
          need,
          need.map(() => costs.order),
          need.map(() => costs.holding),
        );
        const least = plan.leastCost.at(-1) ?? 0;
        expect(lotPlanCost(need, plan.lots, costs)).toBeCloseTo(least, 9);
        for (const [, rule] of rules)
          expect(lotPlanCost(need, planLots(need, rule), costs)).toBeGreaterThanOrEqual(least - 1e-9);
        expect(lotPlanCost(need, planLots(need, wagnerWhitinLot(costs)), costs)).toBeCloseTo(least, 9);
      }),
    );
  });

  test('of equally cheap plans the later orders are taken', () => {
    expect(wagnerWhitin([18, 30, 42, 5, 20], [80, 80, 80, 80, 80], [2, 2, 2, 2, 2]).lots).toEqual([48, 0, 47, 0, 20]);
  });

  test('needs below zero and too few costs are refused', () => {
    expect(() => wagnerWhitin([1, -1], [1, 1], [1, 1])).toThrow('is not a need');
    expect(() => wagnerWhitin([1, 1], [1], [1, 1])).toThrow('cannot be planned');
  });
});

describe('economic order quantity', () => {
  test('ordering and holding cost the same there, and no other lot is cheaper', () => {
    const positive = fc.double({ min: 0.01, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(positive, positive, positive, positive, (demand, order, holding, other) => {
        const lot = economicOrderQuantity(demand, { order, holding });
        const cost = (size: number): number => (demand * order) / size + (size * holding) / 2;
        expect((demand * order) / lot / ((lot * holding) / 2)).toBeCloseTo(1, 9);
        expect(cost(other)).toBeGreaterThanOrEqual(cost(lot) * (1 - 1e-12));
      }),
    );
  });

  test('no demand, no lot; free holding has no answer', () => {
    expect(economicOrderQuantity(0, { order: 5, holding: 1 })).toBe(0);
    expect(() => economicOrderQuantity(5, { order: 5, holding: 0 })).toThrow('cannot be planned');
    expect(() => economicOrderQuantity(-5, { order: 5, holding: 1 })).toThrow('is not a need');
  });
});
