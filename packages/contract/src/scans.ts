import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { id } from './fields.ts';

export const scanned = z
  .object({
    kind: z.enum(['lot', 'hardware', 'purchase order', 'order', 'job']),
    id,
    /** As it is written where it belongs, whatever was typed. */
    tag: z.string(),
    name: z.string(),
    /** Where it is shown. */
    to: z.string(),
  })
  .meta({ id: 'Scanned' });
export type Scanned = z.infer<typeof scanned>;

export const readScan = endpoint({
  method: 'GET',
  path: '/scans/{code}',
  summary: 'What a scanned or typed tag belongs to: a lot, a bin, an order or a job',
  access: ['owner', 'maker', 'bookkeeper'],
  params: z.strictObject({ code: z.string().min(1).max(500) }),
  reply: scanned,
});
