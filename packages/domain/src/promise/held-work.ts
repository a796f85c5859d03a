import type { WorkPart } from './bench-time.ts';
import type { Day } from './day.ts';

/** Work that the shop has taken on; minutes are whole hundredths, so that sums are exact. */
export interface HeldWork {
  jobId: number;
  promisedOn: Day;
  /** What is still to do, in hundredths of a minute. */
  remaining: number;
  /** The same, part by part, where pieces must lie between steps. */
  parts?: readonly WorkPart[];
}

/** Earliest promise first: if any order of work keeps all promises, this one does (Jackson 1955, from memory). */
export function byPromise(work: readonly HeldWork[]): HeldWork[] {
  return [...work].sort((a, b) =>
    a.promisedOn < b.promisedOn ? -1 : a.promisedOn > b.promisedOn ? 1 : a.jobId - b.jobId,
  );
}

export const partsOf = ({ parts, remaining }: HeldWork): readonly WorkPart[] =>
  parts ?? (remaining > 0 ? [{ minutes: remaining, waitAfter: 0 }] : []);
