import { expect, test } from '@jest/globals';
import { shuffled } from './shuffle.mjs';

const files = Array.from({ length: 50 }, (_, index) => `file-${index}`);

test('a shuffle keeps every file once', () => {
  expect(shuffled(files, 7).toSorted()).toEqual(files.toSorted());
});

test('the same seed gives the same order, another seed another', () => {
  expect(shuffled(files, 7)).toEqual(shuffled(files, 7));
  expect(shuffled(files, 7)).not.toEqual(shuffled(files, 8));
});

test('no place is favoured: each file comes first about equally often', () => {
  const counts = new Map();
  for (let seed = 0; seed < 6_000; seed += 1) {
    const [first] = shuffled(['a', 'b', 'c'], seed);
    counts.set(first, (counts.get(first) ?? 0) + 1);
  }
  // 2000 expected each; 200 is more than five standard deviations of a binomial count.
  for (const name of ['a', 'b', 'c']) expect(Math.abs(counts.get(name) - 2_000)).toBeLessThan(200);
});
