import {
  listCustomers,
  listImpressions,
  listPatterns,
  listPlateOffers,
  listTools,
  readTool,
  readToolingAdvice,
} from '@hidewright/contract';
import { infiniteQueryOptions, keepPreviousData, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** Cutting dies and stamp plates, of one pattern or all of them. */
export function toolsQuery(patternId?: number) {
  return queryOptions({
    queryKey: ['tools', 'list', patternId ?? 'all'],
    queryFn: ({ signal }) =>
      everyPage((paging) => call(listTools, { query: { patternId, ...paging }, signal })),
  });
}

export function toolQuery(id: number) {
  return queryOptions({
    queryKey: ['tools', id],
    queryFn: ({ signal }) => call(readTool, { params: { id }, signal }),
  });
}

/** What a tool did, newest first, page by page. */
export function impressionsQuery(id: number) {
  return infiniteQueryOptions({
    queryKey: ['tools', id, 'impressions'],
    queryFn: ({ signal, pageParam }) =>
      call(listImpressions, {
        params: { id },
        query: { limit: 50, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

/** The patterns that a tool can be for. */
export function patternChoicesQuery() {
  return queryOptions({
    queryKey: ['tools', 'pattern-choices'],
    queryFn: ({ signal }) => everyPage((paging) => call(listPatterns, { query: paging, signal })),
    select: ({ items }) => items.map(({ id, name }) => ({ value: id, label: name })),
  });
}

/** The customers whose artwork a plate can carry. */
export function customerChoicesQuery() {
  return queryOptions({
    queryKey: ['tools', 'customer-choices'],
    queryFn: ({ signal }) => everyPage((paging) => call(listCustomers, { query: paging, signal })),
    select: ({ items }) => items.map(({ id, name }) => ({ value: id, label: name })),
  });
}

/** What a new plate of each metal costs and lasts. */
export function plateOffersQuery() {
  return queryOptions({
    queryKey: ['tools', 'plate-offers'],
    queryFn: ({ signal }) => call(listPlateOffers, { signal }),
  });
}

export interface AskedTooling {
  patternId: number;
  customerId?: number | undefined;
  /** To cut, rejects included. */
  pieces: number;
  /** Expected after this one, and the pieces of each. */
  runs?: number | undefined;
  runPieces?: number | undefined;
}

/** The die and plate there are for a run, and which metal a new plate should be. */
export function toolingAdviceQuery({ patternId, ...query }: AskedTooling) {
  return queryOptions({
    queryKey: ['tools', 'advice', patternId, query],
    queryFn: ({ signal }) => call(readToolingAdvice, { params: { id: patternId }, query, signal }),
    placeholderData: keepPreviousData,
  });
}
