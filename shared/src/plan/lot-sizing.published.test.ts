import { describe, expect, test } from '@jest/globals';
import { economicOrderQuantity } from './economic-order-quantity.js';
import { lotPlanCost, planLots } from './lot-rule.js';
import { silverMeal, silverMealMeans } from './silver-meal.js';
import { wagnerWhitin } from './wagner-whitin.js';

const same = (value: number, count: number): number[] => Array.from({ length: count }, () => value);

describe('lot sizing against published examples', () => {
  test('twelve months with changing set-up costs: least cost 864', () => {
    // H. M. Wagner and T. M. Whitin, Management Science 5 (1), 1958, 89-96, table 1.
    const need = [69, 29, 36, 61, 61, 26, 34, 67, 45, 67, 79, 56];
    const setUp = [85, 102, 102, 101, 98, 114, 105, 86, 119, 110, 98, 114];
    const plan = wagnerWhitin(need, setUp, same(1, 12));
    expect(plan.lots).toEqual([98, 0, 97, 0, 121, 0, 0, 112, 0, 67, 135, 0]);
    expect(plan.leastCost).toEqual([85, 114, 186, 277, 348, 400, 469, 555, 600, 710, 789, 864]);
  });

  test('twelve months of 1,200 in all: least cost 501.20', () => {
    // E. A. Silver, D. F. Pyke and R. Peterson, Inventory Management and Production Planning and Scheduling, 3rd ed.,
    // 1998, chapter 6 (from memory, recomputed).
    const need = [10, 62, 12, 130, 154, 129, 88, 52, 124, 160, 238, 41];
    const plan = wagnerWhitin(need, same(54, 12), same(0.4, 12));
    expect(plan.lots).toEqual([84, 0, 0, 130, 283, 0, 140, 0, 124, 160, 279, 0]);
    expect(plan.leastCost.at(-1)).toBeCloseTo(501.2, 9);
    const published = [54, 78.8, 88.4, 142.4, 196.4, 248, 285.6, 322.8, 376.8, 430.8, 484.8, 501.2];
    published.forEach((cost, month) => expect(plan.leastCost[month]).toBeCloseTo(cost, 9));
  });

  test('computer casings: 48, 47 and 20 by Silver and Meal, 310 in all, which is the optimum', () => {
    // S. Nahmias, Production and Operations Analysis, chapter on lot sizing, computer casings.
    const need = [18, 30, 42, 5, 20];
    const costs = { order: 80, holding: 2 };
    const lots = planLots(need, silverMeal(costs));
    expect(lots).toEqual([48, 0, 47, 0, 20]);
    expect(lotPlanCost(need, lots, costs)).toBe(310);
    [80, 70, 102.6667].forEach((mean, n) => expect(silverMealMeans(need, costs)[n]).toBeCloseTo(mean, 4));
    [80, 45, 56.6667].forEach((mean, n) => expect(silverMealMeans(need.slice(2), costs)[n]).toBeCloseTo(mean, 4));
    const optimum = wagnerWhitin(need, same(80, 5), same(2, 5));
    expect(optimum.leastCost).toEqual([80, 140, 220, 230, 310]);
    expect(lotPlanCost(need, optimum.lots, costs)).toBe(310);
  });

  test('a case in which Silver and Meal is not optimal: 140 instead of 130', () => {
    // S. Nahmias, Production and Operations Analysis (from memory, recomputed).
    const need = [10, 40, 30];
    const costs = { order: 50, holding: 1 };
    const lots = planLots(need, silverMeal(costs));
    expect(lots).toEqual([50, 0, 30]);
    expect(lotPlanCost(need, lots, costs)).toBe(140);
    const optimum = wagnerWhitin(need, same(50, 3), same(1, 3));
    expect(optimum.lots).toEqual([10, 70, 0]);
    expect(optimum.leastCost.at(-1)).toBe(130);
  });

  test('the first economic order quantity in print: 2,190', () => {
    // F. W. Harris, Factory 10 (2), February 1913: X = √(240·M·S/C), M 1,000 a month, S 2.00, C 0.10.
    expect(economicOrderQuantity(12 * 1000, { order: 2, holding: 0.1 * 0.1 })).toBeCloseTo(2190.89, 2);
  });

  test('needles: 200 at a time', () => {
    // J. Heizer and B. Render, Operations Management, chapter on inventory (from memory, recomputed).
    expect(economicOrderQuantity(1000, { order: 10, holding: 0.5 })).toBe(200);
  });
});
