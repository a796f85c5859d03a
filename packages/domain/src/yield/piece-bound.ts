import type { LayoutInput } from './layout.ts';

/**
 * More pieces than this fit in no layout. Grown by half the spacing, pieces must not overlap, and
 * all lie in the room grown as much; a piece of area A grown by r covers at least (√A + r√π)²
 * (Brunn–Minkowski inequality). Never more than area over area.
 */
export function pieceBound(
  { spacingMm, trimMm }: Pick<LayoutInput, 'spacingMm' | 'trimMm'>,
  pieceAreaMm2: number,
  size: { x: number; y: number },
): number {
  const [width, height] = [size.x - 2 * trimMm, size.y - 2 * trimMm];
  if (width <= 0 || height <= 0) return 0;
  const byArea = (size.x * size.y) / pieceAreaMm2;
  const grown = (Math.sqrt(pieceAreaMm2) + (spacingMm / 2) * Math.sqrt(Math.PI)) ** 2;
  const bySpacing = ((width + spacingMm) * (height + spacingMm)) / grown;
  return Math.floor(Math.min(byArea, bySpacing) + 1e-9);
}
