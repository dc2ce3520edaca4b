import type { AreaParts } from '../../lib/area';

export const books: AreaParts = {
  links: [
    { label: 'Invoices', to: '/books/invoices' },
    { label: 'Journal', to: '/books/journal' },
    { label: 'Trial balance', to: '/books/balance' },
    { label: 'Payments', to: '/books/payments' },
    { label: 'Stock value', to: '/books/stock-value' },
    { label: 'Exports', to: '/books/exports' },
    { label: 'Months', to: '/books/months' },
    { label: 'Posting rules', to: '/books/rules' },
  ],
  routes: [
    { index: true, lazy: () => import('./pages/queue-page') },
    { path: 'invoices', lazy: () => import('./pages/invoices-page') },
    { path: 'invoices/:code', lazy: () => import('./pages/invoice-page') },
    { path: 'journal', lazy: () => import('./pages/journal-page') },
    { path: 'balance', lazy: () => import('./pages/balance-page') },
    { path: 'payments', lazy: () => import('./pages/payments-page') },
    { path: 'stock-value', lazy: () => import('./pages/stock-value-page') },
    { path: 'exports', lazy: () => import('./pages/exports-page') },
    { path: 'months', lazy: () => import('./pages/months-page') },
    { path: 'rules', lazy: () => import('./pages/rules-page') },
  ],
};
