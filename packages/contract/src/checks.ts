import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { choice, count, day, id, idParams, paperNumber, runQuantity } from './fields.ts';
import { purchaseOrder } from './purchase-orders.ts';

/** One question of *Can we make it?*, answered from what is on hand and on order. No prices in it. */
const checkAnswer = z
  .object({
    about: z.enum(['leather', 'hardware', 'supplies', 'tooling', 'press', 'hours']),
    /** What it is about: a leather, a kind of rivet, the cutting die, the bench. */
    name: z.string(),
    /** The hardware to open: what it is about, or what a missing die sets. */
    hardwareId: id.nullable(),
    unit: z.enum(['mm2', 'piece', 'strike', 'mm', 'minute']),
    /** Exact decimals in the unit. */
    needed: z.string(),
    /** Free now, of what is needed. */
    freeNow: z.string(),
    /** Free by the day on which it is needed, with what comes by then. */
    free: z.string(),
    /** What is missing on that day; "0" where there is enough. */
    short: z.string(),
    enough: z.boolean(),
    /** The first day on which all of it can be there, bought today if need be; null where nobody can tell. */
    enoughOn: day.nullable(),
    /** Whether some of it is to be bought that stands on no draft yet. */
    toBuy: z.boolean(),
    /** The answer in words; where something is short, it says what to do. */
    sentence: z.string(),
  })
  .meta({ id: 'CheckAnswer' });
export type CheckAnswer = z.infer<typeof checkAnswer>;

/** What would come from one lot. */
const checkLot = z.object({
  lotId: id,
  tag: z.string(),
  place: z.string(),
  shade: z.string(),
  freeAreaMm2: z.string(),
  takesAreaMm2: z.string(),
  pieces: count,
  /** How its pieces are known: by a layout on it as drawn, by ready panels, or by its usable share. */
  by: z.enum(['layout', 'panels', 'area']),
  /** How many panels or pieces to take, and how many stay. */
  sentence: z.string(),
});
export type CheckLot = z.infer<typeof checkLot>;

export const runCheck = z
  .object({
    quantity: runQuantity,
    /** The day by which it must be packed. */
    by: day,
    /** The day on which its leather and hardware must be there, so that it can be packed by then. */
    startBy: day,
    cutCount: count,
    containers: count,
    /** True when every answer has enough. */
    yes: z.boolean(),
    answers: z.array(checkAnswer),
    lots: z.array(checkLot),
    patternId: id,
    /** What its pattern should be looked at for, with what to do; it stops nothing. */
    remarks: z.array(z.string()),
    /** What else is worth knowing and stops nothing. */
    notes: z.array(z.string()),
    /**
     * The first day by which it can be packed when what is short is bought today, tooling aside; null where nobody
     * can tell.
     */
    earliestDay: day.nullable(),
  })
  .meta({ id: 'RunCheck' });
export type RunCheck = z.infer<typeof runCheck>;

const comingDay = z.object({
  day,
  comes: z.string(),
  goes: z.string(),
  /** Below 0 where it does not suffice. */
  left: z.string(),
  what: z.array(z.string()),
});

/** A leather, or hardware or supplies, that is short for one of the runs. */
const shortForRuns = z
  .object({
    of: z.enum(['leather', 'hardware']),
    id,
    name: z.string(),
    unit: z.enum(['mm2', 'piece']),
    /** On hand, held for jobs and on order today; of leather, what whole panels can be cut from. */
    onHand: z.string(),
    reserved: z.string(),
    onOrder: z.string(),
    /** Of leather, what could be cut as well, but gives no whole panel of what is short. */
    ends: z.string().nullable(),
    /** For all the runs together. */
    needed: z.string(),
    /** What must be bought for them, beside what is on order; and how much of that is on a draft. */
    buy: z.string(),
    drafted: z.string(),
    /** What to order beyond that, as its supplier sells it: packs, minimum, a break that costs less; of leather with its waste. */
    toOrder: z.string(),
    drafts: z.array(paperNumber),
    supplierName: z.string().nullable(),
    /** The customer brings it: it is not bought. */
    fromCustomer: z.boolean(),
    /** When it is here if it is ordered today; null without a supplier. */
    arrivesOn: day.nullable(),
    days: z.array(comingDay),
    /** The first day on which it does not suffice. */
    runsOutOn: day.nullable(),
  })
  .meta({ id: 'ShortForRuns' });
