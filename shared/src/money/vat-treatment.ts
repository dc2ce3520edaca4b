import { decimal, decimalText } from '../measure/decimal.js';
import type { IsoDay } from '../plan/iso-day.js';
import type { VatCategory } from './vat-category.js';
import { holdsOn, type VatRules } from './vat-rules.js';

/** A supply of goods whose VAT is to be decided. */
export interface VatSupply {
  /** The tax point: a payment in advance sets it, else the dispatch. */
  readonly day: IsoDay;
  readonly rateClass: string;
  readonly shipTo: { readonly country: string; readonly postcode?: string | undefined };
  /** Who has the goods carried; a buyer who fetches them at the shop is supplied at home. */
  readonly carriedBy: 'shop' | 'buyer';
  readonly buyer:
    | { readonly kind: 'consumer' }
    | {
        readonly kind: 'business';
        /** Country of the VAT number, if the buyer gave one (ISO 3166-1; GR for the prefix EL). */
        readonly vatNumberCountry?: string | undefined;
        /** Whether the official service has confirmed the number for this supply. */
        readonly vatNumberConfirmed: boolean;
        /** Whether a proof of transport is held or sure to come. */
        readonly transportProof: boolean;
      };
}

/** Why a supply is treated so; a code a screen turns into a sentence. */
export type VatReason =
  | 'sent_within_home'
  | 'fetched_at_home'
  | 'one_stop_shop'
  | 'no_one_stop_shop'
  | 'number_not_confirmed'
  | 'no_transport_proof'
  | 'sent_out_of_union'
  | 'business_in_union';

/** What is missing for a decision. */
export type VatQuestion =
  | 'country_not_covered'
  | 'special_place'
  | 'rate_not_covered'
  | 'rates_disagree'
  | 'over_threshold'
  | 'buyer_carries_abroad';

/** The decision on a supply. */
export type VatTreatment =
  | {
      readonly kind: 'home' | 'destination' | 'export' | 'intra-community';
      /** Category of EN 16931. */
      readonly category: VatCategory;
      /** Percent, plain notation. */
      readonly ratePercent: string;
      /** The country whose VAT it is, or the destination of an exempt supply. */
      readonly country: string;
      readonly reason: VatReason;
      /** Code of the exemption (VATEX list of EN 16931), for exempt supplies. */
      readonly exemptionCode?: 'VATEX-EU-G' | 'VATEX-EU-IC';
    }
  | { readonly kind: 'ask'; readonly question: VatQuestion; readonly country: string };

/**
 * Decides the VAT on goods that the shop sends from its own country. What the rules do not cover is never guessed: the
 * answer is then "ask". It helps to prepare; local rules and a tax adviser decide.
 *
 * @param supply tax point, kind of goods, destination, buyer
 * @param rules dated rates, countries, special places, the shop's home and elections
 * @returns category, rate and reason, or the question that is open
 * @throws ArithmeticError `measure_not_a_number`, `measure_not_exact` for a rate row that holds no decimal
 * @source Directive 2006/112/EC: articles 31 and 32 (goods not sent, or sent from here), 33(a) and 59c (distance sales
 *   and their threshold), 138 (intra-Community supply), 146 (export), 369a to 369j (one-stop shop); Implementing
 *   Regulation (EU) 282/2011, article 45a (proof of transport). From memory.
 */
export function vatTreatment(supply: VatSupply, rules: VatRules): VatTreatment {
  const { country } = supply.shipTo;
  const area = areaOf(country, supply.day, rules);
  if (area === undefined) return ask('country_not_covered', country);
  if (isSpecialPlace(supply, rules)) return ask('special_place', country);
  if (country === rules.home) return rated('home', country, supply, rules, 'sent_within_home');
  if (supply.carriedBy === 'buyer') return ask('buyer_carries_abroad', country);
  if (area === 'outside') {
    return { kind: 'export', ...exempt('G'), country, reason: 'sent_out_of_union', exemptionCode: 'VATEX-EU-G' };
  }
  return supply.buyer.kind === 'business' ? toBusiness(supply, supply.buyer, rules) : toConsumer(supply, rules);
}

