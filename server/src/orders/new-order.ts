import type { QuoteRequest } from '../catalogue/quote.js';

/** Where an order goes. */
export interface OrderAddress {
  readonly recipient: string;
  readonly company: string | null;
  readonly addressLine: string;
  readonly addressLine2: string | null;
  readonly city: string;
  readonly postcode: string;
  readonly country: string;
}

export interface NewOrder {
  readonly lines: QuoteRequest['lines'];
  readonly email: string;
  readonly address: OrderAddress;
  /** What the buyer saw before pressing the button, minor units; another price is not charged without being shown. */
  readonly expectedGross: number;
  /** The day the buyer was promised. */
  readonly expectedDay: string;
}

/** Who orders: somebody signed in as a customer, or a guest. */
export interface Orderer {
  readonly userId: number | null;
  readonly customerId: number | null;
}

export interface PlacedOrder {
  readonly orderId: number;
  readonly number: string;
  /** Opens the order without signing in; given out once. */
  readonly guestToken: string;
  readonly paymentSessionId: number;
}
