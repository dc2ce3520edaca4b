import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { minorAmount } from './minor-units.js';
import { costPool, issueFromPool, receiveIntoPool } from './movement-value.js';
import { takeBackFromPool } from './take-back.js';

describe('taking back what came by mistake', () => {
  it('leaves the pool as if it had never come', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 1_000 }),
        fc.integer({ min: 0, max: 1_000_000 }),
        fc.integer({ min: 1, max: 1_000 }),
        fc.integer({ min: 0, max: 1_000_000 }),
        (held, worth, quantity, brought) => {
          const before = costPool(held, minorAmount(worth));
          const after = receiveIntoPool(before, quantity, minorAmount(brought)).pool;
          const { pool, value } = takeBackFromPool(after, quantity, minorAmount(brought));
          expect(value).toBe(brought === 0 ? 0 : -brought);
          expect([pool.quantity.toNumber(), pool.value]).toEqual([held, worth]);
        },
      ),
    );
  });

  it('takes the average where some has left since, and never more than there is', () => {
    const mixed = receiveIntoPool(costPool(10, minorAmount(100)), 10, minorAmount(2_000)).pool;
    const { pool } = issueFromPool(mixed, 10);
    expect(pool.value).toBe(1_050);
    expect(takeBackFromPool(pool, 5, minorAmount(2_000))).toMatchObject({ value: -525, pool: { value: 525 } });
  });

  it('takes all that is left with the last of it', () => {
    const pool = costPool(10, minorAmount(70));
    expect(takeBackFromPool(pool, 10, minorAmount(50))).toMatchObject({ value: -70, pool: { value: 0 } });
  });
});
