import type { ConstraintTable } from '../platform/errors/constraints.js';

const country = {
  code: 'invalid_input',
  sentence: 'There is no country of these letters.',
  pointer: '/countryCode',
} as const;

export const settingsConstraints: ConstraintTable = {
  shop_country_code_fkey: country,
  shop_closed_day_pkey: {
    code: 'already_exists',
    sentence: 'The shop is closed on this day already.',
    pointer: '/day',
  },
  vat_rate_country_code_fkey: country,
  vat_exception_country_code_fkey: country,
  vat_exception_pkey: {
    code: 'already_exists',
    sentence: 'There is an exception for these postcodes already. Remove it first.',
    pointer: '/postcodePrefix',
  },
  delivery_rate_country_code_fkey: country,
  delivery_rate_starts_once: {
    code: 'already_exists',
    sentence: 'There is a price for this country from this day on already. Remove it first.',
    pointer: '/validFrom',
  },
};
