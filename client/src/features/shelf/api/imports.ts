import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import { request } from '../../../api/request';
import type { ListState } from '../../../lib/list-state';
import { shelfKey } from './parts';

export type ImportKind = Dto<'ImportKindDto'>;
export type ImportCheck = Dto<'ImportCheckDto'>;
export type ImportRun = RowOf<'/api/imports'>;
export type AppliedImport = Dto<'AppliedImportDto'>;

const importsKey = ['imports'] as const;

export const importKindsQuery = queryOptions({
  queryKey: [...importsKey, 'kinds'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/imports/kinds', { signal })),
  staleTime: Number.POSITIVE_INFINITY,
});

export const importsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...importsKey, 'runs', state] as const,
    queryFn: ({ signal }) => list('/api/imports', state, signal),
  });

/** A file with what a person chose about it. */
export interface ChosenFile {
  file: File;
  /** Per column of the file, from 0: the key it fills, or null to leave it alone. */
  mapping: Readonly<Record<number, string | null>>;
  decimalSign: 'point' | 'comma' | undefined;
}

function formOf({ file, mapping, decimalSign }: ChosenFile): FormData {
  const form = new FormData();
  if (Object.keys(mapping).length > 0) form.set('mapping', JSON.stringify(mapping));
  if (decimalSign) form.set('decimalSign', decimalSign);
  form.set('file', file);
  return form;
}

export function useDryRun(kind: string): UseMutationResult<ImportCheck, Error, ChosenFile> {
  return useMutation({
    mutationFn: (chosen) => request<ImportCheck>('POST', `/api/imports/${kind}/dry-run`, { body: formOf(chosen) }),
    meta: { showsRefusal: true },
  });
}

export function useApplyImport(
  kind: string,
): UseMutationResult<AppliedImport, Error, { chosen: ChosenFile; key: string }> {
  return useMutation({
    mutationFn: ({ chosen, key }) =>
      request<AppliedImport>('POST', `/api/imports/${kind}`, { body: formOf(chosen), idempotencyKey: key }),
    // Bills and plans come this way too, so everything that shows any of it is read again.
    meta: { touches: [importsKey, shelfKey, ['bills'], ['designs']], showsRefusal: true },
  });
}
