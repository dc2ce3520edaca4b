import { describe, expect, test } from '@jest/globals';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { bills } from './bill.builders.js';
import { explode } from './explode.js';
import { lowLevelCodes } from './low-level-codes.js';

function quantities(rows: ReturnType<typeof explode>): Record<string, number> {
  return Object.fromEntries(rows.map(({ part, quantity }) => [part, quantity.toNumber()]));
}

describe('explosion and low-level codes against published structures', () => {
  test('speaker kit: gross quantities for 50 and the code of the part seen at two levels', () => {
    // Heizer and Render, Operations Management, chapter on material requirements planning, multi-level speaker kit;
    // structure from memory, figures recomputed.
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
    expect(Object.fromEntries(lowLevelCodes(kit))).toEqual({ A: 0, B: 1, C: 1, E: 2, F: 2, D: 3, G: 3 });
    expect(quantities(explode(kit, 'A', 50))).toEqual({ B: 100, C: 150, E: 500, F: 300, D: 800, G: 300 });
  });

  test('a part met at levels one, two, three and four takes the deepest', () => {
    // End-of-chapter problem of Jacobs and Chase, Operations and Supply Chain Management, chapter on material
    // requirements planning; codes worked by hand.
    const rows = bills({
      A: [
        ['B', 1],
        ['C', 1],
      ],
      B: [
        ['D', 3],
        ['F', 1],
      ],
      C: [
        ['B', 3],
        ['D', 1],
        ['E', 4],
      ],
      D: [['E', 1]],
    });
    expect(Object.fromEntries(lowLevelCodes(rows))).toEqual({ A: 0, C: 1, B: 2, D: 3, F: 3, E: 4 });
  });

  test('two end items share a part: constructed, no published source', () => {
    const rows = bills({
      X: [
        ['Y', 1],
        ['Z', 2],
      ],
      Y: [
        ['W', 2],
        ['Z', 1],
      ],
      Z: [['W', 1]],
      V: [['W', 4]],
    });
    expect(Object.fromEntries(lowLevelCodes(rows))).toEqual({ X: 0, V: 0, Y: 1, Z: 2, W: 3 });
    expect(quantities(explode(rows, 'X', 1))).toEqual({ Y: 1, Z: 3, W: 5 });
  });

  test('a cycle is refused and named: constructed, no published source', () => {
    const rows = bills({ P: [['Q', 1]], Q: [['R', 1]], R: [['P', 1]] });
    expect(() => explode(rows, 'P', 1)).toThrow(ArithmeticError);
    expect(() => explode(rows, 'P', 1)).toThrow('P → Q → R → P');
  });
});
