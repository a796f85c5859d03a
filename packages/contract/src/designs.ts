import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { count, day, id, idParams, page, pageQuery } from './fields.ts';

/** One customer's version of a pattern, as far as its numbers go by the customer's own runs. */
export const design = z
  .object({
    id,
    customerId: id,
    customerName: z.string(),
    patternId: id,
    patternName: z.string(),
    /** When its figures were taken from runs, and from how many. */
    learnedOn: day,
    runs: count,
  })
  .meta({ id: 'Design' });
export type Design = z.infer<typeof design>;

const idQuery = z.coerce.number().int().positive().optional();

export const listDesigns = endpoint({
  method: 'GET',
  path: '/designs',
  summary: 'Which customers’ designs go by their own runs',
  access: ['owner', 'maker'],
  query: pageQuery.omit({ q: true }).extend({ customerId: idQuery, patternId: idQuery }),
  reply: page(design),
});

export const dropDesign = endpoint({
  method: 'DELETE',
  path: '/designs/{id}',
  summary: 'Go by the pattern again',
  access: ['owner'],
  params: idParams,
  reply: z.object({ dropped: z.literal(true) }),
});
