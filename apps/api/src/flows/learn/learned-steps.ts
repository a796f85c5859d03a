import type { LearnedStep, PatternDefinition } from '@hidewright/contract';
import {
  matchSteps,
  poolRejects,
  poolStepTime,
  practiceFactor,
  type CountedRejects,
  type LoggedStep,
} from '@hidewright/domain';
import type { JobStep } from '../../modules/jobs/job-step.entity.ts';
import {
  countsPieces,
  handledAtEnd,
  handledIn,
  stepLimits,
} from '../../modules/jobs/step-limits.ts';
import type { PastRun } from './past-runs.ts';

type Steps = Extract<PatternDefinition['work'], { kind: 'steps' }>;

/** A step of a past run with how much can have passed there. */
interface Passed {
  step: JobStep;
  limit: number;
  /** Pieces that the run cut. */
  cut: number;
}

/** What past runs say of each step of the pattern as it is now. */
export function learnSteps(
  { steps, learning }: Steps,
  runs: readonly PastRun[],
  restPercent: string,
): LearnedStep[] {
  const found = runs.map(({ job, cut, steps: then }) => {
    const limits = stepLimits(job, then);
    return matchSteps(steps, then).map((at): Passed | null => {
      const step = at === null ? undefined : then[at];
      return step === undefined ? null : { step, limit: limits[at ?? 0] ?? 0, cut };
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
      time: poolStepTime(
        step,
        passed.flatMap((each) => loggedTime(each, learning)),
        restPercent,
      ),
      rejects: poolRejects(passed.flatMap(countedRejects)),
    };
  });
}

function loggedTime({ step, limit, cut }: Passed, learning: Steps['learning']): LoggedStep[] {
  const units = handledAtEnd(step, limit);
  if (step.minutes.isZero() || units < 1) return [];
  const practised = countsPieces(step) ? learning : null;
  return [{ minutes: step.minutes.toString(), units, practice: practiceFactor(practised, cut) }];
}

function countedRejects({ step }: Passed): CountedRejects[] {
  const reached = handledIn(step);
  return countsPieces(step) && reached > 0 ? [{ rejected: step.rejects, reached }] : [];
}
