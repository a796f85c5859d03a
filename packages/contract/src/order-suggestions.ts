import { hardwareUnits } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import { areaMm2, day, id, page, paperNumber, version } from './fields.ts';
import { purchaseOrder } from './purchase-orders.ts';

/** Of leather in mm², of hardware and supplies in whole pieces. */
const text = z.string().meta({ example: '300' });
const quantity = z
  .string('Enter a quantity, such as 100.')
  .trim()
  .refine((typed) => areaMm2.safeParse(typed).success, 'Enter a quantity, such as 100.')
  .meta({ example: '100' });
const above0 = quantity.refine((typed) => Number(typed) > 0, 'Enter a quantity above 0.');

const thing = { of: z.enum(['leather', 'hardware']), id };

/** What the ledger says of its use over the last twelve months. */
const usage = z
  .object({
    periodDays: z.union([z.literal(7), z.literal(28)]),
    /** Per period, oldest first; the last one ends today. */
    series: z.array(text),
    mean: text,
    sd: text,
    /** Share of the periods without use. */
    idlePercent: text,
    method: z.enum(['smoothing', 'croston', 'too little']),
    /** Per period. */
    forecast: text,
    /** By Croston's method: how much at a time, and every how many periods. */
    size: text.nullable(),
    interval: text.nullable(),
  })
  .meta({ id: 'ItemUsage' });

/** A row of how it goes on: a week, or a day on which a paper brings or takes something. */
const comingRow = z.object({
  day,
  /** Since the row before. */
  comes: text,
  goes: text,
  /** Free at the end of the day, below 0 where it does not suffice. */
  left: text,
  what: z.array(z.string()),
});

export const orderSuggestion = z
  .object({
    ...thing,
    name: z.string(),
    kind: z.enum(['leather', 'hardware', 'supplies']),
    /** The kits that it is a part of, with the whole ones that are free of each. */
    kits: z.array(z.object({ id, name: z.string(), free: z.int() })),
    /** What it is counted in: mm2 of leather, else what one of it is. */
    unit: z.enum(['mm2', ...hardwareUnits]),
    state: z.enum(['now', 'soon', 'drafted', 'fine']),
    /** In a sentence or two, without prices. */
    why: z.string(),
    onHand: text,
    reserved: text,
    free: text,
    promised: text,
    /** Sent and not here yet. */
    onOrder: text,
    drafted: text,
    drafts: z.array(z.object({ id, number: paperNumber })),
    /** Papers that should have come by now, or name no day. */
    overdue: z.array(paperNumber),
    minimum: text,
    /** Free and on order, less what is promised. */
    position: text,
    point: text,
    pointBy: z.enum(['hand', 'minimum', 'use']),
    /** What to order now; "0" where nothing is due. */
    quantity: text,
    /** What one order would be. */
    usual: text,
    usualBy: z.enum(['hand', 'year', 'need']),
    /** Of leather that is bought whole: how many that is. */
    whole: z.object({ areaMm2: text, form: z.string() }).nullable(),
    /** As its supplier sells it. */
    least: text.nullable(),
    multiple: text.nullable(),
    supplierId: id.nullable(),
    supplierName: z.string().nullable(),
    /** If it is ordered today. */
    arrivesOn: day.nullable(),
    /** The day on which it is expected to fall below its point. */
    dueOn: day.nullable(),
    runsOutOn: day.nullable(),
    belowMinimumOn: day.nullable(),
    days: z.array(comingRow),
    usage,
    lead: z.object({ meanDays: text, sdDays: text, deliveries: z.int() }),
    /** By use alone; null where there is too little to go by. */
    workedOut: z.object({ safety: text, point: text }).nullable(),
    /** The quantity that costs least over a year, before packs; null without use or price. */
    economic: text.nullable(),
    /** What the owner set instead. */
    byHand: z.object({ point: text.nullable(), quantity: text.nullable() }),
    /** Of one piece or ft², at the usual quantity. */
    unitPrice: confidential(z.string()),
    amount: confidential(z.string()),
    version,
  })
  .meta({ id: 'OrderSuggestion' });
export type OrderSuggestionReply = z.infer<typeof orderSuggestion>;

export const listOrderSuggestions = endpoint({
  method: 'GET',
  path: '/order-suggestions',
  summary: 'What should be ordered now and what soon, with why',
  access: ['owner', 'maker'],
  query: z.strictObject({
    /** Left out, only what is due now or soon, or waits on a draft. */
    show: z.enum(['due', 'all']).default('due'),
  }),
  reply: page(orderSuggestion).extend({
    /** How many are not due. */
    fine: z.int(),
    /** Of what nothing could be said: a fault that is in the program's log. */
    unclear: z.array(z.object({ ...thing, name: z.string() })),
    /** The shop's own starting values that these are worked out by. */
    servicePercent: z.string(),
    holdingPercent: z.string(),
    orderCost: confidential(z.string()),
  }),
});

export const orderByHand = endpoint({
  method: 'PATCH',
  path: '/order-suggestions/{of}/{id}',
  summary: 'Set by hand when and how much of a thing is ordered; null lets it go',
  access: ['owner'],
  edits: true,
  params: z.strictObject({ of: thing.of, id: z.coerce.number().int().positive() }),
  body: z.strictObject({ point: quantity.nullable(), quantity: above0.nullable() }).partial(),
  reply: orderSuggestion,
});

export const draftSuggested = endpoint({
  method: 'POST',
  path: '/order-suggestions/purchase-orders',
  summary: 'Put things on the draft order of their supplier, one draft for each',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    lines: z
      .array(
        z.strictObject({
          ...thing,
          quantity: above0,
          /** What was on drafts when the line was looked at: what came on one since is not drafted again. */
          drafted: quantity,
        }),
      )
      .min(1, 'Tick what you want to order.')
      .max(100, 'Order at most 100 things at a time.'),
  }),
  reply: z.object({
    orders: z.array(purchaseOrder),
    /** What was not drafted, and what to do about it. */
    notes: z.array(z.string()),
  }),
});
