import { outlineBounds, widestStripMm, type Outline } from '@hidewright/domain';
import type { Press } from '../../modules/presses/press.entity.ts';

/** Without a press on record: what most hand presses take, common practice, no source. */
const usualMm = 300;
const tries = 8;

/** Widths of strip worth trying: from just one piece across to what the widest press takes. */
export function stripWidths(outline: Outline, trimMm: number, presses: readonly Press[]): number[] {
  const widest = Math.max(0, ...presses.map(widthOf)) || usualMm;
  const { minX, minY, maxX, maxY } = outlineBounds(outline);
  const least = Math.ceil(Math.min(maxX - minX, maxY - minY) + 2 * trimMm);
  if (least > widest) return [];
  const step = (widest - least) / (tries - 1);
  const widths = Array.from({ length: tries }, (_, at) => Math.round(least + at * step));
  return [...new Set(widths)];
}

const widthOf = ({ bedDepthMm, bedWidthMm, throatMm }: Press): number =>
  widestStripMm({
    bedWidthMm: bedWidthMm.toNumber(),
    bedDepthMm: bedDepthMm.toNumber(),
    throatMm: throatMm?.toNumber() ?? null,
    ruleMm: null,
    reliefAreaMm2: null,
  });
