import { isoDay, type IsoDay } from '../plan/iso-day.js';
import type { VatAreaRow, VatSpecialPlaceRow } from './vat-rules.js';

// Data to start from, as of 2026; each shop keeps and dates its own copy. Check the current rules.

const sinceVatUnion = isoDay('1993-01-01');

/** Member states by the day they joined the single market's VAT area, or its start. */
const members: readonly (readonly [IsoDay, string, IsoDay?])[] = [
  [sinceVatUnion, 'BE DE DK ES FR GR IE IT LU NL PT'],
  [sinceVatUnion, 'GB', isoDay('2020-12-31')],
  [isoDay('1995-01-01'), 'AT FI SE'],
  [isoDay('2004-05-01'), 'CY CZ EE HU LT LV MT PL SI SK'],
  [isoDay('2007-01-01'), 'BG RO'],
  [isoDay('2013-07-01'), 'HR'],
];

/**
 * The member states of the European Union as rows for {@link VatAreaRow}, with their days of accession (treaties of
 * accession) and the United Kingdom until the end of the transition period (withdrawal agreement, article 126) and
 * outside since. Monaco counts as France (Directive 2006/112/EC, article 7). From memory.
 */
export const unionVatAreas: readonly VatAreaRow[] = [
  ...members.flatMap(([from, countries, until]) =>
    countries.split(' ').map((country): VatAreaRow => ({ country, area: 'union', from, until })),
  ),
  { country: 'MC', area: 'union', from: sinceVatUnion },
  { country: 'GB', area: 'outside', from: isoDay('2021-01-01') },
  // Prefix of the VAT numbers of Northern Ireland; goods are still sent to GB.
  { country: 'XI', area: 'union', from: isoDay('2021-01-01') },
];

const places: Readonly<Record<string, string>> = {
  // Jungholz and Mittelberg have a rate of their own.
  AT: '6691 6991 6992 6993',
  // Büsingen, Heligoland.
  DE: '78266 27498',
  // Ceuta, Melilla, Canary Islands.
  ES: '51 52 35 38',
  // Åland.
  FI: '22',
  // Overseas departments and territories.
  FR: '97 98',
  // Northern Ireland keeps the union's rules for goods; Jersey, Guernsey and Man have their own.
  GB: 'BT JE GY IM',
  // Mount Athos.
  GR: '63086 63087',
  // Livigno, Campione d'Italia.
  IT: '23041 23030 22061 22060',
  // Madeira and the Azores have rates of their own.
  PT: '90 91 92 93 94 95 96 97 98 99',
};

/**
 * Places with VAT rules of their own, by the beginning of their post codes. Source: Directive 2006/112/EC, articles 6,
 * 7, 104 and 105, and the protocol on Ireland/Northern Ireland, article 8, for the places; the post codes are common
 * knowledge, from memory.
 */
export const specialVatPlaces: readonly VatSpecialPlaceRow[] = Object.entries(places).flatMap(([country, prefixes]) =>
  prefixes.split(' ').map((postcodePrefix) => ({ country, postcodePrefix, from: sinceVatUnion })),
);
