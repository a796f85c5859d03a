import { listLots, readLot, readLotDrawing, readLotSearch } from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

interface Wanted {
  leatherId?: number | undefined;
  onRack?: 'yes' | undefined;
  /** on the rack, or out to be worked on */
  ours?: 'yes' | undefined;
}

/** Lots, newest first, page by page. */
export function lotsQuery(wanted: Wanted = {}) {
  return infiniteQueryOptions({
    queryKey: ['lots', 'list', wanted],
    queryFn: ({ signal, pageParam }) =>
      call(listLots, {
        query: { ...wanted, limit: 100, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

export function lotQuery(id: number) {
  return queryOptions({
    queryKey: ['lots', id],
    queryFn: ({ signal }) => call(readLot, { params: { id }, signal }),
  });
}

/** The lot's edge and flaws as drawn. */
export function lotDrawingQuery(id: number) {
  return queryOptions({
    queryKey: ['lots', id, 'drawing'],
    queryFn: ({ signal }) => call(readLotDrawing, { params: { id }, signal }),
  });
}

const lookAgainMs = 400;

/** A search for the most pieces, asked after until it has ended. */
export function lotSearchQuery(id: string) {
  return queryOptions({
    queryKey: ['searches', id],
    queryFn: ({ signal }) => call(readLotSearch, { params: { id }, signal }),
    refetchInterval: ({ state: { data, error } }) =>
      error === null && (data === undefined || data.state === 'looking') && lookAgainMs,
  });
}
