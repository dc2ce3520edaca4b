import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, type FieldFault } from '../platform/errors/app-error.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import { BillContentRepository } from './bill-content.repository.js';
import { checkContent, codesIn, containsItself, contentOf, type CheckedContent } from './bill-content.js';
import type { BillContentDto, BillEditDto, BillRevisionDto, NewDraftDto } from './bill.dto.js';
import { loopThrough } from './bill-loops.js';
import type { BillPart, BillRevision } from './bill-revision.js';
import { recordedContent, revisionCode } from './bill-record.js';
import { BillsRepository } from './bills.repository.js';
import { BillsService } from './bills.service.js';
import { RevisionReader } from './revision-reader.js';

/** Makes drafts and changes them. A draft is saved whole. */
@Injectable()
export class DraftBillsService {
  constructor(
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly bills: BillsService,
    private readonly repository: BillsRepository,
    private readonly content: BillContentRepository,
    private readonly reader: RevisionReader,
  ) {}

  /** @throws AppError `already_exists` when the part has a draft, `wrong_state` when nothing is released to begin with */
  async create(person: SignedInUser, code: string, input: NewDraftDto): Promise<BillRevisionDto> {
    return this.transactions.run(async (trx) => {
      const part = await this.bills.part(trx, code);
      if (part.retired)
        throw new AppError('wrong_state', `${code} is retired. Bring it back before designing it anew.`);
      const draft = await this.begin(trx, person, part, input.from);
      return this.reader.read(trx, draft);
    });
  }

  /** Begins a draft in the caller's transaction. @throws AppError as `create` */
  async begin(
    trx: Transaction<DB>,
    person: SignedInUser,
    part: BillPart,
    beginning: NewDraftDto['from'],
  ): Promise<number> {
    await this.content.lockAll(trx);
    const from = beginning === 'released' ? await this.bills.getReleased(trx, part.id) : undefined;
    return this.#insert(trx, person, part, { note: null, content: from && contentOf(from) });
  }

  /**
   * Makes a draft with its content in the caller's transaction, for imports.
   *
   * @throws AppError as `create` and `edit`
   */
  async createWith(
    trx: Transaction<DB>,
    person: SignedInUser,
    code: string,
    input: BillContentDto,
  ): Promise<BillRevision> {
    const part = await this.bills.part(trx, code);
    await this.content.lockAll(trx);
    const checked = await this.#check(trx, part, input, 0);
    const id = await this.#insert(trx, person, part, { note: input.note ?? null, content: checked });
    return this.bills.get(trx, id);
  }

  /** @throws AppError `changed_meanwhile` with the newer state, `wrong_state` for what is no draft, `invalid_input` */
  async edit(person: SignedInUser, code: string, number: number, input: BillEditDto): Promise<BillRevisionDto> {
    return this.transactions.run(async (trx) => {
      const before = await this.bills.getByNumber(trx, code, number);
      await this.replace(trx, person, before, input);
      return this.reader.read(trx, before.id);
    });
  }

  /** Changes a draft in the caller's transaction, for imports. @throws AppError as `edit` */
  async replace(trx: Transaction<DB>, person: SignedInUser, before: BillRevision, input: BillEditDto): Promise<void> {
    refuseUnlessDraft(before);
    await this.content.lockAll(trx);
    if (!(await this.content.takeDraft(trx, before.id, input.version, input.note ?? null))) {
      throw changedMeanwhile(await this.reader.read(trx, before.id));
    }
    const checked = await this.#check(trx, before.part, input, before.id);
    await this.content.replace(trx, before.id, checked);
    const after = await this.bills.get(trx, before.id);
    await this.audit.record(trx, {
      actor: person,
      action: 'bill.edited',
      subjectKind: 'bill_revision',
      subjectId: before.id,
      subjectCode: revisionCode(before),
      before: recordedContent(before),
      after: recordedContent(after),
    });
  }

  /** @throws AppError `changed_meanwhile`, `wrong_state` */
  async discard(person: SignedInUser, code: string, number: number, version: number): Promise<void> {
    await this.transactions.run(async (trx) => {
      const before = await this.bills.getByNumber(trx, code, number);
      refuseUnlessDraft(before);
      if (!(await this.content.deleteDraft(trx, before.id, version))) {
        throw changedMeanwhile(await this.reader.read(trx, before.id));
      }
      await this.audit.record(trx, {
        actor: person,
        action: 'bill.draft_discarded',
        subjectKind: 'bill_revision',
        subjectId: before.id,
        subjectCode: revisionCode(before),
        before: recordedContent(before),
      });
    });
  }

  async #insert(
    trx: Transaction<DB>,
    person: SignedInUser,
    part: BillPart,
    begin: { readonly note: string | null; readonly content: CheckedContent | undefined },
  ): Promise<number> {
    const made = { partId: part.id, note: begin.note, by: person.id, at: this.clock.now() };
    const { id } = await this.content.insertDraft(trx, made);
    if (begin.content) await this.content.replace(trx, id, begin.content);
    const after = await this.bills.get(trx, id);
    await this.audit.record(trx, {
      actor: person,
      action: 'bill.draft_created',
      subjectKind: 'bill_revision',
      subjectId: id,
      subjectCode: revisionCode(after),
      after: recordedContent(after),
    });
    return id;
  }

  /** The graph's lock is held, so what is read here stays until the end. */
  async #check(
    trx: Transaction<DB>,
    owner: BillPart,
    input: BillContentDto,
    revisionId: number,
  ): Promise<CheckedContent> {
    const parts = await this.repository.partsByCode(trx, codesIn(input));
    const { content, faults } = checkContent(owner, input, parts);
    if (faults.length > 0) throw inputRefused(faults);
    const loop = await this.#loopFault(trx, owner, input, { parts, revisionId });
    if (loop) throw inputRefused([loop]);
    return content;
  }

  async #loopFault(
    trx: Transaction<DB>,
    owner: BillPart,
    input: BillContentDto,
    among: { readonly parts: ReadonlyMap<string, BillPart>; readonly revisionId: number },
  ): Promise<FieldFault | undefined> {
    const ids = [...among.parts.values()].map(({ id }) => id);
    const edges = await this.content.edgesBelow(trx, ids, among.revisionId);
    const loop = loopThrough(owner.code, codesIn(input), edges);
    if (!loop) return undefined;
    const component = loop[1] ?? owner.code;
    const index = input.lines.findIndex((line) => line.part === component || line.alternates.includes(component));
    const field = input.lines[index]?.part === component ? 'part' : 'alternates';
    return containsItself(`/lines/${index}/${field}`, loop.join(' contains '));
  }
}

export function refuseUnlessDraft(revision: BillRevision): void {
  if (revision.status === 'draft') return;
  const sentence = `Revision ${revision.number} of ${revision.part.code} is ${revision.status} and cannot change. Make a draft from it.`;
  throw new AppError('wrong_state', sentence);
}
