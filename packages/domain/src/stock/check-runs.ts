import { earliestDay, freeUntil, latestStart } from '../promise/bench-plan.ts';
import type { Day } from '../promise/day.ts';
import { doneOn } from '../promise/elapsed-days.ts';
import type { HeldWork } from '../promise/held-work.ts';
import { InvalidInput } from '../errors/domain-error.ts';
import { drawItem, type ItemFacts } from './check-items.ts';
import { drawLeather, type LeatherFacts } from './check-leather.ts';
import type { ItemStock, LeatherStock, RunNeeds, ShopStock } from './check-stock.ts';
import { withStandIns } from './check-stand-ins.ts';
import { drawTool, type ToolFacts } from './check-tools.ts';

export interface HoursFacts {
  by: Day;
  /** hundredths of a minute */
  needed: number;
  free: number;
  ok: boolean;
  /** the first day by which the bench has the hours, whatever is short otherwise */
  earliest: Day | null;
  /** the first day on which it could be done with if the bench had nothing else: more than hours, where pieces lie */
  soonest: Day | null;
  /** whether pieces must lie between its steps */
  waits: boolean;
}

export interface RunFacts {
  ok: boolean;
  /** its turn among all runs, from 1: by the day, then as chosen */
  turn: number;
  /** when leather and hardware must be there */
  startBy: Day;
  leather: LeatherFacts;
  items: ItemFacts[];
  tools: ToolFacts[];
  hours: HoursFacts;
  /** the first day by which it can be packed when what is short is bought; tooling aside; null where nobody can tell */
  earliest: Day | null;
}

/**
 * Can we make them? Each run in its turn, by its day and then as chosen, is given what the runs before it left:
 * leather from the lots, hardware and supplies free by then, strikes of the tools, hours of the bench. A run that
 * falls short takes what there is, for that is bought and made first.
 * @returns in the order in which the runs were given
 */
export function checkRuns(shop: ShopStock, runs: readonly RunNeeds[]): RunFacts[] {
  const turns = runs
    .map((run, at) => ({ run, at }))
    .sort((a, b) => byDay(a.run, b.run) || a.at - b.at);
  const facts: RunFacts[] = [];
  let left = shop;
  for (const [turn, { run, at }] of turns.entries()) {
    const checked = checkOne(left, run, turn + 1);
    facts[at] = checked.facts;
    left = checked.left;
  }
  return withStandIns(facts, left.items);
}

const byDay = (a: RunNeeds, b: RunNeeds): number => (a.by < b.by ? -1 : a.by > b.by ? 1 : 0);

function checkOne(
  shop: ShopStock,
  run: RunNeeds,
  turn: number,
): { facts: RunFacts; left: ShopStock } {
  const { today } = shop;
  const start = latestStart(shop.bench, shop.held, run);
  const hours = hoursOf(shop, run, start !== null);
  // Where the hours are short anyhow, what comes by the day itself is no further reason.
  const startBy = start ?? run.by;
  const when = { day: startBy, today };
  const { facts: leather, left: leatherLeft } = drawLeather(leatherOf(shop, run), run.leather, {
    ...when,
    pieces: run.pieces,
  });
  const { items, itemsLeft } = drawItems(shop, run, when);
  const { tools, toolsLeft } = drawTools(shop, run);
  const earliest = earliestOf(shop, run, [leather.standing, ...items]);
  const ok =
    hours.ok &&
    [leather.standing, ...items].every(({ short }) => short === 0) &&
    tools.every((tool) => tool.ok);
  const held: HeldWork = {
    jobId: -turn,
    promisedOn: earliest !== null && earliest > run.by ? earliest : run.by,
    remaining: run.minutes,
    parts: run.parts,
  };
  return {
    facts: { ok, turn, startBy, leather, items, tools, hours, earliest },
    left: {
      ...shop,
      held: [...shop.held, held],
      leathers: shop.leathers.map((each) =>
        each.leatherId === leatherLeft.leatherId ? leatherLeft : each,
      ),
      items: itemsLeft,
      tools: toolsLeft,
    },
  };
}

function leatherOf({ leathers }: ShopStock, { leather }: RunNeeds): LeatherStock {
  const found = leathers.find(({ leatherId }) => leatherId === leather.leatherId);
  if (found === undefined) throw new InvalidInput('leather', 'Choose a leather that is there.');
  return found;
}

function drawItems(shop: ShopStock, run: RunNeeds, when: { day: Day; today: Day }) {
  let itemsLeft: readonly ItemStock[] = shop.items;
  const items = run.hardware.map((need) => {
    const item = itemsLeft.find(({ hardwareId }) => hardwareId === need.hardwareId);
    if (item === undefined) throw new InvalidInput('hardware', 'Choose hardware that is there.');
    const { facts, left } = drawItem(item, need, when);
    itemsLeft = itemsLeft.map((each) => (each === item ? left : each));
    return facts;
  });
  return { items, itemsLeft };
}

function drawTools(shop: ShopStock, run: RunNeeds) {
  let toolsLeft = shop.tools;
  const tools = run.tools.map((need) => {
    const { facts, left } = drawTool(toolsLeft, need, run.pieces);
    toolsLeft = left;
    return facts;
  });
  return { tools, toolsLeft };
}

function hoursOf({ bench, held }: ShopStock, run: RunNeeds, ok: boolean): HoursFacts {
  const { by, minutes, parts } = run;
  return {
    by,
    needed: minutes,
    free: freeUntil(bench, held, by),
    ok,
    earliest: earliestDay(bench, held, minutes, { parts }),
    soonest: doneOn(bench, parts, bench.today),
    waits: parts.some(({ waitAfter }) => waitAfter > 0),
  };
}

function earliestOf(
  { bench, held, today }: ShopStock,
  { minutes, parts }: RunNeeds,
  needs: readonly { enoughOn: Day | null }[],
): Day | null {
  let from = today;
  for (const { enoughOn } of needs) {
    if (enoughOn === null) return null;
    if (enoughOn > from) from = enoughOn;
  }
  return earliestDay(bench, held, minutes, { from, parts });
}
