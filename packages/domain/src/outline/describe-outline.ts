import { outlineBounds } from './measure.ts';
import type { DrawnPolygon, Outline } from './outline.ts';

/** An outline in a few words: 'round, 95 mm'. */
export function describeOutline(outline: Outline): string {
  switch (outline.shape) {
    case 'round':
      return `round, ${mm(outline.diameterMm)} mm`;
    case 'oval':
      return `oval, ${mm(outline.widthMm)} × ${mm(outline.heightMm)} mm`;
    case 'rectangle':
      return `rectangle, ${mm(outline.widthMm)} × ${mm(outline.heightMm)} mm${corners(outline.cornerRadiusMm)}`;
    case 'tag':
      return (
        `tag, ${mm(outline.lengthMm)} × ${mm(outline.widthMm)} mm, ` +
        `neck ${mm(outline.neckLengthMm)} × ${mm(outline.neckWidthMm)} mm`
      );
    case 'polygon':
      return describePolygon(outline);
  }
}

function describePolygon(outline: DrawnPolygon): string {
  const { minX, minY, maxX, maxY } = outlineBounds(outline);
  const holes = outline.punched?.length ?? 0;
  const size = `drawn, ${mm(maxX - minX)} × ${mm(maxY - minY)} mm`;
  if (holes === 0) return size;
  return `${size}, ${holes} ${holes === 1 ? 'hole' : 'holes'} punched`;
}

const mm = (value: number): string => String(Math.round(value * 100) / 100);
const corners = (radius: number): string => (radius > 0 ? `, corners ${mm(radius)} mm` : '');
