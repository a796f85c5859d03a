import { carriageBases } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  areaMm2,
  choice,
  count,
  day,
  id,
  idParams,
  lengthMm,
  money,
  optionalLine,
  page,
  pageQuery,
  positiveCount,
  version,
  weighed,
} from './fields.ts';
import { hardware } from './hardware.ts';
import { lot, lotForms } from './lots.ts';
import { purchaseOrder } from './purchase-orders.ts';

export const receiptLine = z
  .object({
    id,
    purchaseLineId: id.nullable(),
    lotId: id.nullable(),
    lotTag: z.string().nullable(),
    hardwareId: id.nullable(),
    /** Of the leather, or of the hardware. */
    name: z.string(),
    areaMm2: z.string().nullable(),
    quantity: z.int().nullable(),
    batch: z.string(),
    /** The area measured here against the one marked on it, where one is. */
    marked: z
      .object({
        areaMm2: z.string(),
        differenceMm2: z.string(),
        differencePercent: z.string(),
        /** Beyond the tolerance that the shop had when it came. */
        short: z.boolean(),
      })
      .nullable(),
    claimId: id.nullable(),
    /** What the goods cost, and their share of freight and duty. */
    goods: confidential(z.string()),
    carriage: confidential(z.string()),
    /** Of leather that was out for a service: what that had cost before. */
    material: confidential(z.string()),
  })
  .meta({ id: 'ReceiptLine' });
export type ReceiptLine = z.infer<typeof receiptLine>;

/** What the owner said to a delivery that differs; it holds for what stood then. */
const deliveryAnswer = z.object({ reason: z.string(), at: z.string(), by: z.string() });
export type DeliveryAnswer = z.infer<typeof deliveryAnswer>;

export const receipt = z
  .object({
    id,
    purchaseOrderId: id.nullable(),
    purchaseOrderNumber: z.string().nullable(),
    receivedOn: z.string(),
    at: z.string(),
    byName: z.string(),
    tolerancePercent: z.string(),
    freight: confidential(z.string()),
    duty: confidential(z.string()),
    sharedBy: z.enum(carriageBases),
    /** In words, why what it cost stays as it is; null while it can be put right. */
    staysBecause: z.string().nullable(),
    /** How much more its goods cost than at their order's prices; nothing where no order says a price. */
    priceDifference: confidential(z.string()),
    /** That this difference is let stand. */
    letStand: confidential(deliveryAnswer.nullable()),
    /** That what is short is not claimed; a claim may follow all the same. */
    notClaimed: confidential(deliveryAnswer.nullable()),
    lines: z.array(receiptLine),
    version,
  })
  .meta({ id: 'Receipt' });
export type Receipt = z.infer<typeof receipt>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listReceipts = endpoint({
  method: 'GET',
  path: '/receipts',
  summary: 'Deliveries that were received, newest first',
  access: everybody,
  query: pageQuery.omit({ q: true }).extend({
    purchaseOrderId: z.coerce.number().int().positive().optional(),
    /** Only those that came without an order. */
    withoutOrder: z.literal('yes').optional(),
  }),
  reply: page(receipt),
});

export const readReceipt = endpoint({
  method: 'GET',
  path: '/receipts/{id}',
  summary: 'One delivery that was received',
  access: everybody,
  params: idParams,
  reply: receipt,
});

const aboveZero = (text: string) => Number(text) > 0;
const fitsARack = (text: string) => Number(text) <= 9_290_304_000;
const side = lengthMm.refine(aboveZero, 'Enter a length above zero, or leave it empty.');

const receivedLot = z.strictObject({
  leatherId: choice('Choose a leather.'),
  purchaseLineId: id.nullable().default(null),
  /** Left empty, the next number is drawn. */
  tag: optionalLine(30).default(''),
  form: z.enum(lotForms, 'Choose the form that it came in.'),
  measuredAreaMm2: areaMm2
    .refine(aboveZero, 'Enter the area as measured, above zero.')
    .refine(fitsARack, 'That is more than a rack holds: enter at most 100,000 ft².'),
  /** What the tannery stamped on it, where it did: what is paid for. */
  markedAreaMm2: areaMm2
    .refine(aboveZero, 'Enter the area as marked, above zero, or leave it empty.')
    .refine(fitsARack, 'That is more than a rack holds: enter at most 100,000 ft².')
    .nullable()
    .default(null),
  pieces: positiveCount.max(10_000, 'A bundle holds at most 10,000 pieces.').default(1),
  widthMm: side.nullable().default(null),
  heightMm: side.nullable().default(null),
  weightOz: weighed.nullable().default(null),
  /** What the goods cost, if the owner types it; otherwise the order's or the leather's price per ft² says it. */
  cost: money.nullable().default(null),
  grade: optionalLine(30).default(''),
  shade: optionalLine(30).default(''),
  place: optionalLine(60).default(''),
  supplierLot: optionalLine(60).default(''),
});
export type ReceivedLot = z.output<typeof receivedLot>;

const receivedHardware = z.strictObject({
  hardwareId: choice('Choose hardware or supplies.'),
  purchaseLineId: id.nullable().default(null),
  quantity: positiveCount,
  /** The maker's own batch, so that a failure can be traced. */
  batch: optionalLine(60).default(''),
  cost: money.nullable().default(null),
});
export type ReceivedHardware = z.output<typeof receivedHardware>;

const tooMany = 'Receive at most 200 lines at a time.';

export const receiveDelivery = endpoint({
  method: 'POST',
  path: '/receipts',
  summary: 'Receive a delivery, for an order to a supplier or without one',
  access: ['owner', 'maker'],
  creates: true,
  body: z.strictObject({
    purchaseOrderId: id.nullable().default(null),
    receivedOn: day.optional(),
    lots: z.array(receivedLot).max(200, tooMany).default([]),
    hardware: z.array(receivedHardware).max(200, tooMany).default([]),
    /** How many deliveries of the order had come when it was looked at: nothing is then received twice by two people. */
    receiptsSeen: count.nullable().default(null),
    /** Freight and duty become part of what the goods cost; only the owner types them. */
    freight: money.default('0.00'),
    duty: money.default('0.00'),
    sharedBy: z.enum(carriageBases, 'Choose value, area or count.').default('value'),
    /** What is still open of the order will not come. */
    nothingMore: z.boolean().default(false),
  }),
  reply: z.object({
    /** Nothing, where nothing came and the order was only closed. */
    receipt: receipt.nullable(),
    lots: z.array(lot),
    hardware: z.array(hardware),
    purchaseOrder: purchaseOrder.nullable(),
  }),
});

export const changeReceipt = endpoint({
  method: 'PATCH',
  path: '/receipts/{id}',
  summary: 'Put right what a delivery cost, as long as nothing of it was used',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z
    .strictObject({
      freight: money,
      duty: money,
      sharedBy: z.enum(carriageBases, 'Choose value, area or count.'),
      goods: z.array(z.strictObject({ receiptLineId: id, goods: money })).max(400),
    })
    .partial(),
  reply: receipt,
});

export const answerDelivery = endpoint({
  method: 'POST',
  path: '/receipts/{id}/answers',
  summary: 'Let the price of a delivery stand, or do not claim what is short in it',
  access: ['owner'],
  creates: true,
  edits: true,
  params: idParams,
  body: z.strictObject({
    matter: z.enum(['price', 'short'], 'Say whether it is about the price or about what is short.'),
    reason: optionalLine(200).default(''),
  }),
  reply: receipt,
});
