import type { DecimalInput } from '../measure/decimal.js';
import type { IsoDay } from '../plan/iso-day.js';

/** A span of days in which a rule holds, both ends included; open without an end. */
export interface RuleSpan {
  readonly from: IsoDay;
  readonly until?: IsoDay | null | undefined;
}

/** A VAT rate of a country. */
export interface VatRateRow extends RuleSpan {
  /** ISO 3166-1 alpha-2 (GR for Greece). */
  readonly country: string;
  /** The shop's name of the kind of goods the rate is for, for example "standard". */
  readonly rateClass: string;
  /** Percent, for example "23". */
  readonly ratePercent: DecimalInput;
}

/** Whether a country's territory belongs to the VAT area of the European Union for goods. */
export interface VatAreaRow extends RuleSpan {
  readonly country: string;
  readonly area: 'union' | 'outside';
}

/** A place inside a country with VAT rules of its own; supplies to it are asked about. */
export interface VatSpecialPlaceRow extends RuleSpan {
  readonly country: string;
  /** Leading characters of its post codes, without spaces. */
  readonly postcodePrefix: string;
}

/** What the shop has set down about VAT; every decision is a function of this and of the supply. */
export interface VatRules {
  /** The shop's own country, from which everything is sent. */
  readonly home: string;
  readonly rates: readonly VatRateRow[];
  readonly areas: readonly VatAreaRow[];
  readonly specialPlaces: readonly VatSpecialPlaceRow[];
  /** The spans for which the shop has elected the union one-stop shop. */
  readonly oneStopShop: readonly RuleSpan[];
  /** The spans in which distance sales have passed the union's threshold. */
  readonly overThreshold: readonly RuleSpan[];
}

/**
 * Whether a rule holds on a day.
 *
 * @param span from and until, both included
 * @param day the day
 * @returns true inside the span
 */
export function holdsOn(span: RuleSpan, day: IsoDay): boolean {
  return span.from <= day && (span.until === undefined || span.until === null || day <= span.until);
}
