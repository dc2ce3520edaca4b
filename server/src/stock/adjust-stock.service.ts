import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { currencyCode, type CurrencyCode } from '@emberlot/shared/money/currency';
import { lineAmount } from '@emberlot/shared/money/line-amount';
import { negateMinor } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import { DocumentsService, type RecordedDocument } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Audit } from '../platform/audit/audit.js';
import { seesMoney } from '../platform/auth/sees-money.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, fieldFault } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { ShopService } from '../settings/shop.service.js';
import type { AdjustmentInputDto, AdjustmentReason } from './move-stock.dto.js';
import { StockLedgerService, valueByComponent } from './stock-ledger.service.js';
import { fault, quantitiesOf, StockLines, type ResolvedLine } from './stock-lines.service.js';
import type { NewMove, PostedMove } from './stock-move.js';
import { placeOf, refuseShortages } from './transfer-stock.service.js';

/** The shelf is found to differ from its record: moves that make the record true again, and the entry for their value. */
@Injectable()
export class AdjustStockService {
  constructor(
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly shop: ShopService,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly ledger: StockLedgerService,
    private readonly stockLines: StockLines,
  ) {}

  /**
   * @returns the number of the adjustment
   * @throws AppError `rule_broken` when everything counted agrees with the record
   */
  async adjust(input: AdjustmentInputDto, person: SignedInUser): Promise<string> {
    refuseCosts(input, person);
    return this.transactions.run(async (trx) => {
      const lines = await this.stockLines.resolve(trx, input.lines);
      const moves = await this.moves(trx, input, lines);
      if (moves.length === 0) {
        throw new AppError('rule_broken', 'What was counted agrees with the record: there is nothing to adjust.');
      }
      const document = await this.documents.record(trx, {
        kind: 'adjustment',
        recordedBy: person.id,
        note: input.note,
      });
      const posted = await this.ledger.post(trx, document, moves);
      await this.book(trx, document, input.reason, posted);
      await this.audit.record(trx, {
        actor: person,
        action: 'stock.adjusted',
        subjectKind: 'document',
        subjectId: document.id,
        subjectCode: document.number,
        after: { reason: input.reason, note: input.note, lines: input.lines },
      });
      return document.number;
    });
  }

  private async moves(
    trx: Transaction<DB>,
    input: AdjustmentInputDto,
    lines: readonly ResolvedLine[],
  ): Promise<readonly NewMove[]> {
    const counted = input.reason === 'counted';
    const parts = lines.map(({ part }) => part);
    const quantities = quantitiesOf(input.lines, parts, counted);
    refuseUnitsFound(input.reason, lines);
    const balanceOf = await this.stockLines.balances(trx, lines.map(placeOf));
    if (input.reason === 'lost' || input.reason === 'damaged') refuseShortages(lines, quantities, balanceOf);
    if (counted) refuseTwice(lines);
    const currency = currencyCode((await this.shop.get(trx)).currency);
    const averages = await this.ledger.averages(
      trx,
      parts.map(({ id }) => id),
    );
    return lines.flatMap((line, index): readonly NewMove[] => {
      const typed = quantities[index] as Decimal;
      const change = signedChange(input.reason, typed, counted ? balanceOf(placeOf(line)) : new Decimal(0));
      if (change.isZero()) return [];
      const move = { partId: line.part.id, ...placeOf(line), quantity: change.abs(), reason: input.reason };
      if (change.isNegative()) return [{ ...move, direction: 'out' }];
      const price = input.lines[index]?.unitCost ?? averages.get(line.part.id)?.toFixed() ?? line.lot.unitCost ?? '0';
      return [{ ...move, direction: 'in', value: valueOf(change, price, currency) }];
    });
  }

  private async book(
    trx: Transaction<DB>,
    document: RecordedDocument,
    reason: AdjustmentReason,
    posted: readonly PostedMove[],
  ): Promise<void> {
    const narrative = `Adjustment ${document.number}: ${reason}`;
    if (reason === 'damaged') {
      await this.journal.post(trx, { document, event: 'stock_scrapped', narrative, amounts: valueByComponent(posted) });
      return;
    }
    const found = valueByComponent(posted.filter(({ quantity }) => quantity.greaterThan(0)));
    const missing = valueByComponent(posted.filter(({ quantity }) => quantity.lessThan(0)));
    const event = 'stock_adjusted';
    const sourceKey = `${document.kind}:${document.number}:${event}`;
    await this.journal.post(trx, { document, event, sourceKey: `${sourceKey}:found`, narrative, amounts: found });
    await this.journal.post(trx, {
      document,
      event,
      sourceKey: `${sourceKey}:missing`,
      narrative,
      amounts: { materials: negateMinor(missing.materials), units: negateMinor(missing.units) },
    });
  }
}

function valueOf(quantity: Decimal, price: string, currency: CurrencyCode) {
  return lineAmount({ quantity, price }, currency);
}

function signedChange(reason: AdjustmentReason, typed: Decimal, held: Decimal): Decimal {
  if (reason === 'counted') return typed.minus(held);
  return reason === 'found' ? typed : typed.negated();
}

function refuseCosts(input: AdjustmentInputDto, person: SignedInUser): void {
  const index = input.lines.findIndex(({ unitCost }) => unitCost !== undefined && unitCost !== null);
  if (index < 0) return;
  const pointer = `/lines/${index}/unitCost`;
  if (!seesMoney(person)) throw fieldFault(pointer, 'not_allowed', 'Leave the cost to the owner.');
  if (input.reason === 'found' || input.reason === 'counted') return;
  throw fieldFault(pointer, 'does_not_fit', 'What leaves the shelf leaves at its average cost: give no cost here.');
}

/** A unit comes onto the shelf by being finished or returned; one that turns up again is an adjustment to reverse. */
function refuseUnitsFound(reason: AdjustmentReason, lines: readonly ResolvedLine[]): void {
  if (reason === 'lost' || reason === 'damaged') return;
  const faults = lines.flatMap(({ part }, index) =>
    part.traced === 'single'
      ? [
          fault(
            `/lines/${index}/part`,
            `${part.code} is followed one by one. Reverse the adjustment by which the unit left.`,
          ),
        ]
      : [],
  );
  if (faults.length > 0) throw inputRefused(faults);
}

function refuseTwice(lines: readonly ResolvedLine[]): void {
  const keys = lines.map((line) => `${line.lot.id}/${line.bin.id}`);
  const faults = keys.flatMap((key, index) =>
    keys.indexOf(key) < index ? [fault(`/lines/${index}/part`, 'This is counted twice on the same sheet.')] : [],
  );
  if (faults.length > 0) throw inputRefused(faults);
}
