import { Injectable } from '@nestjs/common';
import { decimalText } from '@emberlot/shared/measure/decimal';
import { seesMoney } from '../platform/auth/sees-money.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import type { Page } from '../platform/paging/page.js';
import { ShopService } from '../settings/shop.service.js';
import type { MoveDto, MovesQuery } from './move.dto.js';
import { MovesRepository, type MoveRecord } from './moves.repository.js';
import { isReversible } from './reverse-document.service.js';

/** The stock ledger, for reading. */
@Injectable()
export class MovesService {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly shop: ShopService,
    private readonly moves: MovesRepository,
  ) {}

  async list(query: MovesQuery, person: SignedInUser): Promise<Page<MoveDto>> {
    const span = {
      since: query.from === undefined ? undefined : this.clock.startOf(query.from),
      before: query.to === undefined ? undefined : this.clock.endOf(query.to),
    };
    const page = await this.moves.findPage(this.database.handle, query, span);
    const currency = await this.currencyFor(person);
    return { items: page.items.map((row) => moveDto(row, currency)), total: page.total };
  }

  /** The latest moves of a part or lot, newest first. */
  async latest(of: { readonly partId: number } | { readonly lotId: number }, person: SignedInUser): Promise<MoveDto[]> {
    const currency = await this.currencyFor(person);
    const rows = await this.moves.latest(this.database.handle, of, 100);
    return rows.map((row) => moveDto(row, currency));
  }

  /** The currency of the books, for those who are shown money. */
  async currencyFor(person: SignedInUser): Promise<string | undefined> {
    if (!seesMoney(person)) return undefined;
    return (await this.shop.find(this.database.handle))?.currency;
  }
}

function moveDto(row: MoveRecord, currency: string | undefined): MoveDto {
  const { occurredAt, quantity, valueMinor, reversedBy, ...rest } = row;
  const shown = {
    ...rest,
    occurredAt: occurredAt.toISOString(),
    quantity: decimalText(quantity),
    reversible: reversedBy === null && isReversible(row.documentKind),
  };
  return currency === undefined ? shown : { ...shown, value: { amount: valueMinor, currency } };
}
