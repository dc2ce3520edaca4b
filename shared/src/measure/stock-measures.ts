/**
 * The measures in which parts are kept, bought and put on invoices, each with its UN/ECE Recommendation 20 code (which
 * EN 16931 asks for, BT-130) and the decimals a quantity in it may have.
 * Source of the codes: UN/ECE Recommendation 20, annexes I to III, as listed by the EN 16931 code lists (BR-CL-23).
 */
export const stockMeasures = {
  piece: { name: 'piece', recommendation20: 'H87', decimals: 0 },
  set: { name: 'set', recommendation20: 'SET', decimals: 0 },
  pair: { name: 'pair', recommendation20: 'PR', decimals: 0 },
  m: { name: 'metre', recommendation20: 'MTR', decimals: 6 },
  mm: { name: 'millimetre', recommendation20: 'MMT', decimals: 3 },
  kg: { name: 'kilogram', recommendation20: 'KGM', decimals: 6 },
  g: { name: 'gram', recommendation20: 'GRM', decimals: 6 },
  l: { name: 'litre', recommendation20: 'LTR', decimals: 6 },
  ml: { name: 'millilitre', recommendation20: 'MLT', decimals: 6 },
} as const;

/** A measure in which parts are kept. */
export type StockMeasure = keyof typeof stockMeasures;

/** All measures in which parts are kept, in the order they are offered. */
export const stockMeasureCodes = Object.keys(stockMeasures) as readonly StockMeasure[];

/**
 * Whether text is a measure in which parts are kept.
 *
 * @param text for example "piece"
 * @returns true for the codes of {@link stockMeasures}
 */
export function isStockMeasure(text: string): text is StockMeasure {
  return Object.hasOwn(stockMeasures, text);
}
