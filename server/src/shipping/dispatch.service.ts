import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import { DocumentsService, type RecordedDocument } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import type { Order } from '../orders/orders.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile } from '../platform/errors/app-error.js';
import { Jobs } from '../platform/jobs/jobs.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService, valueByComponent } from '../stock/stock-ledger.service.js';
import { PackingService } from './packing.service.js';
import { untested } from './parcel-lithium.js';
import { ParcelLithiumService } from './parcel-lithium.service.js';
import type { DispatchInput } from './parcel.dto.js';
import { ParcelsRepository, type PackedItemRow, type ParcelRow } from './parcels.repository.js';

/**
 * Sends a packed parcel off. An order leaves in one parcel: its whole prepayment becomes revenue with it, and what left
 * becomes cost of sales, in the same transaction as the moves.
 */
@Injectable()
export class DispatchService {
  constructor(
    private readonly clock: Clock,
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly jobs: Jobs,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly ledger: StockLedgerService,
    private readonly reservations: ReservationsService,
    private readonly packing: PackingService,
    private readonly lithium: ParcelLithiumService,
    private readonly parcels: ParcelsRepository,
  ) {}

  /** @throws AppError `wrong_state` when it is not packed or a payment is in doubt, `rule_broken` by the lithium rules */
  async dispatch(parcelNumber: string, input: DispatchInput, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { order, parcel } = await this.packing.lock(trx, parcelNumber);
      if (parcel.status !== 'packed') throw new AppError('wrong_state', `${parcel.number} is not packed, or has left.`);
      if (parcel.version !== input.version) throw changedMeanwhile({ version: parcel.version });
      await this.refuseDoubtful(trx, order);
      await this.refuseByLithium(trx, parcel);
      const items = await this.parcels.items(trx, parcel.id);
      const document = await this.documents.record(trx, {
        kind: 'shipment',
        number: parcel.number,
        recordedBy: person.id,
        note: order.number,
      });
      const cost = await this.moveOut(trx, document, items);
      await this.meetDemands(trx, order, parcel, items);
      await this.journal.post(trx, {
        document,
        event: 'dispatched',
        narrative: `${order.number} left in ${parcel.number}`,
        amounts: {
          goods: minorAmount(order.net_minor - order.delivery_net_minor),
          delivery: minorAmount(order.delivery_net_minor),
          cost_materials: cost.materials,
          cost_units: cost.units,
        },
      });
      await this.finish(trx, parcel, input, person, document);
    });
  }

  private async refuseDoubtful(trx: Transaction<DB>, order: Order): Promise<void> {
    const standing = await this.parcels.standing(trx, order.id);
    if (standing.cancelled || !standing.paid) {
      throw new AppError('wrong_state', `{order:${order.number}} is not paid, or was cancelled.`);
    }
    if (standing.review !== null) {
      throw new AppError(
        'wrong_state',
        `The payment of {order:${order.number}} waits for the owner: ${standing.review}`,
      );
    }
  }

  private async refuseByLithium(trx: Transaction<DB>, parcel: ParcelRow): Promise<void> {
    const { decision, rows, kept } = await this.lithium.decide(trx, parcel);
    const [without] = untested(rows);
    if (without !== undefined) {
      throw new AppError(
        'rule_broken',
        `The pack {part:${without}} has not passed a transport test of its own design: it is never shipped.`,
      );
    }
    if (decision.mayLeave) return;
    if (decision.answer === 'ask' && kept.carrierAnswer) return;
    throw new AppError(
      'rule_broken',
      decision.answer === 'ask'
        ? 'The rules for lithium give no certain answer. Fill in what is missing; if it still asks, ask your carrier, and let the owner write the answer down.'
        : 'By the rules for lithium this parcel must not leave as it stands.',
    );
  }

  private async moveOut(trx: Transaction<DB>, document: RecordedDocument, items: readonly PackedItemRow[]) {
    const moves = await this.ledger.post(
      trx,
      document,
      items.map(({ partId, lotId, binId, quantity }) => ({
        direction: 'out',
        partId,
        lotId,
        binId,
        quantity: decimal(quantity),
        reason: 'dispatch',
      })),
    );
    return valueByComponent(moves);
  }

  private async meetDemands(
    trx: Transaction<DB>,
    order: Order,
    parcel: ParcelRow,
    items: readonly PackedItemRow[],
  ): Promise<void> {
    const needs = await this.parcels.needs(trx, order.id, parcel.id);
    for (const need of needs) {
      if (items.some(({ needId }) => needId === need.id)) {
        await this.reservations.take(trx, need.demandId, decimal(need.packed));
      }
    }
    // A claim that was never needed, because something else was free, ends with its order.
    await this.reservations.release(
      trx,
      needs.map(({ demandId }) => demandId),
      'taken',
    );
  }

  private async finish(
    trx: Transaction<DB>,
    parcel: ParcelRow,
    input: DispatchInput,
    person: SignedInUser,
    document: RecordedDocument,
  ): Promise<void> {
    const { carrier, trackingCode } = input;
    await this.parcels.advance(trx, parcel.id, 'packed', {
      status: 'shipped',
      shipped_at: this.clock.now(),
      shipped_by: person.id,
      carrier,
      tracking_code: trackingCode,
      document_id: document.id,
    });
    const subject = { subjectKind: 'shipment', subjectId: parcel.id, subjectCode: parcel.number };
    await this.audit.record(trx, {
      actor: person,
      action: 'parcel.shipped',
      ...subject,
      after: { carrier, trackingCode },
    });
    await this.jobs.add(trx, 'parcel_shipped_mail', { parcelId: parcel.id });
  }
}
