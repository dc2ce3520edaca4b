/** A scanner is a keyboard that types faster than a hand and ends with Enter. */
export interface ScanSettings {
  /** Longest pause between two keys of one scan, in milliseconds. */
  longestPause: number;
  shortestCode: number;
}

const usual: ScanSettings = { longestPause: 35, shortestCode: 4 };

export interface Key {
  key: string;
  /** Milliseconds, from the event. */
  at: number;
}

/**
 * Watches single keys and says when they were a scan. Pure, so that timing can be tested without a clock.
 * @returns a function that takes each key and gives the code when Enter ends a scan
 */
export function scanReader(settings: ScanSettings = usual): (key: Key) => string | undefined {
  let code = '';
  let last = Number.NEGATIVE_INFINITY;
  return ({ key, at }) => {
    const quick = at - last <= settings.longestPause;
    last = at;
    if (key === 'Enter') {
      const found = quick && code.length >= settings.shortestCode ? code : undefined;
      code = '';
      return found;
    }
    if (key.length !== 1) return undefined;
    code = quick ? code + key : key;
    return undefined;
  };
}

/**
 * Listens for scans anywhere on the page.
 * @param onScan answers true if it took the code, which keeps the Enter from pressing whatever has focus
 * @param settings how fast a scanner types
 * @returns a function that stops listening
 */
export function listenForScans(
  onScan: (code: string, target: EventTarget | null) => boolean,
  settings: ScanSettings = usual,
): () => void {
  const read = scanReader(settings);
  const listener = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const code = read({ key: event.key, at: event.timeStamp });
    if (code !== undefined && onScan(code, event.target)) {
      event.preventDefault();
      event.stopPropagation();
    }
  };
  document.addEventListener('keydown', listener, true);
  return () => document.removeEventListener('keydown', listener, true);
}
