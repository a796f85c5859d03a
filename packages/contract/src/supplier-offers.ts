import { offerFaults } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  areaMm2,
  choice,
  id,
  idParams,
  optionalLine,
  page,
  pageQuery,
  unitPrice,
  version,
} from './fields.ts';

/** Of leather in mm², of hardware in whole pieces. */
const quantity = z
  .string()
  .trim()
  .refine((text) => areaMm2.safeParse(text).success, 'Enter a quantity, such as 100.')
  // What to order reckons with no more.
  .refine(
    (text) => !(Number(text) > 1_000_000_000),
    'Enter at most 1,000,000,000 pieces, or 10,763 ft² of leather.',
  )
  .meta({ example: '100' });
const above0 = (sentence: string) => quantity.refine((text) => Number(text) > 0, sentence);

const offerBreak = z.strictObject({
  /** Of leather in mm², of hardware in pieces: from there on the price holds for the whole order. */
  from: quantity,
  /** Of one ft² of leather, or of one piece. */
  price: unitPrice,
});

const typed = {
  supplierId: choice('Choose a supplier.'),
  /** What the supplier calls it. */
  articleNumber: optionalLine(60),
  /** Null where it takes as long as the supplier usually does. */
  leadDays: z
    .int('Enter whole days.')
    .min(0, 'Enter 0 days or more.')
    .max(365, 'Enter at most 365 days.')
    .nullable(),
  /** The least that is sold; null where there is no least. */
  minimum: above0('Enter a minimum above 0, or leave it empty.').nullable(),
  /** Only multiples of it are sold, a pack; null where any quantity is. */
  multiple: above0('Enter a pack above 0, or leave it empty.').nullable(),
  breaks: z
    .array(offerBreak)
    .min(1, 'Give at least one price.')
    .max(12, 'Keep it to 12 price breaks.'),
};

export const supplierOffer = z
  .object({
    id,
    of: z.enum(['leather', 'hardware']),
    leatherId: id.nullable(),
    hardwareId: id.nullable(),
    /** Of the leather or the hardware. */
    name: z.string(),
    supplierId: id,
    supplierName: z.string(),
    articleNumber: z.string(),
    leadDays: z.int().nullable(),
    /** Its own days, or else the supplier's. */
    usualLeadDays: z.int(),
    /** What minimum, multiple and breaks count. */
    unit: z.enum(['mm2', 'piece']),
    minimum: z.string().nullable(),
    multiple: z.string().nullable(),
    breaks: confidential(z.array(z.object({ from: z.string(), price: z.string() }))),
    /** The one that is usually bought from. */
    preferred: z.boolean(),
    version,
  })
  .meta({ id: 'SupplierOffer' });
export type SupplierOfferReply = z.infer<typeof supplierOffer>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;
const ids = z.coerce.number().int().positive().optional();

export const listSupplierOffers = endpoint({
  method: 'GET',
  path: '/supplier-offers',
  summary: 'Who sells a leather or a hardware at which prices, the preferred one first',
  access: everybody,
  query: pageQuery.omit({ q: true }).extend({ leatherId: ids, hardwareId: ids, supplierId: ids }),
  reply: page(supplierOffer),
});

export const addSupplierOffer = endpoint({
  method: 'POST',
  path: '/supplier-offers',
  summary: 'Enter what a supplier asks for a leather or a hardware',
  access: ['owner'],
  creates: true,
  body: z
    .strictObject({
      ...typed,
      leatherId: id.nullable().default(null),
      hardwareId: id.nullable().default(null),
      articleNumber: typed.articleNumber.default(''),
      leadDays: typed.leadDays.default(null),
      minimum: typed.minimum.default(null),
      multiple: typed.multiple.default(null),
      preferred: z.boolean().default(false),
    })
    .superRefine((offer, context) => {
      if ((offer.leatherId === null) === (offer.hardwareId === null)) {
        const message = 'Say which leather or which hardware is offered, one of them.';
        context.addIssue({ code: 'custom', path: ['hardwareId'], message });
      }
      refineOffer(offer, context);
    }),
  reply: supplierOffer,
});

export const changeSupplierOffer = endpoint({
  method: 'PATCH',
  path: '/supplier-offers/{id}',
  summary: 'Change what a supplier asks, or prefer the supplier',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z
    .strictObject({ ...typed, preferred: z.boolean() })
    .partial()
    .superRefine(({ minimum, multiple, breaks }, context) => {
      if (minimum === undefined || multiple === undefined || breaks === undefined) return;
      refineOffer({ minimum, multiple, breaks }, context);
    }),
  reply: supplierOffer,
});

export const removeSupplierOffer = endpoint({
  method: 'DELETE',
  path: '/supplier-offers/{id}',
  summary: 'Take an offer off the list',
  access: ['owner'],
  params: idParams,
  reply: z.object({ removed: z.literal(true) }),
});

export const adoptSupplierOffer = endpoint({
  method: 'POST',
  path: '/supplier-offers/{id}/adoptions',
  summary: 'Prefer this offer, and reckon with its first price and its supplier from now on',
  access: ['owner'],
  params: idParams,
  reply: supplierOffer,
});

function refineOffer(offer: Parameters<typeof offerFaults>[0], context: z.RefinementCtx): void {
  // Only of what has passed so far: a text that is no number has its own sentence.
  if (context.issues.length > 0) return;
  for (const { field, sentence } of offerFaults(offer)) {
    const path = field.split('.').map((part) => (/^\d+$/.test(part) ? Number(part) : part));
    context.addIssue({ code: 'custom', path, message: sentence });
  }
}
