import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { type IntegerProgram, solveIntegerProgram } from './integer-program.js';

function* points(program: IntegerProgram, index = 0, chosen: readonly number[] = []): Generator<readonly number[]> {
  const variable = program.variables[index];
  if (variable === undefined) yield chosen;
  else {
    for (let value = variable.lower; value <= variable.upper; value += 1) {
      yield* points(program, index + 1, [...chosen, value]);
    }
  }
}

/** Independent model: look at every point of the box. */
function cheapestByEnumeration(program: IntegerProgram): number | undefined {
  let best: number | undefined;
  for (const point of points(program)) {
    const fits = program.rows.every(
      ({ terms, limit }) =>
        terms.reduce((sum, term) => sum + Number(term.coefficient) * (point[term.variable] ?? 0), 0) <= Number(limit),
    );
    const cost = point.reduce((sum, value, index) => sum + value * (program.variables[index]?.cost ?? 0), 0);
    if (fits && (best === undefined || cost < best)) best = cost;
  }
  return best;
}

const programs = fc.integer({ min: 1, max: 4 }).chain((count) =>
  fc.record({
    variables: fc.array(
      fc
        .record({ lower: fc.integer({ min: -2, max: 2 }), more: fc.nat(4), cost: fc.integer({ min: -5, max: 5 }) })
        .map(({ lower, more, cost }) => ({ lower, upper: lower + more, cost })),
      { minLength: count, maxLength: count },
    ),
    rows: fc.array(
      fc.record({
        terms: fc
          .array(fc.bigInt({ min: -9n, max: 9n }), { minLength: count, maxLength: count })
          .map((row) => row.map((coefficient, variable) => ({ variable, coefficient }))),
        limit: fc.bigInt({ min: -15n, max: 30n }),
      }),
      { maxLength: 5 },
    ),
  }),
);

describe('whole-number programs', () => {
  test('have the same optimum as looking at every point', () => {
    fc.assert(
      fc.property(programs, (program) => {
        const answer = solveIntegerProgram(program, { first: false, budget: { branchings: 10_000, work: 1e9 } });
        const expected = cheapestByEnumeration(program);
        if (expected === undefined) return expect(answer.status).toBe('none');
        if (answer.status !== 'found') throw new Error('a solution exists and was not found');
        expect(answer.proven).toBe(true);
        const cost = answer.values.reduce((sum, v, index) => sum + v * (program.variables[index]?.cost ?? 0), 0);
        expect(cost).toBe(expected);
      }),
      { numRuns: 1500 },
    );
  });

  test('are decided the same way when any solution will do', () => {
    fc.assert(
      fc.property(programs, (program) => {
        const answer = solveIntegerProgram(program, { first: true, budget: { branchings: 10_000, work: 1e9 } });
        expect(answer.status).toBe(cheapestByEnumeration(program) === undefined ? 'none' : 'found');
      }),
      { numRuns: 1500 },
    );
  });

  test('say so when they are not given the time', () => {
    const program: IntegerProgram = {
      variables: [0, 1, 2].map(() => ({ lower: 0, upper: 9, cost: 0 })),
      rows: [1n, -1n].map((sign) => ({
        terms: [6n, 10n, 15n].map((coefficient, variable) => ({ variable, coefficient: sign * coefficient })),
        limit: sign * 29n,
      })),
    };
    expect(solveIntegerProgram(program, { first: true, budget: { branchings: 0, work: 1e9 } }).status).toBe(
      'undecided',
    );
    expect(solveIntegerProgram(program, { first: true, budget: { branchings: 10_000, work: 1e9 } }).status).toBe(
      'none',
    );
  });

  test('no variables: the rows alone decide', () => {
    const rows = [{ terms: [], limit: -1n }];
    expect(
      solveIntegerProgram({ variables: [], rows }, { first: true, budget: { branchings: 9, work: 1e9 } }).status,
    ).toBe('none');
  });
});
