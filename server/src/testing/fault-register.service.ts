import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Numbers } from '../platform/numbers/numbers.js';
import type { Unit } from '../units/unit-register.service.js';
import { FaultsRepository, type FaultRow } from './faults.repository.js';

/** Faults are opened by failed runs and by people, and are closed by what was done about them. */
@Injectable()
export class FaultRegister {
  constructor(
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly numbers: Numbers,
    private readonly repository: FaultsRepository,
  ) {}

  async openOf(handle: Kysely<DB>, unitId: number): Promise<FaultRow | undefined> {
    return (await this.repository.ofUnit(handle, unitId)).find(({ closedAt }) => closedAt === null);
  }

  /** The caller holds the unit. @returns the number of the fault */
  async open(
    trx: Transaction<DB>,
    unit: Unit,
    fault: { readonly what: string; readonly runId: number | null; readonly stepId: number | null },
    person: SignedInUser,
  ): Promise<string> {
    const count = await this.numbers.next(trx, 'nonconformity', '');
    const number = `N-${String(count).padStart(4, '0')}`;
    await this.repository.insert(trx, { ...fault, number, unitId: unit.id, at: this.clock.now(), by: person.id });
    await this.audit.record(trx, {
      actor: person,
      action: 'fault.opened',
      subjectKind: 'unit',
      subjectId: unit.id,
      subjectCode: unit.serial,
      after: { number, what: fault.what },
    });
    return number;
  }

  /** A scrapped unit has no open faults. The caller holds the unit. */
  async closeAllAsScrapped(trx: Transaction<DB>, unitId: number, reason: string, person: SignedInUser): Promise<void> {
    const open = (await this.repository.ofUnit(trx, unitId)).filter(({ closedAt }) => closedAt === null);
    for (const fault of open) {
      await this.repository.close(trx, fault, {
        cause: fault.cause,
        action: reason,
        outcome: 'scrapped',
        at: this.clock.now(),
        by: person.id,
      });
    }
  }
}
