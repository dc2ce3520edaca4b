/**
 * Every route that anybody may call, with the reason. A route that is public and does not stand here fails the spec of
 * the routes; adding one is a decision to be read by somebody else.
 */
export const publicRoutes: Readonly<Record<string, string>> = {
  'GET /api/health': 'says that the process lives, and nothing else',
  'GET /api/health/ready': 'says whether requests are taken, and nothing else',
  'GET /api/session': 'who is signed in; gives visitors the token for their forms',
  'POST /api/session': 'signs in',
  'DELETE /api/session': 'signs out; for a visitor it changes nothing',
  'POST /api/sign-ups': 'asks for an account',
  'POST /api/sign-up-completions': 'needs the link of a mail',
  'POST /api/password-resets': 'asks for a mail to an address',
  'POST /api/password-reset-completions': 'needs the link of a mail',
  'POST /api/invitation-completions': 'needs the link of a mail',
  'POST /api/email-change-completions': 'needs the link of a mail',
  'POST /api/first-owner': 'needs the set-up code, and only while there is nobody yet',
  'GET /api/shop': 'who the shop is and where it delivers',
  'GET /api/shop/listings': 'what the shop offers',
  'GET /api/shop/listings/:slug': 'one thing the shop offers',
  'POST /api/shop/quotes': 'prices a basket, claims nothing',
  'POST /api/shop/orders': 'guests order too',
  'POST /api/payment-events': 'the payments service signs what it sends',
  'GET /api/shop/orders/:number': 'needs the token of the link, or to be signed in as its buyer',
  'POST /api/shop/orders/:number/payment-pages': 'as above',
  'GET /api/unit-pages/:token': 'needs the code on a unit’s label; names no person',
};
