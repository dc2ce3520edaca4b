import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { minorAmount } from '../money/minor-units.js';
import { copper } from './conductor-material.js';
import { cheapestPacks, type Pack } from './pack-choice.js';
import { stockPerMeasure, toStockMeasure, type PartMeasures } from './part-measure.js';
import { purchasableQuantity, type PurchaseRule } from './purchasable.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('the measures of a part', () => {
  const wire: PartMeasures = {
    stock: 'm',
    factors: { reel: '250', kg: '570' },
    wire: { material: copper, diameterMillimetres: '0.5', strands: 1 },
  };

  it('take the part’s own factor first, then the units, then the geometry', () => {
    expect(toStockMeasure(2, 'reel', wire).quantity.toFixed()).toBe('500');
    expect(toStockMeasure('0.5', 'kg', wire).quantity.toFixed()).toBe('285');
    expect(toStockMeasure(1500, 'mm', wire).quantity.toFixed()).toBe('1.5');
    expect(toStockMeasure('500', 'g', wire).quantity.toFixed()).toBe('286.443092');
    expect(toStockMeasure('7', 'm', wire).quantity.toFixed()).toBe('7');
  });

  it('weigh a wire that is kept by the gram', () => {
    expect(toStockMeasure(10, 'm', { ...wire, stock: 'g', factors: {} }).quantity.toFixed()).toBe('17.455474');
  });

  it('say what rounding did', () => {
    const third = toStockMeasure(1, 'third', { stock: 'mm', factors: { third: '333.33333' } });
    expect([third.quantity.toFixed(), third.roundedBy.toFixed()]).toEqual(['333.333', '-0.00033']);
    expect(stockPerMeasure('third', { stock: 'mm', factors: { third: '333.33333' } }).toFixed()).toBe('333.33333');
  });

  it.each<[string, PartMeasures, string]>([
    ['kg', { stock: 'piece', factors: {} }, 'measure_no_conversion'],
    ['set', { stock: 'piece', factors: {} }, 'measure_no_conversion'],
    ['pair', { stock: 'piece', factors: {} }, 'measure_no_conversion'],
    ['g', { stock: 'm', factors: {} }, 'measure_no_conversion'],
    ['box', { stock: 'piece', factors: {} }, 'measure_unknown_unit'],
    ['box', { stock: 'piece', factors: { box: 0 } }, 'measure_factor_not_positive'],
    ['toString', { stock: 'piece', factors: {} }, 'measure_unknown_unit'],
  ])('do not turn %s into %p', (measure, part, code) => {
    expect(codeOf(() => toStockMeasure(1, measure, part))).toBe(code);
  });
});

describe('what can be ordered', () => {
  const order = (need: string, rule: PurchaseRule) => {
    const { order: quantity, leftOver } = purchasableQuantity(need, rule);
    return [quantity.toFixed(), leftOver.toFixed()];
  };

  it.each<[string, PurchaseRule, [string, string]]>([
    ['17', {}, ['17', '0']],
    ['17', { multiple: 10 }, ['20', '3']],
    ['20', { multiple: 10 }, ['20', '0']],
    ['17', { minimum: 50 }, ['50', '33']],
    ['17', { minimum: 25, multiple: 10 }, ['30', '13']],
    ['0.3', { multiple: '0.1' }, ['0.3', '0']],
    ['0.31', { multiple: '0.1' }, ['0.4', '0.09']],
    ['0', { minimum: 50 }, ['0', '0']],
    ['-3', { minimum: 50 }, ['0', '3']],
  ])('for %s under %p is %p', (need, rule, expected) => {
    expect(order(need, rule)).toEqual(expected);
  });

  it('refuses packs of nothing', () => {
    expect(codeOf(() => purchasableQuantity(1, { multiple: 0 }))).toBe('measure_pack_size');
    expect(codeOf(() => purchasableQuantity(1, { minimum: -1 }))).toBe('measure_pack_size');
  });
});

describe('the cheapest packs', () => {
  const pack = (size: number | string, price: number): Pack => ({ size, price: minorAmount(price) });
  const choose = (need: number | string, packs: readonly Pack[]) => {
    const { counts, price, leftOver } = cheapestPacks(need, packs);
    return [counts, price, leftOver.toFixed()];
  };

  it('mix sizes, and buy more where more is cheaper', () => {
    expect(choose(37, [pack(10, 100), pack(25, 220), pack(1, 15)])).toEqual([[1, 1, 2], 350, '0']);
    expect(choose(90, [pack(10, 100), pack(100, 800)])).toEqual([[0, 1], 800, '10']);
    expect(choose('2.5', [pack('0.5', 60), pack('2', 200)])).toEqual([[1, 1], 260, '0']);
    expect(choose('2.3', [pack('0.5', 60)])).toEqual([[5], 300, '0.2']);
  });

  it('cost nothing for no need, and prefer less left over at the same price', () => {
    expect(choose(0, [pack(10, 100)])).toEqual([[0], 0, '0']);
    expect(choose(5, [pack(10, 100), pack(6, 100)])).toEqual([[0, 1], 100, '1']);
    expect(choose(7, [pack(4, 0), pack(7, 0)])).toEqual([[0, 1], 0, '0']);
  });

  it('are found at once for a very large need', () => {
    // Forty million packs of 25, and for the last seven three packs of three, which is cheaper than one of ten.
    expect(choose(1_000_000_007, [pack(10, 100), pack(25, 220), pack(3, 29)])).toEqual([
      [0, 40_000_000, 3],
      8_800_000_087,
      '2',
    ]);
  });

  it.each<[readonly Pack[], string]>([
    [[], 'measure_pack_size'],
    [[pack(0, 5)], 'measure_pack_size'],
    [[pack(1, -5)], 'measure_pack_price'],
    [[pack(1, 5), pack('1.0000001', 4)], 'measure_packs_too_fine'],
  ])('refuse %p', (packs, code) => {
    expect(codeOf(() => cheapestPacks(10, packs))).toBe(code);
  });

  it('agree with trying everything', () => {
    const packs = fc.array(
      fc.record({ size: fc.integer({ min: 1, max: 9 }), price: fc.integer({ min: 0, max: 30 }) }),
      {
        minLength: 1,
        maxLength: 3,
      },
    );
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 40 }), packs, (need, list) => {
        let best = [Infinity, Infinity];
        const tryAll = (index: number, held: number, price: number): void => {
          if (held >= need) {
            if (price < (best[0] ?? 0) || (price === best[0] && held < (best[1] ?? 0))) best = [price, held];
            return;
          }
          const next = list[index];
          if (!next) return;
          tryAll(index + 1, held, price);
          tryAll(index, held + next.size, price + next.price);
        };
        tryAll(0, 0, 0);
        const chosen = cheapestPacks(
          need,
          list.map(({ size, price }) => pack(size, price)),
        );
        expect([chosen.price, chosen.leftOver.toNumber() + need]).toEqual(best);
        const sizes = chosen.counts.map((count, index) => count * (list[index]?.size ?? 0));
        expect(sizes.reduce((sum, size) => sum + size, 0)).toBe(best[1]);
      }),
    );
  });
});
