import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  areaMm2,
  count,
  day,
  id,
  idParams,
  optionalLine,
  page,
  pageQuery,
  paperNumber,
  positiveCount,
} from './fields.ts';
import { job, jobState } from './job-ticket.ts';
import { awaited } from './orders.ts';

/** A job in a list. */
export const jobCard = z
  .object({
    id,
    number: paperNumber,
    state: jobState,
    orderId: id,
    /** Its order was cancelled: nothing more is made of it. */
    cancelled: z.boolean(),
    title: z.string(),
    customerName: z.string(),
    quantity: count,
    cutCount: count,
    promisedOn: day,
    inHandsOn: day.nullable(),
    awaits: z.array(awaited),
    plannedMinutes: z.string(),
    loggedMinutes: z.string(),
    /** Each step's share done, 0 to 1, in order: the stitches of the ticket. */
    progress: z.array(z.number()),
    /** The step under way or next; null when all are done. */
    step: z.string().nullable(),
    good: count,
    seconds: count,
  })
  .meta({ id: 'JobCard' });
export type JobCard = z.infer<typeof jobCard>;

/** Estimate and fact of one thing, as exact decimals in its unit. */
const compared = z.object({
  what: z.string(),
  unit: z.enum(['mm2', 'pieces', 'minutes', 'percent', 'money']),
  estimate: z.string(),
  /** Null where nothing was logged that could say it. */
  fact: z.string().nullable(),
});
export type Compared = z.infer<typeof compared>;

export const jobComparison = z
  .object({
    work: z.array(compared),
    /** What it cost and earned: for the owner. */
    money: confidential(z.array(compared)),
  })
  .meta({ id: 'JobComparison' });
export type JobComparison = z.infer<typeof jobComparison>;

const bench = ['owner', 'maker'] as const;
const someArea = areaMm2.refine((text) => Number(text) > 0, 'Enter an area above 0.');
const signedCount = z
  .int('Enter a whole number.')
  .min(-100_000, 'That is too many.')
  .max(100_000, 'That is too many.');
const signedMinutes = z
  .string('Enter minutes, such as 12 or 7.5.')
  .trim()
  .regex(/^-?(0|[1-9]\d{0,4})(\.\d{1,2})?$/, 'Enter minutes, such as 12 or 7.5.')
  .refine((text) => !/^-0(\.0+)?$/.test(text), 'Enter minutes, such as 12 or 7.5.')
  .meta({ example: '12.5' });

export const listJobs = endpoint({
  method: 'GET',
  path: '/jobs',
  summary: 'Jobs, newest first',
  access: bench,
  query: pageQuery.extend({
    state: jobState.optional(),
    open: z.enum(['true', 'false']).optional(),
  }),
  reply: page(jobCard),
});

export const readJob = endpoint({
  method: 'GET',
  path: '/jobs/{id}',
  summary: 'One job: its ticket',
  access: bench,
  params: idParams,
  reply: job,
});

export const logBench = endpoint({
  method: 'POST',
  path: '/jobs/{id}/logs',
  summary: 'Log minutes and counts on a step; a correction is a further row with negative counts',
  access: bench,
  creates: true,
  params: idParams,
  body: z.strictObject({
    stepId: id,
    good: signedCount.default(0),
    rejects: signedCount.default(0),
    seconds: signedCount.default(0),
    minutes: signedMinutes.default('0'),
    note: optionalLine(200).default(''),
  }),
  reply: job,
});

/** So much leather of a named lot, or so many of a kind of hardware. */
const amountOfStock = z.union([
  z.strictObject({ lotId: id, areaMm2: someArea }),
  z.strictObject({ hardwareId: id, quantity: positiveCount }),
]);

/** The same; whoever takes what is held says how much they saw held, so that two who press at once take it once. */
const taking = z.union([
  z.strictObject({ lotId: id, areaMm2: someArea, heldSeenAreaMm2: areaMm2.optional() }),
  z.strictObject({ hardwareId: id, quantity: positiveCount, heldSeenQuantity: count.optional() }),
]);

export const takeForJob = endpoint({
  method: 'POST',
  path: '/jobs/{id}/takings',
  summary:
    'Take leather from a lot, or hardware, for the job; nothing where other than was seen is held',
  access: bench,
  creates: true,
  params: idParams,
  body: taking,
  reply: job,
});

export const holdForJob = endpoint({
  method: 'POST',
  path: '/jobs/{id}/reservations',
  summary: 'Hold leather of a lot, or hardware, for the job: nobody else can take it',
  access: bench,
  creates: true,
  params: idParams,
  body: amountOfStock,
  reply: job,
});

export const letGo = endpoint({
  method: 'POST',
  path: '/jobs/{id}/releases',
  summary: 'Let go of what is held for the job of a lot or of hardware; it is free again',
  access: bench,
  creates: true,
  params: idParams,
  body: z.union([z.strictObject({ lotId: id }), z.strictObject({ hardwareId: id })]),
  reply: job,
});

export const returnFromJob = endpoint({
  method: 'POST',
  path: '/jobs/{id}/returns',
  summary:
    'Put back what the job has taken of a lot or of hardware and does not use; it is free again',
  access: bench,
  creates: true,
  params: idParams,
  body: amountOfStock,
  reply: job,
});

export const finishJob = endpoint({
  method: 'POST',
  path: '/jobs/{id}/finish',
  summary: 'Finish: good pieces and seconds, what is left goes back, the order is packed',
  access: bench,
  creates: true,
  params: idParams,
  body: z.strictObject({
    good: positiveCount,
    seconds: count.default(0),
    leatherLeft: z
      .array(z.strictObject({ lotId: id, areaMm2 }))
      .max(50)
      .default([]),
    hardwareLeft: z
      .array(z.strictObject({ hardwareId: id, quantity: count }))
      .max(50)
      .default([]),
  }),
  reply: job,
});

export const pauseJob = endpoint({
  method: 'POST',
  path: '/jobs/{id}/pauses',
  summary: 'Lay the job aside',
  access: bench,
  creates: true,
  params: idParams,
  body: z.strictObject({}),
  reply: job,
});

export const resumeJob = endpoint({
  method: 'POST',
  path: '/jobs/{id}/resumptions',
  summary: 'Go on with a paused job',
  access: bench,
  creates: true,
  params: idParams,
  body: z.strictObject({}),
  reply: job,
});

export const compareJob = endpoint({
  method: 'GET',
  path: '/jobs/{id}/comparison',
  summary: 'Estimate and fact of a finished job, side by side',
  access: bench,
  params: idParams,
  reply: jobComparison,
});
