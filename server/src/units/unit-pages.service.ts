import { Injectable } from '@nestjs/common';
import { readSerialNumber } from '@emberlot/shared/serial/serial-number';
import { DateTime } from 'luxon';
import type { Plain } from '../platform/api/plain.js';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import { drawLabels } from '../platform/pdf/labels.js';
import { ShopService } from '../settings/shop.service.js';
import { FaultsService } from '../testing/faults.service.js';
import type { TestRunDto } from '../testing/test-run.dto.js';
import { TestRunsService } from '../testing/test-runs.service.js';
import type { PublicUnitDto, UnitDto, UnitItemDto, UnitPageDto, UnitsQuery } from './unit.dto.js';
import { unitLabel, unitLabelSize } from './unit-label.js';
import { UnitPagesRepository, type UnitItemRow } from './unit-pages.repository.js';

/** Units for those who build them, and for whoever holds one. */
@Injectable()
export class UnitPagesService {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly config: Config,
    private readonly shop: ShopService,
    private readonly runs: TestRunsService,
    private readonly faults: FaultsService,
    private readonly repository: UnitPagesRepository,
  ) {}

  async list(query: UnitsQuery): Promise<UnitPageDto> {
    const page = await this.repository.page(this.database.handle, query);
    return { items: page.items.map(itemDto), total: page.total };
  }

  /** @throws AppError `not_found` */
  async open(serial: string): Promise<UnitDto> {
    const handle = this.database.handle;
    const row = await this.repository.find(handle, serial);
    if (!row) throw notFound('unit');
    const { runs } = await this.runs.ofUnit(serial);
    return {
      ...itemDto(row),
      place: row.place,
      batchSize: row.batchSize,
      scrappedAt: row.scrappedAt?.toISOString() ?? null,
      scrapReason: row.scrapReason,
      page: `/u/${row.pageToken}`,
      steps: (await this.repository.steps(handle, row.id)).map(({ doneAt, ...step }) => ({
        ...step,
        doneAt: doneAt?.toISOString() ?? null,
      })),
      asBuilt: (await this.repository.asBuilt(handle, row.id)).map(({ fittedAt, ...part }) => ({
        ...part,
        fittedAt: fittedAt.toISOString(),
      })),
      runs,
      faults: await this.faults.ofUnit(row.id),
      rework: (await this.repository.rework(handle, row.id)).map(({ doneAt, ...work }) => ({
        ...work,
        doneAt: doneAt.toISOString(),
      })),
    };
  }

  /** The page behind the code on the label. @throws AppError `not_found` */
  async publicPage(token: string): Promise<PublicUnitDto> {
    const handle = this.database.handle;
    const row = /^[\w-]{22,64}$/.test(token) ? await this.repository.findByToken(handle, token) : undefined;
    if (!row) throw notFound('unit');
    const shop = await this.shop.get(handle);
    const { year, week } = readSerialNumber(row.serial);
    const last = lastRun((await this.runs.ofUnit(row.serial)).runs);
    const leftAt = await this.repository.leftAt(handle, row.id);
    return {
      serial: row.serial,
      name: row.partName,
      shop: shop.name,
      builtYear: year,
      builtWeek: week,
      revision: row.revision,
      batchSize: row.batchSize,
      sound: row.sound,
      measuredOn: last?.measuredAt ? this.clock.dayOf(new Date(last.measuredAt)) : null,
      readings: (last?.readings ?? [])
        .filter(({ replaced }) => !replaced)
        .map(({ name, reading, answer, unit, lowerLimit, upperLimit, verdict }) => ({
          name,
          reading,
          answer,
          unit,
          lowerLimit,
          upperLimit,
          within: verdict === 'within',
        })),
      warrantyUntil: leftAt ? warrantyUntil(this.clock.dayOf(leftAt), shop.warranty_months) : null,
      cautions: await this.repository.cautions(handle, row.part),
    };
  }

  /** The label of a unit, with the code that opens its page. @throws AppError `not_found` */
  async label(serial: string): Promise<Buffer> {
    const row = await this.repository.find(this.database.handle, serial);
    if (!row) throw notFound('unit');
    return this.draw([row]);
  }

  /** The labels of a whole batch, one after the other. @throws AppError `not_found` */
  async labelsOfBatch(batch: string): Promise<Buffer> {
    const rows = await this.repository.ofBatch(this.database.handle, batch);
    if (rows.length === 0) throw notFound('unit');
    return this.draw(rows);
  }

  private async draw(rows: readonly UnitItemRow[]): Promise<Buffer> {
    const labels = rows.map((row) =>
      unitLabel({ serial: row.serial, name: row.partName, address: `${this.config.baseUrl}/u/${row.pageToken}` }),
    );
    return drawLabels(`Labels, ${rows[0]?.batch ?? ''}`, labels, unitLabelSize, this.clock.now());
  }
}

function itemDto(row: UnitItemRow): Plain<UnitItemDto> {
  const { id, serial, part, partName, revision, batch, state, bin, sound } = row;
  const instants = { issuedAt: row.issuedAt.toISOString(), completedAt: row.completedAt?.toISOString() ?? null };
  return { id, serial, part, partName, revision, batch, state, bin, sound, ...instants };
}

/** The complete run that was measured last. */
function lastRun(runs: readonly TestRunDto[]): TestRunDto | undefined {
  return runs
    .filter(({ measuredAt }) => measuredAt !== null)
    .toSorted((one, other) => (one.measuredAt ?? '').localeCompare(other.measuredAt ?? '') || one.run - other.run)
    .at(-1);
}

function warrantyUntil(day: string, months: number): string | null {
  return DateTime.fromISO(day, { zone: 'utc' }).plus({ months }).toISODate();
}
