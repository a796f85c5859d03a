import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound, wrongState } from '../../http/problem.ts';
import { Job } from './job.entity.ts';
import { JobStep } from './job-step.entity.ts';

/** @throws {Problem} 404 */
export async function findJob(em: EntityManager, id: number): Promise<Job> {
  const job = await em.findOne(Job, id);
  if (job === null) throw notFound('job');
  return job;
}

/** Whether the order that a job is for was cancelled. */
async function isCancelled(em: EntityManager, { orderId }: Pick<Job, 'orderId'>): Promise<boolean> {
  return (await orderOf(em, orderId)).state === 'cancelled';
}

/** @throws {Problem} 409 unless what it took is on the bench, or its order was cancelled before it was finished */
export async function requireBringsBack(em: EntityManager, job: Job): Promise<void> {
  if (job.state !== 'finished' && (await isCancelled(em, job))) return;
  requireJobState(job, 'at the bench', 'paused');
}

/** A job that somebody still wants. @throws {Problem} 404; 409 when its order was cancelled */
export async function findWantedJob(em: EntityManager, id: number): Promise<Job> {
  const job = await findJob(em, id);
  const order = await orderOf(em, job.orderId);
  if (order.state !== 'cancelled') return job;
  const back = job.state === 'finished' ? '' : ' What it has taken can still be brought back.';
  throw wrongState(
    `${order.number} was cancelled, so ${job.number} is over: nothing more is taken, logged, finished or compared.${back}`,
    back === '' ? [] : ['bring back what was taken', 'put an offcut back'],
  );
}

async function orderOf(
  em: EntityManager,
  orderId: number,
): Promise<{ number: string; state: string }> {
  const [order] = await em.execute<[{ number: string; state: string }]>(
    'SELECT number, state FROM customer_order WHERE id = ?',
    [orderId],
  );
  return order;
}

/** A job's steps, in the order of the work. */
export function stepsOf(em: EntityManager, jobId: number): Promise<JobStep[]> {
  return em.find(JobStep, { jobId }, { orderBy: { position: 'asc' } });
}

const refusals: Record<Job['state'], { because: string; allowed: string[] }> = {
  waiting: {
    because: 'still waits for what its order awaits. Note on the order what has arrived',
    allowed: ['note what has arrived'],
  },
  ready: {
    because: 'has not been begun. Take its leather, or log on its first step',
    allowed: ['take', 'log', 'finish'],
  },
  'at the bench': {
    because: 'is at the bench. Log on its steps, pause it, or finish it',
    allowed: ['take', 'log', 'pause', 'finish'],
  },
  paused: { because: 'is paused. Resume it first', allowed: ['resume'] },
  finished: {
    because: 'is finished, and its counts are closed. Read its estimate and fact',
    allowed: ['read estimate and fact'],
  },
};

/** @throws {Problem} 409 with what the job's state does allow */
export function requireJobState(job: Job, ...states: Job['state'][]): void {
  if (states.includes(job.state)) return;
  const { because, allowed } = refusals[job.state];
  throw wrongState(`${job.number} ${because}.`, allowed);
}
