import { notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Tool } from './tool.entity.ts';

/** @throws {Problem} 404 */
export async function findTool({ em }: Pick<Work, 'em'>, id: number): Promise<Tool> {
  const tool = await em.findOne(Tool, id);
  if (tool === null) throw notFound('tool');
  return tool;
}
