import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { OrderSuggestionReply, PurchaseOrder, RunsCheck } from '@hidewright/contract';
import { readyForTheBench, type BenchShop } from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
let oldbeck: number;
let fittings: number;

beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop());
  oldbeck = await supplier('Oldbeck Tannery', 9);
  fittings = await supplier('Fennbridge Fittings', 3);
});
afterEach(() => ready.shop.close());

const owner = () => ready.shop.as('owner');
/** 400 rivets, of which 300 are free. */
const runs = () => [{ patternId: ready.patternId, quantity: 200, by: '2026-12-21' }];

async function supplier(name: string, leadDays: number): Promise<number> {
  return (await owner().post('/api/suppliers').send({ name, leadDays }).expect(201)).body.id;
}

const offer = (body: object) => owner().post('/api/supplier-offers').send(body).expect(201);

async function change(path: string, body: object): Promise<void> {
  const now = await owner().get(`/api/${path}`).expect(200);
  const asked = owner().patch(`/api/${path}`).set('If-Match', `"${now.body.version}"`);
  await asked.send(body).expect(200);
}

async function check(): Promise<RunsCheck> {
  return (await ready.shop.as('maker').post('/api/checks').send({ runs: runs() }).expect(200)).body;
}

async function draft() {
  const asked = { runs: runs() };
  const { body } = await owner().post('/api/checks/purchase-orders').send(asked).expect(201);
  return body as { orders: PurchaseOrder[]; notes: string[] };
}

const rivetsOf = ({ runs: [run] }: RunsCheck) =>
  run?.answers.find(({ about }) => about === 'hardware')?.sentence;

it('goes by the offer that is preferred: its supplier, minimum, packs, days and price', async () => {
  const { hardwareId } = ready;
  const breaks = [{ from: '250', price: '0.20' }];
  await offer({ hardwareId, supplierId: oldbeck, breaks: [{ from: '0', price: '0.10' }] });
  await offer({
    ...{ hardwareId, supplierId: fittings, breaks, preferred: true },
    ...{ minimum: '500', multiple: '250', leadDays: 6 },
  });
  const found = await check();
  expect(rivetsOf(found)).toBe(
    'Rivet 9 mm: 400 needed, 300 free, 100 short. Buy 2 packs of 250, or receive them if they are here. Ordered from Fennbridge Fittings today, it is here by Mon 7 Dec 2026.',
  );
  expect(found.short.find(({ of }) => of === 'hardware')).toMatchObject({
    ...{ supplierName: 'Fennbridge Fittings', arrivesOn: '2026-12-07' },
    ...{ buy: '100', toOrder: '500' },
  });
  const { orders, notes } = await draft();
  expect(orders).toMatchObject([
    {
      ...{ supplierName: 'Fennbridge Fittings', arrivesOn: '2026-12-07' },
      lines: [{ quantity: 500, unitPrice: '0.20' }],
    },
  ]);
  expect(notes.join()).not.toContain('Rivet');
  expect((await draft()).orders).toEqual([]);
});

it('goes on to a price break that costs less, says so, and shows the maker no price', async () => {
  const breaks = [
    { from: '0', price: '0.20' },
    { from: '150', price: '0.12' },
  ];
  await offer({ hardwareId: ready.hardwareId, supplierId: fittings, breaks });
  expect(rivetsOf(await check())).toContain('Buy 150 (the price breaks there), or receive');
  const { orders, notes } = await draft();
  expect(orders[0]?.lines).toMatchObject([{ quantity: 150, unitPrice: '0.12' }]);
  expect(notes).toContain('Rivet 9 mm: 150 cost less than 100, so 150 are drafted.');
});

it('adds to the draft that waits for its supplier, so that both reach a price break together', async () => {
  const { hardwareId } = ready;
  const breaks = [
    { from: '0', price: '0.20' },
    { from: '100', price: '0.12' },
  ];
  await offer({ hardwareId, supplierId: fittings, breaks });
  const lines = [{ of: 'hardware', hardwareId, quantity: 50, unitPrice: '0.20' }];
  const typed = { supplierId: fittings, lines };
  const { body: before } = await owner().post('/api/purchase-orders').send(typed).expect(201);
  const { orders } = await draft();
  expect(orders).toMatchObject([
    {
      ...{ id: before.id, lines: [{ quantity: 100, unitPrice: '0.12' }] },
      draftedFor: expect.stringMatching(/, packed by Mon 21 Dec 2026$/),
    },
  ]);
  expect((await draft()).orders).toEqual([]);
});

