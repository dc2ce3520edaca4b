import Stripe from 'stripe';
import type { PaymentsState } from './state.js';
import { postBody } from './webhook-post.js';
import type { WireEvent } from './wire.js';

export type WebhookEndpoint = {
  readonly url: string;
  /** One secret, or two while it is being changed: both sign. */
  readonly secrets: readonly string[];
  /** Types it listens to; empty means all. */
  readonly events: readonly string[];
};

export type WebhookConduct = {
  /** How often each event is sent. */
  readonly repeat: number;
  /** How many of the next events are lost. */
  readonly drop: number;
  /** Events of this many milliseconds are gathered and sent last one first; 0 sends in order. */
  readonly reorderWithin: number;
  /** By how many seconds the instant of the signature lies back. */
  readonly age: number;
  /** How long an event waits before it is sent. */
  readonly delay: number;
};

export type Attempt = {
  readonly event: string;
  readonly type: string;
  readonly url: string;
  readonly attempt: number;
  readonly outcome: string;
};

type Delivery = { readonly event: string; readonly url: string; readonly attempt: number };

export type ReleaseOrder = 'as-they-came' | 'last-first' | readonly string[];

const ORDERLY: WebhookConduct = { repeat: 1, drop: 0, reorderWithin: 0, age: 0, delay: 0 };
const LIMIT_MILLISECONDS = 10_000;
const LOG_LENGTH = 2000;

/** Sends events, signed, in order, one after another to each endpoint; what is refused is tried again before the next. */
export class Webhooks {
  #endpoints: readonly WebhookEndpoint[];
  #conduct = ORDERLY;
  #queue: readonly Delivery[] = [];
  #gathered: readonly Delivery[] = [];
  #held = false;
  #attempts: readonly Attempt[] = [];
  readonly #running = new Map<string, Promise<void>>();
  readonly #stop = new AbortController();
  readonly #signer = new Stripe('sk_test_signer').webhooks;

  constructor(
    private readonly state: PaymentsState,
    endpoints: readonly WebhookEndpoint[],
    private readonly retryDelays: readonly number[],
    private readonly now: () => number,
    private readonly changed: () => void,
  ) {
    this.#endpoints = endpoints;
  }

  listeners(type: string): number {
    return this.#endpoints.filter((endpoint) => listens(endpoint, type)).length;
  }

