import { listCustomers, readCustomer } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** The customers, newest first; one page holds what a small shop has. */
export function customersQuery() {
  return queryOptions({
    queryKey: ['customers'],
    queryFn: ({ signal }) => call(listCustomers, { query: { limit: 200 }, signal }),
  });
}

export function customerQuery(id: number) {
  return queryOptions({
    queryKey: ['customers', id],
    queryFn: ({ signal }) => call(readCustomer, { params: { id }, signal }),
  });
}
