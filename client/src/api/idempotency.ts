import { useCallback, useRef } from 'react';

/**
 * A key for one attempt of a person to create something: the same for every retry of what was typed, a new one as soon
 * as what is sent changes or the thing was made.
 */
export function useIdempotencyKey(): { keyFor: (body: unknown) => string; done: () => void } {
  const kept = useRef<{ text: string; key: string } | undefined>(undefined);
  const keyFor = useCallback((body: unknown): string => {
    const text = JSON.stringify(body);
    if (kept.current?.text !== text) kept.current = { text, key: crypto.randomUUID() };
    return kept.current.key;
  }, []);
  const done = useCallback((): void => {
    kept.current = undefined;
  }, []);
  return { keyFor, done };
}
