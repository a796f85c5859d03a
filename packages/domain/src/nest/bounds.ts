import { grown } from './clip.ts';
import type { NestProblem } from './problem.ts';
import { counterClockwise, signedArea } from './ring.ts';

/** What no layout can beat, and where the material of one goes; areas in mm². */
export interface NestBounds {
  /** panels and sides: no layout gives more pieces */
  pieces: number | null;
  /** strips: no layout takes less strip per piece */
  mmPerPiece: number | null;
}

/**
 * An upper bound on the count. Grown by half the spacing, pieces must not overlap, and all lie in
 * the container grown as much; a piece of area A grown by r covers at least (√A + r√π)²
 * (Brunn–Minkowski inequality). Never more than area over area.
 */
export function nestBounds(problem: NestProblem): NestBounds {
  const { container, gap, trim = 0 } = problem;
  const area = Math.abs(signedArea(problem.outline));
  const covered = (Math.sqrt(area) + (gap / 2) * Math.sqrt(Math.PI)) ** 2;
  if (container.type === 'strip') {
    const width = container.width - 2 * trim;
    if (width <= 0) return { pieces: 0, mmPerPiece: null };
    return { pieces: null, mmPerPiece: Math.max(area / width, covered / (width + gap)) };
  }
  const byArea = usableArea(problem, 0) / area;
  const bySpacing = usableArea(problem, gap / 2) / covered;
  return { pieces: Math.floor(Math.min(byArea, bySpacing) + 1e-9), mmPerPiece: null };
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
