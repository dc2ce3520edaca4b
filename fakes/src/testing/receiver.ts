import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';

export type Received = { readonly body: string; readonly signature: string };

/** A web address that takes webhooks and answers as it is told. */
export class Receiver {
  readonly received: Received[] = [];
  /** Statuses of the next answers; afterwards 200. */
  answers: number[] = [];
  #server: Server | undefined;

  get url(): string {
    if (!this.#server) throw new Error('The receiver was not started.');
    return `http://127.0.0.1:${(this.#server.address() as AddressInfo).port}/webhooks`;
  }

  get types(): string[] {
    return this.received.map(({ body }) => (JSON.parse(body) as { type: string }).type);
  }

  async start(): Promise<this> {
    const server = createServer((request, response) => {
      const chunks: Buffer[] = [];
      request.on('data', (chunk: Buffer) => chunks.push(chunk));
      request.on('end', () => {
        const signature = String(request.headers['stripe-signature']);
        this.received.push({ body: Buffer.concat(chunks).toString('utf8'), signature });
        response.writeHead(this.answers.shift() ?? 200).end();
      });
    });
    this.#server = server;
    await new Promise<void>((resolve) => {
      server.listen(0, '127.0.0.1', resolve);
    });
    return this;
  }

  async stop(): Promise<void> {
    await new Promise((resolve) => this.#server?.close(resolve));
  }
}
