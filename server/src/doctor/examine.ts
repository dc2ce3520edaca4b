import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { booksChecks } from './books-checks.js';
import type { Check, Violation } from './check.js';
import { makingChecks } from './making-checks.js';
import { sellingChecks } from './selling-checks.js';
import { serialCheck, wrongSerials } from './serial-check.js';
import { stockChecks } from './stock-checks.js';

const sqlChecks: readonly Check[] = [...stockChecks, ...makingChecks, ...sellingChecks, ...booksChecks];

export interface Finding {
  readonly name: string;
  readonly promise: string;
  readonly violations: readonly Violation[];
}

/**
 * Looks after every rule, one check after the other, in one consistent view of the database.
 *
 * @param now the instant for what must not wait too long
 */
export async function examine(handle: Kysely<DB>, now: Date): Promise<readonly Finding[]> {
  return handle
    .transaction()
    .setIsolationLevel('repeatable read')
    .setAccessMode('read only')
    .execute(async (trx) => {
      const findings: Finding[] = [];
      for (const { name, promise, violations } of sqlChecks) {
        const { rows } = await violations(now).execute(trx);
        findings.push({ name, promise, violations: rows });
      }
      findings.push({ ...serialCheck, violations: await wrongSerials(trx) });
      return findings;
    });
}
