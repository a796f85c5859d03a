import { invalid } from '../http/problem.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { noteFile } from '../modules/files/stored-files.ts';
import { issueLink } from '../modules/links/customer-links.ts';
import { enqueueMail } from '../modules/mail/outbox.ts';
import { quoteLetter } from '../modules/quotes/quote-letter.ts';
import type { Quote } from '../modules/quotes/quote.entity.ts';
import { whyNoMail } from '../modules/quotes/why-no-mail.ts';
import type { Work } from '../work.ts';
import type { QuoteOnPaper } from './put-quote-on-paper.ts';

/** How a quote reaches its customer. */
export interface Way {
  by: 'mail' | 'hand';
  /** Where the customer's browser finds the shop, such as https://quotes.example.com: for the words of the link alone. */
  origin: string;
  /** Whether a mail server is set. */
  mailAvailable: boolean;
}

export interface HandedOver {
  quote: Quote;
  /** Told once: only its hash is kept. */
  linkUrl: string;
  text: string;
}

/**
 * Makes a link for the customer and puts it into a mail, or hands it back to be copied.
 * @throws {Problem} 422 when it should go by mail and cannot
 */
export async function handOverQuote(
  work: Work,
  quote: Quote,
  way: Way,
  drawn: QuoteOnPaper,
): Promise<HandedOver> {
  const customer = await work.em.findOneOrFail(Customer, quote.customerId);
  if (way.by === 'mail') requireMailable(customer, way);
  const token = await issueLink(work, quote.id, drawn.paper.validUntil);
  const linkUrl = `${way.origin}/c/${token}`;
  const { subject, text } = quoteLetter(
    drawn.paper,
    linkUrl,
    customer.contactName || customer.name,
  );
  await noteFile(work, drawn.file);
  if (way.by === 'mail') {
    const { name, hash, type } = drawn.file;
    await enqueueMail(work, {
      recipient: customer.email,
      subject,
      body: text,
      attachments: [{ name, hash, type }],
      subjectKind: 'quote',
      subjectId: quote.id,
    });
  }
  return { quote, linkUrl, text };
}

function requireMailable(customer: Customer, way: Way): void {
  const message = whyNoMail(customer, way.mailAvailable);
  if (message !== null) throw invalid([{ field: 'by', message }]);
}
