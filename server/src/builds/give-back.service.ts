import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount, type MinorAmount } from '@emberlot/shared/money/minor-units';
import { costPool, issueFromPool } from '@emberlot/shared/money/movement-value';
import type { Transaction } from 'kysely';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService, valueByComponent } from '../stock/stock-ledger.service.js';
import { fault, quantitiesOf, StockLines } from '../stock/stock-lines.service.js';
import { UnitRegister } from '../units/unit-register.service.js';
import { placeOf } from '../stock/transfer-stock.service.js';
import { BatchClaims } from './batch-claims.service.js';
import { BatchIssuesRepository, type IssuedLotRow } from './batch-issues.repository.js';
import { BatchLinesRepository, type BatchLineRow } from './batch-lines.repository.js';
import { lockBatch } from './batch-record.js';
import { BatchesRepository, type BatchRow } from './batches.repository.js';
import type { IssueLine } from './issue-rules.js';
import type { IssueInputDto } from './picking.dto.js';

/** What is left over, or was taken by mistake, goes back to the shelf at what it came with. */
@Injectable()
export class GiveBackService {
  constructor(
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly ledger: StockLedgerService,
    private readonly stockLines: StockLines,
    private readonly reservations: ReservationsService,
    private readonly units: UnitRegister,
    private readonly claims: BatchClaims,
    private readonly batches: BatchesRepository,
    private readonly lines: BatchLinesRepository,
    private readonly issues: BatchIssuesRepository,
  ) {}

