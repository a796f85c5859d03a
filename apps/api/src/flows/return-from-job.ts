import { logDeed } from '../modules/activity/activity-log.ts';
import { findJob, requireBringsBack } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { returnStock } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { ledgerAmount, type AskedAmount } from './asked-amount.ts';

/**
 * Puts back on the rack or the shelf what a job has taken and does not use, before it is finished or after its order
 * was cancelled.
 * @throws {Problem} 404; 409 when it is finished, or has not taken as much
 */
export async function returnFromJob(work: Work, jobId: number, asked: AskedAmount): Promise<Job> {
  const job = await findJob(work.em, jobId);
  await requireBringsBack(work.em, job);
  const { quantity, ...item } = ledgerAmount(asked);
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
