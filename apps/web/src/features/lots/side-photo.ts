import type { PhotoPlace } from '@hidewright/contract';
import type { Point } from '@hidewright/domain';
import { boxOf, type Box } from './side-sketch.ts';

/** A photo of a side as it lies under the drawing. */
export interface SidePhoto extends Omit<PhotoPlace, 'hash'> {
  /** Where the browser reads it. */
  url: string;
  /** As it stands upright. */
  widthPx: number;
  heightPx: number;
  /** The file that is kept, or the one that will be. */
  source: { hash: string } | { file: File };
}

type Size = Pick<SidePhoto, 'widthPx' | 'heightPx'>;
type Place = Pick<SidePhoto, 'mmPerPixel' | 'x' | 'y'>;

/** A photo whose scale nobody knows yet: over the edge, as wide or as high as it. */
export function fitted({ widthPx, heightPx }: Size, edge: Box): Place {
  const mmPerPixel = Math.max(edge.width / widthPx, edge.height / heightPx);
  const [x, y] = [
    edge.x + (edge.width - widthPx * mmPerPixel) / 2,
    edge.y + (edge.height - heightPx * mmPerPixel) / 2,
  ];
  return { mmPerPixel, x, y };
}

/**
 * The photo true to scale: the line drawn on it gets the length given. Its middle stays where it is; undefined where
 * the line is too short to tell anything.
 */
export function trueToScale(
  photo: SidePhoto,
  [from, to]: readonly [Point, Point],
  lengthMm: number,
): SidePhoto | undefined {
  const drawn = Math.hypot(to.x - from.x, to.y - from.y);
  const pixels = drawn / photo.mmPerPixel;
  if (pixels < leastLinePx) return undefined;
  const mmPerPixel = lengthMm / pixels;
  const grown = (mmPerPixel - photo.mmPerPixel) / 2;
  return {
    ...photo,
    mmPerPixel,
    x: photo.x - photo.widthPx * grown,
    y: photo.y - photo.heightPx * grown,
  };
}

const leastLinePx = 10;

/** A line on the photo, where it lies once the photo is moved or scaled. */
export function carried(line: readonly Point[], from: SidePhoto, to: SidePhoto): Point[] {
  return line.map(({ x, y }) => ({
    x: to.x + ((x - from.x) / from.mmPerPixel) * to.mmPerPixel,
    y: to.y + ((y - from.y) / from.mmPerPixel) * to.mmPerPixel,
  }));
}

export const movedBy = (photo: SidePhoto, dx: number, dy: number): SidePhoto => ({
  ...photo,
  x: photo.x + dx,
  y: photo.y + dy,
});

export function photoBox({ x, y, widthPx, heightPx, mmPerPixel }: SidePhoto): Box {
  return { x, y, width: widthPx * mmPerPixel, height: heightPx * mmPerPixel };
}

/** What is in sight: the edge, and the photo with it. */
export function frameOf(outline: readonly Point[], photo: SidePhoto | undefined): Box {
  if (photo === undefined) return boxOf(outline);
  const { x, y, width, height } = photoBox(photo);
  return boxOf([...outline, { x, y }, { x: x + width, y: y + height }]);
}
