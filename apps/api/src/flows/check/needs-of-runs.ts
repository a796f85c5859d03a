import type { RunNeeds, ToolNeed, ToolStock } from '@hidewright/domain';
import { layoutInputKey, type SideInput } from '@hidewright/domain';
import { layRulesOf, type LotDrawing, type PatternDefinition } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import { piecesBySideInput } from '../../modules/layouts/stored-layouts.ts';
import { readLastTime } from '../../modules/lots/last-time.ts';
import { usesLeft } from '../../modules/tools/tool-ledger.ts';
import type { Tool } from '../../modules/tools/tool.entity.ts';
import { toolsFor } from '../choose-tools.ts';
import { pressReach, type PressReach } from '../press-reach.ts';
import type { LotRow } from './leather-for-check.ts';
import type { PlannedRun } from './runs-asked.ts';

export interface NeededTools {
  needs: ToolNeed[];
  tools: Tool[];
}

/** What a planned run asks of the shop. */
export async function needsOf(
  em: EntityManager,
  run: PlannedRun,
  { rows, tools }: { rows: readonly LotRow[]; tools: readonly ToolNeed[] },
): Promise<RunNeeds> {
  const { plan, by, definition, sides } = run;
  const { pieces, containerAreaMm2 } = plan.input.layout;
  return {
    by,
    pieces: plan.cutCount,
    leather: {
      leatherId: plan.leatherId,
      cut: { pieces, areaMm2: containerAreaMm2, sides },
      laid: await laidOn(
        em,
        definition,
        rows.filter((row) => row.leather_id === plan.leatherId),
      ),
      likeShade: await earlierShade(em, run),
    },
    hardware: plan.hardware,
    tools,
    minutes: scaled(plan.plannedMinutes, 2),
    parts: plan.parts,
  };
}

/** The die and the plate that a run needs; a plate carries a customer's design, so without one none can be named. */
export async function toolsOf(
  em: EntityManager,
  { plan: { needsDie, needsPlate, patternId }, customerId }: PlannedRun,
): Promise<NeededTools> {
  const kinds: Tool['kind'][] = [
    ...(needsPlate && customerId !== null ? (['stamp plate'] as const) : []),
    ...(needsDie ? (['cutting die'] as const) : []),
  ];
  const needed: NeededTools = { needs: [], tools: [] };
  for (const kind of kinds) {
    const tools = await toolsFor(em, kind, { patternId, customerId });
    needed.tools.push(...tools);
    needed.needs.push({
      word: wordFor(kind),
      choices: tools.filter(({ state }) => state === 'on the rack').map(({ id }) => id),
      otherwise: bringIn(kind, tools),
    });
  }
  return needed;
}

const wordFor = (kind: Tool['kind']): string =>
  kind === 'cutting die' ? 'Cutting die' : 'Stamp plate';

export const toToolStock = (tool: Tool): ToolStock => ({
  toolId: tool.id,
  name: `${wordFor(tool.kind)} ${tool.number}`,
  strikesLeft: usesLeft(tool),
  piecesPerStrike: tool.piecesPerStrike,
});

function bringIn(kind: Tool['kind'], tools: readonly Tool[]): string {
  const ordered = tools.find(({ state }) => state === 'on order');
  if (ordered === undefined) return `Order a ${kind}, or add the one you have in the Pattern room.`;
  return `Number ${ordered.number} is on order: take the run on awaiting tooling, and note when it is here.`;
}

/**
 * Pieces that the kept layouts of a pattern give on lots as they are drawn. Where no press takes a side whole, a
 * layout in strips counts before the others; otherwise whichever gives most.
 */
async function laidOn(
  em: EntityManager,
  definition: PatternDefinition,
  rows: readonly LotRow[],
): Promise<Map<number, number>> {
  const drawn = rows.filter(({ outline }) => outline !== null);
  if (drawn.length === 0 || definition.outline === null) return new Map();
  const reach = await pressReach(em);
  const asked = drawn.map((row) => ({ row, ways: waysOn(row, definition, reach) }));
  const pieces = await piecesBySideInput(
    em,
    asked.flatMap(({ ways }) => ways.flat().map(layoutInputKey)),
  );
  const known = asked.flatMap(({ row, ways }) => {
    const best = ways
      .map((inputs) => inputs.flatMap((input) => pieces.get(layoutInputKey(input)) ?? []))
      .find((found) => found.length > 0);
    return best === undefined ? [] : [[row.id, Math.max(...best)] as const];
  });
  return new Map(known);
}

/** The layouts that may be kept of a lot, those first that count first. */
function waysOn(
  { outline, flaws }: LotRow,
  definition: PatternDefinition,
  { takesWhole, widestStripMm }: PressReach,
): SideInput[][] {
  if (definition.outline === null || outline === null) return [];
  const side = {
    outline: JSON.parse(outline) as NonNullable<LotDrawing['outline']>,
    flaws: JSON.parse(flaws) as LotDrawing['flaws'],
  };
  const input: SideInput = { ...layRulesOf(definition, definition.outline), side };
  const whole: SideInput[] = [
    { ...input, search: 'rows' },
    { ...input, search: 'best' },
  ];
  const strips = [{ ...input, widestMm: widestStripMm }];
  return takesWhole(side) ? [[...whole, ...strips]] : [strips, whole];
}

/** The shade of the leather that this customer's last run of the pattern is cut from, where it was noted. */
async function earlierShade(
  em: EntityManager,
  { customerId, quoteId, plan }: PlannedRun,
): Promise<string | null> {
  if (customerId === null) return null;
  const pattern = { id: plan.patternId };
  const last = await readLastTime(em, { customerId, pattern, before: { quoteId } });
  return last?.lots.find(({ shade }) => shade !== '')?.shade ?? null;
}
