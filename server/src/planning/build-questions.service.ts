import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { BuildQuestion } from '@emberlot/shared/bill/build-network';
import { Decimal } from '@emberlot/shared/measure/decimal';
import type { Kysely } from 'kysely';
import { billsOf, issueDecimalsOf, partsOf } from '../bills/bill-arithmetic.js';
import type { BillPart, BillRevision } from '../bills/bill-revision.js';
import { BillsService } from '../bills/bills.service.js';
import { ReservationsService, type Availability } from '../stock/reservations.service.js';

/** A revision, all below it and what is free of each part, as the arithmetic asks for them. */
export interface PreparedQuestion {
  readonly question: BuildQuestion;
  /** Every part that occurs, by its code. */
  readonly parts: ReadonlyMap<string, BillPart>;
  readonly available: ReadonlyMap<number, Availability>;
}

/** Reads what the questions about building need. */
@Injectable()
export class BuildQuestionsService {
  constructor(
    private readonly bills: BillsService,
    private readonly reservations: ReservationsService,
  ) {}

  async prepare(handle: Kysely<DB>, revision: BillRevision): Promise<PreparedQuestion> {
    const below = await this.bills.withAllBelow(handle, revision);
    const parts = partsOf(below.values());
    const available = await this.reservations.available(
      handle,
      [...parts.values()].map(({ id }) => id),
    );
    const onHand = new Map(
      [...parts].map(([code, { id }]) => [code, Decimal.max(available.get(id)?.free ?? 0, 0)] as const),
    );
    const question = {
      bills: billsOf(below.values()),
      part: revision.part.code,
      onHand,
      decimals: issueDecimalsOf(parts),
    };
    return { question, parts, available };
  }
}
