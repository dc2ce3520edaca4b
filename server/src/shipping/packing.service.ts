import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import type { Transaction } from 'kysely';
import { DocumentsService } from '../journal/documents.service.js';
import { OrdersService, type Order } from '../orders/orders.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, fieldFault, notFound } from '../platform/errors/app-error.js';
import { Numbers } from '../platform/numbers/numbers.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService } from '../stock/stock-ledger.service.js';
import { missingOf, needFor, placeFor } from './find-packable.js';
import { PackingLookupRepository, type PackableRow } from './packing-lookup.repository.js';
import type { ScanInput } from './parcel.dto.js';
import { ParcelsRepository, type ParcelNeedRow, type ParcelRow } from './parcels.repository.js';
import { ScanReader, type Scanned } from './scan-reader.js';

export interface ScanDone {
  readonly sentence: string;
  readonly bin: string | null;
}

/**
 * Packs an order by scanning. Every scan is a transaction of its own, so that a server that dies in the middle loses
 * nothing that lies in the parcel. Locks: the order, its parcel, the part.
 */
@Injectable()
export class PackingService {
  constructor(
    private readonly clock: Clock,
    private readonly transactions: Transactions,
    private readonly numbers: Numbers,
    private readonly audit: Audit,
    private readonly documents: DocumentsService,
    private readonly orders: OrdersService,
    private readonly ledger: StockLedgerService,
    private readonly reservations: ReservationsService,
    private readonly reader: ScanReader,
    private readonly lookup: PackingLookupRepository,
    private readonly parcels: ParcelsRepository,
  ) {}

  /**
   * Opens a parcel, or gives the one that is open already.
   *
   * @throws AppError `wrong_state` for an order that is not paid, cancelled, shipped, or waits for a person
   */
  async open(orderId: number, person: SignedInUser): Promise<string> {
    return this.transactions.run(async (trx) => {
      const order = await this.orders.lock(trx, orderId);
      const running = await this.parcels.openOf(trx, orderId);
      if (running) return running.number;
      await this.refuseUnready(trx, order);
      const next = await this.numbers.next(trx, 'parcel', '');
      const number = `P-${String(next).padStart(4, '0')}`;
      const id = await this.parcels.insert(trx, { number, orderId, openedAt: this.clock.now(), openedBy: person.id });
      await this.record(trx, person, 'parcel.opened', { id, number }, { order: order.number });
      return number;
    });
  }

  async scan(parcelNumber: string, input: ScanInput, person: SignedInUser): Promise<ScanDone> {
    return this.transactions.run(async (trx) => {
      const { order, parcel } = await this.packing(trx, parcelNumber);
      const scanned = await this.reader.read(trx, input.code);
      if (scanned.kind !== 'bin') return this.take(trx, order, parcel, scanned, input, person);
      if (scanned.quarantine) {
        throw new AppError('rule_broken', `${scanned.code} is a quarantine bin: nothing is packed from it.`);
      }
      return { sentence: `Bin ${scanned.code}. Now scan what you take from it.`, bin: scanned.code };
    });
  }

