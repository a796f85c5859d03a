import type { CheckAnswer } from '@hidewright/contract';
import { checkRuns, weightsCut, type RunFacts, type ShopStock } from '@hidewright/domain';
import type { Work } from '../../work.ts';
import { misfitsThrough, readSetLines } from '../set-hardware.ts';
import type { Tool } from '../../modules/tools/tool.entity.ts';
import { finishedOf, finishedWords } from './finished-for-check.ts';
import { freeLotRows } from './leather-for-check.ts';
import { loadShopStock } from './load-shop-stock.ts';
import { needsOf, toolsOf, toToolStock } from './needs-of-runs.ts';
import type { OwedToJobs } from './owed-to-jobs.ts';
import { pressForCheck } from './press-for-check.ts';
import { diesNeeded } from './setting-dies.ts';
import type { PlannedRun } from './runs-asked.ts';

export interface CheckedRun {
  planned: PlannedRun;
  facts: RunFacts;
  press: CheckAnswer | null;
  /** What of its hardware does not fit the leather that it is cut from, folded; in sentences. */
  misfits: string[];
  /** What lies finished already, in words. */
  finished: string[];
}

export interface CheckedRuns {
  shop: ShopStock;
  owed: OwedToJobs;
  runs: CheckedRun[];
}

/** Planned runs against all that the shop has and expects, each given what those before it leave. */
export async function checkPlanned(
  work: Work,
  planned: readonly PlannedRun[],
): Promise<CheckedRuns> {
  const { em } = work;
  const leatherIds = [...new Set(planned.map(({ plan }) => plan.leatherId))];
  const hardware = planned.flatMap(({ plan }) => plan.hardware);
  const hardwareIds = [...new Set(hardware.map(({ hardwareId }) => hardwareId))];
  const rows = await freeLotRows(em, leatherIds);
  const { stock, owed } = await loadShopStock(work, { leatherIds, hardwareIds }, rows);
  const tools = await inTurn(planned, (run) => toolsOf(em, run));
  const setLines = await readSetLines(em, planned);
  const needs = await inTurn(planned, (run, at) =>
    needsOf(em, run, {
      rows,
      tools: [...(tools[at]?.needs ?? []), ...diesNeeded(setLines[at] ?? [])],
    }),
  );
  const shop = { ...stock, tools: once(tools.flatMap((each) => each.tools)).map(toToolStock) };
  const facts = checkRuns(shop, needs);
  const there = await finishedOf(em, planned);
  const runs = await inTurn(planned, async (run, at) => {
    const found = facts[at] as RunFacts;
    return {
      planned: run,
      facts: found,
      press: await pressForCheck(em, run, tools[at]?.tools ?? []),
      misfits: misfitsThrough(setLines[at] ?? [], weightsCut(found.leather)),
      finished: finishedWords(there, run),
    };
  });
  return { shop, owed, runs };
}

const once = (tools: readonly Tool[]): Tool[] => [
  ...new Map(tools.map((tool) => [tool.id, tool])).values(),
];

/** One after another: they share a connection. */
async function inTurn<Item, Made>(
  items: readonly Item[],
  make: (item: Item, at: number) => Promise<Made>,
): Promise<Made[]> {
  const made: Made[] = [];
  for (const [at, item] of items.entries()) made.push(await make(item, at));
  return made;
}
