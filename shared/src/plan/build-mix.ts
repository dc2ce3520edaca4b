import type { PartKey } from '../bill/bill-lines.js';
import type { BuildNetwork, NetworkLine } from '../bill/build-network.js';
import { timesRoundedUp } from '../bill/ratio.js';
import { Decimal, decimal, sumDecimals } from '../measure/decimal.js';
import { type MixModel, type MixQuestion, buildMixModel } from './build-mix-model.js';
import { type LinearSolver, solveModel } from './linear-model.js';

export interface MixPart {
  readonly part: PartKey;
  /** In the part's stock unit. */
  readonly taken: Decimal;
  readonly left: Decimal;
  /**
   * What one more stock unit of it would bring, were parts of products allowed; zero for what does not bind. Of the
   * relaxed program: a hint which part to buy, not a price.
   */
  readonly oneMoreBrings: number;
}

export interface BuildMix {
  readonly products: readonly { readonly part: PartKey; readonly build: number; readonly served: number }[];
  /** Sum of what the products earn. */
  readonly earns: Decimal;
  /** What could be earned at most, were parts of products allowed: how far the whole numbers cost anything. */
  readonly relaxedEarns: number;
  /** Bought parts, those that bind first. */
  readonly parts: readonly MixPart[];
  /** What one more minute at the bench would bring, were parts of products allowed; undefined without a limit. */
  readonly oneMoreMinuteBrings: number | undefined;
}

export type MixAnswer =
  | { readonly status: 'optimal'; readonly mix: BuildMix }
  /** The least numbers cannot all be built. */
  | { readonly status: 'impossible' }
  /** Something earns and takes nothing that could run out, or the solver gave up. */
  | { readonly status: 'unlimited' | 'unsolved'; readonly solverStatus: string };

/**
 * The build mix: the products and numbers that earn most, or that keep most promises (by weight) and, among those, earn
 * most. What the solver finds is worked through again in whole steps before it is believed.
 *
 * @param question products, bills, shelf, bench
 * @param aim what comes first
 * @param solver the loaded solver (npm `highs`)
 * @throws ArithmeticError as `buildMixModel`
 * Source: product mix by linear and whole-number programming, as in every textbook of operations research; the
 *   figures of the relaxation are its dual values.
 */
export function buildMix(question: MixQuestion, aim: 'earn_most' | 'serve_promises', solver: LinearSolver): MixAnswer {
  const served = aim === 'serve_promises' ? mostServed(question, solver) : undefined;
  const model = buildMixModel(question, 'earn_most', { servedAtLeast: served });
  const answer = solveModel(model, solver);
  if (answer.status === 'impossible') return { status: 'impossible' };
  if (answer.status !== 'optimal') return answer;
  const used = workThrough(model, answer.values);
  if (used === undefined) return { status: 'unsolved', solverStatus: 'The solution does not stand in whole steps.' };
  const unbounded = buildMixModel(question, 'earn_most', { servedAtLeast: served, unbounded: true });
  const relaxed = solveModel(unbounded, solver, true);
  const shadow = relaxed.status === 'optimal' ? relaxed.shadow : [];
  const builds = model.built.map((variable) => answer.values[variable] ?? 0);
  return {
    status: 'optimal',
    mix: {
      products: question.products.map(({ part, promised }, index) => {
        const build = builds[index] ?? 0;
        return { part, build, served: Math.min(build, promised) };
      }),
      earns: sumDecimals(question.products.map(({ earns }, index) => decimal(earns).times(builds[index] ?? 0))),
      relaxedEarns: relaxed.status === 'optimal' ? relaxed.gain : answer.gain,
      parts: partsOf(model, used, shadow),
      oneMoreMinuteBrings: model.benchRow === undefined ? undefined : plainZero(shadow[model.benchRow]),
    },
  };
}

function mostServed(question: MixQuestion, solver: LinearSolver): number | undefined {
  const answer = solveModel(buildMixModel(question, 'serve_promises'), solver);
  // A hair less, so that the solver's own rounding cannot make the second program impossible.
  return answer.status === 'optimal' ? answer.gain - 1e-6 * Math.max(1, answer.gain) : undefined;
}

/** What is taken of each part, in steps, if the lines are filled as the solver says; undefined if more than there is. */
function workThrough(model: MixModel, values: readonly number[]): bigint[] | undefined {
  const { network } = model;
  const built = new Map(
    model.built.map((variable, index) => [productPart(network, index), BigInt(values[variable] ?? 0)]),
  );
  const used = network.parts.map(() => 0n);
  const short = network.parts.map(({ stock, lines }, index) => {
    if (index === 0) return false;
    const sold = built.get(index) ?? 0n;
    const missing = (used[index] ?? 0n) - stock;
    if (lines.length === 0) return missing > 0n;
    const made = sold + (missing > 0n ? missing : 0n);
    for (const line of lines)
      addTaken(network.lines[line] as NetworkLine, made, shareValues(model, line, values), used);
    return false;
  });
  return short.includes(true) ? undefined : used;
}

/** The products are the components of the first part, in order. */
function productPart(network: BuildNetwork, product: number): number {
  const line = network.lines[network.parts[0]?.lines[product] ?? -1];
  return line?.options[0]?.part ?? -1;
}

function shareValues(model: MixModel, line: number, values: readonly number[]): bigint[] {
  return (model.shares[line] ?? []).map((variable) => BigInt(Math.round(values[variable] ?? 0)));
}

function addTaken(line: NetworkLine, made: bigint, shares: readonly bigint[], used: bigint[]): void {
  let left = timesRoundedUp(made, line.basis);
  line.options.forEach(({ part, ratio }, option) => {
    const isLast = option === line.options.length - 1;
    const wanted = isLast ? left : (shares[option] ?? 0n);
    const share = wanted < left ? wanted : left;
    left -= share;
    used[part] = (used[part] ?? 0n) + timesRoundedUp(share, ratio);
  });
}

function partsOf(model: MixModel, used: readonly bigint[], shadow: readonly number[]): MixPart[] {
  const parts = [...model.partRows].map(([index, row]): MixPart => {
    const { key, stock, decimals } = model.network.parts[index] ?? { key: '', stock: 0n, decimals: 0 };
    const unit = new Decimal(10).pow(decimals);
    const taken = new Decimal((used[index] ?? 0n).toString()).div(unit);
    return {
      part: key,
      taken,
      left: new Decimal(stock.toString()).div(unit).minus(taken),
      oneMoreBrings: plainZero((shadow[row] ?? 0) * unit.toNumber()),
    };
  });
  return parts.toSorted((a, b) => b.oneMoreBrings - a.oneMoreBrings);
}

/** Dual values come with the solver's rounding around zero. */
function plainZero(value: number | undefined): number {
  return value === undefined || Math.abs(value) < 1e-9 ? 0 : value;
}
