import { hasExpired, parseExpiry, passesLuhn } from './cards.js';

export type CardForm = {
  readonly number: string;
  readonly expiry: string;
  readonly code: string;
  readonly holder: string;
  readonly email: string;
};

export type CardFault = { readonly field: keyof CardForm; readonly sentence: string };

export type CheckedCard = {
  readonly number: string;
  readonly expMonth: number;
  readonly expYear: number;
  readonly holder: string;
  readonly email: string;
};

/** Reads what was typed; either the card or what is wrong with it, field by field. */
export function checkCard(
  form: CardForm,
  knownEmail: string | null,
  now: number,
): { readonly card: CheckedCard } | { readonly faults: readonly CardFault[] } {
  const number = form.number.replace(/[\s-]/g, '');
  const expiry = parseExpiry(form.expiry);
  const email = knownEmail ?? form.email.trim();
  const faults: CardFault[] = [];
  if (!passesLuhn(number)) faults.push({ field: 'number', sentence: 'This is no card number. Check its digits.' });
  if (!expiry) faults.push({ field: 'expiry', sentence: 'Write the expiry as month and year, such as 07/30.' });
  if (expiry && hasExpired(expiry.month, expiry.year, now)) {
    faults.push({ field: 'expiry', sentence: 'The card has expired. Use another card.' });
  }
  const codeLength = /^3[47]/.test(number) ? 4 : 3;
  if (!new RegExp(`^\\d{${codeLength}}$`).test(form.code.trim())) {
    faults.push({ field: 'code', sentence: `The security code has ${codeLength} digits.` });
  }
  if (form.holder.trim() === '') faults.push({ field: 'holder', sentence: 'Write the name on the card.' });
  if (!isEmail(email)) faults.push({ field: 'email', sentence: 'Write an e-mail address for the receipt.' });
  if (faults.length > 0 || !expiry) return { faults };
  return { card: { number, expMonth: expiry.month, expYear: expiry.year, holder: form.holder.trim(), email } };
}

export function isEmail(text: string): boolean {
  return /^[^\s@]+@[^\s@]+$/.test(text) && text.length <= 512;
}
