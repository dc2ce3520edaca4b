import type { BuildNetwork, NetworkLine } from './build-network.js';
import type { Range } from './build-ranges.js';
import { type Ratio, timesRoundedUp } from './ratio.js';

/** Shares of each line's options; a settled line has a single entry that is not zero. */
export type Shares = readonly (readonly number[])[];

interface Move {
  readonly line: number;
  readonly from: number;
  readonly to: number;
  readonly amount: number;
}

interface Undo {
  readonly values: number[];
  readonly index: number;
  readonly before: number;
}

/** Moves without less shortage than ever before, after which the search ends. */
const patience = 60;

/**
 * Makes a way to build out of shares that are nearly one: rounds them, then moves share after share away from the part
 * that is short most, always the move that leaves the least shortage in all, never straight back (a search with a short
 * memory). Deterministic. It finds, it proves nothing: whoever asks must prove impossibility otherwise.
 *
 * Plain numbers are exact here as long as `fitsPlainNumbers` holds.
 * Source: F. Glover, Tabu Search, Part I, ORSA Journal on Computing 1 (1989) 190-206 (idea, from memory).
 */
export class ShareRepair {
  private readonly stock: readonly number[];
  private readonly use: number[];
  private readonly make: number[];
  private readonly total: number[];
  private readonly shares: number[][];
  private readonly users: readonly (readonly (readonly [line: number, option: number])[])[];
  private readonly undo: Undo[] = [];
  private shortage = 0;
  /** Shares set so far, those tried and taken back included: a measure of effort. */
  work = 0;

  /**
   * @param network what lies below the part to build
   * @param settled by line: the option that fills all of it, where that is settled
   * @param weight by part: how much a missing step of it counts; 0 where its shortage does not matter here
   */
  constructor(
    private readonly network: BuildNetwork,
    private readonly settled: readonly (number | undefined)[],
    private readonly weight: readonly number[],
  ) {
    this.stock = network.parts.map(({ stock }) => Number(stock));
    this.use = network.parts.map(() => 0);
    this.make = network.parts.map(() => 0);
    this.total = network.lines.map(() => 0);
    this.shares = network.lines.map(({ options }) => options.map(() => 0));
    const users = network.parts.map((): (readonly [number, number])[] => []);
    network.lines.forEach(({ options }, line) =>
      options.forEach(({ part }, option) => users[part]?.push([line, option])),
    );
    this.users = users;
  }

  /**
   * @param quantity steps of the part to build
   * @param wish shares to start from, in any proportion; whole numbers or not
   * @returns the whole shares with the least shortage met, and by part how many steps are missing
   */
  find(quantity: number, wish: Shares): { readonly shares: Shares; readonly missing: readonly number[] } {
    this.setMake(0, quantity, (line) => wish[line] ?? []);
    this.undo.length = 0;
    let best = this.snapshot();
    const forbidden = new Map<string, number>();
    for (let step = 0, last = 0; step - last < patience && this.shortage > 0; step += 1) {
      const move = this.bestMove(step, forbidden);
      if (move === undefined) break;
      forbidden.set(`${move.line} ${move.from}`, step + 7 + (step % 5));
      this.apply(move);
      this.undo.length = 0;
      if (this.shortage < best.shortage - 1e-9) [best, last] = [this.snapshot(), step];
    }
    return best;
  }

  private snapshot(): { shares: Shares; missing: readonly number[]; shortage: number } {
    const missing = this.use.map((_, part) =>
      this.shortOf(part) > 0 ? (this.use[part] ?? 0) - (this.stock[part] ?? 0) : 0,
    );
    return { shares: this.shares.map((row) => [...row]), missing, shortage: this.shortage };
  }

  private bestMove(step: number, forbidden: ReadonlyMap<string, number>): Move | undefined {
    let best: Move | undefined;
    let least = Infinity;
    const now = this.shortage;
    for (const move of this.movesAwayFrom(this.shortest(), new Set())) {
      this.apply(move);
      const after = this.shortage;
      this.takeBack(now);
      const allowed = after === 0 || (forbidden.get(`${move.line} ${move.to}`) ?? -1) < step;
      if (allowed && after < least - 1e-12) [best, least] = [move, after];
    }
    return best;
  }

  private shortest(): number {
    let [chosen, worst] = [-1, 0];
    this.use.forEach((_, part) => {
      const short = this.shortOf(part);
      if (short > worst) [chosen, worst] = [part, short];
    });
    return chosen;
  }

  /** Moves that take less of a part: directly, or by making less of something that takes it. */
  private movesAwayFrom(part: number, seen: Set<number>): Move[] {
    if (seen.has(part)) return [];
    seen.add(part);
    const excess = Math.max(1, (this.use[part] ?? 0) - (this.stock[part] ?? 0));
    return (this.users[part] ?? []).flatMap(([line, option]) => {
      const share = this.shares[line]?.[option] ?? 0;
      const row = this.network.lines[line];
      if (share === 0 || row === undefined) return [];
      const upward = row.parent > 0 ? this.movesAwayFrom(row.parent, seen) : [];
      if (this.settled[line] !== undefined) return upward;
      const needed = Math.min(share, Math.ceil(excess / asNumber(row.options[option]?.ratio)));
      const amounts = needed > 1 ? [1, needed] : [1];
      const others = row.options.map((_, to) => to).filter((to) => to !== option);
      return [...upward, ...others.flatMap((to) => amounts.map((amount) => ({ line, from: option, to, amount })))];
    });
  }

