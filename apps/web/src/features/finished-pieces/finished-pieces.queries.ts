import {
  listFinishedMovements,
  listFinishedPieces,
  listInvoices,
  readFinishedPiece,
  readPattern,
  type QueryInputOf,
} from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

type Asked = Omit<QueryInputOf<typeof listFinishedPieces>, 'cursor' | 'limit'>;

/** The whole shelf, or what lies there that one customer could have. */
export const shelfAsked = (forCustomer: number | undefined): Asked =>
  forCustomer === undefined ? {} : { forCustomer, there: 'yes' };

/** What lies finished on the shelf, kind by kind. */
export function finishedPiecesQuery(asked: Asked = {}) {
  return infiniteQueryOptions({
    queryKey: ['finished-pieces', asked],
    queryFn: ({ signal, pageParam }) =>
      call(listFinishedPieces, {
        query: { ...asked, limit: 100, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

export function finishedPieceQuery(id: number) {
  return queryOptions({
    queryKey: ['finished-piece', id],
    queryFn: ({ signal }) => call(readFinishedPiece, { params: { id }, signal }),
  });
}

/** The drafts that a customer has from the shelf, newest first; 0 while nobody is chosen. */
export function shelfDraftsQuery(customerId: number) {
  return queryOptions({
    queryKey: ['invoices', 'shelf-drafts', customerId],
    queryFn: ({ signal }) =>
      call(listInvoices, { query: { of: 'shelf', state: 'draft', customerId, limit: 5 }, signal }),
    enabled: customerId > 0,
    select: ({ items }) => items,
  });
}

/** The names of the options that a pattern has; 0 where none is chosen. */
export function patternOptionsQuery(id: number) {
  return queryOptions({
    queryKey: ['patterns', id],
    queryFn: ({ signal }) => call(readPattern, { params: { id }, signal }),
    enabled: id > 0,
    select: ({ definition }) => (definition.options ?? []).map(({ name }) => name),
  });
}

/** What came to the shelf and left it, newest first. */
export function finishedMovementsQuery(id: number) {
  return infiniteQueryOptions({
    queryKey: ['finished-piece', id, 'movements'],
    queryFn: ({ signal, pageParam }) =>
      call(listFinishedMovements, {
        params: { id },
        query: { limit: 50, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}
