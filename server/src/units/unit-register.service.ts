import { randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { isoDay } from '@emberlot/shared/plan/iso-day';
import { serialNumberOn } from '@emberlot/shared/serial/serial-number';
import type { Kysely, Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { notFound } from '../platform/errors/app-error.js';
import { Numbers } from '../platform/numbers/numbers.js';
import { UnitRegisterRepository, type UnitRow } from './unit-register.repository.js';

export type Unit = UnitRow;

/** Enough that nobody finds a unit's page by trying: 144 bits. */
const tokenBytes = 18;

/** Gives units their serial numbers and keeps what has become of them. */
@Injectable()
export class UnitRegister {
  constructor(
    private readonly clock: Clock,
    private readonly numbers: Numbers,
    private readonly repository: UnitRegisterRepository,
  ) {}

  /**
   * Issues serial numbers to a batch, in order. A number that is issued is never reused; each product's letters count on
   * by themselves.
   */
  async issue(
    trx: Transaction<DB>,
    batch: { readonly id: number; readonly partId: number; readonly revisionId: number; readonly quantity: number },
    letters: string,
  ): Promise<void> {
    const first = await this.numbers.nextOf(trx, 'serial', letters, batch.quantity);
    const day = isoDay(this.clock.today());
    const rows = Array.from({ length: batch.quantity }, (_, index) => ({
      serial: serialNumberOn(letters, day, first + index),
      partId: batch.partId,
      revisionId: batch.revisionId,
      batchId: batch.id,
      place: index + 1,
      pageToken: randomBytes(tokenBytes).toString('base64url'),
    }));
    await this.repository.insert(trx, rows, this.clock.now());
  }

  async find(handle: Kysely<DB>, serial: string): Promise<Unit | undefined> {
    return this.repository.findBySerial(handle, serial);
  }

  /** @throws AppError `not_found` */
  async get(handle: Kysely<DB>, serial: string): Promise<Unit> {
    const unit = await this.repository.findBySerial(handle, serial);
    if (!unit) throw notFound('unit');
    return unit;
  }

  /** Holds a unit while something is done to it. @throws AppError `not_found` */
  async lock(trx: Transaction<DB>, serial: string): Promise<Unit> {
    const unit = await this.repository.lock(trx, serial);
    if (!unit) throw notFound('unit');
    return unit;
  }

  /** In the order of their places. */
  async ofBatch(handle: Kysely<DB>, batchId: number): Promise<readonly Unit[]> {
    return this.repository.ofBatch(handle, batchId);
  }

  /** Whether a unit may be finished, packed or shipped. */
  async isSound(handle: Kysely<DB>, unitId: number): Promise<boolean> {
    return this.repository.isSound(handle, unitId);
  }

  /** The database refuses a unit that is not sound. */
  async complete(trx: Transaction<DB>, unitId: number, lotId: number): Promise<void> {
    await this.repository.setCompleted(trx, unitId, lotId, this.clock.now());
  }

  async scrap(trx: Transaction<DB>, unitId: number, reason: string): Promise<void> {
    await this.repository.setScrapped(trx, unitId, reason, this.clock.now());
  }
}
