import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import { negateMinor } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService, valueByComponent } from '../stock/stock-ledger.service.js';
import { fault, quantitiesOf, StockLines } from '../stock/stock-lines.service.js';
import { placeOf, refuseShortages } from '../stock/transfer-stock.service.js';
import { BatchIssuesRepository } from './batch-issues.repository.js';
import { BatchLinesRepository, type BatchLineRow } from './batch-lines.repository.js';
import { lockBatch } from './batch-record.js';
import { BatchesRepository, type BatchRow } from './batches.repository.js';
import { notOfLine, refuseClaimedByOthers, refuseTooMuch, unusable, type IssueLine } from './issue-rules.js';
import type { IssueInputDto } from './picking.dto.js';

/** Parts go from the shelf into a batch: they become work in progress. */
@Injectable()
export class PickBatchService {
  constructor(
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly ledger: StockLedgerService,
    private readonly stockLines: StockLines,
    private readonly reservations: ReservationsService,
    private readonly batches: BatchesRepository,
    private readonly lines: BatchLinesRepository,
    private readonly issues: BatchIssuesRepository,
  ) {}

  /** @returns the number of the issue */
  async issue(number: string, input: IssueInputDto, person: SignedInUser): Promise<string> {
    return this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['planned', 'picking', 'in_build']);
      const lines = await this.resolve(trx, batch, input);
      const document = await this.documents.record(trx, { kind: 'issue', recordedBy: person.id });
      const posted = await this.ledger.post(
        trx,
        document,
        lines.map((line) => ({
          direction: 'out' as const,
          reason: 'issue' as const,
          partId: line.part.id,
          ...placeOf(line),
          quantity: line.quantity,
        })),
      );
      const values = posted.map(({ value }) => negateMinor(value));
      await this.issues.insert(
        trx,
        lines.map((line, index) => ({
          lineId: line.line.id,
          documentId: document.id,
          partId: line.part.id,
          ...placeOf(line),
          quantity: line.quantity.toFixed(),
          value: values[index] ?? 0,
          at: document.occurredAt,
          by: person.id,
        })),
      );
      await this.take(trx, lines);
      const total = values.reduce((sum, value) => sum + value, 0);
      await this.batches.addCosts(trx, batch.id, document.id, document.occurredAt, [
        { component: 'materials_in', value: total },
      ]);
      await this.journal.post(trx, {
        document,
        event: 'issued_to_batch',
        narrative: `Parts picked for ${number}`,
        amounts: { ...valueByComponent(posted) },
      });
      if (batch.status === 'planned') await this.batches.setStatus(trx, batch.id, 'planned', 'picking');
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.picked',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        after: { document: document.number, lines: input.lines },
      });
      return document.number;
    });
  }

  /** Everything that is asked for, found, locked and allowed. */
  private async resolve(trx: Transaction<DB>, batch: BatchRow, input: IssueInputDto): Promise<readonly IssueLine[]> {
    const known = await this.lines.lines(trx, batch.id);
    const asked = input.lines.map(({ path }) => known.find((line) => line.path === path));
    const unknown = asked.flatMap((line, index) =>
      line ? [] : [fault(`/lines/${index}/path`, `Batch ${batch.number} takes nothing at this place.`)],
    );
    if (unknown.length > 0) throw inputRefused(unknown);
    const batchLines = asked as readonly BatchLineRow[];
    const alternates = await this.lines.alternates(
      trx,
      batchLines.map(({ billLineId }) => billLineId),
    );
    const strangers = input.lines.flatMap(
      (line, index) => notOfLine(line, batchLines[index] as BatchLineRow, alternates, index) ?? [],
    );
    if (strangers.length > 0) throw inputRefused(strangers);
    await this.ledger.lock(trx, [...batchLines.map(({ partId }) => partId), ...alternates.map(({ id }) => id)]);
    const resolved = await this.stockLines.resolve(trx, input.lines);
    const today = this.clock.today();
    const faults = resolved.flatMap((line, index) => unusable(line, today, index) ?? []);
    if (faults.length > 0) throw inputRefused(faults);
    const quantities = quantitiesOf(
      input.lines,
      resolved.map(({ part }) => part),
    );
    const lines = resolved.map((line, index) => ({
      ...line,
      line: batchLines[index] as BatchLineRow,
      quantity: quantities[index] as Decimal,
    }));
    if (batch.status !== 'in_build') refuseTooMuch(lines);
    refuseShortages(resolved, quantities, await this.stockLines.balances(trx, resolved.map(placeOf)));
    const partIds = lines.map(({ part }) => part.id);
    refuseClaimedByOthers(lines, await this.reservations.available(trx, partIds));
    return lines;
  }

  private async take(trx: Transaction<DB>, lines: readonly IssueLine[]): Promise<void> {
    const byLine = new Map<number, { line: BatchLineRow; quantity: Decimal }>();
    for (const { line, quantity } of lines) {
      const sum = byLine.get(line.id)?.quantity ?? new Decimal(0);
      byLine.set(line.id, { line, quantity: sum.plus(quantity) });
    }
    for (const { line, quantity } of byLine.values()) {
      await this.lines.addIssued(trx, line.id, quantity.toFixed());
      const needed = decimal(line.required).minus(line.issued);
      const taken = Decimal.min(quantity, needed);
      if (line.demandId !== null && taken.greaterThan(0)) await this.reservations.take(trx, line.demandId, taken);
    }
  }
}
