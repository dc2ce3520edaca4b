import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';

export type PartItem = RowOf<'/api/parts'>;
export type Part = Dto<'PartDto'>;
export type PartInput = Dto<'PartInputDto'>;
export type PartStory = Dto<'PartStoryDto'>;

/** What moves, claims or renames anything on the shelf touches all of it. */
export const shelfKey = ['shelf'] as const;

export const partsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...shelfKey, 'parts', state] as const,
    queryFn: ({ signal }) => list('/api/parts', state, signal),
  });

export const partSuggestionsQuery = (q: string) =>
  queryOptions({
    queryKey: [...shelfKey, 'part suggestions', q] as const,
    queryFn: async ({ signal }) =>
      (await answer(api.GET('/api/parts', { params: { query: { q, pageSize: 8 } }, signal }))).items,
    enabled: q.length > 0,
    staleTime: 30_000,
  });

export const partQuery = (code: string) =>
  queryOptions({
    queryKey: [...shelfKey, 'part', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/parts/{code}', { params: { path: { code } }, signal })),
  });

const meta = { touches: [shelfKey], showsRefusal: true };

export function useAddPart(): UseMutationResult<Part, Error, { body: PartInput; key: string }> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/parts', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta,
  });
}

export function useEditPart(code: string): UseMutationResult<Part, Error, PartInput & { version: number }> {
  return useMutation({
    mutationFn: (body) => answer(api.PUT('/api/parts/{code}', { body, params: { path: { code } } })),
    meta,
  });
}

export function useRetirePart(code: string): UseMutationResult<Part, Error, { version: number; retire: boolean }> {
  return useMutation({
    mutationFn: ({ version, retire }) => {
      const call = { body: { version }, params: { path: { code } } };
      return answer(
        retire ? api.POST('/api/parts/{code}/retire', call) : api.POST('/api/parts/{code}/bring-back', call),
      );
    },
    meta,
  });
}
