import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let cap: number;
let post: number;
let kit: { id: number; version: number };

beforeAll(async () => {
  shop = await startTestShop();
  cap = (await add({ name: 'Cap 9 mm', unitPrice: '0.06' }).expect(201)).body.id;
  post = (await add({ name: 'Post 8 mm', unitPrice: '0.05' }).expect(201)).body.id;
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const add = (body: object) => owner().post('/api/hardware').send(body);
const read = async (id: number) => (await owner().get(`/api/hardware/${id}`).expect(200)).body;
const change = async (id: number, body: object) =>
  owner()
    .patch(`/api/hardware/${id}`)
    .set('If-Match', `"${(await read(id)).version}"`)
    .send(body);
const receive = (hardwareId: number, quantity: number) =>
  owner()
    .post('/api/receipts')
    .send({ hardware: [{ hardwareId, quantity }] });

describe('a kit', () => {
  it('costs what its parts cost and is as many as they make up whole', async () => {
    await receive(cap, 250).expect(201);
    await receive(post, 205).expect(201);
    const parts = [
      { hardwareId: cap, quantity: 1 },
      { hardwareId: post, quantity: 2 },
    ];
    const { body } = await add({
      name: 'Rivet 9 mm',
      unitPrice: '0',
      priceFromParts: true,
      reorderAt: 500,
      parts,
    }).expect(201);
    kit = body;
    expect(body).toMatchObject({
      unitPrice: '0.16',
      onHand: 102,
      free: 102,
      short: false,
      parts: [
        { name: 'Cap 9 mm', quantity: 1, free: 250 },
        { name: 'Post 8 mm', quantity: 2, free: 205 },
      ],
    });
    expect(await read(cap)).toMatchObject({ partOf: [{ name: 'Rivet 9 mm' }], parts: [] });
  });

  it('is said where its parts are: what to order, on hand and found', async () => {
    const { body: toOrder } = await owner().get('/api/order-suggestions?show=all').expect(200);
    const kitsOf = (hardwareId: number) =>
      toOrder.items.find(({ id }: { id: number }) => id === hardwareId).kits;
    expect(kitsOf(post)).toEqual([{ id: kit.id, name: 'Rivet 9 mm', free: 102 }]);

    const { body: levels } = await owner().get('/api/stock-levels').expect(200);
    expect(levels.kits).toEqual([
      {
        ...{ hardwareId: kit.id, name: 'Rivet 9 mm', quantity: 102 },
        parts: [
          { name: 'Cap 9 mm', quantity: 1 },
          { name: 'Post 8 mm', quantity: 2 },
        ],
      },
    ]);
    const { body: earlier } = await owner().get('/api/stock-levels?on=2025-01-01').expect(200);
    expect(earlier.kits).toMatchObject([{ name: 'Rivet 9 mm', quantity: 0 }]);

    const { body: found } = await owner().get('/api/search?q=Rivet%209').expect(200);
    expect(found.items).toMatchObject([{ label: 'Rivet 9 mm', detail: 'hardware · a kit' }]);
  });

  it('is not received or counted itself: its parts are', async () => {
    const refused = await receive(kit.id, 10).expect(422);
    expect(refused.body.errors[0].message).toBe(
      'Rivet 9 mm is a kit and is counted by its parts: enter Cap 9 mm and Post 8 mm instead.',
    );
    await owner()
      .post('/api/adjustments')
      .send({ of: 'hardware', hardwareId: kit.id, counted: 5, reason: 'counted' })
      .expect(422);
  });

  it('is not ordered itself either, since it could not be received', async () => {
    const { body: supplier } = await owner().post('/api/suppliers').send({ name: 'Kettlewell' });
    const lines = [{ of: 'hardware', hardwareId: kit.id, quantity: 10, unitPrice: '0.10' }];
    const order = { supplierId: supplier.id, lines };
    const { body } = await owner().post('/api/purchase-orders').send(order).expect(422);
    expect(body.errors).toEqual([
      {
        field: 'lines.0.hardwareId',
        message:
          'Rivet 9 mm is a kit and is counted by its parts: enter Cap 9 mm and Post 8 mm instead.',
      },
    ]);
  });

  it('rises in version when only its parts change, and costs what is typed where that is wanted', async () => {
    const before = await read(kit.id);
    const parts = [
      { hardwareId: cap, quantity: 1 },
      { hardwareId: post, quantity: 1 },
    ];
    expect((await change(kit.id, { parts })).body).toMatchObject({
      unitPrice: '0.11',
      onHand: 205,
      version: before.version + 1,
    });
    const typed = await change(kit.id, { priceFromParts: false, unitPrice: '0.10' });
    expect(typed.body).toMatchObject({ unitPrice: '0.10', parts: [{}, {}] });
  });

  it.each([
    ['itself', () => [{ hardwareId: kit.id, quantity: 1 }], 'part of itself'],
    ['a part that is not there', () => [{ hardwareId: 999, quantity: 1 }], 'Choose a part'],
    [
      'the same part twice',
      () => [
        { hardwareId: cap, quantity: 1 },
        { hardwareId: cap, quantity: 1 },
      ],
      'listed already',
    ],
  ])('has no %s in it', async (_what, parts, said) => {
    const refused = await change(kit.id, { parts: parts() });
    expect(refused.status).toBe(422);
    expect(refused.body.errors[0].message).toContain(said);
  });

  it('goes one level deep', async () => {
    const deeper = await add({
      name: 'Set of rivets',
      unitPrice: '1',
      parts: [{ hardwareId: kit.id, quantity: 4 }],
    }).expect(422);
    expect(deeper.body.errors).toMatchObject([
      {
        field: 'parts.0.hardwareId',
        message: 'Rivet 9 mm is a kit itself. Choose its parts instead.',
      },
    ]);
    await change(post, { parts: [{ hardwareId: cap, quantity: 1 }] }).then(({ status, body }) => {
      expect(status).toBe(422);
      expect(body.errors[0].message).toContain('on the shelf');
    });
    const bare = await add({ name: 'Washer', unitPrice: '0.01' }).expect(201);
    await change(kit.id, { parts: [{ hardwareId: bare.body.id, quantity: 1 }] });
    const circle = await change(bare.body.id, { parts: [{ hardwareId: cap, quantity: 1 }] });
    expect(circle.body.errors[0].message).toContain('is a part of Rivet 9 mm');
  });

  it('is sold by no supplier: its parts are', async () => {
    const { body } = await owner().post('/api/suppliers').send({ name: 'Sells kits' });
    const refused = await owner()
      .post('/api/supplier-offers')
      .send({ supplierId: body.id, hardwareId: kit.id, breaks: [{ from: '1', price: '1' }] })
      .expect(422);
    expect(refused.body.errors[0].message).toContain('is a kit');
  });

  it('has no price of its parts without parts', async () => {
    const refused = await add({ name: 'Alone', unitPrice: '1', priceFromParts: true }).expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'priceFromParts' }]);
  });
});

