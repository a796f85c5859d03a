import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { id, idParams, money, version } from './fields.ts';
import { plateMetals } from './tools.ts';

const priceSentence = 'Enter what one new plate costs, more than 0, with at most two decimals.';
const lifeSentence = 'Enter how many impressions one plate lasts, 1 or more.';

const typed = {
  /** Of one new plate, ready to strike. */
  price: z
    .string(priceSentence)
    .trim()
    .refine((text) => money.safeParse(text).success && Number(text) > 0, priceSentence)
    .meta({ example: '46.00' }),
  /** Impressions that one plate lasts, by the shop's own experience. */
  lifeUses: z
    .int(lifeSentence)
    .min(1, lifeSentence)
    .max(10_000_000, 'Enter a life of at most 10,000,000.'),
};

export const plateOffer = z
  .object({ id, metal: z.enum(plateMetals), price: z.string(), lifeUses: z.int(), version })
  .meta({ id: 'PlateOffer' });
export type PlateOfferReply = z.infer<typeof plateOffer>;

export const listPlateOffers = endpoint({
  method: 'GET',
  path: '/plate-offers',
  summary: 'What a new plate of each metal costs and lasts, the least dear first',
  access: ['owner'],
  reply: z.object({ items: z.array(plateOffer) }),
});

export const addPlateOffer = endpoint({
  method: 'POST',
  path: '/plate-offers',
  summary: 'Enter what a new plate of a metal costs and lasts',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    ...typed,
    metal: z.enum(plateMetals, 'Choose magnesium, copper, brass or steel.'),
  }),
  reply: plateOffer,
});

export const changePlateOffer = endpoint({
  method: 'PATCH',
  path: '/plate-offers/{id}',
  summary: 'Change what a new plate of a metal costs or lasts',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject(typed).partial(),
  reply: plateOffer,
});

export const removePlateOffer = endpoint({
  method: 'DELETE',
  path: '/plate-offers/{id}',
  summary: 'Take a metal off the list',
  access: ['owner'],
  params: idParams,
  reply: z.object({ removed: z.literal(true) }),
});
