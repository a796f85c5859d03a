import { z } from 'zod';
import { line, minutes, percent, seconds } from './fields.ts';
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
});

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
    }),
    z.strictObject({
      kind: z.literal('steps'),
      steps: z.array(workStep).min(1, 'Enter at least one step.').max(40, 'Keep it to 40 steps.'),
    }),
  ],
  'Choose minutes per 100, or steps.',
);
