import { Injectable } from '@nestjs/common';
import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import type { PageQuery } from '../platform/paging/page-query.dto.js';
import { ShopService } from '../settings/shop.service.js';
import type {
  JournalPageDto,
  JournalQuery,
  ReceivedPaymentsDto,
  PeriodQuery,
  PostingRulesDto,
  TrialBalanceDto,
} from './books.dto.js';
import { BooksRepository } from './books.repository.js';

/** The account on which the card processor's money stands. */
const clearingAccount = '1250';

/** Journal, balances, stock value and payments, for who reads the books. */
@Injectable()
export class BooksService {
  constructor(
    private readonly clock: Clock,
    private readonly database: Database,
    private readonly shop: ShopService,
    private readonly repository: BooksRepository,
  ) {}

  async journal(query: JournalQuery): Promise<JournalPageDto> {
    const money = await this.money(this.database.handle);
    const { items, total } = await this.repository.entries(this.database.handle, query);
    const lines = await this.repository.linesOf(
      this.database.handle,
      items.map(({ id }) => id),
    );
    return {
      total,
      items: items.map((entry) => {
        const own = lines.filter(({ entryId }) => entryId === entry.id);
        return {
          ...entry,
          total: money(own.reduce((sum, { debit }) => sum + debit, 0)),
          lines: own.map(({ account, accountName, debit, credit }) => ({
            account,
            accountName,
            debit: debit === 0 ? null : money(debit),
            credit: credit === 0 ? null : money(credit),
          })),
        };
      }),
    };
  }

  async trialBalance(query: PeriodQuery): Promise<TrialBalanceDto> {
    const to = query.to ?? this.clock.today();
    const money = await this.money(this.database.handle);
    const sums = await this.repository.accountSums(this.database.handle, query.from, to);
    return {
      from: query.from ?? null,
      to,
      accounts: sums.map(({ debit, credit, ...account }) => ({
        ...account,
        debit: money(debit),
        credit: money(credit),
        balance: money(debit - credit),
      })),
      debit: money(sums.reduce((sum, { debit }) => sum + debit, 0)),
      credit: money(sums.reduce((sum, { credit }) => sum + credit, 0)),
    };
  }

  async postingRules(): Promise<PostingRulesDto> {
    return { items: await this.repository.postingRules(this.database.handle) };
  }

  async payments(query: PageQuery): Promise<ReceivedPaymentsDto> {
    const handle = this.database.handle;
    const money = await this.money(handle);
    const { items, total } = await this.repository.payments(handle, query);
    return {
      total,
      clearing: money(await this.repository.balanceOf(handle, clearingAccount)),
      items: items.map(({ documentId: _id, amount, currency, refunded, receivedAt, ...row }) => ({
        ...row,
        receivedAt: receivedAt.toISOString(),
        amount: { amount, currency },
        refunded: { amount: refunded, currency },
      })),
    };
  }

  private async money(handle: Kysely<DB>) {
    const { currency } = await this.shop.get(handle);
    return (amount: number) => ({ amount, currency });
  }
}
