import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { Decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { isStockMeasure } from '@emberlot/shared/measure/stock-measures';
import { positiveStockQuantity } from '@emberlot/shared/measure/stock-quantity';
import type { Kysely } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { changedMeanwhile, fieldFault, type FieldFault } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { BillContentRepository } from './bill-content.repository.js';
import type { BillPart } from './bill-revision.js';
import { BillsRepository } from './bills.repository.js';
import { BillsService } from './bills.service.js';
import type {
  ContentsBagDto,
  ContentsDto,
  ContentsEditDto,
  ContentsLineDto,
  ContentsLineInputDto,
  KitListDto,
  KitListQuery,
} from './contents.dto.js';
import { ContentsRepository } from './contents.repository.js';
import { partDto } from './revision-reader.js';

/** Contents lists: a part that has one is packed as a kit. */
@Injectable()
export class ContentsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly bills: BillsService,
    private readonly parts: BillsRepository,
    private readonly graph: BillContentRepository,
    private readonly contents: ContentsRepository,
  ) {}

  async list(query: KitListQuery): Promise<KitListDto> {
    return this.contents.page(this.database.handle, query);
  }

  /** The contents list of a part; an empty one for a part that is no kit. */
  async open(code: string, handle: Kysely<DB> = this.database.handle): Promise<ContentsDto> {
    const part = await this.bills.part(handle, code);
    const version = await this.contents.version(handle, part.id);
    const rows = await this.contents.lines(handle, part.id);
    const lines = rows.map(({ position, quantity, bag, unitWeightG, made, ...inside }): ContentsLineDto => ({
      position,
      quantity,
      bag,
      unitWeightG,
      made,
      part: inside,
      weightG: unitWeightG === null ? null : decimalText(new Decimal(quantity).times(unitWeightG)),
    }));
    const bags = [...new Set(lines.map(({ bag }) => bag))].map((bag): ContentsBagDto => {
      const inBag = lines.filter((line) => line.bag === bag);
      return { bag, lines: inBag.length, ...weightOf(inBag) };
    });
    return { part: partDto(part), version, lines, bags, ...weightOf(lines) };
  }

  /** Saves a list whole. @throws AppError `changed_meanwhile` with the newer list, `invalid_input` */
  async edit(person: SignedInUser, code: string, input: ContentsEditDto): Promise<ContentsDto> {
    return this.transactions.run(async (trx) => {
      // One list at a time, so that two edits cannot put two kits into each other.
      await this.graph.lockAll(trx);
      const before = await this.open(code, trx);
      if (before.version !== input.version) throw changedMeanwhile(before);
      const kit = await this.bills.part(trx, code);
      const inside = await this.parts.partsByCode(
        trx,
        input.lines.map(({ part }) => part),
      );
      const kits = await this.contents.kitsAmong(
        trx,
        [...inside.values()].map(({ id }) => id),
      );
      const faults = input.lines.flatMap((line, index) =>
        lineFaults(kit, line, { inside, kits, at: `/lines/${index}` }),
      );
      faults.push(...repeatedLines(input.lines));
      if (faults.length > 0) throw inputRefused(faults);
      const outer = input.lines.length > 0 ? await this.contents.findKitWith(trx, kit.id) : undefined;
      if (outer !== undefined) {
        throw fieldFault('/lines', 'in_kit', `${code} lies in the kit ${outer} itself, so it cannot be a kit.`);
      }
      const rows = input.lines.map(({ part, quantity, bag }) => ({ partId: inside.get(part)?.id ?? 0, quantity, bag }));
      await this.contents.replace(trx, kit.id, rows, { at: this.clock.now(), by: person.id });
      const after = await this.open(code, trx);
      await this.audit.record(trx, {
        actor: person,
        action: 'kit.contents_edited',
        subjectKind: 'part',
        subjectId: kit.id,
        subjectCode: code,
        before: recorded(before),
        after: recorded(after),
      });
      return after;
    });
  }
}

function lineFaults(
  kit: BillPart,
  line: ContentsLineInputDto,
  among: { inside: ReadonlyMap<string, BillPart>; kits: ReadonlySet<number>; at: string },
): FieldFault[] {
  const part = among.inside.get(line.part);
  const fault = (field: string, code: string, detail: string): FieldFault => ({
    pointer: `${among.at}/${field}`,
    code,
    detail,
  });
  if (!part) return [fault('part', 'unknown', `There is no part ${line.part}. Add it to the shelf first.`)];
  if (part.id === kit.id) return [fault('part', 'contains_itself', 'A kit cannot be packed into itself.')];
  const faults: FieldFault[] = [];
  if (among.kits.has(part.id))
    faults.push(fault('part', 'kit', `${part.code} is a kit itself. Put its parts in instead.`));
  if (part.retired) faults.push(fault('part', 'retired', `${part.code} is retired. Put another part in its place.`));
  const quantity = attempt(() => isStockMeasure(part.measure) && positiveStockQuantity(line.quantity, part.measure));
  if (!quantity.ok) faults.push(fault('quantity', 'quantity', quantity.fault.message));
  return faults;
}

function repeatedLines(lines: readonly ContentsLineInputDto[]): FieldFault[] {
  const seen = new Set<string>();
  return lines.flatMap(({ part, bag }, index) => {
    const key = JSON.stringify([part, bag]);
    if (seen.has(key)) {
      const detail = `${part} stands in bag ${bag} already. Add the quantities up.`;
      return [{ pointer: `/lines/${index}/part`, code: 'repeated', detail }];
    }
    seen.add(key);
    return [];
  });
}

function weightOf(lines: readonly ContentsLineDto[]): Pick<ContentsBagDto, 'weightG' | 'unweighed'> {
  const sum = lines.reduce((total, { weightG }) => total.plus(weightG ?? 0), new Decimal(0));
  const unweighed = lines.filter(({ weightG }) => weightG === null).map(({ part }) => part.code);
  return { weightG: decimalText(sum), unweighed: [...new Set(unweighed)] };
}

function recorded({ lines }: ContentsDto): Readonly<Record<string, unknown>> {
  return { lines: lines.map(({ part, quantity, bag }) => ({ part: part.code, quantity, bag })) };
}
