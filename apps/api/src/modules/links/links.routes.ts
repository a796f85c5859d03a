import { Router } from 'express';
import { agreeOffer, readOffer } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { agreeQuote } from '../../flows/agree-quote.ts';
import { serve } from '../../http/serve.ts';
import { linkLimit } from './link-limit.ts';
import { offerOf, quoteIdBehind } from './offer.ts';

/** The customer's side: no account, only a link; reading changes nothing, agreeing is a POST. */
export function linkRoutes(context: Context): Router {
  const router = Router();
  router.use('/links', linkLimit());

  serve(router, context, readOffer, async (work, { params }) =>
    offerOf(work, await quoteIdBehind(work, params.token)),
  );

  serve(router, context, agreeOffer, async (work, { params, body }) => {
    const quoteId = await quoteIdBehind(work, params.token);
    const byCustomer = {
      ...work,
      actor: { id: null, name: 'The customer', role: 'customer' as const },
    };
    await agreeQuote(byCustomer, { quoteId, ...body, how: 'link' });
    return offerOf(work, quoteId);
  });

  return router;
}
