import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';

export type Shop = Dto<'ShopDto'>;
export type ShopInput = Dto<'ShopInputDto'>;
export type ClosedDay = Dto<'ClosedDayDto'>;
export type VatRate = Dto<'VatRateDto'>;
export type VatException = Dto<'VatExceptionDto'>;
export type DeliveryRate = Dto<'DeliveryRateDto'>;
export type OutboxMail = Dto<'OutboxMailDto'>;

export const shopQuery = queryOptions({
  queryKey: ['shop'],
  queryFn: ({ signal }) => answer(api.GET('/api/shop-settings', { signal })),
});

export const countriesQuery = queryOptions({
  queryKey: ['countries'],
  queryFn: async ({ signal }) => (await answer(api.GET('/api/countries', { signal }))).items,
  staleTime: Infinity,
});

export const closedDaysQuery = queryOptions({
  queryKey: ['shop', 'closed-days'],
  queryFn: async ({ signal }) => (await answer(api.GET('/api/shop/closed-days', { signal }))).items,
});

export const vatRatesQuery = queryOptions({
  queryKey: ['vat', 'rates'],
  queryFn: async ({ signal }) => (await answer(api.GET('/api/vat-rates', { signal }))).items,
});

export const vatExceptionsQuery = queryOptions({
  queryKey: ['vat', 'exceptions'],
  queryFn: async ({ signal }) => (await answer(api.GET('/api/vat-exceptions', { signal }))).items,
});

export const deliveryRatesQuery = queryOptions({
  queryKey: ['delivery-rates'],
  queryFn: async ({ signal }) => (await answer(api.GET('/api/delivery-rates', { signal }))).items,
});

export const outboxQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['outbox', state] as const,
    queryFn: ({ signal }) => list('/api/outbox-mails', state, signal),
  });

/** One change of the set-up; the shop's name, zone and currency are part of the session too. */
function useChange<Body, Given>(
  touches: readonly string[],
  send: (body: Body) => Promise<Given>,
  showsRefusal = true,
): UseMutationResult<Given, Error, Body> {
  return useMutation({ mutationFn: send, meta: { touches: [touches, ['session']], showsRefusal } });
}

export const useSetUpShop = () =>
  useChange(['shop'], (body: ShopInput) => answer(api.POST('/api/shop-settings', { body })));

export const useEditShop = () =>
  useChange(['shop'], (body: Dto<'ShopEditDto'>) => answer(api.PUT('/api/shop-settings', { body })));

export const useCloseDay = () =>
  useChange(['shop'], (body: Dto<'ClosedDayInputDto'>) => answer(api.POST('/api/shop/closed-days', { body })));

export const useOpenDay = () =>
  useChange(
    ['shop'],
    (day: string) => answer(api.DELETE('/api/shop/closed-days/{day}', { params: { path: { day } } })),
    false,
  );

export const useAddVatRate = () =>
  useChange(['vat'], (body: Dto<'VatRateInputDto'>) => answer(api.POST('/api/vat-rates', { body })));

export const useRemoveVatRate = () =>
  useChange(['vat'], (id: number) => answer(api.DELETE('/api/vat-rates/{id}', { params: { path: { id } } })));

export const useAddVatException = () =>
  useChange(['vat'], (body: Dto<'VatExceptionInputDto'>) => answer(api.POST('/api/vat-exceptions', { body })));

export const useRemoveVatException = () =>
  useChange(['vat'], (path: { country: string; prefix: string }) =>
    answer(api.DELETE('/api/vat-exceptions/{country}/{prefix}', { params: { path } })),
  );

export const useAddDeliveryRate = () =>
  useChange(['delivery-rates'], (body: Dto<'DeliveryRateInputDto'>) =>
    answer(api.POST('/api/delivery-rates', { body })),
  );

export const useRemoveDeliveryRate = () =>
  useChange(['delivery-rates'], (id: number) =>
    answer(api.DELETE('/api/delivery-rates/{id}', { params: { path: { id } } })),
  );

export const useRetryMail = () =>
  useChange(
    ['outbox'],
    (id: number) => answer(api.POST('/api/outbox-mails/{id}/retry', { params: { path: { id } } })),
    false,
  );
