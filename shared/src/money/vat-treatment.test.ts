import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { isoDay } from '../plan/iso-day.js';
import { specialVatPlaces, unionVatAreas } from './vat-area.js';
import type { VatRules } from './vat-rules.js';
import { vatTreatment, vatTreatmentAtShop, type VatSupply } from './vat-treatment.js';

const always = { from: isoDay('2000-01-01') };
const rules: VatRules = {
  home: 'IE',
  rates: [
    {
      country: 'IE',
      rateClass: 'standard',
      ratePercent: '23.000',
      from: isoDay('2012-01-01'),
      until: isoDay('2020-08-31'),
    },
    {
      country: 'IE',
      rateClass: 'standard',
      ratePercent: '21',
      from: isoDay('2020-09-01'),
      until: isoDay('2021-02-28'),
    },
    { country: 'IE', rateClass: 'standard', ratePercent: '23', from: isoDay('2021-03-01') },
    { country: 'IE', rateClass: 'books', ratePercent: '0', ...always },
    { country: 'DE', rateClass: 'standard', ratePercent: '19', from: isoDay('2007-01-01') },
    { country: 'FI', rateClass: 'standard', ratePercent: '25.5', from: isoDay('2024-09-01') },
    { country: 'NL', rateClass: 'standard', ratePercent: '21', ...always },
    { country: 'NL', rateClass: 'standard', ratePercent: '19', ...always },
  ],
  areas: [...unionVatAreas, { country: 'US', area: 'outside', ...always }],
  specialPlaces: specialVatPlaces,
  oneStopShop: [{ from: isoDay('2025-07-01') }],
  overThreshold: [],
};
const withoutElection = { ...rules, oneStopShop: [] };
const consumer = { kind: 'consumer' } as const;
const business = { kind: 'business', vatNumberCountry: 'DE', vatNumberConfirmed: true, transportProof: true } as const;
const supply = (country: string, change: Partial<VatSupply> = {}): VatSupply => ({
  day: isoDay('2026-03-10'),
  rateClass: 'standard',
  shipTo: { country, postcode: '10115' },
  carriedBy: 'shop',
  buyer: consumer,
  ...change,
});

