import { z } from 'zod';
import { line, minutes, percent, seconds } from './fields.ts';

/** What a step is counted per. */
export const stepUnits = ['piece', 'strike', 'panel', 'strip', 'run'] as const;

const rejectPercent = percent.refine((text) => Number(text) <= 99, 'Enter rejects from 0 to 99 %.');

export const workStep = z.strictObject({
  name: line(60, 'Enter what is done, such as cut or set rivets.'),
  per: z.enum(stepUnits, 'Choose what the step is counted per.'),
  setupMinutes: minutes,
  secondsPerUnit: seconds,
  rejectPercent,
});
export type WorkStep = z.infer<typeof workStep>;

/** How long the work takes: one figure to begin with, or step by step. */
export const workPlan = z.discriminatedUnion(
  'by',
  [
    z.strictObject({
      by: z.literal('minutes per 100'),
      minutesPer100: minutes.refine((text) => Number(text) > 0, 'Enter how many minutes 100 pieces take.'),
    }),
    z.strictObject({
      by: z.literal('steps'),
      steps: z
        .array(workStep)
        .min(1, 'Enter at least one step.')
        .max(40, 'Keep it to 40 steps.'),
    }),
  ],
  'Choose minutes per 100, or steps.',
);
export type TypedWorkPlan = z.infer<typeof workPlan>;
