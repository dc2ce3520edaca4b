import { useEffect, useEffectEvent } from 'react';
import { isTyping } from './keyboard';
import { listenForScans } from './scanner';

type Taker = (code: string) => boolean;

/** The last to ask is the first to be offered a scan: a page before the shell. */
const takers: Taker[] = [];
let stop: (() => void) | undefined;

function offer(code: string, target: EventTarget | null): boolean {
  // A scan into a field belongs to that field.
  if (isTyping(target)) return false;
  return takers.toReversed().some((take) => take(code));
}

/**
 * Takes scans made anywhere on the page outside a field.
 * @param take answers true if the code was for it; otherwise the next one is asked
 */
export function useScan(take: Taker): void {
  const latest = useEffectEvent(take);
  useEffect(() => {
    const taker: Taker = (code) => latest(code);
    takers.push(taker);
    stop ??= listenForScans(offer);
    return () => {
      takers.splice(takers.indexOf(taker), 1);
      if (takers.length > 0) return;
      stop?.();
      stop = undefined;
    };
  }, []);
}
