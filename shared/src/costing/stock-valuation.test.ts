import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { Decimal } from '../measure/decimal.js';
import { minorAmount, sumMinor } from '../money/minor-units.js';
import { costPool, emptyPool } from '../money/movement-value.js';
import { addLayer, issueFifo, layersValue, type CostLayer } from './fifo.js';
import { periodicAverage } from './periodic-average.js';
import { returnValue } from './returned-goods.js';
import { fifoValuation, movingAverageValuation, type StockEvent } from './stock-valuation.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};
const layer = (id: string, order: number, quantity: string | number, value: number): CostLayer => ({
  id,
  order,
  quantity: new Decimal(quantity),
  value: minorAmount(value),
});

describe('first in, first out', () => {
  const layers = [layer('B', 2, 4, 1240), layer('A', 1, 3, 1000)];

  it('takes the oldest first, whatever the order they are given in', () => {
    const issue = issueFifo(layers, 5);
    expect(issue.value).toBe(-1620);
    expect(issue.shares.map(({ id, quantity, value }) => [id, quantity.toFixed(), value])).toEqual([
      ['A', '3', 1000],
      ['B', '2', 620],
    ]);
    expect(issue.layers.map(({ id, quantity, value }) => [id, quantity.toFixed(), value])).toEqual([['B', '2', 620]]);
  });

  it('leaves later layers as they were', () => {
    const issue = issueFifo([...layers, layer('C', 3, 1, 5)], 1);
    expect(issue.layers.map(({ id, quantity, value }) => [id, quantity.toFixed(), value])).toEqual([
      ['A', '2', 667],
      ['B', '4', 1240],
      ['C', '1', 5],
    ]);
  });

  it('gives the last piece of a layer the odd cent', () => {
    const first = issueFifo([layer('A', 1, 3, 1000)], 1);
    const second = issueFifo(first.layers, 1);
    const third = issueFifo(second.layers, 1);
    expect([first.value, second.value, third.value]).toEqual([-333, -334, -333]);
    expect(third.layers).toEqual([]);
    expect(layersValue(third.layers)).toBe(0);
  });

  it('puts goods that come back on the layer they left', () => {
    const issue = issueFifo(layers, 5);
    const back = issue.shares.reduce<readonly CostLayer[]>((all, share) => addLayer(all, share), issue.layers);
    expect(back.map(({ id, quantity, value }) => [id, quantity.toFixed(), value])).toEqual([
      ['A', '3', 1000],
      ['B', '4', 1240],
    ]);
  });

  it.each<[string, () => unknown, string]>([
    ['more than is held', () => issueFifo(layers, '7.000001'), 'costing_more_than_held'],
    ['nothing', () => issueFifo(layers, 0), 'costing_quantity_not_positive'],
    ['less than nothing', () => issueFifo(layers, -1), 'costing_quantity_not_positive'],
    ['from nothing', () => issueFifo([], 1), 'costing_more_than_held'],
    ['from a broken layer', () => issueFifo([layer('A', 1, 1, -1)], 1), 'costing_layer_broken'],
    ['from an empty layer', () => issueFifo([layer('A', 1, 0, 0)], 1), 'costing_layer_broken'],
    ['and does not add an empty layer', () => addLayer([], layer('A', 1, 0, 5)), 'costing_layer_broken'],
  ])('does not issue %s', (_what, compute, code) => {
    expect(codeOf(compute)).toBe(code);
  });
});

describe('goods that come back', () => {
  const issue = { quantity: 3, value: minorAmount(1000) };

  it('come back at what they were issued at, the last taking the remainder', () => {
    const first = returnValue(issue, { quantity: 0, value: minorAmount(0) }, 1);
    const second = returnValue(issue, { quantity: 1, value: first }, 1);
    const third = returnValue(issue, { quantity: 2, value: sumMinor([first, second]) }, 1);
    expect([first, second, third]).toEqual([333, 334, 333]);
  });

  it.each<[string, number, number, number, string]>([
    ['more than went out', 0, 0, 4, 'costing_return_too_large'],
    ['more than is still out', 2, 667, 2, 'costing_return_too_large'],
    ['nothing', 0, 0, 0, 'costing_quantity_not_positive'],
    ['against records that do not fit', 1, 1001, 1, 'money_pool_broken'],
  ])('do not come back: %s', (_what, quantity, value, now, code) => {
    expect(codeOf(() => returnValue(issue, { quantity, value: minorAmount(value) }, now))).toBe(code);
  });
});

