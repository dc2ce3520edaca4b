import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { Decimal, decimal } from '@emberlot/shared/measure/decimal';
import type { Transaction } from 'kysely';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { AppError } from '../platform/errors/app-error.js';
import { UnitRegister, type Unit } from '../units/unit-register.service.js';
import { BatchIssuesRepository } from './batch-issues.repository.js';
import { BatchLinesRepository } from './batch-lines.repository.js';
import type { BatchRow } from './batches.repository.js';

/** What is in a unit: lots scanned to it, and for the rest the lots of its batch that come into question. */
@Injectable()
export class AsBuiltRecord {
  constructor(
    private readonly clock: Clock,
    private readonly units: UnitRegister,
    private readonly lines: BatchLinesRepository,
    private readonly issues: BatchIssuesRepository,
  ) {}

  /** @throws AppError `rule_broken` when less was picked than the units hold */
  async write(trx: Transaction<DB>, batch: BatchRow, unit: Unit, person: SignedInUser): Promise<void> {
    const finished = (await this.units.ofBatch(trx, batch.id)).filter(({ completedAt }) => completedAt !== null).length;
    const lines = await this.refuseUnpicked(trx, batch, finished + 1);
    const fitted = await this.issues.fittedExactly(trx, batch.id);
    const inBatch = await this.issues.inBatch(trx, batch.id);
    const rows = lines.flatMap((line) => {
      const own = fitted.filter(({ unitId, lineId }) => unitId === unit.id && lineId === line.id);
      const missing = decimal(line.quantityPer).minus(sum(own));
      if (missing.lessThanOrEqualTo(0)) return [];
      const possible = inBatch
        .filter(({ lineId }) => lineId === line.id)
        .map((lot) => ({
          lot,
          left: decimal(lot.quantity).minus(sum(fitted.filter((row) => isOf(row, line.id, lot.lotId)))),
        }))
        .filter(({ left }) => left.greaterThan(0));
      return possible.map(({ lot, left }) => ({
        unitId: unit.id,
        lineId: line.id,
        partId: lot.partId,
        lotId: lot.lotId,
        quantity: Decimal.min(missing, left).toFixed(),
        exact: false,
      }));
    });
    await this.issues.insertAsBuilt(trx, rows, this.clock.now(), person.id);
  }

  /** @throws AppError `rule_broken` when less was picked than so many pieces hold */
  async refuseUnpicked(trx: Transaction<DB>, batch: BatchRow, pieces: number) {
    const lines = await this.lines.lines(trx, batch.id);
    const short = lines.find(({ issued, quantityPer }) => decimal(issued).lessThan(decimal(quantityPer).times(pieces)));
    if (short) {
      const missing = decimal(short.quantityPer).times(pieces).minus(short.issued).toFixed();
      throw new AppError('rule_broken', `${missing} of ${short.code} have not been picked for ${batch.number} yet.`);
    }
    return lines;
  }
}

function sum(rows: readonly { readonly quantity: string }[]): Decimal {
  return rows.reduce((total, { quantity }) => total.plus(quantity), new Decimal(0));
}

function isOf(row: { readonly lineId: number; readonly lotId: number }, lineId: number, lotId: number): boolean {
  return row.lineId === lineId && row.lotId === lotId;
}
