/** Whether a key press belongs to a field, so that a shortcut must leave it alone. */
export function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  return target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName);
}

const steps: Record<string, number> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/**
 * Where arrow keys, Home and End take the focus in a row of things.
 * @returns the next place, or undefined if the key means nothing here
 */
export function rovingTarget(key: string, current: number, count: number): number | undefined {
  if (key === 'Home') return 0;
  if (key === 'End') return count - 1;
  const step = steps[key];
  if (step === undefined) return undefined;
  return Math.min(count - 1, Math.max(0, current + step));
}
