import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';
import { shelfKey } from './parts';

export type LotItem = RowOf<'/api/lots'>;
export type Lot = Dto<'LotDto'>;
export type LotStatusInput = Dto<'LotStatusInputDto'>;

export const lotsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...shelfKey, 'lots', state] as const,
    queryFn: ({ signal }) => list('/api/lots', state, signal),
  });

export const lotQuery = (code: string) =>
  queryOptions({
    queryKey: [...shelfKey, 'lot', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/lots/{code}', { params: { path: { code } }, signal })),
  });

export function useChangeLotStatus(code: string): UseMutationResult<Lot, Error, LotStatusInput> {
  return useMutation({
    mutationFn: (body) => answer(api.POST('/api/lots/{code}/status', { body, params: { path: { code } } })),
    meta: { touches: [shelfKey], showsRefusal: true },
  });
}
