import type { BodyOf, returnFromJob as endpoint } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findJob, isCancelled, requireJobState } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { returnStock } from '../modules/stock/stock-ledger.ts';
import type { StockItem } from '../modules/stock/stock-item.ts';
import type { Work } from '../work.ts';

/**
 * Puts back on the rack or the shelf what a job has taken and does not use, before it is finished or after its order
 * was cancelled.
 * @throws {Problem} 404; 409 when it is finished, or has not taken as much
 */
export async function returnFromJob(
  work: Work,
  jobId: number,
  asked: BodyOf<typeof endpoint>,
): Promise<Job> {
  const job = await findJob(work.em, jobId);
  if (job.state === 'finished' || !(await isCancelled(work.em, job)))
    requireJobState(job, 'at the bench', 'paused');
  const [item, quantity]: [StockItem, number] =
    'lotId' in asked
      ? [{ lotId: asked.lotId }, scaled(new Decimal(asked.areaMm2), 3)]
      : [{ hardwareId: asked.hardwareId }, asked.quantity];
  await returnStock(work, { jobId, ...item, quantity, reason: `not used for ${job.number}` });
  const { name, say } = await describeItem(work.em, item);
  await logDeed(work, {
    action: `brought back ${say(quantity)} of ${name} from ${job.number}`,
    subjectKind: 'job',
    subjectId: job.id,
    detail: { quantity },
  });
  return job;
}
