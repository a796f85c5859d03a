import { draftInvoice } from '@hidewright/contract';
import type { RouteObject } from 'react-router-dom';
import { opensFor } from '../guard.ts';

const numberOf = (invoice: unknown) => (invoice as { number: string | null }).number ?? 'Draft';

export const booksRoutes: RouteObject[] = [
  {
    path: '/books',
    handle: { crumb: 'Books' },
    children: [
      { index: true, lazy: () => import('./books/index.tsx') },
      {
        path: 'invoices',
        handle: { crumb: 'Invoices' },
        children: [
          { index: true, lazy: () => import('./books/invoices.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(draftInvoice)],
            lazy: () => import('./books/new-invoice.tsx'),
          },
          { path: ':id', handle: { crumb: numberOf }, lazy: () => import('./books/invoice.tsx') },
        ],
      },
      { path: 'owed', handle: { crumb: 'Owed' }, lazy: () => import('./books/owed.tsx') },
      {
        path: 'payments',
        handle: { crumb: 'Payments' },
        lazy: () => import('./books/payments.tsx'),
      },
      {
        path: 'sales-sheets',
        handle: { crumb: 'Sales sheets' },
        lazy: () => import('./books/sales-sheets.tsx'),
      },
      { path: 'tax', handle: { crumb: 'Tax' }, lazy: () => import('./books/tax.tsx') },
    ],
  },
];
