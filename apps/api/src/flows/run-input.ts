import {
  minorDigits,
  type Layout,
  type RunHardware,
  type RunInput,
  type WorkPlan,
} from '@hidewright/domain';
import type { PatternDefinition, QuoteBody } from '@hidewright/contract';
import { priceText } from '../http/decimal-text.ts';
import { invalid } from '../http/problem.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';

type Asked = Pick<QuoteBody, 'breaks' | 'tooling' | 'overrides'>;

/**
 * Everything that a run's numbers are worked out from, with the prices and values of today, whole: kept with the
 * quote, it can be worked out again whatever changes later.
 * @throws {Problem} 422 when rejects are set by hand for a pattern that has them at each step
 */
export async function runInputFor(
  work: Pick<Work, 'em'>,
  definition: PatternDefinition,
  layout: Layout,
  { breaks, tooling, overrides }: Asked,
): Promise<RunInput> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const leather = await work.em.findOneOrFail(Leather, definition.leatherId);
  return {
    breaks,
    confidencePercent: workshop.confidencePercent.toString(),
    layout: {
      form: layout.container.form,
      pieces: layout.pieces,
      containerAreaMm2: layout.containerAreaMm2,
    },
    leather: {
      name: leather.name,
      pricePerFt2: overrides.leatherPricePerFt2 ?? priceText(leather.pricePerFt2),
    },
    hardware: await hardwareOf(work, definition),
    tooling,
    work: workPlanOf(definition.work, overrides.rejectPercent),
    wagePerHour: workshop.wagePerHour.toString(),
    deskMinutesPerOrder: String(workshop.deskMinutesPerOrder),
    packingPerOrder: workshop.packingPerOrder.toString(),
    targetPerHour: workshop.targetPerHour.toString(),
    priceStep: workshop.priceStep.toString(),
    minorDigits: minorDigits(workshop.currency),
  };
}

async function hardwareOf(
  work: Pick<Work, 'em'>,
  definition: PatternDefinition,
): Promise<RunHardware[]> {
  const ids = definition.hardware.map(({ hardwareId }) => hardwareId);
  const kinds = new Map(
    (await work.em.find(Hardware, { id: { $in: ids } })).map((kind) => [kind.id, kind]),
  );
  return definition.hardware.flatMap(({ hardwareId, perPiece }) => {
    const kind = kinds.get(hardwareId);
    return kind === undefined
      ? []
      : [{ name: kind.name, unitPrice: priceText(kind.unitPrice), perPiece }];
  });
}

function workPlanOf(plan: WorkPlan, rejectsByHand: string | undefined): WorkPlan {
  if (rejectsByHand === undefined) return plan;
  if (plan.kind === 'minutesPer100') return { ...plan, rejectPercent: rejectsByHand };
  const message =
    'This pattern has its rejects at each step. Change them in the pattern, and leave this empty.';
  throw invalid([{ field: 'overrides.rejectPercent', message }]);
}