describe('VAT on goods sent', () => {
  it('within the home country is the home rate of the day', () => {
    const rateOn = (day: string) => {
      const treatment = vatTreatment(supply('IE', { day: isoDay(day) }), rules);
      return treatment.kind === 'ask' ? treatment.question : treatment.ratePercent;
    };
    expect(['2020-08-31', '2020-09-01', '2021-02-28', '2021-03-01', '2011-12-31'].map(rateOn)).toEqual([
      '23',
      '21',
      '21',
      '23',
      'rate_not_covered',
    ]);
    expect(vatTreatment(supply('IE'), rules)).toEqual({
      kind: 'home',
      category: 'S',
      ratePercent: '23',
      country: 'IE',
      reason: 'sent_within_home',
    });
  });

  it('at a rate of zero is zero rated, not exempt', () => {
    expect(vatTreatment(supply('IE', { rateClass: 'books' }), rules)).toMatchObject({
      category: 'Z',
      ratePercent: '0',
    });
  });

  it('to a business at home is at the home rate, number or not', () => {
    const buyer = { ...business, vatNumberCountry: 'IE' };
    expect(vatTreatment(supply('IE', { buyer }), rules)).toMatchObject({ kind: 'home', reason: 'sent_within_home' });
  });

  it('to a consumer in the union is the destination rate from the day of the election on', () => {
    expect(vatTreatment(supply('DE'), rules)).toEqual({
      kind: 'destination',
      category: 'S',
      ratePercent: '19',
      country: 'DE',
      reason: 'one_stop_shop',
    });
    expect(vatTreatment(supply('DE', { day: isoDay('2025-06-30') }), rules)).toMatchObject({
      kind: 'home',
      ratePercent: '23',
      country: 'IE',
      reason: 'no_one_stop_shop',
    });
  });

  it('to a consumer in the union without election is asked about once the threshold is passed', () => {
    const over = { ...withoutElection, overThreshold: [{ from: isoDay('2026-03-10'), until: isoDay('2026-12-31') }] };
    expect(vatTreatment(supply('DE', { day: isoDay('2026-03-09') }), over)).toMatchObject({ kind: 'home' });
    expect(vatTreatment(supply('DE'), over)).toEqual({ kind: 'ask', question: 'over_threshold', country: 'DE' });
    expect(vatTreatment(supply('DE', { day: isoDay('2027-01-01') }), over)).toMatchObject({ kind: 'home' });
  });

  it('to a business of another member state is exempt, with the code of its exemption', () => {
    expect(vatTreatment(supply('DE', { buyer: business }), rules)).toEqual({
      kind: 'intra-community',
      category: 'K',
      ratePercent: '0',
      country: 'DE',
      reason: 'business_in_union',
      exemptionCode: 'VATEX-EU-IC',
    });
  });

  it.each([
    ['without a confirmed number', { ...business, vatNumberConfirmed: false }],
    ['without a number', { ...business, vatNumberCountry: undefined }],
    ['with a number of the home country', { ...business, vatNumberCountry: 'IE' }],
    ['with a number of a country outside', { ...business, vatNumberCountry: 'GB' }],
  ])('to a business %s is taxed as to a consumer', (_how, buyer) => {
    expect(vatTreatment(supply('DE', { buyer }), rules)).toMatchObject({
      kind: 'destination',
      ratePercent: '19',
      reason: 'number_not_confirmed',
    });
    expect(vatTreatment(supply('DE', { buyer }), withoutElection)).toMatchObject({
      kind: 'home',
      ratePercent: '23',
      reason: 'number_not_confirmed',
    });
  });

  it('to a business without proof of transport is at the home rate', () => {
    const buyer = { ...business, transportProof: false };
    expect(vatTreatment(supply('DE', { buyer }), rules)).toMatchObject({ kind: 'home', reason: 'no_transport_proof' });
  });

  it('out of the union is an export, to whomever', () => {
    for (const buyer of [consumer, business]) {
      expect(vatTreatment(supply('US', { buyer }), rules)).toEqual({
        kind: 'export',
        category: 'G',
        ratePercent: '0',
        country: 'US',
        reason: 'sent_out_of_union',
        exemptionCode: 'VATEX-EU-G',
      });
    }
  });

  it('follows a country that left the union', () => {
    const london = { shipTo: { country: 'GB', postcode: 'EC1A 1BB' } };
    expect(vatTreatment(supply('GB', { ...london, day: isoDay('2020-12-31') }), rules)).toMatchObject({ kind: 'home' });
    expect(vatTreatment(supply('GB', { ...london, day: isoDay('2021-01-01') }), rules)).toMatchObject({
      kind: 'export',
    });
  });

  it.each<[string, VatSupply, string]>([
    ['a country nothing is known about', supply('BR'), 'country_not_covered'],
    ['a member state without a rate', supply('SE'), 'rate_not_covered'],
    [
      'a day before the first rate',
      supply('FI', { day: isoDay('2024-08-31'), shipTo: { country: 'FI', postcode: '00100' } }),
      'rate_not_covered',
    ],
    ['two rates at once', supply('NL'), 'rates_disagree'],
    ['Northern Ireland', supply('GB', { shipTo: { country: 'GB', postcode: 'bt1 5gs' } }), 'special_place'],
    ['the Canary Islands', supply('ES', { shipTo: { country: 'ES', postcode: '35-001' } }), 'special_place'],
    ['a country with special places and no post code', supply('ES', { shipTo: { country: 'ES' } }), 'special_place'],
    ['a buyer who carries the goods abroad', supply('DE', { carriedBy: 'buyer' }), 'buyer_carries_abroad'],
  ])('is asked about for %s', (_what, given, question) => {
    const day = given.shipTo.country === 'FI' ? { ...rules, oneStopShop: [always] } : rules;
    expect(vatTreatment(given, day)).toEqual({ kind: 'ask', question, country: given.shipTo.country });
  });

  it('handed over at the shop is at the home rate', () => {
    expect(vatTreatmentAtShop(supply('DE'), rules)).toMatchObject({ kind: 'home', reason: 'fetched_at_home' });
    expect(vatTreatmentAtShop({ day: isoDay('1999-01-01'), rateClass: 'x' }, rules)).toMatchObject({ kind: 'ask' });
  });

  it('charges nothing only for an export, or for a confirmed business of another state with proof of transport', () => {
    const buyers = fc.oneof(
      fc.constant(consumer),
      fc.record({
        kind: fc.constant('business' as const),
        vatNumberCountry: fc.constantFrom(undefined, 'IE', 'DE', 'FI', 'US'),
        vatNumberConfirmed: fc.boolean(),
        transportProof: fc.boolean(),
      }),
    );
    const countries = fc.constantFrom('IE', 'DE', 'FI', 'US', 'BR', 'GB', 'SE');
    fc.assert(
      fc.property(buyers, countries, fc.boolean(), (buyer, country, elected) => {
        const treatment = vatTreatment(supply(country, { buyer }), elected ? rules : withoutElection);
        if (treatment.kind === 'ask' || treatment.ratePercent !== '0') return;
        const exempt =
          buyer.kind === 'business' &&
          buyer.vatNumberConfirmed &&
          buyer.transportProof &&
          ['DE', 'FI'].includes(buyer.vatNumberCountry ?? '');
        expect(['US', 'GB'].includes(country) || exempt).toBe(true);
      }),
    );
  });
});
