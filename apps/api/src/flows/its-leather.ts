import { invalid, notFound } from '../http/problem.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { Lot } from '../modules/lots/lot.entity.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import { definitionOf } from '../modules/patterns/pattern-versions.ts';
import type { Work } from '../work.ts';

/** A lot of the leather that a job is made of. @throws {Problem} 404, 422 naming the leather it needs */
export async function requireItsLeather({ em }: Work, job: Job, lotId: number): Promise<void> {
  const lot = await em.findOne(Lot, lotId);
  if (lot === null) throw notFound('lot');
  const version = await em.findOneOrFail(PatternVersion, job.patternVersionId);
  const { leatherId } = definitionOf(version);
  if (lot.leatherId === leatherId) return;
  const needed = await em.findOneOrFail(Leather, leatherId);
  const message = `Lot ${lot.tag} is another leather; ${job.number} needs ${needed.name}. Choose a lot of that.`;
  throw invalid([{ field: 'lotId', message }]);
}
