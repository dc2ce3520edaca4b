import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimal } from '@emberlot/shared/measure/decimal';
import { addMinor, minorAmount, subtractMinor } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import { DocumentsService, type RecordedDocument } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, notFound } from '../platform/errors/app-error.js';
import type { ReversalInputDto } from './move-stock.dto.js';
import { ReversalsRepository, type ReversibleDocument, type ReversibleMove } from './reversals.repository.js';
import { StockLedgerService, valueByComponent } from './stock-ledger.service.js';
import { StockLines } from './stock-lines.service.js';
import type { NewMove, PostedMove, StockComponent } from './stock-move.js';

const reversibleKinds = ['receipt', 'transfer', 'adjustment'];

/** Other documents are taken back where they belong: a pick at its batch, a dispatch by a return. */
export function isReversible(kind: string): boolean {
  return reversibleKinds.includes(kind);
}

/**
 * A mistake is reversed, never edited: a document that does the opposite, move by move, and the opposite entry. What came
 * leaves at the value it came with; where the average has moved on too far for that, the rest is a stock difference.
 */
@Injectable()
export class ReverseDocumentService {
  constructor(
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly ledger: StockLedgerService,
    private readonly stockLines: StockLines,
    private readonly reversals: ReversalsRepository,
  ) {}

  /** @returns the number of the reversal */
  async reverse(number: string, input: ReversalInputDto, person: SignedInUser): Promise<string> {
    return this.transactions.run(async (trx) => {
      const original = await this.original(trx, number);
      const wrong = await this.reversals.movesOf(trx, original.id);
      await this.ledger.lock(
        trx,
        wrong.map(({ partId }) => partId),
      );
      await this.refuseUsedUp(trx, original, wrong);
      const document = await this.documents.record(trx, {
        kind: 'reversal',
        recordedBy: person.id,
        note: input.reason,
        reverses: original.id,
      });
      const posted = await this.ledger.post(trx, document, opposites(original, wrong));
      if (original.kind !== 'transfer') await this.book(trx, document, original, wrong, posted);
      await this.audit.record(trx, {
        actor: person,
        action: 'stock.reversed',
        subjectKind: 'document',
        subjectId: original.id,
        subjectCode: original.number,
        after: { reversal: document.number, reason: input.reason },
      });
      return document.number;
    });
  }

  private async original(trx: Transaction<DB>, number: string): Promise<ReversibleDocument> {
    const original = await this.reversals.findByNumber(trx, number);
    if (!original) throw notFound('document');
    if (!isReversible(original.kind)) {
      throw new AppError('rule_broken', `${number} is neither a delivery nor a transfer nor an adjustment.`);
    }
    if (original.reversedBy !== null) {
      throw new AppError('wrong_state', `${number} has been reversed already, by ${original.reversedBy}.`);
    }
    return original;
  }

  /** What came must lie where it was put, all of it; else some of it is elsewhere, or in something built. */
  private async refuseUsedUp(
    trx: Transaction<DB>,
    original: ReversibleDocument,
    wrong: readonly ReversibleMove[],
  ): Promise<void> {
    const came = wrong.filter(({ quantity }) => decimal(quantity).greaterThan(0));
    const balanceOf = await this.stockLines.balances(trx, came);
    const gone = came.find((move) => decimal(move.quantity).greaterThan(balanceOf(move)));
    if (!gone) return;
    const left = balanceOf(gone).toFixed();
    const sentence = `Only ${left} of what ${original.number} put of ${gone.part}, lot ${gone.lot}, into ${gone.bin} still lie there. Bring it back first, or adjust what is wrong.`;
    throw new AppError('not_enough_stock', sentence);
  }

  /** The opposite of the entry that the wrong document posted, and what its value and the shelf's now differ by. */
  private async book(
    trx: Transaction<DB>,
    document: RecordedDocument,
    original: ReversibleDocument,
    wrong: readonly ReversibleMove[],
    posted: readonly PostedMove[],
  ): Promise<void> {
    const narrative = `${document.number} takes back ${original.number}`;
    const event = original.kind === 'receipt' ? 'goods_received' : eventOf(wrong);
    const once = sumOf(wrong);
    const now = valueSigned(posted);
    const sign = event === 'stock_scrapped' ? 1 : -1;
    const amounts = (component: StockComponent) => minorAmount(sign * once[component] + 0);
    await this.journal.post(trx, {
      document,
      event,
      narrative,
      amounts: { materials: amounts('materials'), units: amounts('units') },
    });
    await this.journal.post(trx, {
      document,
      event: 'stock_adjusted',
      sourceKey: `reversal:${document.number}:difference`,
      narrative: `${narrative}: the average has moved since`,
      amounts: {
        materials: addMinor(now.materials, once.materials),
        units: addMinor(now.units, once.units),
      },
    });
  }
}

function eventOf(wrong: readonly ReversibleMove[]): string {
  return wrong.some(({ reason }) => reason === 'damaged') ? 'stock_scrapped' : 'stock_adjusted';
}

function opposites(original: ReversibleDocument, wrong: readonly ReversibleMove[]): readonly NewMove[] {
  if (original.kind === 'transfer') return oppositeTransfers(wrong);
  return wrong.map((move): NewMove => {
    const { partId, lotId, binId } = move;
    const quantity = decimal(move.quantity);
    const back = { partId, lotId, binId, quantity: quantity.abs(), reason: 'reversal' as const, reverses: [move.id] };
    const value = minorAmount(Math.abs(move.valueMinor));
    return quantity.greaterThan(0)
      ? { ...back, direction: 'out', broughtValue: value }
      : { ...back, direction: 'in', value };
  });
}

/** A transfer stands in the ledger as pairs: what left a bin, then what came into the other. */
function oppositeTransfers(wrong: readonly ReversibleMove[]): readonly NewMove[] {
  return wrong.flatMap((left, index): readonly NewMove[] => {
    const came = wrong[index + 1];
    if (index % 2 === 1 || !came) return [];
    const { partId, lotId } = left;
    return [
      {
        direction: 'within',
        reason: 'reversal',
        partId,
        lotId,
        binId: came.binId,
        toBinId: left.binId,
        quantity: decimal(came.quantity),
        reverses: [came.id, left.id],
      },
    ];
  });
}

function sumOf(moves: readonly ReversibleMove[]): Record<StockComponent, ReturnType<typeof minorAmount>> {
  const of = (single: boolean) =>
    moves.reduce(
      (sum, move) => ((move.traced === 'single') === single ? addMinor(sum, minorAmount(move.valueMinor)) : sum),
      minorAmount(0),
    );
  return { materials: of(false), units: of(true) };
}

function valueSigned(moves: readonly PostedMove[]): Record<StockComponent, ReturnType<typeof minorAmount>> {
  const came = valueByComponent(moves.filter(({ quantity }) => quantity.greaterThan(0)));
  const left = valueByComponent(moves.filter(({ quantity }) => quantity.lessThan(0)));
  return {
    materials: subtractMinor(came.materials, left.materials),
    units: subtractMinor(came.units, left.units),
  };
}
