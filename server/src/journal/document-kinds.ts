/**
 * Everything that can happen, with the letters its number begins with. Kinds without letters carry the number of the
 * thing they belong to (an invoice its own, a shipment its parcel's).
 */
export const documentKinds = {
  opening: 'OB',
  receipt: 'R',
  transfer: 'T',
  adjustment: 'A',
  lot_status: 'S',
  issue: 'I',
  issue_return: 'IR',
  completion: 'C',
  scrap: 'X',
  packing: 'K',
  shipment: null,
  invoice: null,
  credit_note: null,
  payment: 'PY',
  refund: 'RF',
  cancellation: 'CN',
  manual_entry: 'M',
  reversal: 'V',
} as const;

export type DocumentKind = keyof typeof documentKinds;
