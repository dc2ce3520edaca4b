import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal } from '../measure/decimal.js';
import { type BuildNetwork, type BuildQuestion, buildNetwork } from './build-network.js';
import { type BuildPlan, findBuildPlan } from './build-plan.js';

export interface Buildable {
  /** How much can be built now, in the stock unit of the part to build. */
  readonly quantity: Decimal;
  /** Proven upper bound; equal to `quantity` unless the search was cut short. */
  readonly atMost: Decimal;
  /** One way to build `quantity`. */
  readonly plan: BuildPlan;
}

const largestCount = 10n ** 12n;

/**
 * How many can be built now: the greatest quantity for which every line, on every level, can be filled from the shelf,
 * from sub-assemblies made for it, or from named alternates, each thing on the shelf being counted once.
 *
 * What lies on the shelf of a sub-assembly is used before any is made. All that is made of a part is one batch and is
 * rounded once per line and option (`issueQuantity`). Filling line after line with what comes first is not enough where
 * lines share parts: a line may take the part another one cannot do without. So a quantity is possible exactly when a
 * whole-number program has a solution; since whoever can build n can build one less, a binary search over n ends at the
 * greatest.
 *
 * @param question bills, part, shelf and the decimals of stock units
 * @param branchingSteps how many branching steps may be spent on each quantity tried
 * @throws ArithmeticError `bill_missing`, `bill_cycle`, `bill_quantity_negative`, `bill_too_large_to_count`, and as
 *   `checkBillLines`
 * Source: common practice, no source (whole-number program and binary search).
 */
export function buildable(question: BuildQuestion, branchingSteps = 2000): Buildable {
  const network = buildNetwork(question);
  const tried = new Map<bigint, ReturnType<typeof findBuildPlan>>();
  const isPossible = (quantity: bigint): boolean => {
    const answer = findBuildPlan(network, quantity, undefined, { steps: branchingSteps });
    tried.set(quantity, answer);
    return answer.status === 'found';
  };
  const quantity = greatest(isPossible, question.part);
  const impossible = [...tried].filter(([, { status }]) => status === 'none').map(([key]) => key);
  const leastImpossible = impossible.reduce((least, key) => (key < least ? key : least), largestCount);
  const answer = tried.get(quantity);
  return {
    quantity: inUnits(network, quantity),
    atMost: inUnits(network, leastImpossible - 1n),
    plan: answer?.status === 'found' ? answer.plan : { takes: [], made: [], missing: [] },
  };
}

/** The greatest quantity that is possible, 0 always being so; doubling, then halving the gap. */
function greatest(isPossible: (quantity: bigint) => boolean, part: string): bigint {
  let [low, high] = [0n, 1n];
  while (isPossible(high)) {
    [low, high] = [high, high * 2n];
    if (high > largestCount) throw new ArithmeticError('bill_too_large_to_count', { part });
  }
  while (high - low > 1n) {
    const middle = (low + high) / 2n;
    if (isPossible(middle)) low = middle;
    else high = middle;
  }
  return low;
}

function inUnits(network: BuildNetwork, steps: bigint): Decimal {
  return new Decimal(steps.toString()).div(new Decimal(10).pow(network.parts[0]?.decimals ?? 0));
}
