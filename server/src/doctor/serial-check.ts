import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { readSerialNumber } from '@emberlot/shared/serial/serial-number';
import type { Violation } from './check.js';

export const serialCheck = {
  name: 'serial-numbers',
  promise: 'Every serial number carries its own check digits and the letters of its part.',
};

/** Reads all serial numbers and works their check digits out again. */
export async function wrongSerials(handle: Kysely<DB>): Promise<readonly Violation[]> {
  const units = await handle
    .selectFrom('unit')
    .innerJoin('part', 'part.id', 'unit.part_id')
    .select(['unit.serial', 'part.serial_letters as letters'])
    .execute();
  return units
    .filter(({ serial, letters }) => {
      const read = attempt(() => readSerialNumber(serial));
      return !read.ok || read.value.product !== letters || read.value.text !== serial;
    })
    .map(({ serial }) => ({ what: `Serial number ${serial} does not bear its check.` }));
}
