import type { MinorAmount } from '@emberlot/shared/money/minor-units';
import type { VatCategory } from '@emberlot/shared/money/vat-category';

export type VatTreatment = 'home' | 'destination' | 'export' | 'intra_community';

/** Seller or buyer as they stand on an invoice: copied when it is issued, so that later changes do not reach it. */
export interface InvoiceParty {
  readonly name: string;
  readonly addressLine: string;
  readonly addressLine2?: string;
  readonly city: string;
  readonly postcode: string;
  readonly countryCode: string;
  readonly email?: string;
  readonly vatNumber?: string;
  readonly registrationNumber?: string;
}

export interface InvoiceDraftLine {
  readonly partId: number | null;
  readonly code: string;
  readonly description: string;
  /** Decimal text in the measure. */
  readonly quantity: string;
  readonly measure: string;
  /** Major units, decimal text. */
  readonly unitNet: string;
  readonly net: MinorAmount;
  readonly vatCategory: VatCategory;
  /** Percent, decimal text. */
  readonly vatRate: string;
}

export interface InvoiceDraftCharge {
  readonly reason: string;
  readonly amount: MinorAmount;
  readonly vatCategory: VatCategory;
  readonly vatRate: string;
}

/** What an invoice is made from. Totals are never handed in: they are worked out. */
export interface InvoiceDraft {
  readonly customerId: number;
  readonly buyer: InvoiceParty;
  /** The order's number, as the buyer knows it. */
  readonly reference: string;
  readonly treatment: VatTreatment;
  /** What the law wants said about the treatment, for example of an export. */
  readonly vatNote: string | null;
  readonly lines: readonly InvoiceDraftLine[];
  readonly charges: readonly InvoiceDraftCharge[];
  /** Paid already, minor units. */
  readonly prepaid: MinorAmount;
  /** The person who issues it; nobody when a payment does. */
  readonly recordedBy: number | null;
}

export interface IssuedInvoice {
  readonly invoiceId: number;
  readonly documentId: number;
  readonly number: string;
  readonly net: MinorAmount;
  readonly vat: MinorAmount;
  readonly gross: MinorAmount;
}
