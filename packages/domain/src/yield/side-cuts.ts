import type { SideStripsPlan } from '../nest/side-strips.ts';
import { placed } from '../nest/placed.ts';
import type { Point } from '../outline/outline.ts';
import { outlinePolygon } from '../outline/polygon.ts';
import { nextCorner, type Ring, ringBounds } from '../outline/ring.ts';
import type { Placement, SideCuts, SideInput } from './layout.ts';

/** What the cuts of a plan make of a side: every strip's width, length and pieces. */
export function sideCuts(
  { side, outline }: Pick<SideInput, 'side' | 'outline'>,
  { way, cuts }: Pick<SideStripsPlan, 'way' | 'cuts'>,
  placements: readonly Placement[],
): SideCuts {
  // Across the cuts is y then.
  const edge = way === 'x' ? side.outline : side.outline.map(swapped);
  const { minY, maxY } = ringBounds(edge);
  const polygon = outlinePolygon(outline);
  const middles = placements.map((placement) => middleOf(placed(polygon, placement), way));
  const strips = [...cuts, maxY].map((to, at) => {
    const from = cuts[at - 1] ?? minY;
    const pieces = middles.filter((middle) => middle > from && middle < to).length;
    return { widthMm: tidy(to - from), lengthMm: tidy(lengthWithin(edge, from, to)), pieces };
  });
  return { along: way === 'x' ? 'width' : 'height', at: cuts.map(tidy), strips };
}

const swapped = ({ x, y }: Point): Point => ({ x: y, y: x });

function middleOf(ring: Ring, way: SideStripsPlan['way']): number {
  const { minX, maxX, minY, maxY } = ringBounds(ring);
  return way === 'x' ? (minY + maxY) / 2 : (minX + maxX) / 2;
}

/** How far an edge reaches along x between two heights. */
function lengthWithin(edge: Ring, low: number, high: number): number {
  const xs = edge.flatMap((from, at) => {
    const to = nextCorner(edge, at);
    const inside = from.y >= low && from.y <= high ? [from.x] : [];
    return [...inside, ...[low, high].flatMap((y) => crossingAt(from, to, y))];
  });
  return xs.length === 0 ? 0 : Math.max(...xs) - Math.min(...xs);
}

function crossingAt(from: Point, to: Point, y: number): number[] {
  if (from.y > y === to.y > y) return [];
  return [from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x)];
}

const tidy = (value: number): number => Math.round(value * 1e4) / 1e4;
