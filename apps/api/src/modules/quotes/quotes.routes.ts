import { Router } from 'express';
import {
  agreeQuote as agreement,
  changeQuote as change,
  createQuote as creation,
  declineQuote as refusal,
  listQuotes,
  quotePaper,
  readQuote,
  renewLink,
  reviseQuote as revision,
  revokeLink,
  sendQuote as sending,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { agreeQuote } from '../../flows/agree-quote.ts';
import { changeQuote } from '../../flows/change-quote.ts';
import { createQuote } from '../../flows/create-quote.ts';
import { declineQuote } from '../../flows/decline-quote.ts';
import { handOverQuote, type HandedOver, type Way } from '../../flows/hand-over-quote.ts';
import { layPattern, type LaidPattern } from '../../flows/lay-pattern.ts';
import { putQuoteOnPaper, type QuoteOnPaper } from '../../flows/put-quote-on-paper.ts';
import { reviseQuote } from '../../flows/revise-quote.ts';
import { sendQuote } from '../../flows/send-quote.ts';
import { requireVersion } from '../../http/conditions.ts';
import { serve, serveFile } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { revokeLinks } from '../links/customer-links.ts';
import { findQuote } from './find-quote.ts';
import { paperOf } from './quote-paper.ts';
import { quoteReply } from './quote-reply.ts';
import { requirePossible } from './quote-states.ts';
import type { Quote } from './quote.entity.ts';
import { listQuoteRows } from './quotes.repository.ts';
import { runBasisRoute } from './run-basis.routes.ts';

export function quoteRoutes(context: Context): Router {
  const router = Router();
  const mailAvailable = context.mailer.available;
  const told = (work: Work, quote: Quote) => quoteReply(work, quote, mailAvailable);
  const handed = async (work: Work, { quote, linkUrl, text }: HandedOver) => ({
    quote: await told(work, quote),
    linkUrl,
    text,
  });
  const way = (by: Way['by'], origin: string): Way => ({
    by,
    origin: context.config.publicUrl ?? origin,
    mailAvailable,
  });

  serve(router, context, listQuotes, async (work, { query }) => listQuoteRows(work, query));

  serve(router, context, readQuote, async (work, { params }) =>
    told(work, await findQuote(work, params.id)),
  );

  runBasisRoute(router, context);

  serve(
    router,
    context,
    creation,
    async (work, { body }, laid: LaidPattern) => told(work, await createQuote(work, body, laid)),
    ({ body }) => layPattern(context, body.patternId),
  );

  serve(
    router,
    context,
    change,
    async (work, { params, body, ifMatch }, laid: LaidPattern) => {
      const quote = await findVersion(work, params.id, ifMatch);
      return told(work, await changeQuote(work, quote, body, laid));
    },
    ({ body }) => layPattern(context, body.patternId),
  );

  serve(
    router,
    context,
    sending,
    async (work, { params, body, ifMatch, origin }, drawn: QuoteOnPaper) => {
      await findVersion(work, params.id, ifMatch);
      return handed(work, await sendQuote(work, params.id, way(body.by, origin), drawn));
    },
    ({ params }, actor) => putQuoteOnPaper(context, actor, params.id),
  );

  serve(
    router,
    context,
    renewLink,
    async (work, { params, body, origin }, drawn: QuoteOnPaper) => {
      const quote = await findQuote(work, params.id);
      requirePossible(quote, 'share');
      const handedOver = await handOverQuote(work, quote, way(body.by, origin), drawn);
      await logLink(work, quote, `sent quote ${quote.number} again`);
      return handed(work, handedOver);
    },
    ({ params }, actor) => putQuoteOnPaper(context, actor, params.id),
  );

  serve(router, context, revokeLink, async (work, { params }) => {
    const quote = await findQuote(work, params.id);
    const stopped = await revokeLinks(work, quote.id);
    if (stopped > 0) await logLink(work, quote, `stopped the link to quote ${quote.number}`);
    return told(work, quote);
  });

  serve(router, context, agreement, async (work, { params, body }) =>
    told(work, await agreeQuote(work, { quoteId: params.id, ...body })),
  );

  serve(router, context, refusal, async (work, { params, body }) =>
    told(work, await declineQuote(work, { quoteId: params.id, ...body })),
  );

  serve(router, context, revision, async (work, { params }) =>
    told(work, await reviseQuote(work, params.id)),
  );

  serveFile(router, context, quotePaper, async (work, { params }) => {
    const paper = await paperOf(work, await findQuote(work, params.id));
    const name = `${paper.number.replace(', revision ', '-')}.pdf`;
    return { name, type: 'application/pdf', bytes: await context.papers.quote(paper) };
  });

  return router;
}

async function findVersion(work: Work, id: number, ifMatch: number): Promise<Quote> {
  const quote = await findQuote(work, id);
  await requireVersion(work.em, { kind: 'quote', id, version: quote.version }, ifMatch);
  return quote;
}

const logLink = (work: Work, quote: Quote, action: string) =>
  logDeed(work, { action, subjectKind: 'quote', subjectId: quote.id });
