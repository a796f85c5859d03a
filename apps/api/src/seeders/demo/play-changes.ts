import { addWorkdays } from '@hidewright/domain';
import { cancelOrder } from '../../flows/cancel-order.ts';
import { movePromise } from '../../flows/move-promise.ts';
import { cancellationOutlook } from '../../flows/order-changes/cancellation-outlook.ts';
import { Job } from '../../modules/jobs/job.entity.ts';
import { findOrder } from '../../modules/orders/find-order.ts';
import type { Played, Stage } from './stage.ts';

/** What comes to an order after it was taken on: another day, or its end. */
export function planChanges({ shop, year }: Stage, played: Played): void {
  const { run } = played;
  const { moved, calledOff } = run;
  if (moved !== undefined) {
    year.planAfter(run.daysBefore, 6, '09:20', async () => {
      await shop.as('owner', async (work) => {
        const order = await findOrder(work.em, played.orderId);
        const promisedOn = addWorkdays(order.promisedOn, moved.workdays);
        const told = { tellCustomer: false, word: '', mailAvailable: true };
        return movePromise(work, order, { promisedOn, why: moved.why, ...told });
      });
    });
  }
  if (calledOff === undefined) return;
  year.planAfter(run.daysBefore, 5, '14:10', async () => {
    await shop.as('owner', async (work) => {
      const order = await findOrder(work.em, played.orderId);
      const job = await work.em.findOneOrFail(Job, { orderId: order.id });
      const { seen } = await cancellationOutlook(work, { order, job }, true);
      const told = {
        tellCustomer: true,
        word: 'Come back when it suits you.',
        mailAvailable: true,
      };
      return cancelOrder(work, { orderId: order.id, why: calledOff, seen, ...told });
    });
  });
}
