import type { BoughtDifference, JobVariances, StepDifference } from '@hidewright/contract';
import {
  benchMinutes,
  boughtVariances,
  Exact,
  mm2ToFootage,
  ticketSteps,
  timeVariances,
  toAtMost,
  toPlaces,
  type BreakNumbers,
  type CostKind,
  type StepMinutes,
  type StepTimes,
  type WorkStep,
} from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { moneyText } from '../http/decimal-text.ts';
import { findWantedJob, requireJobState, stepsOf } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { JobStep } from '../modules/jobs/job-step.entity.ts';
import { handledAtEnd, stepLimits } from '../modules/jobs/step-limits.ts';
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
  const job = await findWantedJob(em, jobId);
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
  const planned = ticketSteps(input.work);
  const handled = steps.map((step, at) => handledAtEnd(step, limits[at] ?? 0));
  const times = steps.map((step, at) => ({
    ...timesOf(planned[at], said[at], handled[at] ?? 0, input.restPercent),
    was: step.minutes.toString(),
  }));
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

/** Of the minutes that were said, all but the setting up goes with what was handled. */
function timesOf(
  step: WorkStep | undefined,
  said: StepMinutes | undefined,
  handled: number,
  restPercent: string | undefined,
): Pick<StepTimes, 'said' | 'saidForMade'> {
  if (step === undefined || said === undefined) return { said: '0', saidForMade: '0' };
  const setup = new Exact(step.setupMinutes)
    .times(step.people ?? 1)
    .times(new Exact(restPercent ?? '0').plus(100))
    .div(100);
  const share = new Exact(said.units).isZero() ? 1 : new Exact(handled).div(said.units);
  const forMade = new Exact(said.minutes).minus(setup).times(share).plus(setup);
  return { said: said.minutes, saidForMade: toAtMost(forMade, 4) };
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
  const share = new Exact(job.good).div(job.quantity);
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
        saidForMade: new Exact(quantity).times(kind.per === 'run' ? 1 : share),
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
