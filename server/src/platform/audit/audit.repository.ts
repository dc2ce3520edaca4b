import { Injectable } from '@nestjs/common';
import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { containing, countOf, paged, sorted, type Page } from '../paging/page.js';
import type { AuditQuery } from './audit.dto.js';

const sortColumns = {
  recordedAt: 'recorded_at',
  action: 'action',
  actorName: 'actor_name',
  subjectCode: 'subject_code',
};

const columns = [
  'id',
  'recorded_at',
  'actor_id',
  'actor_name',
  'actor_role',
  'action',
  'subject_kind',
  'subject_id',
  'subject_code',
  'before',
  'after',
] as const;

/** Instants between which the entries lie, in place of the query's days. */
export interface AuditSpan {
  readonly since: Date | undefined;
  readonly before: Date | undefined;
}

@Injectable()
export class AuditRepository {
  async findPage(handle: Kysely<DB>, query: AuditQuery, span: AuditSpan): Promise<Page<AuditRow>> {
    const found = filtered(handle, query, span);
    const [items, total] = [
      await paged(sorted(found.select(columns), query.sort, sortColumns, '-recordedAt', 'id'), query).execute(),
      await countOf(found),
    ];
    return { items, total };
  }
}

export type AuditRow = Awaited<ReturnType<typeof rowsOf>>[number];

function rowsOf(handle: Kysely<DB>) {
  return handle.selectFrom('audit_entry').select(columns).execute();
}

function filtered(handle: Kysely<DB>, query: AuditQuery, span: AuditSpan) {
  let found = handle.selectFrom('audit_entry');
  if (query.q) {
    const pattern = containing(query.q);
    found = found.where((where) =>
      where.or([where('subject_code', 'ilike', pattern), where('actor_name', 'ilike', pattern)]),
    );
  }
  if (query.action) found = found.where('action', 'like', `${query.action.replaceAll('_', '\\_')}%`);
  if (query.subjectKind) found = found.where('subject_kind', '=', query.subjectKind);
  if (query.subjectId !== undefined) found = found.where('subject_id', '=', query.subjectId);
  if (query.actorId !== undefined) found = found.where('actor_id', '=', query.actorId);
  if (query.actorRole) found = found.where('actor_role', '=', query.actorRole);
  if (span.since) found = found.where('recorded_at', '>=', span.since);
  if (span.before) found = found.where('recorded_at', '<', span.before);
  return found;
}
