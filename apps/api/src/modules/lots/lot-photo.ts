import { photoLimits, photoSentences, type PhotoPlace } from '@hidewright/contract';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { rasterImageOf, type RasterImage } from '../files/raster-image.ts';
import { StoredFile } from '../files/stored-file.entity.ts';
import type { Lot } from './lot.entity.ts';

/** @throws {Problem} 422 with what to do about a file that is no photo, or one of another size */
export function requirePhoto(bytes: Buffer): RasterImage {
  const image = rasterImageOf(bytes);
  if (image === undefined) throw refused(photoSentences.type);
  const { leastPx, mostPx } = photoLimits;
  const sides = [image.widthPx, image.heightPx];
  if (sides.some((side) => side < leastPx || side > mostPx)) throw refused(photoSentences.pixels);
  return image;
}

/**
 * Lays a kept photo under the drawing of a lot, or takes it off.
 * @throws {Problem} 422 where no such photo is kept
 */
export async function placePhoto(work: Work, lot: Lot, photo: PhotoPlace | null): Promise<void> {
  if (photo === null) {
    Object.assign(lot, { photoHash: null, photoPlace: null });
    return;
  }
  const { hash, ...place } = photo;
  const file = await work.em.findOne(StoredFile, { hash });
  // A paper that is kept is no photo, whoever knows its hash.
  if (!file?.type.startsWith('image/'))
    throw invalid([{ field: 'photo.hash', message: 'This photo is not there. Choose it again.' }]);
  Object.assign(lot, { photoHash: hash, photoPlace: place });
}

export function photoOf({ photoHash, photoPlace }: Lot): PhotoPlace | null {
  if (photoHash === null) return null;
  return { hash: photoHash, ...(photoPlace as Omit<PhotoPlace, 'hash'>) };
}

const refused = (message: string) => invalid([{ field: 'photo', message }]);
