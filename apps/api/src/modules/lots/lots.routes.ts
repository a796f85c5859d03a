import { Router } from 'express';
import { soundSide } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import {
  changeLot,
  drawLot,
  layOnLot as layOnLotEndpoint,
  listLots,
  readLot,
  readLotDrawing,
  type LotDrawing,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { layOnLot, laidOnLotReply, type LaidOnLot } from '../../flows/lay-on-lot.ts';
import { keepLayout } from '../layouts/stored-layouts.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { logDeed } from '../activity/activity-log.ts';
import { findLot } from './find-lot.ts';
import { photoOf, placePhoto } from './lot-photo.ts';
import { requireFreeTag } from './lot-tags.ts';
import type { Lot } from './lot.entity.ts';
import { readLotList, readOneLot } from './read-lots.ts';

export function lotRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listLots, async ({ em }, { query }) => {
    const { cursor, limit, ...filters } = query;
    const rows = await readLotList(em, { ...filters, below: readCursor(cursor), limit: limit + 1 });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, readLot, async ({ em }, { params }) => readOneLot(em, params.id));

  serve(router, context, changeLot, async (work, { params, body, ifMatch }) => {
    const lot = await findLot(work.em, params.id);
    await requireVersion(work.em, { kind: 'lot', id: lot.id, version: lot.version }, ifMatch);
    if (body.tag !== undefined && body.tag !== lot.tag)
      await requireFreeTag(work.em, body.tag, 'tag', lot.id);
    const { weightOz, ...others } = body;
    assignDefined(lot, others);
    if (weightOz !== undefined) lot.weightOz = weightOz === null ? null : new Decimal(weightOz);
    await work.em.flush();
    await logDeed(work, {
      action: `changed lot ${lot.tag}`,
      subjectKind: 'lot',
      subjectId: lot.id,
      detail: { changed: Object.keys(body) },
    });
    return readOneLot(work.em, lot.id);
  });

  serve(router, context, readLotDrawing, async ({ em }, { params }) =>
    drawingOf(await findLot(em, params.id)),
  );

  serve(router, context, drawLot, async (work, { params, body, ifMatch }) => {
    const lot = await findLot(work.em, params.id);
    await requireVersion(work.em, { kind: 'lot', id: lot.id, version: lot.version }, ifMatch);
    const { outline, flaws, usablePercent, photo } = body;
    const sound = outline === null ? { outline, flaws: [] } : soundSide({ outline, flaws });
    assignDefined(lot, { ...sound, usablePercent: new Decimal(usablePercent) });
    if (photo !== undefined) await placePhoto(work, lot, photo);
    await work.em.flush();
    await logDeed(work, {
      action: `drew lot ${lot.tag} with ${sound.flaws.length} flaws`,
      subjectKind: 'lot',
      subjectId: lot.id,
    });
    return drawingOf(lot);
  });

  serve(
    router,
    context,
    layOnLotEndpoint,
    async (work, _asked, laid: LaidOnLot) => {
      await keepLayout(work, laid.worked);
      return laidOnLotReply(laid);
    },
    ({ params, body }) => layOnLot(context, params.id, body),
  );

  return router;
}

const drawingOf = (lot: Lot): LotDrawing => ({
  outline: lot.outline as LotDrawing['outline'],
  flaws: lot.flaws as LotDrawing['flaws'],
  usablePercent: lot.usablePercent.toString(),
  photo: photoOf(lot),
  version: lot.version,
});
