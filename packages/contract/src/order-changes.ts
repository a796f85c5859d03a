import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { count, day, id, idParams, line, paperNumber, paragraph } from './fields.ts';
import { order } from './orders.ts';
import { purchaseOrderStates } from './purchase-orders.ts';

/** What cancelling an order would do; nothing is done yet. */
export const cancellationOutlook = z
  .object({
    /** Why it cannot be cancelled, and what to do first; null where it can. */
    because: z.string().nullable(),
    /** What is let go of, each as "12.4 ft² of lot T-0012". */
    held: z.array(z.string()),
    /** What was taken and has not come back; it can come back on the ticket. */
    taken: z.array(z.string()),
    /** Bench minutes that are free again. */
    benchMinutes: z.string(),
    /** Good pieces that are packed for it and go on the shelf. */
    packed: count,
    /** Orders to suppliers that were drafted for it; they stay as they are. */
    purchaseOrders: z.array(
      z.object({
        id,
        number: paperNumber,
        supplierName: z.string(),
        state: z.enum(purchaseOrderStates),
      }),
    ),
    /** Tools made for it that are still to come. */
    tools: z.array(z.string()),
    /** A deposit was noted as received. */
    depositReceived: z.boolean(),
    /** Why the customer cannot be told by mail; null where that can be done. */
    cannotMail: z.string().nullable(),
    /** Stands for all of the above: whoever cancels sends what they saw. */
    seen: z.string(),
  })
  .meta({ id: 'CancellationOutlook' });
export type CancellationOutlook = z.infer<typeof cancellationOutlook>;

/** Whether the bench can keep another day; nothing is moved yet. */
export const promiseOutlook = z
  .object({
    by: day,
    /** Whether all of it can be done by then. */
    kept: z.boolean(),
    sentence: z.string(),
    /** The first day by which the bench can do it, every other promise kept; null where a year does not suffice. */
    earliest: day.nullable(),
    /** What it would do to other promises, a sentence each. */
    pushed: z.array(z.string()),
    cannotMail: z.string().nullable(),
  })
  .meta({ id: 'PromiseOutlook' });
export type PromiseOutlook = z.infer<typeof promiseOutlook>;

/** By mail, with a few words of the owner's own. */
const toCustomer = {
  tellCustomer: z.boolean().default(false),
  word: paragraph(1000).default(''),
};

export const readCancellationOutlook = endpoint({
  method: 'GET',
  path: '/orders/{id}/cancellation',
  summary: 'What cancelling an order would do',
  access: ['owner'],
  params: idParams,
  reply: cancellationOutlook,
});

export const cancelOrder = endpoint({
  method: 'POST',
  path: '/orders/{id}/cancellation',
  summary: 'Cancel an order for good: what its job holds is let go of, nothing more is made for it',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({
    why: line(200, 'Say why it is cancelled.'),
    /** What the outlook said; where it says otherwise by now, nothing is cancelled. */
    seen: z.string().max(100),
    ...toCustomer,
  }),
  reply: order,
});

export const readPromiseOutlook = endpoint({
  method: 'GET',
  path: '/orders/{id}/promises',
  summary: 'Whether the bench can keep another promised day',
  access: ['owner'],
  params: idParams,
  query: z.strictObject({ by: day }),
  reply: promiseOutlook,
});

export const movePromisedDay = endpoint({
  method: 'POST',
  path: '/orders/{id}/promises',
  summary: 'Promise an order for another day; the days promised before are kept',
  access: ['owner'],
  creates: true,
  edits: true,
  params: idParams,
  body: z.strictObject({
    promisedOn: day,
    why: line(200, 'Say why the day is moved.'),
    ...toCustomer,
  }),
  reply: order,
});
