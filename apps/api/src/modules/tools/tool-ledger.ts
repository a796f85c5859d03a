import { invalid, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { findTool } from './find-tool.ts';
import { Impression } from './impression.entity.ts';
import type { Tool } from './tool.entity.ts';

export interface Uses {
  toolId: number;
  /** Cuts or impressions; below zero takes back what was counted too often. */
  uses: number;
  jobId: number | null;
  reason?: string;
}

/**
 * The one place that writes what a cutting die or stamp plate did: a row in its ledger, and the sum beside it, in
 * the same transaction. Who calls it logs the deed that it belongs to.
 * @throws {Problem} 404, 409 when the tool is not on the rack, 422 when more is taken back than was counted
 */
export async function addImpressions(
  work: Work,
  { toolId, uses, jobId, reason = '' }: Uses,
): Promise<Tool> {
  const tool = await findTool(work, toolId);
  requireOnRack(tool);
  const used = tool.used + uses;
  if (uses === 0 || used < 0) throw invalid([{ field: 'uses', message: sentenceFor(tool, uses) }]);
  work.em.create(Impression, {
    toolId,
    uses,
    jobId,
    reason,
    at: work.now.toISOString(),
    actorId: work.actor.id,
    actorName: work.actor.name,
  });
  await work.em.flush();
  // Not through the entity: counting at the bench must not make the owner's open edit stale.
  await work.em.execute('UPDATE tool SET used = ? WHERE id = ?', [used, toolId]);
  await work.em.refresh(tool);
  return tool;
}

/** Cuts or impressions that are still expected of it; none once it has outlived that. */
export function usesLeft(tool: Pick<Tool, 'lifeUses' | 'used'>): number {
  return Math.max(0, tool.lifeUses - tool.used);
}

function requireOnRack(tool: Tool): void {
  if (tool.state === 'on the rack') return;
  const first = tool.state === 'on order' ? 'Put it on the rack first.' : 'Choose another one.';
  const allowed = tool.state === 'on order' ? ['on the rack'] : [];
  throw wrongState(`The ${tool.kind} ${tool.number} is ${tool.state}. ${first}`, allowed);
}

function sentenceFor(tool: Tool, uses: number): string {
  if (uses === 0) return 'Enter how many, but not 0.';
  return `Only ${tool.used} are counted on it. Take back at most that many.`;
}
