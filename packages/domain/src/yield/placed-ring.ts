import { placed } from '../nest/placed.ts';
import type { Outline, Point } from '../outline/outline.ts';
import { outlinePolygon } from '../outline/polygon.ts';
import type { Placement } from './layout.ts';

/** The outline's polygon where a placement puts it, in mm. @throws InvalidInput */
export function placedRing(outline: Outline, placement: Placement): Point[] {
  return placed(outlinePolygon(outline), placement);
}
