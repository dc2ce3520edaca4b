/**
 * A linear program with bounded variables: minimise cost · x subject to rows · x ≤ limits and lower ≤ x ≤ upper.
 * Numbers are plain doubles; callers that need certainty check what comes out against their own exact data.
 */
export interface LinearProgram {
  readonly lower: readonly number[];
  /** Finite for every variable. */
  readonly upper: readonly number[];
  readonly cost: readonly number[];
  readonly rows: readonly LinearRow[];
}

export interface LinearRow {
  readonly variables: readonly number[];
  readonly coefficients: readonly number[];
  readonly limit: number;
}

export interface Bounds {
  readonly lower: Float64Array;
  readonly upper: Float64Array;
}

export type LinearStatus = 'optimal' | 'infeasible' | 'unclear';

const tolerance = 1e-9;

/**
 * The dual simplex method on a dense condensed tableau, with bounds kept out of the rows.
 * It starts from the slack basis, which is dual feasible once every variable sits at its cheaper bound, and every basis
 * it reaches is dual feasible whatever the bounds, so a branching search goes from one set of bounds to the next.
 *
 * Source: the bounded dual simplex method as in R. J. Vanderbei, Linear Programming (from memory);
 * smallest-index rule against cycling: R. G. Bland, Mathematics of Operations Research 2 (1977) 103-107 (from memory).
 */
export class DualSimplex {
  /** Entries of the tableau looked at so far: a measure of effort that is the same on every machine. */
  work = 0;
  pivots = 0;
  private readonly size: number;
  private readonly height: number;
  private readonly table: Float64Array;
  private readonly basicValue: Float64Array;
  private readonly reducedCost: Float64Array;
  private readonly lower: Float64Array;
  private readonly upper: Float64Array;
  private readonly basic: Int32Array;
  private readonly nonbasic: Int32Array;
  private readonly atUpper: Uint8Array;

  constructor(private readonly program: LinearProgram) {
    this.size = program.cost.length;
    this.height = program.rows.length;
    this.table = new Float64Array(this.size * this.height);
    this.basicValue = new Float64Array(this.height);
    this.reducedCost = Float64Array.from(program.cost);
    const noLimit = Array.from({ length: this.height }, () => Infinity);
    this.lower = Float64Array.from([...program.lower, ...noLimit.map(() => 0)]);
    this.upper = Float64Array.from([...program.upper, ...noLimit]);
    this.basic = Int32Array.from(noLimit, (_, row) => this.size + row);
    this.nonbasic = Int32Array.from(program.cost, (_, column) => column);
    this.atUpper = Uint8Array.from(program.cost, (cost) => (cost < 0 ? 1 : 0));
    this.fillTable();
    this.work = this.table.length;
  }

  /** Lower and upper bounds of all variables as they are now. */
  bounds(): Bounds {
    return { lower: this.lower.slice(0, this.size), upper: this.upper.slice(0, this.size) };
  }

  /** Replaces the bounds of all variables; call `solve` afterwards. Any bounds do: the basis stays dual feasible. */
  setBounds({ lower, upper }: Bounds): void {
    const columns = new Map(Array.from(this.nonbasic, (variable, column) => [variable, column]));
    lower.forEach((low, variable) => {
      if (low === this.lower[variable] && upper[variable] === this.upper[variable]) return;
      const column = columns.get(variable);
      const before = column === undefined ? 0 : this.valueOfColumn(column);
      this.lower[variable] = low;
      this.upper[variable] = upper[variable] as number;
      if (column !== undefined) this.chooseCheaperBound(column);
      const shift = column === undefined ? 0 : this.valueOfColumn(column) - before;
      if (column !== undefined && shift !== 0) this.shiftBasics(column, shift);
    });
  }

  /** A variable that was fixed may have got a reduced cost of either sign; freed, it must sit where that fits. */
  private chooseCheaperBound(column: number): void {
    const cost = this.reducedCost[column] as number;
    if (Math.abs(cost) > tolerance) this.atUpper[column] = cost < 0 ? 1 : 0;
  }

  /** Moves to an optimum of the present bounds, or proves that there is none. */
  solve(): LinearStatus {
    const patience = 50 * (this.height + this.size) + 1000;
    for (let step = 0; step < patience; step += 1) {
      const careful = step > patience / 4;
      this.work += this.height + this.size;
      const row = this.leavingRow(careful);
      if (row < 0) return 'optimal';
      const column = this.enteringColumn(row, careful);
      if (column < 0) return this.isProvenInfeasible(row) ? 'infeasible' : 'unclear';
      this.exchange(row, column);
    }
    return 'unclear';
  }

  values(): number[] {
    const values = Array.from({ length: this.size }, () => 0);
    this.nonbasic.forEach((variable, column) => {
      if (variable < this.size) values[variable] = this.valueOfColumn(column);
    });
    this.basic.forEach((variable, row) => {
      if (variable < this.size) values[variable] = this.basicValue[row] as number;
    });
    return values;
  }

  private fillTable(): void {
    this.program.rows.forEach(({ variables, coefficients, limit }, row) => {
      let value = limit;
      variables.forEach((variable, index) => {
        const coefficient = coefficients[index] as number;
        const at = row * this.size + variable;
        this.table[at] = (this.table[at] as number) + coefficient;
        value -= coefficient * this.valueOfColumn(variable);
      });
      this.basicValue[row] = value;
    });
  }

  private valueOfColumn(column: number): number {
    const variable = this.nonbasic[column] as number;
    return (this.atUpper[column] === 1 ? this.upper[variable] : this.lower[variable]) as number;
  }

