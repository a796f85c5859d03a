import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { count, day, id, idParams, paperNumber } from './fields.ts';
import { jobState } from './job-ticket.ts';
import { lotForms } from './lots.ts';

const member = z.object({
  lotId: id,
  tag: z.string(),
  form: z.enum(lotForms),
  /** The lot that it was cut from, or was before a service; null for the one that came in. */
  parentId: id.nullable(),
  /** The work after which it came back as a lot of its own, such as dyeing. */
  service: z.string().nullable(),
  shade: z.string(),
  place: z.string(),
  measuredAreaMm2: z.string(),
  onHandAreaMm2: z.string(),
  /** Out with a supplier to be worked on. */
  outAreaMm2: z.string(),
});
export type FamilyMember = z.infer<typeof member>;

/** How the lot at the head of the family came in. */
const origin = z.object({
  receivedOn: day,
  supplierLot: z.string(),
  supplierName: z.string().nullable(),
  purchaseOrderId: id.nullable(),
  purchaseOrderNumber: paperNumber.nullable(),
});
export type LotOrigin = z.infer<typeof origin>;

const wentInto = z.object({
  lotId: id,
  tag: z.string(),
  jobId: id,
  jobNumber: paperNumber,
  jobState,
  orderId: id,
  orderNumber: paperNumber,
  title: z.string(),
  customerName: z.string(),
  /** Taken, less what came back whole or as an offcut. */
  areaMm2: z.string(),
  /** Good pieces of a finished job, of all its lots together. */
  good: count.nullable(),
});
export type WentInto = z.infer<typeof wentInto>;

export const lotFamily = z
  .object({
    origin,
    /** The lot that came in first; then what was cut from each, in the order in which it was. */
    lots: z.array(member),
    /** What this lot, and what was cut from it, went into; newest first. */
    wentInto: z.array(wentInto),
  })
  .meta({ id: 'LotFamily' });
export type LotFamily = z.infer<typeof lotFamily>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const readLotFamily = endpoint({
  method: 'GET',
  path: '/lots/{id}/family',
  summary:
    'What a lot was cut from, what was cut from it, and which jobs and customers it went into',
  access: everybody,
  params: idParams,
  reply: lotFamily,
});

const cutFrom = z.object({
  lotId: id,
  areaMm2: z.string(),
  /** From the lot that came in down to the one that the job took from. */
  chain: z.array(member),
  origin,
});
export type CutFrom = z.infer<typeof cutFrom>;

export const orderLeather = z.object({ lots: z.array(cutFrom) }).meta({ id: 'OrderLeather' });
export type OrderLeather = z.infer<typeof orderLeather>;

export const readOrderLeather = endpoint({
  method: 'GET',
  path: '/orders/{id}/leather',
  summary: 'The lots that an order was cut from, back to the side and its delivery',
  access: everybody,
  params: idParams,
  reply: orderLeather,
});

const lastTime = z
  .object({
    orderId: id,
    orderNumber: paperNumber,
    title: z.string(),
    shippedOn: day.nullable(),
    /** False where nothing of it is taken yet, and the lots are those that are held for it. */
    cut: z.boolean(),
    lots: z.array(
      z.object({
        lotId: id,
        tag: z.string(),
        shade: z.string(),
        onHandAreaMm2: z.string(),
        /** Its own photo, or that of the lot it was cut from. */
        photo: z.object({ lotId: id, hash: z.string() }).nullable(),
      }),
    ),
  })
  .meta({ id: 'LastTime' });
export type LastTime = z.infer<typeof lastTime>;

const lastTimeReply = z.object({ lastTime: lastTime.nullable() });
const shop = ['owner', 'maker'] as const;

export const readLastTimeOfOrder = endpoint({
  method: 'GET',
  path: '/orders/{id}/last-time',
  summary:
    'What this customer’s order of the same pattern before it was cut from, as the shade to match',
  access: shop,
  params: idParams,
  reply: lastTimeReply,
});

export const readLastTimeOfQuote = endpoint({
  method: 'GET',
  path: '/quotes/{id}/last-time',
  summary:
    'What this customer’s last order of the quoted pattern was cut from, as the shade to match',
  access: shop,
  params: idParams,
  reply: lastTimeReply,
});
