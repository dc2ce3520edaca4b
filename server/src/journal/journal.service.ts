import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { minorAmount, subtractMinor, zeroAmount, type MinorAmount } from '@emberlot/shared/money/minor-units';
import type { Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import type { RecordedDocument } from './documents.service.js';
import { JournalRepository, type NewLineRow, type PostingRuleRow } from './journal.repository.js';

export interface Posting {
  readonly document: RecordedDocument;
  /** An event of the posting rules. */
  readonly event: string;
  /** Lets one happening post once: unique over the journal. Left out, it is the document's number with the event. */
  readonly sourceKey?: string;
  readonly narrative: string;
  /** Amount per component of the event's rules, in minor units; zeros are left out, one below zero swaps the sides. */
  readonly amounts: Readonly<Record<string, MinorAmount>>;
}

/** Turns events with a value into balanced entries, by the one table of posting rules. */
@Injectable()
export class JournalService {
  constructor(
    private readonly clock: Clock,
    private readonly repository: JournalRepository,
  ) {}

  /**
   * Posts one entry on the document's day in the shop's zone; nothing when every amount is zero.
   *
   * @throws Error for an event or component without a rule: a mistake of ours
   */
  async post(trx: Transaction<DB>, posting: Posting): Promise<void> {
    const amounts = Object.entries(posting.amounts).filter(([, amount]) => amount !== 0);
    if (amounts.length === 0) return;
    const rules = await this.repository.rulesOf(trx, posting.event);
    const lines = amounts.flatMap(([component, amount]) => linesOf(posting.event, rules, component, amount));
    const { document } = posting;
    await this.repository.insertEntry(
      trx,
      {
        documentId: document.id,
        event: posting.event,
        sourceKey: posting.sourceKey ?? `${document.kind}:${document.number}:${posting.event}`,
        day: this.clock.dayOf(document.occurredAt),
        postedAt: this.clock.now(),
        recordedBy: document.recordedBy,
        narrative: posting.narrative,
      },
      netPerAccount(lines),
    );
  }
}

interface SignedLine {
  readonly account: string;
  readonly amount: MinorAmount;
}

function linesOf(
  event: string,
  rules: readonly PostingRuleRow[],
  component: string,
  amount: MinorAmount,
): readonly SignedLine[] {
  const rule = rules.find((candidate) => candidate.component === component);
  if (!rule) throw new Error(`no posting rule for ${component} of ${event}`);
  return [
    { account: rule.debit, amount },
    { account: rule.credit, amount: subtractMinor(zeroAmount, amount) },
  ];
}

/** One line per account and side, in the order in which accounts first appear. */
function netPerAccount(lines: readonly SignedLine[]): readonly NewLineRow[] {
  const debits = new Map<string, number>();
  const credits = new Map<string, number>();
  for (const { account, amount } of lines) {
    const side = amount > 0 ? debits : credits;
    side.set(account, (side.get(account) ?? 0) + Math.abs(amount));
  }
  return [
    ...[...debits].map(([account, debit]) => ({ account, debit: minorAmount(debit), credit: 0 })),
    ...[...credits].map(([account, credit]) => ({ account, debit: 0, credit: minorAmount(credit) })),
  ];
}
