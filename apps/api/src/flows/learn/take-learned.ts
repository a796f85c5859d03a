import {
  patternDefinition,
  withEstimate,
  type BodyOf,
  type Learned,
  type takeLearned as takeLearnedEndpoint,
} from '@hidewright/contract';
import { requireVersion } from '../../http/conditions.ts';
import { keepDesign } from '../../modules/designs/keep-design.ts';
import type { WorkedLayout } from '../../modules/layouts/stored-layouts.ts';
import {
  definitionOf,
  findPattern,
  latestVersion,
} from '../../modules/patterns/pattern-versions.ts';
import type { Work } from '../../work.ts';
import { changePattern } from '../save-pattern.ts';
import { estimateFrom } from './estimate-from.ts';
import { readLearned } from './read-learned.ts';

type Asked = BodyOf<typeof takeLearnedEndpoint> & { id: number; ifMatch: number };

/**
 * Makes what the last runs say a new version of a pattern; or, of one customer's runs, what their next quotes go by.
 * @param worked the layout of the pattern as it is, which does not change
 * @throws {Problem} 404, 412, 422 when there is nothing to take
 */
export async function takeLearned(
  work: Work,
  asked: Asked,
  worked: WorkedLayout,
): Promise<Learned> {
  const { id, ifMatch, customerId } = asked;
  const learned = await readLearned(work, id, asked);
  const estimate = estimateFrom(learned, asked.take);
  const pattern = await findPattern(work, id);
  if (customerId === null) {
    const before = definitionOf(await latestVersion(work, pattern));
    const definition = patternDefinition.parse(withEstimate(before, estimate));
    await changePattern(work, { id, ifMatch, change: { definition } }, worked);
  } else {
    await requireVersion(work.em, { kind: 'pattern', id, version: pattern.version }, ifMatch);
    const runs = learned.runs.filter(({ mixedIn }) => mixedIn).length;
    await keepDesign(work, { customerId, patternId: id, estimate, runs });
  }
  return readLearned(work, id, asked);
}
