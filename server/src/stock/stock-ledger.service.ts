import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount, zeroAmount, type MinorAmount } from '@emberlot/shared/money/minor-units';
import {
  averageUnitCost,
  costPool,
  emptyPool,
  issueFromPool,
  receiveIntoPool,
  type CostPool,
} from '@emberlot/shared/money/movement-value';
import { takeBackFromPool } from '@emberlot/shared/money/take-back';
import type { Kysely, Transaction } from 'kysely';
import type { RecordedDocument } from '../journal/documents.service.js';
import { AppError } from '../platform/errors/app-error.js';
import { ShopService } from '../settings/shop.service.js';
import { StockLedgerRepository, type LockedPart, type MoveRow } from './stock-ledger.repository.js';
import type { NewMove, PostedMove, StockComponent } from './stock-move.js';

/**
 * The one way onto and off the shelf. Values each move by its cost pool (a part's average, or a unit's own cost) and
 * appends it; balances and pools follow in the database. The caller posts the values to the journal in the same
 * transaction, and the database checks at commit that both agree.
 */
@Injectable()
export class StockLedgerService {
  constructor(
    private readonly shop: ShopService,
    private readonly repository: StockLedgerRepository,
  ) {}

  /** Takes the lock under which a part's stock is counted, claimed and moved. */
  async lock(trx: Transaction<DB>, partIds: Iterable<number>): Promise<ReadonlyMap<number, LockedPart>> {
    const parts = await this.repository.lockParts(trx, [...new Set(partIds)]);
    return new Map(parts.map((part) => [part.id, part]));
  }

  /**
   * Appends moves in the given order and says what each was worth.
   *
   * @throws AppError `not_enough_stock` when a lot or pool does not hold what is taken; the whole transaction is lost
   */
  async post(
    trx: Transaction<DB>,
    document: RecordedDocument,
    moves: readonly NewMove[],
  ): Promise<readonly PostedMove[]> {
    if (moves.length === 0) return [];
    const parts = await this.lock(
      trx,
      moves.map(({ partId }) => partId),
    );
    const pools = await this.pools(trx, moves);
    const posted = moves.flatMap((move) => this.value(move, partOf(parts, move.partId), pools));
    const exponent = await this.shop.exponent(trx);
    await this.repository.insertMoves(
      trx,
      posted.map(({ move, reason }) => moveRow(document, move, reason, exponent)),
    );
    return posted.map(({ move }) => move);
  }

  /** What one stock unit of a part costs on average, in major units; parts of which nothing lies are left out. */
  async averages(handle: Kysely<DB>, partIds: readonly number[]): Promise<ReadonlyMap<number, Decimal>> {
    if (partIds.length === 0) return new Map();
    const rows = await this.repository.poolsOf(handle, partIds, []);
    const exponent = await this.shop.exponent(handle);
    return new Map(
      rows.flatMap((row) => {
        const average = averageUnitCost(costPool(row.quantity, minorAmount(row.value)), exponent);
        return average ? [[row.partId, average] as const] : [];
      }),
    );
  }

  private async pools(trx: Transaction<DB>, moves: readonly NewMove[]): Promise<Map<string, CostPool>> {
    const rows = await this.repository.poolsOf(
      trx,
      moves.map(({ partId }) => partId),
      moves.map(({ lotId }) => lotId),
    );
    return new Map(
      rows.map((row) => [poolKey(row.partId, row.lotId), costPool(row.quantity, minorAmount(row.value))] as const),
    );
  }

  private value(move: NewMove, part: LockedPart, pools: Map<string, CostPool>): readonly Valued[] {
    const component: StockComponent = part.traced === 'single' ? 'units' : 'materials';
    const { partId, lotId, binId, quantity, reason } = move;
    const base = { partId, lotId, component };
    if (move.direction === 'within') {
      return [
        { reason, move: { ...base, ...reversing(move, 0), binId, quantity: quantity.negated(), value: zeroAmount } },
        { reason, move: { ...base, ...reversing(move, 1), binId: move.toBinId, quantity, value: zeroAmount } },
      ];
    }
    const key = poolKey(partId, part.traced === 'single' ? lotId : null);
    const before = pools.get(key) ?? emptyPool;
    if (move.direction === 'in') {
      const { value, pool } = receiveIntoPool(before, quantity, move.value);
      pools.set(key, pool);
      return [{ reason, move: { ...base, ...reversing(move, 0), binId, quantity, value } }];
    }
    if (quantity.greaterThan(before.quantity)) {
      throw new AppError(
        'not_enough_stock',
        `There are only ${before.quantity.toFixed()} of ${part.code} left, and ${quantity.toFixed()} were asked for.`,
      );
    }
    const { value, pool } =
      move.broughtValue === undefined
        ? issueFromPool(before, quantity)
        : takeBackFromPool(before, quantity, move.broughtValue);
    pools.set(key, pool);
    return [{ reason, move: { ...base, ...reversing(move, 0), binId, quantity: quantity.negated(), value } }];
  }
}

interface Valued {
  readonly move: PostedMove;
  readonly reason: string;
}

/** What moves were worth, per stock account and without their sign: the amounts of a journal entry. */
export function valueByComponent(moves: readonly PostedMove[]): Readonly<Record<StockComponent, MinorAmount>> {
  const sum = (component: StockComponent): MinorAmount =>
    minorAmount(Math.abs(moves.reduce((total, move) => total + (move.component === component ? move.value : 0), 0)));
  return { materials: sum('materials'), units: sum('units') };
}

function reversing(move: NewMove, index: number): { readonly reverses?: number } {
  const reverses = move.reverses?.[index];
  return reverses === undefined ? {} : { reverses };
}

function partOf(parts: ReadonlyMap<number, LockedPart>, partId: number): LockedPart {
  const part = parts.get(partId);
  if (!part) throw new AppError('not_found', 'There is no such part.');
  return part;
}

function poolKey(partId: number, lotId: number | null): string {
  return `${partId}/${lotId ?? ''}`;
}

function moveRow(document: RecordedDocument, move: PostedMove, reason: string, exponent: number): MoveRow {
  const quantity = move.quantity.abs();
  const pool = costPool(quantity, minorAmount(Math.abs(move.value)));
  return {
    documentId: document.id,
    partId: move.partId,
    lotId: move.lotId,
    binId: move.binId,
    quantity: move.quantity.toFixed(),
    unitCost: (averageUnitCost(pool, exponent) ?? new Decimal(0)).toFixed(6),
    value: move.value,
    reason,
    occurredAt: document.occurredAt,
    recordedBy: document.recordedBy,
    reverses: move.reverses ?? null,
  };
}

/** Reads a quantity as the ledger keeps it: at most six decimals. */
export function ledgerQuantity(text: string): Decimal {
  return decimal(text).toDecimalPlaces(6);
}
