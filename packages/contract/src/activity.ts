import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { instant, page, pageQuery } from './fields.ts';

export const activity = z
  .object({
    seq: z.int(),
    at: instant,
    actorName: z.string(),
    actorRole: z.string(),
    /** In words that follow the name. */
    action: z.string(),
    subjectKind: z.string(),
  })
  .meta({ id: 'Activity' });
export type Activity = z.infer<typeof activity>;

export const listActivities = endpoint({
  method: 'GET',
  path: '/activities',
  summary: 'The log of who did what',
  access: ['owner'],
  query: pageQuery,
  reply: page(activity),
});
