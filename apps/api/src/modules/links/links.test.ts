import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { lapseQuotes } from '../../flows/lapse-quotes.ts';
import {
  draftQuote,
  readyToQuote,
  sendByHand,
  type QuotingShop,
} from '../../testing/example-quote.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { Activity } from '../activity/activity.entity.ts';
import { IdempotentReply } from '../../http/idempotency.entity.ts';
import { CustomerLink } from './customer-link.entity.ts';

let ready: QuotingShop;
let shop: QuotingShop['shop'];
const start = new Date('2026-12-01T09:00:00.000Z');

beforeAll(async () => {
  shop = await startTestShop();
  ready = await readyToQuote(shop);
});
afterAll(() => shop.close());

const sent = async (change: object = {}) => sendByHand(ready, await draftQuote(ready, change));
const open = (token: string) => shop.nobody().get(`/api/links/${token}`);
const agree = (token: string, body: object) =>
  shop.nobody().post(`/api/links/${token}/agreements`).send(body);

async function at<T>(instant: string, act: () => Promise<T>): Promise<T> {
  shop.clock.set(new Date(instant));
  try {
    return await act();
  } finally {
    shop.clock.set(start);
  }
}

describe('a customer’s link', () => {
  it('[S16] shows the offer, and nothing of what it costs the shop', async () => {
    const { token, quote } = await sent();
    const { body } = await open(token).expect(200);
    expect(body).toMatchObject({
      shopName: 'A Test Shop',
      number: quote.number,
      state: 'open',
      customerName: 'Brambling Brewery',
      title: 'Coasters with a bramble',
      inHandsOn: '2026-12-18',
      outline: { path: expect.stringMatching(/^M /), words: 'round, 95 mm' },
      tooling: [{ name: 'Stamp plate', charge: '60.00' }],
      toolingTotal: '60.00',
      agreedQuantity: null,
    });
    expect(Object.keys(body.breaks[0]).sort()).toEqual([
      'charges',
      'goodsTotal',
      'priceEach',
      'quantity',
      'reorderTotal',
      'total',
    ]);
    const text = JSON.stringify(body);
    for (const hidden of ['cost', 'margin', 'PerHour', 'wage', '48.00', '9.50', 'example.com']) {
      expect(text).not.toContain(hidden);
    }
  });

  it('[S16] is kept only as a hash, of a token that nobody can guess', async () => {
    const { token } = await sent();
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    const em = shop.context.orm.em.fork();
    const links = await em.find(CustomerLink, { id: { $gt: 0 } });
    expect(links.every(({ tokenHash }) => /^[0-9a-f]{64}$/.test(tokenHash))).toBe(true);
    expect(JSON.stringify(links)).not.toContain(token);
    expect(JSON.stringify(await em.find(IdempotentReply, { status: { $gt: 0 } }))).not.toContain(
      token,
    );
    expect(JSON.stringify(await em.find(Activity, { seq: { $gt: 0 } }))).not.toContain(token);
  });

  it('[S11] changes nothing by being read', async () => {
    const { token, quote } = await sent();
    const before = (await shop.as('owner').get(`/api/quotes/${quote.id}`)).body;
    await open(token).expect(200);
    await open(token).expect(200);
    expect((await shop.as('owner').get(`/api/quotes/${quote.id}`)).body).toEqual(before);
    await shop.nobody().get(`/api/links/${token}/agreements`).expect(404);
  });

  it('lets the customer agree to a quantity, once', async () => {
    const { token, quote } = await sent();
    const agreed = (await agree(token, { quantity: 100 }).expect(200)).body;
    expect(agreed).toMatchObject({ state: 'agreed', agreedQuantity: 100, agreedOn: '2026-12-01' });
    expect((await agree(token, { quantity: 100 }).expect(200)).body).toEqual(agreed);
    await agree(token, { quantity: 250 }).expect(409);
    expect((await open(token).expect(200)).body).toEqual(agreed);
    const seen = (await shop.as('owner').get(`/api/quotes/${quote.id}`)).body;
    expect(seen).toMatchObject({ state: 'agreed', agreedQuantity: 100, agreedHow: 'link' });
    const deeds = await shop.context.orm.em
      .fork()
      .find(Activity, { action: `agreed to quote ${quote.number}` });
    expect(deeds).toMatchObject([{ actorRole: 'customer', actorId: null }]);
  });

  it('takes no quantity that was not offered, and nothing else', async () => {
    const { token } = await sent();
    const { body } = await agree(token, { quantity: 99 }).expect(422);
    expect(body.errors[0].message).toBe('Choose one of the quantities offered: 50, 100, 250.');
    await agree(token, {}).expect(422);
    await agree(token, { quantity: 100, priceEach: '0.01' }).expect(422);
    await agree(token, { quantity: '100' }).expect(422);
  });

  it('is noted as the customer’s even in a browser where the owner is signed in', async () => {
    const { token, quote } = await sent();
    await shop
      .as('owner')
      .post(`/api/links/${token}/agreements`)
      .send({ quantity: 50 })
      .expect(200);
    const deeds = await shop.context.orm.em
      .fork()
      .find(Activity, { action: `agreed to quote ${quote.number}` });
    expect(deeds).toMatchObject([{ actorRole: 'customer' }]);
  });
});

