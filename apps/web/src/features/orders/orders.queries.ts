import { checkQuote, listOrders, readOrder } from '@hidewright/contract';
import { infiniteQueryOptions, keepPreviousData, queryOptions } from '@tanstack/react-query';
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

interface Asked {
  option?: string | undefined;
  quantity?: number | undefined;
  by?: string | undefined;
}

/** Can we make it? Asked anew each time: what is free changes with every other order. */
export function checkQuery(quoteId: number, asked: Asked = {}) {
  return queryOptions({
    queryKey: ['orders', 'check', quoteId, asked],
    queryFn: ({ signal }) => call(checkQuote, { params: { id: quoteId }, query: asked, signal }),
    staleTime: 0,
    placeholderData: keepPreviousData,
  });
}
