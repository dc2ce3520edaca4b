import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { useOfflineQueue } from '../../../../api/offline';
import type { OfflineQueue, QueueState } from '../../../../lib/offline-queue';
import { benchKey } from '../../api/bench';
import type { TypedReading } from './in-hand';

interface TypedReadings {
  queue: OfflineQueue;
  state: QueueState;
  /** What was typed here for a unit and not refused, whether the server has it yet or not. */
  of: (serial: string) => readonly TypedReading[];
  keep: (serial: string, reading: TypedReading) => Promise<void>;
}

/** Readings are kept on this device first and sent from there, so that none is lost with the connection. */
export function useTypedReadings(personId: number): TypedReadings {
  const { queue, state } = useOfflineQueue(personId);
  const queries = useQueryClient();
  const [typed, setTyped] = useState<readonly { serial: string; reading: TypedReading }[]>([]);
  const { lastSentAt } = state;
  useEffect(() => {
    if (lastSentAt !== undefined) void queries.invalidateQueries({ queryKey: benchKey });
  }, [lastSentAt, queries]);
  return {
    queue,
    state,
    of: (serial) => {
      const refused = new Set(state.refused.map(({ idempotencyKey }) => idempotencyKey));
      const waiting = state.waiting.filter(({ subject }) => subject === serial).map(({ body }) => body as TypedReading);
      const here = typed.filter((entry) => entry.serial === serial).map(({ reading }) => reading);
      const all = new Map([...waiting, ...here].map((reading) => [reading.clientKey, reading]));
      return [...all.values()].filter(({ clientKey }) => !refused.has(clientKey));
    },
    keep: async (serial, reading) => {
      await queue.add({
        subject: serial,
        method: 'POST',
        path: `/api/units/${encodeURIComponent(serial)}/readings`,
        body: reading,
        idempotencyKey: reading.clientKey,
        typedAt: reading.measuredAt,
      });
      setTyped((before) => [...before, { serial, reading }]);
    },
  };
}
