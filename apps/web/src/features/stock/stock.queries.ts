import {
  listReservations,
  listStockMovements,
  readStockLevels,
  type QueryInputOf,
} from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** One lot, or one hardware. */
export type Item = { lotId: number } | { hardwareId: number };

/** Which movements: of one item, or of whatever is asked for. */
export type Asked = Omit<QueryInputOf<typeof listStockMovements>, 'cursor' | 'limit'>;

/** What there was at the end of a day; of one item, or of everything. */
export function levelsQuery(asked: QueryInputOf<typeof readStockLevels>) {
  return queryOptions({
    queryKey: ['stock', 'levels', asked],
    queryFn: ({ signal }) => call(readStockLevels, { query: asked, signal }),
  });
}

/** The ledger, newest first, page by page. */
export function movementsQuery(item: Asked) {
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
    queryFn: ({ signal }) =>
      everyPage((paging) => call(listReservations, { query: { ...item, ...paging }, signal })),
  });
}
