import { Decimal } from '../measure/decimal.js';
import type { BillLine, Bills, NamedAlternate } from './bill-lines.js';

/** Short forms for writing bills in examples and tests: `line('R1', 'resistor', 2, { scrap: '0.05' })`. */
export function line(
  position: string,
  part: string,
  quantityPer: string | number,
  more: { scrap?: string | number; alternates?: readonly NamedAlternate[] } = {},
): BillLine {
  return {
    position,
    part,
    quantityPer: new Decimal(quantityPer),
    scrapShare: new Decimal(more.scrap ?? 0),
    alternates: more.alternates ?? [],
  };
}

export function alternate(part: string, priority = 1, factor: string | number = 1): NamedAlternate {
  return { part, priority, factor: new Decimal(factor) };
}

/** `bills({ A: [['B', 2], ['C', 3]] })`: positions are counted from 1. */
export function bills(rows: Readonly<Record<string, readonly (readonly [string, string | number])[]>>): Bills {
  return new Map(
    Object.entries(rows).map(([part, lines]) => [
      part,
      lines.map(([component, quantity], index) => line(String(index + 1), component, quantity)),
    ]),
  );
}