/**
 * Decides the VAT on goods that are handed over at the shop, whatever the buyer does with them.
 *
 * @param supply tax point and kind of goods
 * @param rules as for {@link vatTreatment}
 * @returns the home rate, or the question that is open
 * @throws ArithmeticError as {@link vatTreatment}
 * @source Directive 2006/112/EC, article 31.
 */
export function vatTreatmentAtShop(supply: Pick<VatSupply, 'day' | 'rateClass'>, rules: VatRules): VatTreatment {
  return rated('home', rules.home, supply, rules, 'fetched_at_home');
}

type BusinessBuyer = Extract<VatSupply['buyer'], { readonly kind: 'business' }>;

function toBusiness(supply: VatSupply, buyer: BusinessBuyer, rules: VatRules): VatTreatment {
  const { country } = supply.shipTo;
  const ofAnotherState =
    buyer.vatNumberCountry !== undefined &&
    buyer.vatNumberCountry !== rules.home &&
    areaOf(buyer.vatNumberCountry, supply.day, rules) === 'union';
  // Without a number of another member state the buyer counts as a consumer.
  if (!buyer.vatNumberConfirmed || !ofAnotherState) return toConsumer(supply, rules, 'number_not_confirmed');
  if (!buyer.transportProof) return rated('home', rules.home, supply, rules, 'no_transport_proof');
  return {
    kind: 'intra-community',
    ...exempt('K'),
    country,
    reason: 'business_in_union',
    exemptionCode: 'VATEX-EU-IC',
  };
}

function toConsumer(supply: VatSupply, rules: VatRules, why?: VatReason): VatTreatment {
  const { country } = supply.shipTo;
  if (rules.oneStopShop.some((span) => holdsOn(span, supply.day))) {
    return rated('destination', country, supply, rules, why ?? 'one_stop_shop');
  }
  if (rules.overThreshold.some((span) => holdsOn(span, supply.day))) return ask('over_threshold', country);
  return rated('home', rules.home, supply, rules, why ?? 'no_one_stop_shop');
}

function rated(
  kind: 'home' | 'destination',
  country: string,
  supply: Pick<VatSupply, 'day' | 'rateClass'>,
  rules: VatRules,
  reason: VatReason,
): VatTreatment {
  const rates = new Set(
    rules.rates
      .filter((row) => row.country === country && row.rateClass === supply.rateClass && holdsOn(row, supply.day))
      .map((row) => decimalText(row.ratePercent)),
  );
  const [ratePercent] = rates;
  if (ratePercent === undefined) return ask('rate_not_covered', country);
  if (rates.size > 1) return ask('rates_disagree', country);
  return { kind, category: decimal(ratePercent).isZero() ? 'Z' : 'S', ratePercent, country, reason };
}

/** The area of a country on a day; nothing if no row says, or two rows disagree. */
function areaOf(country: string, day: IsoDay, rules: VatRules): 'union' | 'outside' | undefined {
  const areas = new Set(
    rules.areas.filter((row) => row.country === country && holdsOn(row, day)).map((row) => row.area),
  );
  return areas.size === 1 ? [...areas][0] : undefined;
}

function isSpecialPlace(supply: VatSupply, rules: VatRules): boolean {
  const { country, postcode } = supply.shipTo;
  const places = rules.specialPlaces.filter((row) => row.country === country && holdsOn(row, supply.day));
  const code = postcode?.replace(/[\s-]/g, '').toUpperCase();
  // Where a country has such places, an unknown post code could be one of them.
  if (code === undefined || code === '') return places.length > 0;
  return places.some((row) => code.startsWith(row.postcodePrefix));
}

const exempt = (category: 'G' | 'K') => ({ category, ratePercent: '0' }) as const;

const ask = (question: VatQuestion, country: string): VatTreatment => ({ kind: 'ask', question, country });
