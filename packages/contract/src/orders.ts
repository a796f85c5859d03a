import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  count,
  day,
  id,
  idParams,
  instant,
  page,
  pageQuery,
  paperNumber,
  version,
} from './fields.ts';

export const orderStates = [
  'awaiting proof',
  'awaiting deposit',
  'awaiting tooling',
  'taken on',
  'in work',
  'packed',
  'part shipped',
  'shipped',
  'closed',
  'cancelled',
] as const;
export const orderState = z.enum(orderStates);
export type OrderState = z.infer<typeof orderState>;

/** What can still be awaited after an order is taken on; several at once. */
export const awaited = z.enum(['proof', 'deposit', 'tooling'], 'Choose proof, deposit or tooling.');
export type Awaited = z.infer<typeof awaited>;

/** A promised day that was moved. */
const promiseMove = z
  .object({ fromDay: day, toDay: day, why: z.string(), at: instant, by: z.string() })
  .meta({ id: 'PromiseMove' });
export type PromiseMove = z.infer<typeof promiseMove>;

export const order = z
  .object({
    id,
    number: paperNumber,
    state: orderState,
    /** What is still awaited. */
    awaits: z.array(awaited),
    quoteId: id,
    quoteNumber: paperNumber,
    customerId: id,
    customerName: z.string(),
    patternId: id,
    patternName: z.string(),
    title: z.string(),
    quantity: count,
    priceEach: confidential(z.string()),
    goodsTotal: confidential(z.string()),
    toolingCharge: confidential(z.string()),
    /** The option that was agreed; null for the piece as it is. */
    optionName: z.string().nullable(),
    charges: confidential(z.array(z.object({ name: z.string(), amount: z.string() }))),
    total: confidential(z.string()),
    inHandsOn: day.nullable(),
    promisedOn: day,
    takenOnAt: instant,
    shippedOn: day.nullable(),
    /** How the promised day was moved, the first move first: its `fromDay` is the day that was promised at first. */
    moves: z.array(promiseMove),
    /** Who cancelled it, and why. */
    cancellation: z.object({ at: instant, by: z.string(), why: z.string() }).nullable(),
    job: z.object({
      id,
      number: paperNumber,
      state: z.enum(['waiting', 'ready', 'at the bench', 'paused', 'finished']),
      cutCount: count,
      good: count,
      seconds: count,
    }),
    /** Its invoice, where one has been drafted or issued. */
    invoice: confidential(
      z.object({ id, number: paperNumber.nullable(), state: z.string() }).nullable(),
    ),
    version,
  })
  .meta({ id: 'Order' });
export type Order = z.infer<typeof order>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listOrders = endpoint({
  method: 'GET',
  path: '/orders',
  summary: 'Orders, newest first',
  access: everybody,
  query: pageQuery.extend({
    state: orderState.optional(),
    /** Only those not yet shipped, closed or cancelled. */
    open: z.enum(['true', 'false']).optional(),
    customerId: z.coerce.number().int().positive().optional(),
  }),
  reply: page(order),
});

export const readOrder = endpoint({
  method: 'GET',
  path: '/orders/{id}',
  summary: 'One order',
  access: everybody,
  params: idParams,
  reply: order,
});

export const takeOnOrder = endpoint({
  method: 'POST',
  path: '/orders',
  summary: 'Take on an agreed quote: makes the order, its job and its reservations at once',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    quoteId: id,
    promisedOn: day,
    awaits: z
      .array(awaited)
      .max(3)
      .refine((all) => new Set(all).size === all.length, 'Name each thing that is awaited once.')
      .default([]),
    /** Take it on although something is short: what there is, is held. */
    evenIfShort: z.boolean().default(false),
  }),
  reply: order,
});

export const recordArrival = endpoint({
  method: 'POST',
  path: '/orders/{id}/arrivals',
  summary: 'The proof is approved, the deposit received, or the tooling is here',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({ what: awaited }),
  reply: order,
});

export const shipOrder = endpoint({
  method: 'POST',
  path: '/orders/{id}/shipments',
  summary: 'The packed order has left the shop',
  access: ['owner', 'maker'],
  creates: true,
  params: idParams,
  body: z.strictObject({ shippedOn: day }),
  reply: order,
});
