/** Something to be put into a group whose total size must not pass the least room among its members. */
export interface GroupItem {
  readonly size: number;
  /** At least `size`. */
  readonly room: number;
}

/** A grouping. */
export interface Grouping<T> {
  readonly groups: readonly (readonly T[])[];
  /** Whether fewer groups are impossible. */
  readonly proven: boolean;
}

const mostSteps = 200_000;

/**
 * Puts items into the fewest groups such that in each the sizes add up to no more than the least room.
 *
 * @param items each of which fits alone
 * @returns groups of the items, in a fixed order; `proven` is false only if the search had to stop early
 * @source bin packing by first fit and branch and bound (Martello and Toth, Knapsack Problems, 1990, chapter 8), with
 *   room that depends on the members; the bound for each level of room is our own.
 */
export function fewestGroups<T extends GroupItem>(items: readonly T[]): Grouping<T> {
  // Least room first: such an item settles its group's room, and what joins later cannot lower it.
  const ordered = [...items].sort((one, other) => one.room - other.room || other.size - one.size);
  const first = firstFit(ordered);
  const bound = leastGroups(ordered);
  if (first.length <= bound) return { groups: first, proven: true };
  const search = new GroupSearch(ordered, first, bound);
  return search.run();
}

/** For each level of room: what has at most that much must share groups of at most that much. */
function leastGroups(ordered: readonly GroupItem[]): number {
  let size = 0;
  let bound = ordered.length === 0 ? 0 : 1;
  for (const item of ordered) {
    size += item.size;
    // A rounding error must not raise the bound.
    if (item.room > 0) bound = Math.max(bound, Math.ceil((size / item.room) * (1 - 1e-9)));
  }
  return bound;
}

function firstFit<T extends GroupItem>(ordered: readonly T[]): readonly (readonly T[])[] {
  const groups: T[][] = [];
  for (const item of ordered) {
    const place = groups.find((group) => fits(group, item));
    if (place) place.push(item);
    else groups.push([item]);
  }
  return groups;
}

/** The first member has the least room, since items come in that order. */
function fits(group: readonly GroupItem[], item: GroupItem): boolean {
  return totalSize(group) + item.size <= (group[0]?.room ?? item.room);
}

function totalSize(items: readonly GroupItem[]): number {
  return items.reduce((sum, { size }) => sum + size, 0);
}

/** Depth-first search over all groupings that can still beat the best one known. */
class GroupSearch<T extends GroupItem> {
  private steps = 0;
  /** Total size of the items from each place on. */
  private readonly sizeFrom: readonly number[];

  constructor(
    private readonly ordered: readonly T[],
    private best: readonly (readonly T[])[],
    private readonly bound: number,
  ) {
    this.sizeFrom = ordered.map((_item, index) => totalSize(ordered.slice(index)));
  }

  run(): Grouping<T> {
    this.place(0, []);
    return { groups: this.best, proven: this.steps < mostSteps || this.best.length <= this.bound };
  }

  /** Whether what is still to be placed could go into these groups and as many new ones as still beat the best. */
  private couldFit(index: number, groups: readonly (readonly T[])[]): boolean {
    const free = groups.reduce((sum, group) => sum + (group[0]?.room ?? 0) - totalSize(group), 0);
    const more = this.best.length - 1 - groups.length;
    const roomiest = this.ordered.at(-1)?.room ?? 0;
    return (this.sizeFrom[index] ?? 0) * (1 - 1e-9) <= free + more * roomiest;
  }

  private place(index: number, groups: T[][]): void {
    if (this.best.length <= this.bound || groups.length >= this.best.length) return;
    if (this.steps >= mostSteps || !this.couldFit(index, groups)) return;
    this.steps += 1;
    const item = this.ordered[index];
    if (!item) {
      this.best = groups.map((group) => [...group]);
      return;
    }
    const seen = new Set<string>();
    for (const group of groups) {
      // Groups alike in size and room lead to the same.
      const likeness = `${group[0]?.room} ${totalSize(group)}`;
      if (seen.has(likeness) || !fits(group, item)) continue;
      seen.add(likeness);
      group.push(item);
      this.place(index + 1, groups);
      group.pop();
    }
    this.place(index + 1, [...groups, [item]]);
  }
}