describe('what stands in for another', () => {
  it('does so one way or both ways, as it was entered', async () => {
    const nickel = (await add({ name: 'Ring, nickel', unitPrice: '0.3' }).expect(201)).body.id;
    const brass = (
      await add({
        name: 'Ring, brass',
        unitPrice: '0.4',
        standIns: [{ hardwareId: nickel, bothWays: true }],
      }).expect(201)
    ).body.id;
    expect((await read(nickel)).standIns).toEqual([
      { hardwareId: brass, name: 'Ring, brass', bothWays: true, free: 0 },
    ]);
    await change(brass, { standIns: [{ hardwareId: nickel, bothWays: false }] });
    expect((await read(nickel)).standIns).toEqual([]);
    expect((await read(brass)).standIns).toMatchObject([{ hardwareId: nickel, bothWays: false }]);
    const parts = [{ hardwareId: cap, quantity: 2 }];
    const byKit = await add({ name: 'Ring of caps', unitPrice: '1', parts }).expect(201);
    await change(brass, { standIns: [{ hardwareId: byKit.body.id, bothWays: false }] });
    expect((await read(brass)).standIns).toMatchObject([{ name: 'Ring of caps', free: 125 }]);
    const self = await change(brass, { standIns: [{ hardwareId: brass, bothWays: false }] });
    expect(self.body.errors[0].field).toBe('standIns.0.hardwareId');
  });
});

describe('what is said of hardware', () => {
  it('is kept as it was entered, and the stack it holds makes sense', async () => {
    const { body } = await add({
      ...{
        name: 'Snap, line 24',
        unitPrice: '0.3',
        unit: 'pair',
        metal: 'brass',
        colour: 'antique',
      },
      ...{ bin: 'Drawer 3', postLengthMm: '8', stackMinMm: '4.2', stackMaxMm: '5.5' },
      ...{ settingDie: 'SD-24', settingDieHere: false },
    }).expect(201);
    expect(body).toMatchObject({
      ...{ unit: 'pair', metal: 'brass', colour: 'antique', bin: 'Drawer 3' },
      ...{ postLengthMm: '8', stackMinMm: '4.2', stackMaxMm: '5.5', settingDieHere: false },
    });
    for (const wrong of [{ stackMaxMm: '4' }, { stackMaxMm: '8.5' }, { stackMaxMm: null }])
      expect((await change(body.id, wrong)).body.errors).toMatchObject([{ field: 'stackMaxMm' }]);
  });

  it('says what the customer brings, which nobody is to buy', async () => {
    const { body } = await add({
      ...{ name: 'Club medal', unitPrice: '0', fromCustomer: true, reorderAt: 50 },
    }).expect(201);
    expect(body).toMatchObject({ fromCustomer: true, unitPrice: '0.00', short: false });
    const { body: supplier } = await owner().post('/api/suppliers').send({ name: 'Any' });
    const refused = await owner()
      .post('/api/supplier-offers')
      .send({ supplierId: supplier.id, hardwareId: body.id, breaks: [{ from: '1', price: '1' }] })
      .expect(422);
    expect(refused.body.errors[0].message).toContain('comes from the customer');
  });
});
