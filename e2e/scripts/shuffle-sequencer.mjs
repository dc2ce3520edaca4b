import TestSequencer from '@jest/test-sequencer';
import { givenSeed, shuffled } from './shuffle.mjs';

/** Jest's own order, the slow and the failed first; or, with a seed, the order that belongs to it. */
export default class ShuffleSequencer extends TestSequencer {
  sort(tests) {
    const seed = givenSeed();
    if (seed === undefined) return super.sort(tests);
    return shuffled(
      [...tests].toSorted((one, other) => (one.path < other.path ? -1 : 1)),
      seed,
    );
  }
}
