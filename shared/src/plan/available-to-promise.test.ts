import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { afterPromise, cumulativeAvailable, discreteAvailable, firstPeriodFor } from './available-to-promise.js';
import { scheduleLots } from './lot-schedule.js';

const inputs = fc.integer({ min: 1, max: 8 }).chain((periods) => {
  const row = fc.array(fc.oneof(fc.constant(0), fc.nat(40)), { minLength: periods, maxLength: periods });
  return fc.record({ onHand: fc.nat(40), supply: row, promised: row });
});

/** Independent model: is there ever less than nothing? */
function isKept({ onHand, supply, promised }: { onHand: number; supply: number[]; promised: number[] }): boolean {
  let stock = onHand;
  return supply.every((arriving, period) => (stock += arriving - (promised[period] ?? 0)) >= 0);
}

describe('available to promise', () => {
  test('discrete figures add up to what there is less what is promised', () => {
    fc.assert(
      fc.property(inputs, fc.boolean(), (input, lookBack) => {
        const sum = discreteAvailable(input, lookBack).reduce<number>((total, figure) => total + (figure ?? 0), 0);
        const all = [input.onHand, ...input.supply].reduce((total, amount) => total + amount, 0);
        expect(sum).toBe(all - input.promised.reduce((total, amount) => total + amount, 0));
      }),
    );
  });

  test('with look-back nothing is below zero as long as all promises can be kept', () => {
    fc.assert(
      fc.property(inputs.filter(isKept), (input) => {
        for (const figure of discreteAvailable(input, true)) expect(figure ?? 0).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  test('the cumulative figure is exactly the most that can still be promised for a period', () => {
    fc.assert(
      fc.property(inputs.filter(isKept), fc.nat(7), (input, at) => {
        const period = at % input.supply.length;
        const most = cumulativeAvailable(input)[period] ?? 0;
        const withMore = (quantity: number): number[] =>
          input.promised.with(period, (input.promised[period] ?? 0) + quantity);
        expect(isKept({ ...input, promised: withMore(most) })).toBe(true);
        expect(isKept({ ...input, promised: withMore(most + 1) })).toBe(false);
      }),
    );
  });

  test('what remains after a promise is what would be figured with it', () => {
    fc.assert(
      fc.property(inputs.filter(isKept), fc.nat(7), fc.nat(40), (input, at, wish) => {
        const period = at % input.supply.length;
        const cumulative = cumulativeAvailable(input);
        const quantity = Math.min(wish, cumulative[period] ?? 0);
        const promised = input.promised.with(period, (input.promised[period] ?? 0) + quantity);
        expect(afterPromise(cumulative, period, quantity)).toEqual(cumulativeAvailable({ ...input, promised }));
      }),
    );
  });

  test('more than is free cannot be promised', () => {
    expect(() => afterPromise([2, 5], 0, 3)).toThrow('3');
    expect(firstPeriodFor(6, [2, 5])).toBeUndefined();
    expect(firstPeriodFor(0, [2, 5])).toBe(0);
    expect(firstPeriodFor(0, [-1, 5])).toBe(1);
  });

  test.each([
    { onHand: -1, supply: [1], promised: [1] },
    { onHand: 1, supply: [NaN], promised: [1] },
    { onHand: 1, supply: [1], promised: [-1] },
    { onHand: 1, supply: [1, 2], promised: [1] },
    { onHand: Infinity, supply: [1], promised: [1] },
  ])('input that is no set of quantities is refused: %j', (input) => {
    expect(() => discreteAvailable(input)).toThrow();
    expect(() => cumulativeAvailable(input)).toThrow();
  });
});

describe('a schedule of lots', () => {
  test('keeps stock from falling below zero with as few lots as will do', () => {
    const rows = fc.array(fc.tuple(fc.nat(100), fc.nat(100)), { maxLength: 10 });
    fc.assert(
      fc.property(fc.nat(60), rows, fc.integer({ min: 1, max: 80 }), (onHand, weeks, size) => {
        const { lots, projected } = scheduleLots(
          onHand,
          weeks.map(([f]) => f),
          weeks.map(([, p]) => p),
          size,
        );
        projected.forEach((stock, period) => {
          expect(stock).toBeGreaterThanOrEqual(0);
          if ((lots[period] ?? 0) > 0) expect(stock).toBeLessThan(size);
          expect((lots[period] ?? 0) % size).toBe(0);
        });
      }),
    );
    expect(() => scheduleLots(0, [1], [1], 0)).toThrow('cannot be ordered');
  });
});
