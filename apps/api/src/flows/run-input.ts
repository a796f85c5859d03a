import { minorDigits, type Layout, type RunInput } from '@hidewright/domain';
import {
  runAsAsked,
  type PatternDefinition,
  type QuoteBody,
  type RunAsItStands,
} from '@hidewright/contract';
import { priceText } from '../http/decimal-text.ts';
import { invalid } from '../http/problem.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';
import { hardwareKinds, hardwareLine, optionsOf, type Kinds } from './run-hardware.ts';

/** One rung, so that the input is whole before anything is asked. */
const example = [{ quantity: 100, typedPrice: null }];

/** What a run is of. */
interface RunBasis {
  definition: PatternDefinition;
  layout: Layout;
  /** The hardware it names, where that is at hand already. */
  kinds?: Kinds | undefined;
}

/**
 * Everything that a quoted run's numbers are worked out from, with the prices and values of today, whole: kept with
 * the quote, it can be worked out again whatever changes later.
 * @throws {Problem} 422 when an option is asked for that the pattern does not have
 */
export async function runInputFor(
  work: Pick<Work, 'em'>,
  { definition, layout, kinds }: RunBasis,
  asked: Pick<QuoteBody, 'breaks' | 'tooling' | 'overrides' | 'terms'>,
): Promise<RunInput> {
  const stands = await runAsItStands(work, { definition, layout, kinds });
  requireOptions(stands, asked.terms.options);
  return runAsAsked(stands, asked);
}

/** A run of a pattern before anybody asks for quantities or terms of their own. */
export async function runAsItStands(
  work: Pick<Work, 'em'>,
  { definition, layout, kinds: known }: RunBasis,
): Promise<RunAsItStands> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const leather = await work.em.findOneOrFail(Leather, definition.leatherId);
  const kinds = known ?? (await hardwareKinds(work, [definition]));
  return {
    options: optionsOf(definition, kinds),
    input: {
      ...valuesOf(workshop),
      breaks: example,
      layout: layoutOf(layout),
      leather: {
        name: leather.name,
        pricePerFt2: priceText(leather.pricePerFt2),
        ...(definition.leatherExtraPercent !== undefined && {
          extraPercent: definition.leatherExtraPercent,
        }),
        whole: wholeOf(leather),
      },
      hardware: definition.hardware.flatMap((line) => hardwareLine(kinds, line)),
      supplies: (definition.supplies ?? []).map(({ name, cost = '0', per }) => ({
        name,
        unitPrice: cost,
        per,
        quantity: '1',
      })),
      tooling: [],
      work: definition.work,
      history: definition.history ?? null,
    },
  };
}

/** The shop's own values of today. */
function valuesOf(workshop: Workshop) {
  return {
    confidencePercent: workshop.confidencePercent.toString(),
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
    priceRule: workshop.priceRule,
    priceStep: workshop.priceStep.toString(),
    setUpCharge: workshop.setUpCharge.toString(),
    minimumOrder: workshop.minimumOrder.toString(),
    minorDigits: minorDigits(workshop.currency),
  };
}

function layoutOf({
  container,
  pieces,
  containerAreaMm2,
  rows,
  piecesPerRow,
  rowPieces = null,
}: Layout) {
  // Layouts that were kept before each row was counted know the longest only: certain where all are equal.
  const equal = rows !== null && piecesPerRow !== null && rows * piecesPerRow === pieces;
  const perRow = rowPieces ?? (equal ? piecesPerRow : null);
  return {
    form: container.form,
    pieces,
    containerAreaMm2,
    ...(perRow !== null && pieces > 0 && { rowPieces: perRow }),
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

function requireOptions({ options }: RunAsItStands, asked: QuoteBody['terms']['options']): void {
  const missing = asked.findIndex(({ name }) => !options.some((each) => each.name === name));
  if (missing === -1) return;
  const message = `The pattern has no option "${asked[missing]?.name}" now. Choose from those it has.`;
  throw invalid([{ field: `terms.options.${missing}.name`, message }]);
}
