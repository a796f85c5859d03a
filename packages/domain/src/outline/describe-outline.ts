import type { Outline } from './outline.ts';

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
  }
}

const mm = (value: number): string => String(Math.round(value * 100) / 100);
const corners = (radius: number): string => (radius > 0 ? `, corners ${mm(radius)} mm` : '');
