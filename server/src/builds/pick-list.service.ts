import { Injectable } from '@nestjs/common';
import { Decimal, decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import { ReservationsService, type Availability } from '../stock/reservations.service.js';
import { BatchIssuesRepository, type UsableLotRow } from './batch-issues.repository.js';
import { BatchLinesRepository, type BatchLineRow, type LinePart } from './batch-lines.repository.js';
import { BatchesRepository } from './batches.repository.js';
import type { BatchPartDto } from './batch.dto.js';
import type { PickListDto, PickRowDto, PickShortageDto } from './picking.dto.js';

/** Where to go and what to take: oldest released lots first, in the order of the bins. */
@Injectable()
export class PickListService {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly reservations: ReservationsService,
    private readonly batches: BatchesRepository,
    private readonly lines: BatchLinesRepository,
    private readonly issues: BatchIssuesRepository,
  ) {}

  /** @throws AppError `not_found` */
  async read(number: string): Promise<PickListDto> {
    const handle = this.database.handle;
    const batch = await this.batches.find(handle, number);
    if (!batch) throw notFound('batch');
    const lines = await this.lines.lines(handle, batch.id);
    const open = batch.status === 'done' || batch.status === 'withdrawn' ? [] : lines.filter(isOpen);
    const alternates = await this.lines.alternates(
      handle,
      open.map(({ billLineId }) => billLineId),
    );
    const partIds = [...open.map(({ partId }) => partId), ...alternates.map(({ id }) => id)];
    const usable = await this.issues.usable(handle, [...new Set(partIds)], this.clock.today());
    const available = await this.reservations.available(handle, partIds);
    const { rows, shortages } = suggest(open, alternates, usable, available);
    const picked = await this.issues.inBatch(handle, batch.id);
    return {
      number,
      rows: rows.toSorted((one, other) => one.bin.localeCompare(other.bin, 'en', { numeric: true })),
      shortages,
      picked: picked.map((row) => ({
        path: row.path,
        part: partOf(row),
        lot: row.standing ? null : row.lot,
        bin: row.bin,
        quantity: decimalText(row.quantity),
      })),
    };
  }
}

function isOpen(line: BatchLineRow): boolean {
  return decimal(line.issued).lessThan(line.required);
}

/**
 * Lots for each line in turn: what one line takes is gone for the next. A line takes its own claim and what nobody has
 * claimed; alternates fill what the own part cannot.
 */
function suggest(
  lines: readonly BatchLineRow[],
  alternates: readonly (LinePart & { lineId: number })[],
  usable: readonly UsableLotRow[],
  available: ReadonlyMap<number, Availability>,
): { readonly rows: PickRowDto[]; readonly shortages: PickShortageDto[] } {
  const left = new Map(usable.map((lot) => [lot, decimal(lot.quantity)]));
  const free = new Map([...available].map(([id, entry]) => [id, Decimal.max(entry.free, 0)]));
  const rows: PickRowDto[] = [];
  const shortages: PickShortageDto[] = [];
  for (const line of lines) {
    let needed = decimal(line.required).minus(line.issued);
    const own = { id: line.partId, code: line.code, name: line.name, measure: line.measure, traced: line.traced };
    for (const part of [own, ...alternates.filter(({ lineId }) => lineId === line.billLineId)]) {
      let claim = part.id === line.partId ? decimal(line.claimed) : new Decimal(0);
      for (const lot of usable.filter(({ partId }) => partId === part.id)) {
        const unclaimed = free.get(part.id) ?? new Decimal(0);
        const quantity = Decimal.min(needed, left.get(lot) ?? 0, claim.plus(unclaimed));
        if (quantity.lessThanOrEqualTo(0)) continue;
        left.set(lot, (left.get(lot) ?? new Decimal(0)).minus(quantity));
        needed = needed.minus(quantity);
        const beyond = Decimal.max(quantity.minus(claim), 0);
        claim = Decimal.max(claim.minus(quantity), 0);
        free.set(part.id, unclaimed.minus(beyond));
        rows.push({
          path: line.path,
          part: partOf(part),
          marks: line.marks,
          bin: lot.bin,
          lot: lot.standing ? null : lot.lot,
          quantity: decimalText(quantity),
          standsInFor: part.id === line.partId ? null : line.code,
        });
      }
    }
    if (needed.greaterThan(0)) {
      shortages.push({ path: line.path, part: partOf(own), quantity: decimalText(needed) });
    }
  }
  return { rows, shortages };
}

function partOf({ code, name, measure, traced }: BatchPartDto): BatchPartDto {
  return { code, name, measure, traced };
}
