// Source of the numbers and of what each does: Stripe, "Test card numbers", docs.stripe.com/testing, sections
// "Cards by brand", "Declined payments" and "3D Secure authentication"; of the codes: docs.stripe.com/declines/codes.

export type Decline = { readonly code: string; readonly declineCode: string; readonly sentence: string };

export type CardConduct =
  | { readonly kind: 'pays'; readonly brand: string; readonly funding: string }
  | { readonly kind: 'asks'; readonly brand: string; readonly funding: string }
  | { readonly kind: 'declined'; readonly brand: string; readonly funding: string; readonly decline: Decline };

const pays = (brand: string, funding = 'credit'): CardConduct => ({ kind: 'pays', brand, funding });

const declined = (code: string, declineCode: string, sentence: string): CardConduct => ({
  kind: 'declined',
  brand: 'visa',
  funding: 'credit',
  decline: { code, declineCode, sentence },
});

const CONDUCT: Readonly<Record<string, CardConduct>> = {
  '4242424242424242': pays('visa'),
  '4000056655665556': pays('visa', 'debit'),
  '5555555555554444': pays('mastercard'),
  '5200828282828210': pays('mastercard', 'debit'),
  '378282246310005': pays('amex'),
  '4000002500003155': { kind: 'asks', brand: 'visa', funding: 'credit' },
  '4000000000000002': declined('card_declined', 'generic_decline', 'The card was declined. Try another card.'),
  '4000000000009995': declined(
    'card_declined',
    'insufficient_funds',
    'The card was declined: there is not enough money on it. Try another card.',
  ),
  '4000000000009987': declined(
    'card_declined',
    'lost_card',
    'The card was declined. Its bank must be asked why. Try another card.',
  ),
  '4000000000000069': declined('expired_card', 'expired_card', 'The card has expired. Try another card.'),
  '4000000000000127': declined(
    'incorrect_cvc',
    'incorrect_cvc',
    'The security code is not right. Check it on the card and try again.',
  ),
  '4000000000000119': declined(
    'processing_error',
    'processing_error',
    'Something went wrong while the card was being charged. Nothing was taken. Try again in a moment.',
  ),
};

// The real test mode declines what is not one of its numbers, and so no one's own card is ever taken here.
const NOT_A_TEST_CARD = declined(
  'card_declined',
  'test_mode_live_card',
  'This is a test page and takes test card numbers only. Do not type a real card here.',
);

export const REFUSED_CONFIRMATION: Decline = {
  code: 'payment_intent_authentication_failure',
  declineCode: 'authentication_required',
  sentence: 'The payment was not confirmed. Try again or use another card.',
};

export const FAILED_DEBIT: Decline = {
  code: 'payment_intent_payment_attempt_failed',
  declineCode: 'generic_decline',
  sentence: 'The bank did not pay.',
};

export function conductOf(number: string): CardConduct {
  return CONDUCT[number] ?? NOT_A_TEST_CARD;
}

/**
 * Check digit of ISO/IEC 7812-1:2017, Annex B (Luhn's formula).
 *
 * @param number digits only
 */
export function passesLuhn(number: string): boolean {
  if (!/^\d{12,19}$/.test(number)) return false;
  const sum = Array.from(number)
    .toReversed()
    .map(Number)
    .reduce((total, digit, place) => total + (place % 2 === 0 ? digit : digit > 4 ? digit * 2 - 9 : digit * 2), 0);
  return sum % 10 === 0;
}

/** A card is good to the end of its month. */
export function hasExpired(month: number, year: number, nowSeconds: number): boolean {
  return Date.UTC(year, month, 1) <= nowSeconds * 1000;
}

export function parseExpiry(text: string): { readonly month: number; readonly year: number } | undefined {
  const match = /^(\d{1,2})\s*\/?\s*(\d{2}|\d{4})$/.exec(text.trim());
  const month = Number(match?.[1]);
  const year = Number(match?.[2]);
  if (!match || month < 1 || month > 12) return undefined;
  return { month, year: year < 100 ? 2000 + year : year };
}
