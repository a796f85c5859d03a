import {
  listPatterns,
  listQuotes,
  readQuote,
  readRunBasis,
  type Quote,
  type QuoteState,
} from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

interface Wanted {
  state?: QuoteState | undefined;
  customerId?: number | undefined;
}

/** Quotes, newest first, page by page. */
export function quotesQuery(wanted: Wanted = {}) {
  return infiniteQueryOptions({
    queryKey: ['quotes', 'list', wanted],
    queryFn: ({ signal, pageParam }) =>
      call(listQuotes, {
        query: { ...wanted, limit: 100, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

export function quoteQuery(id: number) {
  return queryOptions({
    queryKey: ['quotes', id],
    queryFn: ({ signal }) => call(readQuote, { params: { id }, signal }),
    // Whether its mail has left, or its customer has agreed, shows without a reload.
    refetchInterval: ({ state }) => refreshAfter(state.data),
  });
}

function refreshAfter(quote: Quote | undefined): number | false {
  if (quote?.letter?.state === 'waiting') return 3000;
  return quote?.state === 'sent' ? 20_000 : false;
}

/** What a run of a pattern is priced from, so that the page can price it as it is typed. */
export function runBasisQuery(patternId: number, customerId?: number) {
  return queryOptions({
    queryKey: ['patterns', patternId, 'run-basis', customerId],
    queryFn: ({ signal }) =>
      call(readRunBasis, { params: { id: patternId }, query: { customerId }, signal }),
    staleTime: 30_000,
  });
}

/** The patterns that a quote can be made of. */
export function patternChoicesQuery() {
  return queryOptions({
    queryKey: ['patterns', 'choices'],
    queryFn: ({ signal }) => everyPage((paging) => call(listPatterns, { query: paging, signal })),
    select: ({ items }) =>
      items.filter((pattern) => pattern.active).map(({ id, name }) => ({ value: id, label: name })),
  });
}
