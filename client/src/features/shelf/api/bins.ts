import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';
import { shelfKey } from './parts';

export type BinItem = RowOf<'/api/bins'>;
export type Bin = Dto<'BinDto'>;
export type BinInput = Dto<'BinInputDto'>;

export const binsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...shelfKey, 'bins', state] as const,
    queryFn: ({ signal }) => list('/api/bins', state, signal),
  });

export const binQuery = (code: string) =>
  queryOptions({
    queryKey: [...shelfKey, 'bin', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/bins/{code}', { params: { path: { code } }, signal })),
  });

const meta = { touches: [shelfKey], showsRefusal: true };

export function useAddBin(): UseMutationResult<Bin, Error, { body: BinInput; key: string }> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/bins', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta,
  });
}

export function useEditBin(code: string): UseMutationResult<Bin, Error, BinInput & { version: number }> {
  return useMutation({
    mutationFn: (body) => answer(api.PUT('/api/bins/{code}', { body, params: { path: { code } } })),
    meta,
  });
}

export function useRetireBin(code: string): UseMutationResult<Bin, Error, { version: number; retire: boolean }> {
  return useMutation({
    mutationFn: ({ version, retire }) => {
      const call = { body: { version }, params: { path: { code } } };
      return answer(retire ? api.POST('/api/bins/{code}/retire', call) : api.POST('/api/bins/{code}/bring-back', call));
    },
    meta,
  });
}
