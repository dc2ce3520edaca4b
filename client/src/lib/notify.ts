export interface Notice {
  text: string;
  tone: 'sound' | 'hot' | 'cool';
  /** An undo or a way to the thing, offered beside the text. */
  action?: { label: string; run: () => void };
}

type Listener = (notice: Notice) => void;
const listeners = new Set<Listener>();

/** Says something in passing; whichever shell is shown reads it out and lets it go again. */
export function notify(text: string, more: Partial<Omit<Notice, 'text'>> = {}): void {
  const notice: Notice = { text, tone: 'sound', ...more };
  for (const listener of listeners) listener(notice);
}

export function onNotice(listener: Listener): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
