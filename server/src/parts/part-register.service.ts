import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import type { BatteryRow, ParameterRow } from './part-details.repository.js';
import { PartRegisterRepository, type RegisteredPartRow, type RegisteredSupplier } from './part-register.repository.js';
import type { PartRow } from './parts.repository.js';

export type RegisteredPart = RegisteredPartRow;

/** A part as a table of many brings it; of its suppliers, the one to order from. */
export interface NewPart extends PartRow {
  readonly parameters: readonly ParameterRow[];
  readonly supplier: RegisteredSupplier | null;
  readonly battery: BatteryRow | null;
}

/** Parts by the thousand, for imports: the single part is the parts service's. */
@Injectable()
export class PartRegister {
  constructor(
    private readonly clock: Clock,
    private readonly repository: PartRegisterRepository,
  ) {}

  /** What is known of parts, by code; unknown codes are left out. */
  async known(handle: Kysely<DB>, codes: readonly string[]): Promise<ReadonlyMap<string, RegisteredPart>> {
    const rows = await this.repository.byCodes(handle, codes);
    return new Map(rows.map((row) => [row.code, row]));
  }

  /** Which part has which letters for its serial numbers. */
  async withLetters(handle: Kysely<DB>, letters: readonly string[]): Promise<ReadonlyMap<string, string>> {
    return this.repository.partsWithLetters(handle, letters);
  }

  async countryCodes(handle: Kysely<DB>): Promise<ReadonlySet<string>> {
    return this.repository.countryCodes(handle);
  }

  /** @param supplierIds ids of every supplier that the parts name, by code */
  async add(
    trx: Transaction<DB>,
    parts: readonly NewPart[],
    supplierIds: ReadonlyMap<string, number>,
    person: SignedInUser,
  ): Promise<void> {
    await this.repository.insert(trx, parts, { id: person.id, at: this.clock.now() });
    await this.repository.insertParameters(
      trx,
      parts.flatMap(({ code, parameters }) => parameters.map((parameter) => ({ ...parameter, part: code }))),
    );
    await this.repository.insertSuppliers(
      trx,
      parts.flatMap(({ code, supplier }) => {
        const supplierId = supplier === null ? undefined : supplierIds.get(supplier.code);
        return supplier === null || supplierId === undefined ? [] : [{ ...supplier, part: code, supplierId }];
      }),
    );
    await this.repository.insertBatteries(
      trx,
      parts.flatMap(({ code, battery }) => (battery === null ? [] : [{ ...battery, part: code }])),
    );
  }
}
