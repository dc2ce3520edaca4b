/** A change that waits in this browser until the server has it. */
export interface Outgoing {
  /** Given by the store; the order of sending. */
  id: number;
  /** Whose it is: another person on the same tablet never sends it. */
  personId: number;
  /** What it belongs to, such as a unit's serial: entries of one subject are sent in order. */
  subject: string;
  method: 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  path: string;
  body: unknown;
  /** Makes sending it twice harmless. */
  idempotencyKey: string;
  /** When it was typed: the instant that counts. */
  typedAt: string;
  /** What the server said, if it would not take it. */
  refusal?: { code: string; detail: string };
}

export interface OutgoingStore {
  add: (entry: Omit<Outgoing, 'id'>) => Promise<Outgoing>;
  /** A person's entries in the order they were made. */
  of: (personId: number) => Promise<readonly Outgoing[]>;
  put: (entry: Outgoing) => Promise<void>;
  remove: (id: number) => Promise<void>;
}

const database = 'emberlot';
const outgoing = 'outgoing';

function settled<Result>(request: IDBRequest<Result>): Promise<Result> {
  return new Promise((resolve, reject) => {
    request.addEventListener('success', () => resolve(request.result));
    request.addEventListener('error', () => reject(request.error ?? new Error('The browser’s store failed.')));
  });
}

function opened(factory: IDBFactory): Promise<IDBDatabase> {
  const request = factory.open(database, 1);
  request.addEventListener('upgradeneeded', () => {
    const store = request.result.createObjectStore(outgoing, { keyPath: 'id', autoIncrement: true });
    store.createIndex('personId', 'personId');
  });
  return settled(request);
}

/** Resolves when what was written is kept, not merely accepted. */
function committed(transaction: IDBTransaction): Promise<void> {
  return new Promise((resolve, reject) => {
    transaction.addEventListener('complete', () => resolve());
    transaction.addEventListener('abort', () => reject(transaction.error ?? new Error('The browser’s store is full.')));
  });
}

/** The waiting changes of this browser, in IndexedDB: they outlive a reload, a crash and a flat battery. */
export function outgoingStore(factory: IDBFactory = indexedDB): OutgoingStore {
  let opening: Promise<IDBDatabase> | undefined;
  const write = async <Result>(change: (store: IDBObjectStore) => IDBRequest<Result>): Promise<Result> => {
    opening ??= opened(factory);
    // `strict` asks the browser to have it on disk before it says so.
    const transaction = (await opening).transaction(outgoing, 'readwrite', { durability: 'strict' });
    const result = settled(change(transaction.objectStore(outgoing)));
    await committed(transaction);
    return result;
  };
  return {
    add: async (entry) => ({ ...entry, id: Number(await write((store) => store.add(entry))) }),
    of: async (personId) => {
      opening ??= opened(factory);
      const index = (await opening).transaction(outgoing).objectStore(outgoing).index('personId');
      return settled<Outgoing[]>(index.getAll(personId));
    },
    put: async (entry) => {
      await write((store) => store.put(entry));
    },
    remove: async (id) => {
      await write((store) => store.delete(id));
    },
  };
}
