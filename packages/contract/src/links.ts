import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { day, optionalLine, paperNumber, runQuantity } from './fields.ts';

const tokenParams = z.strictObject({ token: z.string().min(1).max(200) });

const offeredRung = z.object({
  quantity: runQuantity,
  priceEach: z.string(),
  goodsTotal: z.string(),
  /** Charged once beside the pieces and the tooling: setting up, rush, carriage. */
  charges: z.array(z.object({ name: z.string(), amount: z.string() })),
  total: z.string(),
  /** The same run again, its tooling paid for. */
  reorderTotal: z.string(),
});

/** A quote as its customer reads it: what is offered, at what price, and nothing of what it costs the shop. */
export const offer = z
  .object({
    shopName: z.string(),
    number: paperNumber,
    state: z.enum(['open', 'agreed', 'declined', 'lapsed']),
    customerName: z.string(),
    title: z.string(),
    inHandsOn: day.nullable(),
    validUntil: day.nullable(),
    message: z.string(),
    /** SVG path data in mm, and what it shows in words; null where there is no drawing. */
    outline: z.object({ path: z.string(), words: z.string() }).nullable(),
    currency: z.string(),
    breaks: z.array(offeredRung),
    /** The same with other hardware: one or none is chosen. */
    options: z.array(z.object({ name: z.string(), breaks: z.array(offeredRung) })),
    /** Charged once, in a line of its own. */
    tooling: z.array(z.object({ name: z.string(), charge: z.string() })),
    toolingTotal: z.string(),
    /** What the customer sells a piece for, where they sell it on. */
    resalePrice: z.string().nullable(),
    agreedQuantity: runQuantity.nullable(),
    agreedOption: z.string().nullable(),
    agreedOn: day.nullable(),
    /** What became of it once the shop took it on; null before. */
    order: z
      .object({
        number: paperNumber,
        /** The day by which it is packed. */
        promisedOn: day,
        shippedOn: day.nullable(),
        cancelledOn: day.nullable(),
      })
      .nullable(),
  })
  .meta({ id: 'Offer' });
export type Offer = z.infer<typeof offer>;

export const readOffer = endpoint({
  method: 'GET',
  path: '/links/{token}',
  summary: 'What a customer’s link shows',
  access: 'link',
  params: tokenParams,
  reply: offer,
});

export const agreeOffer = endpoint({
  method: 'POST',
  path: '/links/{token}/agreements',
  summary: 'The customer agrees to a quantity',
  access: 'link',
  params: tokenParams,
  body: z.strictObject({
    quantity: runQuantity,
    option: optionalLine(60).nullable().default(null),
  }),
  reply: offer,
});
