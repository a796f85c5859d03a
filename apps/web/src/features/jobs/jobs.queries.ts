import { compareJob, listJobs, readBenchHours, readJob, readVariances } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** The jobs on which there is still something to do. */
export function openJobsQuery() {
  return queryOptions({
    queryKey: ['jobs', 'open'],
    queryFn: ({ signal }) =>
      everyPage((paging) => call(listJobs, { query: { open: 'true', ...paging }, signal })),
  });
}

/** The latest that are done. */
export function finishedJobsQuery() {
  return queryOptions({
    queryKey: ['jobs', 'finished'],
    queryFn: ({ signal }) => call(listJobs, { query: { open: 'false', limit: 30 }, signal }),
  });
}

export function jobQuery(id: number) {
  return queryOptions({
    queryKey: ['jobs', id],
    queryFn: ({ signal }) => call(readJob, { params: { id }, signal }),
  });
}

export function comparisonQuery(id: number) {
  return queryOptions({
    queryKey: ['jobs', id, 'comparison'],
    queryFn: ({ signal }) => call(compareJob, { params: { id }, signal }),
  });
}

/** Why a finished job took and cost other than was said. */
export function variancesQuery(id: number) {
  return queryOptions({
    queryKey: ['jobs', id, 'variances'],
    queryFn: ({ signal }) => call(readVariances, { params: { id }, signal }),
  });
}

/** The coming two weeks at the bench. */
export function benchHoursQuery() {
  return queryOptions({
    queryKey: ['bench-hours'],
    queryFn: ({ signal }) => call(readBenchHours, { query: { days: 14 }, signal }),
  });
}
