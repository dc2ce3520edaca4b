import { expect, test } from '@jest/globals';
import { discountedOrder } from './discounted-order.js';

test('three price bands: 1,000 at a time for 24,725 a year', () => {
  // J. Heizer and B. Render, Operations Management, quantity discount example; the answer of 1,000 was seen in public
  // copies, the rest is from memory and recomputed.
  const bands = [
    { from: 1, price: 5 },
    { from: 1000, price: 4.8 },
    { from: 2000, price: 4.75 },
  ];
  const { rows, best } = discountedOrder(5000, 49, 0.2, bands);
  expect(rows.map(({ order }) => order)).toEqual([700, 1000, 2000]);
  [25_700, 24_725, 24_822.5].forEach((total, index) => expect(rows[index]?.total).toBeCloseTo(total, 2));
  [700, 714.435, 718.185].forEach((economic, index) => expect(rows[index]?.economic).toBeCloseTo(economic, 3));
  expect([best.order, best.total]).toEqual([1000, 24_725]);
});
