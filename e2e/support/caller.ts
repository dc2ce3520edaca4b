import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { basename } from 'node:path';
import { type APIRequestContext, type APIResponse, request } from '@playwright/test';

/** Whoever calls the product's API: keeps the session's cookie, and sends the form token that came with it. */
export class Caller {
  #token = '';

  private constructor(readonly context: APIRequestContext) {}

  /** A visitor of their own. */
  static async open(url: string): Promise<Caller> {
    return Caller.over(await request.newContext({ baseURL: url }));
  }

  /** With the cookies of a browser's context: `Caller.over(page.request)` calls as the page's own person. */
  static async over(context: APIRequestContext): Promise<Caller> {
    const caller = new Caller(context);
    await caller.#rememberToken(await context.get('/api/session'));
    return caller;
  }

  async signIn(email: string, password: string): Promise<void> {
    await this.startSession('/api/session', { email, password });
  }

  /** A request whose answer is a new session: signing in, or finishing what a link began. */
  async startSession(path: string, body: object): Promise<void> {
    await this.#rememberToken(await this.post(path, body));
  }

  get(path: string): Promise<APIResponse> {
    return this.context.get(path);
  }

  post(path: string, body: object = {}): Promise<APIResponse> {
    return this.#change('POST', path, body);
  }

  put(path: string, body: object): Promise<APIResponse> {
    return this.#change('PUT', path, body);
  }

  patch(path: string, body: object): Promise<APIResponse> {
    return this.#change('PATCH', path, body);
  }

  delete(path: string): Promise<APIResponse> {
    return this.#change('DELETE', path);
  }

  /** A POST that makes something; the same key again makes nothing new. */
  create(path: string, body: object, key: string = randomUUID()): Promise<APIResponse> {
    return this.#change('POST', path, body, { 'idempotency-key': key });
  }

  /** A POST with a file, as a form sends it; with a key it makes something, and the same key again nothing new. */
  async upload(
    path: string,
    field: string,
    file: string,
    { fields = {}, key }: { fields?: Record<string, string>; key?: string } = {},
  ): Promise<APIResponse> {
    const content = { name: basename(file), mimeType: 'application/octet-stream', buffer: await readFile(file) };
    const headers = { ...this.#headers(), ...(key === undefined ? {} : { 'idempotency-key': key }) };
    return this.context.post(path, { headers, multipart: { ...fields, [field]: content } });
  }

  dispose(): Promise<void> {
    return this.context.dispose();
  }

  #headers(): Record<string, string> {
    return { 'x-csrf-token': this.#token };
  }

  /** As the product's own pages do: a form token that another page has outdated is read again once. */
  async #change(
    method: string,
    path: string,
    data?: object,
    headers: Record<string, string> = {},
  ): Promise<APIResponse> {
    const send = () => this.context.fetch(path, { method, data, headers: { ...this.#headers(), ...headers } });
    const answer = await send();
    if (answer.status() !== 403 || !(await answer.text()).includes('"stale_form"')) return answer;
    await this.#rememberToken(await this.context.get('/api/session'));
    return send();
  }

  async #rememberToken(answer: APIResponse): Promise<void> {
    const session = (await bodyOf(answer)) as { csrfToken: string };
    this.#token = session.csrfToken;
  }
}

/** The body of an accepted request; the error of a refused one shows the problem. */
export async function bodyOf(answer: APIResponse): Promise<unknown> {
  if (!answer.ok()) throw new Error(`${answer.url()} answered ${answer.status()}: ${await answer.text()}`);
  const text = await answer.text();
  return text === '' ? undefined : JSON.parse(text);
}
