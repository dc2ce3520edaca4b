import type { Outgoing, OutgoingStore } from './offline-store';
import { ApiProblem } from './problem';

export interface QueueState {
  /** Entries not yet at the server, in order. */
  waiting: readonly Outgoing[];
  /** Entries that the server would not take: somebody must look at them. */
  refused: readonly Outgoing[];
  /** When the last one arrived, in this tab. */
  lastSentAt: string | undefined;
  online: boolean;
  /** This browser can't keep anything: nothing may be typed that must not be lost. */
  broken: boolean;
}

/** Sends one entry; throws what the server or the network said. */
export type SendOutgoing = (entry: Outgoing) => Promise<unknown>;

export interface OfflineQueue {
  state: () => QueueState;
  subscribe: (changed: () => void) => () => void;
  /** Resolves as soon as the entry is kept here; sending goes on by itself. Rejects if this browser can't keep it. */
  add: (entry: Omit<Outgoing, 'id' | 'personId' | 'refusal'>) => Promise<void>;
  /** Sends what waits, in order, until something keeps it from going on. Never rejects: the state says what happened. */
  drain: () => Promise<void>;
  /** Lets a refused entry try again, after whatever was wrong has been put right. */
  retry: (id: number) => Promise<void>;
  discard: (id: number) => Promise<void>;
}

/** Only silence, a fault of the server's or an ended session leaves an entry waiting; anything else is a refusal of it. */
function mustWait(error: unknown): boolean {
  return (
    error instanceof ApiProblem &&
    (error.status === 0 || error.status >= 500 || error.code === 'not_signed_in' || error.code === 'too_many_tries')
  );
}

/**
 * A queue of changes that survives a lost connection.
 * @param personId whose changes are kept and sent
 * @param now the instant that `lastSentAt` shows
 */
export function offlineQueue(
  personId: number,
  store: OutgoingStore,
  send: SendOutgoing,
  now: () => string,
): OfflineQueue {
  let state: QueueState = { waiting: [], refused: [], lastSentAt: undefined, online: true, broken: false };
  let draining: Promise<void> | undefined;
  const listeners = new Set<() => void>();
  const become = (part: Partial<QueueState>): void => {
    state = { ...state, ...part };
    for (const listener of listeners) listener();
  };
  const read = async (): Promise<void> => {
    const entries = await store.of(personId);
    become({ waiting: entries.filter(({ refusal }) => !refusal), refused: entries.filter(({ refusal }) => refusal) });
  };
  /** False when the rest has to wait. */
  const sendOne = async (entry: Outgoing): Promise<boolean> => {
    try {
      await send(entry);
      await store.remove(entry.id);
      become({ lastSentAt: now(), online: true });
      return true;
    } catch (error) {
      if (mustWait(error)) {
        become({ online: false });
        return false;
      }
      const refusal =
        error instanceof ApiProblem
          ? { code: error.code, detail: error.detail }
          : { code: 'unexpected', detail: String(error) };
      await store.put({ ...entry, refusal });
      return true;
    }
  };
  const drainOnce = async (): Promise<void> => {
    await read();
    for (;;) {
      // What follows a refused entry of the same subject may depend on it.
      const stuck = new Set(state.refused.map(({ subject }) => subject));
      const next = state.waiting.find(({ subject }) => !stuck.has(subject));
      if (!next || !(await sendOne(next))) return;
      await read();
    }
  };
  const drain = (): Promise<void> => {
    draining ??= oneTabAtATime(drainOnce)
      .catch(() => become({ broken: true }))
      .finally(() => {
        draining = undefined;
      });
    return draining;
  };
  return {
    state: () => state,
    subscribe: (changed) => {
      listeners.add(changed);
      return () => listeners.delete(changed);
    },
    add: async (entry) => {
      await store.add({ ...entry, personId });
      await read();
      // A drain that is already under way may have read before this entry was there.
      void (draining ?? Promise.resolve()).then(drain);
    },
    drain,
    retry: async (id) => {
      const entry = state.refused.find((candidate) => candidate.id === id);
      if (entry) await store.put({ ...entry, refusal: undefined });
      await drain();
    },
    discard: async (id) => {
      await store.remove(id);
      await read();
      await drain();
    },
  };
}

/** Two tabs must not send the same entry side by side; its key makes a second sending harmless where locks are missing. */
async function oneTabAtATime(work: () => Promise<void>): Promise<void> {
  if (!('locks' in navigator)) return work();
  await navigator.locks.request('emberlot-outgoing', work);
}
