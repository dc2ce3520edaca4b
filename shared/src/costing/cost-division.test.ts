import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { euro } from '../money/currency.js';
import { minorAmount, sumMinor } from '../money/minor-units.js';
import { costPool, emptyPool } from '../money/movement-value.js';
import { divideBatchCost, type BatchOutcome } from './batch-loss.js';
import { lateCostOnPool, splitLateCost, spreadLandedCost } from './landed-cost.js';
import { absorbOverhead } from './overhead.js';
import { unitCost } from './unit-cost.js';
import { adjustToRealisable, netRealisableValue } from './write-down.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};
const batch = (change: Partial<Record<keyof BatchOutcome, number | string>>): BatchOutcome => {
  const all = { started: 100, good: 92, normalLoss: 5, cost: 100_000, salvage: 0, ...change };
  return {
    started: Number(all.started),
    good: Number(all.good),
    normalLoss: all.normalLoss,
    cost: minorAmount(Number(all.cost)),
    salvage: minorAmount(Number(all.salvage)),
  };
};

describe('the loss of a batch', () => {
  it('is spread over the good pieces while it is normal', () => {
    const outcome = divideBatchCost(batch({ good: 95 }));
    expect([outcome.good, outcome.abnormalLoss, outcome.abnormalPieces.toNumber()]).toEqual([100_000, 0, 0]);
    expect(new Set(outcome.perPiece)).toEqual(new Set([1053, 1052]));
  });

  it('is expensed beyond that, at the cost of a good piece', () => {
    // Common practice of process costing: 1,000.00 ÷ (100 − 5) = 10.5263 a piece; 3 pieces lost beyond the normal.
    const outcome = divideBatchCost(batch({}));
    expect([outcome.good, outcome.abnormalLoss, outcome.abnormalPieces.toNumber()]).toEqual([96_842, 3_158, 3]);
    expect(sumMinor(outcome.perPiece)).toBe(96_842);
  });

  it('brings its salvage to whoever bears it', () => {
    // 8 lost pieces bring 80.00: 50.00 of it belongs to the normal loss, 30.00 to the abnormal one.
    const outcome = divideBatchCost(batch({ salvage: 8_000 }));
    expect([outcome.good, outcome.abnormalLoss]).toEqual([92_000, 0]);
  });

  it('below the normal makes the pieces cheaper and is no gain', () => {
    const outcome = divideBatchCost(batch({ good: 98 }));
    expect([outcome.good, outcome.abnormalLoss, outcome.perPiece.length]).toEqual([100_000, 0, 98]);
  });

  it('may be all there is', () => {
    const outcome = divideBatchCost(batch({ good: 0 }));
    expect([outcome.good, outcome.abnormalLoss, outcome.perPiece]).toEqual([0, 100_000, []]);
    expect(divideBatchCost(batch({ started: 0, good: 0, cost: 0 }))).toMatchObject({ good: 0, abnormalLoss: 0 });
  });

  it.each<[Partial<Record<keyof BatchOutcome, number | string>>, string]>([
    [{ good: 101 }, 'costing_more_good_than_started'],
    [{ good: -1 }, 'costing_quantity_negative'],
    [{ started: 1.5 }, 'costing_quantity_negative'],
    [{ normalLoss: -1 }, 'costing_quantity_negative'],
    [{ cost: -1 }, 'costing_value_negative'],
    [{ salvage: -1 }, 'costing_value_negative'],
    [{ cost: 1, salvage: 8_000 }, 'costing_value_negative'],
    [{ good: 0, normalLoss: 100 }, 'costing_nothing_good'],
  ])('cannot be divided with %p', (change, code) => {
    expect(codeOf(() => divideBatchCost(batch(change)))).toBe(code);
  });

  it('leaves no cost unborne', () => {
    const outcomes = fc
      .record({
        started: fc.integer({ min: 1, max: 60 }),
        lost: fc.integer({ min: 0, max: 59 }),
        normal: fc.integer({ min: 0, max: 100 }),
        cost: fc.integer({ min: 10_000, max: 1_000_000 }),
        salvage: fc.integer({ min: 0, max: 10_000 }),
      })
      .filter(({ started, lost }) => lost < started);
    fc.assert(
      fc.property(outcomes, ({ started, lost, normal, cost, salvage }) => {
        const good = started - lost;
        const outcome = divideBatchCost(batch({ started, good, normalLoss: String(normal / 10), cost, salvage }));
        expect(outcome.good + outcome.abnormalLoss).toBe(cost - salvage);
        expect(sumMinor(outcome.perPiece)).toBe(outcome.good);
        expect(Math.max(...outcome.perPiece) - Math.min(...outcome.perPiece)).toBeLessThanOrEqual(1);
      }),
    );
  });
});

