import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../api/request';
import { gridQuery, type GridState } from '../../../components/grid/grid-address';
import type { ListAnswer } from '../../../components/grid/use-server-grid';

export interface AuditEntry {
  id: number;
  recordedAt: string;
  actorId: number | null;
  /** Null for what the product did by itself. */
  actorName: string | null;
  actorRole: string | null;
  action: string;
  subjectKind: string;
  subjectId: number | null;
  subjectCode: string | null;
  before: Record<string, unknown> | null;
  after: Record<string, unknown> | null;
}

export const auditQuery = (state: GridState) =>
  queryOptions({
    queryKey: ['audit', state] as const,
    queryFn: ({ signal }) =>
      request<ListAnswer<AuditEntry>>('GET', '/api/audit-entries', { query: gridQuery(state), signal }),
  });
