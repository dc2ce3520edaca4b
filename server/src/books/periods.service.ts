import { Injectable } from '@nestjs/common';
import { sql } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import type { MonthsDto } from './books.dto.js';

/** Months of the books. A closed one takes no entry: the database sees to it. */
@Injectable()
export class PeriodsService {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly audit: Audit,
  ) {}

  async list(): Promise<MonthsDto> {
    const { rows } = await sql<{ month: string; entries: number; closedAt: Date | null; closedBy: string | null }>`
      select to_char(p.month, 'YYYY-MM') as month, p.closed_at as "closedAt", u.name as "closedBy",
             (select count(*) from journal_entry e where date_trunc('month', e.day)::date = p.month) as entries
      from period p left join app_user u on u.id = p.closed_by
      order by p.month desc
    `.execute(this.database.handle);
    return { items: rows.map((row) => ({ ...row, closedAt: row.closedAt?.toISOString() ?? null })) };
  }

  /** @throws AppError `wrong_state` for a month that is not over, or closed already */
  async close(month: string, person: SignedInUser): Promise<void> {
    if (month >= this.clock.today().slice(0, 7)) {
      throw new AppError('wrong_state', `${month} is not over yet: entries may still come.`);
    }
    await this.change(month, person, { closed: true });
  }

  /** @throws AppError `wrong_state` for a month that is open */
  async reopen(month: string, reason: string, person: SignedInUser): Promise<void> {
    await this.change(month, person, { closed: false, reason });
  }

  private async change(
    month: string,
    person: SignedInUser,
    change: { readonly closed: boolean; readonly reason?: string },
  ): Promise<void> {
    const { closed, reason } = change;
    await this.transactions.run(async (trx) => {
      const first = `${month}-01`;
      await trx
        .insertInto('period')
        .values({ month: first })
        .onConflict((conflict) => conflict.doNothing())
        .execute();
      const done = await trx
        .updateTable('period')
        .set({ closed_at: closed ? this.clock.now() : null, closed_by: closed ? person.id : null })
        .where('month', '=', first)
        .where('closed_at', closed ? 'is' : 'is not', null)
        .executeTakeFirst();
      if (done.numUpdatedRows !== 1n) {
        throw new AppError('wrong_state', `${month} is ${closed ? 'closed' : 'open'} already.`);
      }
      await this.audit.record(trx, {
        actor: person,
        action: closed ? 'period.closed' : 'period.reopened',
        subjectKind: 'period',
        subjectId: null,
        subjectCode: month,
        ...(reason === undefined ? {} : { after: { reason } }),
      });
    });
  }
}