describe('a late cost', () => {
  it('goes where the goods went', () => {
    const places = [
      { name: 'shelf', quantity: 60 },
      { name: 'bench', quantity: '15' },
      { name: 'sold', quantity: 25 },
    ];
    expect(splitLateCost(minorAmount(1_001), 100, places)).toEqual([601, 150, 250]);
    expect(splitLateCost(minorAmount(-1_001), 100, places)).toEqual([-601, -150, -250]);
  });

  it('under a moving average belongs to stock as far as the pool still reaches', () => {
    expect(lateCostOnPool(minorAmount(1_000), 100, costPool(25, minorAmount(5_000)))).toMatchObject({
      toStock: 250,
      toCostOfSales: 750,
      pool: { value: 5_250 },
    });
    expect(lateCostOnPool(minorAmount(1_000), 100, costPool(300, minorAmount(5_000)))).toMatchObject({
      toStock: 1_000,
      toCostOfSales: 0,
    });
  });

  it('leaves an empty pool empty', () => {
    expect(lateCostOnPool(minorAmount(1_000), 100, emptyPool)).toEqual({
      toStock: 0,
      toCostOfSales: 1_000,
      pool: emptyPool,
    });
  });

  it.each<[string, () => unknown, string]>([
    [
      'goods not accounted for',
      () => splitLateCost(minorAmount(1), 5, [{ name: 'shelf', quantity: 4 }]),
      'costing_destinations_differ',
    ],
    ['nothing received', () => splitLateCost(minorAmount(1), 0, []), 'costing_nothing_to_spread_over'],
    [
      'a negative place',
      () =>
        splitLateCost(minorAmount(1), 0, [
          { name: 'a', quantity: -1 },
          { name: 'b', quantity: 1 },
        ]),
      'costing_nothing_to_spread_over',
    ],
    ['a receipt of nothing', () => lateCostOnPool(minorAmount(1), 0, emptyPool), 'costing_quantity_not_positive'],
    [
      'a credit above the value',
      () => lateCostOnPool(minorAmount(-10), 1, costPool(1, minorAmount(5))),
      'money_pool_broken',
    ],
    [
      'lines without weight',
      () => spreadLandedCost(minorAmount(1), [{ quantity: 1, value: minorAmount(1), weight: 0 }], 'weight'),
      'costing_nothing_to_spread_over',
    ],
    ['no lines', () => spreadLandedCost(minorAmount(1), [], 'value'), 'costing_nothing_to_spread_over'],
  ])('is refused for %s', (_what, compute, code) => {
    expect(codeOf(compute)).toBe(code);
  });
});

describe('the own cost of a unit', () => {
  const rates = { currency: euro, labourPerHour: '32.50', overheadPerHour: '11.4' };

  it('is its materials, its minutes, and overhead on them', () => {
    expect(unitCost({ materials: [minorAmount(4_120), minorAmount(380)], minutes: '95' }, rates)).toEqual({
      materials: 4_500,
      labour: 5_146,
      overhead: 1_805,
      total: 11_451,
    });
    expect(unitCost({ materials: [], minutes: 0 }, rates).total).toBe(0);
  });

  it.each<[string, () => unknown, string]>([
    ['negative minutes', () => unitCost({ materials: [], minutes: -1 }, rates), 'costing_quantity_negative'],
    [
      'a negative material',
      () => unitCost({ materials: [minorAmount(-1)], minutes: 1 }, rates),
      'costing_value_negative',
    ],
    [
      'a negative rate',
      () => unitCost({ materials: [], minutes: 1 }, { ...rates, labourPerHour: -1 }),
      'costing_quantity_negative',
    ],
  ])('is refused for %s', (_what, compute, code) => {
    expect(codeOf(compute)).toBe(code);
  });
});

describe('overhead', () => {
  it('is all borne, never above what a normal hour costs', () => {
    fc.assert(
      fc.property(
        fc.nat(10_000_000),
        fc.integer({ min: 1, max: 400 }),
        fc.array(fc.nat(100), { maxLength: 8 }),
        (overhead, normal, hours) => {
          const absorbed = absorbOverhead(minorAmount(overhead), normal, hours);
          expect(sumMinor(absorbed.perJob) + absorbed.unabsorbed).toBe(overhead);
          absorbed.perJob.forEach((amount, index) =>
            expect(amount).toBeLessThanOrEqual(((hours[index] ?? 0) * overhead) / normal + 1),
          );
        },
      ),
    );
  });

  it('needs a capacity and is not negative', () => {
    expect(codeOf(() => absorbOverhead(minorAmount(1), 0, [1]))).toBe('costing_capacity_not_positive');
    expect(codeOf(() => absorbOverhead(minorAmount(-1), 1, [1]))).toBe('costing_value_negative');
    expect(codeOf(() => absorbOverhead(minorAmount(1), 1, [-1]))).toBe('money_weight_negative');
  });
});

describe('net realisable value', () => {
  it('never falls below nothing', () => {
    expect(netRealisableValue({ price: minorAmount(5), completion: minorAmount(4), selling: minorAmount(3) })).toBe(0);
  });

  it('cannot raise an item above its cost', () => {
    const wrong = { cost: minorAmount(5), carrying: minorAmount(6) };
    expect(codeOf(() => adjustToRealisable(wrong, minorAmount(9)))).toBe('costing_carrying_above_cost');
    expect(codeOf(() => adjustToRealisable({ cost: minorAmount(5), carrying: minorAmount(-1) }, minorAmount(9)))).toBe(
      'costing_value_negative',
    );
  });
});
