import { Decimal } from '../measure/decimal.js';
import type { PartKey } from './bill-lines.js';
import { type BuildNetwork, timesRoundedUp } from './build-network.js';
import { type ShortagePrice, buildProgram } from './build-program.js';
import { type BuildRanges, buildRanges } from './build-ranges.js';
import { independentParts } from './independent-parts.js';
import { solveIntegerProgram } from './integer-program.js';

/** One way to build: quantities in stock units. */
export interface BuildPlan {
  /** What each line takes, by option; options that take nothing are left out. */
  readonly takes: readonly PlannedTake[];
  /** What is made on the way, in order of level; the part to build comes first. */
  readonly made: readonly PlannedQuantity[];
  /** Bought parts of which more is taken than lies there. */
  readonly missing: readonly PlannedQuantity[];
}

export interface PlannedTake {
  /** The part whose bill has the line. */
  readonly parent: PartKey;
  readonly position: string;
  readonly part: PartKey;
  readonly quantity: Decimal;
}

export interface PlannedQuantity {
  readonly part: PartKey;
  readonly quantity: Decimal;
}

export type PlanAnswer =
  | { readonly status: 'found'; readonly plan: BuildPlan; readonly proven: boolean }
  | { readonly status: 'none' }
  | { readonly status: 'undecided' };

/**
 * Looks for a way to build a quantity.
 *
 * @param quantity in steps of the part to build
 * @param price what a missing step of a bought part counts; undefined when nothing may be missing
 * @param budget branching steps left, shared between calls
 * @returns a plan (with prices: the one with the least missing), or that there is none
 */
export function findBuildPlan(
  network: BuildNetwork,
  quantity: bigint,
  price: ShortagePrice | undefined,
  budget: { steps: number },
): PlanAnswer {
  const ranges = buildRanges(network, quantity);
  const program = buildProgram(network, ranges, price);
  const values = program.variables.map(() => 0);
  let proven = true;
  for (const part of independentParts(program) ?? [undefined]) {
    if (part === undefined) return { status: 'none' };
    const first = part.original.every((index) => !program.missing.has(index));
    const answer = solveIntegerProgram(part, { first, budget });
    if (answer.status !== 'found') return { status: answer.status };
    proven &&= answer.proven || first;
    part.original.forEach((index, at) => (values[index] = answer.values[at] ?? 0));
  }
  const shares = program.shares.map((variables) => variables.map((index) => BigInt(values[index] ?? 0)));
  return { status: 'found', plan: readPlan(network, ranges, quantity, shares), proven };
}

/** Works the chosen shares through from the top; whatever the program took too much of is not taken here. */
function readPlan(
  network: BuildNetwork,
  ranges: BuildRanges,
  quantity: bigint,
  shares: readonly (readonly bigint[])[],
): BuildPlan {
  const need = network.parts.map(() => 0n);
  const [takes, made, missing]: [PlannedTake[], PlannedQuantity[], PlannedQuantity[]] = [[], [], []];
  const amount = (index: number, steps: bigint): PlannedQuantity => {
    const { key, decimals } = network.parts[index] ?? { key: '', decimals: 0 };
    return { part: key, quantity: new Decimal(steps.toString()).div(new Decimal(10).pow(decimals)) };
  };
  network.parts.forEach((part, index) => {
    const short = index === 0 ? quantity : (need[index] ?? 0n) - part.stock;
    if (short <= 0n) return;
    (part.lines.length > 0 ? made : missing).push(amount(index, short));
    for (const lineIndex of part.lines) {
      const line = network.lines[lineIndex];
      if (line === undefined) continue;
      let left = timesRoundedUp(short, line.basis);
      const settled = ranges.settled[lineIndex];
      line.options.forEach((option, at) => {
        const wanted = settled === undefined ? (shares[lineIndex]?.[at] ?? 0n) : settled === at ? left : 0n;
        const share = wanted < left ? wanted : left;
        left -= share;
        if (share === 0n) return;
        const taken = timesRoundedUp(share, option.ratio);
        need[option.part] = (need[option.part] ?? 0n) + taken;
        takes.push({ parent: part.key, position: line.position, ...amount(option.part, taken) });
      });
    }
  });
  return { takes, made, missing };
}
