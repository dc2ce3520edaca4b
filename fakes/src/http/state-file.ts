import { mkdir, readFile, rename, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';

const SETTLE_MILLISECONDS = 50;

export type StateFile = {
  /** Notes that the state changed; it is written soon after, many changes at once. */
  changed(): void;
  /** Writes what is outstanding and stops. */
  close(): Promise<void>;
};

/**
 * Keeps a state as JSON in a file, replaced as a whole so that a crash never leaves half of one.
 *
 * @param path the file, or undefined to keep nothing
 * @param read gives the state to write, at the moment of writing
 */
export function stateFile(path: string | undefined, read: () => unknown): StateFile {
  if (path === undefined) return { changed: () => undefined, close: () => Promise.resolve() };
  let timer: NodeJS.Timeout | undefined;
  let dirty = false;
  let writing: Promise<void> = Promise.resolve();
  let failure: unknown;

  const write = (): void => {
    if (!dirty) return;
    dirty = false;
    writing = writing
      .then(() => replace(path, JSON.stringify(read())))
      .catch((fault: unknown) => {
        failure = fault;
      });
  };
  return {
    changed: () => {
      if (failure !== undefined) throw failure;
      dirty = true;
      timer ??= setTimeout(() => {
        timer = undefined;
        write();
      }, SETTLE_MILLISECONDS);
    },
    close: async () => {
      clearTimeout(timer);
      write();
      await writing;
      if (failure !== undefined) throw failure;
    },
  };
}

async function replace(path: string, text: string): Promise<void> {
  await mkdir(dirname(path), { recursive: true });
  const draft = `${path}.new`;
  await writeFile(draft, text, { mode: 0o600 });
  await rename(draft, path);
}

/** @returns what the file holds, or undefined if there is none */
export async function readState(path: string | undefined): Promise<unknown> {
  if (path === undefined) return undefined;
  try {
    return JSON.parse(await readFile(path, 'utf8')) as unknown;
  } catch (fault) {
    if (typeof fault === 'object' && fault !== null && 'code' in fault && fault.code === 'ENOENT') return undefined;
    throw fault;
  }
}
