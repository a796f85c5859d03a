/** What of a step its limit depends on. */
export interface CountedStep {
  per: 'piece' | 'strike' | 'panel' | 'strip' | 'run';
  good: number;
  rejects: number;
  seconds: number;
}

interface Counts {
  cutCount: number;
  containers: number;
}

export const handledIn = (step: CountedStep): number => step.good + step.rejects + step.seconds;

/** How many passed a step of a finished job: where nobody counted, all that could. */
export const handledAtEnd = (step: CountedStep, limit: number): number =>
  step.per === 'run' ? 1 : handledIn(step) || limit;

/** Whether a step is counted in pieces, so that what fails there is a piece. */
export const countsPieces = (step: Pick<CountedStep, 'per'>): boolean =>
  step.per === 'piece' || step.per === 'strike';

/**
 * How many of what each step is counted per can pass there, in order: the pieces that are cut less the rejects of
 * the steps before, the panels or strips of the job, or the one run. Seconds go on: they are worked to the end.
 */
export function stepLimits(job: Counts, steps: readonly CountedStep[]): number[] {
  let spoiled = 0;
  return steps.map((step) => {
    if (!countsPieces(step)) return step.per === 'run' ? 1 : job.containers;
    const limit = job.cutCount - spoiled;
    spoiled += step.rejects;
    return limit;
  });
}

/** The share of a step that is done, 0 to 1. */
export function shareDone(step: CountedStep, limit: number): number {
  return limit <= 0 ? 1 : Math.min(1, handledIn(step) / limit);
}

/** Pieces that are no longer there: the rejects of the steps that are counted in pieces. */
export function piecesSpoiled(steps: readonly CountedStep[]): number {
  return steps.filter(countsPieces).reduce((sum, step) => sum + step.rejects, 0);
}

/** How many pieces went under the press: the most that any step counted in pieces has handled, none where nobody counted. */
export function piecesRun(steps: readonly CountedStep[]): number {
  return Math.max(0, ...steps.filter(countsPieces).map(handledIn));
}
