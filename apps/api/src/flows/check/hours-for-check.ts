import { earliestDay, freeUntil } from '@hidewright/domain';
import type { Decimal } from 'decimal.js';
import { scaled, unscaled } from '../../db/columns/scaled-decimal.ts';
import { sayDay } from '../../modules/quotes/say-day.ts';
import type { Work } from '../../work.ts';
import { benchToday, openJobs } from '../bench-load.ts';

export interface NeededHours {
  neededMinutes: string;
  freeMinutes: string;
  /** The first day by which the bench has the hours; null where there is none within a year. */
  earliest: string | null;
  remedy: string;
}

/** The bench hours that are free until a day, beside what has been promised before. */
export async function hoursForCheck(
  work: Work,
  minutes: Decimal,
  by: string,
): Promise<NeededHours> {
  const bench = await benchToday(work);
  const jobs = await openJobs(work.em);
  const earliest = earliestDay(bench, jobs, scaled(minutes, 2));
  return {
    neededMinutes: minutes.toString(),
    freeMinutes: unscaled(freeUntil(bench, jobs, by), 2).toString(),
    earliest,
    remedy:
      earliest === null
        ? 'The bench has no such hours within a year: set its hours per day in the Office.'
        : `Promise ${sayDay(earliest)} or later, or move another job.`,
  };
}
