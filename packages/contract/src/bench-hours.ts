import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { day, id, paperNumber } from './fields.ts';

/** One day of the bench: what there is, and what open jobs will need of it, earliest promise first. */
const benchDay = z
  .object({
    day,
    minutes: z.string(),
    planned: z.array(
      z.object({ jobId: id, number: paperNumber, title: z.string(), minutes: z.string() }),
    ),
    /** Logged already on that day. */
    loggedMinutes: z.string(),
    freeMinutes: z.string(),
    /** Jobs promised for that day. */
    promised: z.array(z.object({ jobId: id, number: paperNumber, title: z.string() })),
  })
  .meta({ id: 'BenchDay' });
export type BenchDay = z.infer<typeof benchDay>;

export const benchHours = z
  .object({
    days: z.array(benchDay),
    /** Jobs that cannot be done by their promised day at the shop's hours. */
    late: z.array(
      z.object({
        jobId: id,
        number: paperNumber,
        title: z.string(),
        promisedOn: day,
        minutesShort: z.string(),
      }),
    ),
  })
  .meta({ id: 'BenchHours' });
export type BenchHours = z.infer<typeof benchHours>;

export const readBenchHours = endpoint({
  method: 'GET',
  path: '/bench-hours',
  summary: 'The calendar of bench hours: each day’s hours and which job will need them',
  access: ['owner', 'maker'],
  query: z.strictObject({ days: z.coerce.number().int().min(1).max(60).default(14) }),
  reply: benchHours,
});
