import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimalText } from '@emberlot/shared/measure/decimal';
import type { Kysely, Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, notFound } from '../platform/errors/app-error.js';
import type { Page } from '../platform/paging/page.js';
import type { BinDto, BinEditDto, BinInputDto, BinItemDto, BinsQuery } from './bin.dto.js';
import { BinsRepository, type BinRow } from './bins.repository.js';

@Injectable()
export class BinsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly bins: BinsRepository,
  ) {}

  async list(query: BinsQuery): Promise<Page<BinItemDto>> {
    return this.bins.findPage(this.database.handle, query);
  }

  /** @throws AppError `not_found` */
  async get(code: string, handle: Kysely<DB> = this.database.handle): Promise<BinDto> {
    const { retiredAt, ...row } = await this.known(handle, code);
    const contents = await this.bins.contentsOf(handle, row.id);
    return {
      ...row,
      retired: retiredAt !== null,
      contents: contents.map((content) => ({ ...content, quantity: decimalText(content.quantity) })),
    };
  }

  async create(input: BinInputDto, person: SignedInUser): Promise<BinDto> {
    return this.transactions.run(async (trx) => {
      await this.bins.insert(trx, [input]);
      await this.record(trx, person, 'bin.created', await this.known(trx, input.code));
      return this.get(input.code, trx);
    });
  }

  /** @throws AppError `changed_meanwhile` with the newer state */
  async edit(code: string, input: BinEditDto, person: SignedInUser): Promise<BinDto> {
    return this.transactions.run(async (trx) => {
      const before = await this.known(trx, code);
      if (!(await this.bins.update(trx, before.id, input.version, input))) {
        throw changedMeanwhile(await this.get(code, trx));
      }
      await this.record(trx, person, 'bin.edited', await this.known(trx, input.code), before);
      return this.get(input.code, trx);
    });
  }

  /** @throws AppError `wrong_state` while something lies in it */
  async retire(code: string, version: number, person: SignedInUser): Promise<BinDto> {
    return this.setRetired(code, version, person, true);
  }

  async bringBack(code: string, version: number, person: SignedInUser): Promise<BinDto> {
    return this.setRetired(code, version, person, false);
  }

  private async setRetired(code: string, version: number, person: SignedInUser, retire: boolean): Promise<BinDto> {
    return this.transactions.run(async (trx) => {
      const before = await this.known(trx, code);
      if (!(await this.bins.setRetired(trx, before.id, version, retire ? this.clock.now() : null))) {
        throw changedMeanwhile(await this.get(code, trx));
      }
      const after = await this.get(code, trx);
      if (retire && after.contents.length > 0) {
        throw new AppError('wrong_state', `Something lies in bin ${code} still. Move it elsewhere first.`);
      }
      await this.record(trx, person, retire ? 'bin.retired' : 'bin.brought_back', await this.known(trx, code), before);
      return after;
    });
  }

  private async known(handle: Kysely<DB>, code: string): Promise<BinRow> {
    const row = await this.bins.findByCode(handle, code);
    if (!row) throw notFound('bin');
    return row;
  }

  private async record(
    trx: Transaction<DB>,
    actor: SignedInUser,
    action: string,
    after: BinRow,
    before?: BinRow,
  ): Promise<void> {
    await this.audit.record(trx, {
      actor,
      action,
      subjectKind: 'bin',
      subjectId: after.id,
      subjectCode: after.code,
      ...(before && { before }),
      after,
    });
  }
}
