import {
  photoLimits,
  photoSentences,
  readLotPhoto,
  type LotDrawing,
  type PhotoPlace,
} from '@hidewright/contract';
import type { Point } from '@hidewright/domain';
import { useEffect, useState } from 'react';
import { addressOf } from '../../lib/api.ts';
import { useAddLotPhoto } from './lots.mutations.ts';
import { fitted, type SidePhoto } from './side-photo.ts';
import { boxOf } from './side-sketch.ts';

export interface UsedPhoto {
  photo: SidePhoto | undefined;
  /** Why the last file cannot be used. */
  refusal: string | undefined;
  setPhoto: (photo: SidePhoto | undefined) => void;
  choose: (file: File, outline: readonly Point[]) => Promise<void>;
  /** Sends the file if it is new, and says what goes with the drawing: undefined leaves it as it is. */
  keep: () => Promise<PhotoPlace | null | undefined>;
}

/** The photo under a lot's drawing: the one that is kept with it, or one that was chosen here. */
export function useSidePhoto(lotId: number, kept: LotDrawing['photo']): UsedPhoto {
  const send = useAddLotPhoto();
  const [photo, setPhoto] = useState<SidePhoto>();
  const [touched, setTouched] = useState(false);
  const [refusal, setRefusal] = useState<string>();

  useEffect(() => {
    if (kept === null) return undefined;
    let gone = false;
    readKept(lotId, kept).then(
      (read) => !gone && setPhoto((now) => now ?? read),
      () => !gone && setRefusal('The photo of this drawing cannot be shown. Choose it again.'),
    );
    return () => void (gone = true);
  }, [lotId, kept]);

  const fileUrl = photo && 'file' in photo.source ? photo.url : undefined;
  useEffect(() => () => (fileUrl ? URL.revokeObjectURL(fileUrl) : undefined), [fileUrl]);

  function change(next: SidePhoto | undefined) {
    setTouched(true);
    setPhoto(next);
  }

  async function choose(file: File, outline: readonly Point[]) {
    setRefusal(undefined);
    const opened = await openFile(file);
    if (typeof opened === 'string') setRefusal(opened);
    else change({ ...opened, ...fitted(opened, boxOf(outline)), source: { file } });
  }

  async function keep() {
    if (!touched) return undefined;
    if (photo === undefined) return null;
    const { source, mmPerPixel, x, y } = photo;
    const { hash } =
      'hash' in source
        ? source
        : await send.mutateAsync({ params: { id: lotId }, bytes: source.file });
    return { hash, mmPerPixel, x, y };
  }

  return { photo, refusal, setPhoto: change, choose, keep };
}

async function readKept(lotId: number, { hash, ...place }: PhotoPlace): Promise<SidePhoto> {
  const url = addressOf(readLotPhoto, { params: { id: lotId, hash } });
  return { ...(await sizeOf(url)), ...place, url, source: { hash } };
}

type Opened = Pick<SidePhoto, 'url' | 'widthPx' | 'heightPx'>;

/** The file to be looked at, or what to do about it. */
async function openFile(file: File): Promise<Opened | string> {
  const { types, mostBytes, leastPx, mostPx } = photoLimits;
  if (!types.some((type) => type === file.type)) return photoSentences.type;
  if (file.size > mostBytes) return photoSentences.bytes;
  const url = URL.createObjectURL(file);
  const size = await sizeOf(url).catch(() => undefined);
  const fits = size && Math.min(size.widthPx, size.heightPx) >= leastPx;
  if (fits && Math.max(size.widthPx, size.heightPx) <= mostPx) return { url, ...size };
  URL.revokeObjectURL(url);
  return size ? photoSentences.pixels : photoSentences.type;
}

/** In pixels, upright: the browser turns it as the camera says. */
function sizeOf(url: string): Promise<Pick<SidePhoto, 'widthPx' | 'heightPx'>> {
  return new Promise((resolve, reject) => {
    const image = new Image();
    image.onload = () => resolve({ widthPx: image.naturalWidth, heightPx: image.naturalHeight });
    image.onerror = () => reject(new Error(`No picture at ${url}`));
    image.src = url;
  });
}
