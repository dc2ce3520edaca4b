import type { Decimal } from '@emberlot/shared/measure/decimal';
import type { MinorAmount } from '@emberlot/shared/money/minor-units';
import type { VatCategory } from '@emberlot/shared/money/vat-category';
import type { DocumentTotals } from '@emberlot/shared/money/vat-totals';
import type { OfferRow } from './listings.repository.js';
import type { ShopPromise } from './promise.js';

export interface QuoteRequest {
  readonly country: string;
  readonly postcode?: string | undefined;
  readonly lines: readonly { readonly listingId: number; readonly quantity: number }[];
}

export interface QuotedNeed {
  readonly partId: number;
  readonly quantity: Decimal;
  readonly bag: string | null;
}

export interface QuotedLine {
  readonly listing: OfferRow;
  readonly quantity: number;
  readonly unitNet: MinorAmount;
  readonly net: MinorAmount;
  readonly needs: readonly QuotedNeed[];
}

/** How the supply is taxed, as the order keeps it. */
export interface QuotedVat {
  readonly treatment: 'home' | 'destination' | 'export';
  readonly category: VatCategory;
  /** Percent, plain notation. */
  readonly ratePercent: string;
  /** Whose VAT it is. */
  readonly country: string;
  /** What the law wants said, for example of an export. */
  readonly note: string | null;
}

/** A basket with its price, VAT and promise: all that an order is made from. */
export interface Quote {
  readonly lines: readonly QuotedLine[];
  readonly delivery: MinorAmount;
  readonly transitDays: number;
  readonly vat: QuotedVat;
  readonly totals: DocumentTotals;
  readonly currency: string;
  readonly promise: ShopPromise;
}

/** The shop cannot answer by itself; the sentence says why and what to do. */
export interface AskUs {
  readonly ask: string;
}
