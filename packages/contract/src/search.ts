import { z } from 'zod';
import { endpoint } from './endpoint.ts';

export const found = z
  .object({
    kind: z.enum([
      'quote',
      'order',
      'job',
      'invoice',
      'customer',
      'pattern',
      'lot',
      'hardware',
      'purchase order',
    ]),
    label: z.string(),
    detail: z.string(),
    /** Where it is shown. */
    to: z.string(),
  })
  .meta({ id: 'Found' });
export type Found = z.infer<typeof found>;

export const search = endpoint({
  method: 'GET',
  path: '/search',
  summary: 'Find a number, customer, pattern, tag or part',
  access: ['owner', 'maker', 'bookkeeper'],
  query: z.strictObject({ q: z.string().trim().min(1, 'Type what you are looking for.').max(100) }),
  reply: z.object({ items: z.array(found) }),
});
