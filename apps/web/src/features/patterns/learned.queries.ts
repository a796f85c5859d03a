import { listTimeReadings, readLearned } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** What the last runs of a pattern say, of one customer or of all, some of them left out. */
export function learnedQuery(id: number, left: readonly number[] = [], customerId?: number) {
  const without = left.length === 0 ? undefined : left.join(',');
  return queryOptions({
    queryKey: ['patterns', id, 'learned', without, customerId],
    queryFn: ({ signal }) =>
      call(readLearned, { params: { id }, query: { without, customerId }, signal }),
  });
}

/** Readings of a pattern's steps, and what its tickets say. */
export function timeReadingsQuery(id: number) {
  return queryOptions({
    queryKey: ['patterns', id, 'time-readings'],
    queryFn: ({ signal }) => call(listTimeReadings, { params: { id }, signal }),
  });
}
