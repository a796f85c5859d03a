import { grown } from '../outline/clip.ts';
import type { NestProblem, RegularPlan, Ring } from './problem.ts';
import { counterClockwise, distanceToEdges, isInside, ringBounds, signedArea } from './ring.ts';

/** What no layout can beat, and where the material of one goes; areas in mm². */
export interface NestBounds {
  /** panels and sides: no layout gives more pieces */
  pieces: number | null;
  /** strips: no layout takes less strip per piece */
  mmPerPiece: number | null;
}

/**
 * Upper bounds that hold for every layout. Grown by half the spacing, pieces must not overlap, and
 * all lie in the container grown as much: area over area. On a panel the circles inscribed in the
 * pieces are as far apart as their diameter and the spacing: Groemer 1960, Oler 1961 (from memory),
 * N ≤ (2/√3) A/d² + P/(2d) + 1 for points d apart in a convex room of area A and perimeter P.
 */
export function nestBounds(problem: NestProblem): NestBounds {
  const { container, outline, gap, trim = 0 } = problem;
  const ring = counterClockwise(outline);
  const covered = areaOf(grown([ring], gap / 2));
  if (container.type === 'strip') {
    const width = container.width - 2 * trim;
    if (width <= 0) return { pieces: 0, mmPerPiece: null };
    const mmPerPiece = Math.max(signedArea(ring) / width, covered / (width + gap));
    return { pieces: null, mmPerPiece };
  }
  const byArea = usableArea(problem, 0) / signedArea(ring);
  const bySpacing = usableArea(problem, gap / 2) / covered;
  const byCircles = container.type === 'rect' ? circlesOn(container, trim, ring, gap) : Infinity;
  return { pieces: Math.floor(Math.min(byArea, bySpacing, byCircles) + 1e-9), mmPerPiece: null };
}

const areaOf = (rings: readonly Ring[]): number =>
  rings.reduce((sum, ring) => sum + signedArea(ring), 0);

function circlesOn(panel: { w: number; h: number }, trim: number, ring: Ring, gap: number): number {
  const radius = inscribedRadius(ring);
  const [a, b] = [panel.w - 2 * trim - 2 * radius, panel.h - 2 * trim - 2 * radius];
  if (a < 0 || b < 0) return 0;
  const apart = 2 * radius + gap;
  return ((2 / Math.sqrt(3)) * a * b) / apart ** 2 + (a + b) / apart + 1;
}

/** The radius of a large circle inside the ring: where a grid, made finer three times, finds it. */
function inscribedRadius(ring: Ring): number {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  let best = { x: (minX + maxX) / 2, y: (minY + maxY) / 2, radius: 0 };
  let [wide, high] = [(maxX - minX) / 2, (maxY - minY) / 2];
  for (let round = 0; round < 4; round += 1) {
    const { x, y } = best;
    for (let i = -8; i <= 8; i += 1) {
      for (let j = -8; j <= 8; j += 1) {
        const at = { x: x + (wide * i) / 8, y: y + (high * j) / 8 };
        if (!isInside([ring], at.x, at.y)) continue;
        const radius = distanceToEdges([ring], at.x, at.y);
        if (radius > best.radius) best = { ...at, radius };
      }
    }
    [wide, high] = [wide / 6, high / 6];
  }
  return best.radius;
}

/** Where the area that no piece takes goes, in mm². */
export interface NestWastes {
  /** per piece: the cell of the repeating pattern less the piece, as a parallelogram reckons it */
  perCellMm2: number;
  /** of the whole panel or side: what lies outside the pieces' cells, at the edges and flaws */
  edgesMm2: number;
}

/** The wastes of a regular plan that repeats; null where none does or nothing is laid. */
export function nestWastes(problem: NestProblem, plan: RegularPlan): NestWastes | null {
  const { container, outline } = problem;
  const piece = Math.abs(signedArea(outline));
  if (container.type === 'strip') {
    if (plan.mmPerPiece === null) return null;
    return { perCellMm2: plan.mmPerPiece * container.width - piece, edgesMm2: 0 };
  }
  if (plan.cellAreaMm2 === null || plan.placements.length === 0) return null;
  const cells = plan.placements.length * plan.cellAreaMm2;
  const whole = usableArea({ ...problem, trim: 0, flawClearance: 0 }, 0);
  // Cells of the outermost pieces may reach over the edge.
  return { perCellMm2: plan.cellAreaMm2 - piece, edgesMm2: Math.max(0, whole - cells) };
}

/** Area of the container less trim and flaws, in mm², all edges moved outwards by so many mm. */
export function usableArea(problem: NestProblem, wider: number): number {
  const { container, trim = 0, holes = [], flawClearance = 0 } = problem;
  if (container.type === 'strip') return 0;
  const flaws = holes.reduce((sum, hole) => {
    const left = grown([counterClockwise(hole)], flawClearance - wider);
    return sum + left.reduce((all, ring) => all + signedArea(ring), 0);
  }, 0);
  return Math.max(0, outerArea(container, wider - trim) - Math.max(0, flaws));
}

function outerArea(container: Exclude<NestProblem['container'], { type: 'strip' }>, by: number) {
  if (container.type === 'rect') {
    return Math.max(0, container.w + 2 * by) * Math.max(0, container.h + 2 * by);
  }
  const rings = grown([counterClockwise(container.points)], by);
  return rings.reduce((sum, ring) => sum + signedArea(ring), 0);
}
