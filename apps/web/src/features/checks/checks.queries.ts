import { checkQuote, listPatterns, listQuotes, readPattern, readQuote } from '@hidewright/contract';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

interface Asked {
  option?: string | undefined;
  quantity?: number | undefined;
  by?: string | undefined;
}

/** Can we make it? Asked anew each time: what is free changes with every other order. */
export function checkQuery(quoteId: number, asked: Asked = {}) {
  return queryOptions({
    queryKey: ['checks', quoteId, asked],
    queryFn: ({ signal }) => call(checkQuote, { params: { id: quoteId }, query: asked, signal }),
    staleTime: 0,
    placeholderData: keepPreviousData,
  });
}

/** Quotes that may still be taken on, those agreed to first. */
export function openQuotesQuery() {
  return queryOptions({
    queryKey: ['quotes', 'open'],
    queryFn: ({ signal }) => everyPage((paging) => call(listQuotes, { query: paging, signal })),
    select: ({ items }) =>
      (['agreed', 'sent', 'draft'] as const).flatMap((state) =>
        items
          .filter((quote) => quote.state === state && quote.orderId === null)
          .map(({ id, number, title }) => ({ value: id, label: `${number} ${title} (${state})` })),
      ),
  });
}

export function patternChoicesQuery() {
  return queryOptions({
    queryKey: ['patterns', 'choices'],
    queryFn: ({ signal }) => everyPage((paging) => call(listPatterns, { query: paging, signal })),
    select: ({ items }) =>
      items.filter(({ active }) => active).map(({ id, name }) => ({ value: id, label: name })),
  });
}

/** The names of the options that a quote offers; they stand with its prices, so the maker is not told them. */
export function quoteOptionsQuery(id: number | undefined) {
  return queryOptions({
    queryKey: ['quotes', id],
    queryFn: ({ signal }) => call(readQuote, { params: { id: id ?? 0 }, signal }),
    enabled: id !== undefined,
    select: ({ numbers }) => (numbers?.options ?? []).map(({ name }) => name),
  });
}

/** The names of the options that a pattern has. */
export function patternOptionsQuery(id: number | undefined) {
  return queryOptions({
    queryKey: ['patterns', id],
    queryFn: ({ signal }) => call(readPattern, { params: { id: id ?? 0 }, signal }),
    enabled: id !== undefined,
    select: ({ definition }) => (definition.options ?? []).map(({ name }) => name),
  });
}
