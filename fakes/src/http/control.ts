import type { IncomingMessage, ServerResponse } from 'node:http';
import { addressOf, answerJson, headerOf, readBody, Refusal } from './exchange.js';

export type ControlCall = {
  readonly parameters: readonly string[];
  readonly query: URLSearchParams;
  readonly body: Readonly<Record<string, unknown>>;
};

export type ControlRoute = {
  readonly method: 'GET' | 'POST' | 'DELETE';
  /** Path with `:name` for a variable segment. */
  readonly path: string;
  readonly does: string;
  readonly run: (call: ControlCall) => unknown;
};

/** Answers the routes that make a stand-in misbehave; only for callers on this machine, never for a web page elsewhere. */
export async function answerControl(
  routes: readonly ControlRoute[],
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  try {
    refuseOutsiders(request);
    const url = addressOf(request);
    if (url.pathname === '/control' && request.method === 'GET') {
      answerJson(
        response,
        200,
        routes.map(({ method, path, does }) => ({ call: `${method} ${path}`, does })),
      );
      return;
    }
    const found = match(routes, request.method ?? 'GET', url.pathname);
    if (!found) throw new Refusal(404, 'There is no such control. GET /control lists them.');
    const body = parseBody(await readBody(request));
    const answer = await found.route.run({ parameters: found.parameters, query: url.searchParams, body });
    answerJson(response, 200, answer ?? { done: true });
  } catch (fault) {
    if (!(fault instanceof Refusal)) throw fault;
    answerJson(response, fault.status, { fault: fault.message });
  }
}

function refuseOutsiders(request: IncomingMessage): void {
  const remote = request.socket.remoteAddress ?? '';
  const loopback = remote.startsWith('127.') || remote === '::1' || remote.startsWith('::ffff:127.');
  if (!loopback) throw new Refusal(403, 'The controls answer to this machine only.');
  const origin = headerOf(request, 'origin');
  if (origin && origin !== `http://${request.headers.host ?? ''}`) {
    throw new Refusal(403, 'The controls do not answer to pages of another origin.');
  }
  const host = (request.headers.host ?? '').replace(/:\d+$/, '');
  if (!['127.0.0.1', 'localhost', '[::1]'].includes(host)) {
    throw new Refusal(403, 'The controls answer to loopback addresses only.');
  }
}

function match(routes: readonly ControlRoute[], method: string, pathname: string) {
  const actual = pathname.split('/');
  for (const route of routes) {
    if (route.method !== method) continue;
    const wanted = route.path.split('/');
    if (wanted.length !== actual.length) continue;
    if (!wanted.every((part, index) => part.startsWith(':') || part === actual[index])) continue;
    const parameters = actual.filter((_, index) => wanted[index]?.startsWith(':')).map(decodeURIComponent);
    return { route, parameters };
  }
  return undefined;
}

function parseBody(text: string): Record<string, unknown> {
  if (text === '') return {};
  try {
    const body: unknown = JSON.parse(text);
    if (typeof body === 'object' && body !== null && !Array.isArray(body)) return body as Record<string, unknown>;
  } catch {
    throw new Refusal(400, 'The body is not JSON.');
  }
  throw new Refusal(400, 'The body is not a JSON object.');
}

export function wholeNumber(body: Readonly<Record<string, unknown>>, name: string, otherwise: number): number {
  const value = body[name] ?? otherwise;
  if (typeof value !== 'number' || !Number.isSafeInteger(value)) {
    throw new Refusal(400, `"${name}" must be a whole number.`);
  }
  return value;
}

export function optionalText(body: Readonly<Record<string, unknown>>, name: string): string | undefined {
  const value = body[name];
  if (value === undefined || value === null) return undefined;
  if (typeof value !== 'string') throw new Refusal(400, `"${name}" must be text.`);
  return value;
}

export function flag(body: Readonly<Record<string, unknown>>, name: string, otherwise: boolean): boolean {
  const value = body[name] ?? otherwise;
  if (typeof value !== 'boolean') throw new Refusal(400, `"${name}" must be true or false.`);
  return value;
}

export function oneOf<const T extends string>(
  body: Readonly<Record<string, unknown>>,
  name: string,
  choices: readonly T[],
  otherwise: T,
): T {
  const value = body[name] ?? otherwise;
  const found = choices.find((choice) => choice === value);
  if (!found) throw new Refusal(400, `"${name}" must be one of ${choices.join(', ')}.`);
  return found;
}

export function requireFound<T>(thing: T | undefined, sentence: string): T {
  if (thing === undefined) throw new Refusal(404, sentence);
  return thing;
}

/** Calls a control of a stand-in at an address; throws what it refuses. */
export async function callControl(address: string, method: string, path: string, body?: object): Promise<unknown> {
  const response = await fetch(address + path, {
    method,
    headers: { 'content-type': 'application/json', connection: 'close' },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
  });
  const answer: unknown = await response.json();
  if (!response.ok) throw new Error(`${method} ${path} answered ${response.status}: ${JSON.stringify(answer)}`);
  return answer;
}
