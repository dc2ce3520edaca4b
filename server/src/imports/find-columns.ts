import type { ImportColumn, ImportKind } from './import-kind.js';

/** Which column of the file fills which column of the kind. */
export interface FoundColumn {
  readonly index: number;
  readonly header: string;
  /** Nothing: the import leaves this column of the file alone. */
  readonly column: ImportColumn | undefined;
}

/** A person's correction of what was found: the kind's column for a column of the file; null leaves it alone. */
export type ColumnChoice = ReadonlyMap<number, string | null>;

export interface ColumnFaults {
  readonly missing: readonly ImportColumn[];
  /** Titles of columns that more than one column of the file would fill. */
  readonly doubled: readonly string[];
}

/** Headers are compared without case, spaces and signs, so that `Unit cost (EUR)` may be `unit_cost_eur`. */
export function plainHeader(header: string): string {
  return header.toLowerCase().replaceAll(/[^\p{L}\p{N}]/gu, '');
}

export function columnFor(header: string, kind: ImportKind): ImportColumn | undefined {
  const asked = plainHeader(header);
  if (asked === '') return undefined;
  const meant = (column: ImportColumn) => [column.title, column.key, ...(column.aliases ?? [])].map(plainHeader);
  return kind.columns.find((column) => meant(column).includes(asked)) ?? kind.openColumn?.(header);
}

export function findColumns(headers: readonly string[], kind: ImportKind, choice: ColumnChoice): FoundColumn[] {
  return headers.map((header, index) => {
    const chosen = choice.get(index);
    if (chosen === null) return { index, header, column: undefined };
    const column = chosen === undefined ? columnFor(header, kind) : kind.columns.find(({ key }) => key === chosen);
    return { index, header, column };
  });
}

export function columnFaults(found: readonly FoundColumn[], kind: ImportKind): ColumnFaults {
  const keys = found.flatMap(({ column }) => (column ? [column.key] : []));
  const doubled = found.flatMap(({ column }) =>
    column && keys.filter((key) => key === column.key).length > 1 ? [column.title] : [],
  );
  return {
    missing: kind.columns.filter(({ key, required }) => required && !keys.includes(key)),
    doubled: [...new Set(doubled)],
  };
}
