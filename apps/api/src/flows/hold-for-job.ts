import { wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findJob, findWantedJob, requireJobState } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { refuseKit } from '../modules/stock/refuse-kit.ts';
import type { StockItem } from '../modules/stock/stock-item.ts';
import { releaseReservations, reserveStock } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { ledgerAmount, type AskedAmount } from './asked-amount.ts';
import { requireItsLeather } from './its-leather.ts';

/**
 * Holds leather of a named lot, or hardware, for a job.
 * @throws {Problem} 404; 409 naming what is free when it is less, or when the job is finished; 422 for another leather
 * or a kit
 */
export async function holdForJob(work: Work, jobId: number, asked: AskedAmount): Promise<Job> {
  const job = await findWantedJob(work.em, jobId);
  requireJobState(job, 'waiting', 'ready', 'at the bench', 'paused');
  const { quantity, ...item } = ledgerAmount(asked);
  if (typeof item.lotId === 'number') await requireItsLeather(work, job, item.lotId);
  await refuseKit(work.em, item);
  await reserveStock(work, { jobId, ...item, quantity });
  await note(work, job, item, quantity, 'held');
  return job;
}

/** Lets go of what is held for a job of one lot or hardware. @throws {Problem} 404; 409 when nothing of it is held */
export async function letGoForJob(
  work: Work,
  jobId: number,
  asked: { lotId: number } | { hardwareId: number },
): Promise<Job> {
  const job = await findJob(work.em, jobId);
  const item: StockItem = asked;
  const { name } = await describeItem(work.em, item);
  const open = await releaseReservations(work, jobId, item);
  if (open === 0)
    throw wrongState(`Nothing of ${name} is held for ${job.number}. Open its ticket again.`, [
      'open the ticket',
    ]);
  await note(work, job, item, open, 'let go of');
  return job;
}

async function note(
  work: Work,
  job: Job,
  item: StockItem,
  quantity: number,
  deed: string,
): Promise<void> {
  const { name, say } = await describeItem(work.em, item);
  await logDeed(work, {
    action: `${deed} ${say(quantity)} of ${name} for ${job.number}`,
    subjectKind: 'job',
    subjectId: job.id,
    detail: { quantity },
  });
}
