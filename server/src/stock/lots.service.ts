import { Injectable } from '@nestjs/common';
import { decimalText } from '@emberlot/shared/measure/decimal';
import { addDays, isoDay } from '@emberlot/shared/plan/iso-day';
import type { Plain } from '../platform/api/plain.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import type { Page } from '../platform/paging/page.js';
import type { LotDto, LotItemDto, LotsQuery, LotStatus } from './lot.dto.js';
import { LotsRepository, type LotRecord } from './lots.repository.js';
import { MovesService } from './moves.service.js';

/** A lot is shown as expiring this many days ahead. */
export const expiringWithinDays = 30;

@Injectable()
export class LotsService {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly lots: LotsRepository,
    private readonly moves: MovesService,
  ) {}

  async list(query: LotsQuery): Promise<Page<LotItemDto>> {
    const today = this.clock.today();
    const page = await this.lots.findPage(this.database.handle, query, addDays(isoDay(today), expiringWithinDays));
    return { items: page.items.map((row) => itemDto(row, today)), total: page.total };
  }

  /** @throws AppError `not_found` */
  async get(code: string, person: SignedInUser): Promise<LotDto> {
    const handle = this.database.handle;
    const row = await this.lots.findByCode(handle, code);
    if (!row) throw notFound('lot');
    const currency = await this.moves.currencyFor(person);
    const changes = await this.lots.statusChangesOf(handle, row.id);
    const cost =
      currency !== undefined && row.unitCost !== null ? { unitCost: decimalText(row.unitCost), currency } : {};
    return {
      ...itemDto(row, this.clock.today()),
      version: row.version,
      origin: row.origin,
      originKind: row.originKind,
      note: row.note,
      places: (await this.lots.placesOf(handle, row.id)).map(withPlainQuantity),
      moves: await this.moves.latest({ lotId: row.id }, person),
      statusChanges: changes.map((change) => ({ ...change, occurredAt: change.occurredAt.toISOString() })),
      batches: (await this.lots.batchesOf(handle, row.id)).map(withPlainQuantity),
      ...cost,
    };
  }
}

function withPlainQuantity<Row extends { quantity: string }>(row: Row): Row {
  return { ...row, quantity: decimalText(row.quantity) };
}

function itemDto(row: LotRecord, today: string): Plain<LotItemDto> {
  return {
    code: row.code,
    part: row.part,
    name: row.name,
    measure: row.measure,
    kind: row.kind,
    status: row.status as LotStatus,
    supplier: row.supplier,
    supplierLot: row.supplierLot,
    receivedOn: row.receivedOn,
    expiresOn: row.expiresOn,
    expired: row.expiresOn !== null && row.expiresOn < today,
    quantity: decimalText(row.quantity),
    bins: row.bins,
  };
}
