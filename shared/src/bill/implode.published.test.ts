import { expect, test } from '@jest/globals';
import { bills } from './bill.builders.js';
import { implode } from './implode.js';

test('speaker kit: every part above the one seen at two levels, with what one of each takes', () => {
  // Heizer and Render, Operations Management, chapter on material requirements planning, multi-level speaker kit;
  // structure from memory. 50 kits take 800 of D there, so one takes 16.
  const kit = bills({
    A: [
      ['B', 2],
      ['C', 3],
    ],
    B: [
      ['D', 2],
      ['E', 2],
    ],
    C: [
      ['E', 2],
      ['F', 2],
    ],
    F: [
      ['D', 2],
      ['G', 1],
    ],
  });
  const rows = implode(kit, 'D').map(({ part, quantity }) => [part, quantity.toNumber()]);
  expect(Object.fromEntries(rows)).toEqual({ B: 2, F: 2, C: 4, A: 16 });
});
