import { listOrders, readOrder } from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

interface Wanted {
  customerId?: number | undefined;
}

/** Orders, newest first, page by page. */
export function ordersQuery(wanted: Wanted = {}) {
  return infiniteQueryOptions({
    queryKey: ['orders', 'list', wanted],
    queryFn: ({ signal, pageParam }) =>
      call(listOrders, {
        query: { ...wanted, limit: 100, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

export function orderQuery(id: number) {
  return queryOptions({
    queryKey: ['orders', id],
    queryFn: ({ signal }) => call(readOrder, { params: { id }, signal }),
  });
}
