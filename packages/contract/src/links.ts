import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { day, paperNumber, runQuantity } from './fields.ts';

const tokenParams = z.strictObject({ token: z.string().min(1).max(200) });

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
    breaks: z.array(
      z.object({
        quantity: runQuantity,
        priceEach: z.string(),
        goodsTotal: z.string(),
        total: z.string(),
      }),
    ),
    /** Charged once, in a line of its own. */
    tooling: z.array(z.object({ name: z.string(), charge: z.string() })),
    toolingTotal: z.string(),
    agreedQuantity: runQuantity.nullable(),
    agreedOn: day.nullable(),
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
  body: z.strictObject({ quantity: runQuantity }),
  reply: offer,
});
