import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { unitCost } from '@emberlot/shared/costing/unit-cost';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import { apportion } from '@emberlot/shared/money/apportion';
import { currencyCode, currencyExponent } from '@emberlot/shared/money/currency';
import { addMinor, minorAmount, negateMinor, type MinorAmount } from '@emberlot/shared/money/minor-units';
import { costPool, issueFromPool } from '@emberlot/shared/money/movement-value';
import type { Transaction } from 'kysely';
import { DocumentsService, type RecordedDocument } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, fieldFault } from '../platform/errors/app-error.js';
import { ShopService } from '../settings/shop.service.js';
import { LotRegister } from '../stock/lot-register.service.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService } from '../stock/stock-ledger.service.js';
import { StockLines } from '../stock/stock-lines.service.js';
import { FaultRegister } from '../testing/fault-register.service.js';
import { UnitRegister, type Unit } from '../units/unit-register.service.js';
import { AsBuiltRecord } from './as-built-record.service.js';
import { BatchCloser } from './batch-closer.service.js';
import { lockBatch, wrongState } from './batch-record.js';
import { BatchesRepository, type BatchRow } from './batches.repository.js';
import { BuildingRepository } from './building.repository.js';
import type { CompletionDto, FinishedUnitDto, MadePiecesDto, ScrapDto } from './picking.dto.js';

/** Units and made pieces come onto the shelf at their own cost, or are scrapped. */
@Injectable()
export class FinishUnitService {
  constructor(
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly shop: ShopService,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly ledger: StockLedgerService,
    private readonly register: LotRegister,
    private readonly stockLines: StockLines,
    private readonly reservations: ReservationsService,
    private readonly units: UnitRegister,
    private readonly faults: FaultRegister,
    private readonly asBuilt: AsBuiltRecord,
    private readonly closer: BatchCloser,
    private readonly batches: BatchesRepository,
    private readonly building: BuildingRepository,
  ) {}

  /** Puts a sound unit on the shelf, as a lot of one at its own cost. */
  async complete(serial: string, input: CompletionDto, person: SignedInUser): Promise<FinishedUnitDto> {
    return this.transactions.run(async (trx) => {
      const { batch, unit } = await this.lock(trx, serial);
      await this.refuseUnsound(trx, unit);
      await this.ledger.lock(trx, [batch.partId]);
      const bin = await this.bin(trx, input.bin);
      await this.asBuilt.write(trx, batch, unit, person);
      const minutes = decimal(await this.building.plannedMinutes(trx, batch.id)).plus(
        await this.building.reworkMinutes(trx, unit.id),
      );
      const cost = await this.cost(trx, await this.shareOfUnit(trx, batch), minutes);
      const document = await this.documents.record(trx, { kind: 'completion', recordedBy: person.id });
      const [lot] = await this.register.add(trx, document, [
        {
          partId: batch.partId,
          kind: 'unit',
          status: 'released',
          code: serial,
          receivedOn: this.clock.today(),
          unitCost: await this.major(trx, cost.total),
        },
      ]);
      if (!lot) throw new Error('the unit was given no lot');
      await this.ledger.post(trx, document, [
        {
          direction: 'in',
          reason: 'completion',
          partId: batch.partId,
          lotId: lot.id,
          binId: bin.id,
          quantity: new Decimal(1),
          value: cost.total,
        },
      ]);
      await this.book(trx, batch, document, 'unit_completed', cost);
      await this.units.complete(trx, unit.id, lot.id);
      await this.reservations.moveToShelf(trx, batch.id, batch.partId, new Decimal(1));
      await this.closer.closeWhenSettled(trx, batch, document, person);
      await this.audit.record(trx, {
        actor: person,
        action: 'unit.completed',
        subjectKind: 'unit',
        subjectId: unit.id,
        subjectCode: serial,
        after: { document: document.number, bin: bin.code },
      });
      return { serial, lot: lot.code, document: document.number };
    });
  }

