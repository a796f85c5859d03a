import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import { Problem } from '../../http/problem.ts';

const windowMs = 60_000;

/** A link's token cannot be guessed; this keeps anyone from trying, and from asking for too much. */
export function linkLimit(): RequestHandler {
  return rateLimit({
    windowMs,
    limit: 60,
    standardHeaders: false,
    legacyHeaders: false,
    handler: () => {
      throw new Problem(
        429,
        'Too often',
        'This was asked for too often. Wait a minute, then try again.',
        {
          headers: { 'Retry-After': String(windowMs / 1000) },
        },
      );
    },
  });
}
