import { Injectable } from '@nestjs/common';
import type { PlannedQuantity } from '@emberlot/shared/bill/build-plan';
import { buildable } from '@emberlot/shared/bill/buildable';
import { nextUnit } from '@emberlot/shared/bill/next-unit';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { Decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { partDto } from '../bills/revision-reader.js';
import { BillsService } from '../bills/bills.service.js';
import { Database } from '../platform/database/database.js';
import { AppError } from '../platform/errors/app-error.js';
import { BuildQuestionsService, type PreparedQuestion } from './build-questions.service.js';
import type { BuildableDto, MissingPartDto } from './design-figures.dto.js';

/** How many could be built now, and what stops the next one. */
@Injectable()
export class BuildableService {
  constructor(
    private readonly database: Database,
    private readonly bills: BillsService,
    private readonly questions: BuildQuestionsService,
  ) {}

  /** @throws AppError `not_found`, `rule_broken` for a bill that cannot be counted */
  async of(code: string, number: number): Promise<BuildableDto> {
    const handle = this.database.handle;
    const revision = await this.bills.getByNumber(handle, code, number);
    if (revision.lines.length === 0) {
      throw new AppError('wrong_state', `Revision ${number} of ${code} has no lines yet.`);
    }
    const prepared = await this.questions.prepare(handle, revision);
    const counted = attempt(() => {
      const now = buildable(prepared.question);
      return { now, next: nextUnit(prepared.question, now.quantity) };
    });
    if (!counted.ok) throw new AppError('rule_broken', counted.fault.message);
    const { now, next } = counted.value;
    const missing = (rows: readonly PlannedQuantity[]) => rows.flatMap((row) => missingDto(row, prepared));
    return {
      quantity: decimalText(now.quantity),
      atMost: decimalText(now.atMost),
      stops: missing(next.missing),
      proven: next.proven,
      aloneEnough: missing(next.aloneEnough),
      takes: takenFromShelf(now.plan.takes, now.plan.made, prepared),
      made: now.plan.made.flatMap(({ part, quantity }) => {
        const known = prepared.parts.get(part);
        return known && part !== code ? [{ part: partDto(known), quantity: decimalText(quantity) }] : [];
      }),
    };
  }
}

function missingDto({ part, quantity }: PlannedQuantity, { parts, available }: PreparedQuestion): MissingPartDto[] {
  const known = parts.get(part);
  if (!known) return [];
  const there = available.get(known.id);
  return [
    {
      part: partDto(known),
      missing: decimalText(quantity),
      onShelf: decimalText(there?.onShelf ?? 0),
      usable: decimalText(there?.usable ?? 0),
      claimed: decimalText(there?.claimed ?? 0),
    },
  ];
}

/** What is made on the way does not come from the shelf. */
function takenFromShelf(
  takes: readonly PlannedQuantity[],
  made: readonly PlannedQuantity[],
  { parts, question }: PreparedQuestion,
): BuildableDto['takes'] {
  const sums = new Map<string, Decimal>();
  for (const { part, quantity } of takes) sums.set(part, (sums.get(part) ?? new Decimal(0)).plus(quantity));
  for (const { part, quantity } of made) {
    const taken = sums.get(part);
    if (taken) sums.set(part, taken.minus(quantity));
  }
  return [...sums].flatMap(([code, taken]) => {
    const part = parts.get(code);
    const free = decimalText(question.onHand.get(code) ?? 0);
    return part && taken.greaterThan(0) ? [{ part: partDto(part), taken: decimalText(taken), free }] : [];
  });
}
