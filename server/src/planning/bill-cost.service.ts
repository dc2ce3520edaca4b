import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { takenPerUnit } from '@emberlot/shared/bill/bill-lines';
import { rollUp, type RolledUpCost } from '@emberlot/shared/bill/roll-up';
import { Decimal, decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { apportion } from '@emberlot/shared/money/apportion';
import { currencyCode, currencyExponent } from '@emberlot/shared/money/currency';
import { lineAmount } from '@emberlot/shared/money/line-amount';
import { minorAmount, subtractMinor } from '@emberlot/shared/money/minor-units';
import { averageUnitCost, costPool } from '@emberlot/shared/money/movement-value';
import type { Kysely } from 'kysely';
import { arithmeticLine, billsOf, minutesOf, partsOf } from '../bills/bill-arithmetic.js';
import type { BillPart, BillRevision } from '../bills/bill-revision.js';
import { BillsService } from '../bills/bills.service.js';
import { partDto } from '../bills/revision-reader.js';
import { Database } from '../platform/database/database.js';
import { ShopService, type Shop } from '../settings/shop.service.js';
import type { BillCostDto, CostLineDto } from './design-figures.dto.js';
import { PartCostsRepository } from './part-costs.repository.js';

interface KnownCost {
  readonly cost: Decimal;
  readonly basis: 'average' | 'last';
}

/** What one made costs today: materials at their average cost, minutes at the shop's rate, over all levels. */
@Injectable()
export class BillCostService {
  constructor(
    private readonly database: Database,
    private readonly bills: BillsService,
    private readonly shop: ShopService,
    private readonly costs: PartCostsRepository,
  ) {}

  async of(code: string, number: number): Promise<BillCostDto> {
    const handle = this.database.handle;
    const revision = await this.bills.getByNumber(handle, code, number);
    const shop = await this.shop.get(handle);
    const below = await this.bills.withAllBelow(handle, revision);
    const parts = partsOf(below.values());
    const known = await this.#known(handle, parts, shop);
    const minutes = new Map([...below.values()].map((each) => [each.part.code, minutesOf(each)]));
    const rolledUp = rollUp({
      bills: billsOf(below.values()),
      unitCost: (part) => known.get(part)?.cost,
      minutes: (part) => minutes.get(part) ?? 0,
      labourPerHour: new Decimal(shop.labour_rate_minor).div(new Decimal(10).pow(exponentOf(shop))),
    });
    return costDto(revision, { rolledUp, known, made: new Set(minutes.keys()), parts, shop });
  }

  async #known(
    handle: Kysely<DB>,
    parts: ReadonlyMap<string, BillPart>,
    shop: Shop,
  ): Promise<ReadonlyMap<string, KnownCost>> {
    const codes = new Map([...parts.values()].map(({ id, code }) => [id, code]));
    const rows = await this.costs.read(handle, [...codes.keys()]);
    return new Map(
      rows.flatMap((row): [string, KnownCost][] => {
        const code = codes.get(row.partId) ?? '';
        const average = averageUnitCost(costPool(row.quantity, minorAmount(row.valueMinor)), exponentOf(shop));
        if (average !== undefined) return [[code, { cost: average, basis: 'average' }]];
        return row.lastCost === null ? [] : [[code, { cost: decimal(row.lastCost), basis: 'last' }]];
      }),
    );
  }
}

interface CostsFound {
  readonly rolledUp: ReadonlyMap<string, RolledUpCost>;
  readonly known: ReadonlyMap<string, KnownCost>;
  /** Codes of parts that have a bill here. */
  readonly made: ReadonlySet<string>;
  readonly parts: ReadonlyMap<string, BillPart>;
  readonly shop: Shop;
}

function costDto(revision: BillRevision, found: CostsFound): BillCostDto {
  const { shop, parts } = found;
  const currency = currencyCode(shop.currency);
  const cost = found.rolledUp.get(revision.part.code);
  const ownMinutes = minutesOf(revision);
  const rate = new Decimal(shop.labour_rate_minor).div(new Decimal(10).pow(exponentOf(shop)));
  const money = (amount: number) => ({ amount, currency: shop.currency });
  const rounded = (value: Decimal) => lineAmount({ quantity: 1, price: value }, currency, 'half-even');
  const total = rounded(cost?.total ?? new Decimal(0));
  const labour = rounded(cost?.labour ?? new Decimal(0));
  const own = rounded(decimal(ownMinutes).times(rate).div(60));
  return {
    lines: costLines(revision, found, subtractMinor(total, own)),
    ownMinutes,
    minutes: decimalText(cost?.minutes.toDecimalPlaces(2) ?? 0),
    labourPerHour: money(shop.labour_rate_minor),
    material: money(subtractMinor(total, labour)),
    labour: money(labour),
    total: money(total),
    unknown: (cost?.unknown ?? []).flatMap((code) => {
      const part = parts.get(code);
      return part ? [partDto(part)] : [];
    }),
  };
}

/** @param toSpread what the lines come to together, so that they add up to the total */
function costLines(
  revision: BillRevision,
  found: CostsFound,
  toSpread: ReturnType<typeof subtractMinor>,
): CostLineDto[] {
  const lines = revision.lines.map((line) => {
    const taken = takenPerUnit(arithmeticLine(line));
    const unit = found.rolledUp.get(line.part.code);
    return { line, taken, unit, value: taken.times(unit?.total ?? 0) };
  });
  const isWorthless = lines.every(({ value }) => value.isZero());
  const amounts = isWorthless
    ? lines.map(() => minorAmount(0))
    : apportion(
        toSpread,
        lines.map(({ value }) => value.toDecimalPlaces(12)),
      );
  return lines.map(({ line, taken, unit }, index) => {
    const basis = basisOf(line.part.code, found);
    return {
      position: line.position,
      part: partDto(line.part),
      taken: decimalText(taken.toDecimalPlaces(6)),
      unitCost: basis === 'unknown' ? null : (unit?.total ?? new Decimal(0)).toDecimalPlaces(6).toFixed(),
      basis,
      amount: { amount: amounts[index] ?? 0, currency: found.shop.currency },
    };
  });
}

function basisOf(code: string, { known, made }: CostsFound): CostLineDto['basis'] {
  return made.has(code) ? 'bill' : (known.get(code)?.basis ?? 'unknown');
}

function exponentOf(shop: Shop): number {
  return currencyExponent(currencyCode(shop.currency));
}
