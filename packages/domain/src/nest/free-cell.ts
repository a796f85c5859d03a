import type { Bounds, Point } from '../outline/outline.ts';
import { ringBounds } from './ring.ts';
import type { Ring } from './problem.ts';

/** A half plane: x · nx + y · ny ≥ d. */
export interface HalfPlane {
  nx: number;
  ny: number;
  d: number;
}

/** The edges of no-fit polygons, flat: from and to of each, counter-clockwise. */
export class Edges {
  readonly bounds: Bounds;
  readonly #ends: Float64Array;

  constructor(rings: readonly Ring[]) {
    this.bounds = ringBounds(rings);
    const ends: number[] = [];
    for (const ring of rings) {
      let from = ring[ring.length - 1] as Point;
      for (const to of ring) {
        if (Math.hypot(to.x - from.x, to.y - from.y) > 1e-9) ends.push(from.x, from.y, to.x, to.y);
        from = to;
      }
    }
    this.#ends = Float64Array.from(ends);
  }

  /** How far a place is from the nearest edge, in mm. */
  distance(x: number, y: number): number {
    const ends = this.#ends;
    let least = Infinity;
    for (let at = 0; at < ends.length; at += 4) {
      const x0 = (ends[at] as number) - x;
      const y0 = (ends[at + 1] as number) - y;
      const dx = (ends[at + 2] as number) - x - x0;
      const dy = (ends[at + 3] as number) - y - y0;
      const along = -(x0 * dx + y0 * dy) / (dx * dx + dy * dy);
      const share = along < 0 ? 0 : along > 1 ? 1 : along;
      const ex = x0 + share * dx;
      const ey = y0 + share * dy;
      least = Math.min(least, ex * ex + ey * ey);
    }
    return Math.sqrt(least);
  }

  /** How deep a place lies inside, in mm; 0 where it is free. */
  depth(x: number, y: number): number {
    const { minX, minY, maxX, maxY } = this.bounds;
    if (x <= minX || x >= maxX || y <= minY || y >= maxY) return 0;
    return this.isInside(x, y) ? this.distance(x, y) : 0;
  }

  isInside(x: number, y: number): boolean {
    const ends = this.#ends;
    let inside = false;
    for (let at = 0; at < ends.length; at += 4) {
      const y0 = (ends[at + 1] as number) - y;
      const y1 = (ends[at + 3] as number) - y;
      if (y0 > 0 === y1 > 0) continue;
      const x0 = (ends[at] as number) - x;
      if (x0 - (y0 / (y1 - y0)) * ((ends[at + 2] as number) - x - x0) > 0) inside = !inside;
    }
    return inside;
  }

  /** The half plane beyond the nearest edge: the shortest way out from inside. */
  wayOut(x: number, y: number): HalfPlane {
    const nearest = this.#near(x, y, this.distance(x, y) + 1e-6)[0];
    return this.#lineOf(nearest?.at ?? 0);
  }

  /** A convex part of what is free around a point outside: as half planes, within the given reach. */
  freeCell(x: number, y: number, reach: number): HalfPlane[] {
    const cell: HalfPlane[] = [];
    for (const { at } of this.#near(x, y, reach)) {
      if (!this.#isShut(at, x, y, reach, cell)) cell.push(this.#separating(at, x, y));
    }
    return cell;
  }

  /** Whether all of an edge that is within reach already lies behind one of the half planes. */
  #isShut(at: number, x: number, y: number, reach: number, cell: readonly HalfPlane[]): boolean {
    if (cell.length === 0) return false;
    const ends = this.#ends;
    const x0 = ends[at] as number;
    const y0 = ends[at + 1] as number;
    const dx = (ends[at + 2] as number) - x0;
    const dy = (ends[at + 3] as number) - y0;
    const long = Math.sqrt(dx * dx + dy * dy);
    const middle = ((x - x0) * dx + (y - y0) * dy) / long;
    const from = Math.max(0, middle - reach) / long;
    const to = Math.min(long, middle + reach) / long;
    for (const { nx, ny, d } of cell) {
      const start = nx * (x0 + from * dx) + ny * (y0 + from * dy);
      const end = nx * (x0 + to * dx) + ny * (y0 + to * dy);
      if (start <= d + 1e-9 && end <= d + 1e-9) return true;
    }
    return false;
  }

  #near(x: number, y: number, reach: number): { at: number; far: number; beyond: number }[] {
    const ends = this.#ends;
    const near: { at: number; far: number; beyond: number }[] = [];
    const most = reach * reach;
    for (let at = 0; at < ends.length; at += 4) {
      const x0 = (ends[at] as number) - x;
      const x1 = (ends[at + 2] as number) - x;
      if ((x0 > reach && x1 > reach) || (x0 < -reach && x1 < -reach)) continue;
      const y0 = (ends[at + 1] as number) - y;
      const y1 = (ends[at + 3] as number) - y;
      if ((y0 > reach && y1 > reach) || (y0 < -reach && y1 < -reach)) continue;
      const dx = x1 - x0;
      const dy = y1 - y0;
      const squared = dx * dx + dy * dy;
      const along = -(x0 * dx + y0 * dy) / squared;
      const share = along < 0 ? 0 : along > 1 ? 1 : along;
      const ex = x0 + share * dx;
      const ey = y0 + share * dy;
      const far = ex * ex + ey * ey;
      if (far >= most) continue;
      // On the right-hand side of a counter-clockwise edge it is free.
      near.push({ at, far: Math.sqrt(far), beyond: (y0 * dx - x0 * dy) / Math.sqrt(squared) });
    }
    return near.sort((a, b) =>
      Math.abs(a.far - b.far) < 1e-7 ? b.beyond - a.beyond : a.far - b.far,
    );
  }

  #lineOf(at: number): HalfPlane {
    const ends = this.#ends;
    const [x0, y0] = [ends[at] as number, ends[at + 1] as number];
    const [dx, dy] = [(ends[at + 2] as number) - x0, (ends[at + 3] as number) - y0];
    const long = Math.hypot(dx, dy);
    const [nx, ny] = [dy / long, -dx / long];
    return { nx, ny, d: nx * x0 + ny * y0 };
  }

  /** The edge's own line where the point lies beyond it, else the line square to the way there. */
  #separating(at: number, x: number, y: number): HalfPlane {
    const ends = this.#ends;
    const [x0, y0] = [ends[at] as number, ends[at + 1] as number];
    const [dx, dy] = [(ends[at + 2] as number) - x0, (ends[at + 3] as number) - y0];
    const long = Math.hypot(dx, dy);
    const [nx, ny] = [dy / long, -dx / long];
    const beyond = (x - x0) * nx + (y - y0) * ny;
    if (beyond > -1e-9) return { nx, ny, d: nx * x0 + ny * y0 };
    const share = Math.min(1, Math.max(0, ((x - x0) * dx + (y - y0) * dy) / (long * long)));
    const [px, py] = [x0 + share * dx, y0 + share * dy];
    const far = Math.hypot(x - px, y - py);
    if (far < 1e-6) return { nx, ny, d: nx * x0 + ny * y0 };
    const [mx, my] = [(x - px) / far, (y - py) / far];
    return { nx: mx, ny: my, d: mx * px + my * py };
  }
}
