import type { BenchLog as LogReply, JobStep as StepReply } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { BenchLog } from '../../modules/jobs/bench-log.entity.ts';
import { cautionFor } from '../../modules/jobs/cautions.ts';
import type { Job } from '../../modules/jobs/job.entity.ts';
import type { JobStep } from '../../modules/jobs/job-step.entity.ts';
import { shareDone, stepLimits } from '../../modules/jobs/step-limits.ts';

/** The steps as the ticket shows them. */
export function ticketSteps(job: Job, steps: readonly JobStep[]): StepReply[] {
  const limits = stepLimits(job, steps);
  return steps.map((step, at) => {
    const limit = limits[at] ?? 0;
    return {
      id: step.id,
      position: step.position,
      name: step.name,
      per: step.per,
      plannedMinutes: step.plannedMinutes.toString(),
      limit,
      good: step.good,
      rejects: step.rejects,
      seconds: step.seconds,
      minutes: step.minutes.toString(),
      done: shareDone(step, limit) === 1,
      caution: cautionFor(step),
    };
  });
}

/** What was logged, newest first. */
export async function ticketLogs(
  em: EntityManager,
  steps: readonly JobStep[],
): Promise<LogReply[]> {
  const names = new Map(steps.map(({ id, name }) => [id, name]));
  const rows = await em.find(
    BenchLog,
    { jobStepId: { $in: [...names.keys()] } },
    { orderBy: { id: 'desc' } },
  );
  return rows.map((row) => ({
    id: row.id,
    stepId: row.jobStepId,
    stepName: names.get(row.jobStepId) ?? '',
    good: row.good,
    rejects: row.rejects,
    seconds: row.seconds,
    minutes: row.minutes.toString(),
    note: row.note,
    at: row.at,
    personName: row.personName,
  }));
}
