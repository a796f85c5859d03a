import { InvalidInput, readWeek } from '@hidewright/domain';
import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { line, minutes, money, signedMoney, workedOut } from './fields.ts';

const twoPlaces = (whole: number) => new RegExp(`^(0|[1-9]\\d{0,${whole - 1}})(\\.\\d{1,2})?$`);

const hoursSentence = 'Enter hours a week, such as 90 or 37.5.';
const hours = z
  .string(hoursSentence)
  .trim()
  .regex(twoPlaces(4), hoursSentence)
  .meta({ example: '90' });
const unitsSentence = 'Enter how many a week, such as 2 or 0.5.';
const units = z
  .string(unitsSentence)
  .trim()
  .regex(twoPlaces(5), unitsSentence)
  .meta({ example: '1.5' });

/** A kind of work of the week; the domain's KindOfWork. */
const kindOfWork = z.strictObject({
  name: line(60, 'Enter what is made, such as Luggage tags.'),
  kind: z.enum(['run', 'large piece'], 'Choose run or large piece.'),
  benchMinutes: minutes.refine(
    (text) => Number(text) > 0,
    'Enter how many minutes it takes, above 0.',
  ),
  deskMinutes: minutes,
  /** Of one run or piece, after everything bought, before wages. */
  left: signedMoney,
  /** Null: any number can be sold. */
  mostPerWeek: units.nullable(),
  leastPerWeek: units,
});
export type KindOfWorkTyped = z.infer<typeof kindOfWork>;

const weekFields = z.strictObject({
  /** All hands together, desk time included. */
  hoursPerWeek: hours.refine((text) => Number(text) > 0, hoursSentence),
  /** Desk time that belongs to no order. */
  deskHoursPerWeek: hours,
  /** What must be left in the week, before wages. */
  incomeNeeded: money,
  kinds: z
    .array(kindOfWork)
    .min(1, 'Enter at least one kind of work.')
    .max(40, 'Keep it to 40 kinds of work.'),
});
/** What no field can tell alone, as that more is promised than there are hours for: the domain's own sentence. */
const week = weekFields.superRefine((typed, context) => {
  if (context.issues.length > 0) return;
  try {
    readWeek(typed);
  } catch (error) {
    if (!(error instanceof InvalidInput)) throw error;
    context.addIssue({ code: 'custom', path: pathOf(error.field), message: error.message });
  }
});

const pathOf = (field: string) =>
  field.split('.').map((part) => (/^\d+$/.test(part) ? Number(part) : part));
export type WeekTyped = z.infer<typeof week>;

const mixedKind = z.object({
  name: z.string(),
  kind: z.enum(['run', 'large piece']),
  units: workedOut,
  benchHours: workedOut,
  deskHours: workedOut,
  left: workedOut,
  leftPerHour: workedOut,
  at: z.enum(['most', 'least']).nullable(),
});

export const weekMix = z
  .object({
    kinds: z.array(mixedKind),
    hours: z.object({ all: workedOut, deskFirst: workedOut, free: workedOut }),
    left: workedOut,
    averagePerHour: workedOut.nullable(),
    oneMoreHour: z.object({ left: workedOut, into: z.array(z.string()) }),
    income: z.object({
      needed: workedOut,
      reached: z.boolean(),
      short: workedOut,
      hoursShort: workedOut.nullable(),
    }),
    largePieces: z.object({ hours: workedOut, atMost: workedOut.nullable() }),
  })
  .meta({ id: 'WeekMix' });
export type WeekMixReply = z.infer<typeof weekMix>;

export const weekStart = z
  .object({
    week: z.object({
      hoursPerWeek: z.string(),
      deskHoursPerWeek: z.string(),
      incomeNeeded: z.string(),
      kinds: z.array(kindOfWork),
    }),
    wagePerHour: z.string(),
    /** What the kinds of work were read from. */
    from: z.object({ runs: z.int(), weeks: z.int() }),
  })
  .meta({ id: 'WeekStart' });
export type WeekStart = z.infer<typeof weekStart>;

export const startWeekMix = endpoint({
  method: 'GET',
  path: '/week-mixes/start',
  summary:
    'What a week’s mix can begin with: the shop’s hours, and what its finished runs took and left',
  access: ['owner'],
  reply: weekStart,
});

export const workOutWeekMix = endpoint({
  method: 'POST',
  path: '/week-mixes',
  summary: 'The mix of runs and large pieces that leaves most of a week’s hours',
  access: ['owner'],
  body: week,
  reply: weekMix,
});
