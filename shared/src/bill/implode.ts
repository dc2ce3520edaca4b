import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal } from '../measure/decimal.js';
import { type BillLine, type Bills, type PartKey, checkBillLines, takenPerUnit } from './bill-lines.js';
import { lowLevelCodes } from './low-level-codes.js';

export interface WhereUsed {
  readonly part: PartKey;
  /** Fewest and most bills between; a part whose own bill has the line is at 1. */
  readonly nearest: number;
  readonly farthest: number;
  /** How much of the asked part is taken for one stock unit of this one, every way counted, normal loss included. */
  readonly quantity: Decimal;
  /** Whether nothing else uses it. */
  readonly isTop: boolean;
}

/**
 * Implodes a part: every part, on any level, that takes it, and how much one of each takes.
 * Only lines that name it count here; where it may stand in for another, see `alternateUses`.
 *
 * @param bills the bills in force
 * @param part the part to look for
 * @returns one row per part that takes it, nearest first, then in the order of the bills
 * @throws ArithmeticError `bill_cycle`, and as `checkBillLines`
 * Source: common practice, no source (explosion read upward).
 */
export function implode(bills: Bills, part: PartKey): WhereUsed[] {
  const parents = parentLines(bills, part);
  const found = new Map<PartKey, Omit<WhereUsed, 'part' | 'isTop'>>([
    [part, { nearest: 0, farthest: 0, quantity: new Decimal(1) }],
  ]);
  const topDown = [...lowLevelCodes(relevantBills(bills, parents, part)).keys()];
  for (const component of topDown.toReversed()) {
    const below = found.get(component);
    if (below === undefined) continue;
    for (const { parent, line } of parents.get(component) ?? []) {
      const before = found.get(parent);
      found.set(parent, {
        nearest: Math.min(before?.nearest ?? Infinity, below.nearest + 1),
        farthest: Math.max(before?.farthest ?? 0, below.farthest + 1),
        quantity: takenPerUnit(line)
          .times(below.quantity)
          .plus(before?.quantity ?? 0),
      });
    }
  }
  const used = new Set([...parents].filter(([, uses]) => uses.length > 0).map(([component]) => component));
  return [...bills.keys()]
    .flatMap((key) => {
      const row = key === part ? undefined : found.get(key);
      return row === undefined ? [] : [{ part: key, ...row, isTop: !used.has(key) }];
    })
    .toSorted((a, b) => a.nearest - b.nearest);
}

interface Use {
  readonly parent: PartKey;
  readonly line: BillLine;
}

/** For the part and everything above it: the lines that name it. */
function parentLines(bills: Bills, part: PartKey): Map<PartKey, Use[]> {
  const all = new Map<PartKey, Use[]>();
  for (const [parent, lines] of bills) {
    for (const line of lines) {
      const uses = all.get(line.part);
      if (uses === undefined) all.set(line.part, [{ parent, line }]);
      else uses.push({ parent, line });
    }
  }
  const above = new Map<PartKey, Use[]>();
  const open = [part];
  for (const key of open) {
    if (above.has(key)) continue;
    above.set(key, all.get(key) ?? []);
    open.push(...(all.get(key) ?? []).map(({ parent }) => parent));
  }
  return above;
}

/** The bills above the part, without the lines that lead elsewhere. */
function relevantBills(bills: Bills, parents: ReadonlyMap<PartKey, readonly Use[]>, part: PartKey): Bills {
  const relevant = new Map<PartKey, BillLine[]>([[part, []]]);
  for (const uses of parents.values()) {
    for (const { parent, line } of uses) {
      const lines = relevant.get(parent);
      const own = { ...line, alternates: [] };
      if (lines === undefined) relevant.set(parent, [own]);
      else lines.push(own);
    }
  }
  for (const parent of relevant.keys()) checkBillLines(parent, bills.get(parent) ?? []);
  return relevant;
}

export interface WhereUsedPlace {
  /** From the asked part upward: the bill's part and the position of the line in it. */
  readonly path: readonly { readonly parent: PartKey; readonly position: string }[];
  /** Taken for one of the last parent by this way alone. */
  readonly quantity: Decimal;
}

/**
 * The same as an indented list: one row per way upward, each parent followed by its own parents.
 *
 * @param rowLimit refuses to write out more rows than this, since ways multiply
 * @throws ArithmeticError as `implode`, and `bill_too_many_places`
 */
export function implodeIndented(bills: Bills, part: PartKey, rowLimit = 20_000): WhereUsedPlace[] {
  const parents = parentLines(bills, part);
  lowLevelCodes(relevantBills(bills, parents, part));
  const rows: WhereUsedPlace[] = [];
  const walk = (component: PartKey, quantity: Decimal, path: WhereUsedPlace['path']): void => {
    for (const { parent, line } of parents.get(component) ?? []) {
      if (rows.length >= rowLimit) throw new ArithmeticError('bill_too_many_places', { part, limit: rowLimit });
      const here = [...path, { parent, position: line.position }];
      const taken = quantity.times(takenPerUnit(line));
      rows.push({ path: here, quantity: taken });
      walk(parent, taken, here);
    }
  };
  walk(part, new Decimal(1), []);
  return rows;
}

/**
 * The lines on which a part may stand in for another.
 *
 * @returns in the order of the bills
 */
export function alternateUses(
  bills: Bills,
  part: PartKey,
): { readonly parent: PartKey; readonly position: string; readonly insteadOf: PartKey }[] {
  return [...bills].flatMap(([parent, lines]) =>
    lines
      .filter((line) => line.alternates.some((alternate) => alternate.part === part))
      .map((line) => ({ parent, position: line.position, insteadOf: line.part })),
  );
}
