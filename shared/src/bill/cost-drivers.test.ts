import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import type { BillLine, Bills } from './bill-lines.js';
import { line } from './bill.builders.js';
import { attributeCost } from './cost-drivers.js';
import type { CostState } from './cost-state.js';
import { costTables } from './cost-table.js';

const decimals = (rows: Record<string, string | number>): Map<string, Decimal> =>
  new Map(Object.entries(rows).map(([key, value]) => [key, new Decimal(value)]));

function state(
  bills: Record<string, BillLine[]>,
  costs: Record<string, string | number>,
  more: { minutes?: Record<string, number>; labour?: string; overhead?: string } = {},
): CostState {
  return {
    bills: new Map(Object.entries(bills)),
    purchaseCost: decimals(costs),
    minutes: decimals(more.minutes ?? {}),
    labourRate: new Decimal(more.labour ?? 0),
    overheadRate: new Decimal(more.overhead ?? 0),
  };
}

const iron = { iron: [line('1', 'board', 1), line('2', 'screw', 4)], board: [line('1', 'chip', 2, { scrap: '0.2' })] };

describe('cost tables', () => {
  test('adds material, labour and overhead over the levels', () => {
    const rolled = costTables(
      state(iron, { chip: '1.6', screw: '0.05' }, { minutes: { iron: 30, board: 6 }, labour: '24', overhead: '10' }),
      'iron',
    );
    const text = rolled.map((r) => [r.part, r.material, r.labour, r.overhead, r.total].map(String).join(' '));
    expect(text).toEqual(['iron 7.6 12 5 24.6', 'board 4 2.4 1 7.4']);
    expect(rolled[0]?.lines.map((l) => `${l.part} ${l.unitCost.toFixed()} ${l.cost.toFixed()}`)).toEqual([
      'board 7.4 7.4',
      'screw 0.05 0.2',
    ]);
  });

  test('a bought part has nothing to roll up', () => {
    expect(costTables(state({}, { screw: 1 }), 'screw')).toEqual([]);
  });

  test('thirds are not rounded on the way up, and each table adds up', () => {
    const bills = { iron: [line('1', 'sub', 3000)], sub: [line('1', 'wire', '0.001', { scrap: '0.7' })] };
    expect(costTables(state(bills, { wire: '0.1' }), 'iron')[0]?.total.toFixed()).toBe('1');
    const thirds = { iron: ['1', '2', '3'].map((position) => line(position, `p${position}`, 1, { scrap: '0.7' })) };
    const rolled = costTables(state(thirds, { p1: '0.1', p2: '0.1', p3: '0.1' }), 'iron')[0];
    expect(rolled?.lines.map(({ cost }) => cost.toFixed())).toEqual(['0.333334', '0.333333', '0.333333']);
  });

  test.each<[string, CostState]>([
    ['chip has no cost', state(iron, { screw: 1 })],
    ['The cost of chip is below zero', state(iron, { chip: -1, screw: 1 })],
    ['The time of board is below zero', state(iron, { chip: 1, screw: 1 }, { minutes: { board: -1 } })],
    ['The labour rate of', state(iron, { chip: 1, screw: 1 }, { labour: '-1' })],
    ['contains itself', state({ iron: [line('1', 'iron', 1)] }, {})],
  ])('is refused: %s', (reason, bad) => {
    expect(() => costTables(bad, 'iron')).toThrow(reason);
  });
});

