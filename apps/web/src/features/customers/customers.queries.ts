import { listCustomers, readCustomer } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** All customers, newest first. */
export function customersQuery() {
  return queryOptions({
    queryKey: ['customers'],
    queryFn: ({ signal }) => everyPage((paging) => call(listCustomers, { query: paging, signal })),
  });
}

export function customerQuery(id: number) {
  return queryOptions({
    queryKey: ['customers', id],
    queryFn: ({ signal }) => call(readCustomer, { params: { id }, signal }),
  });
}
