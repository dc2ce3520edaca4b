import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { currencyCode, currencyExponent } from '@emberlot/shared/money/currency';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { averageUnitCost, costPool } from '@emberlot/shared/money/movement-value';
import type { Kysely } from 'kysely';
import type { Plain } from '../platform/api/plain.js';
import { Clock } from '../platform/clock/clock.js';
import { PartFiguresRepository, type PartFiguresRow } from './part-figures.repository.js';
import type { PartFiguresDto } from './part-list.dto.js';
import { ReservationsService, type Availability } from './reservations.service.js';

export interface FiguredPart {
  readonly id: number;
  readonly reorderPoint: string | null;
}

export interface PartFigures extends Plain<PartFiguresDto> {
  readonly bins: readonly string[];
}

/** The pace at which a part is used is read over this many days. */
const paceDays = 90;

/** What lies of parts, what is claimed, how long it lasts and what it is worth: the figures of lists and pages. */
@Injectable()
export class PartFiguresService {
  constructor(
    private readonly clock: Clock,
    private readonly reservations: ReservationsService,
    private readonly repository: PartFiguresRepository,
  ) {}

  /** @param currency of the books, or nothing for those who are shown no money */
  async read(
    handle: Kysely<DB>,
    parts: readonly FiguredPart[],
    currency: string | undefined,
  ): Promise<ReadonlyMap<number, PartFigures>> {
    const ids = parts.map(({ id }) => id);
    const since = new Date(this.clock.now().getTime() - paceDays * 86_400_000);
    const available = await this.reservations.available(handle, ids);
    const rows = new Map((await this.repository.read(handle, ids, since)).map((row) => [row.partId, row]));
    return new Map(
      parts.flatMap((part) => {
        const availability = available.get(part.id);
        const row = rows.get(part.id);
        return availability && row ? [[part.id, figures(part, availability, row, currency)] as const] : [];
      }),
    );
  }
}

function figures(
  part: FiguredPart,
  { onShelf, usable, claimed, free }: Availability,
  row: PartFiguresRow,
  currency: string | undefined,
): PartFigures {
  const shown = {
    onShelf: decimalText(onShelf),
    usable: decimalText(usable),
    held: decimalText(row.held),
    claimed: decimalText(claimed),
    free: decimalText(free),
    short: free.lessThan(0) ? decimalText(free.negated()) : null,
    belowReorderPoint: part.reorderPoint !== null && free.lessThan(part.reorderPoint),
    lastsDays: lastsDays(free, decimal(row.used)),
    bins: row.bins,
  };
  if (currency === undefined) return shown;
  const exponent = currencyExponent(currencyCode(currency));
  const average = averageUnitCost(costPool(row.poolQuantity, minorAmount(row.valueMinor)), exponent);
  return {
    ...shown,
    averageCost: average ? decimalText(average) : null,
    value: { amount: row.valueMinor, currency },
  };
}

function lastsDays(free: Decimal, used: Decimal): number | null {
  if (used.lessThanOrEqualTo(0)) return null;
  if (free.lessThanOrEqualTo(0)) return 0;
  return Decimal.min(free.times(paceDays).div(used).floor(), 9_999).toNumber();
}