it('names what could be had for the same money, and does not take it by itself', async () => {
  const breaks = [
    { from: '0', price: '0.20' },
    { from: '200', price: '0.10' },
  ];
  await offer({ hardwareId: ready.hardwareId, supplierId: fittings, breaks });
  const { orders, notes } = await draft();
  expect(orders[0]?.lines).toMatchObject([{ quantity: 100 }]);
  expect(notes).toContain('Rivet 9 mm: 200 cost no more than the 100 that are drafted.');
});

it('takes leather by the offer as well, in ft² at its break', async () => {
  const { leatherId } = ready;
  const breaks = [{ from: '0', price: '8.00' }];
  await offer({ leatherId, supplierId: oldbeck, breaks, multiple: '9290304', leadDays: 14 });
  const [lacking] = (await draft()).orders;
  expect(lacking).toMatchObject({ supplierName: 'Oldbeck Tannery', arrivesOn: '2026-12-15' });
  expect(lacking?.lines).toMatchObject([{ areaMm2: '9290304', unitPrice: '8.00' }]);
  expect((await check()).short).toEqual(
    expect.arrayContaining([expect.objectContaining({ of: 'leather', arrivesOn: '2026-12-15' })]),
  );
});

describe('from whom it was bought before somebody else made an offer', () => {
  /** Rivets and leather of those who are named, which somebody new offers for less. */
  async function offeredForLess(rivetPrice: string, leatherPrice: string): Promise<void> {
    const { hardwareId, leatherId } = ready;
    await change(`hardware/${hardwareId}`, { supplierId: fittings, unitPrice: rivetPrice });
    const sides = { wholeForm: 'side', wholeAreaMm2: '2043866.88' };
    await change(`leathers/${leatherId}`, {
      ...{ supplierId: oldbeck, pricePerFt2: leatherPrice },
      ...sides,
    });
    const supplierId = await supplier('Brindle and Daughters', 1);
    await offer({ hardwareId, supplierId, breaks: [{ from: '1', price: '0.01' }] });
    await offer({ leatherId, supplierId, breaks: [{ from: '0', price: '0.50' }] });
  }

  it('is still ordered from, at what was paid, in packs and whole sides', async () => {
    await offeredForLess('0.17', '9.5');
    const { orders, notes } = await draft();
    expect(orders).toMatchObject([
      { supplierName: 'Fennbridge Fittings', lines: [{ quantity: 100, unitPrice: '0.17' }] },
      {
        supplierName: 'Oldbeck Tannery',
        lines: [{ areaMm2: '2043866.88', unitPrice: '9.50' }],
      },
    ]);
    expect(notes).toEqual([]);
    const { short } = await check();
    expect(short.map(({ supplierName }) => supplierName)).toEqual([
      'Oldbeck Tannery',
      'Fennbridge Fittings',
    ]);
  });

  it('is still ordered from where no price was known, and the notes say so', async () => {
    await offeredForLess('0', '0');
    const { orders, notes } = await draft();
    expect(orders).toMatchObject([
      { supplierName: 'Fennbridge Fittings', lines: [{ quantity: 100, unitPrice: '0.00' }] },
      { supplierName: 'Oldbeck Tannery', lines: [{ unitPrice: '0.00' }] },
    ]);
    expect(notes).toEqual(
      ['Oak tan 5–6 oz', 'Rivet 9 mm'].map(
        (name) => `The price of ${name} is not known: its order asks the supplier for it.`,
      ),
    );
  });
});

it('says the same day as what to order', async () => {
  const breaks = [{ from: '0', price: '0.20' }];
  await offer({ hardwareId: ready.hardwareId, supplierId: fittings, breaks, leadDays: 4 });
  const { body } = await owner().get('/api/order-suggestions?show=all').expect(200);
  const items = body.items as OrderSuggestionReply[];
  const suggested = items.find(({ of, id }) => of === 'hardware' && id === ready.hardwareId);
  const short = (await check()).short.find(({ of }) => of === 'hardware');
  // Four days from Tuesday is a Saturday: it comes on Monday.
  expect([suggested?.arrivesOn, short?.arrivesOn]).toEqual(['2026-12-07', '2026-12-07']);
});
