import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { SuppliersRepository } from './suppliers.repository.js';

/** Suppliers by the table, for imports. */
@Injectable()
export class SupplierRegister {
  constructor(
    private readonly clock: Clock,
    private readonly suppliers: SuppliersRepository,
  ) {}

  /** Ids by code; unknown codes are left out. */
  async ids(handle: Kysely<DB>, codes: readonly string[]): Promise<ReadonlyMap<string, number>> {
    return this.suppliers.idsByCode(handle, codes);
  }

  /** Suppliers of whom only a code is known so far; their page takes the rest. */
  async add(trx: Transaction<DB>, codes: readonly string[], currency: string): Promise<ReadonlyMap<string, number>> {
    return this.suppliers.insertMany(trx, codes, currency, this.clock.now());
  }
}
