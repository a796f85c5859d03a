import type { EntityManager } from '@mikro-orm/sqlite';
import type { Tool } from '../../modules/tools/tool.entity.ts';
import { usesLeft } from '../../modules/tools/tool-ledger.ts';
import { chooseTool, strikesFor, toolsFor } from '../choose-tools.ts';

interface Asked {
  patternId: number;
  customerId: number;
  /** Pieces to cut. */
  pieces: number;
  needsDie: boolean;
  needsPlate: boolean;
}

export interface NeededTool {
  name: string;
  inShop: boolean;
  strikesNeeded: number;
  strikesLeft: number;
  /** What to do where it is not here, or has not life enough. */
  remedy: string;
}

/** The die and the plate that a run needs: on the rack, with life left. */
export async function toolingForCheck(em: EntityManager, asked: Asked): Promise<NeededTool[]> {
  const kinds = [
    asked.needsPlate ? 'stamp plate' : null,
    asked.needsDie ? 'cutting die' : null,
  ] as const;
  const needed: NeededTool[] = [];
  for (const kind of kinds) {
    if (kind !== null)
      needed.push(toolForCheck(kind, await toolsFor(em, kind, asked), asked.pieces));
  }
  return needed;
}

function toolForCheck(kind: Tool['kind'], tools: readonly Tool[], pieces: number): NeededTool {
  const tool = chooseTool(tools, pieces);
  const word = kind === 'cutting die' ? 'Cutting die' : 'Stamp plate';
  return {
    name: tool === undefined ? word : `${word} ${tool.number}`,
    inShop: tool !== undefined,
    strikesNeeded: tool === undefined ? pieces : strikesFor(tool, pieces),
    strikesLeft: tool === undefined ? 0 : usesLeft(tool),
    remedy: tool === undefined ? bringIn(kind, tools) : '',
  };
}

function bringIn(kind: Tool['kind'], tools: readonly Tool[]): string {
  const ordered = tools.find(({ state }) => state === 'on order');
  if (ordered === undefined) return `Order a ${kind}, or add the one you have in the Pattern room.`;
  return `Number ${ordered.number} is on order: take the run on awaiting tooling, and note when it is here.`;
}
