import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { id, idParams, instant, line, seconds, workedOut } from './fields.ts';
import { onceSound } from './once-sound.ts';

const reading = z.object({
  id,
  stepName: z.string(),
  seconds: workedOut,
  at: instant,
  personName: z.string(),
});
export type TimeReading = z.infer<typeof reading>;

/** A row of a ticket's log as a reading: the average over the pieces that it counts. */
const loggedReading = z.object({
  stepName: z.string(),
  seconds: workedOut,
  units: z.int().positive(),
  jobNumber: z.string(),
  at: instant,
  personName: z.string(),
});
export type LoggedReading = z.infer<typeof loggedReading>;

export const timeReadings = z
  .object({
    /** Newest first. */
    readings: z.array(reading),
    /** What the tickets of this pattern say, newest first. */
    logged: z.array(loggedReading),
  })
  .meta({ id: 'TimeReadings' });
export type TimeReadings = z.infer<typeof timeReadings>;

const someSeconds = seconds.refine(
  (text) => Number(text) > 0,
  onceSound('Enter seconds above 0, such as 4.5.'),
);

export const listTimeReadings = endpoint({
  method: 'GET',
  path: '/patterns/{id}/time-readings',
  summary: 'How long the steps of a pattern took, one by one',
  access: ['owner', 'maker'],
  params: idParams,
  reply: timeReadings,
});

export const addTimeReadings = endpoint({
  method: 'POST',
  path: '/patterns/{id}/time-readings',
  summary: 'Keep readings of a step, from a stopwatch or typed',
  access: ['owner', 'maker'],
  creates: true,
  params: idParams,
  body: z.strictObject({
    stepName: line(60, 'Choose a step.'),
    seconds: z
      .array(someSeconds)
      .min(1, 'Take at least one reading.')
      .max(200, 'Keep 200 readings at a time.'),
  }),
  reply: timeReadings,
});
