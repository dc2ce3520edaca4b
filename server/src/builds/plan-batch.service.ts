import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import type { Transaction } from 'kysely';
import type { BillRevision } from '../bills/bill-revision.js';
import { BillsService } from '../bills/bills.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, fieldFault, notFound } from '../platform/errors/app-error.js';
import { Numbers } from '../platform/numbers/numbers.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService } from '../stock/stock-ledger.service.js';
import { BatchClaims } from './batch-claims.service.js';
import { BatchLinesRepository } from './batch-lines.repository.js';
import { planBatch, type BatchPlan, type TakesFromShelf } from './batch-plan.js';
import { lockBatch } from './batch-record.js';
import type { BatchInputDto, SubAssemblyInputDto, WithdrawalInputDto } from './batch.dto.js';
import { BatchesRepository, type BatchRow } from './batches.repository.js';

/** Batches come into being, are arranged while they are only planned, and may be withdrawn. */
@Injectable()
export class PlanBatchService {
  constructor(
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly numbers: Numbers,
    private readonly bills: BillsService,
    private readonly ledger: StockLedgerService,
    private readonly reservations: ReservationsService,
    private readonly claims: BatchClaims,
    private readonly batches: BatchesRepository,
    private readonly lines: BatchLinesRepository,
  ) {}

