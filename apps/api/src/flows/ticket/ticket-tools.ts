import type { JobTool } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Job } from '../../modules/jobs/job.entity.ts';
import { Impression } from '../../modules/tools/impression.entity.ts';
import { Tool } from '../../modules/tools/tool.entity.ts';
import { usesLeft } from '../../modules/tools/tool-ledger.ts';
import { chooseTool, toolsFor } from '../choose-tools.ts';

interface Asked {
  kind: Tool['kind'];
  patternId: number;
  customerId: number;
}

/** The tool that the job was struck with, or else the one on the rack that it will be. */
export async function ticketTool(
  em: EntityManager,
  job: Job,
  asked: Asked,
): Promise<JobTool | null> {
  const used = await toolUsedBy(em, job.id, asked.kind);
  const tool = used ?? chooseTool(await toolsFor(em, asked.kind, asked), job.cutCount);
  return tool === undefined ? null : toReply(tool);
}

async function toolUsedBy(
  em: EntityManager,
  jobId: number,
  kind: Tool['kind'],
): Promise<Tool | undefined> {
  const impressions = await em.find(Impression, { jobId });
  const tools = await em.find(Tool, { id: { $in: impressions.map(({ toolId }) => toolId) }, kind });
  return tools[0];
}

function toReply(tool: Tool): JobTool {
  const { id, number, kind, name, slot } = tool;
  return { id, number, kind, name, slot, lifeLeft: usesLeft(tool) };
}
