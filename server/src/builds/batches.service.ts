import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimalText } from '@emberlot/shared/measure/decimal';
import type { Kysely } from 'kysely';
import { BillsService } from '../bills/bills.service.js';
import type { Plain } from '../platform/api/plain.js';
import { seesMoney } from '../platform/auth/sees-money.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import { ShopService } from '../settings/shop.service.js';
import { unclaimed } from './batch-claims.service.js';
import { BatchLinesRepository, type BatchLineRow, type LinePart } from './batch-lines.repository.js';
import { BatchListsRepository, type BatchItemRow, type StripRow } from './batch-lists.repository.js';
import type {
  BatchCostDto,
  BatchDto,
  BatchesQuery,
  BatchItemDto,
  BatchLineDto,
  BatchPageDto,
  BatchPartDto,
} from './batch.dto.js';
import { BatchesRepository } from './batches.repository.js';
import { nextAct } from './next-act.js';

/** Batches as the screens show them. */
@Injectable()
export class BatchesService {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly shop: ShopService,
    private readonly bills: BillsService,
    private readonly batches: BatchesRepository,
    private readonly lists: BatchListsRepository,
    private readonly lines: BatchLinesRepository,
  ) {}

  async list(query: BatchesQuery): Promise<BatchPageDto> {
    const handle = this.database.handle;
    const page = await this.lists.page(handle, query);
    const strips = await this.lists.strips(
      handle,
      page.items.map(({ id }) => id),
    );
    return { items: page.items.map((row) => this.item(row, strips)), total: page.total };
  }

  /** @throws AppError `not_found` */
  async open(number: string, person: SignedInUser): Promise<BatchDto> {
    const handle = this.database.handle;
    const [row, batch] = [await this.lists.find(handle, number), await this.batches.find(handle, number)];
    if (!row || !batch) throw notFound('batch');
    const strip = await this.lists.strips(handle, [batch.id]);
    const revision = await this.bills.get(handle, batch.revisionId);
    const cost = seesMoney(person) ? await this.cost(handle, batch.id) : undefined;
    return {
      ...this.item(row, strip),
      version: batch.version,
      note: batch.note,
      createdAt: batch.createdAt.toISOString(),
      buildStartedAt: batch.buildStartedAt?.toISOString() ?? null,
      finishedAt: batch.finishedAt?.toISOString() ?? null,
      lines: await this.lineDtos(handle, batch.id, batch.status === 'done' || batch.status === 'withdrawn'),
      subAssemblies: (await this.lines.subAssemblies(handle, batch.id)).map(
        ({ path, required, fromShelf, ...part }) => ({
          path,
          part,
          required: decimalText(required),
          fromShelf,
        }),
      ),
      steps: await this.stepDtos(handle, batch.id),
      testPlan: revision.testPlan.map(({ id: _id, ...characteristic }) => characteristic),
      ...(cost && { cost }),
    };
  }

  private async lineDtos(handle: Kysely<DB>, batchId: number, closed: boolean): Promise<BatchLineDto[]> {
    const rows = await this.lines.lines(handle, batchId);
    const alternates = await this.lines.alternates(
      handle,
      rows.map(({ billLineId }) => billLineId),
    );
    return rows.map((row) => ({
      path: row.path,
      part: partOf(row),
      marks: row.marks,
      quantityPer: decimalText(row.quantityPer),
      required: decimalText(row.required),
      issued: decimalText(row.issued),
      claimed: decimalText(row.claimed),
      missing: closed ? '0' : decimalText(unclaimed(row)),
      alternates: alternates.filter(({ lineId }) => lineId === row.billLineId).map(partOf),
    }));
  }

  private async stepDtos(handle: Kysely<DB>, batchId: number): Promise<BatchDto['steps']> {
    const done = await this.lists.stepsDone(handle, batchId);
    return (await this.lines.steps(handle, batchId)).map(({ id, path: _path, ...step }) => ({
      ...step,
      doneOn: done.filter(({ stepId }) => stepId === id).map(({ serial }) => serial),
    }));
  }

  private async cost(handle: Kysely<DB>, batchId: number): Promise<BatchCostDto | undefined> {
    const currency = (await this.shop.find(handle))?.currency;
    if (currency === undefined) return undefined;
    const costs = await this.batches.costs(handle, batchId);
    const money = (amount: number) => ({ amount, currency });
    return {
      materialsIn: money(costs.materials_in),
      materialsOut: money(-costs.materials_out),
      labour: money(costs.labour),
      loss: money(-costs.loss),
      held: money(costs.materials_in + costs.materials_out + costs.loss),
    };
  }

  private item(row: BatchItemRow, strips: readonly StripRow[]): Plain<BatchItemDto> {
    const units = strips.filter(({ batchId }) => batchId === row.id);
    const open = row.status !== 'done' && row.status !== 'withdrawn';
    return {
      id: row.id,
      number: row.number,
      part: partOf(row),
      revision: row.revision,
      quantity: row.quantity,
      status: row.status,
      startOn: row.startOn,
      dueOn: row.dueOn,
      late: open && row.dueOn < this.clock.today(),
      finished: row.madeQuantity + units.filter(({ finished }) => finished).length,
      scrapped: units.filter(({ verdict }) => verdict === 'scrapped').length,
      linesShort: open ? row.linesShort : 0,
      next: nextAct(row, units),
      units: units.map(({ batchId: _batchId, ...unit }) => unit),
    };
  }
}

function partOf({ code, name, measure, traced }: Omit<LinePart, 'id'> | BatchLineRow): BatchPartDto {
  return { code, name, measure, traced };
}
