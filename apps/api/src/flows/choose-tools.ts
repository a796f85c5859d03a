import type { EntityManager } from '@mikro-orm/sqlite';
import { Tool } from '../modules/tools/tool.entity.ts';
import { usesLeft } from '../modules/tools/tool-ledger.ts';

interface ForWhom {
  patternId: number;
  customerId: number;
}

/**
 * The tools of a kind that serve this pattern and customer: named for one of the two, and for no other. Those made for
 * both come first, then those with most life left; scrapped ones are left out.
 */
export async function toolsFor(
  em: EntityManager,
  kind: Tool['kind'],
  forWhom: ForWhom,
): Promise<Tool[]> {
  const { patternId, customerId } = forWhom;
  const tools = await em.find(Tool, {
    kind,
    state: { $ne: 'scrapped' },
    $and: [
      { $or: [{ patternId }, { patternId: null }] },
      { $or: [{ customerId }, { customerId: null }] },
      { $or: [{ patternId }, { customerId }] },
    ],
  });
  return tools.sort((a, b) => named(b) - named(a) || usesLeft(b) - usesLeft(a) || a.id - b.id);
}

const named = (tool: Tool): number =>
  Number(tool.patternId !== null) + Number(tool.customerId !== null);

/** The one to use for so many strikes: from the rack, with enough life if there is such a one. */
export function chooseTool(tools: readonly Tool[], uses: number): Tool | undefined {
  const here = tools.filter((tool) => tool.state === 'on the rack');
  return (
    here.find((tool) => usesLeft(tool) >= uses) ??
    here.find((tool) => usesLeft(tool) > 0) ??
    here[0]
  );
}
