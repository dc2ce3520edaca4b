import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { bills } from '../bill/bill.builders.js';
import { type PromisePart, type PromiseQuestion, earliestPromise } from './promise.js';

const structure = bills({
  iron: [
    ['pack', 1],
    ['core', 1],
  ],
  pack: [['cell', 6]],
});
const never = [0, 0, 0, 0, 0, 0];
const part = (more: Partial<PromisePart> = {}): PromisePart => ({ decimals: 0, available: never, ...more });

function ask(
  quantity: number,
  parts: Record<string, PromisePart>,
  freeMinutes = [60, 60, 60, 60, 60, 60],
): PromiseQuestion {
  return { bills: structure, parts: new Map(Object.entries(parts)), freeMinutes, part: 'iron', quantity };
}

const text = (question: PromiseQuestion): string[] => {
  const { period, steps, hindrance } = earliestPromise(question);
  const rows = steps.map((step) => `${step.kind} ${step.quantity.toFixed()} ${step.part} ${step.from}-${step.until}`);
  return [`period ${period}`, ...rows, hindrance === undefined ? 'free' : `${hindrance.kind} ${hindrance.part}`];
};

describe('the first period for which a quantity can be promised', () => {
  test('what is free is promised at once', () => {
    expect(text(ask(2, { iron: part({ available: [2, 2, 2, 2, 2, 2] }) }))).toEqual([
      'period 0',
      'take 2 iron 0-0',
      'free',
    ]);
  });

  test('the rest is made from components and bench hours', () => {
    const parts = {
      iron: part({ available: [1, 1, 1, 1, 1, 1], minutes: 30 }),
      pack: part({ available: [1, 1, 1, 1, 1, 1], minutes: 20 }),
      core: part({ available: [9, 9, 9, 9, 9, 9] }),
      cell: part({ available: [12, 12, 12, 12, 12, 12] }),
    };
    expect(text(ask(3, parts))).toEqual([
      'period 1',
      'take 1 iron 1-1',
      'make 2 iron 1-1',
      'take 1 pack 1-1',
      'make 1 pack 0-1',
      'take 6 cell 0-0',
      'take 2 core 1-1',
      'bench pack',
    ]);
  });

  test('a part that must be bought holds the promise up', () => {
    const parts = {
      iron: part({ minutes: 10 }),
      pack: part({ available: [5, 5, 5, 5, 5, 5] }),
      core: part({ buyingTime: 3 }),
      cell: part(),
    };
    expect(text(ask(2, parts))).toEqual([
      'period 3',
      'make 2 iron 3-3',
      'take 2 pack 3-3',
      'buy 2 core 0-3',
      'part core',
    ]);
  });

  test('what cannot be bought or made is promised for no period', () => {
    const parts = {
      iron: part(),
      pack: part({ available: [1, 1, 1, 1, 1, 1] }),
      core: part({ buyingTime: 0 }),
      cell: part(),
    };
    expect(text(ask(2, parts))).toEqual(['period undefined', 'part cell']);
  });

  test('a shared component is not counted twice', () => {
    const shared: PromiseQuestion = {
      ...ask(1, { iron: part(), board: part(), screw: part({ available: [5, 5, 5, 9, 9, 9] }) }),
      bills: bills({
        iron: [
          ['board', 1],
          ['screw', 3],
        ],
        board: [['screw', 4]],
      }),
    };
    expect(text(shared)[0]).toBe('period 3');
  });

  test('curing time passes between the work and the promise', () => {
    const parts = {
      iron: part({ minutes: 1, makingTime: 2 }),
      pack: part({ available: [1, 1, 1, 1, 1, 1] }),
      core: part({ buyingTime: 0 }),
      cell: part(),
    };
    expect(text(ask(1, parts)).slice(0, 2)).toEqual(['period 2', 'make 1 iron 0-2']);
  });

  test('nothing asked for can be promised at once; a part nobody knows is refused', () => {
    expect(earliestPromise(ask(0, { iron: part() })).period).toBe(0);
    expect(() => earliestPromise(ask(1, {}))).toThrow('iron, used in iron, is not among');
    expect(() => earliestPromise(ask(1, { iron: part() }))).toThrow('pack, used in iron, is not among');
    expect(() => earliestPromise(ask(-1, { iron: part() }))).toThrow('The quantity -1 of iron');
  });

  test('every promise can be kept: no more minutes and no more of any part than there are, all in time', () => {
    const growing = fc.array(fc.nat(6), { minLength: 6, maxLength: 6 }).map((steps) => {
      let sum = 0;
      return steps.map((step) => (sum += step));
    });
    const shop = fc.record({
      iron: fc.record({ available: growing, minutes: fc.nat(90) }),
      pack: fc.record({ available: growing, minutes: fc.nat(60), makingTime: fc.nat(1) }),
      core: fc.record({ available: growing, buyingTime: fc.option(fc.nat(6), { nil: undefined }) }),
      cell: fc.record({ available: growing, buyingTime: fc.option(fc.nat(6), { nil: undefined }) }),
    });
    const bench = fc.array(fc.nat(200), { minLength: 6, maxLength: 6 });
    fc.assert(
      fc.property(shop, bench, fc.nat(9), (rows, freeMinutes, quantity) => {
        const parts = Object.fromEntries(
          Object.entries(rows).map(([key, row]) => [key, part(row as Partial<PromisePart>)]),
        );
        const { period, steps } = earliestPromise(ask(quantity, parts, freeMinutes));
        if (period === undefined) return;
        for (const [key, { available }] of Object.entries(parts)) {
          available.forEach((free, at) => {
            const taken = steps.filter((step) => step.kind === 'take' && step.part === key && step.from <= at);
            expect(taken.reduce((sum, step) => sum + step.quantity.toNumber(), 0)).toBeLessThanOrEqual(free);
          });
        }
        const minutesUntil = (end: number): number =>
          steps
            .filter((step) => step.kind === 'make' && step.until - (parts[step.part]?.makingTime ?? 0) <= end)
            .reduce((sum, step) => sum + step.quantity.toNumber() * Number(parts[step.part]?.minutes ?? 0), 0);
        freeMinutes.forEach((_, end) => {
          expect(minutesUntil(end)).toBeLessThanOrEqual(
            freeMinutes.slice(0, end + 1).reduce((sum, free) => sum + free, 0),
          );
        });
        for (const step of steps) {
          expect(step.from).toBeGreaterThanOrEqual(0);
          expect(step.until).toBeLessThanOrEqual(period);
        }
        if (period > 0) {
          const before = (row: readonly number[]): number[] => row.slice(0, period);
          const shorter = Object.fromEntries(
            Object.entries(parts).map(([key, p]) => [key, { ...p, available: before(p.available) }]),
          );
          expect(earliestPromise(ask(quantity, shorter, before(freeMinutes))).period).toBeUndefined();
        }
      }),
      { numRuns: 300 },
    );
  });
});
