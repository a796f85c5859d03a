import { InvalidInput } from '../errors/domain-error.ts';
import { checkDrawnPolygon } from './check-polygon.ts';
import { largestMm, smallestMm } from './limits.ts';
import type { Outline, Rectangle, Tag } from './outline.ts';

/**
 * Refuses an outline that cannot be drawn: sizes from 1 to 5,000 mm, corners no rounder than the
 * shape allows, a neck narrower and shorter than its tag; a polygon as `checkDrawnPolygon` wants it.
 * @throws InvalidInput naming the measure to change
 */
export function checkOutline(outline: Outline): void {
  switch (outline.shape) {
    case 'round':
      return checkSize(outline.diameterMm, 'diameterMm', 'diameter');
    case 'oval':
      checkSize(outline.widthMm, 'widthMm', 'width');
      return checkSize(outline.heightMm, 'heightMm', 'height');
    case 'rectangle':
      return checkRectangle(outline);
    case 'tag':
      return checkTag(outline);
    case 'polygon':
      return checkDrawnPolygon(outline);
    default:
      throw new InvalidInput('shape', 'Choose round, rectangle, oval, tag or a drawing.');
  }
}

function checkRectangle(outline: Rectangle): void {
  checkSize(outline.widthMm, 'widthMm', 'width');
  checkSize(outline.heightMm, 'heightMm', 'height');
  checkCorner(outline.cornerRadiusMm, Math.min(outline.widthMm, outline.heightMm) / 2);
}

function checkTag(outline: Tag): void {
  checkSize(outline.lengthMm, 'lengthMm', 'length');
  checkSize(outline.widthMm, 'widthMm', 'width');
  checkSize(outline.neckLengthMm, 'neckLengthMm', 'neck length');
  checkSize(outline.neckWidthMm, 'neckWidthMm', 'neck width');
  if (outline.neckWidthMm >= outline.widthMm) {
    throw new InvalidInput('neckWidthMm', 'Make the neck narrower than the tag.');
  }
  const bodyMm = outline.lengthMm - outline.neckLengthMm;
  if (bodyMm < smallestMm) {
    throw new InvalidInput('neckLengthMm', 'Make the neck shorter than the whole tag.');
  }
  checkCorner(outline.cornerRadiusMm, Math.min(outline.widthMm, bodyMm) / 2);
}

function checkSize(value: number, field: string, word: string): void {
  if (!(value >= smallestMm && value <= largestMm)) {
    throw new InvalidInput(field, `Write the ${word} as ${smallestMm} to ${largestMm} mm.`);
  }
}

function checkCorner(radius: number, most: number): void {
  if (!(radius >= 0 && radius <= most)) {
    throw new InvalidInput('cornerRadiusMm', `Write the corner radius as 0 to ${most} mm.`);
  }
}
