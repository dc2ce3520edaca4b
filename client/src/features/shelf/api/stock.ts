import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';
import { shelfKey } from './parts';

export type Move = RowOf<'/api/stock-moves'>;
export type DeliveryItem = RowOf<'/api/deliveries'>;
export type Delivery = Dto<'DeliveryDto'>;
export type DeliveryInput = Dto<'DeliveryInputDto'>;
export type TransferInput = Dto<'TransferInputDto'>;
export type AdjustmentInput = Dto<'AdjustmentInputDto'>;
export type ShelfQueue = Dto<'ShelfQueueDto'>;
type Made = Dto<'StockDocumentDto'>;

export const queueQuery = queryOptions({
  queryKey: [...shelfKey, 'queue'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/shelf-queue', { signal })),
});

export const movesQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...shelfKey, 'moves', state] as const,
    queryFn: ({ signal }) => list('/api/stock-moves', state, signal),
  });

export const deliveriesQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...shelfKey, 'deliveries', state] as const,
    queryFn: ({ signal }) => list('/api/deliveries', state, signal),
  });

export const deliveryQuery = (number: string) =>
  queryOptions({
    queryKey: [...shelfKey, 'delivery', number] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/deliveries/{number}', { params: { path: { number } }, signal })),
  });

const meta = { touches: [shelfKey], showsRefusal: true };

interface Keyed<Body> {
  body: Body;
  key: string;
}

export function useReceive(): UseMutationResult<Delivery, Error, Keyed<DeliveryInput>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/deliveries', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta,
  });
}

export function useTransfer(): UseMutationResult<Made, Error, Keyed<TransferInput>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/stock-transfers', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta,
  });
}

export function useAdjust(): UseMutationResult<Made, Error, Keyed<AdjustmentInput>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/stock-adjustments', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta,
  });
}

export function useReverse(number: string): UseMutationResult<Made, Error, Keyed<{ reason: string }>> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(
        api.POST('/api/stock-documents/{number}/reversal', {
          body,
          params: { path: { number }, header: { 'Idempotency-Key': key } },
        }),
      ),
    meta,
  });
}
