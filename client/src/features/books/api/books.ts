import { queryOptions, useMutation } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list, type RowOf } from '../../../api/list';
import { request } from '../../../api/request';
import type { ListState } from '../../../lib/list-state';

export type InvoiceRow = RowOf<'/api/invoices'>;
export type Invoice = Dto<'InvoiceDto'>;
export type EntryRow = RowOf<'/api/journal-entries'>;
export type PaymentRow = RowOf<'/api/payments'>;
export type StockValueRow = RowOf<'/api/stock-value'>;
export type ExportTotals = Dto<'ExportTotalsDto'>;
export type Month = Dto<'MonthDto'>;

export const invoicesQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['invoices', state] as const,
    queryFn: ({ signal }) => list('/api/invoices', state, signal),
  });

export const invoiceQuery = (code: string) =>
  queryOptions({
    queryKey: ['invoices', code] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/invoices/{code}', { params: { path: { code } }, signal })),
  });

export const journalQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['journal', state] as const,
    queryFn: ({ signal }) => list('/api/journal-entries', state, signal),
  });

export const paymentsQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['payments', state] as const,
    queryFn: ({ signal }) => list('/api/payments', state, signal),
  });

export const stockValueQuery = (state: ListState) =>
  queryOptions({
    queryKey: ['stock-value', state] as const,
    queryFn: ({ signal }) => list('/api/stock-value', state, signal),
  });

export const balanceQuery = (period: { from?: string; to?: string }) =>
  queryOptions({
    queryKey: ['trial-balance', period] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/trial-balance', { params: { query: period }, signal })),
  });

export const rulesQuery = queryOptions({
  queryKey: ['posting-rules'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/posting-rules', { signal })),
});

export const exportTotalsQuery = (period: { from: string; to: string }) =>
  queryOptions({
    queryKey: ['export-totals', period] as const,
    queryFn: ({ signal }) => answer(api.GET('/api/book-exports/totals', { params: { query: period }, signal })),
  });

export const monthsQuery = queryOptions({
  queryKey: ['months'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/periods', { signal })),
});

/** What waits for the accountant; the same list as on Today. */
export const waitingQuery = queryOptions({
  queryKey: ['today', 'books'] as const,
  queryFn: ({ signal }) => answer(api.GET('/api/today', { signal })),
});

export const useCloseMonth = () =>
  useMutation({
    mutationFn: (month: string) => request<undefined>('POST', `/api/periods/${month}/closed`),
    meta: { touches: [['months']], showsRefusal: true },
  });

export const useReopenMonth = () =>
  useMutation({
    mutationFn: ({ month, reason }: { month: string; reason: string }) =>
      request<undefined>('POST', `/api/periods/${month}/reopened`, { body: { reason } }),
    meta: { touches: [['months']], showsRefusal: true },
  });
