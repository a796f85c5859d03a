import type { RunEstimate } from '@hidewright/contract';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Design } from './design.entity.ts';
import { describeDesign } from './read-designs.ts';

interface Learnt {
  customerId: number;
  patternId: number;
  estimate: RunEstimate;
  /** How many runs stand behind it, 1 or more. */
  runs: number;
}

/** Keeps what a customer's runs say for their next quotes, in place of what was kept before. */
export async function keepDesign(work: Work, learnt: Learnt): Promise<Design> {
  const { customerId, patternId, estimate, runs } = learnt;
  const found = await work.em.findOne(Design, { customerId, patternId });
  const kept = { estimate, runs, learnedOn: work.today };
  const design = found ?? work.em.create(Design, { customerId, patternId, ...kept });
  Object.assign(design, kept);
  await work.em.flush();
  const { customerName, patternName } = await describeDesign(work.em, design);
  await logDeed(work, {
    action: `let quotes of ${patternName} for ${customerName} go by their own runs`,
    subjectKind: 'design',
    subjectId: design.id,
    detail: { runs },
  });
  return design;
}
