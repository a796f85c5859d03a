import {
  listOrders,
  readCancellationOutlook,
  readOrder,
  readPromiseOutlook,
} from '@hidewright/contract';
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

/** What cancelling would do, as it stands when it is asked. */
export function cancellationQuery(id: number) {
  return queryOptions({
    queryKey: ['orders', id, 'cancellation'],
    queryFn: ({ signal }) => call(readCancellationOutlook, { params: { id }, signal }),
    staleTime: 0,
  });
}

/** Whether the bench can keep another day. */
export function promiseQuery(id: number, by: string) {
  return queryOptions({
    queryKey: ['orders', id, 'promise', by],
    queryFn: ({ signal }) => call(readPromiseOutlook, { params: { id }, query: { by }, signal }),
    retry: false,
  });
}
