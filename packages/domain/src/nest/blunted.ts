import type { Point } from '../outline/outline.ts';
import type { Ring } from './problem.ts';
import { cornerAt } from './ring.ts';

/**
 * A counter-clockwise ring with fewer corners that contains the given one and goes no farther than
 * `most` mm beyond it: short edges on bulges give way to the meeting point of their neighbours.
 */
export function blunted(ring: Ring, most: number): Point[] {
  let corners: Point[] = [...ring];
  for (let pass = 0; pass < passes; pass += 1) {
    const next = onePass(corners, most / passes);
    if (next.length === corners.length) break;
    corners = next;
  }
  return corners;
}

const passes = 3;

function onePass(corners: readonly Point[], most: number): Point[] {
  const kept: Point[] = [];
  const count = corners.length;
  for (let at = 0; at < count; at += 1) {
    const meets = at + 1 < count ? meetingPoint(corners, at, most) : null;
    if (meets && count - at > 3 && at > 0) {
      kept.push(meets);
      at += 1;
    } else kept.push(corners[at] as Point);
  }
  return kept.length >= 3 ? kept : [...corners];
}

/** Where the edges before and after an edge meet, if that is close beyond it. */
function meetingPoint(corners: Ring, at: number, most: number): Point | null {
  const [a, b] = [cornerAt(corners, at - 1), cornerAt(corners, at)];
  const [c, d] = [cornerAt(corners, at + 1), cornerAt(corners, at + 2)];
  const [ux, uy] = [b.x - a.x, b.y - a.y];
  const [vx, vy] = [d.x - c.x, d.y - c.y];
  const turn = ux * vy - uy * vx;
  const [ex, ey] = [c.x - b.x, c.y - b.y];
  const bulges = ux * ey - uy * ex > 0 && ex * vy - ey * vx > 0 && turn > 0;
  if (!bulges || ux * vx + uy * vy <= 0) return null;
  const share = (ex * vy - ey * vx) / turn;
  const beyond = (share * (ux * ey - uy * ex)) / Math.hypot(ex, ey);
  return beyond <= most ? { x: b.x + share * ux, y: b.y + share * uy } : null;
}
