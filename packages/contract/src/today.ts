import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import { day, paperNumber } from './fields.ts';
import { role } from './session.ts';

/** One thing that waits for this person. */
const toDo = z.object({
  kind: z.enum([
    'answer',
    'take on',
    'clear',
    'make',
    'check',
    'order',
    'too little',
    'count',
    'approve',
    'claim',
    'price',
    'receive',
    'ship',
    'invoice',
    'remind',
    'lock',
    'give back',
    'start',
  ]),
  title: z.string(),
  detail: z.string(),
  /** The day it hangs on, and what that day is: in hands, promised for, was due. */
  when: z.object({ word: z.string(), day }).nullable(),
  late: z.boolean(),
  /** The word on its button, and where that leads. */
  action: z.string(),
  to: z.string(),
});
export type ToDo = z.infer<typeof toDo>;

const promisedJob = z.object({
  number: paperNumber,
  title: z.string(),
  customerName: z.string(),
  state: z.string(),
  promisedOn: day,
  inHandsOn: day.nullable(),
  /** When its bench hours begin, by the hours there are. */
  startOn: day,
  /** 0 to 1. */
  doneShare: z.number(),
  late: z.boolean(),
  to: z.string(),
});
export type PromisedJob = z.infer<typeof promisedJob>;

const earnedHour = z.object({
  number: paperNumber,
  title: z.string(),
  finishedOn: day,
  perBenchHour: z.string(),
  perHourAllIn: z.string(),
});
export type EarnedHour = z.infer<typeof earnedHour>;

const shortItem = z.object({ name: z.string(), free: z.int(), reorderAt: z.int(), to: z.string() });
export type ShortItem = z.infer<typeof shortItem>;

/** What needs doing now, for the role that asks; a part that is not for the role is null. */
export const today = z
  .object({
    day,
    role,
    now: z.array(toDo),
    fourWeeks: z
      .object({
        from: day,
        until: day,
        promisedMinutes: z.string(),
        benchMinutes: z.string(),
        jobs: z.array(promisedJob),
      })
      .nullable(),
    owed: confidential(
      z
        .array(
          z.object({ age: z.enum(['not due', '1–30 days', '31–60', 'older']), amount: z.string() }),
        )
        .nullable(),
    ),
    earned: confidential(z.object({ target: z.string(), jobs: z.array(earnedHour) }).nullable()),
    short: z.array(shortItem).nullable(),
  })
  .meta({ id: 'Today' });
export type Today = z.infer<typeof today>;

export const readToday = endpoint({
  method: 'GET',
  path: '/today',
  summary: 'What needs doing now',
  access: ['owner', 'maker', 'bookkeeper'],
  reply: today,
});
