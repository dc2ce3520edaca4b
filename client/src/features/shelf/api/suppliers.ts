import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';
import { shelfKey } from './parts';

export type SupplierItem = RowOf<'/api/suppliers'>;
export type Supplier = Dto<'SupplierDto'>;
export type SupplierInput = Dto<'SupplierInputDto'>;

export const suppliersQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...shelfKey, 'suppliers', state] as const,
    queryFn: ({ signal }) => list('/api/suppliers', state, signal),
  });

export const supplierQuery = (code: string) =>
  queryOptions({
    queryKey: [...shelfKey, 'supplier', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/suppliers/{code}', { params: { path: { code } }, signal })),
  });

const meta = { touches: [shelfKey], showsRefusal: true };

export function useAddSupplier(): UseMutationResult<Supplier, Error, { body: SupplierInput; key: string }> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/suppliers', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta,
  });
}

export function useEditSupplier(code: string): UseMutationResult<Supplier, Error, SupplierInput & { version: number }> {
  return useMutation({
    mutationFn: (body) => answer(api.PUT('/api/suppliers/{code}', { body, params: { path: { code } } })),
    meta,
  });
}

export const countriesQuery = queryOptions({
  queryKey: ['countries'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/countries', { signal })),
  staleTime: Number.POSITIVE_INFINITY,
});
