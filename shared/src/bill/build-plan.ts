import { Decimal } from '../measure/decimal.js';
import type { PartKey } from './bill-lines.js';
import type { BuildNetwork } from './build-network.js';
import { type BuildProgram, type ShortagePrice, buildProgram } from './build-program.js';
import { type BuildRanges, buildRanges } from './build-ranges.js';
import { type ProgramPart, independentParts } from './independent-parts.js';
import { type EffortBudget, solveIntegerProgram } from './integer-program.js';
import { ShareRepair, type Shares, fitsPlainNumbers } from './share-repair.js';
import { timesRoundedUp } from './ratio.js';

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
 * @param budget how much may be searched
 * @returns a plan (with prices: the one with the least missing), or that there is none
 */
export function findBuildPlan(
  network: BuildNetwork,
  quantity: bigint,
  price: ShortagePrice | undefined,
  budget: EffortBudget,
): PlanAnswer {
  const ranges = buildRanges(network, quantity);
  const program = buildProgram(network, ranges, price);
  const shares = program.shares.map((variables) => variables.map(() => 0));
  const parts = independentParts(program);
  if (parts === undefined) return { status: 'none' };
  let [proven, decided] = [true, true];
  for (const part of parts) {
    const first = part.originalVariables.every((index) => !program.missing.has(index));
    const places = sharePlaces(program, part);
    const repair = repairOf(network, ranges, quantity, program, part, places, budget);
    const answer = solveIntegerProgram(part, { first, budget, ...(repair && { repair }) });
    if (answer.status === 'none') return { status: 'none' };
    if (answer.status === 'undecided') decided = false;
    if (answer.status !== 'found') continue;
    proven &&= answer.proven || first;
    for (const { line, option, at } of places) (shares[line] ?? [])[option] = answer.values[at] ?? 0;
  }
  if (!decided) return { status: 'undecided' };
  return { status: 'found', plan: readPlan(network, ranges, quantity, shares), proven };
}

interface SharePlace {
  readonly line: number;
  readonly option: number;
  /** Its variable in the part of the program. */
  readonly at: number;
}

function sharePlaces(program: BuildProgram, part: ProgramPart): SharePlace[] {
  const place = new Map(part.originalVariables.map((variable, at) => [variable, at]));
  return program.shares.flatMap((variables, line) =>
    variables.flatMap((variable, option) => {
      const at = place.get(variable);
      return at === undefined ? [] : [{ line, option, at }];
    }),
  );
}

/** Shortage that no plan may have weighs more than any that may be paid for. */
const forbiddenWeight = 1e6;
/** Setting a share takes about as long as working on so many entries of a tableau. */
const workPerShare = 50;

function repairOf(
  network: BuildNetwork,
  ranges: BuildRanges,
  quantity: bigint,
  program: BuildProgram,
  part: ProgramPart,
  places: readonly SharePlace[],
  budget: EffortBudget,
): ((values: readonly number[]) => readonly number[] | undefined) | undefined {
  if (places.length === 0 || !fitsPlainNumbers(network, ranges.make)) return undefined;
  const weights = network.parts.map(() => 0);
  for (const row of part.originalRows) {
    const balanced = program.balances.get(row);
    if (balanced !== undefined && network.parts[balanced]?.lines.length === 0) weights[balanced] = forbiddenWeight;
  }
  const missingPlaces = part.originalVariables.flatMap((variable, at) => {
    const of = program.missing.get(variable);
    if (of !== undefined) weights[of] = part.variables[at]?.cost ?? 0;
    return of === undefined ? [] : [{ of, at }];
  });
  const mayMiss = new Set(missingPlaces.map(({ of }) => of));
  return (values) => {
    const wish: number[][] = network.lines.map(() => []);
    for (const { line, option, at } of places) (wish[line] ?? [])[option] = values[at] ?? 0;
    const search = new ShareRepair(network, ranges.settled, weights);
    const { shares, missing } = search.find(Number(quantity), wish);
    budget.work -= search.work * workPerShare;
    if (missing.some((steps, of) => steps > 0 && !mayMiss.has(of))) return undefined;
    const repaired = [...values];
    for (const { line, option, at } of places) repaired[at] = shares[line]?.[option] ?? 0;
    for (const { of, at } of missingPlaces) repaired[at] = missing[of] ?? 0;
    return repaired;
  };
}

/** Works the chosen shares through from the top; whatever the program took too much of is not taken here. */
function readPlan(network: BuildNetwork, ranges: BuildRanges, quantity: bigint, shares: Shares): BuildPlan {
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
        const wanted =
          settled === undefined ? BigInt(Math.round(shares[lineIndex]?.[at] ?? 0)) : settled === at ? left : 0n;
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
