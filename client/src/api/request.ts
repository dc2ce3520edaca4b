import { apiUrl, type Query } from '../lib/api-url';
import { send } from './send';

export interface RequestOptions {
  query?: Query;
  body?: unknown;
  /** Of a creating call, so that sending it twice makes one thing. */
  idempotencyKey?: string;
  signal?: AbortSignal;
}

/**
 * Calls the server and reads its JSON answer.
 * @param method of HTTP
 * @param path begins with `/api/`
 * @throws ApiProblem
 */
export async function request<Answer>(method: string, path: string, options: RequestOptions = {}): Promise<Answer> {
  const response = await send(
    new Request(new URL(apiUrl(path, options.query), location.origin), {
      method,
      headers: headersOf(options),
      body: bodyOf(options.body),
      signal: options.signal,
    }),
  );
  if (response.status === 204 || response.headers.get('content-length') === '0') return undefined as Answer;
  return (await response.json()) as Answer;
}

function headersOf({ body, idempotencyKey }: RequestOptions): Headers {
  const headers = new Headers({ accept: 'application/json, application/problem+json' });
  if (body !== undefined && !(body instanceof FormData)) headers.set('content-type', 'application/json');
  if (idempotencyKey) headers.set('idempotency-key', idempotencyKey);
  return headers;
}

function bodyOf(body: unknown): BodyInit | undefined {
  if (body === undefined) return undefined;
  return body instanceof FormData ? body : JSON.stringify(body);
}
