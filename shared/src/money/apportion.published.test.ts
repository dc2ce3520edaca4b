import { describe, expect, it } from '@jest/globals';
import type { DecimalInput } from '../measure/decimal.js';
import { apportion } from './apportion.js';
import { minorAmount } from './minor-units.js';

describe('the largest remainder', () => {
  // Ten seats among six parties: the example of the encyclopaedia article "Largest remainder method" (Hare quota),
  // from memory.
  it('gives the seats of the well-known example', () => {
    expect(apportion(minorAmount(10), [47000, 16000, 15800, 12000, 6100, 3100])).toEqual([5, 2, 1, 1, 1, 0]);
  });

  // Constructed with exact rationals, no source.
  it.each<[number, readonly DecimalInput[], readonly number[]]>([
    [10000, [1, 1, 1], [3334, 3333, 3333]],
    [1, [1, 1, 1], [1, 0, 0]],
    [4783, ['630.0', '42.0', '50.8'], [4169, 278, 336]],
    [999, ['0.5', '0.25', '0.25'], [499, 250, 250]],
  ])('splits %i by %p', (total, weights, shares) => {
    expect(apportion(minorAmount(total), weights)).toEqual(shares);
  });
});
