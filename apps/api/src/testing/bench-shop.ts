import type { Job, Order, Quote } from '@hidewright/contract';
import { coaster } from './example-pattern.ts';
import { draftQuote, type QuotingShop } from './example-quote.ts';
import type { startTestShop } from './test-shop.ts';

type Shop = Awaited<ReturnType<typeof startTestShop>>;

/** A shop that can make what it quotes: leather on the rack, rivets on the shelf, a die and a plate with life left. */
export interface BenchShop extends QuotingShop {
  hardwareId: number;
  lotId: number;
  dieId: number;
  plateId: number;
}

const step = (name: string, per: string, secondsPerUnit: string, rejectPercent = '0') => ({
  name,
  per,
  setupMinutes: '5',
  secondsPerUnit,
  rejectPercent,
});

const steps = [
  step('Case panels', 'panel', '60'),
  step('Stamp', 'strike', '12', '3'),
  step('Cut', 'piece', '6', '4'),
  step('Fold and rivet', 'piece', '40', '1'),
];

/** 12 panels of 9 coasters: enough for one run of 50, not for two of 100. */
const lotAreaMm2 = '1107102.96';

export async function readyForTheBench(shop: Shop): Promise<BenchShop> {
  const owner = shop.as('owner');
  const make = async (path: string, body: object) =>
    (await owner.post(`/api/${path}`).send(body).expect(201)).body as { id: number };
  const leather = await make('leathers', { name: 'Oak tan 5–6 oz', pricePerFt2: '9.5' });
  const rivet = await make('hardware', {
    name: 'Rivet 9 mm',
    kind: 'hardware',
    unitPrice: '0.17',
    packSize: 100,
  });
  const definition = coaster(leather.id, {
    hardware: [{ hardwareId: rivet.id, perPiece: 2 }],
    work: { kind: 'steps', steps } as never,
  });
  const pattern = await make('patterns', { name: 'Round coaster', definition });
  const customer = await make('customers', {
    name: 'Brambling Brewery',
    contactName: 'The bar',
    email: 'bar@example.com',
    phone: '555 0100',
    address: 'Maltings Lane',
  });
  const receipt = await owner
    .post('/api/receipts')
    .send({
      lots: [
        {
          leatherId: leather.id,
          tag: 'OT-118',
          form: 'side',
          measuredAreaMm2: lotAreaMm2,
          cost: '120.00',
          place: 'rack 2',
        },
      ],
      hardware: [{ hardwareId: rivet.id, quantity: 300, cost: '51.00' }],
    })
    .expect(201);
  const tool = { cost: '90.00', patternId: pattern.id };
  const die = await make('tools', {
    ...tool,
    kind: 'cutting die',
    name: 'Coaster 95 mm',
    number: '7',
    lifeUses: 50_000,
    slot: 'C3',
  });
  const plate = await make('tools', {
    ...tool,
    kind: 'stamp plate',
    name: 'Bramble',
    number: '41',
    metal: 'magnesium',
    lifeUses: 2_000,
    customerId: customer.id,
  });
  const lots = (receipt.body as { lots: { id: number }[] }).lots;
  return {
    shop,
    patternId: pattern.id,
    customer: customer as QuotingShop['customer'],
    leatherId: leather.id,
    hardwareId: rivet.id,
    lotId: lots[0]?.id ?? 0,
    dieId: die.id,
    plateId: plate.id,
  };
}

/** A quote that the customer agreed to by phone. */
export async function agreedQuote(
  ready: BenchShop,
  quantity = 50,
  change: object = {},
): Promise<Quote> {
  const quote = await draftQuote(ready, change);
  const agreed = await ready.shop
    .as('owner')
    .post(`/api/quotes/${quote.id}/agreements`)
    .send({ quantity, how: 'phone' })
    .expect(200);
  return agreed.body as Quote;
}

export async function takenOn(
  ready: BenchShop,
  quantity = 50,
  change: object = {},
): Promise<Order> {
  const quote = await agreedQuote(ready, quantity);
  const body = { quoteId: quote.id, promisedOn: '2026-12-16', ...change };
  return (await ready.shop.as('owner').post('/api/orders').send(body).expect(201)).body as Order;
}

export async function ticketOf(ready: BenchShop, order: Order): Promise<Job> {
  return (await ready.shop.as('maker').get(`/api/jobs/${order.job.id}`).expect(200)).body as Job;
}

export async function setBenchHours({ shop }: BenchShop, benchHoursPerDay: string): Promise<void> {
  const { version } = (await shop.as('owner').get('/api/workshop').expect(200)).body as {
    version: number;
  };
  await shop
    .as('owner')
    .patch('/api/workshop')
    .set('If-Match', `"${version}"`)
    .send({ benchHoursPerDay })
    .expect(200);
}
