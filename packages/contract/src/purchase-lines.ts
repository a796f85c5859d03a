import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { day, id, idParams, line } from './fields.ts';
import { purchaseOrder } from './purchase-orders.ts';

const lineParams = z.strictObject({
  id: z.coerce.number().int().positive(),
  lineId: z.coerce.number().int().positive(),
});

export const changeAwaitedDay = endpoint({
  method: 'PATCH',
  path: '/purchase-orders/{id}/lines/{lineId}',
  summary: 'Say when the rest of a line is awaited',
  access: ['owner'],
  edits: true,
  params: lineParams,
  body: z.strictObject({ expectedOn: day }),
  reply: purchaseOrder,
});

export const closePurchaseLine = endpoint({
  method: 'POST',
  path: '/purchase-orders/{id}/lines/{lineId}/closings',
  summary: 'Say that nothing more of a line is to come: what is missing of it is short',
  access: ['owner'],
  creates: true,
  params: lineParams,
  body: z.strictObject({ reason: line(200, 'Say why, in a few words.') }),
  reply: purchaseOrder,
});

export const reopenPurchaseOrder = endpoint({
  method: 'POST',
  path: '/purchase-orders/{id}/reopenings',
  summary: 'Await after all what was closed short: one line, or all that is missing',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({
    /** Null for every line that is short. */
    lineId: id.nullable(),
    /** When it comes; null leaves the day as it was. */
    expectedOn: day.nullable().default(null),
  }),
  reply: purchaseOrder,
});
