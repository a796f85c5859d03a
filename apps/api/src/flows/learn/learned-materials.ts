import type { Learned, PatternDefinition } from '@hidewright/contract';
import {
  goodShare,
  poolLeather,
  poolLosses,
  toAtMost,
  unitsFor,
  upToWhole,
  type HardwarePer,
  type Layout,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { StoredLayout } from '../../modules/layouts/layout.entity.ts';
import { layoutHash } from '../../modules/layouts/stored-layouts.ts';
import { StockMovement } from '../../modules/stock/stock-movement.entity.ts';
import { handledIn } from '../../modules/jobs/step-limits.ts';
import { estimateOf } from '../job-estimate.ts';
import type { PastRun } from './past-runs.ts';

/** Leather and hardware for each good piece: as the pattern has it, and as the runs took it from stock. */
export async function learnMaterials(
  em: EntityManager,
  definition: PatternDefinition,
  runs: readonly PastRun[],
): Promise<Pick<Learned, 'leather' | 'hardware' | 'money'>> {
  return {
    leather: {
      saidMm2: await saidLeather(em, definition),
      foundMm2: perGood(runs, ({ used }) => used.leatherAreaMm2, 3),
      saidExtraPercent: definition.leatherExtraPercent ?? '0',
      extra: poolLeather(runs.flatMap(leatherOf)),
    },
    hardware: await hardwareOf(em, definition, runs),
    money: {
      leatherPerGood: perGood(runs, ({ used }) => used.leatherCost, 4),
      hardwarePerGood: perGood(runs, ({ used }) => used.hardwareCost, 4),
    },
  };
}

/** Σ of something over Σ good pieces, of the runs that logged it. */
function perGood(
  runs: readonly PastRun[],
  of: (run: PastRun) => Decimal | string | number | null,
  places: number,
): string | null {
  let [sum, good] = [new Decimal(0), 0];
  for (const run of runs) {
    const taken = of(run);
    if (taken === null) continue;
    sum = sum.plus(taken);
    good += run.job.good;
  }
  return good === 0 ? null : toAtMost(sum.div(good), places);
}

/** What was taken of it, in the measure that the pattern counts it by. */
function foundPer(
  per: HardwarePer,
  runs: readonly PastRun[],
  takenBy: (job: number) => number | null,
): string | null {
  if (per !== 'run') {
    const pieces = per === 'hundred' ? 100 : 1;
    return perGood(runs, ({ job }) => timesOf(takenBy(job.id), pieces), 3);
  }
  const taken = runs.flatMap(({ job }) => takenBy(job.id) ?? []);
  const sum = taken.reduce((all, each) => all + each, 0);
  return taken.length === 0 ? null : toAtMost(new Decimal(sum).div(taken.length), 3);
}

const timesOf = (taken: number | null, times: number): number | null =>
  taken === null ? null : taken * times;

async function saidLeather(
  em: EntityManager,
  definition: PatternDefinition,
): Promise<string | null> {
  const stored = await em.findOne(StoredLayout, { inputHash: layoutHash(definition) });
  if (stored === null || stored.pieces === 0) return null;
  const { containerAreaMm2, pieces } = stored.result as Layout;
  const each = new Decimal(containerAreaMm2).div(pieces);
  const extra = new Decimal(definition.leatherExtraPercent ?? '0').div(100).plus(1);
  return toAtMost(each.times(extra).div(goodShare(definition.work)), 3);
}

async function hardwareOf(
  em: EntityManager,
  definition: PatternDefinition,
  runs: readonly PastRun[],
): Promise<Learned['hardware']> {
  const ids = definition.hardware.map(({ hardwareId }) => hardwareId);
  const kinds = await em.find(Hardware, { id: { $in: ids } });
  const jobs = runs.map(({ job }) => job.id);
  const moved = await em.find(StockMovement, {
    jobId: { $in: jobs },
    hardwareId: { $in: ids },
  });
  return definition.hardware.map((line) => {
    const { hardwareId, perPiece, per = 'piece' } = line;
    return {
      hardwareId,
      name: kinds.find(({ id }) => id === hardwareId)?.name ?? '',
      per,
      said: perPiece,
      found: foundPer(per, runs, (job) => takenFor(moved, job, hardwareId)),
      saidLossPercent: line.lossPercent ?? '0',
      losses: poolLosses(runs.flatMap((run) => fitted(run, line, moved))),
    };
  });
}

/** What the run's layout says of the panels that it planned, and what was taken for it. */
function leatherOf({ job, used }: PastRun): { layoutAreaMm2: string; usedAreaMm2: string }[] {
  if (used.leatherAreaMm2 === null) return [];
  const { containerAreaMm2 } = estimateOf(job).input.layout;
  const layoutAreaMm2 = new Decimal(containerAreaMm2).times(job.containers).toString();
  return [{ layoutAreaMm2, usedAreaMm2: used.leatherAreaMm2 }];
}

/** What the pieces needed that came as far as this hardware, and what was taken for them. */
function fitted(
  { job, steps }: PastRun,
  line: PatternDefinition['hardware'][number],
  moved: readonly StockMovement[],
): { needed: number; taken: number }[] {
  const taken = takenFor(moved, job.id, line.hardwareId);
  if (taken === null || taken <= 0) return [];
  const step = steps[line.fromStep ?? -1];
  const pieces = Math.max(job.good + job.seconds, step === undefined ? 0 : handledIn(step));
  return [{ needed: upToWhole(unitsFor(line, pieces)).toNumber(), taken }];
}

function takenFor(moved: readonly StockMovement[], job: number, hardwareId: number): number | null {
  const own = moved.filter((each) => each.jobId === job && each.hardwareId === hardwareId);
  return own.length === 0 ? null : own.reduce((sum, { quantity }) => sum - quantity, 0);
}
