import { z } from 'zod';

/** An error as RFC 9457 has it, with a sentence for each field that must change. */
export const problem = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    detail: z.string().optional(),
    errors: z.array(z.object({ field: z.string(), message: z.string() })).optional(),
    /** On 409: what may be done now instead. */
    allowed: z.array(z.string()).optional(),
    /** On 412: who changed it meanwhile, and what. */
    changed: z.object({ by: z.string(), at: z.string(), what: z.string() }).optional(),
    requestId: z.string().optional(),
  })
  .meta({ id: 'Problem' });
export type ProblemBody = z.infer<typeof problem>;
