import { Router } from 'express';
import {
  changeFinishedPiece,
  countFinished,
  listFinishedMovements,
  listFinishedPieces,
  putOnShelf,
  readFinishedPiece,
  sellFinished,
  takeFinished,
  type FinishedPiece as FinishedReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { putOnShelfByHand } from '../../flows/put-on-shelf-by-hand.ts';
import { sellFromShelf } from '../../flows/sell-from-shelf.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { describeInvoice } from '../invoices/describe-invoice.ts';
import { countFinishedPieces, findFinished, takeFinishedPieces } from './finished-ledger.ts';
import { requireMarkOf } from './require-mark.ts';
import { readFinishedList, readFinishedMovements, readOneFinished } from './read-finished.ts';

export function finishedPieceRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listFinishedPieces, async ({ em }, { query }) => {
    const { cursor, limit, ...filters } = query;
    const below = readCursor(cursor);
    const rows = await readFinishedList(em, { ...filters, below, limit: limit + 1 });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, readFinishedPiece, ({ em }, { params }) => readOneFinished(em, params.id));

  serve(router, context, listFinishedMovements, async ({ em }, { params, query }) => {
    const { id: pieceId } = await findFinished(em, params.id);
    const { cursor, limit } = query;
    const below = readCursor(cursor);
    const rows = await readFinishedMovements(em, { pieceId, below, limit: limit + 1 });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, putOnShelf, async (work, { body }) => {
    const piece = await putOnShelfByHand(work, body);
    return told(work, piece.id, (of) => `put ${body.quantity} of ${of} on the shelf`, {
      quantity: body.quantity,
      reason: body.reason,
    });
  });

  serve(router, context, takeFinished, async (work, { params, body }) => {
    const piece = await findFinished(work.em, params.id);
    if (body.as !== 'spoiled') await requireMarkOf(work.em, piece, body.customerId);
    await takeFinishedPieces(work, piece, body);
    const words = { sold: 'sold', given: 'gave away', spoiled: 'wrote off' };
    return told(work, piece.id, (of) => `${words[body.as]} ${body.quantity} of ${of}`, body);
  });

  serve(router, context, sellFinished, async (work, { params, body }) =>
    describeInvoice(work, await sellFromShelf(work, { pieceId: params.id, ...body })),
  );

  serve(router, context, countFinished, async (work, { params, body }) => {
    const piece = await findFinished(work.em, params.id);
    const before = piece.onHand;
    await countFinishedPieces(work, piece, body);
    if (piece.onHand === before) return readOneFinished(work.em, piece.id);
    return told(work, piece.id, (of) => `counted ${body.counted} of ${of}`, { ...body, before });
  });

  serve(router, context, changeFinishedPiece, async (work, { params, body, ifMatch }) => {
    const piece = await findFinished(work.em, params.id);
    const { id, version } = piece;
    await requireVersion(work.em, { kind: 'finished piece', id, version }, ifMatch);
    piece.place = body.place;
    await work.em.flush();
    return told(work, id, (of) => `said where ${of} lie`, body);
  });

  return router;
}

/** Logs it, in words that name the pieces, and gives them as they are now. */
async function told(
  work: Work,
  id: number,
  action: (of: string) => string,
  detail: Record<string, unknown>,
): Promise<FinishedReply> {
  const now = await readOneFinished(work.em, id);
  const of = `${now.patternName}${now.sort === 'seconds' ? ', seconds' : ''}`;
  const subject = { subjectKind: 'finished piece', subjectId: id };
  await logDeed(work, { action: action(of), ...subject, detail });
  return now;
}
