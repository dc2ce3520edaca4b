import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { currencyCodes } from '@emberlot/shared/money/currency';
import type { Kysely, Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { changedMeanwhile, fieldFault, notFound } from '../platform/errors/app-error.js';
import type { Page } from '../platform/paging/page.js';
import type {
  SupplierDto,
  SupplierEditDto,
  SupplierInputDto,
  SupplierItemDto,
  SuppliersQuery,
} from './supplier.dto.js';
import { SuppliersRepository, type KnownSupplierRow, type SupplierRow } from './suppliers.repository.js';

@Injectable()
export class SuppliersService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly suppliers: SuppliersRepository,
  ) {}

  async list(query: SuppliersQuery): Promise<Page<SupplierItemDto>> {
    return this.suppliers.findPage(this.database.handle, query);
  }

  /** @throws AppError `not_found` */
  async get(code: string, handle: Kysely<DB> = this.database.handle): Promise<SupplierDto> {
    const row = await this.known(handle, code);
    return {
      ...row,
      parts: await this.suppliers.partsOf(handle, row.id),
      deliveries: await this.suppliers.deliveriesOf(handle, row.id),
    };
  }

  async create(input: SupplierInputDto, person: SignedInUser): Promise<SupplierDto> {
    const row = rowOf(input);
    return this.transactions.run(async (trx) => {
      await this.suppliers.insert(trx, row, this.clock.now());
      const after = await this.known(trx, row.code);
      await this.record(trx, person, 'supplier.created', after);
      return this.get(row.code, trx);
    });
  }

  /** @throws AppError `changed_meanwhile` with the newer state */
  async edit(code: string, input: SupplierEditDto, person: SignedInUser): Promise<SupplierDto> {
    const row = rowOf(input);
    return this.transactions.run(async (trx) => {
      const before = await this.known(trx, code);
      if (!(await this.suppliers.update(trx, before.id, input.version, row))) {
        throw changedMeanwhile(await this.get(code, trx));
      }
      await this.record(trx, person, 'supplier.edited', await this.known(trx, row.code), before);
      return this.get(row.code, trx);
    });
  }

  private async known(handle: Kysely<DB>, code: string): Promise<KnownSupplierRow> {
    const row = await this.suppliers.findByCode(handle, code);
    if (!row) throw notFound('supplier');
    return row;
  }

  private async record(
    trx: Transaction<DB>,
    actor: SignedInUser,
    action: string,
    after: KnownSupplierRow,
    before?: KnownSupplierRow,
  ): Promise<void> {
    await this.audit.record(trx, {
      actor,
      action,
      subjectKind: 'supplier',
      subjectId: after.id,
      subjectCode: after.code,
      ...(before && { before }),
      after,
    });
  }
}

function rowOf(input: SupplierInputDto): SupplierRow {
  if (!currencyCodes.some((code) => code === input.currency))
    throw fieldFault('/currency', 'unknown', 'There is no currency of these letters.');
  return {
    code: input.code,
    name: input.name,
    email: input.email ?? null,
    phone: input.phone ?? null,
    countryCode: input.countryCode ?? null,
    currency: input.currency,
    leadTimeDays: input.leadTimeDays ?? null,
    note: input.note ?? null,
  };
}
