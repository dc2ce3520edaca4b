import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { minorAmount, negateMinor, type MinorAmount } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import type { RecordedDocument } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { UnitRegister } from '../units/unit-register.service.js';
import { BatchLinesRepository } from './batch-lines.repository.js';
import { BatchesRepository, type BatchRow } from './batches.repository.js';

/** Ends batches. A finished batch holds nothing: what no good unit could carry is a loss. */
@Injectable()
export class BatchCloser {
  constructor(
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly journal: JournalService,
    private readonly reservations: ReservationsService,
    private readonly units: UnitRegister,
    private readonly batches: BatchesRepository,
    private readonly lines: BatchLinesRepository,
  ) {}

  /** What the batch holds of work in progress. */
  async held(trx: Transaction<DB>, batchId: number): Promise<MinorAmount> {
    const costs = await this.batches.costs(trx, batchId);
    return minorAmount(costs.materials_in + costs.materials_out + costs.loss);
  }

  /** Units that are neither finished nor scrapped. */
  async unitsOpen(trx: Transaction<DB>, batchId: number): Promise<number> {
    const units = await this.units.ofBatch(trx, batchId);
    return units.filter(({ completedAt, scrappedAt }) => completedAt === null && scrappedAt === null).length;
  }

  async closeWhenSettled(
    trx: Transaction<DB>,
    batch: BatchRow,
    document: RecordedDocument,
    person: SignedInUser,
  ): Promise<void> {
    if ((await this.unitsOpen(trx, batch.id)) === 0) await this.close(trx, batch, document, person);
  }

  async close(trx: Transaction<DB>, batch: BatchRow, document: RecordedDocument, person: SignedInUser): Promise<void> {
    const loss = await this.held(trx, batch.id);
    await this.batches.addCosts(trx, batch.id, document.id, document.occurredAt, [
      { component: 'loss', value: negateMinor(loss) },
    ]);
    await this.journal.post(trx, {
      document,
      event: 'batch_loss',
      narrative: `Lost in batch ${batch.number}`,
      amounts: { materials: loss },
    });
    const lines = await this.lines.lines(trx, batch.id);
    await this.reservations.release(
      trx,
      lines.flatMap(({ demandId }) => (demandId === null ? [] : [demandId])),
    );
    await this.reservations.giveUpBatch(trx, batch.id);
    await this.batches.setStatus(trx, batch.id, 'in_build', 'done', { finishedAt: this.clock.now() });
    await this.audit.record(trx, {
      actor: person,
      action: 'batch.done',
      subjectKind: 'batch',
      subjectId: batch.id,
      subjectCode: batch.number,
      before: { status: batch.status },
      after: { status: 'done', lossMinor: loss },
    });
  }
}
