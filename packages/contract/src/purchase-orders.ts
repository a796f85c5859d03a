import { hardwareUnits } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  areaMm2,
  choice,
  day,
  id,
  idParams,
  line,
  money,
  page,
  pageQuery,
  paperNumber,
  paragraph,
  positiveCount,
  unitPrice,
  version,
} from './fields.ts';
import { lotForms } from './lots.ts';

export const purchaseOrderStates = [
  'draft',
  'sent',
  'part received',
  'received',
  'cancelled',
] as const;
export type PurchaseOrderState = (typeof purchaseOrderStates)[number];

/** Up to 100,000 ft². */
const orderedArea = areaMm2.refine(
  (text) => Number(text) > 0 && Number(text) <= 9_290_304_000,
  'Enter an area above zero, and at most 100,000 ft².',
);

/** Work bought in that makes another leather of a lot: splitting, skiving, dyeing. */
const typedService = z
  .strictObject({
    of: z.literal('service'),
    /** The work, in one word or a few. */
    service: line(40, 'Say which work, such as dyeing.'),
    lotId: choice('Choose the lot that goes out.'),
    /** How much of the lot; left out, all that is free of it. */
    areaMm2: orderedArea.nullish(),
    becomesLeatherId: choice('Choose the leather that it becomes.'),
    /** Per ft² of what goes out … */
    unitPrice: unitPrice.nullish(),
    /** … or for the lot. */
    fixedPrice: money.nullish(),
  })
  .refine((typed) => (typed.unitPrice ?? null) !== null || (typed.fixedPrice ?? null) !== null, {
    path: ['unitPrice'],
    message: 'Enter the price per ft², or for the lot.',
  })
  .refine((typed) => (typed.unitPrice ?? null) === null || (typed.fixedPrice ?? null) === null, {
    path: ['fixedPrice'],
    message: 'Enter one price: per ft², or for the lot.',
  });
export type ServiceLineTyped = z.output<typeof typedService>;

export const typedPurchaseLine = z.discriminatedUnion(
  'of',
  [
    z.strictObject({
      of: z.literal('leather'),
      leatherId: choice('Choose a leather.'),
      areaMm2: orderedArea,
      unitPrice,
    }),
    z.strictObject({
      of: z.literal('hardware'),
      hardwareId: choice('Choose hardware or supplies.'),
      quantity: positiveCount,
      unitPrice,
    }),
    typedService,
  ],
  'Choose a leather, hardware, or a service.',
);
export type PurchaseLineTyped = z.output<typeof typedPurchaseLine>;
/** What is bought, not worked on. */
export type GoodsLineTyped = Exclude<PurchaseLineTyped, { of: 'service' }>;

const typed = {
  supplierId: choice('Choose a supplier.'),
  expectedOn: day.nullable(),
  note: paragraph(2000),
  lines: z
    .array(typedPurchaseLine)
    .min(1, 'Add a line: what do you order?')
    .max(100, 'An order holds at most 100 lines. Make a second one.'),
};

/** Of leather an area, of hardware a count. */
const goods = z.object({ areaMm2: z.string().nullable(), quantity: z.int().nullable() });

/** What a line has done to a lot. */
const service = z
  .object({
    word: z.string(),
    lotId: id,
    lotTag: z.string(),
    lotForm: z.enum(lotForms),
    becomesLeatherId: id,
    becomesName: z.string(),
    /** Whether the leather becomes another one. */
    changes: z.boolean(),
    state: z.enum(['to go out', 'out', 'came back', 'put back']),
  })
  .meta({ id: 'PurchasedService' });
export type PurchasedService = z.infer<typeof service>;

