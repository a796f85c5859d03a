import { listReservations, listStockMovements } from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** One lot, or one hardware. */
export type Item = { lotId: number } | { hardwareId: number };

/** The ledger of one item, newest first, page by page. */
export function movementsQuery(item: Item) {
  return infiniteQueryOptions({
    queryKey: ['stock', 'movements', item],
    queryFn: ({ signal, pageParam }) =>
      call(listStockMovements, {
        query: { ...item, limit: 50, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

/** The jobs that an item is held for. */
export function heldQuery(item: Item) {
  return queryOptions({
    queryKey: ['stock', 'held', item],
    queryFn: ({ signal }) => call(listReservations, { query: { ...item, limit: 200 }, signal }),
  });
}
