import {
  listInvoices,
  listOrdersToInvoice,
  listOwed,
  listPayments,
  readInvoice,
  type InvoiceState,
} from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

interface Wanted {
  state?: InvoiceState | undefined;
  customerId?: number | undefined;
}

/** Invoices, newest first, page by page. */
export function invoicesQuery(wanted: Wanted = {}) {
  return infiniteQueryOptions({
    queryKey: ['invoices', 'list', wanted],
    queryFn: ({ signal, pageParam }) =>
      call(listInvoices, {
        query: { ...wanted, limit: 100, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

export function invoiceQuery(id: number) {
  return queryOptions({
    queryKey: ['invoices', id],
    queryFn: ({ signal }) => call(readInvoice, { params: { id }, signal }),
  });
}

/** What is packed or shipped and has no invoice yet. */
export function ordersToInvoiceQuery() {
  return queryOptions({
    queryKey: ['invoices', 'orders-to-invoice'],
    queryFn: ({ signal }) => call(listOrdersToInvoice, { signal }),
  });
}

export function owedQuery() {
  return queryOptions({
    queryKey: ['invoices', 'owed'],
    queryFn: ({ signal }) => call(listOwed, { signal }),
  });
}

/** Payments, newest first, page by page. */
export function paymentsQuery() {
  return infiniteQueryOptions({
    queryKey: ['invoices', 'payments'],
    queryFn: ({ signal, pageParam }) =>
      call(listPayments, {
        query: { limit: 100, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}
