import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { discountedOrder } from './discounted-order.js';
import { type PurchaseNeed, type SupplierOffer, purchaseOptions } from './purchase-choice.js';

const offer = (supplier: string, breaks: Record<string, string>, more: Partial<SupplierOffer> = {}): SupplierOffer => ({
  supplier,
  breaks: Object.entries(breaks).map(([from, unitPrice]) => ({ from, unitPrice })),
  orderCost: 0,
  leadTime: 5,
  ...more,
});

const text = (need: PurchaseNeed, offers: SupplierOffer[]): string[] =>
  purchaseOptions(need, offers).map((o) =>
    [o.supplier, o.quantity, o.unitPrice, o.paid, o.surplus, o.effective, o.inTime].join(' '),
  );

describe('where to buy how much', () => {
  test('a larger quantity at a lower price can cost less in all', () => {
    expect(text({ quantity: 90 }, [offer('reel house', { 1: '1.00', 100: '0.80' })])).toEqual([
      'reel house 100 0.8 80 10 80 true',
      'reel house 90 1 90 0 90 true',
    ]);
  });

  test('order costs, minimum and multiple count', () => {
    const near = offer('near', { 1: '1.10' }, { orderCost: 2 });
    const far = offer('far', { 1: '1.00' }, { orderCost: 15, minimum: 50, multiple: 25 });
    expect(text({ quantity: 60 }, [near, far])).toEqual(['near 60 1.1 68 0 68 true', 'far 75 1 90 15 90 true']);
  });

  test('surplus that is used later counts, less what holding it costs', () => {
    const two = [offer('packs', { 1: '0.90' }, { multiple: 100 }), offer('loose', { 1: '1.20' })];
    expect(text({ quantity: 60 }, two)[0]).toBe('loose 60 1.2 72 0 72 true');
    expect(text({ quantity: 60, usedLater: 40 }, two)[0]).toBe('packs 100 0.9 90 40 54 true');
    expect(text({ quantity: 60, usedLater: 40, holdingShare: '0.6' }, two)[0]).toBe('loose 60 1.2 72 0 72 true');
  });

  test('who delivers too late comes last, however cheap', () => {
    const two = [offer('slow', { 1: '0.10' }, { leadTime: 30 }), offer('quick', { 1: '9' }, { leadTime: 2 })];
    expect(text({ quantity: 1, withinLeadTime: 10 }, two)).toEqual([
      'quick 1 9 9 0 9 true',
      'slow 1 0.1 0.1 0 0.1 false',
    ]);
  });

  test('nothing wanted, no offers, or no price: no options', () => {
    expect(text({ quantity: 0 }, [offer('a', { 1: '1' })])).toEqual([]);
    expect(text({ quantity: 5 }, [])).toEqual([]);
    expect(text({ quantity: 5 }, [offer('a', {})])).toEqual([]);
  });

  test.each([
    offer('bad', { 1: '-1' }),
    offer('bad', { 1: '1', '1.0': '2' }),
    offer('bad', { 1: '1' }, { orderCost: -1 }),
  ])('a broken offer is refused (%#)', (bad) => {
    expect(() => purchaseOptions({ quantity: 1 }, [bad])).toThrow('bad');
  });

  test('no quantity from one supplier costs less than the best option', () => {
    const breaks = fc.uniqueArray(fc.tuple(fc.integer({ min: 1, max: 60 }), fc.nat(50)), {
      selector: ([from]) => from,
      minLength: 1,
      maxLength: 4,
    });
    fc.assert(
      fc.property(
        breaks,
        fc.integer({ min: 1, max: 40 }),
        fc.integer({ min: 1, max: 7 }),
        (rows, quantity, multiple) => {
          const withFirst: [number, number][] = [[1, 50], ...rows.filter(([from]) => from > 1)];
          const only = offer('only', Object.fromEntries(withFirst.map(([from, price]) => [from, `${price}`])), {
            multiple,
          });
          const best = purchaseOptions({ quantity }, [only])[0];
          for (let bought = 0; bought <= 200; bought += multiple) {
            if (bought < quantity) continue;
            const price = withFirst.filter(([from]) => from <= bought).toSorted((a, b) => b[0] - a[0])[0]?.[1] ?? 0;
            expect(best?.paid.toNumber()).toBeLessThanOrEqual(bought * price);
          }
        },
      ),
    );
  });
});

describe('order size under discounts', () => {
  test('no order size costs less than the best', () => {
    const bands = fc.uniqueArray(fc.tuple(fc.integer({ min: 2, max: 500 }), fc.integer({ min: 1, max: 100 })), {
      selector: ([from]) => from,
      maxLength: 3,
    });
    fc.assert(
      fc.property(
        bands,
        fc.integer({ min: 1, max: 5000 }),
        fc.integer({ min: 1, max: 100 }),
        fc.integer({ min: 1, max: 800 }),
        (rows, demand, orderCost, tried) => {
          // Discounts: prices fall as quantities rise.
          const prices = rows.map(([, price]) => price).toSorted((a, b) => b - a);
          const froms = rows.map(([from]) => from).toSorted((a, b) => a - b);
          const all = [{ from: 1, price: 101 }, ...froms.map((from, index) => ({ from, price: prices[index] ?? 1 }))];
          const price = all.findLast(({ from }) => from <= tried)?.price ?? 101;
          const cost = (demand / tried) * orderCost + (tried / 2) * 0.2 * price + demand * price;
          expect(discountedOrder(demand, orderCost, 0.2, all).best.total).toBeLessThanOrEqual(cost * (1 + 1e-12));
        },
      ),
    );
  });

  test('bands that make no sense are refused', () => {
    expect(() => discountedOrder(1, 1, 0.2, [])).toThrow();
    expect(() => discountedOrder(1, 1, 0.2, [{ from: 1, price: 0 }])).toThrow();
  });
});
