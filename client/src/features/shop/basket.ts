import { useSyncExternalStore } from 'react';
import { readStored, writeStored } from '../../lib/stored';
import type { BasketLine } from './api/shop';

/** What a visitor means to order: things and how many, and where they go. Nothing about the person. */
interface Basket {
  readonly lines: readonly BasketLine[];
  readonly country: string | undefined;
}

const key = 'basket';
/** How many of one thing can be ordered at once. */
export const mostOfOne = 20;
const listeners = new Set<() => void>();
let current: Basket | undefined;

function read(): Basket {
  const kept = readStored('local', key);
  if (typeof kept !== 'object' || kept === null) return { lines: [], country: undefined };
  const { lines, country } = kept as { lines?: unknown; country?: unknown };
  return {
    lines: Array.isArray(lines) ? lines.filter(isLine) : [],
    country: typeof country === 'string' ? country : undefined,
  };
}

function isLine(value: unknown): value is BasketLine {
  const line = value as Partial<BasketLine> | null;
  return Number.isInteger(line?.listingId) && Number.isInteger(line?.quantity);
}

function write(next: Basket): void {
  current = next;
  writeStored('local', key, next);
  for (const listener of listeners) listener();
}

const snapshot = (): Basket => (current ??= read());

/** The basket of this browser, shared by its tabs. */
export function useBasket(): Basket & { readonly count: number } {
  const basket = useSyncExternalStore(subscribe, snapshot);
  return { ...basket, count: basket.lines.reduce((sum, { quantity }) => sum + quantity, 0) };
}

function subscribe(listener: () => void): () => void {
  const fromOtherTab = (event: StorageEvent): void => {
    if (!event.key?.includes(key)) return;
    current = read();
    listener();
  };
  listeners.add(listener);
  addEventListener('storage', fromOtherTab);
  return () => {
    listeners.delete(listener);
    removeEventListener('storage', fromOtherTab);
  };
}

export function putInBasket(listingId: number, quantity = 1): void {
  const { lines, country } = snapshot();
  const known = lines.find((line) => line.listingId === listingId);
  setQuantity(
    listingId,
    (known?.quantity ?? 0) + quantity,
    known ? lines : [...lines, { listingId, quantity: 0 }],
    country,
  );
}

export function setBasketQuantity(listingId: number, quantity: number): void {
  const { lines, country } = snapshot();
  setQuantity(listingId, quantity, lines, country);
}

function setQuantity(
  listingId: number,
  quantity: number,
  lines: readonly BasketLine[],
  country: string | undefined,
): void {
  const kept = Math.min(Math.max(quantity, 0), mostOfOne);
  const next = lines.map((line) => (line.listingId === listingId ? { listingId, quantity: kept } : line));
  write({ country, lines: next.filter((line) => line.quantity > 0) });
}

export function setBasketCountry(country: string): void {
  write({ ...snapshot(), country });
}

export function emptyBasket(): void {
  write({ ...snapshot(), lines: [] });
}
