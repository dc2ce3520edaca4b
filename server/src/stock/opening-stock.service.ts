import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Decimal } from '@emberlot/shared/measure/decimal';
import type { MinorAmount } from '@emberlot/shared/money/minor-units';
import type { Kysely, Transaction } from 'kysely';
import { DocumentsService, type RecordedDocument } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { LotRegister } from './lot-register.service.js';
import { OpeningStockRepository, type CountedPlace } from './opening-stock.repository.js';
import { StockLedgerService, valueByComponent } from './stock-ledger.service.js';
import { StockLookupRepository, type StockBin, type StockLot, type StockPart } from './stock-lookup.repository.js';

export type { StockBin, StockPart } from './stock-lookup.repository.js';

/** What lies in one bin of one lot when the books begin. */
export interface OpeningLine {
  readonly partId: number;
  readonly binId: number;
  readonly quantity: Decimal;
  readonly value: MinorAmount;
  /** Which of the lots below it is of; nothing for a part followed by count. */
  readonly lot: OpeningLot | null;
}

export interface OpeningLot {
  readonly partId: number;
  /** Its own code, if it has one. */
  readonly code: string | null;
  readonly status: 'held' | 'released';
  readonly supplierId: number | null;
  readonly supplierLotCode: string | null;
  readonly receivedOn: string | null;
  readonly expiresOn: string | null;
  readonly unitCost: Decimal;
}

/** What the shelf holds before its first document: lots, moves and the entry against opening balances. */
@Injectable()
export class OpeningStockService {
  constructor(
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly ledger: StockLedgerService,
    private readonly register: LotRegister,
    private readonly lookup: StockLookupRepository,
    private readonly repository: OpeningStockRepository,
  ) {}

  async parts(handle: Kysely<DB>, codes: readonly string[]): Promise<readonly StockPart[]> {
    return this.lookup.parts(handle, codes);
  }

  async lots(handle: Kysely<DB>, codes: readonly string[]): Promise<readonly StockLot[]> {
    return this.lookup.lots(handle, codes);
  }

  async bins(handle: Kysely<DB>, codes: readonly string[]): Promise<readonly StockBin[]> {
    return this.lookup.bins(handle, codes);
  }

  /** Parts followed by count that have opening stock in a bin already: theirs cannot be told apart from a repetition. */
  async counted(handle: Kysely<DB>, partIds: readonly number[]): Promise<readonly CountedPlace[]> {
    return this.repository.counted(handle, partIds);
  }

  async addBins(trx: Transaction<DB>, codes: readonly string[]): Promise<ReadonlyMap<string, number>> {
    return this.repository.insertBins(trx, codes);
  }

  /** @returns the document that carries it all */
  async take(
    trx: Transaction<DB>,
    lines: readonly OpeningLine[],
    by: { readonly personId: number; readonly note: string },
  ): Promise<RecordedDocument> {
    const parts = [...new Set(lines.map(({ partId }) => partId))];
    await this.ledger.lock(trx, parts);
    const document = await this.documents.record(trx, { kind: 'opening', recordedBy: by.personId, note: by.note });
    const lots = [...new Set(lines.flatMap(({ lot }) => (lot ? [lot] : [])))];
    const added = await this.register.add(
      trx,
      document,
      lots.map((lot) => ({ ...lot, kind: 'delivery' as const })),
    );
    const lotIds = new Map(lots.map((lot, index) => [lot, added[index]?.id]));
    const standing = await this.register.standing(
      trx,
      lines.filter(({ lot }) => lot === null).map(({ partId }) => partId),
    );
    const posted = await this.ledger.post(
      trx,
      document,
      lines.map(({ partId, binId, quantity, value, lot }) => {
        const lotId = lot === null ? standing.get(partId) : lotIds.get(lot);
        if (lotId === undefined) throw new Error('a line of opening stock has no lot');
        return { direction: 'in' as const, reason: 'opening' as const, partId, lotId, binId, quantity, value };
      }),
    );
    await this.journal.post(trx, {
      document,
      event: 'opening_stock',
      narrative: `Opening stock ${document.number}`,
      amounts: valueByComponent(posted),
    });
    return document;
  }
}
