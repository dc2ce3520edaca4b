import { Injectable } from '@nestjs/common';
import { explode, explodeIndented } from '@emberlot/shared/bill/explode';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { type Decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { Database } from '../platform/database/database.js';
import { AppError } from '../platform/errors/app-error.js';
import { billsOf, issueDecimalsOf, partsOf } from './bill-arithmetic.js';
import { BillListsRepository } from './bill-lists.repository.js';
import type { BillRevisionDto } from './bill.dto.js';
import type {
  BillComparisonDto,
  BillDto,
  BillListDto,
  BillListQuery,
  BillTreeDto,
  ComponentListDto,
  ComponentQuery,
  TreeRowDto,
  WhereUsedDto,
} from './bill-views.dto.js';
import type { BillPart, BillRevision, RevisionLine } from './bill-revision.js';
import { BillsService } from './bills.service.js';
import { lineChanges, namedChanges, type Change } from './revision-changes.js';
import { partDto, RevisionReader } from './revision-reader.js';
import { WhereUsedRepository } from './where-used.repository.js';

/** Bills as the screens show them. */
@Injectable()
export class BillViewsService {
  constructor(
    private readonly database: Database,
    private readonly bills: BillsService,
    private readonly lists: BillListsRepository,
    private readonly whereUsedRows: WhereUsedRepository,
    private readonly reader: RevisionReader,
  ) {}

  async list(query: BillListQuery): Promise<BillListDto> {
    return this.lists.page(this.database.handle, query);
  }

  async components(query: ComponentQuery): Promise<ComponentListDto> {
    return this.lists.components(this.database.handle, query);
  }

  /** A part's bill with all its revisions; none of them for a part that is not made. */
  async open(code: string): Promise<BillDto> {
    const handle = this.database.handle;
    const part = await this.bills.part(handle, code);
    const revisions = await this.lists.revisions(handle, part.id);
    const numberOf = (status: string) => revisions.find((revision) => revision.status === status)?.number ?? null;
    return {
      part: partDto(part),
      revisions,
      released: numberOf('released'),
      draft: numberOf('draft'),
      usedIn: await this.lists.usedIn(handle, part.id),
    };
  }

  async revision(code: string, number: number): Promise<BillRevisionDto> {
    const handle = this.database.handle;
    return this.reader.toDto(handle, await this.bills.getByNumber(handle, code, number));
  }

  /** @throws AppError `rule_broken` when the tree is too large to be written out */
  async tree(code: string, number: number, quantity: string): Promise<BillTreeDto> {
    const handle = this.database.handle;
    const top = await this.bills.getByNumber(handle, code, number);
    const below = await this.bills.withAllBelow(handle, top);
    const revisions = [...below.values()];
    const parts = partsOf(revisions);
    const bills = billsOf(revisions);
    const exploded = attempt(() => ({
      rows: explodeIndented(bills, code, quantity, 5_000),
      totals: explode(bills, code, quantity, issueDecimalsOf(parts)),
    }));
    if (!exploded.ok) throw new AppError('rule_broken', exploded.fault.message);
    const lines = linesByPlace(revisions);
    const madeBy = new Map(revisions.map((revision) => [revision.part.code, revision.number]));
    return {
      quantity,
      rows: exploded.value.rows.flatMap((row): TreeRowDto[] => {
        const line = lines.get(`${row.parent} ${row.path.at(-1)}`);
        if (!line) return [];
        return [
          {
            path: row.path.map(Number),
            level: row.level,
            parent: row.parent,
            quantity: decimalText(readable(row.quantity)),
            ...treeLine(line),
            madeBy: madeBy.get(row.part) ?? null,
          },
        ];
      }),
      totals: exploded.value.totals.flatMap(({ part, level, quantity: total, made }) => {
        const known = parts.get(part);
        return known ? [{ part: partDto(known), level, quantity: decimalText(total), made }] : [];
      }),
    };
  }

  async compare(code: string, from: number, to: number): Promise<BillComparisonDto> {
    const handle = this.database.handle;
    const [before, after] = [
      await this.bills.getByNumber(handle, code, from),
      await this.bills.getByNumber(handle, code, to),
    ];
    const [earlier, later] = [await this.reader.toDto(handle, before), await this.reader.toDto(handle, after)];
    const at = (revision: BillRevisionDto, line: RevisionLine | null) =>
      revision.lines.find(({ position }) => position === line?.position) ?? null;
    return {
      from,
      to,
      lines: lineChanges(before, after).map((change: Change<RevisionLine>) => ({
        ...change,
        before: at(earlier, change.before),
        after: at(later, change.after),
      })),
      steps: namedChanges(earlier.steps, later.steps, ({ title }) => title),
      testPlan: namedChanges(earlier.testPlan, later.testPlan, ({ name }) => name),
    };
  }

  /** What contains a part, at every level, over released revisions and drafts; and the kits it ends up in. */
  async whereUsed(code: string): Promise<WhereUsedDto> {
    const handle = this.database.handle;
    const part = await this.bills.part(handle, code);
    const rows = await this.whereUsedRows.uses(handle, part.id);
    const kits = await this.whereUsedRows.kits(handle, [code, ...new Set(rows.map((row) => row.code))]);
    return {
      part: partDto(part),
      uses: rows.map(({ code: above, name, measure, traced, retired, ...use }) => ({
        ...use,
        part: { code: above, name, measure, traced, retired },
      })),
      kits: kits.map(({ code: kit, name, measure, traced, retired, ...use }) => ({
        ...use,
        part: { code: kit, name, measure, traced, retired },
      })),
    };
  }
}

/** Four decimals, and for what is smaller four digits: a quotient that never ends is for reading only. */
function readable(quantity: Decimal): Decimal {
  return quantity.toDecimalPlaces(Math.max(4, 3 - quantity.e));
}

function linesByPlace(revisions: readonly BillRevision[]): ReadonlyMap<string, RevisionLine> {
  return new Map(
    revisions.flatMap(({ part, lines }) => lines.map((line) => [`${part.code} ${line.position}`, line] as const)),
  );
}

function treeLine({ part, quantityPer, scrapPercent, marks, alternates }: RevisionLine) {
  const codes = alternates.map(({ code }: BillPart) => code);
  return { part: partDto(part), quantityPer, scrapPercent, marks, alternates: codes };
}
