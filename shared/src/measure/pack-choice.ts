import { ArithmeticError } from '../errors/arithmetic-error.js';
import { minorAmount, type MinorAmount } from '../money/minor-units.js';
import { Decimal, decimal, onCommonScale, type DecimalInput } from './decimal.js';

/** A pack a part is sold in. */
export interface Pack {
  /** What it holds, in the measure of the need. */
  readonly size: DecimalInput;
  /** Minor units for one pack. */
  readonly price: MinorAmount;
}

/** A choice of packs. */
export interface PackChoice {
  /** How many of each pack, in the order given. */
  readonly counts: readonly number[];
  /** Minor units. */
  readonly price: MinorAmount;
  /** What is bought beyond the need. */
  readonly leftOver: Decimal;
}

const largestTable = 2_000_000;

/**
 * The cheapest packs that hold at least what is needed; of equal prices those with less left over, then those with more
 * of the packs listed first.
 *
 * Exact: all but a bounded part of a large need is covered by the pack of lowest unit price, because of any s packs,
 * s being that pack's size in common steps, some add up to a multiple of s and can be swapped for it at no more cost.
 * The rest is solved step by step.
 *
 * @param need quantity wanted; zero or less buys nothing
 * @param packs sizes and prices, at least one
 * @returns how many of each
 * @throws ArithmeticError `measure_pack_size`, `measure_pack_price`, `measure_packs_too_fine` when sizes such as 1 and
 *   1.000001 would need a table of more than 2,000,000 steps; `money_too_large`; `measure_not_a_number`,
 *   `measure_not_exact`
 * @source covering form of the unbounded knapsack problem; the exchange argument is the pigeonhole principle.
 */
export function cheapestPacks(need: DecimalInput, packs: readonly Pack[]): PackChoice {
  const wanted = decimal(need);
  for (const { size, price } of packs) {
    if (decimal(size).lessThanOrEqualTo(0)) throw new ArithmeticError('measure_pack_size', { size: size.toString() });
    if (price < 0) throw new ArithmeticError('measure_pack_price', { price });
  }
  if (packs.length === 0) throw new ArithmeticError('measure_pack_size', { size: '0' });
  if (wanted.lessThanOrEqualTo(0)) {
    return { counts: packs.map(() => 0), price: minorAmount(0), leftOver: wanted.negated().plus(0) };
  }
  const { steps, sizes } = inSteps(wanted, packs);
  const best = bestUnitPrice(sizes, packs);
  const largest = sizes.reduce((most, size) => Math.max(most, size), 0);
  const bestSize = sizes[best] ?? 1;
  // One more of each than the exchange argument needs, so that ties are settled by the table alone.
  const bound = bestSize * largest + largest;
  const before = Math.max(0, Math.floor((steps - bound) / bestSize));
  const rest = steps - before * bestSize;
  if (rest + largest > largestTable) throw new ArithmeticError('measure_packs_too_fine');
  const counts = [...cover(rest, sizes, packs)];
  counts[best] = (counts[best] ?? 0) + before;
  const held = packs.reduce(
    (sum, { size }, index) => sum.plus(decimal(size).times(counts[index] ?? 0)),
    new Decimal(0),
  );
  const price = packs.reduce((sum, pack, index) => sum + pack.price * (counts[index] ?? 0), 0);
  return { counts, price: minorAmount(price), leftOver: held.minus(wanted) };
}

/** Need and sizes as whole numbers of the largest step that divides every size; the need is rounded up to it. */
function inSteps(
  wanted: Decimal,
  packs: readonly Pack[],
): { readonly steps: number; readonly sizes: readonly number[] } {
  const [need = 0n, ...sizes] = onCommonScale([wanted, ...packs.map(({ size }) => size)]).integers;
  const step = sizes.reduce(greatestCommonDivisor, 0n);
  const steps = (need + step - 1n) / step;
  if (steps > BigInt(Number.MAX_SAFE_INTEGER)) throw new ArithmeticError('measure_packs_too_fine');
  return { steps: Number(steps), sizes: sizes.map((size) => Number(size / step)) };
}

function greatestCommonDivisor(one: bigint, other: bigint): bigint {
  return other === 0n ? one : greatestCommonDivisor(other, one % other);
}

function bestUnitPrice(sizes: readonly number[], packs: readonly Pack[]): number {
  return packs.reduce((best, pack, index) => {
    const own = BigInt(pack.price) * BigInt(sizes[best] ?? 1);
    const other = BigInt(packs[best]?.price ?? 0) * BigInt(sizes[index] ?? 1);
    return own < other ? index : best;
  }, 0);
}

/** Cheapest way to hold each exact number of steps, then the cheapest number at or above the need. */
function cover(need: number, sizes: readonly number[], packs: readonly Pack[]): readonly number[] {
  const largest = sizes.reduce((most, size) => Math.max(most, size), 0);
  const prices = new Float64Array(need + largest).fill(Infinity);
  const lastPack = new Int32Array(need + largest).fill(-1);
  prices[0] = 0;
  for (let held = 1; held < prices.length; held += 1) {
    for (const [index, size] of sizes.entries()) {
      const price = (prices[held - size] ?? Infinity) + (packs[index]?.price ?? 0);
      if (price < (prices[held] ?? Infinity)) {
        prices[held] = price;
        lastPack[held] = index;
      }
    }
  }
  let held = need;
  for (let other = need + 1; other < prices.length; other += 1) {
    if ((prices[other] ?? Infinity) < (prices[held] ?? Infinity)) held = other;
  }
  const counts = sizes.map(() => 0);
  while (held > 0) {
    const index = lastPack[held] ?? 0;
    counts[index] = (counts[index] ?? 0) + 1;
    held -= sizes[index] ?? held;
  }
  return counts;
}
