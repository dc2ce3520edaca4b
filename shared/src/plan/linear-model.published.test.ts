import { beforeAll, describe, expect, test } from '@jest/globals';
import * as highs from 'highs';
import { type LinearModel, type LinearSolver, modelText, solveModel } from './linear-model.js';

let solver: LinearSolver;
beforeAll(async () => {
  // The package's types describe its CommonJS form; what an ES module gets by default is the loader itself.
  const load = highs.default as unknown as () => Promise<LinearSolver>;
  solver = await load();
}, 60_000);

function model(gains: number[], rows: number[][], limits: number[], whole: boolean, most = Infinity): LinearModel {
  return {
    variables: gains.map((gain) => ({ gain, least: 0, most, whole })),
    rows: rows.map((row, index) => ({
      terms: row.map((coefficient, variable) => ({ variable, coefficient })),
      atMost: limits[index] ?? 0,
    })),
  };
}

function solved(asked: LinearModel): { gain: number; values: readonly number[]; shadow: readonly number[] } {
  const answer = solveModel(asked, solver);
  if (answer.status !== 'optimal') throw new Error(answer.solverStatus);
  return answer;
}

const close = (actual: readonly number[], expected: readonly number[]): void => {
  expect(actual).toHaveLength(expected.length);
  expected.forEach((value, index) => expect(actual[index]).toBeCloseTo(value, 6));
};

describe('linear programs with published optima and shadow prices', () => {
  test.each<[string, number[], number[][], number[], number, number[], number[]]>([
    // F. S. Hillier and G. J. Lieberman, Introduction to Operations Research, prototype example.
    [
      'doors and windows',
      [3, 5],
      [
        [1, 0],
        [0, 2],
        [3, 2],
      ],
      [4, 12, 18],
      36,
      [2, 6],
      [0, 1.5, 1],
    ],
    // H. A. Taha, Operations Research, paint-mix example (from memory, recomputed).
    [
      'paint mix',
      [5, 4],
      [
        [6, 4],
        [1, 2],
        [-1, 1],
        [0, 1],
      ],
      [24, 6, 1, 2],
      21,
      [3, 1.5],
      [0.75, 0.5, 0, 0],
    ],
    // W. L. Winston, Operations Research, desks, tables and chairs (from memory, recomputed).
    [
      'desks, tables, chairs',
      [60, 30, 20],
      [
        [8, 6, 1],
        [4, 2, 1.5],
        [2, 1.5, 0.5],
        [0, 1, 0],
      ],
      [48, 20, 8, 5],
      280,
      [2, 0, 8],
      [0, 10, 10, 0],
    ],
  ])('%s', (_, gains, rows, limits, gain, values, shadow) => {
    const answer = solved(model(gains, rows, limits, false));
    expect(answer.gain).toBeCloseTo(gain, 6);
    close(answer.values, values);
    close(answer.shadow, shadow);
  });

  test('whole numbers: tables and chairs, capital budgeting', () => {
    // W. L. Winston, Operations Research (from memory, recomputed).
    expect(
      solved(
        model(
          [8, 5],
          [
            [1, 1],
            [9, 5],
          ],
          [6, 45],
          true,
        ),
      ),
    ).toMatchObject({ gain: 40, values: [5, 0] });
    const budget = model([16, 22, 12, 8], [[5, 7, 4, 3]], [14], true, 1);
    expect(solved(budget)).toMatchObject({ gain: 42, values: [0, 1, 1, 1] });
    expect(solveModel(budget, solver, true)).toMatchObject({ status: 'optimal', gain: 44 });
  });
});

describe('models as text', () => {
  test('what cannot be or has no end is said so', () => {
    expect(solveModel(model([1], [[-1]], [-5], false, 3), solver).status).toBe('impossible');
    expect(solveModel(model([1], [[-1]], [5], false), solver).status).toBe('unlimited');
  });

  test('terms of one variable are added, empty rows and gains are written so that they can be read', () => {
    const odd: LinearModel = {
      variables: [{ gain: 0, least: 0, most: 4, whole: true }],
      rows: [
        {
          terms: [
            { variable: 0, coefficient: 1 },
            { variable: 0, coefficient: 2 },
          ],
          atMost: 9,
        },
        { terms: [], atMost: 1 },
      ],
    };
    expect(modelText(odd)).toContain('r0: + 3 v0 <= 9');
    expect(solveModel(odd, solver).status).toBe('optimal');
  });
});
