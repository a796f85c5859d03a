import type { RequestHandler } from 'express';
import type { Config } from '../config.ts';
import { Problem } from './problem.ts';

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Changes are taken only from our own pages, or from a program that is no browser. */
export function sameOrigin(config: Config): RequestHandler {
  return (request, _response, next) => {
    if (safeMethods.has(request.method)) {
      next();
      return;
    }
    const site = request.get('Sec-Fetch-Site');
    const origin = request.get('Origin');
    const ours = [`${request.protocol}://${request.get('Host') ?? ''}`, config.publicUrl];
    const foreign =
      (site !== undefined && site !== 'same-origin' && site !== 'none') ||
      (origin !== undefined && !ours.includes(origin));
    if (foreign) {
      throw new Problem(
        403,
        'Not from here',
        'This request comes from another site. Open Hidewright itself and try again.',
      );
    }
    next();
  };
}
