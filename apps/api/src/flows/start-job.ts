import { logDeed } from '../modules/activity/activity-log.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import { findOrder } from '../modules/orders/find-order.ts';
import type { Work } from '../work.ts';

/** The first thing that is logged or taken brings a ready job to the bench, and its order into work. */
export async function startIfReady(work: Work, job: Job): Promise<void> {
  if (job.state !== 'ready') return;
  job.state = 'at the bench';
  job.startedAt = work.now.toISOString();
  const order = await findOrder(work.em, job.orderId);
  order.state = 'in work';
  await work.em.flush();
  await logDeed(work, {
    action: `brought ${job.number} to the bench`,
    subjectKind: 'job',
    subjectId: job.id,
  });
  await logDeed(work, {
    action: `began work on ${order.number}`,
    subjectKind: 'order',
    subjectId: order.id,
  });
}
