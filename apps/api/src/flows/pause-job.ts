import { logDeed } from '../modules/activity/activity-log.ts';
import { findWantedJob, requireJobState } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { Work } from '../work.ts';

/** Lays a job aside; what it holds stays held. @throws {Problem} 404, 409 */
export async function pauseJob(work: Work, jobId: number): Promise<Job> {
  return change(work, jobId, { from: 'at the bench', to: 'paused', verb: 'paused' });
}

/** Goes on with a paused job. @throws {Problem} 404, 409 */
export async function resumeJob(work: Work, jobId: number): Promise<Job> {
  return change(work, jobId, { from: 'paused', to: 'at the bench', verb: 'resumed' });
}

interface Change {
  from: Job['state'];
  to: Job['state'];
  verb: string;
}

async function change(work: Work, jobId: number, { from, to, verb }: Change): Promise<Job> {
  const job = await findWantedJob(work.em, jobId);
  requireJobState(job, from);
  job.state = to;
  await work.em.flush();
  await logDeed(work, { action: `${verb} ${job.number}`, subjectKind: 'job', subjectId: job.id });
  return job;
}
