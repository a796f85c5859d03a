import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { leaseMail } from '../modules/mail/outbox.ts';
import { OutgoingMail } from '../modules/mail/outgoing-mail.entity.ts';
import { draftQuote, readyToQuote, type QuotingShop } from '../testing/example-quote.ts';
import { startLocalSmtp } from '../testing/local-smtp.ts';
import { startTestShop } from '../testing/test-shop.ts';
import { inTransaction, theProgram } from '../work.ts';
import { sendDueMail } from './outbox.ts';

let ready: QuotingShop;
let shop: QuotingShop['shop'];
let smtp: Awaited<ReturnType<typeof startLocalSmtp>>;
const start = Date.parse('2026-12-01T09:00:00.000Z');

beforeAll(async () => {
  smtp = await startLocalSmtp();
  shop = await startTestShop({ SMTP_URL: smtp.url, PUBLIC_URL: 'http://quotes.example.com' });
  ready = await readyToQuote(shop);
});
afterAll(async () => {
  await shop.close();
  await smtp.close();
});
beforeEach(() => {
  smtp.mails.length = 0;
  smtp.refuse = false;
  shop.clock.set(new Date(start));
});

async function mailQuote() {
  const quote = await draftQuote(ready);
  const { body } = await shop
    .as('owner')
    .post(`/api/quotes/${quote.id}/sendings`)
    .set('If-Match', `"${quote.version}"`)
    .send({ by: 'mail' })
    .expect(200);
  return body as { quote: { id: number; number: string; version: number }; linkUrl: string };
}

const mailOf = (quoteId: number) =>
  shop.context.orm.em
    .fork()
    .findOneOrFail(OutgoingMail, { subjectKind: 'quote', subjectId: quoteId });
const letterOf = async (quoteId: number) =>
  (await shop.as('owner').get(`/api/quotes/${quoteId}`)).body.letter;

