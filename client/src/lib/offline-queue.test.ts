import 'fake-indexeddb/auto';
import { afterEach, describe, expect, it, jest } from '@jest/globals';
import { IDBFactory } from 'fake-indexeddb';
import { offlineQueue, type SendOutgoing } from './offline-queue';
import { outgoingStore, type Outgoing } from './offline-store';
import { ApiProblem, unreachable } from './problem';

const reading = (subject: string, value: string) => ({
  subject,
  method: 'POST' as const,
  path: `/api/units/${subject}/readings`,
  body: { value },
  idempotencyKey: `${subject}-${value}`,
  typedAt: '2026-12-01T10:00:00Z',
});

const sent = '2026-12-01T10:00:04Z';

function bench(send: SendOutgoing, factory = new IDBFactory(), person = 1) {
  return { factory, queue: offlineQueue(person, outgoingStore(factory), send, () => sent) };
}

afterEach(() => {
  jest.restoreAllMocks();
});

describe('readings on a bench without connection', () => {
  it('wait, outlive a reload, and leave in order when the connection is back', async () => {
    const gone: Outgoing[] = [];
    const offline = bench(() => Promise.reject(unreachable()));
    await offline.queue.add(reading('WR-1', '1.04'));
    await offline.queue.add(reading('WR-1', '51.8'));
    await offline.queue.drain();
    expect(offline.queue.state()).toMatchObject({ online: false, lastSentAt: undefined });
    expect(offline.queue.state().waiting).toHaveLength(2);

    const again = bench(async (entry) => gone.push(entry), offline.factory);
    await again.queue.drain();
    expect(gone.map(({ body }) => body)).toEqual([{ value: '1.04' }, { value: '51.8' }]);
    expect(again.queue.state()).toEqual({ waiting: [], refused: [], online: true, lastSentAt: sent, broken: false });
  });

  it('keep the instant at which they were typed, and their key', async () => {
    const send = jest.fn<SendOutgoing>().mockResolvedValue(undefined);
    const { queue } = bench(send);
    await queue.add(reading('WR-1', '2.27'));
    await queue.drain();
    expect(send.mock.calls[0]?.[0]).toMatchObject({ typedAt: '2026-12-01T10:00:00Z', idempotencyKey: 'WR-1-2.27' });
  });

  it('are sent once, also when the answer to the first sending was lost', async () => {
    let lost = true;
    const seen: string[] = [];
    const { queue } = bench(async (entry) => {
      seen.push(entry.idempotencyKey);
      if (!lost) return;
      lost = false;
      throw unreachable();
    });
    await queue.add(reading('WR-1', '2.27'));
    await queue.drain();
    await queue.drain();
    expect(new Set(seen).size).toBe(1);
    expect(queue.state().waiting).toHaveLength(0);
  });

  it('of another person on the same tablet stay where they are', async () => {
    const first = bench(() => Promise.reject(unreachable()));
    await first.queue.add(reading('WR-1', '1'));
    const send = jest.fn<SendOutgoing>().mockResolvedValue(undefined);
    const second = bench(send, first.factory, 2);
    await second.queue.drain();
    expect(send).not.toHaveBeenCalled();
  });
});

describe('a reading that the server refuses', () => {
  const refused = new ApiProblem(422, { code: 'rule_broken', detail: 'This unit is packed.', errors: [] });

  it('is kept with the reason, holds back what follows on the same unit, and lets other units go on', async () => {
    const gone: string[] = [];
    const { queue } = bench(async (entry) => {
      if (entry.idempotencyKey === 'WR-1-1') throw refused;
      gone.push(entry.idempotencyKey);
    });
    await queue.add(reading('WR-1', '1'));
    await queue.add(reading('WR-1', '2'));
    await queue.add(reading('WR-2', '3'));
    await queue.drain();
    expect(gone).toEqual(['WR-2-3']);
    expect(queue.state().refused[0]?.refusal).toEqual({ code: 'rule_broken', detail: 'This unit is packed.' });
    expect(queue.state().waiting.map(({ idempotencyKey }) => idempotencyKey)).toEqual(['WR-1-2']);
  });

  it('can try again, or be let go', async () => {
    let closed = true;
    const gone: string[] = [];
    const { queue } = bench(async (entry) => {
      if (closed) throw refused;
      gone.push(entry.idempotencyKey);
    });
    await queue.add(reading('WR-1', '1'));
    await queue.add(reading('WR-2', '2'));
    await queue.drain();
    const [one, two] = queue.state().refused;
    closed = false;
    await queue.retry(one?.id ?? 0);
    await queue.discard(two?.id ?? 0);
    expect(gone).toEqual(['WR-1-1']);
    expect(queue.state()).toMatchObject({ waiting: [], refused: [] });
  });

  it.each([
    ['the server has a fault', new ApiProblem(503, { code: 'service_unavailable', detail: 'x', errors: [] })],
    ['the session has ended', new ApiProblem(401, { code: 'not_signed_in', detail: 'x', errors: [] })],
  ])('is no refusal when %s', async (_, problem) => {
    const { queue } = bench(() => Promise.reject(problem));
    await queue.add(reading('WR-1', '1'));
    await queue.drain();
    expect(queue.state()).toMatchObject({ refused: [], online: false });
    expect(queue.state().waiting).toHaveLength(1);
  });
});

describe('a browser that keeps nothing', () => {
  it('says so instead of losing a reading', async () => {
    const factory = new IDBFactory();
    jest.spyOn(factory, 'open').mockImplementation(() => {
      throw new DOMException('not allowed', 'SecurityError');
    });
    const { queue } = bench(() => Promise.resolve(), factory);
    await expect(queue.add(reading('WR-1', '1'))).rejects.toThrow('not allowed');
    await queue.drain();
    expect(queue.state().broken).toBe(true);
  });
});
