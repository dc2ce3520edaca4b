// An order of test files that can be had again from its seed.

/** A small generator of numbers from 0 up to 1 (Mulberry32, public domain): good enough to shuffle with. */
function numbersFrom(seed) {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/**
 * @template Item
 * @param {readonly Item[]} items
 * @param {number} seed a whole number
 * @returns {Item[]} every item once, in the order that belongs to the seed
 */
export function shuffled(items, seed) {
  const next = numbersFrom(seed);
  const result = [...items];
  for (let last = result.length - 1; last > 0; last -= 1) {
    const chosen = Math.floor(next() * (last + 1));
    [result[last], result[chosen]] = [result[chosen], result[last]];
  }
  return result;
}

/** The seed this run was given, or undefined when files come in their usual order. */
export function givenSeed() {
  const text = process.env.EMBERLOT_TEST_SEED;
  return text === undefined || text === '' ? undefined : Number(text);
}
