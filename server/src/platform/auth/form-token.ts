import { csrfSync } from 'csrf-sync';
import type { Request } from 'express';

/** The header in which the client sends back the token that it was given with the session. */
export const formTokenHeader = 'x-csrf-token';

const synchronised = csrfSync({ size: 32, getTokenFromRequest: (request) => request.get(formTokenHeader) });

/** The token of this session; making one stores something in the session, so that the visitor keeps the same one. */
export function formTokenOf(request: Request): string {
  return synchronised.generateToken(request);
}

export function isFormTokenValid(request: Request): boolean {
  return Boolean(request.session) && synchronised.isRequestValid(request);
}
