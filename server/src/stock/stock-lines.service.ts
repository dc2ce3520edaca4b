import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { decimal, Decimal } from '@emberlot/shared/measure/decimal';
import { isStockMeasure } from '@emberlot/shared/measure/stock-measures';
import { positiveStockQuantity, stockQuantity } from '@emberlot/shared/measure/stock-quantity';
import type { Transaction } from 'kysely';
import { AppError, type FieldFault } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { LotRegister } from './lot-register.service.js';
import { StockLedgerService } from './stock-ledger.service.js';
import {
  StockLookupRepository,
  type Place,
  type StockBin,
  type StockLot,
  type StockPart,
} from './stock-lookup.repository.js';

/** A line of a stock document, as it is typed or scanned. */
export interface StockLine {
  readonly part: string;
  /** Not needed for a part followed by count, which has one standing lot. */
  readonly lot?: string | null;
  readonly bin: string;
}

export interface ResolvedLine {
  readonly part: StockPart;
  readonly lot: StockLot;
  readonly bin: StockBin;
}

/** Finds what lines name, under the parts' locks, and says beside each field what cannot be found. */
@Injectable()
export class StockLines {
  constructor(
    private readonly ledger: StockLedgerService,
    private readonly register: LotRegister,
    private readonly lookup: StockLookupRepository,
  ) {}

  /** @throws AppError `invalid_input` with a fault per field that names nothing */
  async resolve(trx: Transaction<DB>, lines: readonly StockLine[]): Promise<readonly ResolvedLine[]> {
    const parts = await this.parts(trx, lines);
    const bins = await this.bins(
      trx,
      lines.map(({ bin }, index) => ({ code: bin, pointer: `/lines/${index}/bin` })),
    );
    const lots = await this.lots(trx, lines, parts);
    return lines.map((_, index) => ({
      part: parts[index] as StockPart,
      bin: bins[index] as StockBin,
      lot: lots[index] as StockLot,
    }));
  }

  /** The parts of lines, locked. @throws AppError `invalid_input` */
  async parts(trx: Transaction<DB>, lines: readonly { readonly part: string }[]): Promise<readonly StockPart[]> {
    const found = await this.lookup.parts(trx, [...new Set(lines.map(({ part }) => part))]);
    const byCode = new Map(found.map((part) => [part.code, part]));
    const faults = lines.flatMap(({ part }, index) =>
      byCode.has(part) ? [] : [fault(`/lines/${index}/part`, `There is no part ${part}.`)],
    );
    if (faults.length > 0) throw inputRefused(faults);
    await this.ledger.lock(
      trx,
      found.map(({ id }) => id),
    );
    return lines.map(({ part }) => byCode.get(part) as StockPart);
  }

  /** Bins that are in use, held so that they stay so. @throws AppError `invalid_input` */
  async bins(
    trx: Transaction<DB>,
    asked: readonly { readonly code: string; readonly pointer: string }[],
  ): Promise<readonly StockBin[]> {
    const found = await this.lookup.lockBins(trx, [...new Set(asked.map(({ code }) => code))]);
    const byCode = new Map(found.map((bin) => [bin.code, bin]));
    const faults = asked.flatMap(({ code, pointer }) => {
      const bin = byCode.get(code);
      if (!bin) return [fault(pointer, `There is no bin ${code}.`)];
      return bin.retiredAt === null ? [] : [fault(pointer, `Bin ${code} is no longer in use.`)];
    });
    if (faults.length > 0) throw inputRefused(faults);
    return asked.map(({ code }) => byCode.get(code) as StockBin);
  }

  /** What lies of each line's lot in its bin, read under the parts' locks. */
  async balances(trx: Transaction<DB>, places: readonly Place[]): Promise<(place: Place) => Decimal> {
    const rows = await this.lookup.balances(trx, places);
    const byPlace = new Map(rows.map((row) => [placeKey(row), decimal(row.quantity)]));
    return (place) => byPlace.get(placeKey(place)) ?? new Decimal(0);
  }

  private async lots(
    trx: Transaction<DB>,
    lines: readonly StockLine[],
    parts: readonly StockPart[],
  ): Promise<readonly StockLot[]> {
    const standing = await this.register.standing(
      trx,
      parts.filter(({ traced }) => traced === 'count').map(({ id }) => id),
    );
    const named = lines.flatMap(({ lot }) => (lot ? [lot] : []));
    const known = [
      ...(await this.lookup.lots(trx, named)),
      ...(await this.lookup.lotsById(trx, [...standing.values()])),
    ];
    const faults: FieldFault[] = [];
    const found = lines.map(({ lot }, index) => {
      const part = parts[index] as StockPart;
      const pointer = `/lines/${index}/lot`;
      if (!lot && part.traced === 'count') return known.find(({ id }) => id === standing.get(part.id));
      const match = known.find((candidate) => candidate.code === lot && candidate.partId === part.id);
      if (!match)
        faults.push(fault(pointer, lot ? `${part.code} has no lot ${lot}.` : `Say which lot of ${part.code}.`));
      return match;
    });
    if (faults.length > 0) throw inputRefused(faults);
    return found as readonly StockLot[];
  }
}

/**
 * Reads a quantity in a part's stock unit.
 *
 * @returns the quantity, or a sentence about what is wrong with it
 */
export function quantityOf(text: string, part: StockPart, zero = false): Decimal | string {
  const { measure } = part;
  if (!isStockMeasure(measure)) throw new Error(`part ${part.code} is kept in ${measure}`);
  const read = attempt(() => (zero ? stockQuantity(text, measure) : positiveStockQuantity(text, measure)));
  return read.ok ? read.value : read.fault.message;
}

/** Quantities of lines, each in its part's unit. @throws AppError `invalid_input` */
export function quantitiesOf(
  lines: readonly { readonly quantity: string }[],
  parts: readonly StockPart[],
  zero = false,
): readonly Decimal[] {
  const read = lines.map(({ quantity }, index) => quantityOf(quantity, parts[index] as StockPart, zero));
  const faults = read.flatMap((value, index) =>
    typeof value === 'string' ? [fault(`/lines/${index}/quantity`, value)] : [],
  );
  if (faults.length > 0) throw inputRefused(faults);
  return read as readonly Decimal[];
}

export function tooLittle(line: ResolvedLine, held: Decimal, asked: Decimal, index: number): AppError {
  const what = line.part.traced === 'count' ? line.part.code : `${line.part.code}, lot ${line.lot.code},`;
  const sentence = `Only ${held.toFixed()} of ${what} lie in ${line.bin.code}, and ${asked.toFixed()} were asked for.`;
  return new AppError('not_enough_stock', sentence, {
    faults: [{ pointer: `/lines/${index}/quantity`, code: 'not_enough', detail: sentence }],
  });
}

export function fault(pointer: string, detail: string): FieldFault {
  return { pointer, code: 'does_not_fit', detail };
}

function placeKey({ lotId, binId }: Place): string {
  return `${lotId}/${binId}`;
}
