import {
  listHardware,
  listLeathers,
  listPatterns,
  listPatternVersions,
  readPattern,
  readWorkshop,
} from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** The patterns, newest first; one page holds what a small shop makes. */
export function patternsQuery() {
  return queryOptions({
    queryKey: ['patterns'],
    queryFn: ({ signal }) => everyPage((paging) => call(listPatterns, { query: paging, signal })),
  });
}

export function patternQuery(id: number) {
  return queryOptions({
    queryKey: ['patterns', id],
    queryFn: ({ signal }) => call(readPattern, { params: { id }, signal }),
  });
}

export function patternVersionsQuery(id: number) {
  return queryOptions({
    queryKey: ['patterns', id, 'versions'],
    queryFn: ({ signal }) => call(listPatternVersions, { params: { id }, signal }),
  });
}

/** All leathers that a pattern can be made of. */
export function leatherChoicesQuery() {
  return queryOptions({
    queryKey: ['patterns', 'leather-choices'],
    queryFn: ({ signal }) => everyPage((paging) => call(listLeathers, { query: paging, signal })),
    select: ({ items }) => items.filter((leather) => leather.active),
  });
}

/** All hardware and supplies that a pattern can take. */
export function hardwareChoicesQuery() {
  return queryOptions({
    queryKey: ['patterns', 'hardware-choices'],
    queryFn: ({ signal }) => everyPage((paging) => call(listHardware, { query: paging, signal })),
    select: ({ items }) => items.filter((hardware) => hardware.active),
  });
}

/** What each kind of hardware is called, also those that the shop keeps no more. */
export function hardwareNamesQuery() {
  return queryOptions({
    ...hardwareChoicesQuery(),
    select: ({ items }) => new Map(items.map(({ id, name }) => [id, name])),
  });
}

/** The shop's spacing, trim and rejects, with which a new pattern begins. */
export function startingValuesQuery() {
  return queryOptions({
    queryKey: ['patterns', 'starting-values'],
    queryFn: ({ signal }) => call(readWorkshop, { signal }),
  });
}
