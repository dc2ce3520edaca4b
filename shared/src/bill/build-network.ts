import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, type DecimalInput } from '../measure/decimal.js';
import {
  type BillLine,
  type Bills,
  type IssueDecimals,
  type PartKey,
  alternatesInOrder,
  checkBillLines,
  quantityFrom,
} from './bill-lines.js';
import { lowLevelCodes } from './low-level-codes.js';
import { type Ratio, inSteps, multiply, one, ratioOf } from './ratio.js';

/** What a question about building needs to know. */
export interface BuildQuestion {
  readonly bills: Bills;
  /** What is to be built; what of it already lies on the shelf plays no role. */
  readonly part: PartKey;
  /** What may be taken, in stock units; a part that is not named has none. */
  readonly onHand: ReadonlyMap<PartKey, DecimalInput>;
  /** Decimals of each part's stock unit (0 for pieces). */
  readonly decimals: IssueDecimals;
}

/** One way to fill a line. Quantities are whole steps, a step being the last decimal of a part's stock unit. */
export interface NetworkOption {
  /** Index of the part in the network. */
  readonly part: number;
  /** Steps taken per step of the line's share. */
  readonly ratio: Ratio;
}

export interface NetworkLine {
  readonly parent: number;
  readonly position: string;
  /**
   * What is divided among the options, per step built: the built units themselves (ratio 1), or, where kinds may mix
   * within a unit, the quantity of the line's own part.
   */
  readonly basis: Ratio;
  /** In order of preference. */
  readonly options: readonly NetworkOption[];
}

export interface NetworkPart {
  readonly key: PartKey;
  readonly decimals: number;
  readonly stock: bigint;
  /** Indexes of the lines of its bill; none for a bought part. */
  readonly lines: readonly number[];
}

/** Everything below the part to build, in order of low-level code; the part to build is the first. */
export interface BuildNetwork {
  readonly parts: readonly NetworkPart[];
  readonly lines: readonly NetworkLine[];
}

/**
 * Turns bills and stock into whole steps and exact fractions.
 *
 * @throws ArithmeticError `bill_missing` (nothing to build it from), `bill_cycle`, `bill_quantity_negative`, and as
 *   `checkBillLines`
 */
export function buildNetwork(question: BuildQuestion): BuildNetwork {
  const below = billsBelow(question);
  const keys = [...lowLevelCodes(below).keys()];
  const indexOf = new Map(keys.map((key, index) => [key, index]));
  const lines: NetworkLine[] = [];
  const parts = keys.map((key, parent): NetworkPart => {
    const first = lines.length;
    for (const line of below.get(key) ?? []) lines.push(networkLine(line, parent, key, indexOf, question.decimals));
    const own = Array.from({ length: lines.length - first }, (_, index) => first + index);
    return { key, decimals: question.decimals(key), stock: stockSteps(question, key), lines: own };
  });
  return { parts, lines };
}

function billsBelow({ bills, part }: BuildQuestion): Map<PartKey, readonly BillLine[]> {
  const below = new Map<PartKey, readonly BillLine[]>();
  const open = [part];
  for (const key of open) {
    const lines = bills.get(key) ?? [];
    if (lines.length === 0 || below.has(key)) continue;
    checkBillLines(key, lines);
    below.set(key, lines);
    open.push(...lines.flatMap((line) => [line.part, ...line.alternates.map((alternate) => alternate.part)]));
  }
  if (!below.has(part)) throw new ArithmeticError('bill_missing', { part });
  return below;
}

/** What lies on the shelf beyond a whole step cannot be taken. */
function stockSteps({ onHand, decimals, part }: BuildQuestion, key: PartKey): bigint {
  if (key === part) return 0n;
  const quantity = quantityFrom(onHand.get(key) ?? 0, `stock of ${key}`);
  return BigInt(quantity.times(new Decimal(10).pow(decimals(key))).toFixed(0, Decimal.ROUND_FLOOR));
}

function networkLine(
  line: BillLine,
  parent: number,
  parentKey: PartKey,
  indexOf: ReadonlyMap<PartKey, number>,
  decimals: IssueDecimals,
): NetworkLine {
  const taken = ratioOf(line.quantityPer, new Decimal(1).minus(line.scrapShare));
  const steps = (part: PartKey, from: PartKey, base: Ratio): Ratio => inSteps(base, decimals(part) - decimals(from));
  const own = line.part;
  const mixes = line.alternatesMix === true;
  const option = (part: PartKey, factor: Decimal): NetworkOption => {
    const perShare = ratioOf(factor, new Decimal(1));
    const base = mixes ? steps(part, own, perShare) : steps(part, parentKey, multiply(taken, perShare));
    return { part: indexOf.get(part) ?? 0, ratio: base };
  };
  return {
    parent,
    position: line.position,
    basis: mixes ? steps(own, parentKey, taken) : one,
    options: [option(own, new Decimal(1)), ...alternatesInOrder(line).map(({ part, factor }) => option(part, factor))],
  };
}
