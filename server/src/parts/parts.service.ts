import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { changedMeanwhile, fieldFault, notFound } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { PartDetailsRepository, type PartSupplierRow } from './part-details.repository.js';
import type { PartDto, PartEditDto, PartInputDto } from './part.dto.js';
import { batteryRow, checkPart, parameterRows, partDto, partRow } from './part-values.js';
import { PartsRepository, type KnownPartRow } from './parts.repository.js';

/** The record of what can lie on the shelf. What lies there is the stock ledger's. */
@Injectable()
export class PartsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly parts: PartsRepository,
    private readonly details: PartDetailsRepository,
  ) {}

  /** @throws AppError `not_found` */
  async get(code: string, handle: Kysely<DB> = this.database.handle): Promise<PartDto> {
    return this.read(handle, await this.known(handle, code));
  }

  async create(input: PartInputDto, person: SignedInUser): Promise<PartDto> {
    checkPart(input);
    return this.transactions.run(async (trx) => {
      const suppliers = await this.suppliers(trx, input);
      const id = await this.parts.insert(trx, partRow(input), { id: person.id, at: this.clock.now() });
      await this.writeDetails(trx, id, input, suppliers);
      const after = await this.get(input.code, trx);
      await this.record(trx, person, 'part.created', { after });
      return after;
    });
  }

  /** @throws AppError `changed_meanwhile` with the newer state */
  async edit(code: string, input: PartEditDto, person: SignedInUser): Promise<PartDto> {
    checkPart(input);
    return this.transactions.run(async (trx) => {
      const known = await this.known(trx, code);
      const before = await this.read(trx, known);
      refuseFrozen(before, input);
      const suppliers = await this.suppliers(trx, input);
      if (!(await this.parts.update(trx, known.id, input.version, partRow(input)))) {
        throw changedMeanwhile(await this.get(code, trx));
      }
      await this.writeDetails(trx, known.id, input, suppliers);
      const after = await this.get(input.code, trx);
      await this.record(trx, person, 'part.edited', { before, after });
      return after;
    });
  }

  /** A retired part is no longer bought, built or offered; what lies of it may still be used up. */
  async retire(code: string, version: number, person: SignedInUser): Promise<PartDto> {
    return this.setRetired(code, version, person, this.clock.today());
  }

  async bringBack(code: string, version: number, person: SignedInUser): Promise<PartDto> {
    return this.setRetired(code, version, person, null);
  }

  private async setRetired(code: string, version: number, person: SignedInUser, on: string | null): Promise<PartDto> {
    return this.transactions.run(async (trx) => {
      const before = await this.known(trx, code);
      if (!(await this.parts.setRetired(trx, before.id, version, on))) {
        throw changedMeanwhile(await this.get(code, trx));
      }
      const after = await this.get(code, trx);
      const change = { before: { retiredOn: before.retiredOn }, after: { id: after.id, code, retiredOn: on } };
      await this.record(trx, person, on === null ? 'part.brought_back' : 'part.retired', change);
      return after;
    });
  }

  private async known(handle: Kysely<DB>, code: string): Promise<KnownPartRow> {
    const known = await this.parts.findByCode(handle, code);
    if (!known) throw notFound('part');
    return known;
  }

  private async read(handle: Kysely<DB>, known: KnownPartRow): Promise<PartDto> {
    return partDto(known, {
      moved: await this.parts.hasMoved(handle, known.id),
      parameters: await this.details.parametersOf(handle, known.id),
      suppliers: await this.details.suppliersOf(handle, known.id),
      battery: await this.details.batteryOf(handle, known.id),
    });
  }

  private async suppliers(handle: Kysely<DB>, input: PartInputDto): Promise<PartSupplierRow[]> {
    const ids = await this.details.supplierIds(
      handle,
      input.suppliers.map(({ supplier }) => supplier),
    );
    const faults = input.suppliers.flatMap(({ supplier }, index) =>
      ids.has(supplier)
        ? []
        : [{ pointer: `/suppliers/${index}/supplier`, code: 'unknown', detail: `There is no supplier ${supplier}.` }],
    );
    if (faults.length > 0) throw inputRefused(faults);
    return input.suppliers.map((entry) => ({
      supplierId: ids.get(entry.supplier) ?? 0,
      supplierPartCode: entry.supplierPartCode ?? null,
      leadTimeDays: entry.leadTimeDays ?? null,
      preferred: entry.preferred,
    }));
  }

  private async writeDetails(
    trx: Transaction<DB>,
    partId: number,
    input: PartInputDto,
    suppliers: readonly PartSupplierRow[],
  ): Promise<void> {
    await this.details.replaceParameters(trx, partId, parameterRows(input.parameters));
    await this.details.replaceSuppliers(trx, partId, suppliers);
    await this.details.replaceBattery(trx, partId, batteryRow(input.battery));
  }

  private async record(
    trx: Transaction<DB>,
    actor: SignedInUser,
    action: string,
    change: { before?: object; after: { id: number; code: string } },
  ): Promise<void> {
    await this.audit.record(trx, {
      actor,
      action,
      subjectKind: 'part',
      subjectId: change.after.id,
      subjectCode: change.after.code,
      ...(change.before && { before: change.before }),
      after: change.after,
    });
  }
}

/** Said before the database would: quantities that moved would mean something else. */
function refuseFrozen(before: PartDto, input: PartInputDto): void {
  if (!before.moved) return;
  const sentence = `${before.code} has moved already, so this stays as it is. Make a new part for another way.`;
  if (before.measure !== input.measure) throw fieldFault('/measure', 'stays', sentence);
  if (before.traced !== input.traced) throw fieldFault('/traced', 'stays', sentence);
}
