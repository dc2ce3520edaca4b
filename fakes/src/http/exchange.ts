import type { IncomingMessage, ServerResponse } from 'node:http';

const BODY_LIMIT_BYTES = 10_000_000;

/** A refusal of a page or control call, answered with its status and sentence. */
export class Refusal extends Error {
  constructor(
    readonly status: number,
    message: string,
  ) {
    super(message);
  }
}

export async function readBody(request: IncomingMessage): Promise<string> {
  const chunks: Buffer[] = [];
  let size = 0;
  for await (const chunk of request) {
    const bytes = chunk as Buffer;
    size += bytes.length;
    if (size > BODY_LIMIT_BYTES) throw new Refusal(413, 'The body is larger than 10 MB.');
    chunks.push(bytes);
  }
  return Buffer.concat(chunks).toString('utf8');
}

export function addressOf(request: IncomingMessage): URL {
  return new URL(request.url ?? '/', 'http://127.0.0.1');
}

export function headerOf(request: IncomingMessage, name: string): string | undefined {
  const value = request.headers[name];
  return Array.isArray(value) ? value[0] : value;
}

export function answerJson(
  response: ServerResponse,
  status: number,
  body: unknown,
  headers: Readonly<Record<string, string>> = {},
): void {
  response.writeHead(status, { 'content-type': 'application/json', 'cache-control': 'no-store', ...headers });
  response.end(JSON.stringify(body, null, 2));
}

export function answerPage(response: ServerResponse, status: number, html: string, policy = PAGE_POLICY): void {
  response.writeHead(status, {
    'content-type': 'text/html; charset=utf-8',
    'cache-control': 'no-store',
    'content-security-policy': policy,
    'x-content-type-options': 'nosniff',
    'referrer-policy': 'no-referrer',
  });
  response.end(html);
}

export function redirect(response: ServerResponse, location: string): void {
  response.writeHead(303, { location, 'cache-control': 'no-store' });
  response.end();
}

// No form-action here: browsers apply it to the redirect after a form as well, and the shop has another origin.
const PAGE_POLICY = "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; base-uri 'none'";
