import type { PaymentsOptions } from '../payments.js';
import type { ControlRoute } from '../http/control.js';
import { Api, type RequestNote } from './api.js';
import { moneyControls } from './control-money.js';
import { trafficControls } from './control-traffic.js';
import { Faults } from './faults.js';
import type { PaymentsState } from './state.js';
import { Webhooks } from './webhooks.js';
import type { Surprise, World } from './world.js';

export type Assembly = {
  readonly world: World;
  readonly webhooks: Webhooks;
  readonly api: Api;
  readonly controls: readonly ControlRoute[];
  readonly requests: () => readonly RequestNote[];
};

const DEFAULT_RETRY_DELAYS = [500, 2000, 5000, 15_000, 30_000, 60_000];
const REQUESTS_KEPT = 2000;

/**
 * Puts the parts of the payments stand-in together around a state.
 *
 * @param address the listener's address, known only once it listens
 * @param changed called whenever the state may have changed
 */
export function assemble(
  options: PaymentsOptions,
  state: PaymentsState,
  address: () => string,
  changed: () => void,
): Assembly {
  const now = () => Math.floor((options.now ?? Date.now)() / 1000);
  const switches = new Switches();
  const endpoints = (options.webhooks ?? []).map(({ url, secret, events = [] }) => ({
    url,
    secrets: [secret],
    events,
  }));
  const webhooks = new Webhooks(state, endpoints, options.retryDelays ?? DEFAULT_RETRY_DELAYS, now, changed);
  const faults = new Faults();
  const notes = new Notes();
  const world: World = {
    state,
    shopName: options.shopName ?? 'Fernhollow Tools',
    publicAddress: () => options.publicAddress ?? address(),
    now: () => now() + switches.offset,
    deliver: (event) => webhooks.deliver(event),
    listeners: (type) => webhooks.listeners(type),
    takeSurprise: () => switches.takeSurprise(),
    takeRefundStatus: () => switches.takeRefundStatus(),
  };
  const reset = (): void => {
    state.clear();
    for (const part of [faults, webhooks, switches, notes]) part.reset();
  };
  const controls = [
    ...trafficControls({ state, faults, webhooks, requests: () => notes.all, reset }),
    ...moneyControls(world, switches),
  ];
  const api = new Api(world, { apiKey: options.apiKey, faults, changed, note: (note) => notes.add(note) });
  return { world, webhooks, api, controls, requests: () => notes.all };
}

class Notes {
  #notes: readonly RequestNote[] = [];

  get all(): readonly RequestNote[] {
    return this.#notes;
  }

  add(note: RequestNote): void {
    this.#notes = [...this.#notes, note].slice(-REQUESTS_KEPT);
  }

  reset(): void {
    this.#notes = [];
  }
}

class Switches {
  #surprise: Surprise | undefined;
  #pendingRefunds = 0;
  #offset = 0;

  get offset(): number {
    return this.#offset;
  }

  turnClock(seconds: number): void {
    this.#offset = seconds;
  }

  surprise(surprise: Surprise): void {
    this.#surprise = surprise;
  }

  takeSurprise(): Surprise | undefined {
    const surprise = this.#surprise;
    this.#surprise = undefined;
    return surprise;
  }

  nextRefundsPending(count: number): void {
    this.#pendingRefunds = count;
  }

  takeRefundStatus(): 'succeeded' | 'pending' {
    if (this.#pendingRefunds === 0) return 'succeeded';
    this.#pendingRefunds -= 1;
    return 'pending';
  }

  reset(): void {
    this.#offset = 0;
    this.#surprise = undefined;
    this.#pendingRefunds = 0;
  }
}
