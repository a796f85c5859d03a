import { advisePlate, type PlateAdvice } from '@hidewright/domain';
import type {
  MetalAdviceReply,
  QueryOf,
  readToolingAdvice,
  ToolForRun,
  ToolingAdviceReply,
} from '@hidewright/contract';
import { moneyText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';
import { Customer } from '../../modules/customers/customer.entity.ts';
import {
  definitionOf,
  findPattern,
  latestVersion,
} from '../../modules/patterns/pattern-versions.ts';
import { PlateOffer } from '../../modules/tools/plate-offer.entity.ts';
import type { Work } from '../../work.ts';
import { toolForRun, type Run } from './tool-for-run.ts';

type Asked = QueryOf<typeof readToolingAdvice>;

/**
 * The die and the plate that a run of a pattern would get, whether each lasts, and which metal a new plate should be
 * for this run and for the runs expected after it.
 * @throws {Problem} 404
 */
export async function adviseTooling(
  work: Work,
  patternId: number,
  asked: Asked,
): Promise<ToolingAdviceReply> {
  const pattern = await findPattern(work, patternId);
  const { needsDie, needsPlate } = definitionOf(await latestVersion(work, pattern));
  const run: Run = {
    pieces: asked.pieces,
    runs: asked.runs,
    runPieces: asked.runPieces ?? asked.pieces,
    patternId,
    customerId: await requireCustomer(work, asked.customerId),
  };
  const die = needsDie ? await toolForRun(work, 'cutting die', run) : null;
  const plate = needsPlate ? await toolForRun(work, 'stamp plate', run) : null;
  const metals = plate === null ? null : await metalsFor(work, run, plate);
  if (plate !== null) plate.newCost = newPlateCost(metals);
  return {
    ...{ pieces: run.pieces, runs: run.runs, runPieces: run.runPieces },
    tools: [plate, die].filter((each) => each !== null),
    metals,
  };
}

async function requireCustomer({ em }: Work, id: number | undefined): Promise<number | null> {
  if (id === undefined) return null;
  if ((await em.findOne(Customer, id)) === null) throw notFound('customer');
  return id;
}

async function metalsFor(
  { em }: Work,
  run: Run,
  plate: ToolForRun,
): Promise<NonNullable<ToolingAdviceReply['metals']>> {
  const offers = await em.find(PlateOffer, {}, { orderBy: { price: 'asc', id: 'asc' } });
  const left = plate.tool?.usesLeft ?? 0;
  const advice = advisePlate({
    now: run.pieces,
    repeats: run.runs,
    perRepeat: run.runPieces,
    left,
    offers: offers.map(({ metal, price, lifeUses }) => ({
      metal,
      price: moneyText(price),
      life: lifeUses,
    })),
  });
  return { left, impressions: run.pieces, ...repliedWith(advice, offers) };
}

function repliedWith(
  { impressionsInAll, metals, leastNow, leastInAll, turns }: PlateAdvice,
  offers: readonly PlateOffer[],
): Omit<MetalAdviceReply, 'left' | 'impressions'> {
  const rows = offers.flatMap(({ metal, price, lifeUses }, at) => {
    const advised = metals[at];
    if (advised === undefined) return [];
    return [{ ...advised, metal, price: moneyText(price), lifeUses }];
  });
  return { impressionsInAll, rows, leastNow, leastInAll, turns };
}

/** Of one plate: of the metal that the run asks for, or else of the one with the lowest price. */
function newPlateCost(metals: MetalAdviceReply | null): string | null {
  const wanted = metals?.leastNow?.metal ?? metals?.rows[0]?.metal;
  return metals?.rows.find(({ metal }) => metal === wanted)?.price ?? null;
}
