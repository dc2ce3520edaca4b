import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, fieldFault, notFound } from '../platform/errors/app-error.js';
import { UnitRegister } from '../units/unit-register.service.js';
import { FaultRegister } from './fault-register.service.js';
import { FaultsRepository, type FaultOutcome, type FaultRow } from './faults.repository.js';
import type {
  FaultDto,
  FaultInputDto,
  FaultPageDto,
  FaultsQuery,
  FirstPassListDto,
  NoFaultInputDto,
  ReworkInputDto,
} from './test-run.dto.js';
import { TestRunsRepository } from './test-runs.repository.js';

/** What was found wrong with units, and what was done about it. */
@Injectable()
export class FaultsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly units: UnitRegister,
    private readonly register: FaultRegister,
    private readonly repository: FaultsRepository,
    private readonly runs: TestRunsRepository,
  ) {}

  async list(query: FaultsQuery): Promise<FaultPageDto> {
    const page = await this.repository.page(this.database.handle, query);
    return { items: page.items.map(faultDto), total: page.total };
  }

  /** @throws AppError `not_found` */
  async read(number: string): Promise<FaultDto> {
    const fault = await this.repository.find(this.database.handle, number);
    if (!fault) throw notFound('fault');
    return faultDto(fault);
  }

  /** In the order in which they were found. */
  async ofUnit(unitId: number): Promise<FaultDto[]> {
    return (await this.repository.ofUnit(this.database.handle, unitId)).map(faultDto);
  }

  async firstPasses(): Promise<FirstPassListDto> {
    return { items: await this.repository.firstPasses(this.database.handle) };
  }

  /** Somebody sees that something is wrong, without a measurement. @returns the number of the fault */
  async report(serial: string, input: FaultInputDto, person: SignedInUser): Promise<string> {
    return this.transactions.run(async (trx) => {
      const unit = await this.units.lock(trx, serial);
      if (unit.scrappedAt !== null) throw new AppError('wrong_state', `${serial} is scrapped already.`);
      const stepId = input.step ? await this.repository.stepId(trx, unit.batchId, input.step) : null;
      if (stepId === undefined) throw fieldFault('/step', 'unknown', 'The batch has no such step.');
      return this.register.open(trx, unit, { what: input.what, runId: null, stepId }, person);
    });
  }

  /** Work was done again: the fault is closed, and no earlier pass says anything any more. */
  async rework(number: string, input: ReworkInputDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const fault = await this.close(trx, number, input.version, person, {
        cause: input.cause,
        action: input.action,
        outcome: 'reworked',
      });
      const at = this.clock.now();
      await this.repository.insertRework(trx, {
        unitId: fault.unitId,
        faultId: fault.id,
        what: input.action,
        minutes: input.minutes,
        at,
        by: person.id,
      });
      await this.runs.voidPasses(trx, fault.unitId, `Reworked for ${number}`, at);
    });
  }

  /** It was looked at and nothing is wrong; a failed run still asks for another one. */
  async noFault(number: string, input: NoFaultInputDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      await this.close(trx, number, input.version, person, { cause: null, action: input.reason, outcome: 'no_fault' });
    });
  }

  private async close(
    trx: Transaction<DB>,
    number: string,
    version: number,
    person: SignedInUser,
    closing: { readonly cause: string | null; readonly action: string; readonly outcome: FaultOutcome },
  ): Promise<FaultRow> {
    const known = await this.repository.find(trx, number);
    if (!known) throw notFound('fault');
    await this.units.lock(trx, known.serial);
    const fault = await this.repository.find(trx, number);
    if (!fault) throw notFound('fault');
    if (fault.closedAt !== null) throw new AppError('wrong_state', `${number} is closed already.`);
    const closed = await this.repository.close(
      trx,
      { id: fault.id, version },
      { ...closing, at: this.clock.now(), by: person.id },
    );
    if (!closed) throw changedMeanwhile(faultDto(fault));
    await this.audit.record(trx, {
      actor: person,
      action: `fault.${closing.outcome}`,
      subjectKind: 'nonconformity',
      subjectId: fault.id,
      subjectCode: number,
      after: closing,
    });
    return fault;
  }
}

export function faultDto({ unitId: _unitId, ...fault }: FaultRow): FaultDto {
  return { ...fault, foundAt: fault.foundAt.toISOString(), closedAt: fault.closedAt?.toISOString() ?? null };
}
