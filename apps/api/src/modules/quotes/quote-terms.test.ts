import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  quoteBody as quoteBodySchema,
  runAsAsked,
  type Invoice,
  type Offer,
  type Order,
  type Pattern,
  type Quote,
  type QuoteRow,
  type RunBasis,
  type Today,
  type WeekStart,
} from '@hidewright/contract';
import { priceRun } from '@hidewright/domain';
import { readyForTheBench, ticketOf, type BenchShop } from '../../testing/bench-shop.ts';
import { draftQuote, quoteBody, sendByHand } from '../../testing/example-quote.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
let brassId: number;

beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
  const brass = { name: 'Rivet 9 mm, brass', kind: 'hardware', unitPrice: '0.42' };
  brassId = (await owner().post('/api/hardware').send(brass).expect(201)).body.id as number;
  await owner()
    .post('/api/receipts')
    .send({ hardware: [{ hardwareId: brassId, quantity: 400, cost: '168.00' }] })
    .expect(201);
  await addOption('Brass rivets');
});
afterAll(() => ready.shop.close());

const owner = () => ready.shop.as('owner');

async function addOption(name: string): Promise<void> {
  const { definition, version } = (
    await owner().get(`/api/patterns/${ready.patternId}`).expect(200)
  ).body as Pattern;
  const swaps = [{ hardwareId: ready.hardwareId, byHardwareId: brassId, perPiece: 2 }];
  await owner()
    .patch(`/api/patterns/${ready.patternId}`)
    .set('If-Match', `"${version}"`)
    .send({ definition: { ...definition, options: [{ name, swaps }] } })
    .expect(200);
}

const brass = { options: [{ name: 'Brass rivets', typedExtra: null }] };
const everything = {
  priceRule: { kind: 'margin', percent: '20' },
  floorPrice: '2',
  setUpCharge: '12.00',
  minimumOrder: '150.00',
  rushPercent: '25',
  carriageCost: '9.00',
  carriageCharge: '11.50',
  resalePrice: '12',
  ...brass,
};
const agree = (quote: Quote, body: object) =>
  owner()
    .post(`/api/quotes/${quote.id}/agreements`)
    .send({ quantity: 50, how: 'phone', ...body });

describe('the terms of a quote', () => {
  it('price it to the cent as the page did while it was typed', async () => {
    const basis = (await owner().get(`/api/patterns/${ready.patternId}/run-basis`).expect(200))
      .body as RunBasis;
    const own = { kind: 'markup', percent: '80' };
    const body = quoteBody(ready, {
      terms: everything,
      breaks: [
        { quantity: 50, rule: own },
        { quantity: 100 },
        { quantity: 250, typedPrice: '6.4' },
      ],
      overrides: { rejectPercent: '6', leatherPricePerFt2: '10.25' },
    });
    const saved = await draftQuote(ready, body);
    expect(saved.numbers).toEqual(priceRun(runAsAsked(basis, quoteBodySchema.parse(body))));
    expect(saved.numbers?.options).toHaveLength(1);
    expect(saved.terms).toEqual(everything);
  });

  it('stand in the offer as charges, and say nothing of what it costs', async () => {
    const quote = await draftQuote(ready, { terms: everything });
    const { token } = await sendByHand(ready, quote);
    const offer = (await ready.shop.nobody().get(`/api/links/${token}`).expect(200)).body as Offer;
    const [rung] = offer.breaks;
    expect(rung?.charges.map(({ name }) => name)).toEqual(['Setting up', 'Rush', 'Carriage']);
    const once = (rung?.charges ?? []).reduce((sum, { amount }) => sum + Number(amount), 0);
    expect(Number(rung?.total)).toBeCloseTo(Number(rung?.goodsTotal) + once + 60, 2);
    expect(Number(rung?.reorderTotal)).toBeCloseTo(Number(rung?.total) - 60, 2);
    expect(offer.options.map(({ name }) => name)).toEqual(['Brass rivets']);
    expect(JSON.stringify(offer)).not.toMatch(/cost|margin|perBenchHour|left/i);
  });

  it('are refused where the pattern has no such option, beside the field', async () => {
    const options = [{ name: 'Silver rivets', typedExtra: null }];
    const reply = await owner()
      .post('/api/quotes')
      .send(quoteBody(ready, { terms: { options } }));
    expect(reply.status).toBe(422);
    expect(reply.body.errors[0].field).toBe('terms.options.0.name');
  });

  it.each([
    [{ priceRule: { kind: 'margin', percent: '95' } }, 'terms.priceRule.percent'],
    [{ rushPercent: '-5' }, 'terms.rushPercent'],
    [{ minimumOrder: '1,000' }, 'terms.minimumOrder'],
    [{ floorPrice: 'NaN' }, 'terms.floorPrice'],
  ])('are refused as %j', async (terms, field) => {
    const reply = await owner().post('/api/quotes').send(quoteBody(ready, { terms }));
    expect(reply.status).toBe(422);
    expect(reply.body.errors.map((each: { field: string }) => each.field)).toContain(field);
  });
});

