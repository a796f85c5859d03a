import type { FilterQuery } from '@mikro-orm/core';
import type { ImpressionReply, ToolReply } from '@hidewright/contract';
import { moneyText } from '../../http/decimal-text.ts';
import type { Work } from '../../work.ts';
import { Customer } from '../customers/customer.entity.ts';
import { Job } from '../jobs/job.entity.ts';
import { Pattern } from '../patterns/pattern.entity.ts';
import { Impression } from './impression.entity.ts';
import { isTermOver } from './tool-term.ts';
import { usesLeft } from './tool-ledger.ts';
import { Tool } from './tool.entity.ts';

interface Wanted {
  below: number | undefined;
  q: string | undefined;
  kind: Tool['kind'] | undefined;
  state: Tool['state'] | undefined;
  patternId: number | undefined;
  limit: number;
}

/** One row more than a page, so that `toPage` sees whether there is another. */
export async function listTools({ em }: Work, wanted: Wanted): Promise<Tool[]> {
  const { below, q, kind, state, patternId, limit } = wanted;
  const where: FilterQuery<Tool> = {
    ...(below === undefined ? {} : { id: { $lt: below } }),
    ...(kind === undefined ? {} : { kind }),
    ...(state === undefined ? {} : { state }),
    ...(patternId === undefined ? {} : { patternId }),
    ...(q === undefined
      ? {}
      : { $or: [{ name: { $like: `%${q}%` } }, { number: q }, { slot: q }] }),
  };
  return em.find(Tool, where, { orderBy: { id: 'desc' }, limit: limit + 1 });
}

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

/** What a tool did, newest first, one row more than a page. */
export async function listImpressions(
  { em }: Work,
  wanted: { toolId: number; below: number | undefined; limit: number },
): Promise<Impression[]> {
  const where = {
    toolId: wanted.toolId,
    ...(wanted.below === undefined ? {} : { id: { $lt: wanted.below } }),
  };
  return em.find(Impression, where, { orderBy: { id: 'desc' }, limit: wanted.limit + 1 });
}

export async function describeImpressions(
  { em }: Work,
  rows: Impression[],
): Promise<ImpressionReply[]> {
  const jobs = await em.find(Job, { id: { $in: idsOf(rows.map((row) => row.jobId)) } });
  return rows.map(({ id, uses, jobId, at, reason, actorName }) => {
    const jobNumber = jobs.find((job) => job.id === jobId)?.number ?? null;
    return { id, uses, jobId, jobNumber, at, reason, actorName };
  });
}

const idsOf = (ids: (number | null)[]): number[] => [...new Set(ids.filter((id) => id !== null))];
