import { quoteTerms, type Quote as QuoteReply } from '@hidewright/contract';
import type { Layout, RunInput } from '@hidewright/domain';
import { notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { pathOf } from '../layouts/stored-layouts.ts';
import { whyNoMail } from './why-no-mail.ts';
import type { Quote } from './quote.entity.ts';
import { numbersOfQuote } from './quote-numbers.ts';
import { quotedOf } from './quoted.ts';

/**
 * A quote with all that its screen shows.
 * @param mailAvailable whether a mail server is set
 */
export async function quoteReply(
  work: Work,
  quote: Quote,
  mailAvailable: boolean,
): Promise<QuoteReply> {
  const about = await readAbout(work, quote.id);
  const { breaks } = quotedOf(quote);
  const input = quote.input as RunInput;
  return {
    ...ownFields(quote),
    customerName: about.customerName,
    patternId: about.patternId,
    patternName: about.patternName,
    patternVersion: about.patternVersion,
    orderId: about.orderId,
    orderNumber: about.orderNumber,
    orderCancelled: about.orderCancelled === 1,
    layout: JSON.parse(about.layout) as Layout,
    outlinePath: pathOf({ input: JSON.parse(about.laidOut) }),
    breaks,
    tooling: input.tooling,
    input,
    numbers: numbersOfQuote(quote),
    customerEmail: about.customerEmail,
    cannotMail: whyNoMail({ name: about.customerName, email: about.customerEmail }, mailAvailable),
    letter: about.letter === null ? null : (JSON.parse(about.letter) as QuoteReply['letter']),
    link: about.linkExpiresAt === null ? null : { expiresAt: about.linkExpiresAt },
    revisions: JSON.parse(about.revisions) as QuoteReply['revisions'],
  };
}

function ownFields(quote: Quote) {
  return {
    id: quote.id,
    number: quote.number,
    revision: quote.revision,
    state: quote.state,
    customerId: quote.customerId,
    layoutId: quote.layoutId,
    title: quote.title,
    inHandsOn: quote.inHandsOn,
    validUntil: quote.validUntil,
    createdAt: quote.createdAt,
    sentAt: quote.sentAt,
    agreedAt: quote.agreedAt,
    agreedQuantity: quote.agreedQuantity,
    agreedHow: quote.agreedHow as QuoteReply['agreedHow'],
    agreedOption: quote.agreedOption,
    terms: quoteTerms.parse(quote.terms),
    overrides: quote.overrides,
    message: quote.message,
    version: quote.version,
  };
}

interface About {
  customerName: string;
  customerEmail: string;
  patternId: number;
  patternName: string;
  patternVersion: number;
  layout: string;
  laidOut: string;
  orderId: number | null;
  orderNumber: string | null;
  orderCancelled: 0 | 1 | null;
  letter: string | null;
  linkExpiresAt: string | null;
  revisions: string;
}

/** All around a quote in one statement: a screen shows it after every change. */
async function readAbout({ em, now }: Work, quoteId: number): Promise<About> {
  const [about] = await em.execute<About[]>(
    `SELECT c.name AS customerName, c.email AS customerEmail, p.id AS patternId, p.name AS patternName,
      v.number AS patternVersion, l.result AS layout, l.input AS laidOut, o.id AS orderId, o.number AS orderNumber,
      o.state = 'cancelled' AS orderCancelled,
      (SELECT json_object('state', state, 'recipient', recipient, 'sentAt', sent_at, 'lastError', last_error)
        FROM outgoing_mail WHERE subject_kind = 'quote' AND subject_id = q.id ORDER BY id DESC LIMIT 1) AS letter,
      (SELECT MAX(expires_at) FROM customer_link
        WHERE quote_id = q.id AND revoked_at IS NULL AND expires_at > ?) AS linkExpiresAt,
      (SELECT json_group_array(json_object('id', id, 'revision', revision, 'state', state) ORDER BY revision DESC)
        FROM quote WHERE number = q.number AND id <> q.id) AS revisions
    FROM quote q JOIN customer c ON c.id = q.customer_id JOIN pattern_version v ON v.id = q.pattern_version_id
      JOIN pattern p ON p.id = v.pattern_id JOIN layout l ON l.id = q.layout_id
      LEFT JOIN customer_order o ON o.quote_id = q.id
    WHERE q.id = ?`,
    [now.toISOString(), quoteId],
  );
  if (about === undefined) throw notFound('quote');
  return about;
}
