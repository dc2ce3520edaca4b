import type { IncomingMessage, ServerResponse } from 'node:http';
import { answerControl, callControl } from './http/control.js';
import { addressOf, answerPage, Refusal } from './http/exchange.js';
import { listen } from './http/listener.js';
import { markup, page } from './http/page.js';
import { readState, stateFile } from './http/state-file.js';
import type { RequestNote } from './payments/api.js';
import { assemble, type Assembly } from './payments/assembly.js';
import { expireDue } from './payments/checkout-sessions.js';
import { answerPages } from './payments/pay-routes.js';
import { PaymentsState } from './payments/state.js';
import type { Attempt, WebhookEndpoint, Webhooks } from './payments/webhooks.js';
import type { World } from './payments/world.js';

export type PaymentsOptions = {
  /** 0 takes a free one. */
  readonly port?: number;
  /** The only key that is let in; without it any test key is. */
  readonly apiKey?: string;
  readonly shopName?: string;
  /** The address browsers reach the payment page at, if it is not the listener's own. */
  readonly publicAddress?: string;
  readonly webhooks?: readonly { readonly url: string; readonly secret: string; readonly events?: readonly string[] }[];
  /** Milliseconds before each further attempt of a webhook; after the last the event is given up. */
  readonly retryDelays?: readonly number[];
  /** File in which everything survives a restart. */
  readonly stateFile?: string;
  /** The instant, in milliseconds since 1970. */
  readonly now?: () => number;
};

export type PaymentsFake = {
  readonly port: number;
  readonly address: string;
  setWebhooks(endpoints: readonly WebhookEndpoint[]): void;
  /** Resolves when every webhook was sent or given up (held ones stay). */
  webhooksSettled(): Promise<void>;
  webhookAttempts(): readonly Attempt[];
  requests(): readonly RequestNote[];
  /** Calls a control: `control('POST', '/control/reset')`. Throws on a refusal. */
  control(method: 'GET' | 'POST' | 'DELETE', path: string, body?: object): Promise<unknown>;
  close(): Promise<void>;
};

const EXPIRY_CHECK_MILLISECONDS = 1000;

/** Starts a stand-in for the payment processor: its HTTP API, its hosted page, its webhooks, and controls to misbehave. */
export async function startPayments(options: PaymentsOptions = {}): Promise<PaymentsFake> {
  const state = new PaymentsState();
  const saved = (await readState(options.stateFile)) as Record<string, unknown> | undefined;
  if (saved) state.load(saved);
  const file = stateFile(options.stateFile, () => ({ ...state.save(), waiting: parts.webhooks.waiting() }));
  const parts = assemble(
    options,
    state,
    () => listener.address,
    () => file.changed(),
  );
  const { world, webhooks } = parts;
  const listener = await listen(options.port ?? 0, async (request, response) => {
    expireDue(world);
    await answer(parts, request, response);
    file.changed();
  });
  webhooks.resume((saved?.['waiting'] ?? []) as ReturnType<Webhooks['waiting']>);
  const clock = setInterval(() => expireDue(world), EXPIRY_CHECK_MILLISECONDS);
  clock.unref();
  return {
    port: listener.port,
    address: listener.address,
    setWebhooks: (replaced) => webhooks.setEndpoints(replaced),
    webhooksSettled: () => webhooks.settled(),
    webhookAttempts: () => webhooks.attempts(),
    requests: () => parts.requests(),
    control: (method, path, body) => callControl(listener.address, method, path, body),
    close: async () => {
      clearInterval(clock);
      await listener.close();
      await webhooks.close();
      await file.close();
    },
  };
}

async function answer(parts: Assembly, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const { pathname } = addressOf(request);
  if (pathname.startsWith('/v1/')) return parts.api.answer(request, response);
  if (pathname === '/control' || pathname.startsWith('/control/')) {
    return answerControl(parts.controls, request, response);
  }
  return showPages(parts.world, request, response);
}

async function showPages(world: World, request: IncomingMessage, response: ServerResponse): Promise<void> {
  try {
    await answerPages(world, request, response);
  } catch (fault) {
    if (!(fault instanceof Refusal)) throw fault;
    answerPage(response, fault.status, page('Refused', '', markup`<h1>Refused</h1><p>${fault.message}</p>`));
  }
}