  /** Gives a unit up. Its share of the batch's materials goes to the units that become good. */
  async scrap(serial: string, input: ScrapDto, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const { batch, unit } = await this.lock(trx, serial);
      await this.faults.closeAllAsScrapped(trx, unit.id, input.reason, person);
      await this.units.scrap(trx, unit.id, input.reason);
      const document = await this.documents.record(trx, { kind: 'scrap', recordedBy: person.id, note: input.reason });
      await this.closer.closeWhenSettled(trx, batch, document, person);
      await this.audit.record(trx, {
        actor: person,
        action: 'unit.scrapped',
        subjectKind: 'unit',
        subjectId: unit.id,
        subjectCode: serial,
        after: { reason: input.reason, document: document.number },
      });
    });
  }

  /** Puts pieces of a part that is not followed one by one on the shelf. @returns the number of the document */
  async completePieces(number: string, input: MadePiecesDto, person: SignedInUser): Promise<string> {
    return this.transactions.run(async (trx) => {
      const batch = await lockBatch(this.batches, trx, number, ['in_build']);
      const part = await this.building.part(trx, batch.partId);
      if (part.traced === 'single') {
        throw new AppError('rule_broken', `${part.code} is finished unit by unit, each by its own measurements.`);
      }
      const left = batch.quantity - batch.madeQuantity;
      if (input.quantity > left) {
        throw fieldFault('/quantity', 'too_much', `Only ${left} of batch ${number} are still to come.`);
      }
      await this.ledger.lock(trx, [batch.partId]);
      const bin = await this.bin(trx, input.bin);
      const quantity = new Decimal(input.quantity);
      await this.asBuilt.refuseUnpicked(trx, batch, batch.madeQuantity + input.quantity);
      const held = await this.closer.held(trx, batch.id);
      const materials = input.last
        ? held
        : negateMinor(issueFromPool(costPool(new Decimal(left), held), quantity).value);
      const minutes = decimal(await this.building.plannedMinutes(trx, batch.id)).times(quantity);
      const cost = await this.cost(trx, materials, minutes);
      const document = await this.documents.record(trx, { kind: 'completion', recordedBy: person.id });
      const lotId = await this.lotOfPieces(
        trx,
        batch,
        document,
        part.traced,
        (await this.major(trx, cost.total)).div(quantity),
      );
      await this.ledger.post(trx, document, [
        {
          direction: 'in',
          reason: 'completion',
          partId: batch.partId,
          lotId,
          binId: bin.id,
          quantity,
          value: cost.total,
        },
      ]);
      await this.book(trx, batch, document, 'made_part_completed', cost);
      await this.batches.addMade(trx, batch.id, input.quantity);
      await this.reservations.moveToShelf(trx, batch.id, batch.partId, quantity);
      if (input.last || input.quantity === left) await this.closer.close(trx, batch, document, person);
      await this.audit.record(trx, {
        actor: person,
        action: 'batch.pieces_made',
        subjectKind: 'batch',
        subjectId: batch.id,
        subjectCode: number,
        after: { quantity: input.quantity, bin: bin.code, last: input.last, document: document.number },
      });
      return document.number;
    });
  }

  private async lotOfPieces(
    trx: Transaction<DB>,
    batch: BatchRow,
    document: RecordedDocument,
    traced: string,
    each: Decimal,
  ): Promise<number> {
    const { partId } = batch;
    if (traced === 'count') {
      const standing = (await this.register.standing(trx, [partId])).get(partId);
      if (standing === undefined) throw new Error('a part followed by count has no standing lot');
      return standing;
    }
    const [lot] = await this.register.add(trx, document, [
      {
        partId,
        kind: 'made',
        status: 'released',
        receivedOn: this.clock.today(),
        unitCost: each.toDecimalPlaces(6),
        note: `Batch ${batch.number}`,
      },
    ]);
    if (!lot) throw new Error('the pieces were given no lot');
    return lot.id;
  }

  private async lock(trx: Transaction<DB>, serial: string): Promise<{ batch: BatchRow; unit: Unit }> {
    const known = await this.units.get(trx, serial);
    const batch = await this.batches.lockById(trx, known.batchId);
    const unit = await this.units.lock(trx, serial);
    if (unit.completedAt !== null) throw new AppError('wrong_state', `${serial} is finished already.`);
    if (unit.scrappedAt !== null) throw new AppError('wrong_state', `${serial} is scrapped.`);
    if (!batch || batch.status !== 'in_build') throw wrongState(batch ?? { number: serial, status: 'done' });
    return { batch, unit };
  }

  private async refuseUnsound(trx: Transaction<DB>, unit: Unit): Promise<void> {
    const fault = await this.faults.openOf(trx, unit.id);
    if (fault) {
      throw new AppError(
        'rule_broken',
        `${unit.serial} has an open fault, ${fault.number}. See to it, then measure again.`,
      );
    }
    if (!(await this.units.isSound(trx, unit.id))) {
      throw new AppError('rule_broken', `${unit.serial} has not passed its measurements. It cannot be finished.`);
    }
    const [step] = await this.building.stepsLeft(trx, unit.id);
    if (step !== undefined) throw new AppError('rule_broken', `${unit.serial} still needs: ${step}.`);
  }

  private async bin(trx: Transaction<DB>, code: string) {
    const [bin] = await this.stockLines.bins(trx, [{ code, pointer: '/bin' }]);
    if (!bin || bin.quarantine) {
      throw fieldFault('/bin', 'does_not_fit', `${code} is a quarantine bin. Finished goods need another.`);
    }
    return bin;
  }

  /** Equal shares over the units that are still to come; the last takes what is left. */
  private async shareOfUnit(trx: Transaction<DB>, batch: BatchRow): Promise<MinorAmount> {
    const open = await this.closer.unitsOpen(trx, batch.id);
    const shares = apportion(
      await this.closer.held(trx, batch.id),
      Array.from({ length: open }, () => 1),
    );
    return shares[0] ?? minorAmount(0);
  }

  private async cost(trx: Transaction<DB>, materials: MinorAmount, minutes: Decimal) {
    const shop = await this.shop.get(trx);
    const currency = currencyCode(shop.currency);
    const labourPerHour = new Decimal(shop.labour_rate_minor).div(new Decimal(10).pow(currencyExponent(currency)));
    const cost = unitCost({ materials: [materials], minutes }, { currency, labourPerHour, overheadPerHour: 0 });
    return { materials: cost.materials, labour: cost.labour, total: addMinor(cost.materials, cost.labour) };
  }

  private async major(trx: Transaction<DB>, amount: MinorAmount): Promise<Decimal> {
    return new Decimal(amount).div(new Decimal(10).pow(await this.shop.exponent(trx)));
  }

  private async book(
    trx: Transaction<DB>,
    batch: BatchRow,
    document: RecordedDocument,
    event: 'unit_completed' | 'made_part_completed',
    cost: { readonly materials: MinorAmount; readonly labour: MinorAmount },
  ): Promise<void> {
    await this.batches.addCosts(trx, batch.id, document.id, document.occurredAt, [
      { component: 'materials_out', value: negateMinor(cost.materials) },
      { component: 'labour', value: cost.labour },
    ]);
    await this.journal.post(trx, {
      document,
      event,
      narrative: `Finished in batch ${batch.number}`,
      amounts: { materials: cost.materials, labour: cost.labour },
    });
  }
}