  deliver(event: WireEvent): void {
    if (this.#conduct.drop > 0) {
      this.#conduct = { ...this.#conduct, drop: this.#conduct.drop - 1 };
      this.note({ event: event.id, url: '', attempt: 0 }, 'dropped');
      return;
    }
    const fresh = this.#endpoints
      .filter((endpoint) => listens(endpoint, event.type))
      .flatMap(({ url }) => Array.from({ length: this.#conduct.repeat }, () => ({ event: event.id, url, attempt: 1 })));
    if (this.#conduct.reorderWithin > 0) this.gather(fresh);
    else this.enqueue(fresh);
  }

  setEndpoints(endpoints: readonly WebhookEndpoint[]): void {
    this.#endpoints = endpoints;
  }

  setConduct(conduct: Partial<WebhookConduct>): WebhookConduct {
    this.#conduct = { ...this.#conduct, ...conduct };
    return this.#conduct;
  }

  hold(): void {
    this.#held = true;
  }

  release(order: ReleaseOrder): void {
    this.#held = false;
    if (order === 'last-first') this.#queue = this.#queue.toReversed();
    else if (order !== 'as-they-came') {
      const place = (delivery: Delivery) => {
        const index = order.indexOf(delivery.event);
        return index < 0 ? order.length : index;
      };
      this.#queue = this.#queue.toSorted((one, other) => place(one) - place(other));
    }
    this.enqueue([]);
  }

  /** Sends an event again, as if it had not been sent. */
  resend(event: WireEvent, times: number): void {
    const urls = this.#endpoints.filter((endpoint) => listens(endpoint, event.type)).map(({ url }) => url);
    this.enqueue(
      Array.from({ length: times }).flatMap(() => urls.map((url) => ({ event: event.id, url, attempt: 1 }))),
    );
  }

  attempts(): readonly Attempt[] {
    return this.#attempts;
  }

  waiting(): readonly Delivery[] {
    return [...this.#queue, ...this.#gathered];
  }

  describe() {
    const endpoints = this.#endpoints.map(({ url, events }) => ({ url, events }));
    return { endpoints, conduct: this.#conduct, held: this.#held, waiting: this.waiting() };
  }

  /** Resolves when nothing waits to be sent, unless it is held. */
  async settled(): Promise<void> {
    while (this.#running.size > 0 || this.#gathered.length > 0) {
      await Promise.race(this.#running.size > 0 ? this.#running.values() : [pause(10, this.#stop.signal)]);
    }
  }

  resume(waiting: readonly Delivery[]): void {
    const known = waiting.filter((one) => this.#endpoints.some(({ url }) => url === one.url));
    this.enqueue(known.filter((one) => this.state.events.find(one.event)).map((one) => ({ ...one, attempt: 1 })));
  }

  reset(): void {
    this.#queue = [];
    this.#gathered = [];
    this.#attempts = [];
    this.#held = false;
    this.#conduct = ORDERLY;
  }

  async close(): Promise<void> {
    this.#stop.abort();
    await Promise.all(this.#running.values());
  }

  private gather(deliveries: readonly Delivery[]): void {
    const first = this.#gathered.length === 0;
    this.#gathered = [...this.#gathered, ...deliveries];
    if (!first || deliveries.length === 0) return;
    void pause(this.#conduct.reorderWithin, this.#stop.signal).then(() => {
      const gathered = this.#gathered.toReversed();
      this.#gathered = [];
      this.enqueue(gathered);
    });
  }

  private enqueue(deliveries: readonly Delivery[]): void {
    this.#queue = [...this.#queue, ...deliveries];
    for (const { url } of this.#queue) {
      if (this.#running.has(url)) continue;
      this.#running.set(
        url,
        this.work(url).finally(() => this.ended(url)),
      );
    }
  }

  private ended(url: string): void {
    this.#running.delete(url);
    // Something may have come between the last look at the queue and here.
    if (!this.#held && !this.#stop.signal.aborted && this.#queue.some((one) => one.url === url)) this.enqueue([]);
  }

  private async work(url: string): Promise<void> {
    // The answer that caused the event goes out first, as it does with a service far away.
    await pause(this.#conduct.delay, this.#stop.signal);
    while (!this.#held && !this.#stop.signal.aborted) {
      const next = this.#queue.find((delivery) => delivery.url === url);
      if (!next) return;
      const sent = await this.send(next);
      if (this.#stop.signal.aborted || !this.#queue.includes(next)) continue;
      const wait = sent ? undefined : this.retryDelays[next.attempt - 1];
      const again = { ...next, attempt: next.attempt + 1 };
      this.#queue = this.#queue.flatMap((one) => (one === next ? (wait === undefined ? [] : [again]) : [one]));
      this.changed();
      if (wait !== undefined) await pause(wait, this.#stop.signal);
    }
  }

  private async send(delivery: Delivery): Promise<boolean> {
    const endpoint = this.#endpoints.find(({ url }) => url === delivery.url);
    const event = this.state.events.find(delivery.event);
    if (!endpoint || !event) return true;
    const payload = JSON.stringify(event, null, 2);
    const headers = {
      'content-type': 'application/json; charset=utf-8',
      'stripe-signature': this.sign(payload, endpoint.secrets),
      'user-agent': 'payments stand-in',
    };
    const result = await postBody(endpoint.url, payload, headers, LIMIT_MILLISECONDS, this.#stop.signal);
    const sent = 'status' in result && result.status >= 200 && result.status < 300;
    this.note(delivery, 'status' in result ? String(result.status) : result.fault);
    const pending = this.state.events.find(event.id)?.pending_webhooks ?? 0;
    if (sent && pending > 0) this.state.events.change(event.id, { pending_webhooks: pending - 1 });
    return sent;
  }

  /** The header of the SDK's own scheme: the instant, then a signature for each secret in force. */
  private sign(payload: string, secrets: readonly string[]): string {
    const timestamp = this.now() - this.#conduct.age;
    const signatures = secrets.map(
      (secret) => this.#signer.generateTestHeaderString({ payload, secret, timestamp }).split(',')[1] ?? '',
    );
    return [`t=${timestamp}`, ...signatures].join(',');
  }

  private note(delivery: Delivery, outcome: string): void {
    const type = this.state.events.find(delivery.event)?.type ?? '';
    const { event, url, attempt } = delivery;
    this.#attempts = [...this.#attempts, { event, type, url, attempt, outcome }].slice(-LOG_LENGTH);
  }
}

function listens({ events }: WebhookEndpoint, type: string): boolean {
  return events.length === 0 || events.includes('*') || events.includes(type);
}

function pause(milliseconds: number, signal: AbortSignal): Promise<void> {
  return new Promise((resolve) => {
    if (signal.aborted) {
      resolve();
      return;
    }
    const done = () => {
      clearTimeout(timer);
      signal.removeEventListener('abort', done);
      resolve();
    };
    const timer = setTimeout(done, milliseconds);
    signal.addEventListener('abort', done);
  });
}
