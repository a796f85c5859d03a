import type { PatternDefinition } from '@hidewright/contract';
import {
  benchMinutes,
  hardwareOrdered,
  runNeeds,
  ticketSteps,
  toAtMost,
  waitAfter,
  type RunInput,
  type WorkPart,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { summed, throughKits } from '../modules/hardware/kits.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import { definitionOf } from '../modules/patterns/pattern-versions.ts';
import { numbersOfQuote, rungsOf } from '../modules/quotes/quote-numbers.ts';
import type { Quote } from '../modules/quotes/quote.entity.ts';

/** A step as the job will have it. */
interface PlannedStep {
  name: string;
  per: 'piece' | 'strike' | 'panel' | 'strip' | 'run';
  setupMinutes: Decimal;
  secondsPerUnit: Decimal;
  rejectPercent: Decimal;
  plannedMinutes: Decimal;
}

/** What a run of so many needs, by the numbers that its quote was priced with. */
export interface RunPlan {
  quantity: number;
  cutCount: number;
  containers: number;
  patternId: number;
  leatherId: number;
  leatherAreaMm2: string;
  /** With what of it the pieces ordered take where nothing is lost. */
  hardware: { hardwareId: number; quantity: number; ordered: number }[];
  steps: PlannedStep[];
  plannedMinutes: Decimal;
  /** The same minutes with the waits between them, in hundredths of a minute. */
  parts: WorkPart[];
  needsDie: boolean;
  needsPlate: boolean;
  /** The run as it was priced, with this one quantity. */
  input: RunInput;
}

/**
 * Works a quote's run out again for one quantity, from the snapshot that the quote kept.
 * @throws {InvalidInput | NotWorkable} when the quantity cannot be made
 */
export async function planRun(
  em: EntityManager,
  quote: Quote,
  quantity: number,
  option: string | null,
): Promise<RunPlan> {
  const version = await em.findOneOrFail(PatternVersion, quote.patternVersionId);
  const { patternId } = version;
  const input = forOne(quote, quantity, option);
  const definition = definitionOf(version);
  const plan = planOf(input, { definition, patternId, quantity, option: null });
  // What a quote of before counts as one thing can be a kit by now.
  return { ...plan, hardware: await throughKits(em, plan.hardware) };
}

interface Planned {
  definition: Pick<PatternDefinition, 'leatherId' | 'hardware' | 'needsDie' | 'needsPlate'>;
  patternId: number;
  quantity: number;
  option: string | null;
}

/** The plan of a run with one quantity, with or without a quote. */
export function planOf(
  asked: RunInput,
  { definition, patternId, quantity, option }: Planned,
): RunPlan {
  const input = withOption(asked, option);
  const { leatherId, hardware, needsDie, needsPlate } = definition;
  const run = runNeeds(input, quantity);
  const { cutCount, containers, leatherAreaMm2 } = run;
  const ordered = hardwareOrdered(input, quantity);
  const steps = planSteps(input, { pieces: cutCount, containers });
  return {
    ...{ quantity, cutCount, containers, leatherAreaMm2, leatherId, needsDie, needsPlate },
    ...{ steps, input, patternId },
    hardware: summed(
      input.hardware.map((line, at) => ({
        // Quotes of before there were options have the pattern's hardware, line by line.
        hardwareId: line.hardwareId ?? (hardware[at]?.hardwareId as number),
        quantity: run.hardwareCounts[at] ?? 0,
        ordered: ordered[at] ?? 0,
      })),
    ),
    plannedMinutes: steps.reduce((sum, step) => sum.plus(step.plannedMinutes), new Decimal(0)),
    parts: ticketSteps(input.work).map((step, at) => ({
      minutes: steps[at]?.plannedMinutes.times(100).toNumber() ?? 0,
      waitAfter: waitAfter(step),
    })),
  };
}

function withOption(input: RunInput, name: string | null): RunInput {
  const option = input.options?.find((each) => each.name === name);
  return { ...input, hardware: option?.hardware ?? input.hardware, options: [] };
}

/** At the price that was offered: alone, a rung could be suggested another than beside smaller and larger ones. */
function forOne(quote: Quote, quantity: number, optionName: string | null): RunInput {
  const numbers = numbersOfQuote(quote);
  const input = quote.input as RunInput;
  const breaks = rungsOf(numbers, optionName);
  const typedPrice = breaks.find((each) => each.quantity === quantity)?.priceEach ?? null;
  return { ...withOption(input, optionName), breaks: [{ quantity, typedPrice }] };
}

/** Each step with its minutes, to the hundredth of a minute that a job keeps. */
function planSteps(
  { work: plan, restPercent }: RunInput,
  run: { pieces: number; containers: number },
): PlannedStep[] {
  const { bySteps } = benchMinutes(plan, { ...run, restPercent });
  return ticketSteps(plan).map((step, at) => ({
    name: step.name,
    per: step.per,
    setupMinutes: hundredths(step.setupMinutes),
    secondsPerUnit: hundredths(step.secondsPerUnit),
    rejectPercent: new Decimal(step.rejectPercent),
    plannedMinutes: hundredths(bySteps[at]?.minutes ?? '0'),
  }));
}

const hundredths = (exact: string): Decimal => new Decimal(toAtMost(new Decimal(exact), 2));
