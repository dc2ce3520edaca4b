import { useEffect, useEffectEvent } from 'react';
import { isTyping } from '../../../../lib/keyboard';

/** Keys anywhere on the screen, except in a field, an open dialog, or where Enter presses what has the focus. */
export function useKeys(onKey: (key: string) => boolean): void {
  const latest = useEffectEvent(onKey);
  useEffect(() => {
    const listener = (event: KeyboardEvent): void => {
      const target = event.target instanceof HTMLElement ? event.target : null;
      if (event.ctrlKey || event.metaKey || event.altKey || isTyping(target)) return;
      if (target?.closest('[role="dialog"], [role="toolbar"]')) return;
      if (event.key === 'Enter' && target?.closest('button, a')) return;
      if (latest(event.key)) event.preventDefault();
    };
    document.addEventListener('keydown', listener);
    return () => document.removeEventListener('keydown', listener);
  }, []);
}
