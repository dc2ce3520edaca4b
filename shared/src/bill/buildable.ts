import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal } from '../measure/decimal.js';
import { type BuildNetwork, type BuildQuestion, buildNetwork } from './build-network.js';
import { type BuildPlan, type PlanAnswer, findBuildPlan } from './build-plan.js';
import type { EffortBudget } from './integer-program.js';

export interface Buildable {
  /** How much can be built now, in the stock unit of the part to build. */
  readonly quantity: Decimal;
  /** Proven upper bound; equal to `quantity` unless the search was cut short. */
  readonly atMost: Decimal;
  /** One way to build `quantity`. */
  readonly plan: BuildPlan;
}

const largestCount = 10n ** 12n;
const usualWork = 5e7;

/**
 * How many can be built now: the greatest quantity for which every line, on every level, can be filled from the shelf,
 * from sub-assemblies made for it, or from named alternates, each thing on the shelf being counted once.
 *
 * What lies on the shelf of a sub-assembly is used before any is made. All that is made of a part is one batch and is
 * rounded once per line and option (`issueQuantity`). Filling line after line with what comes first is not enough where
 * lines share parts: a line may take the part another one cannot do without. So a quantity is possible exactly when a
 * whole-number program has a solution; since whoever can build n can build one less, searching n by halves ends at the
 * greatest.
 *
 * @param question bills, part, shelf and the decimals of stock units
 * @param work how much may be searched, in entries of tableaus; what is not proven by then is told by `atMost`
 * @throws ArithmeticError `bill_missing`, `bill_cycle`, `bill_quantity_negative`, `bill_too_large_to_count`, and as
 *   `checkBillLines`
 * Source: common practice, no source (whole-number program and search by halves).
 */
export function buildable(question: BuildQuestion, work = usualWork): Buildable {
  const network = buildNetwork(question);
  const search = new QuantitySearch(network, question.part);
  search.quickly();
  search.thoroughly({ branchings: Infinity, work });
  return {
    quantity: inUnits(network, search.possible),
    atMost: inUnits(network, search.impossible - 1n),
    plan: search.plan,
  };
}

const relaxationOnly: EffortBudget = { branchings: 0, work: Infinity };

class QuantitySearch {
  possible = 0n;
  impossible = largestCount;
  plan: BuildPlan = { takes: [], made: [], missing: [] };
  private readonly open = new Set<bigint>();

  constructor(
    private readonly network: BuildNetwork,
    private readonly part: string,
  ) {}

  /** Looks at relaxations only: narrows the answer from both sides, and mostly finds it. */
  quickly(): void {
    let [low, high] = [0n, 1n];
    while (this.tryQuantity(high, relaxationOnly) === 'found') {
      [low, high] = [high, high * 2n];
      if (high > largestCount) throw new ArithmeticError('bill_too_large_to_count', { part: this.part });
    }
    low = this.halve(low, high, (status) => status === 'found');
    while (this.tryQuantity(high, relaxationOnly) !== 'none') {
      [low, high] = [high, high * 2n];
      if (high > largestCount) throw new ArithmeticError('bill_too_large_to_count', { part: this.part });
    }
    this.halve(low, high, (status) => status !== 'none');
  }

  /** Decides what is left, one unit after the other. */
  thoroughly(budget: EffortBudget): void {
    while (this.impossible - this.possible > 1n) {
      if (this.tryQuantity(this.possible + 1n, budget) === 'undecided') return;
    }
  }

  /** Between a quantity for which the test holds and a greater one for which it does not: the greatest that holds. */
  private halve(from: bigint, to: bigint, holds: (status: PlanAnswer['status']) => boolean): bigint {
    let [low, high] = [from, to];
    while (high - low > 1n) {
      const middle = (low + high) / 2n;
      if (holds(this.tryQuantity(middle, relaxationOnly))) low = middle;
      else high = middle;
    }
    return low;
  }

  private tryQuantity(quantity: bigint, budget: EffortBudget): PlanAnswer['status'] {
    if (quantity <= this.possible) return 'found';
    if (quantity >= this.impossible) return 'none';
    if (budget === relaxationOnly && this.open.has(quantity)) return 'undecided';
    const answer = findBuildPlan(this.network, quantity, undefined, budget);
    if (answer.status === 'undecided') this.open.add(quantity);
    if (answer.status === 'none') this.impossible = quantity;
    if (answer.status === 'found') [this.possible, this.plan] = [quantity, answer.plan];
    return answer.status;
  }
}

function inUnits(network: BuildNetwork, steps: bigint): Decimal {
  return new Decimal(steps.toString()).div(new Decimal(10).pow(network.parts[0]?.decimals ?? 0));
}
