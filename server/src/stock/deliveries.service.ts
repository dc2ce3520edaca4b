import { Injectable } from '@nestjs/common';
import { decimalText } from '@emberlot/shared/measure/decimal';
import type { Plain } from '../platform/api/plain.js';
import { seesMoney } from '../platform/auth/sees-money.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import type { Page } from '../platform/paging/page.js';
import { ShopService } from '../settings/shop.service.js';
import { DeliveriesRepository, type DeliveryLineRow, type DeliveryRow } from './deliveries.repository.js';
import type { DeliveriesQuery, DeliveryDto, DeliveryItemDto, DeliveryLineDto } from './delivery.dto.js';

/** What has arrived, for reading. */
@Injectable()
export class DeliveriesService {
  constructor(
    private readonly database: Database,
    private readonly shop: ShopService,
    private readonly deliveries: DeliveriesRepository,
  ) {}

  async list(query: DeliveriesQuery, person: SignedInUser): Promise<Page<DeliveryItemDto>> {
    const currency = await this.currencyFor(person);
    const page = await this.deliveries.findPage(this.database.handle, query);
    return { items: page.items.map((row) => itemDto(row, currency)), total: page.total };
  }

  /** @throws AppError `not_found` */
  async get(number: string, person: SignedInUser): Promise<DeliveryDto> {
    const row = await this.deliveries.findByNumber(this.database.handle, number);
    if (!row) throw notFound('delivery');
    const currency = await this.currencyFor(person);
    const lines = await this.deliveries.linesOf(this.database.handle, row.documentId);
    return {
      ...itemDto(row, currency),
      note: row.note,
      occurredAt: row.occurredAt.toISOString(),
      lines: lines.map((line) => lineDto(line, currency)),
    };
  }

  /** Nothing for those who are shown no money. */
  private async currencyFor(person: SignedInUser): Promise<string | undefined> {
    if (!seesMoney(person)) return undefined;
    return (await this.shop.find(this.database.handle))?.currency;
  }
}

function itemDto(row: DeliveryRow, currency: string | undefined): Plain<DeliveryItemDto> {
  const { number, receivedOn, supplier, supplierName, deliveryNote, lineCount, recordedBy, reversedBy } = row;
  const shown = { number, receivedOn, supplier, supplierName, deliveryNote, lineCount, recordedBy, reversedBy };
  return currency === undefined ? shown : { ...shown, value: { amount: row.valueMinor, currency } };
}

function lineDto(row: DeliveryLineRow, currency: string | undefined): DeliveryLineDto {
  const { valueMinor, unitCost, quantity, ...rest } = row;
  const shown = { ...rest, quantity: decimalText(quantity) };
  return currency === undefined
    ? shown
    : { ...shown, unitCost: decimalText(unitCost), value: { amount: valueMinor, currency } };
}
