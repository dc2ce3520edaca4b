import { expectedWeight, lineVariance, type ExpectedWeight, type KitLine, type WeighingRule } from './kit-weight.js';
import { noticeableFrom, unnoticeable } from './noticeable.js';
import { fewestGroups, type GroupItem } from './weighing-groups.js';

/** One weighing of a few pieces before they go into the kit. */
export interface SubWeighing {
  /** What is on the scale; a line may be split over several weighings. */
  readonly lines: readonly KitLine[];
  readonly expected: ExpectedWeight;
}

/** How to weigh so that no single missing piece slips through. */
export interface WeighingPlan {
  /** Weighings before the one of the whole kit. */
  readonly weighings: readonly SubWeighing[];
  /** Parts so light or so uneven that no weighing notices one piece: count them by hand. */
  readonly countByHand: readonly string[];
  /** Whether fewer weighings were proven impossible (with lines split as they are here). */
  readonly proven: boolean;
}

/**
 * The fewest weighings beside that of the whole kit after which every missing piece is noticed. What the whole kit's
 * weight shows anyway is left out. Handling every piece once costs the same whatever the grouping, so the fewest
 * weighings are the cheapest.
 *
 * A line whose own spread hides one of its pieces is split into the fewest equal lots that do not; such lots and whole
 * lines are then grouped by an exact search.
 *
 * @param lines contents
 * @param rule scale, false alarms and wanted confidence
 * @returns groups to weigh, and what must be counted by hand; for a given input always the same
 * @throws ArithmeticError as `expectedWeight`
 * @source a form of bin packing in which the lightest piece of a bin sets its room; the search is our own.
 */
export function planWeighings(lines: readonly KitLine[], rule: WeighingRule): WeighingPlan {
  const hidden = new Set(unnoticeable(lines, rule));
  const lots = lines.filter((line) => hidden.has(line.part)).map((line) => ({ line, lots: lotsOf(line, rule) }));
  const countByHand = lots.flatMap(({ line, lots: list }) => (list === undefined ? [line.part] : []));
  const items = lots
    .flatMap(({ lots: list }) => list ?? [])
    .map((lot): GroupItem & { readonly lot: KitLine } => ({
      lot,
      size: lineVariance(lot),
      room: roomFor(lot.grams, rule),
    }));
  const { groups, proven } = fewestGroups(items);
  const weighings = groups.map((group) => {
    const onScale = group.map(({ lot }) => lot);
    return { lines: onScale, expected: expectedWeight(onScale, rule) };
  });
  return { weighings, countByHand, proven };
}

/** Variance that may lie on the scale with a piece of this weight for it still to be noticed, g². */
function roomFor(grams: number, rule: WeighingRule): number {
  // A hair less, so that the root taken later cannot undo it.
  return (grams / noticeableFrom(1, rule)) ** 2 * (1 - 1e-12) - rule.scaleGrams ** 2;
}

/** The line as it is, or in the fewest lots of nearly equal size in which a missing piece shows; nothing if in none. */
function lotsOf(line: KitLine, rule: WeighingRule): readonly KitLine[] | undefined {
  const room = roomFor(line.grams, rule);
  if (lineVariance({ ...line, pieces: 1 }) > room) return undefined;
  let most = line.pieces;
  // Variance grows with the pieces, so the largest lot that fits can be found by halving.
  let least = 1;
  while (least < most) {
    const middle = Math.ceil((least + most) / 2);
    if (lineVariance({ ...line, pieces: middle }) <= room) least = middle;
    else most = middle - 1;
  }
  const count = Math.ceil(line.pieces / least);
  return Array.from({ length: count }, (_, index) => ({
    ...line,
    pieces: Math.floor((line.pieces + count - 1 - index) / count),
  }));
}