  private apply({ line, from, to, amount }: Move): void {
    this.setShare(line, from, (this.shares[line]?.[from] ?? 0) - amount);
    this.setShare(line, to, (this.shares[line]?.[to] ?? 0) + amount);
  }

  private takeBack(shortage: number): void {
    for (let at = this.undo.length - 1; at >= 0; at -= 1) {
      const { values, index, before } = this.undo[at] as Undo;
      values[index] = before;
    }
    this.undo.length = 0;
    this.shortage = shortage;
  }

  private set(values: number[], index: number, value: number): void {
    this.undo.push({ values, index, before: values[index] ?? 0 });
    values[index] = value;
  }

  private setShare(line: number, option: number, value: number, wish?: (line: number) => readonly number[]): void {
    const row = this.network.lines[line] as NetworkLine;
    const { part, ratio } = row.options[option] as NetworkLine['options'][number];
    const shares = this.shares[line] as number[];
    this.work += 1;
    const change = roundedUp(value, ratio) - roundedUp(shares[option] ?? 0, ratio);
    this.set(shares, option, value);
    if (change === 0) return;
    const before = this.shortOf(part);
    this.set(this.use, part, (this.use[part] ?? 0) + change);
    this.shortage += this.shortOf(part) - before;
    if (this.network.parts[part]?.lines.length !== 0) {
      this.setMake(part, Math.max(0, (this.use[part] ?? 0) - (this.stock[part] ?? 0)), wish);
    }
  }

  private setMake(part: number, amount: number, wish?: (line: number) => readonly number[]): void {
    if (amount === this.make[part]) return;
    this.set(this.make, part, amount);
    for (const line of this.network.parts[part]?.lines ?? []) {
      const total = roundedUp(amount, this.network.lines[line]?.basis);
      const change = total - (this.total[line] ?? 0);
      this.set(this.total, line, total);
      const target = wish === undefined ? this.adjusted(line, change) : this.divided(line, total, wish(line));
      target.forEach((value, option) => {
        if (value !== this.shares[line]?.[option]) this.setShare(line, option, value, wish);
      });
    }
  }

  /** More goes to the option that has most, less is taken from the last ones first. */
  private adjusted(line: number, change: number): number[] {
    const shares = [...(this.shares[line] ?? [])];
    const settled = this.settled[line];
    if (change > 0) {
      const to = settled ?? shares.indexOf(Math.max(...shares));
      shares[to] = (shares[to] ?? 0) + change;
      return shares;
    }
    let left = -change;
    for (let option = shares.length - 1; option >= 0 && left > 0; option -= 1) {
      const less = Math.min(left, shares[option] ?? 0);
      shares[option] = (shares[option] ?? 0) - less;
      left -= less;
    }
    return shares;
  }

  /** A total in whole shares as near as can be to the wished proportions (largest remainders). */
  private divided(line: number, total: number, wish: readonly number[]): number[] {
    const options = this.network.lines[line]?.options ?? [];
    const settled = this.settled[line];
    if (settled !== undefined) return options.map((_, option) => (option === settled ? total : 0));
    const sum = wish.reduce((all, value) => all + Math.max(0, value), 0);
    const exact = options.map((_, option) => (sum > 0 ? (Math.max(0, wish[option] ?? 0) * total) / sum : 0));
    const shares = exact.map((value) => Math.min(total, Math.floor(value + 1e-6)));
    const order = exact.map((value, option) => ({ option, rest: value - (shares[option] ?? 0) }));
    order.sort((a, b) => b.rest - a.rest || a.option - b.option);
    let left = total - shares.reduce((all, value) => all + value, 0);
    for (let at = 0; left > 0; at = (at + 1) % order.length, left -= 1) {
      const option = order[at]?.option ?? 0;
      shares[option] = (shares[option] ?? 0) + (sum > 0 ? 1 : left);
      if (sum === 0) left = 1;
    }
    return shares;
  }

  private shortOf(part: number): number {
    return Math.max(0, (this.use[part] ?? 0) - (this.stock[part] ?? 0)) * (this.weight[part] ?? 0);
  }
}

/** Whether no product of a share and a ratio can leave the range in which plain numbers are exact. */
export function fitsPlainNumbers(network: BuildNetwork, make: readonly Range[]): boolean {
  const limit = BigInt(Number.MAX_SAFE_INTEGER);
  return network.lines.every(({ parent, basis, options }) => {
    const built = make[parent]?.most ?? 0n;
    const share = timesRoundedUp(built, basis);
    return built * basis.numerator < limit && options.every(({ ratio }) => share * ratio.numerator < limit);
  });
}

function asNumber(ratio: Ratio | undefined): number {
  return ratio === undefined ? 1 : Number(ratio.numerator) / Number(ratio.denominator);
}

function roundedUp(amount: number, ratio: Ratio | undefined): number {
  if (ratio === undefined) return amount;
  const [product, denominator] = [amount * Number(ratio.numerator), Number(ratio.denominator)];
  const rest = product % denominator;
  return (product - rest) / denominator + (rest > 0 ? 1 : 0);
}
