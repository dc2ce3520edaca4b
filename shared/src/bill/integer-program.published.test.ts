import { describe, expect, test } from '@jest/globals';
import { type IntegerProgram, solveIntegerProgram } from './integer-program.js';

/** Maximise, as the books write it; whole-number data. */
function maximise(gains: number[], rows: number[][], limits: number[], upper: number): IntegerProgram {
  return {
    variables: gains.map((gain) => ({ lower: 0, upper, cost: -gain })),
    rows: rows.map((row, index) => ({
      terms: row.map((coefficient, variable) => ({ variable, coefficient: BigInt(coefficient) })),
      limit: BigInt(limits[index] ?? 0),
    })),
  };
}

function best(program: IntegerProgram): readonly number[] {
  const answer = solveIntegerProgram(program, { first: false, budget: { branchings: 1000, work: 1e9 } });
  if (answer.status !== 'found' || !answer.proven) throw new Error(`not proven: ${answer.status}`);
  return answer.values;
}

describe('whole-number programs with published optima', () => {
  test('tables and chairs: 5 and 0, worth 40', () => {
    // W. L. Winston, Operations Research, branch-and-bound example (from memory, recomputed).
    expect(
      best(
        maximise(
          [8, 5],
          [
            [1, 1],
            [9, 5],
          ],
          [6, 45],
          100,
        ),
      ),
    ).toEqual([5, 0]);
  });

  test('capital budgeting with yes-or-no choices: the last three, worth 42', () => {
    // W. L. Winston, Operations Research, 0-1 capital budgeting example (from memory, recomputed).
    expect(best(maximise([16, 22, 12, 8], [[5, 7, 4, 3]], [14], 1))).toEqual([0, 1, 1, 1]);
  });

  test('three tool models over five shared parts: 6, 2 and 5, worth 841', () => {
    // Constructed, no published source; optimum by full enumeration. The last row is in tenths of an hour.
    const rows = [
      [4, 8, 12],
      [1, 1, 1],
      [2, 2, 4],
      [1, 2, 2],
      [8, 11, 19],
    ];
    expect(best(maximise([38, 64, 97], rows, [101, 13, 37, 21, 183], 100))).toEqual([6, 2, 5]);
  });
});
