import { type Bounds, DualSimplex, type LinearProgram } from './dual-simplex.js';

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
  /**
   * May make a whole-number solution out of a point of the relaxation. What it answers counts as a solution without a
   * further check.
   */
  readonly repair?: (values: readonly number[]) => readonly number[] | undefined;
  /** Shared between calls. */
  readonly budget: EffortBudget;
}

/** How much a search may still do. Counted, not timed, so that answers are the same on every machine. */
export interface EffortBudget {
  /** Sides of a branching that may still be looked at; the relaxation as a whole is always looked at. */
  branchings: number;
  /** Entries of tableaus that may still be worked on; about 300 million take a second. */
  work: number;
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

/** A tableau is set up anew after so much use, since it collects rounding. */
const pivotsBeforeRenewal = 3000;

class Search {
  best: readonly number[] | undefined;
  cutShort = false;
  private bestCost = Infinity;
  private readonly open: Bounds[] = [];
  private readonly linear: LinearProgram;
  private simplex: DualSimplex;

  constructor(
    private readonly program: IntegerProgram,
    private readonly options: SearchOptions,
  ) {
    this.linear = relaxation(program);
    this.simplex = this.tableau();
  }

  private tableau(): DualSimplex {
    const simplex = new DualSimplex(this.linear);
    this.options.budget.work -= simplex.work;
    return simplex;
  }

  run(): void {
    this.visit();
    const { budget } = this.options;
    while (this.open.length > 0 && !(this.options.first && this.best !== undefined)) {
      if (budget.branchings <= 0 || budget.work <= 0) {
        this.cutShort = true;
        return;
      }
      budget.branchings -= 1;
      if (this.simplex.pivots > pivotsBeforeRenewal) this.simplex = this.tableau();
      this.simplex.setBounds(this.open.pop() as Bounds);
      this.visit();
    }
  }

  private visit(): void {
    const { simplex } = this;
    const before = simplex.work;
    const status = simplex.solve();
    this.options.budget.work -= simplex.work - before;
    if (status === 'infeasible') return;
    const values = simplex.values();
    const cost = values.reduce((sum, value, index) => sum + value * this.costOf(index), 0);
    if (status === 'optimal' && cost >= this.bestCost - 1e-7 * Math.max(1, Math.abs(this.bestCost))) return;
    const rounded = values.map(nearestWhole);
    if (satisfies(this.program, rounded)) this.keep(rounded);
    else this.keep(this.options.repair?.(values));
    if (this.options.first && this.best !== undefined) return;
    const bounds = simplex.bounds();
    const split = this.splitVariable(bounds, values);
    if (split >= 0) this.branch(bounds, split, values[split] as number);
  }

  private costOf(variable: number): number {
    return this.program.variables[variable]?.cost ?? 0;
  }

  private keep(values: readonly number[] | undefined): void {
    if (values === undefined) return;
    const cost = values.reduce((sum, value, index) => sum + value * this.costOf(index), 0);
    if (cost < this.bestCost) [this.best, this.bestCost] = [values, cost];
  }

  /** The variable farthest from a whole number; when all are whole but the point was no solution, any that can move. */
  private splitVariable({ lower, upper }: Bounds, values: readonly number[]): number {
    let [chosen, farthest] = [-1, 1e-6];
    values.forEach((value, index) => {
      const distance = Math.abs(value - Math.round(value));
      if (distance > farthest && lower[index] !== upper[index]) [chosen, farthest] = [index, distance];
    });
    if (chosen >= 0 || satisfies(this.program, values.map(nearestWhole))) return chosen;
    return values.findIndex((_, index) => lower[index] !== upper[index]);
  }

  /** Opens both sides of a value; the nearer one is looked at first. */
  private branch(bounds: Bounds, variable: number, value: number): void {
    const [lower, upper] = [bounds.lower[variable] as number, bounds.upper[variable] as number];
    const below = Math.min(Math.max(Math.floor(value), lower), upper - 1);
    const down = { ...bounds, upper: bounds.upper.with(variable, below) };
    const up = { ...bounds, lower: bounds.lower.with(variable, below + 1) };
    this.open.push(...(value - below > 0.5 ? [down, up] : [up, down]));
  }
}

/** Rounded, without a negative zero. */
function nearestWhole(value: number): number {
  return Math.round(value) + 0;
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
