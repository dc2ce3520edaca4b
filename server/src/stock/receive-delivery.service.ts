import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { currencyCode, currencyExponent, type CurrencyCode } from '@emberlot/shared/money/currency';
import { lineAmount } from '@emberlot/shared/money/line-amount';
import { minorAmount, type MinorAmount } from '@emberlot/shared/money/minor-units';
import { addDays, isoDay } from '@emberlot/shared/plan/iso-day';
import type { Transaction } from 'kysely';
import { DocumentsService, type RecordedDocument } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { fieldFault, type FieldFault } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { ShopService } from '../settings/shop.service.js';
import type { DeliveryInputDto, DeliveryLineInputDto } from './delivery.dto.js';
import { DeliveriesRepository } from './deliveries.repository.js';
import { LotRegister } from './lot-register.service.js';
import { StockLedgerService, valueByComponent } from './stock-ledger.service.js';
import { fault, quantitiesOf, StockLines } from './stock-lines.service.js';
import { StockLookupRepository, type StockBin, type StockPart } from './stock-lookup.repository.js';
import type { MoveIn } from './stock-move.js';

/** A line whose parts, bins and figures have been found. */
interface ReadyLine {
  readonly input: DeliveryLineInputDto;
  readonly part: StockPart;
  readonly bin: StockBin;
  readonly quantity: Decimal;
  readonly value: MinorAmount;
  readonly unitCost: Decimal;
}

/** Goods from a supplier come onto the shelf: a document, a lot per line, moves, and the entry for them. */
@Injectable()
export class ReceiveDeliveryService {
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
    private readonly lookup: StockLookupRepository,
    private readonly deliveries: DeliveriesRepository,
  ) {}

  /** @returns the number of the receipt */
  async receive(input: DeliveryInputDto, person: SignedInUser): Promise<string> {
    if (input.receivedOn > this.clock.today()) {
      throw fieldFault('/receivedOn', 'in_future', 'This day is still to come. Record the delivery when it is here.');
    }
    return this.transactions.run(async (trx) => {
      const supplierId = await this.lookup.supplierId(trx, input.supplier);
      if (supplierId === undefined) throw fieldFault('/supplier', 'unknown', `There is no supplier ${input.supplier}.`);
      const lines = await this.ready(trx, input.lines);
      const document = await this.documents.record(trx, {
        kind: 'receipt',
        recordedBy: person.id,
        note: input.note ?? undefined,
      });
      await this.deliveries.insert(trx, {
        documentId: document.id,
        supplierId,
        deliveryNote: input.deliveryNote ?? null,
        receivedOn: input.receivedOn,
      });
      const moves = await this.moves(trx, document, lines, { supplierId, receivedOn: input.receivedOn });
      const posted = await this.ledger.post(trx, document, moves);
      await this.journal.post(trx, {
        document,
        event: 'goods_received',
        narrative: `Delivery ${document.number} from ${input.supplier}`,
        amounts: valueByComponent(posted),
      });
      await this.audit.record(trx, {
        actor: person,
        action: 'delivery.received',
        subjectKind: 'document',
        subjectId: document.id,
        subjectCode: document.number,
        after: { supplier: input.supplier, deliveryNote: input.deliveryNote ?? null, lines: lines.length },
      });
      return document.number;
    });
  }

  private async ready(trx: Transaction<DB>, inputs: readonly DeliveryLineInputDto[]): Promise<readonly ReadyLine[]> {
    const { currency } = await this.shop.get(trx);
    const parts = await this.stockLines.parts(trx, inputs);
    const bins = await this.stockLines.bins(
      trx,
      inputs.map(({ bin }, index) => ({ code: bin, pointer: `/lines/${index}/bin` })),
    );
    const faults = inputs.flatMap((input, index) => faultsOf(input, parts[index] as StockPart, index));
    if (faults.length > 0) throw inputRefused(faults);
    const quantities = quantitiesOf(inputs, parts);
    return inputs.map((input, index) => {
      const quantity = quantities[index] as Decimal;
      const money = valueOf(input, quantity, currencyCode(currency));
      return { input, part: parts[index] as StockPart, bin: bins[index] as StockBin, quantity, ...money };
    });
  }

  private async moves(
    trx: Transaction<DB>,
    document: RecordedDocument,
    lines: readonly ReadyLine[],
    origin: { readonly supplierId: number; readonly receivedOn: string },
  ): Promise<readonly MoveIn[]> {
    const byCount = lines.filter(({ part }) => part.traced === 'count');
    const byDelivery = lines.filter(({ part }) => part.traced !== 'count');
    const standing = await this.register.standing(
      trx,
      byCount.map(({ part }) => part.id),
    );
    const lots = await this.register.add(
      trx,
      document,
      byDelivery.map(({ input, part, unitCost }) => ({
        ...origin,
        partId: part.id,
        kind: 'delivery' as const,
        status: input.held ? ('held' as const) : ('released' as const),
        supplierLotCode: input.supplierLot ?? null,
        expiresOn: input.expiresOn ?? lastDay(part, origin.receivedOn),
        unitCost,
      })),
    );
    return lines.map((line) => {
      const lotId = standing.get(line.part.id) ?? lots[byDelivery.indexOf(line)]?.id;
      if (lotId === undefined) throw new Error(`no lot was made for ${line.part.code}`);
      const { part, bin, quantity, value } = line;
      return { direction: 'in', reason: 'receipt', partId: part.id, lotId, binId: bin.id, quantity, value };
    });
  }
}

function faultsOf(input: DeliveryLineInputDto, part: StockPart, index: number): FieldFault[] {
  const at = (field: string, sentence: string) => fault(`/lines/${index}/${field}`, sentence);
  const hasPrice = input.unitPrice !== undefined && input.unitPrice !== null;
  const hasValue = input.lineValueMinor !== undefined && input.lineValueMinor !== null;
  const faults: FieldFault[] = [];
  if (hasPrice === hasValue) {
    faults.push(
      at(
        'unitPrice',
        hasPrice ? 'Give the price or the value, not both.' : 'Give the price of one, or the value of the line.',
      ),
    );
  }
  if (part.retiredOn !== null) faults.push(at('part', `${part.code} is retired. Bring it back on its page first.`));
  if (part.traced === 'single') {
    faults.push(at('part', `${part.code} is followed one by one: its units come from a batch or a return.`));
  }
  if (part.traced === 'count') {
    const why = `${part.code} is followed by count and has no lots of its own`;
    if (input.held) faults.push(at('held', `${why}: put doubtful pieces into a quarantine bin.`));
    if (input.supplierLot) faults.push(at('supplierLot', `${why}: leave this empty.`));
    if (input.expiresOn) faults.push(at('expiresOn', `${why}: leave this empty.`));
  }
  return faults;
}

function valueOf(
  input: DeliveryLineInputDto,
  quantity: Decimal,
  currency: CurrencyCode,
): { value: MinorAmount; unitCost: Decimal } {
  if (input.lineValueMinor !== undefined && input.lineValueMinor !== null) {
    const major = new Decimal(input.lineValueMinor).div(new Decimal(10).pow(currencyExponent(currency)));
    return { value: minorAmount(input.lineValueMinor), unitCost: major.div(quantity).toDecimalPlaces(6, 4) };
  }
  const price = input.unitPrice ?? '0';
  return { value: lineAmount({ quantity, price }, currency), unitCost: new Decimal(price) };
}

/** The last day on which it may be used, where the part says how long it keeps. */
function lastDay(part: StockPart, receivedOn: string): string | null {
  return part.shelfLifeDays === null ? null : addDays(isoDay(receivedOn), part.shelfLifeDays);
}
