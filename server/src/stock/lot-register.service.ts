import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Decimal } from '@emberlot/shared/measure/decimal';
import type { Transaction } from 'kysely';
import type { RecordedDocument } from '../journal/documents.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Numbers } from '../platform/numbers/numbers.js';
import { LotRegisterRepository, type LotRow } from './lot-register.repository.js';
import { StockLedgerService } from './stock-ledger.service.js';

/** A lot that comes into being; its quantity comes with the first move. */
export interface NewLot {
  readonly partId: number;
  readonly kind: 'delivery' | 'made' | 'unit';
  readonly status: 'held' | 'released';
  /** The unit's serial number, or a code it brings along; otherwise it gets the next L-number. */
  readonly code?: string | null;
  readonly supplierId?: number | null;
  readonly supplierLotCode?: string | null;
  readonly receivedOn?: string | null;
  readonly expiresOn?: string | null;
  /** What one stock unit cost, in major units of the shop's currency. */
  readonly unitCost?: Decimal | null;
  readonly note?: string | null;
}

export interface RegisteredLot {
  readonly id: number;
  readonly code: string;
}

/** Gives lots their place in the record. A part followed by count has one standing lot, made when first needed. */
@Injectable()
export class LotRegister {
  constructor(
    private readonly clock: Clock,
    private readonly numbers: Numbers,
    private readonly ledger: StockLedgerService,
    private readonly repository: LotRegisterRepository,
  ) {}

  /** The standing lots of parts followed by count, by part; those that are missing are made, under the parts' locks. */
  async standing(trx: Transaction<DB>, partIds: readonly number[]): Promise<ReadonlyMap<number, number>> {
    const asked = [...new Set(partIds)];
    if (asked.length === 0) return new Map();
    await this.ledger.lock(trx, asked);
    const known = new Map((await this.repository.standingLots(trx, asked)).map(({ partId, lotId }) => [partId, lotId]));
    const missing = asked.filter((partId) => !known.has(partId));
    if (missing.length === 0) return known;
    const codes = await this.nextCodes(trx, missing.length);
    const rows = missing.map((partId, index) => ({ ...emptyRow, code: codes[index] ?? '', partId }));
    const made = await this.repository.insert(trx, rows, this.clock.now());
    return new Map([...known, ...rows.map(({ partId, code }) => [partId, lotOf(made, code)] as const)]);
  }

  /** Lots that a document brings. @returns them in the order asked for */
  async add(
    trx: Transaction<DB>,
    document: RecordedDocument,
    lots: readonly NewLot[],
  ): Promise<readonly RegisteredLot[]> {
    if (lots.length === 0) return [];
    await this.passOver(trx, lots);
    const unnamed = lots.filter(({ code }) => code === undefined || code === null).length;
    const codes = (await this.nextCodes(trx, unnamed)).values();
    const rows = lots.map((lot): LotRow => {
      const code = lot.code ?? codes.next().value ?? '';
      const { unitCost, ...values } = lot;
      return { ...emptyRow, ...values, code, unitCost: unitCost?.toFixed(6) ?? null, documentId: document.id };
    });
    const made = await this.repository.insert(trx, rows, this.clock.now());
    return rows.map(({ code }) => ({ id: lotOf(made, code), code }));
  }

  /** Lots may bring codes of our own form, from labels printed before: those numbers are then taken. */
  private async passOver(trx: Transaction<DB>, lots: readonly NewLot[]): Promise<void> {
    const taken = lots.map(({ code }) => Number(/^L-(\d{1,9})$/.exec(code ?? '')?.[1] ?? 0));
    const highest = taken.reduce((most, number) => Math.max(most, number), 0);
    if (highest > 0) await this.numbers.passOver(trx, 'lot', '', highest);
  }

  private async nextCodes(trx: Transaction<DB>, count: number): Promise<readonly string[]> {
    if (count === 0) return [];
    const first = await this.numbers.nextOf(trx, 'lot', '', count);
    return Array.from({ length: count }, (_, index) => `L-${String(first + index).padStart(4, '0')}`);
  }
}

const emptyRow = {
  kind: 'standing',
  status: 'released',
  supplierId: null,
  supplierLotCode: null,
  receivedOn: null,
  expiresOn: null,
  unitCost: null,
  documentId: null,
  note: null,
} as const satisfies Omit<LotRow, 'code' | 'partId'>;

function lotOf(made: ReadonlyMap<string, number>, code: string): number {
  const id = made.get(code);
  if (id === undefined) throw new Error(`the lot ${code} was not kept`);
  return id;
}
