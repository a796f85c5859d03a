import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { idParams } from './fields.ts';

/** What a photo of a side may be. */
export const photoLimits = {
  types: ['image/png', 'image/jpeg', 'image/webp'],
  mostBytes: 15_000_000,
  leastPx: 50,
  mostPx: 12_000,
} as const;

/** What to do about a file that cannot be taken, said by the page and by the API alike. */
export const photoSentences = {
  type: 'Choose a photo as PNG, JPEG or WebP. Another format must be saved as one of these first.',
  bytes: 'Choose a photo of at most 15 MB. Save it smaller, and choose it again.',
  pixels: 'Choose a photo of 50 to 12,000 pixels each way. Save it in another size.',
} as const;

const hash = z.string().regex(/^[0-9a-f]{64}$/, 'Choose the photo again.');
const mm = z.number().min(-20_000).max(20_000);

/** Where a photo lies under the drawing of a side: its top left corner in mm, and how large it is. */
export const photoPlace = z.strictObject({
  /** The kept file, by the hash of its bytes. */
  hash,
  mmPerPixel: z.number().min(0.001).max(100),
  x: mm,
  y: mm,
});
export type PhotoPlace = z.infer<typeof photoPlace>;

const access = ['owner', 'maker'] as const;

/** The file is named by its bytes: sent twice, it is kept once. */
export const addLotPhoto = endpoint({
  method: 'POST',
  path: '/lots/{id}/photos',
  summary: 'Keep a photo of a lot, to be laid under its drawing',
  access,
  params: idParams,
  takes: { types: photoLimits.types, mostBytes: photoLimits.mostBytes, refusal: photoSentences },
  reply: z.object({ hash: z.string() }).meta({ id: 'KeptPhoto' }),
});

export const readLotPhoto = endpoint({
  method: 'GET',
  path: '/lots/{id}/photos/{hash}',
  summary: 'The photo under the drawing of a lot',
  access,
  params: z.strictObject({ ...idParams.shape, hash }),
  reply: z.unknown(),
  file: 'image/*',
});
