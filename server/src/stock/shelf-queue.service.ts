import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { addDays, isoDay } from '@emberlot/shared/plan/iso-day';
import type { Kysely } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { expiringWithinDays } from './lots.service.js';
import { PartFiguresService, type PartFigures } from './part-figures.service.js';
import type { ShelfQueueDto, ShortPartDto } from './shelf-queue.dto.js';
import { ShelfQueueRepository, type ShortPartRow } from './shelf-queue.repository.js';

/** What waits for a hand on the shelf: held lots, parts that run short, lots that expire. */
@Injectable()
export class ShelfQueueService {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly figures: PartFiguresService,
    private readonly queue: ShelfQueueRepository,
  ) {}

  async read(handle: Kysely<DB> = this.database.handle): Promise<ShelfQueueDto> {
    const today = this.clock.today();
    const held = await this.queue.heldLots(handle);
    const expiring = await this.queue.expiringLots(handle, addDays(isoDay(today), expiringWithinDays));
    const short = await this.queue.shortParts(handle, { at: this.clock.now(), today });
    const figures = await this.figures.read(handle, short, undefined);
    return {
      heldLots: held.rows.map((row) => ({ ...row, quantity: decimalText(row.quantity) })),
      heldLotCount: held.count,
      shortParts: short.flatMap((row) => shortDto(row, figures.get(row.id))).toSorted(moreUrgent),
      shortPartCount: short.length,
      expiringLots: expiring.rows.map((row) => ({
        ...row,
        quantity: decimalText(row.quantity),
        expired: row.expiresOn < today,
      })),
      expiringLotCount: expiring.count,
    };
  }
}

function shortDto(row: ShortPartRow, figures: PartFigures | undefined): ShortPartDto[] {
  if (!figures) return [];
  return [
    {
      part: row.part,
      name: row.name,
      measure: row.measure,
      free: figures.free,
      claimed: figures.claimed,
      short: figures.short,
      reorderPoint: row.reorderPoint === null ? null : decimalText(row.reorderPoint),
      supplier: row.supplier,
    },
  ];
}

/** What is promised and missing comes before what merely runs low. */
function moreUrgent(left: ShortPartDto, right: ShortPartDto): number {
  if ((left.short === null) !== (right.short === null)) return left.short === null ? 1 : -1;
  return new Decimal(left.free).comparedTo(right.free);
}
