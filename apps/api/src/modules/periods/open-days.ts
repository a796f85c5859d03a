import { Problem, invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Period } from './period.entity.ts';
import { sayDate, sayPeriod } from './say-period.ts';

/**
 * Nothing is posted into a locked period, nor onto a day that has not come.
 * @throws {Problem} 409 when the day is locked, 422 when it is still to come
 */
export async function requireOpenDay(work: Work, day: string, field: string): Promise<void> {
  if (day > work.today) {
    throw invalid([{ field, message: 'That day is still to come. Choose today or a day before.' }]);
  }
  const locked = await work.em.findOne(Period, { fromDay: { $lte: day }, toDay: { $gte: day } });
  if (locked === null) return;
  throw new Problem(
    409,
    'Locked',
    `${sayDate(day)} lies in a locked period (${sayPeriod(locked)}). Choose a day after it.`,
    { allowed: ['choose a later day'] },
  );
}
