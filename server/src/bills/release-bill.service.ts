import { Injectable } from '@nestjs/common';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, type FieldFault } from '../platform/errors/app-error.js';
import { BillContentRepository } from './bill-content.repository.js';
import type { BillRevisionDto } from './bill.dto.js';
import { revisionCode } from './bill-record.js';
import type { BillPart, BillRevision } from './bill-revision.js';
import { BillsService } from './bills.service.js';
import { refuseUnlessDraft } from './draft-bills.service.js';
import { RevisionReader } from './revision-reader.js';

/** Puts a draft in force. From then on it cannot change, and the revision before is superseded. */
@Injectable()
export class ReleaseBillService {
  constructor(
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly bills: BillsService,
    private readonly content: BillContentRepository,
    private readonly reader: RevisionReader,
  ) {}

  /** @throws AppError `rule_broken` with everything that stands against it, `changed_meanwhile`, `wrong_state` */
  async release(person: SignedInUser, code: string, number: number, version: number): Promise<BillRevisionDto> {
    return this.transactions.run(async (trx) => {
      await this.content.lockAll(trx);
      const draft = await this.bills.getByNumber(trx, code, number);
      refuseUnlessDraft(draft);
      if (draft.version !== version) throw changedMeanwhile(await this.reader.read(trx, draft.id));
      refuseUnfit(draft);
      const at = this.clock.now();
      const earlier = await this.bills.findReleased(trx, draft.part.id);
      if (earlier) await this.content.supersede(trx, draft.part.id, at);
      if (!(await this.content.release(trx, draft.id, version, { id: person.id, at }))) {
        throw changedMeanwhile(await this.reader.read(trx, draft.id));
      }
      await this.audit.record(trx, {
        actor: person,
        action: 'bill.released',
        subjectKind: 'bill_revision',
        subjectId: draft.id,
        subjectCode: revisionCode(draft),
        before: { status: 'draft', released: earlier?.number ?? null },
        after: { status: 'released', released: draft.number },
      });
      return this.reader.read(trx, draft.id);
    });
  }
}

function refuseUnfit(draft: BillRevision): void {
  const faults = releaseFaults(draft);
  if (faults.length === 0) return;
  const [first, second, third, ...others] = faults.map(({ detail }) => detail);
  const rest = others.length > 0 ? `And ${others.length} more.` : undefined;
  const sentence = [first, second, third, rest].filter((part) => part !== undefined).join(' ');
  throw new AppError('rule_broken', sentence, { faults });
}

/** What stands against releasing a draft. That nothing contains itself is held by each edit. */
export function releaseFaults(draft: BillRevision): FieldFault[] {
  const { part, lines, testPlan } = draft;
  const faults: FieldFault[] = [];
  if (part.retired) faults.push({ pointer: '/part', code: 'retired', detail: `${part.code} is retired.` });
  if (lines.length === 0) {
    faults.push({ pointer: '/lines', code: 'empty', detail: 'Add at least one line: nothing is made of nothing.' });
  }
  if (part.traced === 'single' && testPlan.length === 0) {
    const detail = `${part.code} is made one by one, so it needs a test plan with at least one line.`;
    faults.push({ pointer: '/testPlan', code: 'empty', detail });
  }
  lines.forEach((line, index) => {
    if (line.part.retired) faults.push(retired(`/lines/${index}/part`, line.part));
    for (const alternate of line.alternates) {
      if (alternate.retired) faults.push(retired(`/lines/${index}/alternates`, alternate));
    }
  });
  return faults;
}

function retired(pointer: string, part: BillPart): FieldFault {
  return { pointer, code: 'retired', detail: `${part.code} is retired. Put another part in its place.` };
}
