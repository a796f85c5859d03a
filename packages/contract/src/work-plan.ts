import { z } from 'zod';
import { confidential } from './confidential.ts';
import { line, minutes, percent, runQuantity, seconds, unitPrice } from './fields.ts';
import { onceSound } from './once-sound.ts';

/** What a step is counted per. */
export const stepUnits = ['piece', 'strike', 'panel', 'strip', 'run'] as const;

const rejectPercent = percent.refine(
  (text) => Number(text) <= 99,
  onceSound('Enter rejects from 0 to 99 %.'),
);

export const workStep = z.strictObject({
  name: line(60, 'Enter what is done, such as cut or set rivets.'),
  setupMinutes: minutes,
  secondsPerUnit: seconds,
  per: z.enum(stepUnits, 'Choose what the step is counted per.'),
  rejectPercent,
  people: z
    .int('Enter a whole number.')
    .min(1, 'Enter 1 or more people.')
    .max(20, 'Enter at most 20 people.')
    .optional(),
  /** Nobody stands by while it runs. */
  unattended: z.boolean().optional(),
  /** How long pieces must, and how long they may, lie before the next step. */
  shortestWait: minutes.nullish(),
  longestWait: minutes.nullish(),
  /** Paid for each unit in place of by the hour. */
  pieceRate: confidential(unitPrice.nullable()),
});

const curveSentence = 'Enter a curve above 50 %, up to 100 %, such as 90.';
const learning = z.strictObject({
  model: z.enum(['unit', 'cumulative'], 'Choose a learning model.'),
  curvePercent: z
    .string(curveSentence)
    .trim()
    .regex(/^\d{2,3}(\.\d{1,2})?$/, curveSentence)
    .refine((text) => Number(text) > 50 && Number(text) <= 100, curveSentence),
  measuredAt: runQuantity,
});

const wholePlan = {
  /** Pieces good enough to sell for less, of those cut. */
  secondsPercent: rejectPercent.optional(),
  learning: learning.nullish(),
};

const perHundred = 'Enter how many minutes 100 pieces take, such as 180 or 92.5.';
const takesTime = (text: string) => minutes.safeParse(text).success && Number(text) > 0;

/** How long the work takes: one figure for 100 pieces to begin with, or step by step. The domain's WorkPlan. */
export const workPlan = z.discriminatedUnion(
  'kind',
  [
    z.strictObject({
      kind: z.literal('minutesPer100'),
      minutes: z.string(perHundred).trim().refine(takesTime, perHundred).meta({ example: '180' }),
      rejectPercent,
      ...wholePlan,
    }),
    z.strictObject({
      kind: z.literal('steps'),
      ...wholePlan,
      steps: z.array(workStep).min(1, 'Enter at least one step.').max(40, 'Keep it to 40 steps.'),
    }),
  ],
  'Choose minutes per 100, or steps.',
);
