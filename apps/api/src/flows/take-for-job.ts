import type { BodyOf, takeForJob as endpoint } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { wrongState } from '../http/problem.ts';
import { findWantedJob, requireJobState } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import { heldForJob } from '../modules/stock/held-for-job.ts';
import { refuseKit } from '../modules/stock/refuse-kit.ts';
import type { StockItem } from '../modules/stock/stock-item.ts';
import { takeStock } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { requireItsLeather } from './its-leather.ts';
import { startIfReady } from './start-job.ts';

const inLedger = (areaMm2: string): number => scaled(new Decimal(areaMm2), 3);

/**
 * Takes leather from a named lot, or hardware, for a job: what is held for it first, then what is free.
 * @throws {Problem} 404, 409 when the job is not at the bench, other than was seen is held for it or less is to be
 * had, 422 when the lot is of another leather or the hardware is a kit
 */
export async function takeForJob(
  work: Work,
  jobId: number,
  taking: BodyOf<typeof endpoint>,
): Promise<Job> {
  const job = await findWantedJob(work.em, jobId);
  requireJobState(job, 'ready', 'at the bench');
  const reason = `for ${job.number}`;
  if ('lotId' in taking) {
    const { lotId, areaMm2, heldSeenAreaMm2: seen } = taking;
    await requireItsLeather(work, job, lotId);
    if (seen !== undefined) await requireHeld(work, job, { lotId }, inLedger(seen));
    await takeStock(work, { jobId, lotId, quantity: inLedger(areaMm2), reason });
  } else {
    const { hardwareId, quantity, heldSeenQuantity: seen } = taking;
    await refuseKit(work.em, { hardwareId });
    if (seen !== undefined) await requireHeld(work, job, { hardwareId }, seen);
    await takeStock(work, { jobId, hardwareId, quantity, reason });
  }
  await startIfReady(work, job);
  return job;
}

/** What two take who press at once is taken by the first alone. @throws {Problem} 409 naming what is held now */
async function requireHeld(work: Work, job: Job, item: StockItem, seen: number): Promise<void> {
  const held = await heldForJob(work.em, job.id, item);
  if (held === seen) return;
  const { name, say } = await describeItem(work.em, item);
  throw held === 0
    ? wrongState(
        `Nothing of ${name} is held for ${job.number} any more: it was taken already, or let go of. Nothing is taken now. Look at what the ticket has taken.`,
        ['take other stock'],
      )
    : wrongState(
        `${say(held)} of ${name} is held for ${job.number} now, not ${say(seen)} as before. Nothing is taken now. Look at the ticket, then take it again.`,
        [`take ${say(held)}`],
      );
}
