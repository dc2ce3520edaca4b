import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import type { ImportRow } from './import-row.js';

export const importKindKeys = ['parts', 'bill', 'build_steps', 'test_plan', 'opening_stock'] as const;

export type ImportKindKey = (typeof importKindKeys)[number];

/** What stands in the cells of a column. Numbers come out as plain decimal texts, days as `YYYY-MM-DD`. */
export type CellType =
  | { readonly type: 'text'; readonly max: number }
  /** Capital letters are made of small ones before the pattern is looked at. */
  | { readonly type: 'code'; readonly pattern: RegExp; readonly sentence: string }
  | { readonly type: 'number'; readonly decimals: number; readonly least?: number; readonly above?: number }
  | { readonly type: 'whole'; readonly least: number; readonly most: number }
  | { readonly type: 'day' }
  /** The value, and what people write for it (in small letters). */
  | { readonly type: 'choice'; readonly choices: Readonly<Record<string, readonly string[]>> };

export interface ImportColumn {
  readonly key: string;
  /** What the template's header says. */
  readonly title: string;
  /** Other headers that mean it. */
  readonly aliases?: readonly string[];
  readonly required?: boolean;
  readonly cell: CellType;
  /** What belongs there, for the person who fills the table. */
  readonly sentence: string;
  /** Cells of the template's example lines. */
  readonly examples: readonly string[];
}

export interface RowFault {
  readonly line: number;
  /** The title of the column, or nothing where the line as a whole is at fault. */
  readonly column: string | null;
  readonly sentence: string;
}

/** What a file would do. The plan is worked out for `apply`, and is of no use when there are faults. */
export interface ImportCheck<Plan> {
  readonly faults: readonly RowFault[];
  /** What will be added, what is there already: a sentence each. */
  readonly notes: readonly string[];
  /** How many things will be added. */
  readonly additions: number;
  readonly plan: Plan;
}

export interface ImportedBy {
  readonly person: SignedInUser;
  readonly fileName: string;
}

/**
 * A kind of table that can be taken in. Give it to the imports module as a provider; the framework reads the file, finds
 * the columns, reads each cell by its type, and shows or applies what the kind says. All or nothing: `apply` runs in the
 * one transaction that `check` was repeated in.
 */
export interface ImportKind<Plan = unknown> {
  readonly key: ImportKindKey;
  readonly title: string;
  readonly sentence: string;
  /** Whether the same file may come again, because what is there already is left alone. */
  readonly repeatable: boolean;
  readonly columns: readonly ImportColumn[];
  /** A column of the file's own making, such as one per parameter. */
  openColumn?(header: string): ImportColumn | undefined;
  /** Looks at all rows together and against the shelf; changes nothing. */
  check(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<ImportCheck<Plan>>;
  /** @returns the document that carries what was taken in, if there is one */
  apply(trx: Transaction<DB>, plan: Plan, by: ImportedBy): Promise<{ readonly documentId: number | null }>;
}
