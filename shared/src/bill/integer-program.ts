import { DualSimplex, type LinearProgram } from './dual-simplex.js';

/** Minimise cost · x over whole numbers x with rows · x ≤ limits and lower ≤ x ≤ upper. Data of rows is exact. */
export interface IntegerProgram {
  readonly variables: readonly IntegerVariable[];
  readonly rows: readonly IntegerRow[];
}

export interface IntegerVariable {
  readonly lower: number;
  readonly upper: number;
  readonly cost: number;
}

export interface IntegerRow {
  readonly terms: readonly { readonly variable: number; readonly coefficient: bigint }[];
  readonly limit: bigint;
}

export type IntegerAnswer =
  | { readonly status: 'found'; readonly values: readonly number[]; readonly proven: boolean }
  | { readonly status: 'none' }
  | { readonly status: 'undecided' };

export interface SearchOptions {
  /** Stop at the first solution instead of looking for the cheapest. */
  readonly first: boolean;
  /** Shared between calls: how many branching steps are left. */
  readonly budget: { steps: number };
}

/**
 * Branch and bound over the linear relaxation, deepest first, nearer side first; deterministic.
 * Whole-number solutions are checked against the rows in exact arithmetic before they count; a side is given up only
 * when its relaxation is proven infeasible or (looking for the cheapest) not cheaper than what is known.
 *
 * @param program whole-number program; every variable bounded
 * @param options what to look for and how long
 * @returns `found` (`proven` false when the search ended early), `none` when proven that there is none, `undecided`
 *   when the budget ran out before either
 * Source: A. H. Land and A. G. Doig, Econometrica 28 (1960) 497-520 (from memory).
 */
export function solveIntegerProgram(program: IntegerProgram, options: SearchOptions): IntegerAnswer {
  const search = new Search(program, options);
  if (program.variables.every(({ lower, upper }) => lower <= upper)) search.run();
  if (search.best !== undefined) return { status: 'found', values: search.best, proven: !search.cutShort };
  return search.cutShort ? { status: 'undecided' } : { status: 'none' };
}

interface Branch {
  readonly simplex: DualSimplex;
  readonly variable: number;
  readonly lower: number;
  readonly upper: number;
}

class Search {
  best: readonly number[] | undefined;
  cutShort = false;
  private bestCost = Infinity;
  private readonly open: Branch[] = [];

  constructor(
    private readonly program: IntegerProgram,
    private readonly options: SearchOptions,
  ) {}

  run(): void {
    this.visit(new DualSimplex(relaxation(this.program)));
    while (this.open.length > 0 && !(this.options.first && this.best !== undefined)) {
      if (this.options.budget.steps <= 0) {
        this.cutShort = true;
        return;
      }
      this.options.budget.steps -= 1;
      const { simplex, variable, lower, upper } = this.open.pop() as Branch;
      simplex.restrict(variable, lower, upper);
      this.visit(simplex);
    }
  }

  private visit(simplex: DualSimplex): void {
    const status = simplex.solve();
    if (status === 'infeasible') return;
    const values = simplex.values();
    const cost = values.reduce((sum, value, index) => sum + value * this.costOf(index), 0);
    if (status === 'optimal' && cost >= this.bestCost - 1e-7 * Math.max(1, Math.abs(this.bestCost))) return;
    const rounded = values.map((value) => Math.round(value));
    if (satisfies(this.program, rounded)) this.keep(rounded);
    const split = this.splitVariable(simplex, values);
    if (split >= 0) this.branch(simplex, split, values[split] as number);
  }

  private costOf(variable: number): number {
    return this.program.variables[variable]?.cost ?? 0;
  }

  private keep(values: readonly number[]): void {
    const cost = values.reduce((sum, value, index) => sum + value * this.costOf(index), 0);
    if (cost < this.bestCost) [this.best, this.bestCost] = [values, cost];
  }

  /** The variable farthest from a whole number; when all are whole but the point was no solution, any that can move. */
  private splitVariable(simplex: DualSimplex, values: readonly number[]): number {
    let [chosen, farthest] = [-1, 1e-6];
    values.forEach((value, index) => {
      const distance = Math.abs(value - Math.round(value));
      const { lower, upper } = simplex.boundsOf(index);
      if (lower < upper && distance > farthest) [chosen, farthest] = [index, distance];
    });
    if (chosen >= 0 || satisfies(this.program, values.map(Math.round))) return chosen;
    return values.findIndex((_, index) => simplex.boundsOf(index).lower < simplex.boundsOf(index).upper);
  }

  private branch(simplex: DualSimplex, variable: number, value: number): void {
    const { lower, upper } = simplex.boundsOf(variable);
    const below = Math.min(Math.max(Math.floor(value), lower), upper - 1);
    const down = { variable, lower, upper: below };
    const up = { variable, lower: below + 1, upper };
    const nearerUp = value - below > 0.5;
    this.open.push({ simplex: simplex.copy(), ...(nearerUp ? down : up) });
    this.open.push({ simplex, ...(nearerUp ? up : down) });
  }
}

function satisfies({ variables, rows }: IntegerProgram, values: readonly number[]): boolean {
  const inBounds = variables.every(({ lower, upper }, index) => {
    const value = values[index] ?? NaN;
    return value >= lower && value <= upper && Number.isSafeInteger(value);
  });
  if (!inBounds) return false;
  return rows.every(({ terms, limit }) => {
    const sum = terms.reduce((total, term) => total + term.coefficient * BigInt(values[term.variable] ?? 0), 0n);
    return sum <= limit;
  });
}

/** Rows are scaled by a power of two near their largest coefficient, which changes no digit of them. */
function relaxation({ variables, rows }: IntegerProgram): LinearProgram {
  return {
    lower: variables.map((variable) => variable.lower),
    upper: variables.map((variable) => variable.upper),
    cost: variables.map((variable) => variable.cost),
    rows: rows.map(({ terms, limit }) => {
      const largest = terms.reduce((most, term) => Math.max(most, Math.abs(Number(term.coefficient))), 1);
      const scale = 2 ** -Math.round(Math.log2(largest));
      return {
        variables: terms.map((term) => term.variable),
        coefficients: terms.map((term) => Number(term.coefficient) * scale),
        limit: Number(limit) * scale,
      };
    }),
  };
}
