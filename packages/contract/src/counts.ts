import { hardwareUnits } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  areaMm2,
  choice,
  count,
  id,
  idParams,
  line,
  optionalLine,
  page,
  pageQuery,
  version,
} from './fields.ts';
import { onceSound } from './once-sound.ts';
import { stockReservation } from './stock.ts';

export const countStates = ['open', 'handed in', 'approved', 'cancelled'] as const;
export type CountState = (typeof countStates)[number];

/** One thing on a count sheet. What the books say stands in it only once the sheet is handed in, and never for the maker. */
export const countLine = z
  .object({
    id,
    lotId: id.nullable(),
    hardwareId: id.nullable(),
    /** What hangs or stands on it. */
    tag: z.string(),
    name: z.string(),
    /** What one of it is; null for a lot. */
    unit: z.enum(hardwareUnits).nullable(),
    form: z.string().nullable(),
    place: z.string(),
    /** Found there, although the books had it elsewhere. */
    added: z.boolean(),
    /** Of a lot, as measured. */
    countedAreaMm2: z.string().nullable(),
    /** Of hardware, in its unit. */
    countedQuantity: z.int().nullable(),
    /** It hangs there and was not measured again: its area stays as it is. */
    unmeasured: z.boolean(),
    countedAt: z.string().nullable(),
    countedByName: z.string().nullable(),
    /** The owner asked to count it once more. */
    again: z.boolean(),
    /** What the books said when it was counted. */
    bookAreaMm2: confidential(z.string().nullable()),
    bookQuantity: confidential(z.int().nullable()),
    differenceAreaMm2: confidential(z.string().nullable()),
    differenceQuantity: confidential(z.int().nullable()),
    /** The difference at cost. */
    differenceValue: confidential(z.string().nullable()),
    /** What came, or below 0 went, between counting and now: it is in the books already and stays. Null where nothing did. */
    movedAreaMm2: confidential(z.string().nullable()),
    movedQuantity: confidential(z.int().nullable()),
  })
  .meta({ id: 'CountLine' });
export type CountLine = z.infer<typeof countLine>;

const head = {
  id,
  title: z.string(),
  state: z.enum(countStates),
  openedAt: z.string(),
  openedByName: z.string(),
  handedInAt: z.string().nullable(),
  handedInByName: z.string().nullable(),
  settledAt: z.string().nullable(),
  settledByName: z.string().nullable(),
  lineCount: z.int(),
  countedCount: z.int(),
  version,
};

export const countCard = z.object(head).meta({ id: 'CountCard' });
export type CountCard = z.infer<typeof countCard>;

export const stockCount = z
  .object({
    ...head,
    /** The place that is counted; null where it is a leather, or hardware and supplies. */
    place: z.string().nullable(),
    lines: z.array(countLine),
    /** All differences at cost. */
    differenceValue: confidential(z.string().nullable()),
    /** What is held for jobs and would not all be there. */
    broken: confidential(z.array(stockReservation)),
  })
  .meta({ id: 'StockCount' });
export type StockCount = z.infer<typeof stockCount>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;
const stockroom = ['owner', 'maker'] as const;

export const listCounts = endpoint({
  method: 'GET',
  path: '/counts',
  summary: 'Sheets on which something was or is being counted, newest first',
  access: everybody,
  query: pageQuery.omit({ q: true }),
  reply: page(countCard),
});

const countPlace = z.object({
  /** '' for lots of which nobody said where they lie. */
  place: z.string(),
  lots: z.int(),
  /** Kinds of hardware and supplies that have their bin there. */
  bins: z.int(),
});
export type CountPlace = z.infer<typeof countPlace>;

export const listCountPlaces = endpoint({
  method: 'GET',
  path: '/count-places',
  summary: 'The places where lots lie or bins stand, with how many of each',
  access: stockroom,
  reply: z.object({ items: z.array(countPlace) }),
});

export const openCount = endpoint({
  method: 'POST',
  path: '/counts',
  summary: 'Open a sheet for a place, a leather, or hardware and supplies',
  access: stockroom,
  creates: true,
  body: z.discriminatedUnion(
    'of',
    [
      z.strictObject({ of: z.literal('place'), place: optionalLine(60) }),
      z.strictObject({ of: z.literal('leather'), leatherId: choice('Choose a leather.') }),
      z.strictObject({ of: z.literal('hardware') }),
      z.strictObject({ of: z.literal('supplies') }),
    ],
    'Choose what to count: a place, a leather, hardware or supplies.',
  ),
  reply: stockCount,
});

export const readCount = endpoint({
  method: 'GET',
  path: '/counts/{id}',
  summary: 'One sheet with its lines',
  access: everybody,
  params: idParams,
  reply: stockCount,
});

const fewEnough = (text: string) => Number(text) <= 9_290_304_000;

export const enterCount = endpoint({
  method: 'PUT',
  path: '/counts/{id}/lines/{lineId}',
  summary: 'Write down what was counted; nothing named takes the line’s count away again',
  access: stockroom,
  params: z.strictObject({
    id: z.coerce.number().int().positive(),
    lineId: z.coerce.number().int().positive(),
  }),
  body: z
    .strictObject({
      areaMm2: areaMm2.refine(fewEnough, 'Enter at most 100,000 ft².').optional(),
      quantity: count.optional(),
      unmeasured: z.literal(true).optional(),
      /** How long ago it was counted, where it could not be sent at once. */
      secondsAgo: z
        .int()
        .min(0)
        .max(7 * 24 * 3600, 'That was counted too long ago: count it again.')
        .default(0),
    })
    .refine(
      ({ areaMm2: area, quantity, unmeasured }) =>
        [area, quantity, unmeasured].filter((given) => given !== undefined).length <= 1,
      onceSound('Enter an area or a count, not both.'),
    ),
  reply: z.object({
    line: countLine,
    /** Who had written what there before, where that was somebody else. */
    replaced: z.string().nullable(),
  }),
});

export const addToCount = endpoint({
  method: 'POST',
  path: '/counts/{id}/lines',
  summary: 'Put on the sheet what was found and does not stand there, by its tag',
  access: stockroom,
  creates: true,
  params: idParams,
  body: z.strictObject({ code: line(500, 'Scan or type the tag of what you found.') }),
  reply: z.object({
    line: countLine,
    /** It stood on the sheet already. */
    already: z.boolean(),
  }),
});

export const handInCount = endpoint({
  method: 'POST',
  path: '/counts/{id}/handing-in',
  summary: 'Hand in a sheet; lines that nobody counted stay as the books say, if that is meant',
  access: stockroom,
  creates: true,
  params: idParams,
  body: z.strictObject({ leaveUncounted: z.boolean().default(false) }),
  reply: stockCount,
});

export const countAgain = endpoint({
  method: 'POST',
  path: '/counts/{id}/recounts',
  summary: 'Ask for some lines to be counted once more',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({
    lineIds: z.array(id).min(1, 'Choose at least one line.').max(1000),
  }),
  reply: stockCount,
});

export const approveCount = endpoint({
  method: 'POST',
  path: '/counts/{id}/approval',
  summary: 'Approve a sheet as it was read: its differences become movements, all or none',
  access: ['owner'],
  creates: true,
  edits: true,
  params: idParams,
  body: z.strictObject({}),
  reply: stockCount,
});

export const cancelCount = endpoint({
  method: 'POST',
  path: '/counts/{id}/cancellation',
  summary: 'Put a sheet aside: the books stay as they are',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({}),
  reply: stockCount,
});
