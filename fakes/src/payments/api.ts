import type { IncomingMessage, ServerResponse } from 'node:http';
import { addressOf, answerJson, headerOf, readBody } from '../http/exchange.js';
import { ApiError } from './api-error.js';
import { expand } from './expand.js';
import type { Fault, Faults } from './faults.js';
import { canonical, parseForm, type FormTree } from './form-body.js';
import { Idempotency, type Replay } from './idempotency.js';
import { identifier } from './identifier.js';
import { Parameters } from './parameters.js';
import { findRoute } from './routes.js';
import { API_VERSION } from './wire.js';
import type { World } from './world.js';

export type Answer = {
  readonly status: number;
  readonly body: unknown;
  /** Whether the answer is kept under the idempotency key. */
  readonly kept: boolean;
  readonly retry: boolean | null;
};

export type RequestNote = {
  readonly request: string;
  readonly method: string;
  readonly path: string;
  readonly idempotencyKey: string | null;
  readonly parameters: FormTree;
  readonly outcome: string;
};

type Asked = {
  readonly request: string;
  readonly method: string;
  readonly path: string;
  readonly tree: FormTree;
  readonly key: string | null;
};

export type ApiOptions = {
  readonly apiKey: string | undefined;
  readonly faults: Faults;
  readonly note: (note: RequestNote) => void;
  readonly changed: () => void;
};

const MESSAGE_OF_500 = 'An unknown error occurred';

/** The HTTP API below /v1. */
export class Api {
  readonly #keys: Idempotency;

  constructor(
    private readonly world: World,
    private readonly options: ApiOptions,
  ) {
    this.#keys = new Idempotency(world);
  }

  async answer(request: IncomingMessage, response: ServerResponse): Promise<void> {
    const id = identifier('req_', 14);
    const url = addressOf(request);
    const method = request.method ?? 'GET';
    try {
      this.checkKey(request);
      const body = await readBody(request);
      const tree = parseForm(method === 'GET' || method === 'DELETE' ? url.search.slice(1) : body);
      const key = method === 'POST' ? (headerOf(request, 'idempotency-key') ?? null) : null;
      const asked: Asked = { request: id, method, path: url.pathname, tree, key };
      await this.strike(asked, response);
    } catch (fault) {
      if (!(fault instanceof ApiError)) throw fault;
      send(response, { request: id, key: null }, { status: fault.status, body: fault.body, kept: false, retry: null });
    } finally {
      this.options.changed();
    }
  }

  private checkKey(request: IncomingMessage): void {
    const header = headerOf(request, 'authorization') ?? '';
    const bearer = /^Bearer\s+(\S+)$/i.exec(header)?.[1];
    const basic = /^Basic\s+(\S+)$/i.exec(header)?.[1];
    const key = bearer ?? (basic && Buffer.from(basic, 'base64').toString('utf8').split(':')[0]);
    if (!key) {
      throw new ApiError(401, 'invalid_request_error', 'You did not provide an API key in the Authorization header.');
    }
    const { apiKey } = this.options;
    if (apiKey === undefined ? /^(sk|rk)_test_./.test(key) : key === apiKey) return;
    throw new ApiError(401, 'invalid_request_error', `Invalid API Key provided: ${key.slice(0, 8)}****`);
  }

  /** Applies the fault that was ordered for this request, if any; a kept answer is replayed through it all the same. */
  private async strike(asked: Asked, response: ServerResponse): Promise<void> {
    const replay = this.#keys.replay(asked.key, endpointOf(asked), canonical(asked.tree));
    const fault = this.options.faults.take(asked.method, asked.path);
    const release = this.#keys.begin(asked.key);
    // A request that hangs holds its key until its caller goes away.
    response.once('close', release);
    if (fault?.kind === 'delay') await new Promise((resolve) => setTimeout(resolve, fault.milliseconds));
    if (fault && fault.kind !== 'delay') {
      this.note(asked, `${fault.kind} ${fault.processed ? 'after' : 'before'} processing`);
      this.spoil(asked, fault, replay, response);
    } else {
      const answer = replay?.answer ?? this.execute(asked);
      this.note(asked, replay ? `${answer.status} replayed` : String(answer.status));
      send(response, asked, answer, replay?.request);
    }
    if (response.writableEnded) release();
  }

  private note(asked: Asked, outcome: string): void {
    const { request, method, path, key, tree } = asked;
    this.options.note({ request, method, path, idempotencyKey: key, parameters: tree, outcome });
  }

  private spoil(asked: Asked, fault: Fault, replay: Replay | undefined, response: ServerResponse): void {
    if (fault.processed && !replay) this.execute(asked);
    if (fault.kind === 'hang') return;
    if (fault.kind === 'reset') {
      response.socket?.resetAndDestroy();
      return;
    }
    if (fault.kind === 'garbage') {
      response.writeHead(200, { 'content-type': 'text/html', 'request-id': asked.request });
      response.end('<html><body>Not the answer you expected</body></html>');
      return;
    }
    const answer = failure(fault);
    if (fault.stored && !replay) this.keep(asked, answer);
    send(response, asked, answer);
  }

  private execute(asked: Asked): Answer {
    const answer = this.run(asked);
    if (answer.kept) this.keep(asked, answer);
    return answer;
  }

  private keep(asked: Asked, answer: Answer): void {
    this.#keys.keep(asked.key, endpointOf(asked), canonical(asked.tree), answer, asked.request);
  }

  private run({ request, method, path, tree, key }: Asked): Answer {
    try {
      const found = path.startsWith('/v1/') ? findRoute(method, path.slice(3)) : undefined;
      if (!found) {
        throw new ApiError(404, 'invalid_request_error', `Unrecognized request URL (${method}: ${path}).`);
      }
      const given = new Parameters(tree);
      const paths = given.texts('expand');
      const cause = { request, idempotencyKey: key };
      const answer = found.route.run(this.world, { id: found.id, given, cause, path });
      return { status: 200, body: expand(this.world.state, answer, paths), kept: true, retry: null };
    } catch (fault) {
      if (!(fault instanceof ApiError)) throw fault;
      return { status: fault.status, body: fault.body, kept: fault.started, retry: null };
    }
  }
}

function endpointOf({ method, path }: Asked): string {
  return `${method} ${path}`;
}

function failure({ status, code, message, retry }: Fault): Answer {
  const type = status >= 500 ? 'api_error' : status === 402 ? 'card_error' : 'invalid_request_error';
  const known = code ?? (status === 429 ? 'rate_limit' : null);
  const error = {
    type,
    message: message === '' ? MESSAGE_OF_500 : message,
    ...(known === null ? {} : { code: known }),
  };
  return { status, body: { error }, kept: false, retry };
}

function send(
  response: ServerResponse,
  { request, key }: Pick<Asked, 'request' | 'key'>,
  answer: Answer,
  original?: string,
): void {
  answerJson(response, answer.status, answer.body, {
    'request-id': request,
    'stripe-version': API_VERSION,
    ...(key === null ? {} : { 'idempotency-key': key }),
    ...(original === undefined ? {} : { 'idempotent-replayed': 'true', 'original-request': original }),
    ...(answer.retry === null ? {} : { 'stripe-should-retry': String(answer.retry) }),
  });
}
