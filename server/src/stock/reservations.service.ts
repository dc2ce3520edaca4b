import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import type { Kysely, Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { AppError } from '../platform/errors/app-error.js';
import { AvailabilityRepository } from './availability.repository.js';
import { ReservationsRepository, type EndReason } from './reservations.repository.js';
import { StockLedgerService } from './stock-ledger.service.js';

export interface NewDemand {
  readonly kind: 'order_line' | 'batch_line';
  readonly partId: number;
  readonly quantity: Decimal;
  readonly neededOn: string | null;
  /** What it is for, as a person reads it: the number of an order or batch. */
  readonly reference: string;
}

export interface Claim {
  readonly demandId: number;
  readonly partId: number;
  readonly quantity: Decimal;
  readonly supply: { readonly kind: 'shelf' } | { readonly kind: 'batch'; readonly batchId: number };
  /** When the claim ends by itself; nothing for one that stays. */
  readonly expiresAt: Date | null;
}

/** What lies of a part, in its stock unit. */
export interface Availability {
  readonly onShelf: Decimal;
  /** Released, not expired, in no quarantine bin. */
  readonly usable: Decimal;
  readonly claimed: Decimal;
  /** Usable and claimed by nobody; below zero when supply shrank under its claims. */
  readonly free: Decimal;
}

const nothing: Availability = {
  onShelf: new Decimal(0),
  usable: new Decimal(0),
  claimed: new Decimal(0),
  free: new Decimal(0),
};

/**
 * Demands and the claims they hold on supplies. What was promised is claimed; two buyers never get the same last unit,
 * because whoever claims from the shelf holds the lock on the part while counting what is free.
 */
@Injectable()
export class ReservationsService {
  constructor(
    private readonly clock: Clock,
    private readonly ledger: StockLedgerService,
    private readonly availability: AvailabilityRepository,
    private readonly repository: ReservationsRepository,
  ) {}

  /** Reads what is there; parts unknown to the shelf read as nothing. */
  async available(handle: Kysely<DB>, partIds: readonly number[]): Promise<ReadonlyMap<number, Availability>> {
    const rows = await this.availability.read(handle, [...new Set(partIds)], this.clock.now(), this.clock.today());
    const read = rows.map((row) => {
      const usable = decimal(row.usable);
      const claimed = decimal(row.claimed);
      const entry: Availability = { onShelf: decimal(row.onShelf), usable, claimed, free: usable.minus(claimed) };
      return [row.partId, entry] as const;
    });
    return new Map(read);
  }

  /** @returns ids in the order of the demands */
  async open(trx: Transaction<DB>, demands: readonly NewDemand[]): Promise<readonly number[]> {
    if (demands.length === 0) return [];
    const createdAt = this.clock.now();
    return this.repository.insertDemands(
      trx,
      demands.map((demand) => ({ ...demand, quantity: demand.quantity.toFixed(), createdAt })),
    );
  }

  /**
   * Claims quantities for demands. Claims on the shelf are counted under the parts' locks; a claim on a batch has been
   * counted by the caller, who holds the batch's lock.
   *
   * @throws AppError `not_enough_stock` naming the first part of which too little is free; then nothing is claimed
   */
  async claim(trx: Transaction<DB>, claims: readonly Claim[]): Promise<void> {
    if (claims.length === 0) return;
    await this.checkShelf(
      trx,
      claims.filter(({ supply }) => supply.kind === 'shelf'),
    );
    const createdAt = this.clock.now();
    await this.repository.insertReservations(
      trx,
      claims.map(({ demandId, partId, quantity, supply, expiresAt }) => ({
        demandId,
        partId,
        quantity: quantity.toFixed(),
        supply: supply.kind,
        batchId: supply.kind === 'batch' ? supply.batchId : null,
        expiresAt,
        createdAt,
      })),
    );
  }

  /** A quantity of a demand has gone where it was needed: its claims end, oldest first, and the demand when it is met. */
  async take(trx: Transaction<DB>, demandId: number, quantity: Decimal): Promise<void> {
    const demand = await this.repository.lockDemand(trx, demandId);
    if (!demand) throw new AppError('not_found', 'There is no such demand.');
    const now = this.clock.now();
    let remaining = quantity;
    for (const claim of await this.repository.liveOf(trx, [demandId])) {
      if (remaining.lessThanOrEqualTo(0)) break;
      const held = decimal(claim.quantity);
      if (held.lessThanOrEqualTo(remaining)) await this.repository.end(trx, [claim.id], 'taken', now);
      else await this.repository.setQuantity(trx, claim.id, held.minus(remaining).toFixed());
      remaining = remaining.minus(held);
    }
    const taken = decimal(demand.taken).plus(quantity);
    const met = taken.greaterThanOrEqualTo(demand.quantity);
    await this.repository.setTaken(trx, demandId, taken.toFixed(), met ? now : null);
  }

  /** Gives up all claims of demands and closes these: the order or batch they stood for is no more. */
  async release(trx: Transaction<DB>, demandIds: readonly number[], reason: EndReason = 'cancelled'): Promise<void> {
    const live = await this.repository.liveOf(trx, demandIds);
    const now = this.clock.now();
    await this.repository.end(
      trx,
      live.map(({ id }) => id),
      reason,
      now,
    );
    await this.repository.closeDemands(trx, demandIds, now);
  }

  /** Makes claims last (no instant) or end by themselves. */
  async setExpiry(trx: Transaction<DB>, demandIds: readonly number[], expiresAt: Date | null): Promise<void> {
    await this.repository.setExpiry(trx, demandIds, expiresAt);
  }

  /**
   * Binds one piece of a demand's claim to a unit, as it is scanned into a parcel. Where the claim was lost, a free
   * piece is claimed first.
   *
   * @throws AppError `not_enough_stock` when the demand holds no claim and nothing is free
   */
  async bindUnit(trx: Transaction<DB>, demand: { id: number; partId: number }, lotId: number): Promise<void> {
    const live = await this.repository.liveOf(trx, [demand.id]);
    const open = live.find((claim) => claim.lotId === null && claim.supply === 'shelf');
    const one = new Decimal(1);
    if (!open) await this.checkShelf(trx, [{ ...shelfClaim(demand, one), expiresAt: null }]);
    else if (decimal(open.quantity).greaterThan(1)) {
      await this.repository.setQuantity(trx, open.id, decimal(open.quantity).minus(1).toFixed());
    } else {
      await this.repository.bind(trx, open.id, lotId);
      return;
    }
    const row = { demandId: demand.id, partId: demand.partId, quantity: '1', supply: 'shelf' as const, batchId: null };
    const [id] = await this.repository.insertReservations(trx, [
      { ...row, expiresAt: null, createdAt: this.clock.now() },
    ]);
    if (id === undefined) throw new Error('the claim was not kept');
    await this.repository.bind(trx, id, lotId);
  }

  /** The unit was taken out of the parcel again: its piece of the claim is open for another one. */
  async unbindUnit(trx: Transaction<DB>, demandId: number, lotId: number): Promise<void> {
    const live = await this.repository.liveOf(trx, [demandId]);
    const bound = live.find((claim) => claim.lotId === lotId);
    if (bound) await this.repository.unbind(trx, bound.id);
  }

  /** Pieces of a batch have come onto the shelf: as much of the claims on the batch follows them, oldest first. */
  async moveToShelf(trx: Transaction<DB>, batchId: number, partId: number, quantity: Decimal): Promise<void> {
    const now = this.clock.now();
    let remaining = quantity;
    for (const claim of await this.repository.liveOnBatch(trx, batchId, now)) {
      if (remaining.lessThanOrEqualTo(0)) break;
      const held = decimal(claim.quantity);
      const moved = Decimal.min(held, remaining);
      if (moved.equals(held)) await this.repository.end(trx, [claim.id], 'moved', now);
      else await this.repository.setQuantity(trx, claim.id, held.minus(moved).toFixed());
      const { demandId, expiresAt } = claim;
      const row = { demandId, partId, quantity: moved.toFixed(), supply: 'shelf' as const, batchId: null };
      await this.repository.insertReservations(trx, [{ ...row, expiresAt, createdAt: now }]);
      remaining = remaining.minus(moved);
    }
  }

  /** A batch brings nothing more: what still waits for it is a shortage of whoever claimed it. */
  async giveUpBatch(trx: Transaction<DB>, batchId: number): Promise<void> {
    const now = this.clock.now();
    const live = await this.repository.liveOnBatch(trx, batchId, now);
    await this.repository.end(
      trx,
      live.map(({ id }) => id),
      'cancelled',
      now,
    );
  }

  /** Claims on a batch that have not ended, oldest first. */
  async claimedOnBatch(handle: Kysely<DB>, batchId: number): Promise<Decimal> {
    const live = await this.repository.liveOnBatch(handle, batchId, this.clock.now());
    return live.reduce((sum, claim) => sum.plus(claim.quantity), new Decimal(0));
  }

  private async checkShelf(trx: Transaction<DB>, claims: readonly Claim[]): Promise<void> {
    if (claims.length === 0) return;
    const partIds = [...new Set(claims.map(({ partId }) => partId))];
    const parts = await this.ledger.lock(trx, partIds);
    const available = await this.available(trx, partIds);
    for (const partId of partIds) {
      const asked = claims.reduce(
        (sum, claim) => (claim.partId === partId ? sum.plus(claim.quantity) : sum),
        new Decimal(0),
      );
      const { free } = available.get(partId) ?? nothing;
      if (asked.greaterThan(free)) throw shortage(parts.get(partId)?.code ?? String(partId), asked, free);
    }
  }
}

function shelfClaim(demand: { id: number; partId: number }, quantity: Decimal): Omit<Claim, 'expiresAt'> {
  return { demandId: demand.id, partId: demand.partId, quantity, supply: { kind: 'shelf' } };
}

function shortage(code: string, asked: Decimal, free: Decimal): AppError {
  const left = Decimal.max(free, 0).toFixed();
  return new AppError('not_enough_stock', `Only ${left} of ${code} are free, and ${asked.toFixed()} were asked for.`);
}
