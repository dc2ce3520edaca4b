/** A linear or whole-number program as data: maximise gain · x subject to rows. */
export interface LinearModel {
  readonly variables: readonly ModelVariable[];
  readonly rows: readonly ModelRow[];
}

export interface ModelVariable {
  readonly gain: number;
  readonly least: number;
  /** Infinity for none. */
  readonly most: number;
  readonly whole: boolean;
}

export interface ModelRow {
  readonly terms: readonly { readonly variable: number; readonly coefficient: number }[];
  readonly atMost: number;
}

/** The part of the solver's interface that is used (npm `highs`): text in, columns and rows out. */
export interface LinearSolver {
  solve(
    problem: string,
    options?: { readonly mip_rel_gap?: number; readonly mip_abs_gap?: number },
  ): LinearSolverResult;
}

export interface LinearSolverResult {
  readonly Status: string;
  readonly ObjectiveValue: number;
  readonly Columns: Readonly<Record<string, { readonly Primal?: number; readonly Dual?: number }>>;
  readonly Rows: readonly { readonly Name: string; readonly Primal?: number; readonly Dual?: number }[];
}

export type ModelAnswer =
  | {
      readonly status: 'optimal';
      readonly gain: number;
      readonly values: readonly number[];
      /** By row: what one more of `atMost` would bring; only of a program without whole numbers. */
      readonly shadow: readonly number[];
    }
  | { readonly status: 'impossible' | 'unlimited' | 'unsolved'; readonly solverStatus: string };

/**
 * Writes a model in the LP format that solvers read; variables are `v0`, `v1` …, rows `r0`, `r1` ….
 *
 * @param relaxed whether to leave out that variables must be whole
 * Source: CPLEX LP file format as read by HiGHS.
 */
export function modelText({ variables, rows }: LinearModel, relaxed = false): string {
  const gains = variables.map(({ gain }, index) => term(gain, index)).filter((text) => text !== '');
  const wholes = relaxed ? [] : variables.flatMap(({ whole }, index) => (whole ? [`v${index}`] : []));
  return [
    'Maximize',
    ` obj: ${gains.length > 0 ? gains.join(' ') : '0 v0'}`,
    'Subject To',
    ...rows.map((row, index) => ` r${index}: ${rowText(row)}`),
    'Bounds',
    ...variables.map(({ least, most }, index) => ` ${least} <= v${index}${most === Infinity ? '' : ` <= ${most}`}`),
    ...(wholes.length > 0 ? ['General', ` ${wholes.join(' ')}`] : []),
    'End',
    '',
  ].join('\n');
}

function rowText({ terms, atMost }: ModelRow): string {
  const sums = new Map<number, number>();
  for (const { variable, coefficient } of terms) sums.set(variable, (sums.get(variable) ?? 0) + coefficient);
  const texts = [...sums].map(([variable, coefficient]) => term(coefficient, variable)).filter((text) => text !== '');
  return `${texts.length > 0 ? texts.join(' ') : '0 v0'} <= ${atMost}`;
}

function term(coefficient: number, variable: number): string {
  if (coefficient === 0) return '';
  return `${coefficient < 0 ? '-' : '+'} ${Math.abs(coefficient)} v${variable}`;
}

/** By default a solver stops within a ten-thousandth of the optimum. */
const toTheOptimum = { mip_rel_gap: 0, mip_abs_gap: 1e-6 } as const;

/**
 * Has a model solved.
 *
 * @param solver the loaded solver
 * @param relaxed whether to leave out that variables must be whole; only then there are shadow figures
 */
export function solveModel(model: LinearModel, solver: LinearSolver, relaxed = false): ModelAnswer {
  const result = solver.solve(modelText(model, relaxed), toTheOptimum);
  if (result.Status !== 'Optimal') {
    const kinds: Record<string, 'impossible' | 'unlimited'> = { Infeasible: 'impossible', Unbounded: 'unlimited' };
    return { status: kinds[result.Status] ?? 'unsolved', solverStatus: result.Status };
  }
  const rowByName = new Map(result.Rows.map((row) => [row.Name, row]));
  return {
    status: 'optimal',
    gain: result.ObjectiveValue,
    values: model.variables.map(({ whole }, index) => {
      const value = result.Columns[`v${index}`]?.Primal ?? 0;
      return (whole && !relaxed ? Math.round(value) : value) + 0;
    }),
    shadow: model.rows.map((_, index) => rowByName.get(`r${index}`)?.Dual ?? 0),
  };
}
