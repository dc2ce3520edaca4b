import { queryOptions } from '@tanstack/react-query';
import { list, type RowOf } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';

export type AuditEntry = RowOf<'/api/audit-entries'>;

export const auditQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['audit', state] as const,
    queryFn: ({ signal }) => list('/api/audit-entries', state, signal),
  });
