import type { Learned, PatternDefinition } from '@hidewright/contract';
import { goodShare, toAtMost, type Layout } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { StoredLayout } from '../../modules/layouts/layout.entity.ts';
import { layoutHash } from '../../modules/layouts/stored-layouts.ts';
import { StockMovement } from '../../modules/stock/stock-movement.entity.ts';
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

async function saidLeather(
  em: EntityManager,
  definition: PatternDefinition,
): Promise<string | null> {
  const stored = await em.findOne(StoredLayout, { inputHash: layoutHash(definition) });
  if (stored === null || stored.pieces === 0) return null;
  const { containerAreaMm2, pieces } = stored.result as Layout;
  const each = new Decimal(containerAreaMm2).div(pieces);
  return toAtMost(each.div(goodShare(definition.work)), 3);
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
  return definition.hardware.map(({ hardwareId, perPiece }) => ({
    name: kinds.find(({ id }) => id === hardwareId)?.name ?? '',
    said: perPiece,
    found: perGood(runs, ({ job }) => takenFor(moved, job.id, hardwareId), 3),
  }));
}

function takenFor(moved: readonly StockMovement[], job: number, hardwareId: number): number | null {
  const own = moved.filter((each) => each.jobId === job && each.hardwareId === hardwareId);
  return own.length === 0 ? null : own.reduce((sum, { quantity }) => sum - quantity, 0);
}
