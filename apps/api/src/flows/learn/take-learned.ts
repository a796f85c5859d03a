import {
  patternDefinition,
  type BodyOf,
  type Learned,
  type PatternDefinition,
  type takeLearned as takeLearnedEndpoint,
} from '@hidewright/contract';
import { invalid, type FieldFault } from '../../http/problem.ts';
import type { WorkedLayout } from '../../modules/layouts/stored-layouts.ts';
import {
  definitionOf,
  findPattern,
  latestVersion,
} from '../../modules/patterns/pattern-versions.ts';
import type { Work } from '../../work.ts';
import { changePattern } from '../save-pattern.ts';
import { readLearned } from './read-learned.ts';

type Asked = BodyOf<typeof takeLearnedEndpoint>;
type Taken = Asked['take'][number];

/**
 * Makes a new version of a pattern with what its last runs say. When all rejects are taken, the pieces behind
 * them are kept for the cut count; when only some are, none stand behind the rest.
 * @param worked the layout of the pattern as it is, which does not change
 * @throws {Problem} 404, 412, 422 when there is nothing to take
 */
export async function takeLearned(
  work: Work,
  asked: Asked & { id: number; ifMatch: number },
  worked: WorkedLayout,
): Promise<Learned> {
  const learned = await readLearned(work, asked.id, asked.without);
  const faults = asked.take.flatMap((taken, at) => faultsOf(taken, at, learned));
  if (faults.length > 0) throw invalid(faults);
  const before = definitionOf(await latestVersion(work, await findPattern(work, asked.id)));
  const definition = patternDefinition.parse({
    ...before,
    work: workWith(before.work, learned, asked.take),
    history: historyAfter(before, learned, asked.take),
  });
  const change = { id: asked.id, ifMatch: asked.ifMatch, change: { definition } };
  await changePattern(work, change, worked);
  return readLearned(work, asked.id, asked.without);
}

/** What the runs say of a figure; null where they say nothing. */
function foundFor({ what, step }: Taken, learned: Learned) {
  const of = step === null ? learned : learned.steps[step - 1];
  if (of === undefined) return null;
  if (what === 'rejects') return 'said' in of ? of.rejects : of.rejects.found;
  return 'said' in of ? of.time : of.minutes.found;
}

function faultsOf(taken: Taken, at: number, learned: Learned): FieldFault[] {
  const fault = (message: string) => [{ field: `take.${at}`, message }];
  if ((learned.by === 'steps') !== (taken.step !== null)) {
    return fault('This pattern is worked in another way. Open the page again.');
  }
  const found = foundFor(taken, learned);
  if (found === null) return fault('No run has logged this, so there is nothing to use.');
  if ('percent' in found && Number(found.percent) > 99) {
    return fault('Nearly every piece failed. Enter the rejects by hand, below 99 %.');
  }
  return [];
}

type WorkPlan = PatternDefinition['work'];

function workWith(work: WorkPlan, learned: Learned, take: readonly Taken[]): WorkPlan {
  const takes = (what: Taken['what'], step: number | null) =>
    take.some((each) => each.what === what && each.step === step);
  if (work.kind === 'minutesPer100') {
    const { minutes, rejects } = learned;
    return {
      ...work,
      ...(takes('minutes', null) && minutes.found ? { minutes: minutes.found.per100 } : {}),
      ...(takes('rejects', null) && rejects.found ? { rejectPercent: rejects.found.percent } : {}),
    };
  }
  const steps = work.steps.map((step, at) => {
    const { time, rejects } = learned.steps[at] ?? { time: null, rejects: null };
    const { setupMinutes, secondsPerUnit } = time ?? step;
    return {
      ...step,
      ...(takes('minutes', at + 1) ? { setupMinutes, secondsPerUnit } : {}),
      ...(takes('rejects', at + 1) && rejects ? { rejectPercent: rejects.percent } : {}),
    };
  });
  return { ...work, steps };
}

function historyAfter(
  before: PatternDefinition,
  learned: Learned,
  take: readonly Taken[],
): PatternDefinition['history'] {
  const taken = take.filter(({ what }) => what === 'rejects');
  if (taken.length === 0) return before.history;
  const all =
    learned.by === 'minutesPer100' ||
    learned.steps.every(
      ({ rejects, position }) => rejects === null || taken.some(({ step }) => step === position),
    );
  const { good, of } = learned.history;
  return all && good !== null && of !== null ? { good, total: of } : null;
}
