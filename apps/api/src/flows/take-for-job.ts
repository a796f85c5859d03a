import { Decimal } from 'decimal.js';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { findJob, requireJobState } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { takeStock } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { requireItsLeather } from './its-leather.ts';
import { startIfReady } from './start-job.ts';

export type Taking = { lotId: number; areaMm2: string } | { hardwareId: number; quantity: number };

/**
 * Takes leather from a named lot, or hardware, for a job: what is held for it first, then what is free.
 * @throws {Problem} 404, 409 when the job is not at the bench or less is to be had, 422 when the lot is of another leather
 */
export async function takeForJob(work: Work, jobId: number, taking: Taking): Promise<Job> {
  const job = await findJob(work.em, jobId);
  requireJobState(job, 'ready', 'at the bench');
  const reason = `for ${job.number}`;
  if ('lotId' in taking) {
    await requireItsLeather(work, job, taking.lotId);
    const quantity = scaled(new Decimal(taking.areaMm2), 3);
    await takeStock(work, { jobId, lotId: taking.lotId, quantity, reason });
  } else {
    await takeStock(work, {
      jobId,
      hardwareId: taking.hardwareId,
      quantity: taking.quantity,
      reason,
    });
  }
  await startIfReady(work, job);
  return job;
}
