import {
  flag,
  oneOf,
  optionalText,
  requireFound,
  wholeNumber,
  type ControlCall,
  type ControlRoute,
} from '../http/control.js';
import { Refusal } from '../http/exchange.js';
import type { RequestNote } from './api.js';
import type { Faults } from './faults.js';
import type { PaymentsState } from './state.js';
import type { ReleaseOrder, WebhookEndpoint, Webhooks } from './webhooks.js';

export type Traffic = {
  readonly state: PaymentsState;
  readonly faults: Faults;
  readonly webhooks: Webhooks;
  readonly requests: () => readonly RequestNote[];
  readonly reset: () => void;
};

/** Controls of the calls that come in, the webhooks that go out, and of the whole. */
export function trafficControls({ state, faults, webhooks, requests, reset }: Traffic): readonly ControlRoute[] {
  return [
    ...faultControls(faults),
    ...webhookControls(state, webhooks),
    {
      method: 'GET',
      path: '/control/requests',
      does: 'Lists the API requests that came in.',
      run: () => requests(),
    },
    { method: 'GET', path: '/control/state', does: 'Shows everything that is kept.', run: () => state.save() },
    { method: 'POST', path: '/control/reset', does: 'Forgets everything and behaves well again.', run: () => reset() },
  ];
}

function faultControls(faults: Faults): readonly ControlRoute[] {
  return [
    {
      method: 'POST',
      path: '/control/faults',
      does:
        'Spoils the next requests: kind fail, hang, reset, delay or garbage; count; method; path (its start); processed; ' +
        'for fail status, code, message, stored, retry; for delay milliseconds.',
      run: ({ body }) => (addFault(faults, body), faults.list()),
    },
    { method: 'GET', path: '/control/faults', does: 'Lists the faults to come.', run: () => faults.list() },
    { method: 'DELETE', path: '/control/faults', does: 'Forgets the faults to come.', run: () => faults.reset() },
  ];
}

function webhookControls(state: PaymentsState, webhooks: Webhooks): readonly ControlRoute[] {
  return [
    {
      method: 'POST',
      path: '/control/webhooks/conduct',
      does: 'Sets repeat (times each), drop (the next so many), reorder_within and delay (milliseconds), age of the signature (seconds).',
      run: ({ body }) => {
        const { conduct } = webhooks.describe();
        return webhooks.setConduct({
          repeat: wholeNumber(body, 'repeat', conduct.repeat),
          drop: wholeNumber(body, 'drop', conduct.drop),
          reorderWithin: wholeNumber(body, 'reorder_within', conduct.reorderWithin),
          age: wholeNumber(body, 'age', conduct.age),
          delay: wholeNumber(body, 'delay', conduct.delay),
        });
      },
    },
    { method: 'POST', path: '/control/webhooks/hold', does: 'Holds the webhooks back.', run: () => webhooks.hold() },
    {
      method: 'POST',
      path: '/control/webhooks/release',
      does: 'Sends what was held: order as-they-came, last-first, or events (a list of ids, sent first in that order).',
      run: ({ body }) => webhooks.release(readOrder(body)),
    },
    {
      method: 'POST',
      path: '/control/webhooks/resend',
      does: 'Sends an event again: event, times.',
      run: ({ body }) => {
        const event = requireFound(state.events.find(optionalText(body, 'event') ?? ''), 'No such event.');
        webhooks.resend(event, wholeNumber(body, 'times', 1));
      },
    },
    {
      method: 'POST',
      path: '/control/webhooks/endpoints',
      does: 'Replaces the endpoints: endpoints, each with url, secret (or secrets) and events.',
      run: ({ body }) => webhooks.setEndpoints(readEndpoints(body)),
    },
    {
      method: 'GET',
      path: '/control/webhooks',
      does: 'Shows endpoints, conduct, what waits and every attempt made.',
      run: () => ({ ...webhooks.describe(), attempts: webhooks.attempts() }),
    },
  ];
}

function addFault(faults: Faults, body: ControlCall['body']): void {
  const kind = oneOf(body, 'kind', ['fail', 'hang', 'reset', 'delay', 'garbage'], 'fail');
  const status = wholeNumber(body, 'status', 500);
  if (status < 400 || status > 599) throw new Refusal(400, '"status" must be from 400 to 599.');
  const count = wholeNumber(body, 'count', 1);
  if (count < 1) throw new Refusal(400, '"count" must be at least 1.');
  faults.add({
    kind,
    count,
    status,
    method: optionalText(body, 'method') ?? null,
    path: optionalText(body, 'path') ?? '/v1/',
    processed: flag(body, 'processed', kind === 'garbage'),
    code: optionalText(body, 'code') ?? null,
    message: optionalText(body, 'message') ?? '',
    stored: flag(body, 'stored', false),
    retry: body['retry'] === undefined ? null : flag(body, 'retry', true),
    milliseconds: wholeNumber(body, 'milliseconds', 1000),
  });
}

function readOrder(body: ControlCall['body']): ReleaseOrder {
  const { events } = body;
  if (Array.isArray(events) && events.every((event) => typeof event === 'string')) return events;
  return oneOf(body, 'order', ['as-they-came', 'last-first'], 'as-they-came');
}

function readEndpoints(body: ControlCall['body']): WebhookEndpoint[] {
  const { endpoints } = body;
  if (!Array.isArray(endpoints)) throw new Refusal(400, '"endpoints" must be a list.');
  return endpoints.map((endpoint: unknown) => {
    const given = endpoint as Record<string, unknown>;
    const url = optionalText(given, 'url');
    const secret = optionalText(given, 'secret');
    const secrets = Array.isArray(given['secrets'])
      ? given['secrets'].map(String)
      : secret === undefined
        ? []
        : [secret];
    if (url === undefined || !URL.canParse(url) || secrets.length === 0) {
      throw new Refusal(400, 'Each endpoint needs a url and a secret.');
    }
    return { url, secrets, events: Array.isArray(given['events']) ? given['events'].map(String) : [] };
  });
}