describe('what drives a change of cost', () => {
  const drivers = (before: CostState, after: CostState): string[] =>
    attributeCost(before, after, 'iron').drivers.map(({ driver, amount }) => {
      const { kind, ...place } = driver;
      return [kind, ...Object.values(place), amount.toFixed()].join(' ');
    });

  test('nothing changed, no drivers', () => {
    expect(drivers(state(iron, { chip: 1, screw: 1 }), state(iron, { chip: 1, screw: 1 }))).toEqual([]);
  });

  test('a single change is the only driver and has all of it', () => {
    const before = state(iron, { chip: '1.6', screw: '0.05' });
    expect(drivers(before, state(iron, { chip: '2', screw: '0.05' }))).toEqual(['price chip 1']);
    const four = { ...iron, board: [line('1', 'chip', 4, { scrap: '0.2' })] };
    expect(drivers(before, state(four, { chip: '1.6', screw: '0.05' }))).toEqual(['quantity board 1 chip 4']);
    const clean = { ...iron, board: [line('1', 'chip', 2)] };
    expect(drivers(before, state(clean, { chip: '1.6', screw: '0.05' }))).toEqual(['scrap board 1 chip -0.8']);
  });

  test('two factors that change together share the rest alike', () => {
    const before = state({ iron: [line('1', 'screw', 10)] }, { screw: '1' });
    const after = state({ iron: [line('1', 'screw', 12)] }, { screw: '1.5' });
    expect(drivers(before, after)).toEqual(['price screw 5.5', 'quantity iron 1 screw 2.5']);
  });

  test('added, removed and exchanged lines count whole', () => {
    const before = state({ iron: [line('1', 'a', 1), line('2', 'b', 2)] }, { a: 5, b: 1 });
    const after = state({ iron: [line('1', 'c', 1), line('3', 'd', 2)] }, { c: 7, d: 4, a: 9, b: 9 });
    expect(drivers(before, after)).toEqual([
      'line_added iron 3 d 8',
      'part_exchanged iron 1 c 2',
      'line_removed iron 2 b -2',
    ]);
  });

  test('a part that was bought and is made now', () => {
    const before = state({ iron: [line('1', 'pack', 2)] }, { pack: 30 });
    const after = state({ iron: [line('1', 'pack', 2)], pack: [line('1', 'cell', 6)] }, { cell: 4 });
    expect(drivers(before, after)).toEqual(['made_or_bought pack -12']);
  });

  test('rates and minutes', () => {
    const before = state(
      iron,
      { chip: 0, screw: 0 },
      { minutes: { iron: 60, board: 60 }, labour: '20', overhead: '10' },
    );
    const after = state(
      iron,
      { chip: 0, screw: 0 },
      { minutes: { iron: 30, board: 60 }, labour: '24', overhead: '10' },
    );
    expect(drivers(before, after)).toEqual(['minutes iron -16', 'labour_rate 7']);
  });

  /** Independent model: plain recursion over the tree. */
  function costByRecursion(of: CostState, part: string): Decimal {
    const lines = of.bills.get(part);
    if (lines === undefined) return of.purchaseCost.get(part) ?? new Decimal(NaN);
    const hours = (of.minutes.get(part) ?? new Decimal(0)).div(60);
    return lines.reduce(
      (sum, row) =>
        sum.plus(row.quantityPer.times(costByRecursion(of, row.part)).div(new Decimal(1).minus(row.scrapShare))),
      hours.times(of.labourRate.plus(of.overheadRate)),
    );
  }

  const rows = fc.array(
    fc.record({
      parent: fc.nat(3),
      step: fc.integer({ min: 1, max: 4 }),
      per: fc.integer({ min: 1, max: 50 }),
      scrap: fc.constantFrom('0', '0.03', '0.07', '0.3'),
    }),
    { maxLength: 8 },
  );
  const states = fc
    .record({
      rows,
      costs: fc.array(fc.nat(10_000_000), { minLength: 9, maxLength: 9 }),
      minutes: fc.array(fc.nat(100), { minLength: 9, maxLength: 9 }),
      rates: fc.tuple(fc.nat(50), fc.nat(50)),
    })
    .map(({ rows: lines, costs, minutes, rates }): CostState => {
      const bills = new Map<string, BillLine[]>();
      lines.forEach(({ parent, step, per, scrap }, index) => {
        const key = parent === 0 ? 'iron' : `p${parent}`;
        const row = line(`${index}`, `p${parent + step}`, new Decimal(per).div(7).toDecimalPlaces(6).toFixed(), {
          scrap,
        });
        bills.set(key, [...(bills.get(key) ?? []), row]);
      });
      const named = (values: number[], scale: number): Map<string, Decimal> =>
        new Map(values.map((value, index) => [index === 0 ? 'iron' : `p${index}`, new Decimal(value).div(scale)]));
      const [labour, overhead] = rates;
      return {
        bills: bills satisfies Bills,
        purchaseCost: named(costs, 1_000_000),
        minutes: named(minutes, 1),
        labourRate: new Decimal(labour),
        overheadRate: new Decimal(overhead),
      };
    });

  test('a table equals plain recursion, and its tables add up', () => {
    fc.assert(
      fc.property(states, (of) => {
        for (const rolled of costTables(of, 'iron')) {
          expect(rolled.total.minus(costByRecursion(of, rolled.part)).abs().toNumber()).toBeLessThanOrEqual(5e-7);
          const sum = rolled.lines.reduce((total, { cost }) => total.plus(cost), rolled.labour.plus(rolled.overhead));
          expect(sum.toFixed()).toBe(rolled.total.toFixed());
        }
      }),
    );
  });

  test('the drivers of any change add up to it', () => {
    fc.assert(
      fc.property(states, states, (before, after) => {
        const result = attributeCost(before, after, 'iron');
        const sum = result.drivers.reduce((total, { amount }) => total.plus(amount), new Decimal(0));
        expect(sum.toFixed()).toBe(result.after.minus(result.before).toFixed());
      }),
    );
  });

  test('read backward, every driver has the opposite sign', () => {
    fc.assert(
      fc.property(states, states, (before, after) => {
        const signs = (from: CostState, to: CostState, sign: number): string[] =>
          attributeCost(from, to, 'iron')
            .drivers.filter(({ driver }) => ['price', 'minutes', 'labour_rate', 'overhead_rate'].includes(driver.kind))
            .filter(({ amount }) => amount.abs().greaterThan('0.00001'))
            .map(({ driver, amount }) => `${JSON.stringify(driver)} ${Math.sign(amount.toNumber()) * sign}`)
            .toSorted();
        expect(signs(before, after, 1)).toEqual(signs(after, before, -1));
      }),
    );
  });
});
