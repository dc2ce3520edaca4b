import createClient from 'openapi-fetch';
import type { components, paths } from './schema';
import { send } from './send';

/** A shape that the server takes or gives, by the name it has there. */
export type Dto<Name extends keyof components['schemas']> = components['schemas'][Name];

/**
 * The server's routes with their types: `await answer(api.GET('/api/profile', { signal }))`.
 * A creating call sends a key with it: `params: { header: { 'Idempotency-Key': key } }`.
 */
export const api = createClient<paths>({ baseUrl: location.origin, fetch: send });

/**
 * What a call gave.
 * @throws ApiProblem if it was refused, or nothing answered
 */
export async function answer<Given>(call: Promise<{ data?: Given }>): Promise<Given> {
  const { data } = await call;
  // A refusal has been thrown by now; what is left without data is an answer that has none.
  return data as Given;
}
