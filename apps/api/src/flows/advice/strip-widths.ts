import { outlineBounds, type Outline } from '@hidewright/domain';

const tries = 8;

/** Widths of strip worth trying: from just one piece across to the widest that a press takes. */
export function stripWidths(outline: Outline, trimMm: number, widestMm: number): number[] {
  const { minX, minY, maxX, maxY } = outlineBounds(outline);
  const least = Math.ceil(Math.min(maxX - minX, maxY - minY) + 2 * trimMm);
  if (least > widestMm) return [];
  const step = (widestMm - least) / (tries - 1);
  const widths = Array.from({ length: tries }, (_, at) => Math.round(least + at * step));
  return [...new Set(widths)];
}
