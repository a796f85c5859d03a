import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import type { Context } from '../../context.ts';
import { Problem } from '../../http/problem.ts';

const windowMs = 15 * 60_000;

/** Limits failed tries, by account and by address; a sign-in that succeeds is not counted. */
export function signInLimits(context: Context): RequestHandler[] {
  const limit = context.config.signInLimit;
  return [
    limitBy(limit, accountOf),
    limitBy(limit * 5, (request) => ipKeyGenerator(request.ip ?? '')),
  ];
}

function limitBy(limit: number, keyGenerator: (request: Request) => string): RequestHandler {
  return rateLimit({
    windowMs,
    limit,
    keyGenerator,
    skipSuccessfulRequests: true,
    standardHeaders: false,
    legacyHeaders: false,
    handler: () => {
      throw new Problem(
        429,
        'Too many tries',
        'Too many tries to sign in. Wait a quarter of an hour, then try again.',
        {
          headers: { 'Retry-After': String(windowMs / 1000) },
        },
      );
    },
  });
}

function accountOf(request: Request): string {
  const body: unknown = request.body;
  const email = typeof body === 'object' && body !== null && 'email' in body ? body.email : '';
  return typeof email === 'string' ? email.trim().toLowerCase() : '';
}
