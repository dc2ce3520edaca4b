import { parseMinor } from '../../../lib/parse-number';
import { currencyDecimals } from '../../../lib/format-money';
import type { AdjustmentInput, DeliveryInput, TransferInput } from '../api/stock';

const orNone = (value: string): string | null => (value.trim() === '' ? null : value.trim());

export interface DeliveryLineValues {
  part: string;
  quantity: string;
  bin: string;
  unitPrice: string;
  /** In major units; instead of the price. */
  lineValueMinor: string;
  supplierLot: string;
  expiresOn: string;
  held: boolean;
}

export interface DeliveryValues {
  supplier: string;
  deliveryNote: string;
  receivedOn: string;
  note: string;
  lines: DeliveryLineValues[];
}

export const emptyDeliveryLine: DeliveryLineValues = {
  part: '',
  quantity: '',
  bin: '',
  unitPrice: '',
  lineValueMinor: '',
  supplierLot: '',
  expiresOn: '',
  held: false,
};

export function deliveryInput(values: DeliveryValues, currency: string): DeliveryInput {
  const decimals = currencyDecimals(currency);
  return {
    supplier: values.supplier.trim(),
    deliveryNote: orNone(values.deliveryNote),
    receivedOn: values.receivedOn,
    note: orNone(values.note),
    lines: values.lines.map((line) => ({
      part: line.part.trim(),
      quantity: line.quantity,
      bin: line.bin.trim(),
      unitPrice: orNone(line.unitPrice),
      lineValueMinor: parseMinor(line.lineValueMinor, decimals) ?? null,
      supplierLot: orNone(line.supplierLot),
      expiresOn: orNone(line.expiresOn),
      held: line.held,
    })),
  };
}

export interface TransferLineValues {
  part: string;
  lot: string;
  bin: string;
  toBin: string;
  quantity: string;
}

export function transferInput(values: { lines: TransferLineValues[]; note: string }): TransferInput {
  return {
    note: orNone(values.note),
    lines: values.lines.map(({ part, lot, bin, toBin, quantity }) => ({
      part: part.trim(),
      lot: orNone(lot),
      bin: bin.trim(),
      toBin: toBin.trim(),
      quantity,
    })),
  };
}

export interface AdjustmentLineValues {
  part: string;
  lot: string;
  bin: string;
  quantity: string;
  unitCost: string;
}

export interface AdjustmentValues {
  reason: string;
  note: string;
  lines: AdjustmentLineValues[];
}

export function adjustmentInput(values: AdjustmentValues): AdjustmentInput {
  const costs = values.reason === 'found' || values.reason === 'counted';
  return {
    reason: values.reason as AdjustmentInput['reason'],
    note: values.note,
    lines: values.lines.map(({ part, lot, bin, quantity, unitCost }) => ({
      part: part.trim(),
      lot: orNone(lot),
      bin: bin.trim(),
      quantity,
      unitCost: costs ? orNone(unitCost) : null,
    })),
  };
}
