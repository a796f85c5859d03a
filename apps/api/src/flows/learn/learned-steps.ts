import type { LearnedStep, PatternDefinition } from '@hidewright/contract';
import {
  matchSteps,
  poolRejects,
  poolStepTime,
  type CountedRejects,
  type LoggedStep,
} from '@hidewright/domain';
import type { JobStep } from '../../modules/jobs/job-step.entity.ts';
import { countsPieces, handledIn, stepLimits } from '../../modules/jobs/step-limits.ts';
import type { PastRun } from './past-runs.ts';

type Step = Extract<PatternDefinition['work'], { kind: 'steps' }>['steps'][number];

/** A step of a past run with how much can have passed there. */
interface Passed {
  step: JobStep;
  limit: number;
}

/** What past runs say of each step of the pattern as it is now. */
export function learnSteps(steps: readonly Step[], runs: readonly PastRun[]): LearnedStep[] {
  const found = runs.map(({ job, steps: then }) => {
    const limits = stepLimits(job, then);
    return matchSteps(steps, then).map((at): Passed | null => {
      const step = at === null ? undefined : then[at];
      return step === undefined ? null : { step, limit: limits[at ?? 0] ?? 0 };
    });
  });
  return steps.map((step, at) => {
    const passed = found.flatMap((run) => run[at] ?? []);
    const { setupMinutes, secondsPerUnit, rejectPercent } = step;
    return {
      position: at + 1,
      name: step.name,
      per: step.per,
      said: { setupMinutes, secondsPerUnit, rejectPercent },
      time: poolStepTime(step, passed.flatMap(loggedTime)),
      rejects: poolRejects(passed.flatMap(countedRejects)),
    };
  });
}

/** The job is finished: where only minutes were logged, all that could pass has passed. */
function loggedTime({ step, limit }: Passed): LoggedStep[] {
  const units = step.per === 'run' ? 1 : handledIn(step) || limit;
  return step.minutes.isZero() || units < 1 ? [] : [{ minutes: step.minutes.toString(), units }];
}

function countedRejects({ step }: Passed): CountedRejects[] {
  const reached = handledIn(step);
  return countsPieces(step) && reached > 0 ? [{ rejected: step.rejects, reached }] : [];
}