  /** @returns the number of the batch */
  async plan(input: BatchInputDto, person: SignedInUser): Promise<string> {
    const startOn = input.startOn ?? null;
    if (startOn !== null && startOn > input.dueOn) {
      throw fieldFault('/startOn', 'does_not_fit', 'It cannot start after the day it is due.');
    }
    return this.transactions.run(async (trx) => {
      const part = await this.bills.part(trx, input.part).catch((error: unknown) => {
        throw error instanceof AppError ? fieldFault('/part', 'unknown', `There is no part ${input.part}.`) : error;
      });
      if (part.retired) throw fieldFault('/part', 'does_not_fit', `${part.code} is no longer made.`);
      const revision = await this.bills.findReleased(trx, part.id);
      if (!revision) {
        throw fieldFault('/part', 'does_not_fit', `${part.code} has no released bill. Release one in Designs first.`);
      }
      const below = await this.bills.withAllBelow(trx, revision);
      await this.ledger.lock(trx, partIdsOf(below));
      const plan = planBatch(revision, madeBelow(below, part.id), input.quantity, await this.whereFree(trx, below));
      const count = await this.numbers.next(trx, 'batch', '');
      const number = `B-${String(count).padStart(4, '0')}`;
      const id = await this.batches.insert(trx, {
        number,
        partId: part.id,
        revisionId: revision.id,
        quantity: input.quantity,
        startOn,
        dueOn: input.dueOn,
        note: input.note ?? null,
        createdAt: this.clock.now(),
        createdBy: person.id,
      });
      await this.arrange(trx, { id, number, startOn, dueOn: input.dueOn }, plan);
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.planned',
        subjectKind: 'batch',
        subjectId: id,
        subjectCode: number,
        after: {
          part: part.code,
          quantity: input.quantity,
          startOn,
          dueOn: input.dueOn,
          note: input.note ?? null,
          revision: revision.number,
        },
      });
      return number;
    });
  }

  /** Takes a made component from the shelf, or builds it within the batch. */
  async chooseSubAssembly(number: string, input: SubAssemblyInputDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['planned']);
      if (batch.version !== input.version) throw changedMeanwhile(batch);
      const chosen = await this.lines.subAssemblies(trx, batch.id);
      const one = chosen.find(({ path }) => path === input.path);
      if (!one) throw notFound('sub-assembly');
      if (one.traced === 'single' && !input.fromShelf) {
        const sentence = `${one.code} is followed one by one. Plan a batch of it, then take it from the shelf.`;
        throw fieldFault('/fromShelf', 'does_not_fit', sentence);
      }
      const known = new Map(chosen.map(({ path, fromShelf }) => [path, fromShelf]));
      known.set(input.path, input.fromShelf);
      await this.releaseDemands(trx, batch.id);
      await this.lines.clear(trx, batch.id);
      const revision = await this.bills.get(trx, batch.revisionId);
      const below = await this.bills.withAllBelow(trx, revision);
      await this.ledger.lock(trx, partIdsOf(below));
      const free = await this.whereFree(trx, below);
      const choice: TakesFromShelf = (component) => known.get(component.path) ?? free(component);
      await this.arrange(trx, batch, planBatch(revision, madeBelow(below, batch.partId), batch.quantity, choice));
      await this.batches.touch(trx, batch.id);
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.rearranged',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        before: { path: input.path, fromShelf: one.fromShelf },
        after: { path: input.path, fromShelf: input.fromShelf },
      });
    });
  }

  /** Claims what has come onto the shelf meanwhile. */
  async claimMissing(number: string, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['planned', 'picking', 'in_build']);
      const short = await this.claims.claimMissing(trx, batch.id);
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.claimed',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        after: { linesShort: short },
      });
    });
  }

  /** Frees the claims of a batch that will not be built. Nothing may lie in it any more. */
  async withdraw(number: string, input: WithdrawalInputDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['planned', 'picking']);
      const lines = await this.lines.lines(trx, batch.id);
      if (lines.some(({ issued }) => new Decimal(issued).greaterThan(0))) {
        const sentence = `Parts have been picked for ${number}. Give them back to the shelf before you withdraw it.`;
        throw new AppError('wrong_state', sentence);
      }
      await this.releaseDemands(trx, batch.id);
      await this.reservations.giveUpBatch(trx, batch.id);
      await this.batches.setStatus(trx, batch.id, batch.status, 'withdrawn', { finishedAt: this.clock.now() });
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.withdrawn',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        before: { status: batch.status },
        after: { status: 'withdrawn', reason: input.reason },
      });
    });
  }

  private async arrange(
    trx: Transaction<DB>,
    batch: Pick<BatchRow, 'id' | 'number' | 'startOn' | 'dueOn'>,
    plan: BatchPlan,
  ): Promise<void> {
    const demandIds = await this.reservations.open(
      trx,
      plan.lines.map((line) => ({
        kind: 'batch_line' as const,
        partId: line.partId,
        quantity: line.required,
        neededOn: batch.startOn ?? batch.dueOn,
        reference: batch.number,
      })),
    );
    await this.lines.insertLines(trx, batch.id, plan.lines, demandIds);
    await this.lines.insertSteps(trx, batch.id, plan.steps);
    await this.lines.insertSubAssemblies(trx, batch.id, plan.subAssemblies);
    await this.claims.claimMissing(trx, batch.id);
  }

  private async releaseDemands(trx: Transaction<DB>, batchId: number): Promise<void> {
    const lines = await this.lines.lines(trx, batchId);
    const demandIds = lines.flatMap(({ demandId }) => (demandId === null ? [] : [demandId]));
    await this.reservations.release(trx, demandIds);
  }

  /** From the shelf when enough for the whole batch is free; what one place takes is gone for the next. */
  private async whereFree(trx: Transaction<DB>, below: ReadonlyMap<number, BillRevision>): Promise<TakesFromShelf> {
    const available = await this.reservations.available(trx, [...below.keys()]);
    const left = new Map([...available].map(([partId, { free }]) => [partId, free]));
    return ({ partId, required }) => {
      const free = left.get(partId) ?? new Decimal(0);
      if (free.lessThan(required)) return false;
      left.set(partId, free.minus(required));
      return true;
    };
  }
}

function madeBelow(all: ReadonlyMap<number, BillRevision>, top: number): ReadonlyMap<number, BillRevision> {
  return new Map([...all].filter(([partId]) => partId !== top));
}

/** All parts that a batch may claim, locked at once and in one order. */
function partIdsOf(below: ReadonlyMap<number, BillRevision>): number[] {
  return [...below.values()].flatMap(({ part, lines }) => [part.id, ...lines.map((line) => line.part.id)]);
}
