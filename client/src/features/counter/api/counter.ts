import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import { request } from '../../../api/request';
import type { ListState } from '../../../lib/list-state';

export type OrderRow = RowOf<'/api/desk-orders'>;
export type DeskOrder = Dto<'OrderDeskDto'>;
export type ParcelRow = RowOf<'/api/parcels'>;
export type Parcel = Dto<'ParcelDto'>;
export type ScanAnswer = Dto<'ScanAnswerDto'>;

/** What packing, sending, cancelling and settling change. */
const touched = [['desk-orders'], ['parcels'], ['today']];

export const ordersQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['desk-orders', state] as const,
    queryFn: ({ signal }) => list('/api/desk-orders', state, signal),
  });

export const orderQuery = (code: string) =>
  queryOptions({
    queryKey: ['desk-orders', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/desk-orders/{code}', { params: { path: { code } }, signal })),
  });

/** Orders that somebody at the counter can go on with, oldest promise first. */
export const waitingQuery = queryOptions({
  queryKey: ['desk-orders', 'waiting'] as const,
  queryFn: async ({ signal }): Promise<readonly OrderRow[]> => {
    const states = ['review', 'packed', 'packing', 'ready', 'short'] as const;
    const pages = await Promise.all(
      states.map((state) =>
        answer(
          api.GET('/api/desk-orders', { params: { query: { state, sort: 'promisedOn', pageSize: 100 } }, signal }),
        ),
      ),
    );
    return pages.flatMap(({ items }) => items).toSorted((a, b) => a.promisedOn.localeCompare(b.promisedOn));
  },
});

export const parcelsQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['parcels', state] as const,
    queryFn: ({ signal }) => list('/api/parcels', state, signal),
  });

export const parcelQuery = (code: string) =>
  queryOptions({
    queryKey: ['parcels', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/parcels/{code}', { params: { path: { code } }, signal })),
  });

function useAct<Body, Given>(
  act: (body: Body) => Promise<Given>,
  showsRefusal = true,
): UseMutationResult<Given, Error, Body> {
  return useMutation({ mutationFn: act, meta: { touches: touched, showsRefusal } });
}

export const useOpenParcel = () =>
  useAct(
    ({ order, key }: { order: string; key: string }) =>
      request<Parcel>('POST', '/api/parcels', { body: { order }, idempotencyKey: key }),
    false,
  );

export const useCancelOrder = () =>
  useAct(({ key, ...body }: { order: string; reason: string; key: string }) =>
    request<Dto<'CancellationDto'>>('POST', '/api/order-cancellations', { body, idempotencyKey: key }),
  );

export const useSettleReview = () =>
  useAct(({ id, resolution }: { id: number; resolution: string }) =>
    request<undefined>('POST', `/api/payment-reviews/${id}/settled`, { body: { resolution } }),
  );

export interface Scan {
  code: string;
  bin?: string;
  needId?: number;
  quantity?: string;
}

const at = (parcel: string, act: string) => `/api/parcels/${encodeURIComponent(parcel)}/${act}`;

export const useScanInto = (parcel: string) =>
  useAct((body: Scan) => request<ScanAnswer>('POST', at(parcel, 'scans'), { body }));

export const useTakeOut = (parcel: string) =>
  useAct((item: number) => request<Parcel>('POST', at(parcel, `items/${item}/taken-out`)), false);

export const useParcelAct = (parcel: string, act: 'packed' | 'reopened') =>
  useAct((version: number) => request<Parcel>('POST', at(parcel, act), { body: { version } }), false);

export const useSayLithium = (parcel: string) =>
  useAct((body: Dto<'LithiumInput'>) => request<Parcel>('PUT', at(parcel, 'lithium'), { body }));

export const useCarrierAnswer = (parcel: string) =>
  useAct((body: Dto<'CarrierAnswerInput'>) => request<Parcel>('POST', at(parcel, 'carrier-answer'), { body }));

export const useDispatch = (parcel: string) =>
  useAct((body: Dto<'DispatchInput'>) => request<Parcel>('POST', at(parcel, 'dispatch'), { body }));