  private shiftBasics(column: number, shift: number): void {
    for (let row = 0, at = column; row < this.height; row += 1, at += this.size) {
      const entry = this.table[at] as number;
      if (entry !== 0) this.basicValue[row] = (this.basicValue[row] as number) - entry * shift;
    }
  }

  private violation(row: number): number {
    const variable = this.basic[row] as number;
    const value = this.basicValue[row] as number;
    const [lower, upper] = [this.lower[variable] as number, this.upper[variable] as number];
    const slack = tolerance * Math.max(1, Math.abs(value));
    if (value < lower - slack) return value - lower;
    return value > upper + slack ? value - upper : 0;
  }

  private leavingRow(careful: boolean): number {
    let chosen = -1;
    let worst = 0;
    for (let row = 0; row < this.height; row += 1) {
      const size = Math.abs(this.violation(row));
      if (size === 0) continue;
      const better = careful
        ? chosen < 0 || (this.basic[row] as number) < (this.basic[chosen] as number)
        : size > worst;
      if (better) [chosen, worst] = [row, size];
    }
    return chosen;
  }

  /** The ratio test: the column whose reduced cost reaches zero first; among equals the largest pivot. */
  private enteringColumn(row: number, careful: boolean): number {
    const direction = this.violation(row) < 0 ? -1 : 1;
    let chosen = -1;
    let best = Infinity;
    let pivot = 0;
    for (let column = 0; column < this.size; column += 1) {
      const variable = this.nonbasic[column] as number;
      if (this.lower[variable] === this.upper[variable]) continue;
      const entry = direction * (this.table[row * this.size + column] as number);
      if (this.atUpper[column] === 1 ? entry > -tolerance : entry < tolerance) continue;
      const ratio = Math.abs(this.reducedCost[column] as number) / Math.abs(entry);
      const tie = ratio <= best + tolerance;
      const smallerIndex = chosen >= 0 && variable < (this.nonbasic[chosen] as number);
      if (ratio < best - tolerance || (tie && (careful ? smallerIndex : Math.abs(entry) > pivot))) {
        [chosen, best, pivot] = [column, Math.min(best, ratio), Math.abs(entry)];
      }
    }
    return chosen;
  }

  private exchange(row: number, column: number): void {
    this.pivots += 1;
    const leaving = this.basic[row] as number;
    const entering = this.nonbasic[column] as number;
    const toUpper = this.violation(row) > 0;
    const target = (toUpper ? this.upper[leaving] : this.lower[leaving]) as number;
    const pivot = this.table[row * this.size + column] as number;
    const step = ((this.basicValue[row] as number) - target) / pivot;
    const value = this.valueOfColumn(column) + step;
    this.shiftBasics(column, step);
    this.eliminate(row, column, pivot);
    this.basicValue[row] = value;
    this.basic[row] = entering;
    this.nonbasic[column] = leaving;
    this.atUpper[column] = toUpper ? 1 : 0;
  }

  private eliminate(row: number, column: number, pivot: number): void {
    const { size, table, reducedCost } = this;
    const filled: number[] = [];
    const start = row * size;
    for (let j = 0; j < size; j += 1) {
      if (j === column || table[start + j] === 0) continue;
      table[start + j] = (table[start + j] as number) / pivot;
      filled.push(j);
    }
    for (let i = 0, at = column; i < this.height; i += 1, at += size) {
      const factor = table[at] as number;
      if (i === row || factor === 0) continue;
      this.work += filled.length;
      const base = i * size;
      for (const j of filled) {
        const entry = (table[base + j] as number) - factor * (table[start + j] as number);
        table[base + j] = Math.abs(entry) < 1e-13 ? 0 : entry;
      }
      table[at] = -factor / pivot;
    }
    const cost = reducedCost[column] as number;
    for (const j of filled) reducedCost[j] = (reducedCost[j] as number) - cost * (table[start + j] as number);
    reducedCost[column] = -cost / pivot;
    table[start + column] = 1 / pivot;
  }

  /**
   * Infeasibility is not taken from the tableau, which has collected rounding: the multipliers that it suggests are
   * applied to the rows as given, and the contradiction must stand there by a clear margin (Farkas' lemma).
   */
  private isProvenInfeasible(row: number): boolean {
    const sign = this.violation(row) < 0 ? -1 : 1;
    const combined = new Float64Array(this.size);
    let [limit, size] = [0, 0];
    for (const [index, multiplier] of this.multipliers(row, sign)) {
      const { variables, coefficients, limit: rowLimit } = this.program.rows[index] as LinearRow;
      limit += multiplier * rowLimit;
      size += Math.abs(multiplier * rowLimit);
      variables.forEach((variable, at) => {
        combined[variable] = (combined[variable] as number) + multiplier * (coefficients[at] as number);
      });
    }
    let least = 0;
    combined.forEach((coefficient, variable) => {
      const bound = (coefficient > 0 ? this.lower[variable] : this.upper[variable]) as number;
      if (coefficient !== 0) least += coefficient * bound;
      if (coefficient !== 0) size += Math.abs(coefficient * bound);
    });
    return least > limit + tolerance * size;
  }

  /** Non-negative multipliers of the original rows that make up the given row of the tableau. */
  private multipliers(row: number, sign: number): Map<number, number> {
    const found = new Map<number, number>();
    const leaving = this.basic[row] as number;
    if (leaving >= this.size && sign < 0) found.set(leaving - this.size, 1);
    this.nonbasic.forEach((variable, column) => {
      const multiplier = -sign * (this.table[row * this.size + column] as number);
      if (variable >= this.size && multiplier > 0) found.set(variable - this.size, multiplier);
    });
    return found;
  }
}
