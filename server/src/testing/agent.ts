import { randomUUID } from 'node:crypto';
import supertest, { type Test } from 'supertest';

/** A browser: keeps its cookies, and sends the form token that the session was given. */
export class Agent {
  readonly #http: ReturnType<typeof supertest.agent>;
  #token = '';

  private constructor(url: string) {
    this.#http = supertest.agent(url);
  }

  /** Opens the product as a visitor does. */
  static async open(url: string): Promise<Agent> {
    const agent = new Agent(url);
    await agent.refresh();
    return agent;
  }

  /** Reads the session and its token again. */
  async refresh(): Promise<void> {
    const { body } = await this.#http.get('/api/session').expect(200);
    this.#token = (body as { csrfToken: string }).csrfToken;
  }

  async signIn(email: string, password: string): Promise<void> {
    const { body } = await this.post('/api/session', { email, password }).expect(200);
    this.#token = (body as { csrfToken: string }).csrfToken;
  }

  get token(): string {
    return this.#token;
  }

  get(path: string): Test {
    return this.#http.get(path);
  }

  post(path: string, body?: object): Test {
    return this.#change(this.#http.post(path), body);
  }

  /** A POST that makes something; a key of its own unless one is given. */
  create(path: string, body: object, key: string = randomUUID()): Test {
    return this.post(path, body).set('Idempotency-Key', key);
  }

  put(path: string, body?: object): Test {
    return this.#change(this.#http.put(path), body);
  }

  patch(path: string, body?: object): Test {
    return this.#change(this.#http.patch(path), body);
  }

  delete(path: string, body?: object): Test {
    return this.#change(this.#http.delete(path), body);
  }

  /** A POST with a file, as a form sends it. */
  upload(path: string, field: string, content: Buffer, fileName: string): Test {
    return this.#http.post(path).set('x-csrf-token', this.#token).attach(field, content, fileName);
  }

  #change(test: Test, body: object | undefined): Test {
    const withToken = test.set('x-csrf-token', this.#token);
    return body === undefined ? withToken : withToken.send(body);
  }
}
