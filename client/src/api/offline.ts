import { useEffect, useMemo, useSyncExternalStore } from 'react';
import { offlineQueue, type OfflineQueue, type QueueState } from '../lib/offline-queue';
import { outgoingStore, type Outgoing } from '../lib/offline-store';
import { request } from './request';

const tryAgainEvery = 15_000;

function sendOutgoing({ method, path, body, idempotencyKey }: Outgoing): Promise<unknown> {
  return request(method, path, { body, idempotencyKey });
}

/**
 * The waiting changes of the person at this tablet. They are sent at once if the server answers, else when the
 * connection is back, and in any case every quarter of a minute.
 */
export function useOfflineQueue(personId: number): { queue: OfflineQueue; state: QueueState } {
  const queue = useMemo(
    () => offlineQueue(personId, outgoingStore(), sendOutgoing, () => new Date().toISOString()),
    [personId],
  );
  const state = useSyncExternalStore(queue.subscribe, queue.state);
  useEffect(() => {
    const drain = (): void => void queue.drain();
    drain();
    window.addEventListener('online', drain);
    const timer = setInterval(drain, tryAgainEvery);
    return () => {
      window.removeEventListener('online', drain);
      clearInterval(timer);
    };
  }, [queue]);
  return { queue, state };
}
