import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';
import { designsKey } from './bills';

export type KitListItem = Dto<'KitListItemDto'>;
export type Contents = Dto<'ContentsDto'>;
export type ContentsLine = Dto<'ContentsLineDto'>;
export type ContentsEdit = Dto<'ContentsEditDto'>;

export const kitsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...designsKey, 'kits', state] as const,
    queryFn: ({ signal }) => list('/api/kits', state, signal),
  });

export const contentsQuery = (code: string) =>
  queryOptions({
    queryKey: [...designsKey, 'contents', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/kits/{code}', { params: { path: { code } }, signal })),
  });

export function useSaveContents(code: string): UseMutationResult<Contents, Error, ContentsEdit> {
  return useMutation({
    mutationFn: (body) => answer(api.PUT('/api/kits/{code}', { body, params: { path: { code } } })),
    meta: { touches: [designsKey], showsRefusal: true },
  });
}
