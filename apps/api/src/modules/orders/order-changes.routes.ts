import { Router } from 'express';
import {
  cancelOrder as cancelling,
  movePromisedDay,
  readCancellationOutlook,
  readPromiseOutlook,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { cancelOrder } from '../../flows/cancel-order.ts';
import { requireReachable } from '../../flows/check/runs-asked.ts';
import { movePromise, requireOpen } from '../../flows/move-promise.ts';
import { cancellationOutlook } from '../../flows/order-changes/cancellation-outlook.ts';
import { promiseOutlook } from '../../flows/order-changes/promise-outlook.ts';
import { requireVersion } from '../../http/conditions.ts';
import { serve } from '../../http/serve.ts';
import { Job } from '../jobs/job.entity.ts';
import { findOrder } from './find-order.ts';
import { readOrderReply } from './orders.repository.ts';

/** An order that changes after it was taken on: cancelled, or promised for another day. */
export function orderChangeRoutes(context: Context): Router {
  const router = Router();
  const mailAvailable = context.mailer.available;

  serve(router, context, readCancellationOutlook, async (work, { params }) => {
    const order = await findOrder(work.em, params.id);
    const job = await work.em.findOneOrFail(Job, { orderId: order.id });
    return cancellationOutlook(work, { order, job }, mailAvailable);
  });

  serve(router, context, cancelling, async (work, { params, body }) => {
    await cancelOrder(work, { orderId: params.id, ...body, mailAvailable });
    return readOrderReply(work.em, params.id);
  });

  serve(router, context, readPromiseOutlook, async (work, { params, query }) => {
    const order = await findOrder(work.em, params.id);
    requireOpen(order);
    requireReachable(work, query.by, 'by');
    return promiseOutlook(work, order, { by: query.by, mailAvailable });
  });

  serve(router, context, movePromisedDay, async (work, { params, body, ifMatch }) => {
    const order = await findOrder(work.em, params.id);
    const { id, version } = order;
    await requireVersion(work.em, { kind: 'order', id, version }, ifMatch);
    await movePromise(work, order, { ...body, mailAvailable });
    return readOrderReply(work.em, id);
  });

  return router;
}
