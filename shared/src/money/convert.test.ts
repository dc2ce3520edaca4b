import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { isoDay } from '../plan/iso-day.js';
import { convertMoney, type ConversionRule, type ExchangeRate } from './convert.js';
import { currencyCode, euro } from './currency.js';
import { minorAmount, type Money } from './minor-units.js';

const yen = currencyCode('JPY');
const krona = currencyCode('SEK');
const dinar = currencyCode('KWD');
const euros = (amount: number): Money => ({ amount: minorAmount(amount), currency: euro });
const rate = (quote: typeof euro, value: string, day: string): ExchangeRate => ({
  base: euro,
  quote,
  rate: value,
  day: isoDay(day),
});
const rule: ConversionRule = { on: isoDay('2026-03-10'), oldestDays: 7, mode: 'half-up' };
const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('converting by a dated rate', () => {
  const rates = [
    rate(krona, '11.2345', '2026-03-09'),
    rate(krona, '11.1', '2026-03-05'),
    rate(krona, '12', '2026-03-11'),
    rate(yen, '161.27', '2026-03-10'),
    rate(dinar, '0.3341', '2026-03-04'),
  ];

  it('takes the latest rate up to the day', () => {
    expect(convertMoney(euros(10_000), krona, rates, rule)).toEqual({
      money: { amount: 112_345, currency: 'SEK' },
      rate: rates[0],
    });
  });

  it('minds the decimals of both currencies', () => {
    expect(convertMoney(euros(1_050), yen, rates, rule).money.amount).toBe(1_693);
    expect(convertMoney(euros(1_050), dinar, rates, rule).money.amount).toBe(3_508);
    expect(convertMoney({ amount: minorAmount(1_693), currency: yen }, euro, rates, rule).money.amount).toBe(1_050);
  });

  it('divides when the rate was published the other way round', () => {
    expect(convertMoney({ amount: minorAmount(112_345), currency: krona }, euro, rates, rule).money).toEqual(
      euros(10_000),
    );
  });

  it('leaves the same currency alone and needs no rate for it', () => {
    expect(convertMoney(euros(-5), euro, [], rule)).toEqual({ money: euros(-5) });
  });

  it('prefers the direct one of two rates of a day', () => {
    const inverse = { base: krona, quote: euro, rate: '0.1', day: isoDay('2026-03-09') };
    expect(convertMoney(euros(100), krona, [inverse, ...rates], rule).rate).toBe(rates[0]);
    expect(convertMoney(euros(100), krona, [...rates, inverse], rule).rate).toBe(rates[0]);
  });

  it.each<[string, ExchangeRate[], string]>([
    ['without any rate', [], 'money_no_rate'],
    ['with a later rate only', [rate(krona, '11', '2026-03-11')], 'money_no_rate'],
    ['with a rate of another pair only', [rate(yen, '161', '2026-03-10')], 'money_no_rate'],
    ['with a rate too old', [rate(krona, '11', '2026-03-02')], 'money_rate_too_old'],
    ['with a rate of zero', [rate(krona, '0', '2026-03-10')], 'money_rate_not_positive'],
    ['with a negative rate', [rate(krona, '-1', '2026-03-10')], 'money_rate_not_positive'],
  ])('refuses %s', (_how, given, code) => {
    expect(codeOf(() => convertMoney(euros(100), krona, given, rule))).toBe(code);
  });

  it('comes back within the rounding of one unit of the coarser side', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1_000_000_000, max: 1_000_000_000 }), (amount) => {
        const there = convertMoney(euros(amount), krona, rates, rule).money;
        expect(convertMoney(there, euro, rates, rule).money).toEqual(euros(amount));
      }),
    );
  });
});