describe('an option', () => {
  it('is agreed to by name, and only where it was offered', async () => {
    const plain = await draftQuote(ready);
    const refused = await agree(plain, { option: 'Brass rivets' });
    expect(refused.status).toBe(422);
    expect(refused.body.errors[0].field).toBe('option');
    const quote = await draftQuote(ready, { terms: brass });
    const { body } = await agree(quote, { option: 'Brass rivets' }).expect(200);
    expect(body).toMatchObject({ agreedOption: 'Brass rivets', agreedQuantity: 50 });
  });

  it('goes on to the check, the order, the ticket and the invoice', async () => {
    const terms = { ...everything, carriageCharge: null, carriageCost: null };
    const quote = (
      await agree(await draftQuote(ready, { terms }), { option: 'Brass rivets' }).expect(200)
    ).body as Quote;
    const check = await ready.shop.as('maker').get(`/api/quotes/${quote.id}/check`).expect(200);
    const names = (check.body.answers as { name: string }[]).map(({ name }) => name);
    expect(names).toContain('Rivet 9 mm, brass');
    expect(names).not.toContain('Rivet 9 mm');
    const taken = { quoteId: quote.id, promisedOn: '2026-12-16' };
    const order = (await owner().post('/api/orders').send(taken).expect(201)).body as Order;
    const offered = quote.numbers?.options[0]?.breaks.find((rung) => rung.quantity === 50);
    const listed = await owner().get('/api/quotes?state=agreed').expect(200);
    const row = (listed.body.items as QuoteRow[]).find(({ id }) => id === quote.id);
    expect(row?.total).toBe(offered?.total);
    expect(order).toMatchObject({
      title: 'Coasters with a bramble, Brass rivets',
      optionName: 'Brass rivets',
      total: offered?.total,
      charges: offered?.charges.map(({ name, amount }) => ({ name, amount })),
    });
    const ticket = await ticketOf(ready, order);
    expect(ticket.hardware.map(({ name }) => name)).toEqual(['Rivet 9 mm, brass']);
    const work = (what: string, body: object) =>
      ready.shop.as('maker').post(`/api/jobs/${ticket.id}/${what}`).send(body).expect(201);
    await work('logs', { stepId: ticket.steps[1]?.id, good: 50, minutes: '120' });
    await work('finish', { good: 50 });
    const draft = { orderId: order.id, taxRateId: null };
    const invoice = (
      await ready.shop.as('bookkeeper').post('/api/invoices').send(draft).expect(201)
    ).body as Invoice;
    expect(invoice.lines.map(({ description }) => description)).toEqual([
      'Coasters with a bramble, Brass rivets',
      'Setting up',
      'Rush',
      'Tooling, charged once',
    ]);
    expect(invoice.net).toBe(order.total);

    // Two logged hours: what the option left, by the hour and for a week's mix.
    const today = (await owner().get('/api/today').expect(200)).body as Today;
    expect(today.earned?.jobs[0]?.perBenchHour).toBe((Number(offered?.left) / 2).toFixed(2));
    const start = (await owner().get('/api/week-mixes/start').expect(200)).body as WeekStart;
    expect(start.week.kinds[0]).toMatchObject({ left: offered?.left, benchMinutes: '120' });
  });
});
