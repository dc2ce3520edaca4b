/** Small values the browser may refuse to keep (private windows, full quota): losing one is no fault. */
function attempt<T>(action: () => T): T | undefined {
  try {
    return action();
  } catch {
    return undefined;
  }
}

/** What was kept, or undefined; the caller knows the shape it once wrote. */
export function readStored(area: 'local' | 'session', key: string): unknown {
  const text = attempt(() => storage(area).getItem(key));
  return text ? attempt(() => JSON.parse(text) as unknown) : undefined;
}

export function writeStored(area: 'local' | 'session', key: string, value: unknown): void {
  attempt(() => storage(area).setItem(key, JSON.stringify(value)));
}

export function dropStored(area: 'local' | 'session', key: string): void {
  attempt(() => storage(area).removeItem(key));
}

export function storedKeys(area: 'local' | 'session', prefix: string): string[] {
  return attempt(() => Object.keys(storage(area)).filter((key) => key.startsWith(prefix))) ?? [];
}

function storage(area: 'local' | 'session'): Storage {
  return area === 'local' ? window.localStorage : window.sessionStorage;
}
