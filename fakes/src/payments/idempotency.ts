import { ApiError } from './api-error.js';
import type { World } from './world.js';

type Kept = { readonly status: number; readonly body: unknown; readonly retry: boolean | null };

export type Replay = {
  readonly answer: Kept & { readonly kept: boolean };
  readonly request: string;
};

const LONGEST_KEY = 255;
const SECONDS_KEPT = 24 * 3600;

/**
 * Idempotency keys by the published rules (docs.stripe.com/api/idempotent_requests): the first answer is kept with its
 * status and replayed, errors of a started request and 500s as well; other parameters are an error; a request that
 * failed its checks keeps nothing; keys end after 24 hours.
 */
export class Idempotency {
  readonly #running = new Set<string>();

  constructor(private readonly world: World) {}

  /** The kept answer for a key, or undefined if the request is to be run. */
  replay(key: string | null, endpoint: string, parameters: string): Replay | undefined {
    if (key === null) return undefined;
    if (key.length > LONGEST_KEY || key === '') {
      throw new ApiError(400, 'invalid_request_error', `Idempotency keys have 1 to ${LONGEST_KEY} characters.`);
    }
    if (this.#running.has(key)) {
      throw new ApiError(409, 'idempotency_error', `Another request with the key '${key}' is still in progress.`, {
        code: 'idempotency_key_in_use',
      });
    }
    const kept = this.world.state.answers.find(key);
    if (!kept || kept.created + SECONDS_KEPT < this.world.now()) return undefined;
    if (kept.endpoint !== endpoint || kept.parameters !== parameters) {
      const what = kept.endpoint === endpoint ? 'with the same parameters' : `for the same endpoint (${kept.endpoint})`;
      throw new ApiError(
        400,
        'idempotency_error',
        `Keys for idempotent requests can only be used ${what} they were first used with. Try using a key other than '${key}' if you meant to execute a different request.`,
      );
    }
    const { status, body, retry, request } = kept;
    return { answer: { status, body, retry, kept: true }, request };
  }

  /** Marks a key as being worked on; the answer ends it. */
  begin(key: string | null): () => void {
    if (key === null) return () => undefined;
    this.#running.add(key);
    return () => this.#running.delete(key);
  }

  keep(key: string | null, endpoint: string, parameters: string, answer: Kept, request: string): void {
    if (key === null) return;
    const { status, body, retry } = answer;
    const kept = {
      id: key,
      endpoint,
      parameters,
      status,
      body: structuredClone(body),
      retry,
      request,
      created: this.world.now(),
    };
    const { answers } = this.world.state;
    if (answers.find(key)) answers.change(key, kept);
    else answers.add(kept);
  }
}
