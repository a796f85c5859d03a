import type { AskedRun, RunsCheck } from '@hidewright/contract';
import type { Work } from '../work.ts';
import { checkPlanned, type CheckedRuns } from './check/checked-runs.ts';
import { runReply, sayFor } from './check/run-reply.ts';
import { planAskedRuns } from './check/runs-asked.ts';
import { shortOf } from './check/short-for-runs.ts';
import type { LaidPattern } from './lay-pattern.ts';

/**
 * Can we make them? Several runs at once; nothing is held by asking.
 * @throws {Problem} 422 naming the run and what is wrong with it
 */
export async function checkAskedRuns(
  work: Work,
  asked: readonly AskedRun[],
  laid: readonly (LaidPattern | null)[],
): Promise<RunsCheck> {
  const checked = await checkPlanned(work, await planAskedRuns(work, asked, laid));
  const say = await sayFor(work.em);
  const runs = checked.runs.map((run) => ({
    ...runReply(run, say),
    quoteId: run.planned.quoteId,
    name: run.planned.name,
    option: run.planned.option,
    turn: run.facts.turn,
  }));
  return {
    runs,
    yes: runs.every(({ yes }) => yes),
    short: await shortOf(work, checked),
    earliestDay: latest(checked),
  };
}

/** All of them are packed when the last one is; null where nobody can tell of one. */
function latest({ runs }: CheckedRuns): string | null {
  const days = runs.map(({ facts }) => facts.earliest);
  const known = days.filter((day) => day !== null);
  return known.length < days.length ? null : (known.sort().at(-1) ?? null);
}
