import type { BuildNetwork, NetworkLine } from './build-network.js';
import type { BuildRanges } from './build-ranges.js';
import type { IntegerProgram, IntegerRow, IntegerVariable } from './integer-program.js';
import { type Ratio, timesRoundedUp } from './ratio.js';

/** The choices that are still open, as a whole-number program over steps. */
export interface BuildProgram extends IntegerProgram {
  /** By line: the variables of its options' shares; empty where the line is settled. */
  readonly shares: readonly (readonly number[])[];
  /** By variable that says how much of a part is missing: the part. */
  readonly missing: ReadonlyMap<number, number>;
  /** By row that weighs what is asked of a part against what there is: the part. */
  readonly balances: ReadonlyMap<number, number>;
}

/** What a missing step of a bought part (by index) counts; undefined: of this one nothing may be missing. */
export type ShortagePrice = (part: number) => number | undefined;

/** Something linear: constant + sum of variables. */
interface Expression {
  readonly constant: bigint;
  readonly terms: readonly { readonly variable: number; readonly coefficient: bigint }[];
}

/**
 * States what building needs, for the parts that could run short:
 * the shares of a line's options add up to what is built; what is taken is at least share × ratio and whole; what is
 * taken of a part is at most what lies there plus what is made of it (or, at a price, is missing).
 * Every solution is a way to build; every way to build is a solution.
 */
export function buildProgram(network: BuildNetwork, ranges: BuildRanges, price?: ShortagePrice): BuildProgram {
  return new ProgramBuilder(network, ranges, price).build();
}

class ProgramBuilder {
  private readonly variables: IntegerVariable[] = [];
  private readonly rows: IntegerRow[] = [];
  private readonly shares: number[][];
  private readonly missing = new Map<number, number>();
  private readonly balances = new Map<number, number>();
  private readonly asked = new Map<number, Expression[]>();

  constructor(
    private readonly network: BuildNetwork,
    private readonly ranges: BuildRanges,
    private readonly price: ShortagePrice | undefined,
  ) {
    this.shares = network.lines.map(() => []);
  }

  build(): BuildProgram {
    this.network.parts.forEach(({ lines }, index) => {
      if (index > 0 && this.ranges.free[index] === true) return;
      const built = this.balance(index);
      for (const line of lines) this.askFor(line, built);
    });
    const { variables, rows, shares, missing, balances } = this;
    return { variables, rows, shares, missing, balances };
  }

  private add(lower: bigint, upper: bigint, cost = 0): Expression & { index: number } {
    const index = this.variables.push({ lower: Number(lower), upper: Number(upper), cost }) - 1;
    return { index, constant: 0n, terms: [{ variable: index, coefficient: 1n }] };
  }

  /** States left ≤ right. */
  private atMost(left: Expression, right: Expression): void {
    const terms = [...left.terms, ...scale(right, -1n).terms];
    this.rows.push({ terms, limit: right.constant - left.constant });
  }

  /** What is asked of a part ≤ what lies there + what is made of it + what is missing. Answers what is made. */
  private balance(index: number): Expression {
    const part = this.network.parts[index];
    const make = this.ranges.make[index];
    if (index === 0 || part === undefined || make === undefined) return constant(make?.most ?? 0n);
    const asked = sum(this.asked.get(index) ?? []);
    const built = make.least === make.most ? constant(make.least) : this.add(make.least, make.most);
    const needMost = this.ranges.need[index]?.most ?? 0n;
    const cost = part.lines.length === 0 ? this.price?.(index) : undefined;
    const missing = cost === undefined ? constant(0n) : this.addMissing(index, needMost, cost);
    this.balances.set(this.rows.length, index);
    this.atMost(asked, sum([constant(part.stock), built, missing]));
    return built;
  }

  private addMissing(part: number, most: bigint, cost: number): Expression {
    const variable = this.add(0n, most, cost);
    this.missing.set(variable.index, part);
    return variable;
  }

  private askFor(lineIndex: number, built: Expression): void {
    const line = this.network.lines[lineIndex];
    if (line === undefined) return;
    const total = this.roundedUp(built, line.basis, this.mostShares(line));
    const settled = this.ranges.settled[lineIndex];
    if (settled !== undefined) {
      this.take(line, settled, total);
      return;
    }
    // Where nothing may be missing, ways to build that keep to the preferred options are met first.
    const costOf = (rank: number): number => (this.price === undefined ? rank : 0);
    const shares = line.options.map((_, rank) => this.add(0n, this.mostShares(line), costOf(rank)));
    this.shares[lineIndex] = shares.map(({ index }) => index);
    this.atMost(total, sum(shares));
    shares.forEach((share, option) => this.take(line, option, share));
  }

  private mostShares(line: NetworkLine): bigint {
    return timesRoundedUp(this.ranges.make[line.parent]?.most ?? 0n, line.basis);
  }

  private take(line: NetworkLine, optionIndex: number, share: Expression): void {
    const option = line.options[optionIndex];
    if (option === undefined || this.ranges.free[option.part] === true) return;
    const most = timesRoundedUp(this.mostShares(line), option.ratio);
    const taken = this.roundedUp(share, option.ratio, most);
    this.asked.set(option.part, [...(this.asked.get(option.part) ?? []), taken]);
  }

  /** The least whole number not below amount × ratio; a variable of its own only where rounding can matter. */
  private roundedUp(amount: Expression, ratio: Ratio, most: bigint): Expression {
    if (ratio.denominator === 1n) return scale(amount, ratio.numerator);
    if (amount.terms.length === 0) return constant(timesRoundedUp(amount.constant, ratio));
    const whole = this.add(0n, most);
    this.atMost(scale(amount, ratio.numerator), scale(whole, ratio.denominator));
    return whole;
  }
}

function constant(value: bigint): Expression {
  return { constant: value, terms: [] };
}

function scale({ constant, terms }: Expression, factor: bigint): Expression {
  return {
    constant: constant * factor,
    terms: terms.map(({ variable, coefficient }) => ({ variable, coefficient: coefficient * factor })),
  };
}

function sum(expressions: readonly Expression[]): Expression {
  return {
    constant: expressions.reduce((total, { constant }) => total + constant, 0n),
    terms: expressions.flatMap(({ terms }) => terms),
  };
}
