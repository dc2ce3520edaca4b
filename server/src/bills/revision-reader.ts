import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';
import { minutesOf } from './bill-arithmetic.js';
import type { BillPartDto, BillRevisionDto } from './bill.dto.js';
import type { BillPart, BillRevision } from './bill-revision.js';
import { BillsService } from './bills.service.js';
import { without } from './without.js';

/** A revision as it travels, with what the screens show beside each line. */
@Injectable()
export class RevisionReader {
  constructor(private readonly bills: BillsService) {}

  async read(handle: Kysely<DB>, revisionId: number): Promise<BillRevisionDto> {
    return this.toDto(handle, await this.bills.get(handle, revisionId));
  }

  async toDto(handle: Kysely<DB>, revision: BillRevision): Promise<BillRevisionDto> {
    const made = await this.bills.released(
      handle,
      revision.lines.map(({ part }) => part.id),
    );
    const { part, lines, steps, testPlan } = revision;
    return {
      ...without(revision, 'id'),
      part: partDto(part),
      minutes: minutesOf(revision),
      lines: lines.map((line) => ({
        ...without(line, 'id'),
        part: partDto(line.part),
        alternates: line.alternates.map(partDto),
        madeBy: made.get(line.part.id)?.number ?? null,
      })),
      steps: steps.map((step) => without(step, 'id')),
      testPlan: testPlan.map((characteristic) => without(characteristic, 'id')),
    };
  }
}

export function partDto({ code, name, measure, traced, retired }: BillPart): BillPartDto {
  return { code, name, measure, traced, retired };
}
