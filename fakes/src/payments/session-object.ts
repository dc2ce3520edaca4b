import type Stripe from 'stripe';

export type SessionSeed = {
  readonly id: string;
  readonly url: string;
  readonly created: number;
  readonly expiresAt: number;
  readonly currency: string;
  readonly amount: number;
  readonly successUrl: string;
  readonly cancelUrl: string | null;
  readonly clientReferenceId: string | null;
  readonly customerEmail: string | null;
  readonly metadata: Record<string, string>;
  readonly allowedMethods: string[];
  readonly locale: string | null;
  readonly submitType: string | null;
  readonly shopName: string;
};

/** A new, open session as the API answers it. */
export function newSession(seed: SessionSeed): Stripe.Checkout.Session {
  return {
    ...EMPTY,
    id: seed.id,
    amount_subtotal: seed.amount,
    amount_total: seed.amount,
    branding_settings: { ...PLAIN_BRANDING, display_name: seed.shopName },
    cancel_url: seed.cancelUrl,
    client_reference_id: seed.clientReferenceId,
    created: seed.created,
    currency: seed.currency,
    customer_details: seed.customerEmail === null ? null : customerDetails(seed.customerEmail, null),
    customer_email: seed.customerEmail,
    expires_at: seed.expiresAt,
    locale: seed.locale,
    metadata: seed.metadata,
    allowed_payment_method_types: seed.allowedMethods.length === 0 ? null : seed.allowedMethods,
    payment_method_types: seed.allowedMethods.length === 0 ? ['card'] : seed.allowedMethods,
    payment_status: seed.amount === 0 ? 'no_payment_required' : 'unpaid',
    submit_type: seed.submitType,
    success_url: seed.successUrl,
    url: seed.url,
  } satisfies Stripe.Checkout.Session;
}

export function customerDetails(email: string, name: string | null): Stripe.Checkout.Session.CustomerDetails {
  return {
    address: null,
    business_name: null,
    email,
    individual_name: null,
    name,
    phone: null,
    tax_exempt: 'none',
    tax_ids: [],
  };
}

const PLAIN_BRANDING = {
  background_color: '#ffffff',
  border_style: 'rectangular',
  button_color: '#e7e7e7',
  font_family: 'default',
  icon: null,
  logo: null,
} satisfies Partial<Stripe.Checkout.Session.BrandingSettings>;

const EMPTY = {
  object: 'checkout.session',
  adaptive_pricing: { enabled: false },
  after_expiration: null,
  allow_promotion_codes: null,
  automatic_tax: { enabled: false, liability: null, provider: null, status: null },
  billing_address_collection: null,
  client_secret: null,
  collected_information: null,
  consent: null,
  consent_collection: null,
  currency_conversion: null,
  custom_fields: [],
  custom_text: { after_submit: null, shipping_address: null, submit: null, terms_of_service_acceptance: null },
  customer: null,
  customer_account: null,
  customer_creation: 'if_required',
  discounts: [],
  integration_identifier: null,
  invoice: null,
  invoice_creation: null,
  livemode: false,
  managed_payments: { enabled: false },
  mode: 'payment',
  origin_context: null,
  payment_intent: null,
  payment_link: null,
  payment_method_collection: 'if_required',
  payment_method_configuration_details: null,
  payment_method_options: {},
  permissions: null,
  phone_number_collection: { enabled: false },
  recovered_from: null,
  saved_payment_method_options: null,
  setup_intent: null,
  shipping_address_collection: null,
  shipping_cost: null,
  shipping_options: [],
  status: 'open',
  subscription: null,
  total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
  ui_mode: 'hosted_page',
  wallet_options: null,
} satisfies Partial<Stripe.Checkout.Session>;
