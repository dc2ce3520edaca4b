import { Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import type { PartKey } from './bill-lines.js';
import { type BuildNetwork, type BuildQuestion, buildNetwork } from './build-network.js';
import { type PlannedQuantity, findBuildPlan } from './build-plan.js';
import { buildRanges } from './build-ranges.js';
import type { EffortBudget } from './integer-program.js';

export interface NextUnit {
  /** Bought parts that are missing for the next one, and how much of each: all of these together let it be built. */
  readonly missing: readonly PlannedQuantity[];
  /** False when the search was cut short: then less may do, or another part alone. */
  readonly proven: boolean;
  /** Parts of which more would be enough alone, and how much more: any ONE of them lets the next one be built. */
  readonly aloneEnough: readonly PlannedQuantity[];
}

/**
 * What stops the next one: the least that must come in before one more (one more step of the stock unit) can be built.
 *
 * @param question bills, part, shelf and the decimals of stock units
 * @param quantity how much can be built now (`buildable`), in the stock unit of the part to build
 * @param unitCost what one stock unit of a bought part counts, for instance its price; where it is undefined, what one
 *   unit of the part to build takes of it counts as one. The least is the least sum of these.
 * @param work how much may be searched for each of the two answers, in entries of tableaus; what that leaves open shows in
 *   `proven`
 * @throws ArithmeticError as `buildable`
 * Source: common practice, no source (the whole-number program of `buildable` with priced shortages).
 */
export function nextUnit(
  question: BuildQuestion,
  quantity: DecimalInput,
  unitCost: (part: PartKey) => DecimalInput | undefined = () => undefined,
  work = 1e8,
): NextUnit {
  const network = buildNetwork(question);
  const unit = new Decimal(10).pow(network.parts[0]?.decimals ?? 0);
  const next = BigInt(decimal(quantity).times(unit).toFixed(0)) + 1n;
  const weights = shortageWeights(network, unitCost);
  const budget: EffortBudget = { branchings: Infinity, work };
  const answer = findBuildPlan(network, next, (part) => weights[part], budget);
  const missing = answer.status === 'found' ? answer.plan.missing : [];
  const remedies =
    missing.length === 0 ? { found: [], complete: true } : singleRemedies(network, next, { ...budget, work });
  return {
    missing,
    proven: answer.status === 'found' && answer.proven && remedies.complete,
    aloneEnough: remedies.found,
  };
}

/** What a missing step of each part counts; never zero, so that nothing is called missing without need. */
function shortageWeights(
  network: BuildNetwork,
  unitCost: (part: PartKey) => DecimalInput | undefined,
): readonly number[] {
  const mostTaken = network.parts.map(() => 0);
  for (const { options, basis } of network.lines) {
    for (const { part, ratio } of options) {
      const taken = Number(ratio.numerator * basis.numerator) / Number(ratio.denominator * basis.denominator);
      mostTaken[part] = Math.max(mostTaken[part] ?? 0, taken);
    }
  }
  return network.parts.map(({ key, decimals }, index) => {
    const cost = unitCost(key);
    const weight = cost === undefined ? 1 / (mostTaken[index] || 1) : decimal(cost).toNumber() / 10 ** decimals;
    return Math.max(weight, 1e-6);
  });
}

function singleRemedies(
  network: BuildNetwork,
  next: bigint,
  budget: EffortBudget,
): { readonly found: PlannedQuantity[]; readonly complete: boolean } {
  const { free, need } = buildRanges(network, next);
  const found: PlannedQuantity[] = [];
  let complete = true;
  network.parts.forEach(({ lines }, candidate) => {
    const mayRunShort = candidate > 0 && free[candidate] === false && lines.length === 0;
    if (!mayRunShort || need[candidate]?.most === 0n) return;
    if (budget.work <= 0) {
      complete = false;
      return;
    }
    const price = (part: number): number | undefined => (part === candidate ? 1 : undefined);
    const answer = findBuildPlan(network, next, price, budget);
    if (answer.status === 'found') found.push(...answer.plan.missing);
    if (answer.status === 'undecided' || (answer.status === 'found' && !answer.proven)) complete = false;
  });
  return { found, complete };
}