export const purchaseLine = z
  .object({
    id,
    position: z.int(),
    of: z.enum(['leather', 'hardware', 'service']),
    leatherId: id.nullable(),
    hardwareId: id.nullable(),
    /** Of a service, the work and the lot: Dyeing of T-0012, Oak tan natural. */
    name: z.string(),
    /** What the supplier calls it; empty where nobody said, and for a service. */
    articleNumber: z.string(),
    /** What one of it is; null where it is leather. */
    unit: z.enum(hardwareUnits).nullable(),
    service: service.nullable(),
    /** Of leather: what was ordered and what came. */
    areaMm2: z.string().nullable(),
    receivedAreaMm2: z.string().nullable(),
    /** Where what came is counted by its marks and measured otherwise, what was measured. */
    measuredAreaMm2: z.string().nullable(),
    /** Of leather that comes out even in what it is bought as: so many sides. */
    whole: z.object({ count: z.int(), form: z.string() }).nullable(),
    /** Of hardware: what was ordered and what came. */
    quantity: z.int().nullable(),
    received: z.int().nullable(),
    /** While the order is awaited; once it is closed, what is missing is short. */
    toCome: goods,
    over: goods,
    short: goods,
    /** What of it went back to its supplier, and on which days first and last. */
    sentBack: goods.extend({ firstOn: z.string(), lastOn: z.string() }).nullable(),
    /** The day on which the rest is awaited: its own, or the order's. */
    expectedOn: z.string().nullable(),
    /** Per ft², or per piece. */
    unitPrice: confidential(z.string()),
    /** Of a service that is paid for the lot: then its price per ft² is 0. */
    fixedPrice: confidential(z.string().nullable()),
    amount: confidential(z.string()),
    /** What was paid for what came, and how much that is above its price on the order. */
    paid: confidential(z.string()),
    priceDifference: confidential(z.string()),
  })
  .meta({ id: 'PurchaseLine' });
export type PurchaseLine = z.infer<typeof purchaseLine>;

export const purchaseOrder = z
  .object({
    id,
    number: paperNumber,
    supplierId: id,
    supplierName: z.string(),
    supplierEmail: z.string(),
    state: z.enum(purchaseOrderStates),
    createdAt: z.string(),
    sentAt: z.string().nullable(),
    /** Of a draft, the day that was chosen for it, if any; once sent, the day that its supplier was told. */
    expectedOn: z.string().nullable(),
    /** Of a draft, the day on which it would be here if it were sent today; null once it is sent. */
    arrivesOn: z.string().nullable(),
    /** The day on which the next of what is still to come is awaited; null where nothing is. */
    awaitedOn: z.string().nullable(),
    /** Why, by whom and when it was cancelled; null where it was not. */
    cancellation: z.object({ at: z.string(), by: z.string(), why: z.string() }).nullable(),
    note: z.string(),
    /** Of one that the check drafted, the runs that it is for; its supplier is not told. */
    draftedFor: z.string(),
    lines: z.array(purchaseLine),
    /** How many deliveries of it have come. */
    receipts: z.int(),
    total: confidential(z.string()),
    version,
  })
  .meta({ id: 'PurchaseOrder' });
export type PurchaseOrder = z.infer<typeof purchaseOrder>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listPurchaseOrders = endpoint({
  method: 'GET',
  path: '/purchase-orders',
  summary: 'Orders to suppliers, newest first',
  access: everybody,
  query: pageQuery.extend({
    state: z.enum(purchaseOrderStates).optional(),
    supplierId: z.coerce.number().int().positive().optional(),
    /** Sent, and not all of it here. */
    awaited: z.enum(['yes']).optional(),
  }),
  reply: page(purchaseOrder),
});

export const readPurchaseOrder = endpoint({
  method: 'GET',
  path: '/purchase-orders/{id}',
  summary: 'One order to a supplier',
  access: everybody,
  params: idParams,
  reply: purchaseOrder,
});

export const addPurchaseOrder = endpoint({
  method: 'POST',
  path: '/purchase-orders',
  summary: 'Draft an order to a supplier',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    ...typed,
    expectedOn: typed.expectedOn.default(null),
    note: typed.note.default(''),
  }),
  reply: purchaseOrder,
});

export const changePurchaseOrder = endpoint({
  method: 'PATCH',
  path: '/purchase-orders/{id}',
  summary: 'Change an order that is still a draft; lines are given whole',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject(typed).partial(),
  reply: purchaseOrder,
});

export const purchaseOrderPaper = endpoint({
  method: 'GET',
  path: '/purchase-orders/{id}/paper',
  summary: 'The order as PDF, as the supplier gets it; once sent, the very file that was sent',
  access: ['owner', 'bookkeeper'],
  params: idParams,
  reply: z.unknown(),
  file: 'application/pdf',
});

export const sendPurchaseOrder = endpoint({
  method: 'POST',
  path: '/purchase-orders/{id}/sendings',
  summary: 'Send an order to its supplier by e-mail, or say that it was handed over otherwise',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({ by: z.enum(['mail', 'hand'], 'Choose by e-mail or by hand.') }),
  reply: purchaseOrder,
});

export const cancelPurchaseOrder = endpoint({
  method: 'POST',
  path: '/purchase-orders/{id}/cancellations',
  summary: 'Cancel an order of which nothing has come',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({ reason: line(200, 'Say why, in a few words.') }),
  reply: purchaseOrder,
});
