import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { priceRun, type RunInput } from '@hidewright/domain';
import type { Quote as QuoteReply } from '@hidewright/contract';
import {
  draftQuote,
  quoteBody,
  readyToQuote,
  sendByHand,
  type QuotingShop,
} from '../../testing/example-quote.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { Activity } from '../activity/activity.entity.ts';
import { Quote } from './quote.entity.ts';

let ready: QuotingShop;
let shop: QuotingShop['shop'];

beforeAll(async () => {
  shop = await startTestShop();
  ready = await readyToQuote(shop);
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const change = (quote: QuoteReply, body: object, version = quote.version) =>
  owner().put(`/api/quotes/${quote.id}`).set('If-Match', `"${version}"`).send(body);
const post = (quote: QuoteReply, what: string, body: object = {}) =>
  owner().post(`/api/quotes/${quote.id}/${what}`).send(body);
const fieldsOf = (body: { errors: { field: string }[] }) => body.errors.map(({ field }) => field);
const deedsOf = async (id: number) =>
  (
    await shop.context.orm.em
      .fork()
      .find(Activity, { subjectKind: 'quote', subjectId: id }, { orderBy: { seq: 'asc' } })
  ).map(({ action }) => action);

describe('a draft', () => {
  it('is worked out from the pattern and kept with everything it was priced from', async () => {
    const quote = await draftQuote(ready);
    expect(quote).toMatchObject({
      number: expect.stringMatching(/^Q-\d{4}$/),
      revision: 1,
      state: 'draft',
      customerName: 'Brambling Brewery',
      patternName: 'Round coaster',
      patternVersion: 1,
      title: 'Coasters with a bramble',
      inHandsOn: '2026-12-18',
      orderId: null,
    });
    expect(quote.layout.pieces).toBeGreaterThan(0);
    expect(quote.breaks.map(({ quantity }) => quantity)).toEqual([50, 100, 250]);
    expect(quote.input).toMatchObject({
      leather: { name: 'Oak tan 5–6 oz', pricePerFt2: '9.50' },
      hardware: [{ name: 'Rivet 9 mm', unitPrice: '0.17', perPiece: 2 }],
      work: { kind: 'minutesPer100', minutes: '180', rejectPercent: '10' },
    });
    expect(quote.numbers).toEqual(priceRun(quote.input as RunInput));
  });

  it('never rises from one worked-out price to the next, and shows each total with the tooling in it', async () => {
    const quantities = [20, 37, 100, 101, 400, 2000].map((quantity) => ({ quantity }));
    const { breaks } = await draftQuote(ready, { breaks: quantities });
    const prices = breaks.map(({ priceEach }) => Number(priceEach));
    expect(prices).toEqual([...prices].sort((a, b) => b - a));
    for (const rung of breaks) {
      expect(Number(rung.goodsTotal)).toBeCloseTo(rung.quantity * Number(rung.priceEach), 2);
      expect(Number(rung.total)).toBeCloseTo(Number(rung.goodsTotal) + 60, 2);
    }
  });

  it('takes the price that the owner types, and gives the worked-out one back', async () => {
    const plain = await draftQuote(ready, { breaks: [{ quantity: 100 }] });
    const suggested = plain.breaks[0]?.priceEach;
    const typed = (
      await change(
        plain,
        quoteBody(ready, { breaks: [{ quantity: 100, typedPrice: '9.1234' }] }),
      ).expect(200)
    ).body;
    expect(typed.breaks[0]).toMatchObject({
      typedPrice: '9.1234',
      priceEach: '9.1234',
      goodsTotal: '912.34',
    });
    expect(typed.numbers.breaks[0]).toMatchObject({
      typed: true,
      suggestedPrice: Number(suggested).toString(),
    });
    const restored = (
      await change(typed, quoteBody(ready, { breaks: [{ quantity: 100 }] })).expect(200)
    ).body;
    expect(restored.breaks[0]).toMatchObject({ typedPrice: null, priceEach: suggested });
  });

  it('is worked out again with the prices of today when it is saved', async () => {
    const quote = await draftQuote(ready);
    const leather = (await owner().get(`/api/leathers/${ready.leatherId}`)).body;
    await owner()
      .patch(`/api/leathers/${ready.leatherId}`)
      .set('If-Match', `"${leather.version}"`)
      .send({ pricePerFt2: '19' })
      .expect(200);
    expect((await owner().get(`/api/quotes/${quote.id}`)).body.input.leather.pricePerFt2).toBe(
      '9.50',
    );
    const saved = (await change(quote, quoteBody(ready)).expect(200)).body;
    expect(saved.input.leather.pricePerFt2).toBe('19.00');
    expect(Number(saved.breaks[0].priceEach)).toBeGreaterThan(Number(quote.breaks[0]?.priceEach));
    await owner()
      .patch(`/api/leathers/${ready.leatherId}`)
      .set('If-Match', `"${leather.version + 1}"`)
      .send({ pricePerFt2: '9.5' })
      .expect(200);
  });

  it('keeps what was set by hand in place of the shop’s values', async () => {
    const overrides = { rejectPercent: '25', leatherPricePerFt2: '12' };
    const quote = await draftQuote(ready, { overrides });
    expect(quote.overrides).toEqual(overrides);
    expect(quote.input).toMatchObject({
      leather: { pricePerFt2: '12' },
      work: { rejectPercent: '25' },
    });
    const plain = await draftQuote(ready);
    const cut = (each: QuoteReply) => each.numbers?.breaks[0]?.cutCount ?? 0;
    expect(cut(quote)).toBeGreaterThan(cut(plain));
  });

  it('has the pattern’s name where none is typed', async () => {
    expect((await draftQuote(ready, { title: '' })).title).toBe('Round coaster');
  });

  it('is made once for one Idempotency-Key', async () => {
    const send = () =>
      owner().post('/api/quotes').set('Idempotency-Key', 'once').send(quoteBody(ready));
    const first = (await send().expect(201)).body;
    expect((await send().expect(201)).body).toEqual(first);
  });
});

describe('a draft that makes no sense', () => {
  it.each([
    ['a quantity twice', { breaks: [{ quantity: 50 }, { quantity: 50 }] }, 'breaks.1.quantity'],
    ['no quantity', { breaks: [] }, 'breaks'],
    [
      'nine quantities',
      { breaks: [1, 2, 3, 4, 5, 6, 7, 8, 9].map((quantity) => ({ quantity })) },
      'breaks',
    ],
    ['a negative quantity', { breaks: [{ quantity: -5 }] }, 'breaks.0.quantity'],
    ['half a piece', { breaks: [{ quantity: 1.5 }] }, 'breaks.0.quantity'],
    [
      'a price that is no number',
      { breaks: [{ quantity: 5, typedPrice: 'NaN' }] },
      'breaks.0.typedPrice',
    ],
    ['a negative price', { breaks: [{ quantity: 5, typedPrice: '-1' }] }, 'breaks.0.typedPrice'],
    [
      'too many decimals',
      { breaks: [{ quantity: 5, typedPrice: '1.00001' }] },
      'breaks.0.typedPrice',
    ],
    ['an unknown field', { total: '1.00' }, 'total'],
    [
      'an unknown field in a rung',
      { breaks: [{ quantity: 5, priceEach: '1' }] },
      'breaks.0.priceEach',
    ],
    ['a day that does not exist', { inHandsOn: '2026-02-30' }, 'inHandsOn'],
    ['a day that is over', { inHandsOn: '2026-11-30' }, 'inHandsOn'],
    ['a customer who does not exist', { customerId: 9999 }, 'customerId'],
    ['a pattern that does not exist', { patternId: 9999 }, 'patternId'],
    [
      'tooling without a name',
      { tooling: [{ name: '', cost: '1', charge: '1' }] },
      'tooling.0.name',
    ],
    [
      'tooling in fractions of a cent',
      { tooling: [{ name: 'Die', cost: '1.005', charge: '1' }] },
      'tooling.0.cost',
    ],
    [
      'rejects of more than all',
      { overrides: { rejectPercent: '101' } },
      'overrides.rejectPercent',
    ],
  ])('is refused: %s', async (_name, wrong, field) => {
    const before = await shop.context.orm.em.fork().count(Quote);
    const { body } = await owner().post('/api/quotes').send(quoteBody(ready, wrong)).expect(422);
    expect(fieldsOf(body)).toContain(field);
    expect(await shop.context.orm.em.fork().count(Quote)).toBe(before);
  });

  it('is refused by the domain’s own sentence where every piece would fail', async () => {
    const { body } = await owner()
      .post('/api/quotes')
      .send(quoteBody(ready, { overrides: { rejectPercent: '100' } }))
      .expect(422);
    expect(body.detail).toMatch(/nothing to sell/);
  });

  it('is not saved over a newer version', async () => {
    const quote = await draftQuote(ready);
    await change(quote, quoteBody(ready, { title: 'Coasters, renamed' })).expect(200);
    const { body } = await change(quote, quoteBody(ready)).expect(412);
    expect(body.changed).toMatchObject({
      by: 'The owner',
      what: `worked out quote ${quote.number} again`,
    });
    await owner().put(`/api/quotes/${quote.id}`).send(quoteBody(ready)).expect(428);
  });
});

describe('a quote that was sent', () => {
  it('never changes again, whatever changes around it', async () => {
    const draft = await draftQuote(ready);
    const { quote } = await sendByHand(ready, draft);
    expect(quote).toMatchObject({
      state: 'sent',
      validUntil: '2026-12-18',
      sentAt: '2026-12-01T09:00:00.000Z',
    });
    const refused = await change(quote, quoteBody(ready)).expect(409);
    expect(refused.body).toMatchObject({
      detail: `Quote ${quote.number} has been sent, and stays as it was sent. Make a revision to change it.`,
      allowed: ['share', 'agree', 'decline', 'revise'],
    });
    const again = (await owner().get(`/api/quotes/${quote.id}`).expect(200)).body;
    expect(again.numbers).toEqual(draft.numbers);
    expect(again.input).toEqual(draft.input);
  });

  it('is not sent twice, nor from a version that is out of date', async () => {
    const draft = await draftQuote(ready);
    const { quote } = await sendByHand(ready, draft);
    const send = (version: number) =>
      owner()
        .post(`/api/quotes/${quote.id}/sendings`)
        .set('If-Match', `"${version}"`)
        .send({ by: 'hand' });
    await send(draft.version).expect(412);
    await send(quote.version).expect(409);
    await post(quote, 'sendings', { by: 'hand' }).expect(428);
  });

  it('goes by hand where no mail server is set', async () => {
    const draft = await draftQuote(ready);
    const { body } = await owner()
      .post(`/api/quotes/${draft.id}/sendings`)
      .set('If-Match', `"${draft.version}"`)
      .send({ by: 'mail' })
      .expect(422);
    expect(body.errors).toEqual([
      {
        field: 'by',
        message: 'No mail server is set, so send it by hand: copy the link and the text.',
      },
    ]);
    expect((await owner().get(`/api/quotes/${draft.id}`)).body.state).toBe('draft');
    const { text, linkUrl } = await sendByHand(ready, draft);
    expect(linkUrl).toMatch(/^http:\/\/127\.0\.0\.1:\d+\/c\/[\w-]{43}$/);
    expect(text).toContain(linkUrl);
    expect(text).toContain('Good day The bar,');
    expect(text).toContain('Stamp plate, charged once: 60.00');
  });

  it('is on paper as a PDF that holds no cost', async () => {
    const draft = await draftQuote(ready);
    const reply = await owner()
      .get(`/api/quotes/${draft.id}/paper`)
      .responseType('blob')
      .expect(200);
    expect(reply.headers['content-type']).toBe('application/pdf');
    expect(reply.headers['content-disposition']).toContain(`${draft.number}.pdf`);
    expect((reply.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
  });

  it('gives way to its revision once that is sent', async () => {
    const first = (await sendByHand(ready, await draftQuote(ready))).quote;
    const draft = (await post(first, 'revisions').expect(201)).body as QuoteReply;
    expect(draft).toMatchObject({
      number: first.number,
      revision: 2,
      state: 'draft',
      breaks: first.breaks,
    });
    await post(first, 'revisions').expect(409);
    expect((await owner().get(`/api/quotes/${first.id}`)).body.state).toBe('sent');
    const cheaper = quoteBody(ready, { breaks: [{ quantity: 100, typedPrice: '3.00' }] });
    const saved = (await change(draft, cheaper).expect(200)).body as QuoteReply;
    const second = (await sendByHand(ready, saved)).quote;
    expect(second.revisions).toEqual([{ id: first.id, revision: 1, state: 'superseded' }]);
    const { body } = await post(first, 'agreements', { quantity: 100, how: 'phone' }).expect(409);
    expect(body.detail).toContain('was replaced by a later revision');
    expect(await deedsOf(first.id)).toEqual([
      `drafted quote ${first.number}`,
      `sent quote ${first.number} to Brambling Brewery`,
      `replaced revision 1 of quote ${first.number}`,
    ]);
  });

  it('cannot be overtaken by a revision once it was agreed', async () => {
    const first = (await sendByHand(ready, await draftQuote(ready))).quote;
    const draft = (await post(first, 'revisions').expect(201)).body as QuoteReply;
    await post(first, 'agreements', { quantity: 50, how: 'mail' }).expect(200);
    const { body } = await owner()
      .post(`/api/quotes/${draft.id}/sendings`)
      .set('If-Match', `"${draft.version}"`)
      .send({ by: 'hand' })
      .expect(409);
    expect(body.detail).toContain('Revision 1');
  });
});

describe('an agreement by phone', () => {
  it('is one press, also from a draft, and is noted once', async () => {
    const draft = await draftQuote(ready);
    const agreed = (await post(draft, 'agreements', { quantity: 100, how: 'phone' }).expect(200))
      .body;
    expect(agreed).toMatchObject({ state: 'agreed', agreedQuantity: 100, agreedHow: 'phone' });
    const again = (await post(draft, 'agreements', { quantity: 100, how: 'phone' }).expect(200))
      .body;
    expect(again).toEqual(agreed);
    const { body } = await post(draft, 'agreements', { quantity: 250, how: 'phone' }).expect(409);
    expect(body.allowed).toEqual(['share', 'take on']);
    expect((await deedsOf(draft.id)).filter((deed) => deed.includes('agreed'))).toHaveLength(1);
  });

  it('is to a quantity that was offered', async () => {
    const draft = await draftQuote(ready);
    const { body } = await post(draft, 'agreements', { quantity: 99, how: 'phone' }).expect(422);
    expect(body.errors[0].message).toBe('Choose one of the quantities offered: 50, 100, 250.');
    await post(draft, 'agreements', { quantity: 100, how: 'link' }).expect(422);
    await post(draft, 'agreements', { quantity: 100, how: 'phone', state: 'agreed' }).expect(422);
  });

  it('does not follow a refusal', async () => {
    const draft = await draftQuote(ready);
    const declined = (await post(draft, 'refusals', { reason: 'too late for them' }).expect(200))
      .body;
    expect(declined.state).toBe('declined');
    const { body } = await post(draft, 'agreements', { quantity: 100, how: 'phone' }).expect(409);
    expect(body.allowed).toEqual(['revise']);
    await post(draft, 'revisions').expect(201);
  });
});

describe('what a role sees of a quote', () => {
  it('[S15] is no price, cost or address for the maker, who can still read what would be made', async () => {
    const draft = await draftQuote(ready);
    const seen = (await shop.as('maker').get(`/api/quotes/${draft.id}`).expect(200)).body;
    expect(seen).toMatchObject({
      number: draft.number,
      customerName: 'Brambling Brewery',
      inHandsOn: '2026-12-18',
    });
    expect(seen.breaks).toEqual([{ quantity: 50 }, { quantity: 100 }, { quantity: 250 }]);
    expect(seen.layout.pieces).toBe(draft.layout.pieces);
    const text = JSON.stringify(seen);
    for (const hidden of [
      'example.com',
      'priceEach',
      'cost',
      'charge',
      'numbers',
      'pricePerFt2',
      '60.00',
    ]) {
      expect(text).not.toContain(hidden);
    }
    const list = (await shop.as('maker').get('/api/quotes').expect(200)).body;
    expect(JSON.stringify(list)).not.toContain('total');
  });

  it('lets only the owner draft, send, revise and agree', async () => {
    const draft = await draftQuote(ready);
    for (const role of ['maker', 'bookkeeper'] as const) {
      await shop.as(role).post('/api/quotes').send(quoteBody(ready)).expect(403);
      await shop.as(role).get(`/api/patterns/${ready.patternId}/run-basis`).expect(403);
      const body = { quantity: 100, how: 'phone' };
      await shop.as(role).post(`/api/quotes/${draft.id}/agreements`).send(body).expect(403);
    }
    await shop.as('maker').get(`/api/quotes/${draft.id}/paper`).expect(403);
    await shop.nobody().get(`/api/quotes/${draft.id}`).expect(401);
  });
});

describe('the list of quotes', () => {
  it('is found by number, customer, title and state, newest first, page by page', async () => {
    const draft = await draftQuote(ready, { title: 'A very particular thing' });
    const get = async (query: object) =>
      (await owner().get('/api/quotes').query(query).expect(200)).body;
    const byTitle = await get({ q: 'particular' });
    expect(byTitle.items).toMatchObject([
      { id: draft.id, quantities: [50, 100, 250], total: draft.breaks[2]?.total },
    ]);
    expect((await get({ q: draft.number })).items).toHaveLength(1);
    expect((await get({ q: 'Brambling', limit: 1 })).items[0].id).toBe(draft.id);
    const agreed = (await get({ state: 'agreed' })).items as { state: string }[];
    expect(new Set(agreed.map(({ state }) => state))).toEqual(new Set(['agreed']));
    const first = await get({ limit: 1 });
    const second = await get({ limit: 1, cursor: first.next });
    expect(second.items[0].id).toBeLessThan(first.items[0].id);
    await owner().get('/api/quotes').query({ state: 'lost' }).expect(422);
  });
});

describe('what a run is priced from', () => {
  it('gives the page the same numbers that a saved quote gets', async () => {
    const basis = (await owner().get(`/api/patterns/${ready.patternId}/run-basis`).expect(200))
      .body;
    const quote = await draftQuote(ready);
    const { breaks, tooling } = quote.input as RunInput;
    expect(priceRun({ ...basis.input, breaks, tooling })).toEqual(quote.numbers);
    expect(basis).toMatchObject({ patternName: 'Round coaster', needsPlate: true });
    await owner().get('/api/patterns/9999/run-basis').expect(404);
  });
});