describe('the average of a period', () => {
  it('of an empty period is nothing', () => {
    expect(periodicAverage({ opening: emptyPool, receipts: [], issues: [] })).toEqual({
      costOfIssues: 0,
      perIssue: [],
      closing: emptyPool,
    });
  });

  it('leaves nothing when all is issued', () => {
    const all = periodicAverage({
      opening: costPool(1, minorAmount(100)),
      receipts: [costPool(2, minorAmount(1))],
      issues: [1, 1, 1],
    });
    expect(all).toEqual({ costOfIssues: 101, perIssue: [34, 34, 33], closing: emptyPool });
  });

  it('refuses to issue what is not there, or nothing', () => {
    expect(codeOf(() => periodicAverage({ opening: emptyPool, receipts: [], issues: [1] }))).toBe(
      'costing_more_than_held',
    );
    expect(codeOf(() => periodicAverage({ opening: emptyPool, receipts: [], issues: [0] }))).toBe(
      'costing_quantity_not_positive',
    );
  });
});

/** A history in which each issue takes at most what is held: quantities in thousandths. */
const histories = fc
  .array(
    fc.record({
      kind: fc.constantFrom('in', 'out'),
      thousandths: fc.integer({ min: 1, max: 20_000 }),
      value: fc.integer({ min: 0, max: 100_000 }),
    }),
    { maxLength: 40 },
  )
  .map((steps) => {
    let held = 0;
    return steps.flatMap(({ kind, thousandths, value }): StockEvent[] => {
      const quantity = kind === 'in' ? thousandths : Math.min(thousandths, held);
      held += kind === 'in' ? quantity : -quantity;
      if (quantity === 0) return [];
      const text = new Decimal(quantity).div(1000);
      return [
        kind === 'in' ? { kind: 'in', quantity: text, value: minorAmount(value) } : { kind: 'out', quantity: text },
      ];
    });
  });
const receipts = (events: readonly StockEvent[]) =>
  events.flatMap((event) => (event.kind === 'in' ? [event.value] : [])).reduce((sum, value) => sum + value, 0);

describe('every history', () => {
  it('loses nothing and leaves zero at zero, under either method', () => {
    fc.assert(
      fc.property(histories, (events) => {
        for (const valuation of [fifoValuation(events), movingAverageValuation(events)]) {
          expect(valuation.costOfIssues + valuation.closing.value).toBe(receipts(events));
          expect(sumMinor(valuation.perIssue)).toBe(valuation.costOfIssues);
          expect(Math.min(0, ...valuation.perIssue, valuation.closing.value)).toBe(0);
          if (valuation.closing.quantity.isZero()) expect(valuation.closing.value).toBe(0);
        }
      }),
    );
  });

  it('under FIFO with whole cents per piece costs what a queue of single pieces costs', () => {
    const steps = fc.array(
      fc.record({ kind: fc.constantFrom('in', 'out'), pieces: fc.integer({ min: 1, max: 9 }), cents: fc.nat(500) }),
      { maxLength: 30 },
    );
    fc.assert(
      fc.property(steps, (list) => {
        const queue: number[] = [];
        const expected: number[] = [];
        const events = list.flatMap(({ kind, pieces, cents }): StockEvent[] => {
          if (kind === 'in') {
            queue.push(...Array.from({ length: pieces }, () => cents));
            return [{ kind: 'in', quantity: pieces, value: minorAmount(pieces * cents) }];
          }
          const taken = queue.splice(0, pieces);
          if (taken.length === 0) return [];
          expected.push(taken.reduce((sum, value) => sum + value, 0));
          return [{ kind: 'out', quantity: taken.length }];
        });
        const valuation = fifoValuation(events);
        expect(valuation.perIssue).toEqual(expected);
        expect(valuation.closing.value).toBe(queue.reduce((sum, value) => sum + value, 0));
      }),
    );
  });

  it('costs the same in a period whether issues come early or late', () => {
    const pools = fc.array(
      fc
        .record({ quantity: fc.integer({ min: 1, max: 50 }), value: fc.nat(10_000) })
        .map(({ quantity, value }) => costPool(quantity, minorAmount(value))),
      { minLength: 1, maxLength: 6 },
    );
    fc.assert(
      fc.property(pools, fc.array(fc.integer({ min: 1, max: 9 }), { maxLength: 6 }), (list, issues) => {
        const [opening = emptyPool, ...rest] = list;
        const held = list.reduce((sum, pool) => sum + pool.quantity.toNumber(), 0);
        const asked = issues.reduce((sum, quantity) => sum + quantity, 0);
        fc.pre(asked <= held);
        const forward = periodicAverage({ opening, receipts: rest, issues });
        const backward = periodicAverage({ opening, receipts: [...rest].reverse(), issues: [...issues].reverse() });
        expect(forward.costOfIssues).toBe(backward.costOfIssues);
        expect(forward.costOfIssues + forward.closing.value).toBe(list.reduce((sum, pool) => sum + pool.value, 0));
        expect(sumMinor(forward.perIssue)).toBe(forward.costOfIssues);
        if (forward.closing.quantity.isZero()) expect(forward.closing.value).toBe(0);
      }),
    );
  });
});
