import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';

export type BillListItem = Dto<'BillListItemDto'>;
export type Bill = Dto<'BillDto'>;
export type BillPart = Dto<'BillPartDto'>;
export type BillRevision = Dto<'BillRevisionDto'>;
export type BillLine = Dto<'BillLineDto'>;
export type BuildStep = Dto<'BuildStepDto'>;
export type Characteristic = Dto<'CharacteristicDto'>;
export type BillTree = Dto<'BillTreeDto'>;
export type BillCost = Dto<'BillCostDto'>;
export type Buildable = Dto<'BuildableDto'>;
export type BillComparison = Dto<'BillComparisonDto'>;
export type WhereUsed = Dto<'WhereUsedDto'>;
export type DesignQueueItem = Dto<'DesignQueueItemDto'>;
export type BillEdit = Dto<'BillEditDto'>;

/** One revision, by the code of its part and its number. */
export interface RevisionPlace {
  code: string;
  number: number;
}

/** Everything that a change of a bill may touch: where-used, queues and figures as well. */
export const designsKey = ['designs'] as const;

export const designQueueQuery = queryOptions({
  queryKey: [...designsKey, 'queue'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/design-queue', { signal })),
});

export const billsQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...designsKey, 'bills', state] as const,
    queryFn: ({ signal }) => list('/api/bills', state, signal),
  });

export const billQuery = (code: string) =>
  queryOptions({
    queryKey: [...designsKey, 'bill', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/bills/{code}', { params: { path: { code } }, signal })),
  });

export const revisionQuery = (place: RevisionPlace) =>
  queryOptions({
    queryKey: [...designsKey, 'revision', place] as const,
    queryFn: ({ signal }) =>
      answer(api.GET('/api/bills/{code}/revisions/{number}', { params: { path: place }, signal })),
  });

export const treeQuery = (place: RevisionPlace) =>
  queryOptions({
    queryKey: [...designsKey, 'tree', place] as const,
    queryFn: ({ signal }) =>
      answer(api.GET('/api/bills/{code}/revisions/{number}/tree', { params: { path: place }, signal })),
  });

export const buildableQuery = (place: RevisionPlace) =>
  queryOptions({
    queryKey: [...designsKey, 'buildable', place] as const,
    queryFn: ({ signal }) =>
      answer(api.GET('/api/bills/{code}/revisions/{number}/buildable', { params: { path: place }, signal })),
  });

export const costQuery = (place: RevisionPlace) =>
  queryOptions({
    queryKey: [...designsKey, 'cost', place] as const,
    queryFn: ({ signal }) =>
      answer(api.GET('/api/bills/{code}/revisions/{number}/cost', { params: { path: place }, signal })),
  });

export const comparisonQuery = (code: string, from: number, to: number) =>
  queryOptions({
    queryKey: [...designsKey, 'comparison', code, from, to] as const,
    queryFn: ({ signal }) =>
      answer(api.GET('/api/bills/{code}/comparison', { params: { path: { code }, query: { from, to } }, signal })),
  });

export const whereUsedQuery = (code: string) =>
  queryOptions({
    queryKey: [...designsKey, 'where-used', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/bills/{code}/where-used', { params: { path: { code } }, signal })),
  });

/** Parts to choose from while somebody types. */
export const componentsQuery = (q: string) =>
  queryOptions({
    queryKey: [...designsKey, 'components', q] as const,
    queryFn: ({ signal }) =>
      answer(api.GET('/api/bill-components', { params: { query: { q, pageSize: 20 } }, signal })),
    staleTime: 30_000,
  });

interface NewDraft {
  code: string;
  from: 'nothing' | 'released';
  key: string;
}

export function useBeginDraft(): UseMutationResult<BillRevision, Error, NewDraft> {
  return useMutation({
    mutationFn: ({ code, from, key }) =>
      answer(
        api.POST('/api/bills/{code}/revisions', {
          body: { from },
          params: { path: { code }, header: { 'Idempotency-Key': key } },
        }),
      ),
    meta: { touches: [designsKey], showsRefusal: true },
  });
}

export function useSaveDraft(place: RevisionPlace): UseMutationResult<BillRevision, Error, BillEdit> {
  return useMutation({
    mutationFn: (body) => answer(api.PUT('/api/bills/{code}/revisions/{number}', { body, params: { path: place } })),
    meta: { touches: [designsKey], showsRefusal: true },
  });
}

export function useRelease(place: RevisionPlace): UseMutationResult<BillRevision, Error, number> {
  return useMutation({
    mutationFn: (version) =>
      answer(api.POST('/api/bills/{code}/revisions/{number}/release', { body: { version }, params: { path: place } })),
    meta: { touches: [designsKey], showsRefusal: true },
  });
}

export function useDiscardDraft(place: RevisionPlace): UseMutationResult<unknown, Error, number> {
  return useMutation({
    mutationFn: (version) =>
      answer(api.POST('/api/bills/{code}/revisions/{number}/discard', { body: { version }, params: { path: place } })),
    meta: { touches: [designsKey], showsRefusal: true },
  });
}
