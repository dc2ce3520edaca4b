import type { VatQuestion, VatTreatment } from '@emberlot/shared/money/vat-treatment';

/** Why a basket cannot be priced, in a sentence for the buyer. */
export const questionSentence: Readonly<Record<VatQuestion, (country: string) => string>> = {
  country_not_covered: (country) => `We have not sent anything to ${country} yet. Write to us, and we will find out.`,
  special_place: (country) =>
    `Parts of ${country} have tax rules of their own, and this postcode may be in one. Write to us before you order.`,
  rate_not_covered: (country) => `We do not know today's VAT for ${country}. Write to us before you order.`,
  rates_disagree: (country) => `We are not sure of today's VAT for ${country}. Write to us before you order.`,
  over_threshold: (country) => `We cannot charge the VAT of ${country} just now. Write to us before you order.`,
  buyer_carries_abroad: () => 'Collecting goods for another country needs papers. Write to us before you order.',
};

type Decided = Exclude<VatTreatment, { kind: 'ask' }>;

/** What stands on order and invoice beside the amounts. */
export function vatNote(decided: Decided, countryName: string): string | null {
  if (decided.kind === 'export') {
    return 'Export of goods to a place outside the European Union, exempt from VAT: Directive 2006/112/EC, article 146.';
  }
  if (decided.kind === 'destination') return `VAT of ${countryName}, declared through the one-stop shop.`;
  return null;
}
