import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import type { Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, fieldFault, notFound } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { UnitRegister, type Unit } from '../units/unit-register.service.js';
import { BatchIssuesRepository } from './batch-issues.repository.js';
import { BatchLinesRepository, type BatchLineRow } from './batch-lines.repository.js';
import { lockBatch } from './batch-record.js';
import { BatchesRepository } from './batches.repository.js';
import { BuildingRepository } from './building.repository.js';
import type { FittedLotDto, StepTickDto } from './picking.dto.js';

/** Building: serial numbers, steps, and which lot went into which unit. */
@Injectable()
export class BuildBatchService {
  constructor(
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly units: UnitRegister,
    private readonly batches: BatchesRepository,
    private readonly lines: BatchLinesRepository,
    private readonly issues: BatchIssuesRepository,
    private readonly building: BuildingRepository,
  ) {}

  /** Units made one by one get their serial numbers now, in order. */
  async start(number: string, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['picking']);
      const lines = await this.lines.lines(trx, batch.id);
      if (lines.every(({ issued }) => decimal(issued).isZero())) {
        throw new AppError('wrong_state', `Nothing has been picked for ${number} yet. Pick its parts first.`);
      }
      const part = await this.building.part(trx, batch.partId);
      if (part.serialLetters !== null) await this.units.issue(trx, batch, part.serialLetters);
      await this.batches.setStatus(trx, batch.id, 'picking', 'in_build', { buildStartedAt: this.clock.now() });
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.building_started',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        before: { status: batch.status },
        after: { status: 'in_build' },
      });
    });
  }

  /** Ticks a step on one unit or on many, or takes the tick back. */
  async tick(number: string, position: number, input: StepTickDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['in_build']);
      const steps = await this.lines.steps(trx, batch.id);
      const step = steps.find((candidate) => candidate.position === position);
      if (!step) throw notFound('step');
      const units = await this.units.ofBatch(trx, batch.id);
      const chosen = input.units.map((serial) => units.find((unit) => unit.serial === serial));
      const faults = chosen.flatMap((unit, index) => unitFault(unit, input.units[index] ?? '', index, number));
      if (faults.length > 0) throw inputRefused(faults);
      const ids = (chosen as Unit[]).map(({ id }) => id);
      if (input.done) await this.building.tick(trx, ids, step.id, this.clock.now(), person.id);
      else await this.building.untick(trx, ids, step.id);
      await this.audit.record(trx, {
        actor: person,
        action: input.done ? 'batch.step_done' : 'batch.step_taken_back',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        after: { step: step.title, units: input.units },
      });
    });
  }

  /** Says exactly which lot is in a unit, by scanning it there. */
  async fitLot(serial: string, input: FittedLotDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const known = await this.units.get(trx, serial);
      const batch = await this.batches.lockById(trx, known.batchId);
      const unit = await this.units.lock(trx, serial);
      if (!batch || unit.completedAt !== null || unit.scrappedAt !== null) {
        throw new AppError('wrong_state', `${serial} is not being built any more.`);
      }
      const line = (await this.lines.lines(trx, batch.id)).find(({ path }) => path === input.path);
      if (!line) throw fieldFault('/path', 'unknown', `Batch ${batch.number} takes nothing at this place.`);
      const row = await this.fitting(trx, batch.id, unit, line, input);
      await this.issues.insertAsBuilt(trx, [{ ...row, unitId: unit.id, exact: true }], this.clock.now(), person.id);
      await this.audit.record(trx, {
        actor: person,
        action: 'unit.lot_fitted',
        subjectKind: 'unit',
        subjectId: unit.id,
        subjectCode: serial,
        after: { path: input.path, lot: input.lot, quantity: row.quantity },
      });
    });
  }

  private async fitting(trx: Transaction<DB>, batchId: number, unit: Unit, line: BatchLineRow, input: FittedLotDto) {
    const inBatch = (await this.issues.inBatch(trx, batchId)).filter(({ lineId }) => lineId === line.id);
    const issued = inBatch.find(({ lot }) => lot === input.lot);
    if (!issued) {
      const sentence = `Lot ${input.lot} was not picked for this place. Pick it first, then scan it to the unit.`;
      throw fieldFault('/lot', 'does_not_fit', sentence);
    }
    const fitted = (await this.issues.fittedExactly(trx, batchId)).filter(({ lineId }) => lineId === line.id);
    const sum = (rows: readonly { quantity: string }[]) =>
      rows.reduce((total, { quantity }) => total.plus(quantity), new Decimal(0));
    const missing = decimal(line.quantityPer).minus(sum(fitted.filter(({ unitId }) => unitId === unit.id)));
    const quantity = input.quantity ? decimal(input.quantity) : missing;
    if (missing.lessThanOrEqualTo(0) || quantity.greaterThan(missing)) {
      const sentence = `${unit.serial} holds ${decimal(line.quantityPer).toFixed()} of ${line.code}; that much is scanned to it.`;
      throw fieldFault('/quantity', 'too_much', sentence);
    }
    const left = decimal(issued.quantity).minus(sum(fitted.filter(({ lotId }) => lotId === issued.lotId)));
    if (quantity.greaterThan(left)) {
      const sentence = `Of lot ${input.lot} only ${left.toFixed()} are left in this batch.`;
      throw new AppError('not_enough_stock', sentence, {
        faults: [{ pointer: '/lot', code: 'not_enough', detail: sentence }],
      });
    }
    return { lineId: line.id, partId: issued.partId, lotId: issued.lotId, quantity: quantity.toFixed() };
  }
}

function unitFault(unit: Unit | undefined, serial: string, index: number, number: string) {
  const pointer = `/units/${index}`;
  const code = 'does_not_fit';
  if (!unit) return [{ pointer, code, detail: `${serial} is not of batch ${number}.` }];
  if (unit.completedAt !== null)
    return [{ pointer, code, detail: `${serial} is finished; its steps stay as they are.` }];
  if (unit.scrappedAt !== null) return [{ pointer, code, detail: `${serial} is scrapped.` }];
  return [];
}
