import { listHardware, readHardware } from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** Hardware and supplies with their counts, newest first, page by page. */
export function hardwarePagesQuery() {
  return infiniteQueryOptions({
    queryKey: ['hardware', 'pages'],
    queryFn: ({ signal, pageParam }) =>
      call(listHardware, {
        query: { limit: 200, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

/** All hardware and supplies, to choose from. */
export function hardwareListQuery() {
  return queryOptions({
    queryKey: ['hardware'],
    queryFn: ({ signal }) => everyPage((paging) => call(listHardware, { query: paging, signal })),
  });
}

export function hardwareQuery(id: number) {
  return queryOptions({
    queryKey: ['hardware', id],
    queryFn: ({ signal }) => call(readHardware, { params: { id }, signal }),
  });
}
