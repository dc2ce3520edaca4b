import { MoneyDto } from '../platform/api/money.dto.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';

export class StockValueQuery extends PageQuery {}

export class StockValueItemDto {
  part: string;
  name: string;
  measure: string;
  quantity: string;
  averageCost: string;
  value: MoneyDto;
  /** The stock account it stands in. */
  account: string;
}

export class StockValueDto {
  items: StockValueItemDto[];
  total: number;
  /** Of the whole shelf, whatever is searched for. */
  shelfValue: MoneyDto;
  /** What the stock accounts carry; the same, at every moment. */
  accountsBalance: MoneyDto;
}
