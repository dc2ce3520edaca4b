import { Injectable } from '@nestjs/common';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { OrdersService, type Order } from '../orders/orders.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import { drawPaper } from '../platform/pdf/paper.js';
import { ShopService } from '../settings/shop.service.js';
import { refusalOf } from './find-packable.js';
import { packingSlip } from './packing-slip.js';
import { PackingLookupRepository, type PackableRow } from './packing-lookup.repository.js';
import { lithiumDto } from './parcel-lithium.js';
import { ParcelLithiumService } from './parcel-lithium.service.js';
import type { ParcelDto, ParcelNeedDto, ParcelPageDto, ParcelState, ParcelsQuery } from './parcel.dto.js';
import { ParcelsRepository, type PackedItemRow, type ParcelNeedRow, type ParcelRow } from './parcels.repository.js';

const cautions: readonly string[] = [
  'The tip burns skin at once and stays hot after switching off.',
  'Solder with flux fumes: work where air is drawn away.',
  'Lithium cells: never crush, short or charge unattended.',
];

/** Parcels as people see them. Nothing here shows a price. */
@Injectable()
export class ParcelsService {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly orders: OrdersService,
    private readonly shop: ShopService,
    private readonly lithium: ParcelLithiumService,
    private readonly lookup: PackingLookupRepository,
    private readonly parcels: ParcelsRepository,
  ) {}

  async list(query: ParcelsQuery): Promise<ParcelPageDto> {
    const { items, total } = await this.parcels.findPage(this.database.handle, query);
    return {
      total,
      items: items.map(({ id: _id, openedAt, shippedAt, ...row }) => ({
        ...row,
        state: row.state as ParcelState,
        openedAt: openedAt.toISOString(),
        shippedAt: shippedAt?.toISOString() ?? null,
      })),
    };
  }

  /** @throws AppError `not_found` */
  async get(number: string): Promise<ParcelDto> {
    const handle = this.database.handle;
    const parcel = await this.parcels.find(handle, number);
    if (!parcel) throw notFound('parcel');
    const order = await this.orders.get(handle, parcel.order_id);
    const needs = await this.parcels.needs(handle, order.id, parcel.id);
    const partIds = parcel.status === 'packing' ? needs.map(({ partId }) => partId) : [];
    const lying = await this.lookup.lying(handle, partIds, this.clock.today());
    const { decision, kept, rows } = await this.lithium.decide(handle, parcel);
    return {
      ...rowOf(parcel, order),
      version: parcel.version,
      address: addressOf(order),
      weightG: parcel.weight_g,
      needs: needs.map((need) => needDto(need, lying)),
      items: (await this.parcels.items(handle, parcel.id)).map(itemDto),
      lithium: lithiumDto(decision, kept, rows),
      cautions: needs.some(({ form }) => form !== 'spare') ? [...cautions] : [],
    };
  }

  /** @throws AppError `not_found` */
  async slip(number: string): Promise<Buffer> {
    const parcel = await this.get(number);
    return drawPaper(packingSlip(parcel, await this.shop.get(this.database.handle), this.clock.now()));
  }
}

function rowOf(parcel: ParcelRow, order: Order) {
  return {
    number: parcel.number,
    order: order.number,
    state: parcel.status as ParcelState,
    recipient: order.recipient,
    country: order.country_code,
    promisedOn: order.promised_on,
    openedAt: parcel.opened_at.toISOString(),
    shippedAt: parcel.shipped_at?.toISOString() ?? null,
    carrier: parcel.carrier,
    trackingCode: parcel.tracking_code,
  };
}

function addressOf(order: Order): string[] {
  const place = `${order.postcode} ${order.city}`;
  const lines = [order.company, order.recipient, order.address_line, order.address_line_2, place, order.country_code];
  return lines.filter((line) => line !== null);
}

function needDto(need: ParcelNeedRow, lying: readonly PackableRow[]): ParcelNeedDto {
  return {
    id: need.id,
    title: need.title,
    bag: need.bag,
    part: need.part,
    partName: need.partName,
    measure: need.measure,
    traced: need.traced,
    quantity: new Decimal(need.quantity).toFixed(),
    packed: new Decimal(need.packed).toFixed(),
    places: lying
      .filter((row) => row.partId === need.partId && refusalOf(row) === undefined)
      .slice(0, 8)
      .map(({ bin, lot, quantity }) => ({ bin, lot, quantity: new Decimal(quantity).toFixed() })),
  };
}

function itemDto(item: PackedItemRow) {
  const { id, needId, part, lot, bin, serial } = item;
  const quantity = new Decimal(item.quantity).toFixed();
  return { id, needId, part, lot, bin, serial, quantity, packedAt: item.packedAt.toISOString() };
}
