import { Decimal } from 'decimal.js';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { invalid } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findWantedJob, requireJobState, stepsOf } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { piecesRun, piecesSpoiled } from '../modules/jobs/step-limits.ts';
import { findOrder } from '../modules/orders/find-order.ts';
import type { Order } from '../modules/orders/order.entity.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import { definitionOf } from '../modules/patterns/pattern-versions.ts';
import { releaseReservations, returnStock } from '../modules/stock/stock-ledger.ts';
import { addImpressions } from '../modules/tools/tool-ledger.ts';
import type { Work } from '../work.ts';
import { chooseTool, strikesFor, toolsFor } from './choose-tools.ts';
import { keepFinished } from './keep-finished.ts';
import { startIfReady } from './start-job.ts';

export interface Finished {
  good: number;
  seconds: number;
  /** What goes back on the rack, by lot and by kind. */
  leatherLeft: { lotId: number; areaMm2: string }[];
  hardwareLeft: { hardwareId: number; quantity: number }[];
}

/**
 * Closes a job: what is left goes back, what is still held is let go, die and plate gain their strikes, and the
 * order is packed; pieces beyond it, and seconds, go on the shelf.
 * @throws {Problem} 404, 409 when the job is not at the bench or more would come back than was taken, 422
 */
export async function finishJob(work: Work, jobId: number, finished: Finished): Promise<Job> {
  const job = await findWantedJob(work.em, jobId);
  requireJobState(job, 'ready', 'at the bench');
  const steps = await stepsOf(work.em, jobId);
  refuseMoreThanThereIs(job, finished, job.cutCount - piecesSpoiled(steps));
  await startIfReady(work, job);
  await bringBack(work, job, finished);
  await releaseReservations(work, jobId);
  const order = await findOrder(work.em, job.orderId);
  await countStrikes(work, job, order, piecesRun(steps) || job.cutCount);
  await close(work, job, order, finished);
  await keepFinished(work, job, order);
  return job;
}

function refuseMoreThanThereIs(job: Job, { good, seconds }: Finished, most: number): void {
  if (good + seconds <= most) return;
  const spoiled = job.cutCount - most;
  const why =
    spoiled > 0
      ? `${job.cutCount} are cut and ${spoiled} are logged as rejects`
      : `${job.cutCount} are cut`;
  const field = good > most ? 'good' : 'seconds';
  throw invalid([
    {
      field,
      message: `${why}, so at most ${most} pieces can come out. Count again, or correct the rejects.`,
    },
  ]);
}

async function bringBack(
  work: Work,
  { id: jobId, number }: Job,
  { leatherLeft, hardwareLeft }: Finished,
): Promise<void> {
  const reason = `left over from ${number}`;
  for (const { lotId, areaMm2 } of leatherLeft) {
    const quantity = scaled(new Decimal(areaMm2), 3);
    if (quantity > 0) await returnStock(work, { jobId, lotId, quantity, reason });
  }
  for (const { hardwareId, quantity } of hardwareLeft) {
    if (quantity > 0) await returnStock(work, { jobId, hardwareId, quantity, reason });
  }
}

async function countStrikes(work: Work, job: Job, order: Order, pieces: number): Promise<void> {
  const version = await work.em.findOneOrFail(PatternVersion, job.patternVersionId);
  const { needsDie, needsPlate } = definitionOf(version);
  const forWhom = { patternId: version.patternId, customerId: order.customerId };
  const kinds = [needsPlate ? 'stamp plate' : null, needsDie ? 'cutting die' : null] as const;
  for (const kind of kinds) {
    if (kind === null) continue;
    const tool = chooseTool(await toolsFor(work.em, kind, forWhom), pieces);
    if (tool === undefined) continue;
    const uses = strikesFor(tool, pieces);
    await addImpressions(work, { toolId: tool.id, uses, jobId: job.id, reason: job.number });
  }
}

async function close(
  work: Work,
  job: Job,
  order: Order,
  { good, seconds }: Finished,
): Promise<void> {
  job.state = 'finished';
  job.good = good;
  job.seconds = seconds;
  job.finishedAt = work.now.toISOString();
  order.state = 'packed';
  await work.em.flush();
  const detail = { good, seconds };
  await logDeed(work, {
    action: `finished ${job.number}`,
    subjectKind: 'job',
    subjectId: job.id,
    detail,
  });
  await logDeed(work, {
    action: `packed ${order.number}`,
    subjectKind: 'order',
    subjectId: order.id,
  });
}
