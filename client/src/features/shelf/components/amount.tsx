import type { ReactElement } from 'react';
import { Quantity } from '../../../components/figures';
import { formatQuantity } from '../../../lib/format-quantity';

/** The unit as it stands behind a figure; a bare figure counts pieces. */
export function unitOf(measure: string): string | undefined {
  return measure === 'piece' ? undefined : measure;
}

/** Units that are priced by the piece need no unit behind a cost. */
export function costUnitOf(measure: string): string | undefined {
  return ['piece', 'pair', 'set'].includes(measure) ? undefined : measure;
}

/** A quantity of a part in a table: `81 pair`, `41.2 m`, `36`. */
export function Amount({ value, measure }: { value: string; measure: string }): ReactElement {
  return <Quantity value={value} unit={unitOf(measure)} />;
}

const counted = new Set(['piece', 'pair', 'set']);

/** A quantity of a part in a sentence: `36 pieces`, `1 pair`, `41.2 m`. */
export function amountWords(value: string, measure: string): string {
  return formatQuantity(value, counted.has(measure) && value !== '1' ? `${measure}s` : measure);
}
