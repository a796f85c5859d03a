import { addCustomer, createQuote, changeQuote, listCustomers } from '@hidewright/contract';
import type { RouteObject } from 'react-router-dom';
import { opensFor } from '../guard.ts';

const nameOf = (customer: unknown) => (customer as { name: string }).name;
const numberOf = (paper: unknown) => (paper as { number: string }).number;

export const counterRoutes: RouteObject[] = [
  {
    path: '/counter',
    handle: { crumb: 'Counter' },
    children: [
      { index: true, lazy: () => import('./counter/index.tsx') },
      {
        path: 'quotes',
        handle: { crumb: 'Quotes' },
        children: [
          { index: true, lazy: () => import('./counter/quotes.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(createQuote)],
            lazy: () => import('./counter/new-quote.tsx'),
          },
          { path: ':id', handle: { crumb: numberOf }, lazy: () => import('./counter/quote.tsx') },
          {
            path: ':id/workings',
            handle: { crumb: numberOf },
            lazy: () => import('./counter/quote-workings.tsx'),
          },
          {
            path: ':id/change',
            handle: { crumb: numberOf },
            middleware: [opensFor(changeQuote)],
            lazy: () => import('./counter/change-quote.tsx'),
          },
        ],
      },
      {
        path: 'orders',
        handle: { crumb: 'Orders' },
        children: [
          { index: true, lazy: () => import('./counter/orders.tsx') },
          { path: ':id', handle: { crumb: numberOf }, lazy: () => import('./counter/order.tsx') },
        ],
      },
      {
        path: 'customers',
        handle: { crumb: 'Customers' },
        middleware: [opensFor(listCustomers)],
        children: [
          { index: true, lazy: () => import('./counter/customers.tsx') },
          {
            path: 'new',
            handle: { crumb: 'New' },
            middleware: [opensFor(addCustomer)],
            lazy: () => import('./counter/new-customer.tsx'),
          },
          { path: ':id', handle: { crumb: nameOf }, lazy: () => import('./counter/customer.tsx') },
        ],
      },
    ],
  },
];
