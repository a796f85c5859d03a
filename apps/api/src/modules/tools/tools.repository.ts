import type { FilterQuery } from '@mikro-orm/core';
import type { ImpressionReply } from '@hidewright/contract';
import type { Work } from '../../work.ts';
import { Job } from '../jobs/job.entity.ts';
import { Impression } from './impression.entity.ts';
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
