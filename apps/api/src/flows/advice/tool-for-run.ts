import type { ToolForRun } from '@hidewright/contract';
import { describeTool } from '../../modules/tools/describe-tool.ts';
import type { Tool } from '../../modules/tools/tool.entity.ts';
import { usesLeft } from '../../modules/tools/tool-ledger.ts';
import { moneyText } from '../../http/decimal-text.ts';
import type { Work } from '../../work.ts';
import { chooseTool, strikesFor, toolsFor } from '../choose-tools.ts';
import { toolSentence } from './tool-sentence.ts';

export interface Run {
  /** To cut, rejects included. */
  pieces: number;
  /** Expected after this one, and the pieces of each. */
  runs: number;
  runPieces: number;
  patternId: number;
  customerId: number | null;
}

/** The tool of a kind that a job of this run would get now, and whether it lasts. */
export async function toolForRun(work: Work, kind: Tool['kind'], run: Run): Promise<ToolForRun> {
  const tools = await toolsFor(work.em, kind, run);
  const tool = chooseTool(tools, run.pieces);
  const onOrder = tools.find(({ state }) => state === 'on order')?.number ?? null;
  const wear = wearOf(run, tool);
  const described = tool === undefined ? null : await describeTool(work, tool);
  const found = { kind, ...wear, tool: described, onOrder };
  return {
    ...found,
    newCost: dearestOf(tools),
    sentence: toolSentence(found, run),
  };
}

function wearOf(
  { pieces, runs, runPieces }: Run,
  tool: Tool | undefined,
): Pick<ToolForRun, 'strikes' | 'strikesInAll' | 'enough' | 'enoughInAll' | 'replacedAfter'> {
  const cutting = tool ?? { piecesPerStrike: 1 };
  const strikes = strikesFor(cutting, pieces);
  const strikesInAll = strikes + runs * strikesFor(cutting, runPieces);
  const left = tool === undefined ? 0 : usesLeft(tool);
  return {
    strikes,
    strikesInAll,
    enough: left >= strikes,
    enoughInAll: left >= strikesInAll,
    replacedAfter: left > 0 && left < strikes ? left : null,
  };
}

/** Of those that served this pattern, what the dearest cost: a new one will hardly cost less. */
function dearestOf(tools: readonly Tool[]): string | null {
  const [dearest] = tools.map(({ cost }) => cost).sort((a, b) => b.cmp(a));
  return dearest === undefined ? null : moneyText(dearest);
}
