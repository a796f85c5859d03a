import { logDeed } from '../modules/activity/activity-log.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { findTool } from '../modules/tools/find-tool.ts';
import { requireReturnable, requireScrappable } from '../modules/tools/tool-states.ts';
import type { Tool } from '../modules/tools/tool.entity.ts';
import type { Work } from '../work.ts';

/**
 * Gives a customer's own tool back, or scraps a tool: no job is given it any more, and its ledger stays.
 * @throws {Problem} 404, 409 for what is not here, and for giving back the shop's own
 */
export async function endTool(work: Work, id: number, how: 'returned' | 'scrapped'): Promise<Tool> {
  const tool = await findTool(work, id);
  if (how === 'returned') requireReturnable(tool);
  else requireScrappable(tool);
  tool.state = how;
  await work.em.flush();
  const { kind, number, name, ownedBy, keptUntil, used } = tool;
  const what = `${kind} ${number}, ${name}`;
  await logDeed(work, {
    action:
      how === 'scrapped' ? `scrapped ${what}` : `gave ${what} back to ${await ownerOf(work, tool)}`,
    subjectKind: 'tool',
    subjectId: id,
    detail: { ownedBy, keptUntil, used },
  });
  return tool;
}

async function ownerOf({ em }: Work, { customerId }: Tool): Promise<string> {
  return (await em.findOneOrFail(Customer, { id: customerId as number })).name;
}
