import type { ToolNeed, ToolStock } from './check-stock.ts';

export interface ToolFacts {
  need: ToolNeed;
  /** null where none is in the shop */
  tool: ToolStock | null;
  strikesNeeded: number;
  strikesLeft: number;
  ok: boolean;
}

/** The tool that a run uses: one with life enough for it, or else one with any life left. */
export function drawTool(
  tools: readonly ToolStock[],
  need: ToolNeed,
  pieces: number,
): { facts: ToolFacts; left: readonly ToolStock[] } {
  const here = need.choices.flatMap((id) => tools.find(({ toolId }) => toolId === id) ?? []);
  const tool =
    here.find((each) => each.strikesLeft >= strikesOf(each, pieces)) ??
    here.find(({ strikesLeft }) => strikesLeft > 0) ??
    here[0] ??
    null;
  if (tool === null) {
    const facts = { need, tool, strikesNeeded: pieces, strikesLeft: 0, ok: false };
    return { facts, left: tools };
  }
  const strikesNeeded = strikesOf(tool, pieces);
  const { strikesLeft } = tool;
  const used = { ...tool, strikesLeft: Math.max(0, strikesLeft - strikesNeeded) };
  return {
    facts: { need, tool, strikesNeeded, strikesLeft, ok: strikesLeft >= strikesNeeded },
    left: tools.map((each) => (each.toolId === tool.toolId ? used : each)),
  };
}

/** A die may cut several pieces at once. */
const strikesOf = ({ piecesPerStrike }: ToolStock, pieces: number): number =>
  Math.ceil(pieces / piecesPerStrike);
