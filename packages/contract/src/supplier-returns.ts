import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { choice, idParams, line, positiveCount } from './fields.ts';
import { stockMovement } from './stock.ts';

const reason = line(200, 'Say why, in a few words, such as wrong colour.');

export const listSupplierReturns = endpoint({
  method: 'GET',
  path: '/purchase-orders/{id}/returns',
  summary: 'What of an order went back to its supplier',
  access: ['owner', 'maker', 'bookkeeper'],
  params: idParams,
  reply: z.object({ items: z.array(stockMovement) }),
});

export const returnToSupplier = endpoint({
  method: 'POST',
  path: '/purchase-orders/{id}/returns',
  summary: 'Send back to the supplier a lot, or hardware, that came on an order',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.discriminatedUnion(
    'of',
    [
      /** All that is left of it. */
      z.strictObject({ of: z.literal('lot'), lotId: choice('Choose a lot.'), reason }),
      z.strictObject({
        of: z.literal('hardware'),
        hardwareId: choice('Choose hardware or supplies.'),
        quantity: positiveCount,
        reason,
      }),
    ],
    'Choose a lot, or hardware.',
  ),
  reply: stockMovement,
});
