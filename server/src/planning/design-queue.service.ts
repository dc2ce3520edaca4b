import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { nextUnit } from '@emberlot/shared/bill/next-unit';
import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import type { Kysely } from 'kysely';
import type { BillRevision } from '../bills/bill-revision.js';
import { BillsService } from '../bills/bills.service.js';
import { releaseFaults } from '../bills/release-bill.service.js';
import { partDto } from '../bills/revision-reader.js';
import { Database } from '../platform/database/database.js';
import { BuildQuestionsService } from './build-questions.service.js';
import type { DesignQueueDto, DesignQueueItemDto } from './design-figures.dto.js';
import { ReleasedBillsRepository } from './released-bills.repository.js';

/** A look at each bill is enough here; the design's own page searches for longer. */
const branchingSteps = 200;

/** What of the designs needs a hand. */
@Injectable()
export class DesignQueueService {
  constructor(
    private readonly database: Database,
    private readonly bills: BillsService,
    private readonly questions: BuildQuestionsService,
    private readonly inHand: ReleasedBillsRepository,
  ) {}

  /** Drafts first, then released bills with retired components, then those of which not one can be built. */
  async read(): Promise<DesignQueueDto> {
    const handle = this.database.handle;
    const rows = await this.inHand.inHand(handle);
    const idsOf = (status: string) => rows.filter((row) => row.status === status).map(({ id }) => id);
    const drafts = await this.bills.read(handle, idsOf('draft'));
    const released = await this.bills.read(handle, idsOf('released'));
    const retired = released.flatMap(retiredItem);
    const short: DesignQueueItemDto[] = [];
    for (const revision of released) short.push(...(await this.#shortItem(handle, revision)));
    return { items: [...drafts.map(draftItem), ...retired, ...short] };
  }

  async #shortItem(handle: Kysely<DB>, revision: BillRevision): Promise<DesignQueueItemDto[]> {
    const { question } = await this.questions.prepare(handle, revision);
    const next = attempt(() => nextUnit(question, 0, undefined, branchingSteps));
    if (!next.ok || next.value.missing.length === 0) return [];
    const parts = next.value.missing.map(({ part }) => part);
    return [itemOf(revision, 'cannot_build', { parts })];
  }
}

function draftItem(draft: BillRevision): DesignQueueItemDto {
  return itemOf(draft, 'draft_waiting', { against: releaseFaults(draft).map(({ detail }) => detail) });
}

function retiredItem(revision: BillRevision): DesignQueueItemDto[] {
  const retired = revision.lines.flatMap(({ part }) => (part.retired ? [part.code] : []));
  return retired.length > 0 ? [itemOf(revision, 'component_retired', { parts: [...new Set(retired)] })] : [];
}

function itemOf(
  revision: BillRevision,
  kind: DesignQueueItemDto['kind'],
  { parts = [], against = [] }: Partial<Pick<DesignQueueItemDto, 'parts' | 'against'>>,
): DesignQueueItemDto {
  const { part, number, createdAt, releasedAt } = revision;
  return { kind, part: partDto(part), number, since: releasedAt ?? createdAt, parts, against };
}
