import {
  Exact,
  minorDigits,
  type Layout,
  type RunHardware,
  type RunInput,
  type WorkPlan,
} from '@hidewright/domain';
import type { PatternDefinition, QuoteBody } from '@hidewright/contract';
import { priceText } from '../http/decimal-text.ts';
import { invalid } from '../http/problem.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';
import { hardwareKinds, hardwareLine, optionsOf } from './run-hardware.ts';

type Asked = Pick<QuoteBody, 'breaks' | 'tooling' | 'overrides' | 'terms'>;

/**
 * Everything that a run's numbers are worked out from, with the prices and values of today, whole: kept with the
 * quote, it can be worked out again whatever changes later.
 * @throws {Problem} 422 when an option is asked for that the pattern does not have
 */
export async function runInputFor(
  work: Pick<Work, 'em'>,
  definition: PatternDefinition,
  layout: Layout,
  { breaks, tooling, overrides, terms }: Asked,
): Promise<RunInput> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const leather = await work.em.findOneOrFail(Leather, definition.leatherId);
  const kinds = await hardwareKinds(work, definition);
  return {
    breaks,
    confidencePercent: workshop.confidencePercent.toString(),
    layout: {
      form: layout.container.form,
      pieces: layout.pieces,
      containerAreaMm2: layout.containerAreaMm2,
      ...(layout.rows !== null &&
        layout.piecesPerRow !== null &&
        layout.piecesPerRow > 0 && { rowPieces: layout.piecesPerRow }),
    },
    leather: {
      name: leather.name,
      pricePerFt2: overrides.leatherPricePerFt2 ?? priceText(leather.pricePerFt2),
      whole: wholeOf(leather),
    },
    hardware: definition.hardware.flatMap((line) => hardwareLine(kinds, line)),
    supplies: (definition.supplies ?? []).map(({ name, cost = '0', per }) => ({
      name,
      unitPrice: cost,
      per,
      quantity: '1',
    })),
    tooling,
    work: workPlanOf(definition.work, overrides.rejectPercent),
    history: overrides.rejectPercent === undefined ? (definition.history ?? null) : null,
    options: askedOptions(optionsOf(definition, kinds), terms.options),
    ...valuesOf(workshop),
    ...termsOf(workshop, terms),
  };
}

/** The shop's own values of today. */
function valuesOf(workshop: Workshop) {
  return {
    restPercent: workshop.restPercent.toString(),
    wagePerHour: workshop.wagePerHour.toString(),
    minimumWagePerHour: workshop.minimumWagePerHour.toString(),
    wagesByStep: true,
    overheadPerHour: workshop.overheadPerHour.toString(),
    deskMinutesPerOrder: String(workshop.deskMinutesPerOrder),
    packingPerOrder: workshop.packingPerOrder.toString(),
    packingPerPiece: workshop.packingPerPiece.toString(),
    cardFee: {
      percent: workshop.cardFeePercent.toString(),
      each: workshop.cardFeeEach.toString(),
    },
    targetPerHour: workshop.targetPerHour.toString(),
    priceStep: workshop.priceStep.toString(),
    minorDigits: minorDigits(workshop.currency),
  };
}

/** What the quote says, or else what the shop usually asks. */
function termsOf(workshop: Workshop, terms: QuoteBody['terms']) {
  return {
    priceRule: terms.priceRule ?? workshop.priceRule,
    floorPrice: terms.floorPrice,
    setUpCharge: terms.setUpCharge ?? workshop.setUpCharge.toString(),
    minimumOrder: terms.minimumOrder ?? workshop.minimumOrder.toString(),
    rushPercent: terms.rushPercent ?? '0',
    carriage: { cost: terms.carriageCost ?? '0', charge: terms.carriageCharge ?? '0' },
    resalePrice: terms.resalePrice,
  };
}

function wholeOf({ wholeForm, wholeAreaMm2, wholeUsablePercent }: Leather) {
  if (wholeForm === null || wholeAreaMm2 === null) return null;
  return {
    form: wholeForm,
    areaMm2: wholeAreaMm2.toString(),
    usablePercent: wholeUsablePercent.toString(),
  };
}

function askedOptions(
  has: readonly { name: string; hardware: RunHardware[] }[],
  asked: QuoteBody['terms']['options'],
): RunInput['options'] {
  return asked.map(({ name, typedExtra }, at) => {
    const option = has.find((each) => each.name === name);
    if (option !== undefined) return { ...option, typedExtra };
    const message = `The pattern has no option "${name}" now. Choose from those it has.`;
    throw invalid([{ field: `terms.options.${at}.name`, message }]);
  });
}

/**
 * The work with rejects as they were set by hand. Where each step has its own, all are counted at the last one, so
 * that nothing is bought too little for the pieces that get that far.
 */
function workPlanOf(plan: WorkPlan, rejectsByHand: string | undefined): WorkPlan {
  if (rejectsByHand === undefined) return plan;
  if (plan.kind === 'minutesPer100') return { ...plan, rejectPercent: rejectsByHand };
  const last = plan.steps.length - 1;
  const rejectPercent = new Exact(rejectsByHand).toFixed();
  const steps = plan.steps.map((step, at) => ({
    ...step,
    rejectPercent: at === last ? rejectPercent : '0',
  }));
  return { ...plan, steps };
}
