import type { BuildNetwork, NetworkLine } from './build-network.js';
import { timesRoundedUp } from './ratio.js';

export interface Range {
  readonly least: bigint;
  readonly most: bigint;
}

/** What can be said about building a number of units before choosing among the options of any line. In steps. */
export interface BuildRanges {
  /** By part: how much of it all lines together may ask for. */
  readonly need: readonly Range[];
  /** By part: how much of it has to be made; zero for bought parts. */
  readonly make: readonly Range[];
  /** By part: whether it can carry the most that could be asked of it, from the shelf or by making it. */
  readonly free: readonly boolean[];
  /** By line: the option that fills all of it, where that is settled. */
  readonly settled: readonly (number | undefined)[];
}

/**
 * Settles every line that need not be argued about. A line with an option that can carry everything that could ever be
 * asked of it takes that option: this takes nothing from anyone. Each settled line asks less of its other options, so
 * the reckoning is repeated until nothing more is settled.
 *
 * @param network what lies below the part to build
 * @param quantity how much of it is to be built, in steps
 */
export function buildRanges(network: BuildNetwork, quantity: bigint): BuildRanges {
  const settled = network.lines.map(({ options }): number | undefined => (options.length === 1 ? 0 : undefined));
  for (;;) {
    const { need, make } = askedFor(network, quantity, settled);
    const free = carriesAll(network, need, settled);
    let more = false;
    network.lines.forEach((line, index) => {
      if (settled[index] !== undefined) return;
      const option = line.options.findIndex(({ part }) => free[part] === true);
      if (option < 0) return;
      settled[index] = option;
      more = true;
    });
    if (!more) return { need, make, free, settled };
  }
}

function askedFor(
  network: BuildNetwork,
  quantity: bigint,
  settled: readonly (number | undefined)[],
): { need: Range[]; make: Range[] } {
  const least = network.parts.map(() => 0n);
  const most = network.parts.map(() => 0n);
  const make = network.parts.map(({ stock, lines }, index): Range => {
    if (index === 0) return { least: quantity, most: quantity };
    return lines.length === 0 ? { least: 0n, most: 0n } : { least: stock, most: stock };
  });
  network.parts.forEach(({ stock, lines }, index) => {
    if (lines.length === 0) return;
    if (index > 0) make[index] = { least: above(least[index] ?? 0n, stock), most: above(most[index] ?? 0n, stock) };
    const built = make[index] ?? { least: 0n, most: 0n };
    for (const lineIndex of lines) addAsked(network.lines[lineIndex], built, settled[lineIndex], least, most);
  });
  return { need: least.map((low, index) => ({ least: low, most: most[index] ?? low })), make };
}

function addAsked(
  line: NetworkLine | undefined,
  built: Range,
  settled: number | undefined,
  least: bigint[],
  most: bigint[],
): void {
  line?.options.forEach(({ part, ratio }, option) => {
    if (settled !== undefined && settled !== option) return;
    const shareMost = timesRoundedUp(built.most, line.basis);
    most[part] = (most[part] ?? 0n) + timesRoundedUp(shareMost, ratio);
    if (settled === undefined) return;
    least[part] = (least[part] ?? 0n) + timesRoundedUp(timesRoundedUp(built.least, line.basis), ratio);
  });
}

function above(need: bigint, stock: bigint): bigint {
  return need > stock ? need - stock : 0n;
}

/** From the bottom up: the shelf covers the most asked, or each line of the bill has an option that is free itself. */
function carriesAll(
  { parts, lines }: BuildNetwork,
  need: readonly Range[],
  settled: readonly (number | undefined)[],
): boolean[] {
  const free = parts.map(() => false);
  for (let index = parts.length - 1; index > 0; index -= 1) {
    const part = parts[index];
    if (part === undefined) continue;
    const covered = (need[index]?.most ?? 0n) <= part.stock;
    free[index] = covered || (part.lines.length > 0 && part.lines.every((line) => hasFreeOption(line)));
  }
  return free;

  function hasFreeOption(line: number): boolean {
    const options = lines[line]?.options ?? [];
    const chosen = settled[line];
    return chosen === undefined
      ? options.some(({ part }) => free[part] === true)
      : free[options[chosen]?.part ?? -1] === true;
  }
}
