import { Injectable } from '@nestjs/common';
import { Database } from '../platform/database/database.js';
import { UnitRegister } from '../units/unit-register.service.js';
import { counting } from './judge-reading.js';
import type { TestRunDto, UnitRunsDto } from './test-run.dto.js';
import { TestRunsRepository, type ReadingRow, type RunRow } from './test-runs.repository.js';

/** Runs of a unit, for reading. */
@Injectable()
export class TestRunsService {
  constructor(
    private readonly database: Database,
    private readonly units: UnitRegister,
    private readonly repository: TestRunsRepository,
  ) {}

  /** @throws AppError `not_found` */
  async ofUnit(serial: string): Promise<UnitRunsDto> {
    const handle = this.database.handle;
    const unit = await this.units.get(handle, serial);
    const runs = await this.repository.runs(handle, unit.id);
    const readings = await this.repository.readings(
      handle,
      runs.map(({ id }) => id),
    );
    const open = runs.find(({ verdict, voidedAt }) => verdict === null && voidedAt === null);
    return {
      serial: unit.serial,
      nextRun: open?.sequence ?? (runs.at(-1)?.sequence ?? 0) + 1,
      runs: runs.map((run) => runDto(run, readings)),
    };
  }
}

function runDto(run: RunRow, all: readonly ReadingRow[]): TestRunDto {
  const readings = all.filter(({ runId }) => runId === run.id);
  const last = new Set(counting(readings).values());
  return {
    run: run.sequence,
    verdict: run.verdict,
    startedAt: run.startedAt.toISOString(),
    measuredAt: run.measuredAt?.toISOString() ?? null,
    voidedAt: run.voidedAt?.toISOString() ?? null,
    voidReason: run.voidReason,
    readings: readings.map((reading) => ({
      position: reading.position,
      name: reading.name,
      kind: reading.kind,
      reading: reading.typed,
      answer: reading.answer,
      unit: reading.unit,
      lowerLimit: reading.lower,
      upperLimit: reading.upper,
      verdict: reading.verdict,
      measuredAt: reading.measuredAt.toISOString(),
      recordedBy: reading.recordedBy,
      replaced: !last.has(reading),
    })),
  };
}