describe('the outbox', () => {
  it('really sends a quote, from the shop’s name, with the link and the quote as PDF', async () => {
    const { quote, linkUrl } = await mailQuote();
    expect(linkUrl).toMatch(/^http:\/\/quotes\.example\.com\/c\//);
    expect(await letterOf(quote.id)).toMatchObject({
      state: 'waiting',
      recipient: 'bar@example.com',
    });
    expect(smtp.mails).toHaveLength(0);
    expect(await sendDueMail(shop.context)).toBe(1);
    const [mail = ''] = smtp.mails;
    expect(mail).toMatch(/^From: "?A Test Shop"? <owner@example\.com>/m);
    expect(mail).toMatch(/^To: bar@example\.com/m);
    expect(mail).toMatch(new RegExp(`^Subject: .*${quote.number}`, 'm'));
    expect(textOf(mail)).toContain(linkUrl);
    expect(mail).toContain(`filename=${quote.number}.pdf`);
    expect(attachmentOf(mail).subarray(0, 5).toString()).toBe('%PDF-');
    expect(await letterOf(quote.id)).toMatchObject({
      state: 'sent',
      sentAt: '2026-12-01T09:00:00.000Z',
    });
  });

  it('sends each mail once, and keeps no link after that', async () => {
    const { quote, linkUrl } = await mailQuote();
    expect(await sendDueMail(shop.context)).toBe(1);
    expect(await sendDueMail(shop.context)).toBe(0);
    expect(smtp.mails).toHaveLength(1);
    expect((await mailOf(quote.id)).body).not.toContain(linkUrl.split('/c/')[1]);
  });

  it('writes nothing when the quote is not sent after all', async () => {
    const quote = await draftQuote(ready);
    await shop.context.orm.em
      .fork()
      .getConnection()
      .execute('UPDATE quote SET in_hands_on = ? WHERE id = ?', ['2026-11-30', quote.id]);
    await shop
      .as('owner')
      .post(`/api/quotes/${quote.id}/sendings`)
      .set('If-Match', `"${quote.version}"`)
      .send({ by: 'mail' })
      .expect(422);
    expect(await shop.context.orm.em.fork().count(OutgoingMail, { subjectId: quote.id })).toBe(0);
    expect(await sendDueMail(shop.context)).toBe(0);
  });

  it('tries again later, ever more patiently, and gives up in the end', async () => {
    const { quote } = await mailQuote();
    smtp.refuse = true;
    expect(await sendDueMail(shop.context)).toBe(0);
    expect(await letterOf(quote.id)).toMatchObject({
      state: 'waiting',
      lastError: expect.stringContaining('451'),
    });
    expect((await mailOf(quote.id)).nextTryAt).toBe('2026-12-01T09:00:30.000Z');
    expect(await sendDueMail(shop.context)).toBe(0);
    expect((await mailOf(quote.id)).attempts).toBe(1);
    for (let hours = 1; hours < 9; hours += 1) {
      shop.clock.set(new Date(start + hours * 3_600_000 * 2));
      await sendDueMail(shop.context);
    }
    expect(await mailOf(quote.id)).toMatchObject({ state: 'failed', attempts: 8 });
    expect(smtp.mails).toHaveLength(0);
  });

  it('hands a mail to one sender at a time, and again once that one’s lease has run out', async () => {
    const { quote } = await mailQuote();
    const lease = () => inTransaction(shop.context, theProgram, leaseMail);
    expect(await lease()).toMatchObject({ subjectId: quote.id, attempts: 1 });
    expect(await lease()).toBeNull();
    expect(await sendDueMail(shop.context)).toBe(0);
    shop.clock.set(new Date(start + 121_000));
    expect(await sendDueMail(shop.context)).toBe(1);
    expect((await mailOf(quote.id)).attempts).toBe(2);
  });

  it('keeps a name from adding lines to a mail’s head', async () => {
    const body = { name: 'Odalys & Pim', contactName: 'Pim', email: 'pim@example.com' };
    const customer = (await shop.as('owner').post('/api/customers').send(body).expect(201)).body;
    const quote = await draftQuote({ ...ready, customer });
    await shop.context.orm.em
      .fork()
      .getConnection()
      .execute('UPDATE quote SET title = ? WHERE id = ?', [
        'Wraps\r\nBcc: eve@example.com',
        quote.id,
      ]);
    await shop
      .as('owner')
      .post(`/api/quotes/${quote.id}/sendings`)
      .set('If-Match', `"${quote.version}"`)
      .send({ by: 'mail' })
      .expect(200);
    await sendDueMail(shop.context);
    expect(split(smtp.mails[0] ?? '')[0]).not.toMatch(/^Bcc:/m);
  });

  it('needs an address', async () => {
    const customer = (
      await shop.as('owner').post('/api/customers').send({ name: 'No mail' }).expect(201)
    ).body;
    const quote = await draftQuote({ ...ready, customer });
    const { body } = await shop
      .as('owner')
      .post(`/api/quotes/${quote.id}/sendings`)
      .set('If-Match', `"${quote.version}"`)
      .send({ by: 'mail' })
      .expect(422);
    expect(body.errors[0].message).toMatch(/^No mail has no e-mail address/);
  });
});

/** The decoded words of a mail of several parts. */
function textOf(mail: string): string {
  const part = partsOf(mail).find((each) => /Content-Type: text\/plain/i.test(each)) ?? '';
  const [head = '', body = ''] = split(part);
  if (/base64/i.test(head)) return Buffer.from(body, 'base64').toString('utf8');
  const joined = body.replaceAll('=\r\n', '');
  return joined.replaceAll(/=([0-9A-F]{2})/g, (_, hex: string) =>
    String.fromCharCode(parseInt(hex, 16)),
  );
}

function attachmentOf(mail: string): Buffer {
  const part = partsOf(mail).find((each) => /Content-Disposition: attachment/i.test(each)) ?? '';
  return Buffer.from(split(part)[1] ?? '', 'base64');
}

function partsOf(mail: string): string[] {
  const boundary = /boundary="([^"]+)"/.exec(mail)?.[1] ?? '';
  return mail.split(`--${boundary}`);
}

function split(part: string): [string, string] {
  const at = part.indexOf('\r\n\r\n');
  return [part.slice(0, at), part.slice(at + 4)];
}
