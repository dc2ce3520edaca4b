import { Injectable } from '@nestjs/common';
import type { Transaction } from 'kysely';
import type { DB, JsonValue } from '@emberlot/db/database.types';
import type { SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../clock/clock.js';

export interface AuditRecord {
  /** Who did it; null for what the product does by itself (a job, a webhook). */
  readonly actor: Pick<SignedInUser, 'id' | 'name' | 'role'> | null;
  /** What was done, from the general to the special: `user.role_changed`. */
  readonly action: string;
  /** What it was done to: a table's name in the singular. */
  readonly subjectKind: string;
  readonly subjectId: number | null;
  /** The code on the subject's tag, or the name people know it by. */
  readonly subjectCode?: string | null;
  /** The values that changed, before and after; never a secret. */
  readonly before?: object;
  readonly after?: object;
  readonly requestId?: string;
}

/** The record of who did what, which the server's database role can add to and nothing else. */
@Injectable()
export class Audit {
  constructor(private readonly clock: Clock) {}

  /** Written in the transaction of the deed, so that there is neither one without the other. */
  async record(trx: Transaction<DB>, entry: AuditRecord): Promise<void> {
    await trx
      .insertInto('audit_entry')
      .values({
        recorded_at: this.clock.now(),
        actor_id: entry.actor?.id ?? null,
        actor_name: entry.actor?.name ?? null,
        actor_role: entry.actor?.role ?? null,
        action: entry.action,
        subject_kind: entry.subjectKind,
        subject_id: entry.subjectId,
        subject_code: entry.subjectCode ?? null,
        before: asJson(entry.before),
        after: asJson(entry.after),
        request_id: entry.requestId ?? null,
      })
      .execute();
  }
}

/** Dates become ISO strings and the like, as they would on the wire. */
function asJson(values: object | undefined): JsonValue | null {
  return values === undefined ? null : (JSON.parse(JSON.stringify(values)) as JsonValue);
}
