import type { ToolReply } from '@hidewright/contract';
import { moneyText } from '../../http/decimal-text.ts';
import type { Work } from '../../work.ts';
import { Customer } from '../customers/customer.entity.ts';
import { Pattern } from '../patterns/pattern.entity.ts';
import { usesLeft } from './tool-ledger.ts';
import { isTermOver } from './tool-term.ts';
import type { Tool } from './tool.entity.ts';

/** Tools with the names of what they belong to. */
export async function describeTools({ em, today }: Work, tools: Tool[]): Promise<ToolReply[]> {
  const patterns = await em.find(Pattern, {
    id: { $in: idsOf(tools.map((tool) => tool.patternId)) },
  });
  const customers = await em.find(Customer, {
    id: { $in: idsOf(tools.map((tool) => tool.customerId)) },
  });
  return tools.map((tool) => ({
    id: tool.id,
    number: tool.number,
    kind: tool.kind,
    name: tool.name,
    metal: tool.metal,
    cost: moneyText(tool.cost),
    lifeUses: tool.lifeUses,
    used: tool.used,
    usesLeft: usesLeft(tool),
    slot: tool.slot,
    patternId: tool.patternId,
    patternName: patterns.find(({ id }) => id === tool.patternId)?.name ?? null,
    customerId: tool.customerId,
    customerName: customers.find(({ id }) => id === tool.customerId)?.name ?? null,
    ownedBy: tool.ownedBy,
    keptUntil: tool.keptUntil,
    termOver: isTermOver(tool, today),
    state: tool.state,
    piecesPerStrike: tool.piecesPerStrike,
    ruleThicknessMm: tool.ruleThicknessMm?.toString() ?? null,
    borderMm: tool.borderMm?.toString() ?? null,
    reliefAreaMm2: tool.reliefAreaMm2?.toString() ?? null,
    version: tool.version,
  }));
}

export async function describeTool(work: Work, tool: Tool): Promise<ToolReply> {
  const [described] = await describeTools(work, [tool]);
  return described as ToolReply;
}

const idsOf = (ids: (number | null)[]): number[] => [...new Set(ids.filter((id) => id !== null))];
