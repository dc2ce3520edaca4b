import type { AttemptLimit } from '../platform/limits/attempt-limits.js';

/**
 * How often people may try. A limit per account stops guessing at one password, a limit per network address stops
 * guessing at many accounts. Nobody can lock another person out for good: from a place they signed in from before people
 * have a count of their own, every window ends by itself, and a new password by mail clears the account's count.
 */
export const peopleLimits = {
  signInFromAddress: { name: 'sign_in.address', attempts: 60, minutes: 15 },
  signInToAccount: { name: 'sign_in.account', attempts: 10, minutes: 15 },
  signInFromKnownAddress: { name: 'sign_in.known_address', attempts: 10, minutes: 15 },
  signUpFromAddress: { name: 'sign_up.address', attempts: 20, minutes: 60 },
  mailToAccount: { name: 'account_mail.account', attempts: 5, minutes: 60 },
  resetFromAddress: { name: 'password_reset.address', attempts: 20, minutes: 60 },
  linkFromAddress: { name: 'link.address', attempts: 30, minutes: 15 },
  passwordOfAccount: { name: 'password.account', attempts: 10, minutes: 15 },
  setupCodeFromAddress: { name: 'setup_code.address', attempts: 10, minutes: 15 },
} as const satisfies Record<string, AttemptLimit>;
