/**
 * Every fault the product can name, with the HTTP status it answers.
 * One table, so that the server's filter and the client's sentences cannot drift apart; the compiler checks that both
 * cover each code.
 */
export const errorStatus = {
  /** The request's form is wrong: fields are missing, of the wrong type, or out of bounds. */
  invalid_input: 400,
  /** Nobody is signed in. */
  not_signed_in: 401,
  /** Address and password do not belong together, or the account is closed. */
  wrong_credentials: 401,
  /** The form's protection token is missing or of another session. */
  stale_form: 403,
  /** The role does not allow it. */
  not_allowed: 403,
  /** There is no such thing, or it is somebody else's. */
  not_found: 404,
  /** Somebody else changed it in between; both states are in the answer. */
  changed_meanwhile: 409,
  /** The thing is not in a state in which this can be done. */
  wrong_state: 409,
  /** Something of that name or code exists already. */
  already_exists: 409,
  /** There is not as much left as was asked for. */
  not_enough_stock: 409,
  /** A link or code that can be used once is used or out of date. */
  link_expired: 410,
  /** The body is larger than allowed. */
  too_large: 413,
  /** The body is not JSON, or not a kind of file this takes. */
  unsupported_media: 415,
  /** The request was understood, but a rule of the shop forbids it. */
  rule_broken: 422,
  /** The same key was used for another request. */
  key_reused: 422,
  /** Too many tries; wait. */
  too_many_tries: 429,
  /** Something that is ours went wrong. */
  unexpected: 500,
  /** A service that this needs does not answer just now. */
  service_unavailable: 503,
} as const;

export type ErrorCode = keyof typeof errorStatus;
