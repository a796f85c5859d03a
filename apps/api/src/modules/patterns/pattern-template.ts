import { outlineOf } from '@hidewright/contract';
import { describeOutline } from '@hidewright/domain';
import { Problem } from '../../http/problem.ts';
import type { TemplatePaper } from '../../papers/template-pdf.ts';
import type { Work } from '../../work.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { definitionOf, findPattern, latestVersion } from './pattern-versions.ts';

/**
 * What goes on a pattern's template as it is now; on the paper of a shop that measures in inches where it does.
 * @throws {Problem} 404 when there is no such pattern, or it has a hand count and no outline
 */
export async function templateOf(
  work: Work,
  patternId: number,
  safeMarginMm: number,
): Promise<TemplatePaper> {
  const pattern = await findPattern(work, patternId);
  const typed = definitionOf(await latestVersion(work, pattern)).outline;
  if (typed === null) throw noOutline();
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const outline = outlineOf(typed);
  return {
    patternName: pattern.name,
    versionNumber: pattern.latestVersion,
    description: describeOutline(outline),
    shopName: workshop.name,
    day: work.today,
    outline,
    safeMarginMm,
    paper: workshop.lengthUnit === 'in' ? 'letter' : 'a4',
  };
}

const noOutline = () =>
  new Problem(
    404,
    'Not found',
    'This pattern has a hand count and no outline. Draw the outline in it first.',
  );
