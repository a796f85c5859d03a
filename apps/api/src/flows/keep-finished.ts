import { costOfKept } from '@hidewright/domain';
import { scaled, unscaled } from '../db/columns/scaled-decimal.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { putFinished, type FinishedKind } from '../modules/finished-pieces/finished-ledger.ts';
import { stepsOf } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { Order } from '../modules/orders/order.entity.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import { definitionOf } from '../modules/patterns/pattern-versions.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import type { Work } from '../work.ts';
import { usedBy } from './used-by-job.ts';

/** What a finished job made beyond what was ordered goes on the shelf, and so do its seconds. */
export async function keepFinished(work: Work, job: Job, order: Order): Promise<void> {
  const { good, seconds, quantity } = job;
  const overs = Math.max(0, good - quantity);
  if (overs + seconds === 0) return;
  const cost = await costOf(work, job);
  const worth = costOfKept({ cost, made: good + seconds, overs, seconds });
  const kind = await kindOf(work, job, order);
  if (overs > 0) await keep(work, job, { ...kind, sort: 'good' }, [overs, worth.overs]);
  if (seconds > 0) await keep(work, job, { ...kind, sort: 'seconds' }, [seconds, worth.seconds]);
}

/** The good pieces of a cancelled order go on the shelf too, at what its overs and seconds have left of the cost. */
export async function keepPacked(work: Work, job: Job, order: Order): Promise<void> {
  const quantity = Math.min(job.good, order.quantity);
  if (quantity === 0) return;
  const [shelved] = await work.em.execute<[{ value: number }]>(
    'SELECT COALESCE(SUM(value), 0) AS value FROM finished_movement WHERE job_id = ?',
    [job.id],
  );
  const left = Math.max(0, (await costOf(work, job)) - shelved.value);
  await keep(work, job, { ...(await kindOf(work, job, order)), sort: 'good' }, [quantity, left]);
}

/** Leather and hardware that the job took and did not bring back, in hundredths. */
async function costOf({ em }: Work, job: Job): Promise<number> {
  const { leatherCost, hardwareCost } = await usedBy(em, job, await stepsOf(em, job.id));
  const [leather, hardware] = [leatherCost, hardwareCost].map((cost) =>
    cost === null ? 0 : scaled(cost, 2),
  );
  return (leather ?? 0) + (hardware ?? 0);
}

/** Pieces with a customer's mark are theirs alone, so they lie apart. */
async function kindOf({ em }: Work, job: Job, order: Order): Promise<Omit<FinishedKind, 'sort'>> {
  const version = await em.findOneOrFail(PatternVersion, job.patternVersionId);
  return {
    patternId: version.patternId,
    optionName: order.optionName ?? '',
    customerId: definitionOf(version).needsPlate ? order.customerId : null,
  };
}

async function keep(
  work: Work,
  job: Job,
  kind: FinishedKind,
  [quantity, hundredths]: [number, number],
): Promise<void> {
  const value = unscaled(hundredths, 2);
  const reason = `made with ${job.number}`;
  const piece = await putFinished(work, kind, { quantity, value, jobId: job.id, reason });
  const { name } = await work.em.findOneOrFail(Pattern, kind.patternId);
  await logDeed(work, {
    action: `put ${quantity} of ${name}${kind.sort === 'seconds' ? ', seconds,' : ''} on the shelf`,
    subjectKind: 'finished piece',
    subjectId: piece.id,
    detail: { quantity, job: job.number },
  });
}