export type ShortForRuns = z.infer<typeof shortForRuns>;

const askedOption = z.string().trim().max(60).nullish();
const fewestRuns = 'Choose a quote, or a pattern and a quantity.';

/** A quote that would be taken on, or just so many of a pattern. */
const askedRun = z
  .strictObject({
    quoteId: choice('Choose a quote.').nullish(),
    patternId: choice('Choose a pattern.').nullish(),
    /** Of a quote: what was agreed, or else the least that is offered. */
    quantity: runQuantity.nullish(),
    option: askedOption,
    /** Else the day in hands, or two working weeks from today. */
    by: day.nullish(),
  })
  .superRefine(({ quoteId, patternId, quantity }, context) => {
    const has = (value: unknown) => value !== null && value !== undefined;
    if (has(quoteId) === has(patternId)) {
      const message = has(quoteId) ? 'Choose a quote or a pattern, not both.' : fewestRuns;
      context.addIssue({ code: 'custom', path: ['patternId'], message });
    } else if (has(patternId) && !has(quantity)) {
      context.addIssue({ code: 'custom', path: ['quantity'], message: 'Enter how many.' });
    }
  });
export type AskedRun = z.output<typeof askedRun>;

const askedRuns = z
  .strictObject({
    runs: z.array(askedRun).min(1, fewestRuns).max(20, 'Check at most 20 runs at a time.'),
  })
  .superRefine(({ runs }, context) => {
    runs.forEach(({ quoteId }, at) => {
      if (quoteId === null || quoteId === undefined) return;
      if (runs.findIndex((run) => run.quoteId === quoteId) === at) return;
      const message = 'This quote is chosen already. Check it once, with all of its quantity.';
      context.addIssue({ code: 'custom', path: ['runs', at, 'quoteId'], message });
    });
  });

export const checkQuote = endpoint({
  method: 'GET',
  path: '/quotes/{id}/check',
  summary:
    'Can we make it? Leather, hardware, tooling and bench hours against what is free, by that day',
  access: ['owner', 'maker'],
  params: idParams,
  query: z.strictObject({
    quantity: z.coerce.number('Enter a quantity.').pipe(runQuantity).optional(),
    by: day.optional(),
    option: z.string().max(60).optional(),
  }),
  reply: runCheck,
});

export const runsCheck = z
  .object({
    /** In the order in which they were asked. */
    runs: z.array(
      runCheck.extend({
        quoteId: id.nullable(),
        /** "Q-0012 Heron tags", or the pattern's name. */
        name: z.string(),
        option: z.string().nullable(),
        /** Its turn: by the day, then as asked; what comes first is given first. */
        turn: z.int().positive(),
      }),
    ),
    yes: z.boolean(),
    short: z.array(shortForRuns),
    /** The first day by which all of them can be packed. */
    earliestDay: day.nullable(),
  })
  .meta({ id: 'RunsCheck' });
export type RunsCheck = z.infer<typeof runsCheck>;

export const checkRuns = endpoint({
  method: 'POST',
  path: '/checks',
  summary: 'Can we make them? Several runs at once, each given what those before it leave',
  access: ['owner', 'maker'],
  body: askedRuns,
  reply: runsCheck,
});

export const draftShort = endpoint({
  method: 'POST',
  path: '/checks/purchase-orders',
  summary: 'Draft what is short for these runs: one order for each supplier, in full packs',
  access: ['owner'],
  creates: true,
  body: askedRuns,
  reply: z.object({
    orders: z.array(purchaseOrder),
    /** What was not drafted and why, and where a price break makes more of it cost less. */
    notes: z.array(z.string()),
  }),
});