  /** @throws AppError `not_found` when it is not in the parcel (any more) */
  async takeOut(parcelNumber: string, itemId: number, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { order, parcel } = await this.packing(trx, parcelNumber);
      const item = (await this.parcels.items(trx, parcel.id)).find(({ id }) => id === itemId);
      if (!item) throw notFound('thing in the parcel');
      await this.parcels.takeOut(trx, [itemId], this.clock.now());
      const need = (await this.parcels.needs(trx, order.id, parcel.id)).find(({ id }) => id === item.needId);
      if (need && item.unitId !== null) await this.reservations.unbindUnit(trx, need.demandId, item.lotId);
      await this.record(trx, person, 'parcel.taken_out', parcel, { what: item.serial ?? item.lot });
    });
  }

  /** @throws AppError `rule_broken` naming what is missing */
  async close(parcelNumber: string, version: number, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { order, parcel } = await this.packing(trx, parcelNumber);
      if (parcel.version !== version) throw changedMeanwhile({ version: parcel.version });
      const missing = (await this.parcels.needs(trx, order.id, parcel.id)).filter((need) =>
        missingOf(need).greaterThan(0),
      );
      if (missing.length > 0) {
        const words = missing.map((need) => `${missingOf(need).toFixed()} of {part:${need.part}}`).join(', ');
        throw new AppError('rule_broken', `Still missing: ${words}.`);
      }
      await this.documents.record(trx, { kind: 'packing', recordedBy: person.id, note: parcel.number });
      await this.parcels.advance(trx, parcel.id, 'packing', { status: 'packed', packed_at: this.clock.now() });
      await this.record(trx, person, 'parcel.packed', parcel, {});
    });
  }

  /** Opens a packed parcel again, to take something out. What was found about lithium is asked afresh. */
  async reopen(parcelNumber: string, version: number, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { parcel } = await this.lock(trx, parcelNumber);
      if (parcel.version !== version) throw changedMeanwhile({ version: parcel.version });
      const change = { status: 'packing', packed_at: null, lithium: {} };
      if (!(await this.parcels.advance(trx, parcel.id, 'packed', change))) {
        throw new AppError('wrong_state', `${parcel.number} is not packed.`);
      }
      await this.record(trx, person, 'parcel.reopened', parcel, {});
    });
  }

  /** Takes everything out of an open parcel: its order will not leave. The caller holds the order's lock. */
  async dissolve(trx: Transaction<DB>, order: Order): Promise<void> {
    const parcel = await this.parcels.openOf(trx, order.id);
    if (!parcel) return;
    const items = await this.parcels.items(trx, parcel.id);
    const needs = await this.parcels.needs(trx, order.id, parcel.id);
    for (const item of items.filter(({ unitId }) => unitId !== null)) {
      const need = needs.find(({ id }) => id === item.needId);
      if (need) await this.reservations.unbindUnit(trx, need.demandId, item.lotId);
    }
    await this.parcels.takeOut(
      trx,
      items.map(({ id }) => id),
      this.clock.now(),
    );
    await this.parcels.advance(trx, parcel.id, parcel.status, { status: 'dissolved' });
  }

  /** Takes the locks of a parcel: its order first. @throws AppError `not_found` */
  async lock(trx: Transaction<DB>, parcelNumber: string): Promise<{ order: Order; parcel: ParcelRow }> {
    const found = await this.parcels.find(trx, parcelNumber);
    if (!found) throw notFound('parcel');
    const order = await this.orders.lock(trx, found.order_id);
    return { order, parcel: await this.parcels.lock(trx, found.id) };
  }

  private async packing(trx: Transaction<DB>, parcelNumber: string): Promise<{ order: Order; parcel: ParcelRow }> {
    const { order, parcel } = await this.lock(trx, parcelNumber);
    if (parcel.status === 'packing') return { order, parcel };
    const sentences: Readonly<Record<string, string>> = {
      packed: `${parcel.number} is packed. Open it again before you change what is in it.`,
      shipped: `${parcel.number} has left.`,
      dissolved: `${parcel.number} was dissolved when its order was cancelled.`,
    };
    throw new AppError('wrong_state', sentences[parcel.status] ?? `${parcel.number} is not being packed.`);
  }

  private async refuseUnready(trx: Transaction<DB>, order: Order): Promise<void> {
    const standing = await this.parcels.standing(trx, order.id);
    if (standing.cancelled) throw new AppError('wrong_state', `{order:${order.number}} was cancelled.`);
    if (standing.shipped) throw new AppError('wrong_state', `{order:${order.number}} has left already.`);
    if (!standing.paid)
      throw new AppError('wrong_state', `{order:${order.number}} is not paid yet: nothing is packed.`);
    if (standing.review !== null) {
      throw new AppError(
        'wrong_state',
        `The payment of {order:${order.number}} waits for the owner: ${standing.review}`,
      );
    }
  }

  private async take(
    trx: Transaction<DB>,
    order: Order,
    parcel: ParcelRow,
    scanned: Exclude<Scanned, { kind: 'bin' }>,
    input: ScanInput,
    person: SignedInUser,
  ): Promise<ScanDone> {
    const needs = await this.parcels.needs(trx, order.id, parcel.id);
    const need = needFor(needs, { id: scanned.partId, code: scanned.part }, input.needId, order.number);
    await this.ledger.lock(trx, [need.partId]);
    const lying = await this.lookup.lying(trx, [need.partId], this.clock.today());
    const ofLot = scanned.lotId === null ? lying : lying.filter(({ lotId }) => lotId === scanned.lotId);
    const place = placeFor(ofLot, scanned.tag, scanned.kind === 'unit' ? undefined : input.bin);
    const quantity = this.quantityOf(need, place, scanned, input.quantity);
    await this.claim(trx, need, place, quantity);
    await this.parcels.insertItem(trx, {
      parcelId: parcel.id,
      needId: need.id,
      partId: need.partId,
      lotId: place.lotId,
      binId: place.binId,
      unitId: scanned.kind === 'unit' ? scanned.unitId : null,
      quantity: quantity.toFixed(),
      packedAt: this.clock.now(),
      packedBy: person.id,
    });
    const left = missingOf(need).minus(quantity);
    const more = left.greaterThan(0) ? ` ${left.toFixed()} more of it to come.` : '';
    const where = need.bag === null ? 'in the parcel' : `in bag ${need.bag}`;
    return {
      sentence: `${quantity.toFixed()} ${need.measure} of {part:${need.part}}, ${scanned.tag}, ${where}.${more}`,
      bin: input.bin ?? null,
    };
  }

  private quantityOf(
    need: ParcelNeedRow,
    place: PackableRow,
    scanned: Exclude<Scanned, { kind: 'bin' }>,
    asked: string | undefined,
  ): Decimal {
    if (scanned.kind === 'unit') return new Decimal(1);
    if (need.traced === 'single') {
      throw new AppError('rule_broken', `{part:${need.part}} is packed one by one: scan the label of the unit.`);
    }
    const missing = missingOf(need);
    const lies = decimal(place.quantity);
    const quantity = asked === undefined ? Decimal.min(missing, lies) : decimal(asked);
    if (quantity.greaterThan(missing)) {
      throw fieldFault('/quantity', 'quantity', `Only ${missing.toFixed()} of it are still to be packed.`);
    }
    if (quantity.greaterThan(lies)) {
      throw fieldFault('/quantity', 'quantity', `Only ${lies.toFixed()} of it lie in ${place.bin}.`);
    }
    return quantity;
  }

  /** What is packed stands on a claim of its order; where that was lost, what is free is claimed now. */
  private async claim(trx: Transaction<DB>, need: ParcelNeedRow, place: PackableRow, quantity: Decimal): Promise<void> {
    const { demandId, partId } = need;
    if (need.traced === 'single') {
      await this.reservations.bindUnit(trx, { id: demandId, partId }, place.lotId);
      return;
    }
    const claimed = await this.lookup.claimed(trx, demandId);
    const lacking = decimal(need.packed).plus(quantity).minus(claimed);
    if (lacking.lessThanOrEqualTo(0)) return;
    await this.reservations.claim(trx, [
      { demandId, partId, quantity: lacking, supply: { kind: 'shelf' }, expiresAt: null },
    ]);
  }

  private async record(
    trx: Transaction<DB>,
    actor: SignedInUser,
    action: string,
    parcel: { readonly id: number; readonly number: string },
    after: object,
  ): Promise<void> {
    const subject = { subjectKind: 'shipment', subjectId: parcel.id, subjectCode: parcel.number };
    await this.audit.record(trx, { actor, action, ...subject, after });
  }
}
