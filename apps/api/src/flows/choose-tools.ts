import type { EntityManager } from '@mikro-orm/sqlite';
import { Tool } from '../modules/tools/tool.entity.ts';
import { usesLeft } from '../modules/tools/tool-ledger.ts';

interface ForWhom {
  patternId: number;
  /** Null where nobody is named yet: then only what is no customer's. */
  customerId: number | null;
}

/**
 * The tools of a kind that serve this pattern and customer: named for one of the two, and for no other. Those made for
 * both come first, then those with most life left; what was given back or scrapped is left out.
 */
export async function toolsFor(
  em: EntityManager,
  kind: Tool['kind'],
  forWhom: ForWhom,
): Promise<Tool[]> {
  const { patternId, customerId } = forWhom;
  const tools = await em.find(Tool, {
    kind,
    state: { $nin: ['returned', 'scrapped'] },
    $and: [
      { $or: [{ patternId }, { patternId: null }] },
      { $or: [{ customerId }, { customerId: null }] },
      customerId === null ? { patternId } : { $or: [{ patternId }, { customerId }] },
    ],
  });
  return tools.sort((a, b) => named(b) - named(a) || usesLeft(b) - usesLeft(a) || a.id - b.id);
}

const named = (tool: Tool): number =>
  Number(tool.patternId !== null) + Number(tool.customerId !== null);

/** Strikes for so many pieces: a die may cut several at once. */
export function strikesFor({ piecesPerStrike }: Pick<Tool, 'piecesPerStrike'>, pieces: number) {
  return Math.ceil(pieces / piecesPerStrike);
}

/** The one to use for so many pieces: from the rack, with enough life if there is such a one. */
export function chooseTool(tools: readonly Tool[], pieces: number): Tool | undefined {
  const here = tools.filter((tool) => tool.state === 'on the rack');
  return (
    here.find((tool) => usesLeft(tool) >= strikesFor(tool, pieces)) ??
    here.find((tool) => usesLeft(tool) > 0) ??
    here[0]
  );
}
