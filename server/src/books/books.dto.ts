import { Matches } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { MoneyDto } from '../platform/api/money.dto.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { Day, Optional, Text } from '../platform/validation/fields.js';

export class JournalQuery extends PageQuery {
  @Optional()
  @Day()
  from?: string;

  @Optional()
  @Day()
  to?: string;

  /** Entries with a line on this account. */
  @Optional()
  @Matches(/^[0-9]{4}$/, { message: 'Give an account by its four digits.' })
  account?: string;

  /** Entries of one document, by its number. */
  @Optional()
  @Text({ max: textLimit.code })
  document?: string;
}

export class PeriodQuery {
  /** First day; the beginning when nothing is said. */
  @Optional()
  @Day()
  from?: string;

  /** Last day; today when nothing is said. */
  @Optional()
  @Day()
  to?: string;
}

export class ExportQuery {
  @Day()
  from: string;

  @Day()
  to: string;
}

export class ReopenMonthInput {
  @Text({ max: textLimit.line, lines: true })
  reason: string;
}

export class JournalLineDto {
  account: string;
  accountName: string;
  debit: MoneyDto | null;
  credit: MoneyDto | null;
}

export class JournalEntryDto {
  id: number;
  day: string;
  event: string;
  document: string;
  documentKind: string;
  narrative: string;
  total: MoneyDto;
  lines: JournalLineDto[];
}

export class JournalPageDto {
  items: JournalEntryDto[];
  total: number;
}

export class AccountBalanceDto {
  account: string;
  name: string;
  kind: string;
  debit: MoneyDto;
  credit: MoneyDto;
  /** Debit less credit. */
  balance: MoneyDto;
}

export class TrialBalanceDto {
  from: string | null;
  to: string;
  accounts: AccountBalanceDto[];
  debit: MoneyDto;
  credit: MoneyDto;
}

export class PostingRuleDto {
  event: string;
  component: string;
  sentence: string;
  debitAccount: string;
  debitName: string;
  creditAccount: string;
  creditName: string;
}

export class PostingRulesDto {
  items: PostingRuleDto[];
}

export class ReceivedPaymentDto {
  document: string;
  receivedAt: string;
  order: string;
  providerPaymentId: string;
  amount: MoneyDto;
  invoice: string | null;
  refunded: MoneyDto;
  refundState: string | null;
}

export class ReceivedPaymentsDto {
  items: ReceivedPaymentDto[];
  total: number;
  /** What the card processor holds by the books: payments less fees and refunds. */
  clearing: MoneyDto;
}

export class ExportTotalsDto {
  from: string;
  to: string;
  invoices: number;
  creditNotes: number;
  /** Invoices less credit notes. */
  net: MoneyDto;
  vat: MoneyDto;
  gross: MoneyDto;
  entries: number;
  lines: number;
  debit: MoneyDto;
  credit: MoneyDto;
}

export class MonthDto {
  /** `2027-03` */
  month: string;
  entries: number;
  closedAt: string | null;
  closedBy: string | null;
}

export class MonthsDto {
  items: MonthDto[];
}
