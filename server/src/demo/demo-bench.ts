import type { INestApplicationContext } from '@nestjs/common';
import { Decimal } from '@emberlot/shared/measure/decimal';
import type { BatchDto } from '../builds/batch.dto.js';
import { BatchesService } from '../builds/batches.service.js';
import { BuildBatchService } from '../builds/build-batch.service.js';
import { FinishUnitService } from '../builds/finish-unit.service.js';
import { PickBatchService } from '../builds/pick-batch.service.js';
import { PickListService } from '../builds/pick-list.service.js';
import { PlanBatchService } from '../builds/plan-batch.service.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { FaultsService } from '../testing/faults.service.js';
import { RecordReadingService } from '../testing/record-reading.service.js';
import type { Chance } from './chance.js';
import type { TurnedClock } from './turned-clock.js';

type Planned = BatchDto['testPlan'][number];

/** How far a characteristic has moved from its target, as a share of half its limits: drifts, and is brought back. */
export type Drift = (name: string) => number;

/** Builds batches as the people at the bench do: plan, pick, build, measure, finish. */
export class DemoBench {
  constructor(
    private readonly app: INestApplicationContext,
    private readonly clock: TurnedClock,
    private readonly chance: Chance,
    private readonly owner: SignedInUser,
    private readonly assembler: SignedInUser,
  ) {}

  /** Makes a number of a sub-assembly and puts them on the shelf. */
  async makeParts(part: string, quantity: number, bin: string): Promise<void> {
    const number = await this.pickAll(part, quantity);
    await this.app.get(BuildBatchService).start(number, this.assembler);
    this.clock.advance({ hours: 3 });
    await this.app.get(FinishUnitService).completePieces(number, { quantity, bin, last: true }, this.assembler);
  }

  /** Plans a batch that nobody has begun. */
  async plan(part: string, quantity: number, dueOn: string): Promise<string> {
    return this.app.get(PlanBatchService).plan({ part, quantity, dueOn }, this.owner);
  }

  /** Builds and measures a batch of irons. The unit at `faulty` fails once and is reworked. */
  async buildIrons(part: string, quantity: number, drift: Drift, faulty: number, leaveOpen = 0): Promise<void> {
    const number = await this.pickAll(part, quantity);
    await this.app.get(BuildBatchService).start(number, this.assembler);
    const batch = await this.app.get(BatchesService).open(number, this.assembler);
    const serials = batch.units.map(({ serial }) => serial);
    const finished = serials.slice(0, serials.length - leaveOpen);
    for (const { position } of batch.steps) {
      await this.app.get(BuildBatchService).tick(number, position, { done: true, units: finished }, this.assembler);
      this.clock.advance({ minutes: 50 });
    }
    for (const [place, serial] of finished.entries()) {
      await this.measureUntilSound(serial, batch, place === faulty ? poorClamp(drift) : drift);
      await this.app.get(FinishUnitService).complete(serial, { bin: 'G2' }, this.assembler);
      this.clock.advance({ minutes: 12 });
    }
  }

  private async pickAll(part: string, quantity: number): Promise<string> {
    const dueOn = new Date(this.clock.now().getTime() + 7 * 86_400_000).toISOString().slice(0, 10);
    const number = await this.plan(part, quantity, dueOn);
    this.clock.advance({ hours: 1 });
    const { rows, shortages } = await this.app.get(PickListService).read(number);
    if (shortages.length > 0)
      throw new Error(`${number} for ${quantity} of ${part} is short of ${JSON.stringify(shortages)}`);
    const lines = rows.map(({ path, part: picked, bin, lot, quantity: amount }) => ({
      path,
      part: picked.code,
      bin,
      quantity: amount,
      ...(lot === null ? {} : { lot }),
    }));
    await this.app.get(PickBatchService).issue(number, { lines }, this.assembler);
    this.clock.advance({ hours: 1 });
    return number;
  }

  /** Measures; what fails is reworked and measured again, now as it should be. */
  private async measureUntilSound(serial: string, batch: BatchDto, drift: Drift): Promise<void> {
    let moved = drift;
    for (let run = 1; run <= 4; run += 1) {
      await this.measure(serial, batch, moved, run);
      if (!(await this.rework(serial))) return;
      moved = () => 0;
    }
  }

  /** @returns whether there was a fault to see to */
  private async rework(serial: string): Promise<boolean> {
    const faults = await this.app.get(FaultsService).list({ q: serial, open: true, page: 1, pageSize: 10 });
    const [fault] = faults.items;
    if (!fault) return false;
    const rework = {
      cause: 'A clamp face was not bright',
      action: 'Clamp faces dressed and tightened again',
      minutes: '14',
      version: fault.version,
    };
    await this.app.get(FaultsService).rework(fault.number, rework, this.assembler);
    this.clock.advance({ minutes: 20 });
    return true;
  }

  private async measure(serial: string, batch: BatchDto, drift: Drift, run: number): Promise<void> {
    for (const planned of batch.testPlan) {
      this.clock.advance({ minutes: 1 });
      await this.app.get(RecordReadingService).record(
        serial,
        {
          run,
          position: planned.position,
          measuredAt: this.clock.now().toISOString(),
          clientKey: this.chance.uuid(),
          confirmed: true,
          ...(planned.kind === 'yes_no' ? { answer: true } : { reading: this.reading(planned, drift(planned.name)) }),
        },
        this.assembler,
      );
    }
  }

  /** A value round the middle of the limits, moved by the drift, with as many digits as the instrument gives. */
  private reading(planned: Planned, moved: number): string {
    const digits = planned.digits ?? 0;
    const [lower, upper] = [planned.lowerLimit, planned.upperLimit].map((limit) =>
      limit === null ? null : Number(limit),
    );
    if (lower !== null && lower !== undefined && upper !== null && upper !== undefined) {
      const half = (upper - lower) / 2;
      const value = (upper + lower) / 2 + half * (moved + 0.16 * this.chance.bell());
      return new Decimal(value.toFixed(digits)).toFixed(digits);
    }
    // One limit only: well on the right side of it.
    const limit = lower ?? upper ?? 1;
    const share = 0.08 * Math.abs(this.chance.bell());
    const value = typeof lower === 'number' ? limit * (2.2 + share) : limit * (0.78 + 0.2 * moved + share * 0.5);
    return new Decimal(value.toFixed(digits)).toFixed(digits);
  }
}

/** A poor contact at the clamp shows in the pack current, far out of its limits. */
function poorClamp(drift: Drift): Drift {
  return (name) => (name === 'Pack current at working drive' ? 2 : drift(name));
}