describe('a link that does not work', () => {
  const sentence = 'This link does not work, or no longer works. Ask the shop for a new one.';

  it('[S14] is 404 with one sentence, whether it never was, was stopped or has expired', async () => {
    const { token, quote } = await sent();
    expect((await open('A'.repeat(43)).expect(404)).body.detail).toBe(sentence);
    expect((await open('x').expect(404)).body.detail).toBe(sentence);
    const late = '2027-03-20T00:00:00.000Z';
    expect((await at(late, () => open(token).expect(404))).body.detail).toBe(sentence);
    const stopped = (await shop.as('owner').delete(`/api/quotes/${quote.id}/links`).expect(200))
      .body;
    expect(stopped.link).toBeNull();
    expect((await open(token).expect(404)).body.detail).toBe(sentence);
    await agree(token, { quantity: 100 }).expect(404);
  });

  it('is the one of a quote that was replaced', async () => {
    const { token, quote } = await sent();
    const draft = (await shop.as('owner').post(`/api/quotes/${quote.id}/revisions`).expect(201))
      .body;
    await open(token).expect(200);
    const next = await sendByHand(ready, draft);
    await open(token).expect(404);
    expect((await open(next.token).expect(200)).body.number).toBe(quote.number);
  });

  it('can be followed by another, and the first one works beside it', async () => {
    const { token, quote } = await sent();
    const again = await shop
      .as('owner')
      .post(`/api/quotes/${quote.id}/links`)
      .send({ by: 'hand' })
      .expect(200);
    await open(String(again.body.linkUrl).split('/c/')[1] ?? '').expect(200);
    await open(token).expect(200);
    const draft = await draftQuote(ready);
    await shop.as('owner').post(`/api/quotes/${draft.id}/links`).send({ by: 'hand' }).expect(409);
  });
});

describe('an offer that has run out', () => {
  it('still shows, and cannot be agreed to', async () => {
    const { token } = await sent();
    await at('2026-12-19T09:00:00.000Z', async () => {
      expect((await open(token).expect(200)).body.state).toBe('lapsed');
      const { body } = await agree(token, { quantity: 100 }).expect(409);
      expect(body.detail).toBe('This offer has run out. Ask the shop for a new one.');
    });
  });

  it('lapses by itself, and says so once in the log', async () => {
    const { quote } = await sent();
    await at('2026-12-19T09:00:00.000Z', async () => {
      await inTransaction(shop.context, theProgram, lapseQuotes);
      await inTransaction(shop.context, theProgram, lapseQuotes);
    });
    expect((await shop.as('owner').get(`/api/quotes/${quote.id}`)).body.state).toBe('lapsed');
    const deeds = await shop.context.orm.em
      .fork()
      .find(Activity, { action: `let quote ${quote.number} lapse` });
    expect(deeds).toHaveLength(1);
  });

  it('is said to be declined where it was', async () => {
    const { token, quote } = await sent();
    await shop.as('owner').post(`/api/quotes/${quote.id}/refusals`).send({}).expect(200);
    expect((await open(token).expect(200)).body.state).toBe('declined');
    await agree(token, { quantity: 100 }).expect(409);
  });
});

describe('whoever tries too often', () => {
  it('[S16] is asked to wait', async () => {
    const statuses: number[] = [];
    for (let tried = 0; tried < 80; tried += 1)
      statuses.push((await open(`guess-${tried}`)).status);
    expect(statuses.at(-1)).toBe(429);
    const { body, headers } = await open('another').expect(429);
    expect(headers['retry-after']).toBe('60');
    expect(body.detail).toBe('This was asked for too often. Wait a minute, then try again.');
  });
});
