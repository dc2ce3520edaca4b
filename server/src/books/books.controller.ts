import { Controller, Get, Query } from '@nestjs/common';
import { Roles } from '../platform/auth/access.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import {
  JournalPageDto,
  JournalQuery,
  ReceivedPaymentsDto,
  PeriodQuery,
  PostingRulesDto,
  TrialBalanceDto,
} from './books.dto.js';
import { BooksService } from './books.service.js';

/** What the accountant reads. */
@Controller()
@Roles('accountant', 'owner')
export class BooksController {
  constructor(private readonly books: BooksService) {}

  @Get('journal-entries')
  async journal(@Query() query: JournalQuery): Promise<JournalPageDto> {
    return this.books.journal(query);
  }

  @Get('trial-balance')
  async trialBalance(@Query() query: PeriodQuery): Promise<TrialBalanceDto> {
    return this.books.trialBalance(query);
  }

  @Get('posting-rules')
  async postingRules(): Promise<PostingRulesDto> {
    return this.books.postingRules();
  }

  @Get('payments')
  async payments(@Query() query: PageQuery): Promise<ReceivedPaymentsDto> {
    return this.books.payments(query);
  }
}
