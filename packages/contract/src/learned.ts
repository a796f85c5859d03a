import { hardwarePers } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { design } from './designs.ts';
import { endpoint } from './endpoint.ts';
import { count, day, id, idParams, paperNumber, version, workedOut } from './fields.ts';
import { stepUnits } from './work-plan.ts';

const pastRun = z.object({
  jobId: id,
  number: paperNumber,
  finishedOn: day,
  patternVersion: count,
  quantity: count,
  cut: count,
  good: count,
  seconds: count,
  /** Null where no minutes were logged. */
  minutes: workedOut.nullable(),
  minutesPer100: workedOut.nullable(),
  /** Null where nobody counted at the bench: then nothing is known of them. */
  rejects: count.nullable(),
  rejectPercent: workedOut.nullable(),
  customerName: z.string(),
  /** Leather that was used for each good piece; null where none was taken. */
  leatherPerGoodMm2: workedOut.nullable(),
  /** Why it looks unlike the others; it counts all the same, unless it is left out. */
  unusual: z.enum(['slow', 'quick', 'many rejects']).nullable(),
  mixedIn: z.boolean(),
});
export type PastRun = z.infer<typeof pastRun>;

const pooledRejects = z.object({
  percent: workedOut,
  lowPercent: workedOut,
  highPercent: workedOut,
  rejected: count,
  reached: count,
});

const pooledMinutes = z.object({
  per100: workedOut,
  sd: workedOut.nullable(),
  pieces: count,
  runs: count,
});

const learnedStep = z.object({
  /** 1 and up, in the order of the work. */
  position: count,
  name: z.string(),
  per: z.enum(stepUnits),
  said: z.object({
    setupMinutes: workedOut,
    secondsPerUnit: workedOut,
    rejectPercent: workedOut,
  }),
  /** Null where no run logged this step: it keeps its values. */
  time: z
    .object({ setupMinutes: workedOut, secondsPerUnit: workedOut, units: count, runs: count })
    .nullable(),
  /** Null where no run counted pieces at this step. */
  rejects: pooledRejects.nullable(),
});
export type LearnedStep = z.infer<typeof learnedStep>;

const pooledLeather = z.object({
  extraPercent: workedOut,
  leastPercent: workedOut,
  mostPercent: workedOut,
  runs: count,
});

const pooledLosses = z.object({ percent: workedOut, needed: count, taken: count, runs: count });

/** What the last finished runs of a pattern say its next estimate should be. */
export const learned = z
  .object({
    patternId: id,
    patternName: z.string(),
    versionNumber: count,
    /** Whose runs these are: one customer's, or everybody's. */
    customerId: id.nullable(),
    customers: z.array(z.object({ id, name: z.string(), runs: count })),
    /** That this customer's quotes go by their own runs, and since when. */
    design: design.nullable(),
    /** The pattern's way of working: one figure, or step by step. */
    by: z.enum(['minutesPer100', 'steps']),
    /** Newest first. */
    runs: z.array(pastRun),
    minutes: z.object({ said: workedOut.nullable(), found: pooledMinutes.nullable() }),
    rejects: z.object({ said: workedOut, found: pooledRejects.nullable() }),
    /** One for each step of the pattern as it is now; none where it has one figure. */
    steps: z.array(learnedStep),
    /** For each good piece: as the layout and the reject rate have it, and as it was. */
    leather: z.object({
      saidMm2: workedOut.nullable(),
      foundMm2: workedOut.nullable(),
      /** On top of the layout, per cent. */
      saidExtraPercent: workedOut,
      extra: pooledLeather.nullable(),
    }),
    hardware: z.array(
      z.object({
        hardwareId: id,
        name: z.string(),
        /** What the pattern counts it for, and so this does: good pieces, or runs. */
        per: z.enum(hardwarePers),
        said: count,
        found: workedOut.nullable(),
        saidLossPercent: workedOut,
        losses: pooledLosses.nullable(),
      }),
    ),
    /** What leather and hardware of each good piece really took from the stock's worth. */
    money: confidential(
      z.object({ leatherPerGood: workedOut.nullable(), hardwarePerGood: workedOut.nullable() }),
    ),
    /** Whether taking all rejects keeps the pieces behind them, and if not, which step stands in the way. */
    history: z.object({
      good: count.nullable(),
      of: count.nullable(),
      uncounted: z.array(z.string()),
    }),
    version,
  })
  .meta({ id: 'Learned' });
export type Learned = z.infer<typeof learned>;

const mostRuns = 8;
const without = z
  .string()
  .regex(/^\d{1,15}(,\d{1,15}){0,7}$/, 'Name the jobs to leave out by their ids.')
  .transform((text) => text.split(',').map(Number));

export const readLearned = endpoint({
  method: 'GET',
  path: '/patterns/{id}/learned',
  summary: 'What the last runs of a pattern say its next estimate should be',
  access: ['owner', 'maker'],
  params: idParams,
  query: z.strictObject({
    without: without.optional(),
    /** Only this customer's runs. */
    customerId: z.coerce.number().int().positive().optional(),
  }),
  reply: learned,
});

export const takeLearned = endpoint({
  method: 'POST',
  path: '/patterns/{id}/learned',
  summary:
    'Make what the last runs say a new version of the pattern, or the estimate of one customer’s design',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({
    without: z.array(id).max(mostRuns).default([]),
    /** For this customer's design only; the pattern stays as it is. */
    customerId: id.nullable().default(null),
    take: z
      .array(
        z.strictObject({
          what: z.enum(['minutes', 'rejects', 'leather', 'hardware']),
          /** Which step, from 1; null where the pattern has one figure for all of it. */
          step: z.int().positive().max(40).nullable(),
          /** Which hardware, where it is that. */
          hardwareId: id.nullable().default(null),
        }),
      )
      .min(1, 'Choose at least one figure to use.')
      .max(80),
  }),
  reply: learned,
});
