import type { Customer, Quote, SentQuote } from '@hidewright/contract';
import { coaster } from './example-pattern.ts';
import type { startTestShop } from './test-shop.ts';

type Shop = Awaited<ReturnType<typeof startTestShop>>;

/** A shop that can quote: one leather, one kind of rivet, one pattern, one customer. */
export interface QuotingShop {
  shop: Shop;
  patternId: number;
  customer: Customer;
  leatherId: number;
}

export async function readyToQuote(shop: Shop): Promise<QuotingShop> {
  const owner = shop.as('owner');
  const leather = await owner
    .post('/api/leathers')
    .send({ name: 'Oak tan 5–6 oz', pricePerFt2: '9.5' })
    .expect(201);
  const rivet = { name: 'Rivet 9 mm', kind: 'hardware', unitPrice: '0.17' };
  const hardware = await owner.post('/api/hardware').send(rivet).expect(201);
  const definition = coaster(leather.body.id, {
    hardware: [{ hardwareId: hardware.body.id, perPiece: 2 }],
  });
  const pattern = await owner
    .post('/api/patterns')
    .send({ name: 'Round coaster', definition })
    .expect(201);
  const customer = await owner
    .post('/api/customers')
    .send({
      name: 'Brambling Brewery',
      contactName: 'The bar',
      email: 'bar@example.com',
      address: 'Maltings Lane',
    })
    .expect(201);
  return {
    shop,
    patternId: pattern.body.id,
    customer: customer.body as Customer,
    leatherId: leather.body.id,
  };
}

export function quoteBody({ patternId, customer }: QuotingShop, change: object = {}) {
  return {
    customerId: customer.id,
    patternId,
    title: 'Coasters with a bramble',
    inHandsOn: '2026-12-18',
    breaks: [{ quantity: 50 }, { quantity: 100 }, { quantity: 250 }],
    tooling: [{ name: 'Stamp plate', cost: '48.00', charge: '60.00' }],
    message: 'The plate stays yours.',
    ...change,
  };
}

export async function draftQuote(ready: QuotingShop, change: object = {}): Promise<Quote> {
  const reply = await ready.shop
    .as('owner')
    .post('/api/quotes')
    .send(quoteBody(ready, change))
    .expect(201);
  return reply.body as Quote;
}

export async function sendByHand(
  ready: QuotingShop,
  quote: Quote,
): Promise<SentQuote & { token: string }> {
  const reply = await ready.shop
    .as('owner')
    .post(`/api/quotes/${quote.id}/sendings`)
    .set('If-Match', `"${quote.version}"`)
    .send({ by: 'hand' })
    .expect(200);
  const sent = reply.body as SentQuote;
  return { ...sent, token: sent.linkUrl.split('/c/')[1] ?? '' };
}
