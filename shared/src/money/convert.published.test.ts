import { describe, expect, it } from '@jest/globals';
import { isoDay } from '../plan/iso-day.js';
import { convertMoney } from './convert.js';
import { currencyCode, euro } from './currency.js';
import { minorAmount } from './minor-units.js';

// The irrevocable rates between the euro and the currencies it replaced: Council Regulation (EC) No 2866/98, article 1
// (BEF, DEM, FRF), from memory; they are outside of ISO 4217's list of today, so currencies of as many decimals stand in
// for them. The results follow from article 4 of Regulation (EC) No 1103/97: divide by the rate, then round.
describe('conversion by fixed rates', () => {
  it.each([
    [100_00, '1.95583', 51_13],
    [100_00, '6.55957', 15_24],
    [1_000_00, '40.3399', 24_79],
    [10_00, '1.95583', 5_11],
  ])('%i at %s for one euro is %i cents', (amount, value, cents) => {
    const other = currencyCode('DKK');
    const day = isoDay('1999-01-01');
    const rates = [{ base: euro, quote: other, rate: value, day }];
    const rule = { on: day, oldestDays: 0, mode: 'half-up' } as const;
    expect(convertMoney({ amount: minorAmount(amount), currency: other }, euro, rates, rule).money.amount).toBe(cents);
  });
});
