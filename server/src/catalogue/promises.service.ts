import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { isoDay, type IsoDay } from '@emberlot/shared/plan/iso-day';
import { addWorkingDays } from '@emberlot/shared/plan/working-calendar';
import type { Kysely, Transaction } from 'kysely';
import { BatchSupplyService, type BatchSupply } from '../builds/batch-supply.service.js';
import { Clock } from '../platform/clock/clock.js';
import { ShopService } from '../settings/shop.service.js';
import { WorkingCalendarService } from '../settings/working-calendar.service.js';
import { ReservationsService } from '../stock/reservations.service.js';
import type { Cover, Need, ShopPromise } from './promise.js';

const none = new Decimal(0);

/**
 * The day by which something that is sold leaves the shop: what lies on the shelf and is claimed by nobody goes first,
 * then pieces of batches under way that nobody has claimed, soonest first. What neither covers is asked about.
 */
@Injectable()
export class PromisesService {
  constructor(
    private readonly clock: Clock,
    private readonly shop: ShopService,
    private readonly calendar: WorkingCalendarService,
    private readonly reservations: ReservationsService,
    private readonly batches: BatchSupplyService,
  ) {}

  /** Reads a promise; it claims nothing. */
  async read(handle: Kysely<DB>, needs: readonly Need[]): Promise<ShopPromise> {
    return this.promise(handle, needs, await this.batches.toCome(handle, partIds(needs)));
  }

  /** Reads a promise that holds until the transaction ends: batches stay held, and the caller holds the parts. */
  async hold(trx: Transaction<DB>, needs: readonly Need[]): Promise<ShopPromise> {
    return this.promise(trx, needs, await this.batches.hold(trx, partIds(needs)));
  }

  private async promise(
    handle: Kysely<DB>,
    needs: readonly Need[],
    supplies: readonly BatchSupply[],
  ): Promise<ShopPromise> {
    const available = await this.reservations.available(handle, partIds(needs));
    const covers = summed(needs).map((need) => coverOf(need, available.get(need.partId)?.free ?? none, supplies));
    if (covers.some((cover) => cover === undefined)) return { kind: 'ask' };
    const found = covers.filter((cover) => cover !== undefined);
    const used = new Set(found.flatMap(({ fromBatches }) => fromBatches.map(({ batchId }) => batchId)));
    const last = supplies.findLast(({ batchId }) => used.has(batchId));
    const day = await this.leaves(handle, last?.dueOn);
    return { kind: 'by', day, batchNumber: last?.number ?? null, covers: found };
  }

  /** Packing begins on the day all is there, or today if that is later, and takes the shop's handling days. */
  private async leaves(handle: Kysely<DB>, dueOn: string | undefined): Promise<IsoDay> {
    const today = isoDay(this.clock.today());
    const ready = dueOn !== undefined && dueOn > today ? isoDay(dueOn) : today;
    const { handling_days: handling } = await this.shop.get(handle);
    return addWorkingDays(ready, handling, await this.calendar.from(handle, ready));
  }
}

const partIds = (needs: readonly Need[]): readonly number[] => [...new Set(needs.map(({ partId }) => partId))];

/** One need per part: the same part may stand in several lines. */
function summed(needs: readonly Need[]): readonly Need[] {
  const totals = new Map<number, Decimal>();
  for (const { partId, quantity } of needs) totals.set(partId, quantity.plus(totals.get(partId) ?? none));
  return [...totals].map(([partId, quantity]) => ({ partId, quantity }));
}

function coverOf(need: Need, free: Decimal, supplies: readonly BatchSupply[]): Cover | undefined {
  const fromShelf = Decimal.min(need.quantity, Decimal.max(free, none));
  let missing = need.quantity.minus(fromShelf);
  const fromBatches: { batchId: number; quantity: Decimal }[] = [];
  for (const { batchId, partId, free: toCome } of supplies) {
    if (missing.lessThanOrEqualTo(0)) break;
    if (partId !== need.partId) continue;
    const quantity = Decimal.min(missing, toCome);
    fromBatches.push({ batchId, quantity });
    missing = missing.minus(quantity);
  }
  return missing.greaterThan(0) ? undefined : { partId: need.partId, fromShelf, fromBatches };
}