  /** @returns the number of the document */
  async giveBack(number: string, input: IssueInputDto, person: SignedInUser): Promise<string> {
    return this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['picking', 'in_build']);
      const known = await this.lines.lines(trx, batch.id);
      await this.ledger.lock(
        trx,
        known.map(({ partId }) => partId),
      );
      const lines = await this.resolve(trx, batch, known, input);
      const values = await this.values(trx, batch, lines);
      const document = await this.documents.record(trx, { kind: 'issue_return', recordedBy: person.id });
      const posted = await this.ledger.post(
        trx,
        document,
        lines.map((line, index) => ({
          direction: 'in' as const,
          reason: 'issue_return' as const,
          partId: line.part.id,
          ...placeOf(line),
          quantity: line.quantity,
          value: values[index] as MinorAmount,
        })),
      );
      await this.issues.insert(
        trx,
        lines.map((line, index) => ({
          lineId: line.line.id,
          documentId: document.id,
          partId: line.part.id,
          ...placeOf(line),
          quantity: line.quantity.negated().toFixed(),
          value: 0 - (values[index] ?? 0),
          at: document.occurredAt,
          by: person.id,
        })),
      );
      await this.batches.addCosts(trx, batch.id, document.id, document.occurredAt, [
        { component: 'materials_out', value: 0 - values.reduce((sum, value) => sum + value, 0) },
      ]);
      await this.journal.post(trx, {
        document,
        event: 'returned_from_batch',
        narrative: `Parts given back from ${number}`,
        amounts: { ...valueByComponent(posted) },
      });
      await this.needAgain(trx, batch, lines);
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.gave_back',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        after: { document: document.number, lines: input.lines },
      });
      return document.number;
    });
  }

  private async resolve(
    trx: Transaction<DB>,
    batch: BatchRow,
    known: readonly BatchLineRow[],
    input: IssueInputDto,
  ): Promise<readonly IssueLine[]> {
    const faults = input.lines.flatMap(({ path }, index) =>
      known.some((line) => line.path === path)
        ? []
        : [fault(`/lines/${index}/path`, `Batch ${batch.number} takes nothing at this place.`)],
    );
    if (faults.length > 0) throw inputRefused(faults);
    const resolved = await this.stockLines.resolve(trx, input.lines);
    const quantities = quantitiesOf(
      input.lines,
      resolved.map(({ part }) => part),
    );
    return resolved.map((line, index) => ({
      ...line,
      line: known.find(({ path }) => path === input.lines[index]?.path) as BatchLineRow,
      quantity: quantities[index] as Decimal,
    }));
  }

  /** Each lot gives back its share of what it came with; what finished units hold stays in them. */
  private async values(
    trx: Transaction<DB>,
    batch: BatchRow,
    lines: readonly IssueLine[],
  ): Promise<readonly MinorAmount[]> {
    const inBatch = new Map((await this.issues.inBatch(trx, batch.id)).map((row) => [lotKey(row), row]));
    const costs = await this.batches.costs(trx, batch.id);
    let held = costs.materials_in + costs.materials_out + costs.loss;
    const spare = await this.spare(trx, batch, inBatch);
    return lines.map((asked, index) => {
      const key = lotKey({ lineId: asked.line.id, lotId: asked.lot.id });
      const issued = inBatch.get(key);
      const left = Decimal.min(spare.byLot.get(key) ?? 0, spare.byLine(asked.line));
      if (!issued || asked.quantity.greaterThan(left)) {
        const sentence = `Only ${Decimal.max(left, 0).toFixed()} of ${asked.part.code} from ${asked.lot.code} can be given back.`;
        throw new AppError('not_enough_stock', sentence, {
          faults: [{ pointer: `/lines/${index}/quantity`, code: 'not_enough', detail: sentence }],
        });
      }
      const pool = costPool(decimal(issued.quantity), minorAmount(issued.value));
      const share = issueFromPool(pool, asked.quantity);
      const value = minorAmount(Math.min(0 - share.value, held));
      held -= value;
      inBatch.set(key, { ...issued, quantity: share.pool.quantity.toFixed(), value: share.pool.value });
      spare.take(key, asked);
      return value;
    });
  }

  private async spare(trx: Transaction<DB>, batch: BatchRow, inBatch: ReadonlyMap<string, IssuedLotRow>) {
    const finished = (await this.units.ofBatch(trx, batch.id)).filter(({ completedAt }) => completedAt !== null).length;
    const byLot = new Map([...inBatch].map(([key, { quantity }]) => [key, decimal(quantity)]));
    for (const row of await this.issues.fittedExactly(trx, batch.id)) {
      const key = lotKey(row);
      byLot.set(key, (byLot.get(key) ?? new Decimal(0)).minus(row.quantity));
    }
    const taken = new Map<number, Decimal>();
    return {
      byLot,
      byLine: (line: BatchLineRow) =>
        decimal(line.issued)
          .minus(decimal(line.quantityPer).times(finished + batch.madeQuantity))
          .minus(taken.get(line.id) ?? 0),
      take: (key: string, { line, quantity }: IssueLine) => {
        byLot.set(key, (byLot.get(key) ?? new Decimal(0)).minus(quantity));
        taken.set(line.id, (taken.get(line.id) ?? new Decimal(0)).plus(quantity));
      },
    };
  }

  /** Where the units would now lack something, the batch needs it again and claims it. */
  private async needAgain(trx: Transaction<DB>, batch: BatchRow, lines: readonly IssueLine[]): Promise<void> {
    for (const { line, quantity } of lines) await this.lines.addIssued(trx, line.id, quantity.negated().toFixed());
    const touched = new Set(lines.map(({ line }) => line.id));
    for (const line of await this.lines.lines(trx, batch.id)) {
      const stays = decimal(line.quantityPer).times(batch.quantity);
      if (!touched.has(line.id)) continue;
      if (decimal(line.issued).greaterThanOrEqualTo(stays)) {
        await this.lines.needNoMore(trx, line.id);
        continue;
      }
      if (line.demandId !== null) await this.reservations.release(trx, [line.demandId]);
      const quantity = decimal(line.required).minus(line.issued);
      const [demandId] = await this.reservations.open(trx, [
        {
          kind: 'batch_line',
          partId: line.partId,
          quantity,
          neededOn: batch.startOn ?? batch.dueOn,
          reference: batch.number,
        },
      ]);
      if (demandId !== undefined) await this.lines.setDemand(trx, line.id, demandId);
    }
    await this.claims.claimMissing(trx, batch.id);
  }
}

function lotKey({ lineId, lotId }: { lineId: number; lotId: number }): string {
  return `${lineId}/${lotId}`;
}
