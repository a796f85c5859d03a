import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import { count, idParams, signedMoney } from './fields.ts';
import { stepUnits } from './work-plan.ts';

const parts = {
  /** Leather and hardware dearer (above 0) or cheaper than was said. */
  price: signedMoney,
  /** More or less of it than was said for the good pieces made. */
  usage: signedMoney,
  /** More or fewer pieces came out than were ordered. */
  made: signedMoney,
  /** Rounding, or what the estimate reckoned otherwise. */
  other: signedMoney,
  sum: signedMoney,
};

const boughtDifference = z.object({
  kind: z.enum(['leather', 'hardware']),
  name: z.string(),
  ...parts,
});
export type BoughtDifference = z.infer<typeof boughtDifference>;

const stepDifference = z.object({
  name: z.string(),
  per: z.enum(stepUnits),
  /** What the step really handled, counted per what it is counted per. */
  handled: count,
  saidMinutes: z.string(),
  /** Said for as many as it handled. */
  saidForMade: z.string(),
  /** Null where none were logged. */
  wasMinutes: z.string().nullable(),
  money: confidential(z.object({ time: signedMoney, made: signedMoney, wage: signedMoney })),
});
export type StepDifference = z.infer<typeof stepDifference>;

export const jobVariances = z
  .object({
    steps: z.array(stepDifference),
    /** Of all wages; null where no minutes were logged. */
    wages: confidential(z.object({ other: signedMoney, sum: signedMoney }).nullable()),
    /** Only what was taken from stock: of what was not, nothing is known. */
    bought: confidential(z.array(boughtDifference)),
    /** All of it together: what the run cost beyond what was said. */
    sum: confidential(signedMoney),
  })
  .meta({ id: 'JobVariances' });
export type JobVariances = z.infer<typeof jobVariances>;

export const readVariances = endpoint({
  method: 'GET',
  path: '/jobs/{id}/variances',
  summary: 'Why a finished job took and cost other than was said, step by step',
  access: ['owner', 'maker'],
  params: idParams,
  reply: jobVariances,
});
