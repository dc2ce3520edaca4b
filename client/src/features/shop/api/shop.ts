import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { readStored, writeStored } from '../../../lib/stored';

export type Listing = Dto<'ShopListingDto'>;
export type Product = Dto<'ShopProductDto'>;
export type Quote = Dto<'QuoteDto'>;
export type BasketLine = Dto<'BasketLineDto'>;
export type Checkout = Dto<'CheckoutDto'>;
export type CheckedOut = Dto<'CheckedOutDto'>;
export type BuyerOrder = Dto<'BuyerOrderDto'>;

/** Prices and promises change slowly, but never trust an old one at the till: the server looks again. */
const freshFor = 30_000;

export const frontQuery = queryOptions({
  queryKey: ['shop', 'front'] as const,
  queryFn: () => answer(api.GET('/api/shop')),
  staleTime: 10 * 60_000,
});

export const listingsQuery = (country: string | undefined) =>
  queryOptions({
    queryKey: ['shop', 'listings', country] as const,
    queryFn: () => answer(api.GET('/api/shop/listings', { params: { query: country ? { country } : {} } })),
    staleTime: freshFor,
  });

export const productQuery = (slug: string, country: string | undefined) =>
  queryOptions({
    queryKey: ['shop', 'product', slug, country] as const,
    queryFn: () =>
      answer(api.GET('/api/shop/listings/{slug}', { params: { path: { slug }, query: country ? { country } : {} } })),
    staleTime: freshFor,
  });

export const quoteQuery = (country: string, postcode: string, lines: readonly BasketLine[]) =>
  queryOptions({
    queryKey: ['shop', 'quote', country, postcode, lines] as const,
    queryFn: () =>
      answer(api.POST('/api/shop/quotes', { body: { country, lines: [...lines], ...(postcode ? { postcode } : {}) } })),
    enabled: lines.length > 0 && country !== '',
  });

export function usePlaceOrder(): UseMutationResult<CheckedOut, Error, { body: Checkout; key: string }> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/shop/orders', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta: { touches: [['shop'], ['session']], showsRefusal: true },
  });
}

const tokenKey = (number: string) => `order ${number}`;

/** The link of an order that was placed in this window, so that coming back from the payment page opens it. */
export const rememberOrderToken = (number: string, token: string): void =>
  writeStored('session', tokenKey(number), token);

export function orderToken(number: string): string | undefined {
  const kept = readStored('session', tokenKey(number));
  return typeof kept === 'string' ? kept : undefined;
}

const tokenHeader = (number: string) => {
  const token = orderToken(number);
  return token ? { 'x-order-token': token } : {};
};

export const orderQuery = (number: string) =>
  queryOptions({
    queryKey: ['shop', 'order', number] as const,
    queryFn: () =>
      answer(
        api.GET('/api/shop/orders/{number}', {
          params: { path: { number } },
          headers: tokenHeader(number),
        }),
      ),
    // The payments service tells the shop within seconds; until then the page looks again by itself.
    refetchInterval: ({ state }) => (state.data?.canPay ? 3_000 : false),
  });

export function usePayAgain(number: string): UseMutationResult<Dto<'PaymentPageDto'>, Error, void> {
  return useMutation({
    mutationFn: () =>
      answer(
        api.POST('/api/shop/orders/{number}/payment-pages', {
          params: { path: { number } },
          headers: tokenHeader(number),
        }),
      ),
    meta: { touches: [['shop', 'order', number]], showsRefusal: true },
  });
}

export const ownOrdersQuery = queryOptions({
  queryKey: ['shop', 'own-orders'] as const,
  queryFn: () => answer(api.GET('/api/own-orders')),
});
