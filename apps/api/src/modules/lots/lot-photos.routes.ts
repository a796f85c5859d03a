import { Router } from 'express';
import { addLotPhoto, readLotPhoto } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { notFound } from '../../http/problem.ts';
import { serve, serveFile } from '../../http/serve.ts';
import { StoredFile } from '../files/stored-file.entity.ts';
import { noteFile, type KeptFile } from '../files/stored-files.ts';
import { findLot } from './find-lot.ts';
import { requirePhoto } from './lot-photo.ts';

export function lotPhotoRoutes(context: Context): Router {
  const router = Router();

  serve(
    router,
    context,
    addLotPhoto,
    async (work, _asked, photo: KeptFile) => {
      await noteFile(work, photo);
      return { hash: photo.hash };
    },
    async ({ params, bytes }) => {
      const { type } = requirePhoto(bytes);
      const { tag } = await findLot(context.orm.em.fork(), params.id);
      const hash = await context.files.keep(bytes);
      return { hash, type, name: `Photo of ${tag}`, size: bytes.length };
    },
  );

  serveFile(router, context, readLotPhoto, async ({ em }, { params }) => {
    const { photoHash } = await findLot(em, params.id);
    if (photoHash === null || photoHash !== params.hash) throw notFound('photo');
    const { name, type } = await em.findOneOrFail(StoredFile, { hash: photoHash });
    return { name, type, bytes: await context.files.read(photoHash) };
  });

  return router;
}
