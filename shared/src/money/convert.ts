import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, onCommonScale, type DecimalInput } from '../measure/decimal.js';
import { daysBetween, type IsoDay } from '../plan/iso-day.js';
import { currencyExponent, type CurrencyCode } from './currency.js';
import { minorAmountOf, type Money } from './minor-units.js';
import { roundQuotient, type RoundingMode } from './round.js';

/** A published exchange rate: one unit of `base` costs `rate` units of `quote` from its day on. */
export interface ExchangeRate {
  readonly base: CurrencyCode;
  readonly quote: CurrencyCode;
  /** Major units of `quote` for one major unit of `base`; more than zero. */
  readonly rate: DecimalInput;
  readonly day: IsoDay;
}

/** How to convert. */
export interface ConversionRule {
  /** The day whose rate counts: the latest one published on it or before. */
  readonly on: IsoDay;
  /** A rate older than this is refused; a week spans every holiday. */
  readonly oldestDays: number;
  readonly mode: RoundingMode;
}

/** A converted amount with the rate it came by. */
export interface Conversion {
  readonly money: Money;
  /** Nothing when the currency stays the same. */
  readonly rate?: ExchangeRate;
}

/**
 * Converts an amount by the latest published rate of a day, in the direction it was published or by dividing through it
 * (never through a rounded inverse).
 *
 * @param money the amount
 * @param to the wanted currency
 * @param rates published rates, in any order
 * @param rule day, oldest rate in days, rounding
 * @returns the amount in `to`, rounded once, and the rate used; of two rates of one day the direct one
 * @throws ArithmeticError `money_no_rate`, `money_rate_too_old`, `money_rate_not_positive`, `money_too_large`
 * @source Council Regulation (EC) No 1103/97, article 4 (no rounding of rates, no inverse rates), from memory.
 */
export function convertMoney(
  money: Money,
  to: CurrencyCode,
  rates: readonly ExchangeRate[],
  rule: ConversionRule,
): Conversion {
  if (money.currency === to) return { money };
  const rate = rateOn(money.currency, to, rates, rule);
  const [numerator = 0n, denominator = 1n] = onCommonScale(
    rate.base === money.currency ? [rate.rate, 1] : [1, rate.rate],
  ).integers;
  const scale = (currency: CurrencyCode) => 10n ** BigInt(currencyExponent(currency));
  const amount = roundQuotient(
    BigInt(money.amount) * numerator * scale(to),
    denominator * scale(money.currency),
    rule.mode,
  );
  return { money: { amount: minorAmountOf(amount), currency: to }, rate };
}

function rateOn(from: CurrencyCode, to: CurrencyCode, rates: readonly ExchangeRate[], rule: ConversionRule) {
  const usable = rates.filter(
    ({ base, quote, day }) => day <= rule.on && ((base === from && quote === to) || (base === to && quote === from)),
  );
  const latest = usable.reduce<ExchangeRate | undefined>((best, rate) => {
    if (!best || rate.day > best.day) return rate;
    return rate.day === best.day && rate.base === from && best.base !== from ? rate : best;
  }, undefined);
  if (!latest) throw new ArithmeticError('money_no_rate', { from, to, day: rule.on });
  if (daysBetween(latest.day, rule.on) > rule.oldestDays) {
    throw new ArithmeticError('money_rate_too_old', { from, to, day: rule.on, rateDay: latest.day });
  }
  const value = decimal(latest.rate);
  if (value.lessThanOrEqualTo(0)) throw new ArithmeticError('money_rate_not_positive', { rate: value.toFixed() });
  return latest;
}
