import { listCountPlaces, listCounts, readCount } from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** Count sheets, newest first, page by page. */
export function countsQuery() {
  return infiniteQueryOptions({
    queryKey: ['counts', 'list'],
    queryFn: ({ signal, pageParam }) =>
      call(listCounts, { query: { limit: 50, ...(pageParam && { cursor: pageParam }) }, signal }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

export function countQuery(id: number) {
  return queryOptions({
    queryKey: ['counts', id],
    queryFn: ({ signal }) => call(readCount, { params: { id }, signal }),
  });
}

export function countPlacesQuery() {
  return queryOptions({
    queryKey: ['counts', 'places'],
    queryFn: ({ signal }) => call(listCountPlaces, { signal }),
  });
}
