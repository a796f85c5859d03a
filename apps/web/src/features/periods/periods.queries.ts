import { listPeriods, readSalesSheet } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** What was issued and paid from one day to another, both included. */
export function salesSheetQuery(from: string, to: string) {
  return queryOptions({
    queryKey: ['periods', 'sheet', from, to],
    queryFn: ({ signal }) => call(readSalesSheet, { query: { from, to }, signal }),
  });
}

/** What is locked, latest first. */
export function periodsQuery() {
  return queryOptions({
    queryKey: ['periods', 'locked'],
    queryFn: ({ signal }) => call(listPeriods, { signal }),
  });
}
