import { Injectable } from '@nestjs/common';
import { decimalText } from '@emberlot/shared/measure/decimal';
import { currencyCode, currencyExponent } from '@emberlot/shared/money/currency';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { averageUnitCost, costPool } from '@emberlot/shared/money/movement-value';
import { Database } from '../platform/database/database.js';
import { ShopService } from '../settings/shop.service.js';
import type { StockValueDto, StockValueItemDto, StockValueQuery } from './stock-value.dto.js';
import { StockValueRepository, type StockValueRow } from './stock-value.repository.js';

/** What the shelf is worth now, part by part, beside what the books say it is. */
@Injectable()
export class StockValueService {
  constructor(
    private readonly database: Database,
    private readonly shop: ShopService,
    private readonly repository: StockValueRepository,
  ) {}

  /** Read in one snapshot, so that list, sum and books are of the same moment. */
  async read(query: StockValueQuery): Promise<StockValueDto> {
    const { currency } = await this.shop.get(this.database.handle);
    return this.database.handle
      .transaction()
      .setIsolationLevel('repeatable read')
      .execute(async (trx) => {
        const page = await this.repository.findPage(trx, query);
        const { shelf, accounts } = await this.repository.totals(trx);
        return {
          items: page.items.map((row) => itemDto(row, currency)),
          total: page.total,
          shelfValue: { amount: shelf, currency },
          accountsBalance: { amount: accounts, currency },
        };
      });
  }
}

function itemDto(row: StockValueRow, currency: string): StockValueItemDto {
  const exponent = currencyExponent(currencyCode(currency));
  const average = averageUnitCost(costPool(row.quantity, minorAmount(row.valueMinor)), exponent);
  return {
    part: row.part,
    name: row.name,
    measure: row.measure,
    quantity: decimalText(row.quantity),
    averageCost: average ? decimalText(average) : '0',
    value: { amount: row.valueMinor, currency },
    account: row.traced === 'single' ? '1330' : '1310',
  };
}
