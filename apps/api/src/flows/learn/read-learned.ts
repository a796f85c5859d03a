import type { Learned, PastRun as PastRunReply, PatternDefinition } from '@hidewright/contract';
import {
  poolMinutes,
  poolRejects,
  practiceFactor,
  rejectShare,
  toAtMost,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { dayIn } from '../../day-in.ts';
import { definitionFor, describeDesign } from '../../modules/designs/read-designs.ts';
import { countsPieces } from '../../modules/jobs/step-limits.ts';
import {
  definitionOf,
  findPattern,
  latestVersion,
} from '../../modules/patterns/pattern-versions.ts';
import { Workshop } from '../../modules/workshop/workshop.entity.ts';
import type { Work } from '../../work.ts';
import { learnMaterials } from './learned-materials.ts';
import { learnSteps } from './learned-steps.ts';
import { customersOf, pastRuns, type PastRun } from './past-runs.ts';

type Learning = PatternDefinition['work']['learning'];

interface Asked {
  /** The jobs to leave out, by id. */
  without?: readonly number[] | undefined;
  /** Only this customer's runs, against what their quotes go by. */
  customerId?: number | null | undefined;
}

/**
 * What the last finished runs of a pattern say its next estimate should be.
 * @throws {Problem} 404
 */
export async function readLearned(
  { em }: Pick<Work, 'em'>,
  patternId: number,
  { without = [], customerId = null }: Asked,
): Promise<Learned> {
  const pattern = await findPattern({ em }, patternId);
  const { definition, design } = await definitionFor(
    em,
    definitionOf(await latestVersion({ em }, pattern)),
    { patternId, customerId },
  );
  const { timeZone, restPercent } = await em.findOneOrFail(Workshop, 1);
  const runs = await pastRuns(em, patternId, customerId);
  const mixed = runs.filter(({ job }) => !without.includes(job.id));
  const { work } = definition;
  const steps = work.kind === 'steps' ? learnSteps(work, mixed, restPercent.toString()) : [];
  const rejects = {
    said: toAtMost(new Decimal(rejectShare(work)).times(100), 2),
    found: poolRejects(mixed.flatMap(countedRejects)),
  };
  return {
    patternId,
    patternName: pattern.name,
    versionNumber: pattern.latestVersion,
    customerId,
    customers: await customersOf(em, patternId),
    design: design === null ? null : await describeDesign(em, design),
    by: work.kind,
    runs: runs.map((run) => toReply(run, timeZone, !without.includes(run.job.id))),
    minutes: {
      said: work.kind === 'minutesPer100' ? work.minutes : null,
      found: poolMinutes(mixed.flatMap((run) => timed(run, work.learning, restPercent))),
    },
    rejects,
    steps,
    ...(await learnMaterials(em, definition, mixed)),
    history: historyOf(definition, mixed, rejects.found, steps),
    version: pattern.version,
  };
}

const countedRejects = ({ rejects, cut }: PastRun) =>
  rejects === null ? [] : [{ rejected: rejects, reached: cut }];

/** An estimate adds rest to the minutes, and practice takes from them: what is learned is without either. */
function timed({ used, cut }: PastRun, learning: Learning, restPercent: Decimal) {
  if (used.minutes === null) return [];
  const factor = restPercent.plus(100).div(100).times(practiceFactor(learning, cut).toString());
  return [{ minutes: toAtMost(used.minutes.div(factor), 4), pieces: cut }];
}

/** The pieces stand behind all rejects or behind none: a step that nobody counted would pass for faultless. */
function historyOf(
  { work }: PatternDefinition,
  runs: readonly PastRun[],
  found: Learned['rejects']['found'],
  steps: Learned['steps'],
): Learned['history'] {
  const uncounted =
    work.kind === 'steps'
      ? steps
          .filter((step) => countsPieces(step) && step.rejects === null)
          .filter(({ said }) => Number(said.rejectPercent) > 0)
          .map(({ name }) => name)
      : [];
  // A piece that goes for less is no good one, though nothing rejected it.
  const seconds = runs
    .filter(({ rejects }) => rejects !== null)
    .reduce((sum, { job }) => sum + job.seconds, 0);
  const good = found === null ? 0 : found.reached - found.rejected - seconds;
  const kept = found !== null && good > 0 && uncounted.length === 0;
  return { good: kept ? good : null, of: kept ? found.reached : null, uncounted };
}

function toReply(run: PastRun, timeZone: string, mixedIn: boolean): PastRunReply {
  const { job, cut, rejects, used } = run;
  const orNull = (value: Decimal | null, places: number) =>
    value === null ? null : toAtMost(value, places);
  const share = rejects === null ? null : new Decimal(rejects).times(100).div(cut);
  const area = used.leatherAreaMm2;
  return {
    jobId: job.id,
    number: job.number,
    customerName: run.customer.name,
    finishedOn: dayIn(timeZone, new Date(job.finishedAt ?? 0)),
    patternVersion: run.patternVersion,
    quantity: job.quantity,
    ...{ cut, rejects, mixedIn },
    good: job.good,
    seconds: job.seconds,
    minutes: orNull(used.minutes, 2),
    minutesPer100: orNull(run.minutesPer100, 1),
    rejectPercent: orNull(share, 2),
    leatherPerGoodMm2: area === null ? null : toAtMost(new Decimal(area).div(job.good), 3),
    unusual: run.unusual,
  };
}
