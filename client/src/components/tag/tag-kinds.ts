export const outlinedKinds = ['part', 'lot', 'unit', 'batch', 'order', 'invoice'] as const;
export const plainKinds = ['person', 'supplier', 'bin', 'document'] as const;

export type OutlinedKind = (typeof outlinedKinds)[number];
export type TagKind = OutlinedKind | (typeof plainKinds)[number];

/**
 * The left edge that tells the kind, drawn in a box of 14 by 26 whose right side joins the tag's body:
 * straight, clipped corner, punched hole, double rule, notch, folded corner. The printed label uses the same paths.
 */
export const tagEdges: Record<OutlinedKind, string> = {
  part: 'M14 .5H3.5a3 3 0 0 0-3 3v19a3 3 0 0 0 3 3H14',
  lot: 'M14 .5H9L.5 9v13.5a3 3 0 0 0 3 3H14',
  unit: 'M14 .5H8L.5 8v10L8 25.5h6M9.6 13a2.1 2.1 0 1 1-4.2 0 2.1 2.1 0 0 1 4.2 0',
  batch: 'M14 .5H3.5a3 3 0 0 0-3 3v19a3 3 0 0 0 3 3H14M4.5 .5v25',
  order: 'M14 .5H3.5a3 3 0 0 0-3 3V9a4 4 0 0 1 0 8v5.5a3 3 0 0 0 3 3H14',
  invoice: 'M14 .5H9.5L.5 9.5v13a3 3 0 0 0 3 3H14M.5 9.5h9v-9',
};

export const tagWords: Record<TagKind, string> = {
  part: 'Part',
  lot: 'Lot',
  unit: 'Unit',
  batch: 'Batch',
  order: 'Order',
  invoice: 'Invoice',
  person: 'Person',
  supplier: 'Supplier',
  bin: 'Bin',
  document: 'Document',
};

const folders: Record<Exclude<TagKind, 'document'>, string> = {
  part: '/shelf/parts',
  lot: '/shelf/lots',
  bin: '/shelf/bins',
  supplier: '/shelf/suppliers',
  batch: '/bench/batches',
  unit: '/bench/units',
  order: '/counter/orders',
  person: '/counter/buyers',
  invoice: '/books/invoices',
};

/** Where a thing lives in the staff shell; documents of mixed kinds are opened by an address of their own. */
export function tagAddress(kind: TagKind, code: string): string | undefined {
  return kind === 'document' ? undefined : `${folders[kind]}/${encodeURIComponent(code)}`;
}

export function hasOutline(kind: TagKind): kind is OutlinedKind {
  return kind in tagEdges;
}

export function isTagKind(word: string): word is TagKind {
  return Object.hasOwn(tagWords, word);
}
