import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { DocumentsService } from '../journal/documents.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, notFound } from '../platform/errors/app-error.js';
import { LotStatusRepository, type LotState } from './lot-status.repository.js';
import type { LotStatusInputDto } from './lot.dto.js';
import { StockLedgerService } from './stock-ledger.service.js';

/** Holding a lot back, releasing it, rejecting it: by a document with a reason. Only released stock can be issued. */
@Injectable()
export class LotStatusService {
  constructor(
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly documents: DocumentsService,
    private readonly ledger: StockLedgerService,
    private readonly repository: LotStatusRepository,
  ) {}

  /** @throws AppError `changed_meanwhile`, `wrong_state`, `rule_broken` */
  async change(code: string, input: LotStatusInputDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const lot = await this.locked(trx, code);
      if (lot.version !== input.version) throw changedMeanwhile(lot);
      refuseKind(lot);
      if (lot.status === input.status) {
        throw new AppError('wrong_state', `Lot ${code} is ${input.status} already.`);
      }
      const document = await this.documents.record(trx, {
        kind: 'lot_status',
        recordedBy: person.id,
        note: input.reason,
      });
      await this.repository.change(trx, lot, input.status);
      await this.repository.recordChange(trx, {
        documentId: document.id,
        lotId: lot.id,
        from: lot.status,
        to: input.status,
        reason: input.reason,
      });
      await this.audit.record(trx, {
        actor: person,
        action: `lot.${input.status}`,
        subjectKind: 'lot',
        subjectId: lot.id,
        subjectCode: lot.code,
        before: { status: lot.status },
        after: { status: input.status, reason: input.reason, document: document.number },
      });
    });
  }

  /** Under the part's lock, as every issue is: a lot is not held while it is being taken. */
  private async locked(trx: Transaction<DB>, code: string): Promise<LotState> {
    const known = await this.repository.find(trx, code);
    if (!known) throw notFound('lot');
    await this.ledger.lock(trx, [known.partId]);
    const lot = await this.repository.find(trx, code);
    if (!lot) throw notFound('lot');
    return lot;
  }
}

function refuseKind(lot: LotState): void {
  if (lot.kind === 'standing') {
    const sentence = 'A part followed by count has no lots to hold. Move the doubtful pieces to a quarantine bin.';
    throw new AppError('rule_broken', sentence);
  }
  if (lot.kind === 'unit') {
    throw new AppError('rule_broken', 'A unit is held or released by its tests and its rework, on its own page.');
  }
}
