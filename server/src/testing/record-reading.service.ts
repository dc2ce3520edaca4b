import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, fieldFault } from '../platform/errors/app-error.js';
import { UnitRegister, type Unit } from '../units/unit-register.service.js';
import { FaultRegister } from './fault-register.service.js';
import { counting, judged, whatFailed } from './judge-reading.js';
import type { ReadingInputDto, ReadingResultDto } from './test-run.dto.js';
import { TestRunsRepository, type RunRow } from './test-runs.repository.js';

/** Clocks of tablets are seldom exact to the second. */
const clockSlackMilliseconds = 2 * 60_000;

/** Readings come in, are judged at once, and complete runs. They are added and never changed. */
@Injectable()
export class RecordReadingService {
  constructor(
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly units: UnitRegister,
    private readonly faults: FaultRegister,
    private readonly repository: TestRunsRepository,
  ) {}

  /**
   * Applies one reading once, whenever and however often it arrives.
   *
   * @throws AppError `key_reused` when the key was used for another unit; `wrong_state` when the unit takes no readings
   */
  async record(serial: string, input: ReadingInputDto, person: SignedInUser): Promise<ReadingResultDto> {
    return this.transactions.run(async (trx) => {
      const unit = await this.units.lock(trx, serial);
      const known = await this.repository.findByKey(trx, input.clientKey);
      if (known && known.unitId !== unit.id)
        throw new AppError('key_reused', 'This key belongs to a reading of another unit.');
      if (known) return this.result(trx, unit, known.runId, known.verdict);
      if (unit.scrappedAt !== null) throw new AppError('wrong_state', `${serial} is scrapped and takes no readings.`);
      const plan = await this.repository.plan(trx, unit.revisionId);
      const characteristic = plan.find(({ position }) => position === input.position);
      if (!characteristic) throw fieldFault('/position', 'unknown', 'The test plan asks for nothing at this position.');
      const reading = judged(characteristic, input);
      const measuredAt = this.instant(input.measuredAt, unit);
      const runId = await this.runFor(trx, unit, input.run, measuredAt, person);
      const receivedAt = this.clock.now();
      await this.repository.insertReading(trx, {
        ...reading,
        runId,
        characteristicId: characteristic.id,
        measuredAt,
        receivedAt,
        recordedBy: person.id,
        clientKey: input.clientKey,
      });
      await this.judgeRun(trx, unit, runId, plan.length, person);
      return this.result(trx, unit, runId, reading.verdict);
    });
  }

  private instant(text: string, unit: Unit): Date {
    const measuredAt = new Date(text);
    const now = this.clock.now();
    if (measuredAt.getTime() > now.getTime() + clockSlackMilliseconds) {
      throw fieldFault('/measuredAt', 'future', 'This was measured in the future. Set the clock of this device.');
    }
    if (measuredAt < unit.issuedAt && unit.issuedAt.getTime() - measuredAt.getTime() > clockSlackMilliseconds) {
      throw fieldFault(
        '/measuredAt',
        'past',
        'This was measured before the unit was begun. Set the clock of this device.',
      );
    }
    return measuredAt;
  }

  /**
   * The run that a reading belongs to. Late ones go to the run they were measured for, also when that is complete by now;
   * what is measured after it is complete belongs to a new run.
   */
  private async runFor(
    trx: Transaction<DB>,
    unit: Unit,
    sequence: number,
    measuredAt: Date,
    person: SignedInUser,
  ): Promise<number> {
    const runs = await this.repository.runs(trx, unit.id);
    const asked = runs.find((run) => run.sequence === sequence);
    if (asked && takes(asked, measuredAt)) return asked.id;
    const open = runs.find(({ verdict, voidedAt }) => verdict === null && voidedAt === null);
    if (open && open.sequence > sequence) return open.id;
    const next = (runs.at(-1)?.sequence ?? 0) + 1;
    if (open || sequence > next) {
      throw new AppError('wrong_state', `${unit.serial} is not at run ${sequence}. Look at it again.`);
    }
    const fault = await this.faults.openOf(trx, unit.id);
    if (fault) {
      throw new AppError(
        'wrong_state',
        `${unit.serial} has failed. See to ${fault.number} before you measure it again.`,
      );
    }
    const id = await this.repository.insertRun(trx, {
      unitId: unit.id,
      revisionId: unit.revisionId,
      sequence: next,
      startedAt: this.clock.now(),
      startedBy: person.id,
    });
    await this.audit.record(trx, {
      actor: person,
      action: 'unit.run_started',
      subjectKind: 'unit',
      subjectId: unit.id,
      subjectCode: unit.serial,
      after: { run: next },
    });
    return id;
  }

  /** A run is complete when each characteristic has a reading; it passes when the last of each is within. */
  private async judgeRun(
    trx: Transaction<DB>,
    unit: Unit,
    runId: number,
    planned: number,
    person: SignedInUser,
  ): Promise<void> {
    const readings = await this.repository.readings(trx, [runId]);
    const last = counting(readings);
    if (last.size < planned) return;
    const run = (await this.repository.runs(trx, unit.id)).find(({ id }) => id === runId);
    if (!run) return;
    const failed = [...last.values()].some(({ verdict }) => verdict === 'outside');
    const verdict = failed ? 'fail' : 'pass';
    const measuredAt = new Date(Math.max(...readings.map(({ measuredAt: at }) => at.getTime())));
    await this.repository.setVerdict(trx, runId, verdict, measuredAt);
    if (run.verdict === verdict) return;
    if (failed && run.voidedAt === null) {
      await this.faults.open(trx, unit, { what: whatFailed(last.values()), runId, stepId: null }, person);
    }
    await this.audit.record(trx, {
      actor: person,
      action: failed ? 'unit.failed' : 'unit.passed',
      subjectKind: 'unit',
      subjectId: unit.id,
      subjectCode: unit.serial,
      before: { verdict: run.verdict },
      after: { run: run.sequence, verdict },
    });
  }

  private async result(
    trx: Transaction<DB>,
    unit: Unit,
    runId: number,
    verdict: 'within' | 'outside',
  ): Promise<ReadingResultDto> {
    const run = (await this.repository.runs(trx, unit.id)).find(({ id }) => id === runId);
    const fault = await this.faults.openOf(trx, unit.id);
    return { verdict, run: run?.sequence ?? 0, runVerdict: run?.verdict ?? null, fault: fault?.number ?? null };
  }
}

function takes(run: RunRow, measuredAt: Date): boolean {
  if (run.measuredAt !== null) return measuredAt <= run.measuredAt;
  return run.voidedAt === null || measuredAt <= run.voidedAt;
}
