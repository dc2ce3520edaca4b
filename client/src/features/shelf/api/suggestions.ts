import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../api/request';
import { shelfKey } from './parts';

export type Suggested = 'part' | 'bin' | 'supplier';

interface Suggestion {
  code: string;
  name: string;
}

const lists: Record<Suggested, string> = { part: '/api/parts', bin: '/api/bins', supplier: '/api/suppliers' };

/** A few things whose code or name fits what is being typed. */
export const suggestionsQuery = (kind: Suggested, q: string) =>
  queryOptions({
    queryKey: [...shelfKey, 'suggestions', kind, q] as const,
    queryFn: async ({ signal }): Promise<readonly Suggestion[]> => {
      const query = { q, pageSize: 8 };
      return (await request<{ items: readonly Suggestion[] }>('GET', lists[kind], { query, signal })).items;
    },
    enabled: q.length > 0,
    staleTime: 30_000,
  });
