import type { RefusalCode } from './measure.js';

/** The two levels that a signal rests at, in volts. */
export interface StateLevels {
  readonly low: number;
  readonly high: number;
  /** Extremes seen when the levels were found. */
  readonly least: number;
  readonly greatest: number;
  readonly clipped: boolean;
}

export type FoundLevels = { readonly levels: StateLevels } | { readonly refused: RefusalCode };

const bins = 256;

/** The second level has to lie this far from the first, as a share of the range. */
const leastApart = 0.25;

interface Extremes {
  readonly least: number;
  readonly greatest: number;
  readonly finite: number;
  readonly infinite: boolean;
}

function extremesOf(values: Float64Array, count: number): Extremes {
  let least = Number.POSITIVE_INFINITY;
  let greatest = Number.NEGATIVE_INFINITY;
  let finite = 0;
  let infinite = false;
  for (let index = 0; index < count; index += 1) {
    const value = values[index] ?? Number.NaN;
    if (Number.isFinite(value)) {
      finite += 1;
      if (value < least) least = value;
      if (value > greatest) greatest = value;
    } else if (!Number.isNaN(value)) infinite = true;
  }
  return { least, greatest, finite, infinite };
}

interface Histogram {
  readonly counts: Uint32Array;
  readonly sums: Float64Array;
}

function histogramOf(values: Float64Array, count: number, { least, greatest }: Extremes): Histogram {
  const counts = new Uint32Array(bins);
  const sums = new Float64Array(bins);
  const scale = bins / (greatest - least);
  for (let index = 0; index < count; index += 1) {
    const value = values[index] ?? Number.NaN;
    if (!Number.isFinite(value)) continue;
    const bin = Math.min(bins - 1, Math.floor((value - least) * scale));
    counts[bin] = (counts[bin] ?? 0) + 1;
    // Summing the distance from the least keeps large offsets from eating the digits.
    sums[bin] = (sums[bin] ?? 0) + (value - least);
  }
  return { counts, sums };
}

function fullestBin(counts: Uint32Array, from: number, to: number): number {
  let fullest = from;
  for (let bin = from; bin < to; bin += 1) {
    if ((counts[bin] ?? 0) > (counts[fullest] ?? 0)) fullest = bin;
  }
  return fullest;
}

/** The fullest bin, and the fullest of those far enough from it. */
function twoModes(counts: Uint32Array): readonly [low: number, high: number] {
  const first = fullestBin(counts, 0, bins);
  const apart = Math.floor(bins * leastApart);
  const below = first - apart > 0 ? fullestBin(counts, 0, first - apart) : first;
  const above = first + apart < bins ? fullestBin(counts, first + apart, bins) : first;
  const second = first === below || (above !== first && (counts[above] ?? 0) >= (counts[below] ?? 0)) ? above : below;
  return first < second ? [first, second] : [second, first];
}

/** Both modes have to stand out from what lies between them; a triangle or noise has none that do. */
function standOut(counts: Uint32Array, low: number, high: number, samples: number): boolean {
  let between = 0;
  const from = low + 3;
  const to = high - 2;
  for (let bin = from; bin < to; bin += 1) between += counts[bin] ?? 0;
  const usual = to > from ? between / (to - from) : 0;
  const needed = Math.max(4, samples / 1000, 2 * usual);
  return (counts[low] ?? 0) >= needed && (counts[high] ?? 0) >= needed;
}

/**
 * Mean of the samples in a modal bin and in the neighbours on both sides that are at least half as full: noise spreads a
 * state over several bins, the fullest of which is chance. Samples of a clean edge are too few to be taken in.
 */
function meanAbout(counts: Uint32Array, sums: Float64Array, mode: number): number {
  const enough = (counts[mode] ?? 0) / 2;
  let from = mode;
  let to = mode;
  while (from > 0 && (counts[from - 1] ?? 0) >= enough) from -= 1;
  while (to < bins - 1 && (counts[to + 1] ?? 0) >= enough) to += 1;
  let samples = 0;
  let sum = 0;
  for (let bin = from; bin <= to; bin += 1) {
    samples += counts[bin] ?? 0;
    sum += sums[bin] ?? 0;
  }
  return sum / samples;
}

/** How one state looks: samples in it, those at the extreme beyond it, and neighbours that do not differ. */
interface StateLook {
  readonly samples: number;
  readonly atExtreme: number;
  readonly pairs: number;
  readonly still: number;
}

function lookAt(
  values: Float64Array,
  count: number,
  level: number,
  extreme: number,
  reach: number,
  dust: number,
): StateLook {
  let samples = 0;
  let atExtreme = 0;
  let pairs = 0;
  let still = 0;
  let before = Number.NaN;
  for (let index = 0; index < count; index += 1) {
    const value = values[index] ?? Number.NaN;
    const inside = Math.abs(value - level) < reach;
    if (inside) {
      samples += 1;
      if (Math.abs(value - extreme) < dust) atExtreme += 1;
      if (Math.abs(before - level) < reach) pairs += 1;
      if (Math.abs(value - before) < dust) still += 1;
    }
    before = value;
  }
  return { samples, atExtreme, pairs, still };
}

/**
 * Whether one state is pressed flat against the extreme while the other shows noise: the sign of an exceeded range. An
 * ideal trace that is flat in both states is not called clipped, nor can a trace cut off on both sides be told from it.
 */
function looksClipped(values: Float64Array, count: number, extremes: Extremes, low: number, high: number): boolean {
  const reach = 0.1 * (high - low);
  // Rounding in the export is not noise.
  const dust = 1e-6 * (extremes.greatest - extremes.least);
  const top = lookAt(values, count, high, extremes.greatest, reach, dust);
  const bottom = lookAt(values, count, low, extremes.least, reach, dust);
  const pressed = (state: StateLook): boolean =>
    state.atExtreme > 0.5 * state.samples && state.still > 0.5 * state.pairs;
  const noisy = (state: StateLook): boolean => state.pairs > 0 && state.still < 0.2 * state.pairs;
  return (pressed(top) && noisy(bottom)) || (pressed(bottom) && noisy(top));
}

/**
 * Low and high state level of a two-level signal: the means of the samples in and close about the two modal bins of
 * its amplitude histogram. The second mode is looked for at least a quarter of the range away from the first, so that a ringing edge
 * does not draw the boundary between the halves.
 *
 * @param values samples (V); gaps (NaN) are left out, infinities are overflows
 * @param count how many of them
 * @returns the levels, or why there are none
 * @source IEEE Std 181-2011, 5.2 (state levels by histogram modes); from memory
 */
export function findStateLevels(values: Float64Array, count: number): FoundLevels {
  const extremes = extremesOf(values, count);
  if (extremes.finite < 16) return { refused: 'few_samples' };
  // With every sample of one state beyond the range, only the other level is left.
  const none = { refused: extremes.infinite ? 'clipped' : 'no_two_levels' } as const;
  if (!(extremes.greatest > extremes.least)) return none;
  const { counts, sums } = histogramOf(values, count, extremes);
  const [lowBin, highBin] = twoModes(counts);
  if (lowBin === highBin || !standOut(counts, lowBin, highBin, extremes.finite)) return none;
  const low = extremes.least + meanAbout(counts, sums, lowBin);
  const high = extremes.least + meanAbout(counts, sums, highBin);
  const clipped = extremes.infinite || looksClipped(values, count, extremes, low, high);
  return { levels: { low, high, least: extremes.least, greatest: extremes.greatest, clipped } };
}
