import type { BoughtDifference, JobVariances, StepDifference } from '@hidewright/contract';
import {
  benchMinutes,
  boughtVariances,
  Exact,
  mm2ToFootage,
  timeVariances,
  toAtMost,
  toPlaces,
  type BreakNumbers,
  type CostKind,
  type StepTimes,
} from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { moneyText } from '../http/decimal-text.ts';
import { findJob, requireJobState, stepsOf } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { JobStep } from '../modules/jobs/job-step.entity.ts';
import { handledIn, stepLimits } from '../modules/jobs/step-limits.ts';
import { StockMovement } from '../modules/stock/stock-movement.entity.ts';
import type { Work } from '../work.ts';
import { estimateOf, numbersOf, type JobEstimate } from './job-estimate.ts';
import { usedBy, type Used } from './used-by-job.ts';

/**
 * Why a finished job took and cost other than was said: time by step, leather and each hardware by price, usage and
 * pieces made. An hour was paid what whoever logged it is paid; where nobody said, the wage of the estimate.
 * @throws {Problem} 404, 409 while it is not finished
 */
export async function explainJob({ em }: Work, jobId: number): Promise<JobVariances> {
  const job = await findJob(em, jobId);
  requireJobState(job, 'finished');
  const steps = await stepsOf(em, jobId);
  const used = await usedBy(em, job, steps);
  const estimate = estimateOf(job);
  const numbers = numbersOf(estimate);
  const time = explainTime(job, steps, used, estimate, numbers);
  const bought = [
    ...explainLeather(job, used, estimate, numbers),
    ...(await explainHardware(em, job, estimate, numbers)),
  ];
  const sum = [...bought, ...(time.wages === null ? [] : [time.wages])].reduce(
    (total, each) => total.plus(each.sum),
    new Exact(0),
  );
  return { ...time, bought, sum: toPlaces(sum, 2) };
}

const saidCost = ({ costLines }: BreakNumbers, kind: CostKind, name?: string): string =>
  moneyText(
    costLines
      .filter((line) => line.kind === kind && (name === undefined || line.name === name))
      .reduce((sum, { amount }) => sum.plus(amount), new Exact(0)),
  );

function explainTime(
  job: Job,
  steps: readonly JobStep[],
  used: Used,
  { input }: JobEstimate,
  numbers: BreakNumbers,
): { steps: StepDifference[]; wages: { other: string; sum: string } | null } {
  const limits = stepLimits(job, steps);
  const run = {
    pieces: numbers.cutCount,
    containers: numbers.containers,
    restPercent: input.restPercent,
  };
  const said = benchMinutes(input.work, run).bySteps;
  const handled = steps.map((step, at) => handledOf(step, limits[at] ?? 0));
  const times = steps.map((step, at) =>
    timesOf(step, handled[at] ?? 0, said[at]?.minutes ?? '0', input.restPercent),
  );
  const wages =
    used.minutes === null
      ? null
      : timeVariances({
          steps: times,
          saidWagePerHour: input.wagePerHour,
          wasWagePerHour: wagePaid(used) ?? input.wagePerHour,
          saidCost: saidCost(numbers, 'wages'),
          places: 2,
        });
  return {
    steps: steps.map((step, at) => ({
      name: step.name,
      per: step.per,
      handled: handled[at] ?? 0,
      saidMinutes: toAtMost(new Exact(times[at]?.said ?? '0'), 2),
      saidForMade: toAtMost(new Exact(times[at]?.saidForMade ?? '0'), 2),
      wasMinutes: step.minutes.isZero() ? null : step.minutes.toString(),
      money: wages?.steps[at],
    })),
    wages: wages === null ? null : { other: wages.other, sum: wages.sum },
  };
}

/** What an hour was paid on average, to the ten-thousandth. */
const wagePaid = ({ wages, minutes }: Used): string | null =>
  wages === null || minutes === null ? null : toAtMost(wages.times(60).div(minutes), 4);

/** Where a step was not counted, all that could pass has passed: the job is finished. */
function handledOf(step: JobStep, limit: number): number {
  return step.per === 'run' ? 1 : handledIn(step) || limit;
}

function timesOf(
  step: JobStep,
  handled: number,
  said: string,
  restPercent: string | undefined,
): StepTimes {
  const forMade = new Exact(handled)
    .times(step.secondsPerUnit.toString())
    .div(60)
    .plus(step.setupMinutes.toString())
    .times(new Exact(restPercent ?? '0').plus(100))
    .div(100);
  return { said, saidForMade: toAtMost(forMade, 4), was: step.minutes.toString() };
}

function explainLeather(
  job: Job,
  { leatherAreaMm2, leatherCost }: Used,
  { input, leatherAreaMm2: saidArea }: JobEstimate,
  numbers: BreakNumbers,
): BoughtDifference[] {
  if (leatherAreaMm2 === null || leatherCost === null) return [];
  const said = mm2ToFootage(new Exact(saidArea));
  const parts = boughtVariances(
    {
      saidQuantity: said,
      saidForMade: said.times(job.good).div(job.quantity),
      wasQuantity: mm2ToFootage(new Exact(leatherAreaMm2)),
      saidPrice: new Exact(input.leather.pricePerFt2),
      saidCost: saidCost(numbers, 'leather'),
      wasCost: moneyText(leatherCost),
    },
    2,
  );
  return [{ kind: 'leather', name: input.leather.name, ...parts }];
}

async function explainHardware(
  em: EntityManager,
  job: Job,
  { input, hardware }: JobEstimate,
  numbers: BreakNumbers,
): Promise<BoughtDifference[]> {
  const moved = await em.find(StockMovement, { jobId: job.id, hardwareId: { $ne: null } });
  return hardware.flatMap(({ hardwareId, quantity }, at) => {
    const own = moved.filter((each) => each.hardwareId === hardwareId);
    // A quote of before there were options names no numbers; its lines stand in the same order.
    const kind =
      input.hardware.find((line) => line.hardwareId === hardwareId) ??
      (input.hardware[at]?.hardwareId === undefined ? input.hardware[at] : undefined);
    if (own.length === 0 || kind === undefined) return [];
    const parts = boughtVariances(
      {
        saidQuantity: new Exact(quantity),
        saidForMade: new Exact(quantity).times(job.good).div(job.quantity),
        wasQuantity: new Exact(own.reduce((sum, each) => sum - each.quantity, 0)),
        saidPrice: new Exact(kind.unitPrice),
        saidCost: saidCost(numbers, 'hardware', kind.name),
        wasCost: moneyText(own.reduce((sum, { value }) => sum.minus(value), new Exact(0))),
      },
      2,
    );
    return [{ kind: 'hardware' as const, name: kind.name, ...parts }];
  });
}
