import { describe, expect, it } from '@jest/globals';
import { Decimal } from '../measure/decimal.js';
import { minorAmount } from '../money/minor-units.js';
import { averageUnitCost, costPool, emptyPool } from '../money/movement-value.js';
import { absorbOverhead } from './overhead.js';
import { spreadLandedCost, type LandedLine } from './landed-cost.js';
import { periodicAverage } from './periodic-average.js';
import { fifoValuation, movingAverageValuation, type StockEvent } from './stock-valuation.js';
import { adjustMaterial, adjustToRealisable, netRealisableValue } from './write-down.js';

const received = (quantity: number, cents: number): StockEvent => ({
  kind: 'in',
  quantity,
  value: minorAmount(quantity * cents),
});
const issued = (quantity: number): StockEvent => ({ kind: 'out', quantity });

describe('a textbook year of purchases and sales', () => {
  // OpenStax, Principles of Accounting, volume 1: Financial Accounting, 2019, sections 10.2 and 10.3 (figures from
  // memory, recomputed): 150 at 21, 225 at 27 and 210 at 33; 120 and 180 sold.
  const events = [received(150, 2100), issued(120), received(225, 2700), issued(180), received(210, 3300)];

  it('first in, first out: 7,200 sold, 8,955 left', () => {
    const { costOfIssues, perIssue, closing } = fifoValuation(events);
    expect([costOfIssues, perIssue, closing.value]).toEqual([720_000, [252_000, 468_000], 895_500]);
  });

  it('moving average: 7,253 sold, 8,902 left', () => {
    const { costOfIssues, perIssue, closing } = movingAverageValuation(events);
    expect([costOfIssues, perIssue, closing.value]).toEqual([725_294, [252_000, 473_294], 890_206]);
    expect(averageUnitCost(closing, 2)?.toFixed(4)).toBe('31.2353');
  });

  it('periodic average: 8,284.62 sold, 7,870.38 left', () => {
    const pool = (quantity: number, cents: number) => costPool(quantity, minorAmount(quantity * cents));
    const year = periodicAverage({
      opening: emptyPool,
      receipts: [pool(150, 2100), pool(225, 2700), pool(210, 3300)],
      issues: [120, 180],
    });
    expect([year.costOfIssues, year.closing.value]).toEqual([828_462, 787_038]);
    expect(year.perIssue).toEqual([331_385, 497_077]);
  });
});

describe('cases constructed on IAS 2, computed with exact rationals', () => {
  // All stock is consumed: what is left of the value must be exactly nothing.
  const events = [received(10, 250), received(4, 310), issued(7), issued(5), received(6, 295), issued(8)];

  it('leave zero at zero under both methods', () => {
    const fifo = fifoValuation(events);
    expect([fifo.perIssue, fifo.closing.value]).toEqual([[1750, 1370, 2390], 0]);
    const average = movingAverageValuation(events);
    expect([average.perIssue, average.closing.value]).toEqual([[1870, 1336, 2304], 0]);
    expect(average.closing.quantity.isZero()).toBe(true);
  });

  // IAS 2, paragraphs 10 and 11: 47.83 spread by value, weight and quantity.
  it('spread landed cost', () => {
    const lines: readonly LandedLine[] = [
      { quantity: 200, value: minorAmount(63_000), weight: '9.6' },
      { quantity: 50, value: minorAmount(4_200), weight: '1.1' },
      { quantity: 40, value: minorAmount(5_080), weight: '0.3' },
    ];
    const spread = (basis: 'value' | 'weight' | 'quantity') => spreadLandedCost(minorAmount(4783), lines, basis);
    expect(spread('value')).toEqual([4169, 278, 336]);
    expect(spread('weight')).toEqual([4174, 478, 131]);
    expect(spread('quantity')).toEqual([3298, 825, 660]);
    const unitCosts = spread('value').map((share, index) => {
      const line = lines[index];
      return line ? new Decimal(line.value + share).div(100).div(line.quantity.toString()).toFixed(5) : '';
    });
    expect(unitCosts).toEqual(['3.35845', '0.89560', '1.35400']);
  });

  // IAS 2, paragraphs 9, 28 and 29: item by item.
  it('write down item by item', () => {
    const change = (quantity: number, cost: number, price: number, completion: number, selling: number) => {
      const all = (each: number) => minorAmount(quantity * each);
      const realisable = netRealisableValue({ price: all(price), completion: all(completion), selling: all(selling) });
      return adjustToRealisable({ cost: all(cost), carrying: all(cost) }, realisable);
    };
    expect(change(10, 5200, 7000, 800, 500)).toBe(0);
    expect(change(25, 1840, 2100, 0, 350)).toBe(-2250);
    expect(change(4, 13_000, 12_800, 0, 640)).toBe(-3360);
  });

  // IAS 2, paragraph 33: a reversal stops at the original cost.
  it('reverse a write-down up to the cost', () => {
    const cost = minorAmount(10_000);
    let carrying = cost;
    const changes = [8200, 9500, 12_000].map((realisable) => {
      const change = adjustToRealisable({ cost, carrying }, minorAmount(realisable));
      carrying = minorAmount(carrying + change);
      return [change, carrying];
    });
    expect(changes).toEqual([
      [-1800, 8200],
      [1300, 9500],
      [500, 10_000],
    ]);
  });

  // IAS 2, paragraph 32.
  it('leave material alone while its product sells above cost', () => {
    const item = { cost: minorAmount(1200), carrying: minorAmount(1200) };
    const replacement = minorAmount(900);
    expect(adjustMaterial(item, replacement, { cost: minorAmount(8000), realisable: minorAmount(9500) })).toBe(0);
    expect(adjustMaterial(item, replacement, { cost: minorAmount(8000), realisable: minorAmount(8000) })).toBe(0);
    expect(adjustMaterial(item, replacement, { cost: minorAmount(8000), realisable: minorAmount(7999) })).toBe(-300);
  });

  // IAS 2, paragraph 13: 6,000.00 of overhead, 160 normal hours.
  it('absorb overhead at normal capacity', () => {
    const absorb = (hours: readonly number[]) => absorbOverhead(minorAmount(600_000), 160, hours);
    expect(absorb([60, 60])).toEqual({ perJob: [225_000, 225_000], unabsorbed: 150_000 });
    expect(absorb([80, 80])).toEqual({ perJob: [300_000, 300_000], unabsorbed: 0 });
    expect(absorb([120, 80])).toEqual({ perJob: [360_000, 240_000], unabsorbed: 0 });
    expect(absorb([])).toEqual({ perJob: [], unabsorbed: 600_000 });
  });
});
