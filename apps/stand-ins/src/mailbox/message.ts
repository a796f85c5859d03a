import { simpleParser, type AddressObject, type Attachment } from 'mailparser';
import { linksIn } from './links.ts';

export interface Message {
  id: string;
  from: string;
  to: string;
  subject: string;
  /** When it was sent, by its own word; when it came, if it does not say. */
  date: string;
  text: string;
  html: string | undefined;
  links: string[];
  attachments: Attachment[];
}

export async function readMessage(id: string, raw: Buffer): Promise<Message> {
  const mail = await simpleParser(raw, { skipTextLinks: true, skipTextToHtml: true });
  const text = mail.text ?? '';
  const html = mail.html || undefined;
  return {
    id,
    from: addresses(mail.from),
    to: addresses(mail.to) || mail.headerLines.filter(isDelivery).map(deliveredTo).join(', '),
    subject: mail.subject ?? '(no subject)',
    date: (mail.date ?? new Date(Number(id.split('-')[0]))).toISOString(),
    text,
    html,
    links: linksIn(text, html),
    attachments: mail.attachments,
  };
}

function addresses(found: AddressObject | AddressObject[] | undefined): string {
  const groups = found === undefined ? [] : [found].flat();
  return groups
    .flatMap((group) => group.value)
    .map((one) => one.address ?? '')
    .join(', ');
}

function isDelivery({ key }: { key: string }): boolean {
  return key === 'delivered-to';
}

function deliveredTo({ line }: { line: string }): string {
  return line.slice(line.indexOf(':') + 1).trim();
}
