import { placed } from '../nest/placed.ts';
import type { NestPlacement, NestProblem } from '../nest/problem.ts';
import { ringBounds } from '../outline/ring.ts';

/**
 * Moves a whole layout on a panel into the corner where both sides begin, so that the first piece is
 * placed against the edges and what is left over lies together. On a side it stays where it is.
 */
export function intoCorner(
  { container, outline, trim = 0 }: NestProblem,
  placements: readonly NestPlacement[],
): NestPlacement[] {
  if (container.type !== 'rect' || placements.length === 0) return [...placements];
  const bounds = placements.map((placement) => ringBounds(placed(outline, placement)));
  const by = {
    x: trim - Math.min(...bounds.map(({ minX }) => minX)),
    y: trim - Math.min(...bounds.map(({ minY }) => minY)),
  };
  return placements.map(({ x, y, rot }) => ({ x: tidy(x + by.x), y: tidy(y + by.y), rot }));
}

/** A tenth of a nanometre: pieces that touch must not come to overlap by it. */
const tidy = (value: number): number => Math.round(value * 1e7) / 1e7 + 0;
