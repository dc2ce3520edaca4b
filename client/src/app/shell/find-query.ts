import { queryOptions } from '@tanstack/react-query';
import { request } from '../../api/request';
import { tagAddress, type TagKind } from '../../components/tag/tag-kinds';
import type { StaffRole } from '../../lib/area';
import { areasFor } from '../areas';
import type { Found } from './find-recent';

interface FoundAnswer {
  items: readonly { kind: TagKind; code: string; story?: string; to?: string; exact?: boolean }[];
}

function addressed({ kind, code, story, to }: FoundAnswer['items'][number]): Found[] {
  const address = to ?? tagAddress(kind, code);
  return address ? [{ kind, code, story, to: address }] : [];
}

/** Things whose code, name or serial fits a few letters; the server leaves out what the role may not see. */
export const findQuery = (q: string) =>
  queryOptions({
    queryKey: ['find', q],
    queryFn: async ({ signal }): Promise<readonly Found[]> => {
      const answer = await request<FoundAnswer>('GET', '/api/find', { query: { q, limit: 8 }, signal });
      return answer.items.flatMap(addressed);
    },
    enabled: q.length > 1,
    retry: false,
    staleTime: 30_000,
  });

/** The one thing a scanned code names, if it names one. */
export async function findExactly(code: string): Promise<Found | undefined> {
  const answer = await request<FoundAnswer>('GET', '/api/find', { query: { q: code, limit: 8 } });
  const exact = answer.items.filter((item) => item.exact ?? item.code.toLowerCase() === code.toLowerCase());
  return exact.flatMap(addressed)[0];
}

/** Areas and their lists, by the beginning of any of their words. */
export function findPages(q: string, role: StaffRole): readonly Found[] {
  const asked = q.toLowerCase();
  const pages = areasFor(role).flatMap((area): Found[] => [
    { kind: 'page', code: area.label, to: area.path },
    ...area.links
      .filter(({ roles }) => !roles || roles.includes(role))
      .map(({ label, to }): Found => ({ kind: 'page', code: label, story: `in ${area.label}`, to })),
  ]);
  return pages
    .filter(({ code }) =>
      code
        .toLowerCase()
        .split(' ')
        .some((word) => word.startsWith(asked)),
    )
    .slice(0, 5);
}
