import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import type { Transaction } from 'kysely';
import { ReservationsService, type Claim } from '../stock/reservations.service.js';
import { StockLedgerService } from '../stock/stock-ledger.service.js';
import { BatchLinesRepository, type BatchLineRow } from './batch-lines.repository.js';

/** What a line still needs of the shelf and holds no claim on. */
export function unclaimed(line: Pick<BatchLineRow, 'required' | 'issued' | 'claimed'>): Decimal {
  return Decimal.max(decimal(line.required).minus(line.issued).minus(line.claimed), 0);
}

/** Claims of a batch's lines on the shelf. */
@Injectable()
export class BatchClaims {
  constructor(
    private readonly ledger: StockLedgerService,
    private readonly reservations: ReservationsService,
    private readonly lines: BatchLinesRepository,
  ) {}

  /**
   * Claims for each line as much of what is missing as is free. What is not there stays a shortage of that line.
   *
   * @returns how many lines still miss something
   */
  async claimMissing(trx: Transaction<DB>, batchId: number): Promise<number> {
    const before = await this.lines.lines(trx, batchId);
    const partIds = before.map(({ partId }) => partId);
    await this.ledger.lock(trx, partIds);
    const available = await this.reservations.available(trx, partIds);
    const free = new Map([...available].map(([partId, { free: left }]) => [partId, left]));
    const claims: Claim[] = [];
    let short = 0;
    for (const line of before) {
      const missing = unclaimed(line);
      const left = free.get(line.partId) ?? new Decimal(0);
      const taken = Decimal.max(Decimal.min(left, missing), 0);
      if (taken.lessThan(missing)) short += 1;
      if (taken.isZero() || line.demandId === null) continue;
      free.set(line.partId, left.minus(taken));
      const { demandId, partId } = line;
      claims.push({ demandId, partId, quantity: taken, supply: { kind: 'shelf' }, expiresAt: null });
    }
    await this.reservations.claim(trx, claims);
    return short;
  }
}
