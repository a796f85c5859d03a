import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const add = (body: object) => owner().post('/api/hardware').send(body);

describe('hardware and supplies', () => {
  it('start with nothing on hand and are short of what the owner wants to hold', async () => {
    const { body } = await add({ name: 'Snap, brass', unitPrice: '0.24', reorderAt: 200 }).expect(
      201,
    );
    expect(body).toMatchObject({
      kind: 'hardware',
      onHand: 0,
      reserved: 0,
      free: 0,
      onOrder: 0,
      short: true,
      unitPrice: '0.24',
    });
    await owner()
      .post('/api/receipts')
      .send({ hardware: [{ hardwareId: body.id, quantity: 200 }] })
      .expect(201);
    const short = await owner().get('/api/hardware?short=yes&q=Snap').expect(200);
    expect(short.body.items).toEqual([]);
  });

  it('are listed by kind, page by page', async () => {
    for (const name of ['Thread', 'Box, small', 'Wax'])
      await add({ name, kind: 'supplies', unitPrice: '1' }).expect(201);
    const first = await shop.as('maker').get('/api/hardware?kind=supplies&limit=2').expect(200);
    expect(first.body.items.map((item: { name: string }) => item.name)).toEqual([
      'Wax',
      'Box, small',
    ]);
    const second = await shop
      .as('maker')
      .get(`/api/hardware?kind=supplies&limit=2&cursor=${first.body.next}`)
      .expect(200);
    expect(second.body).toMatchObject({ items: [{ name: 'Thread' }], next: null });
  });

  it('change only what is sent, in the version that was read', async () => {
    const { body } = await add({
      name: 'D-ring',
      unitPrice: '0.40',
      packSize: 50,
      reorderAt: 100,
    }).expect(201);
    const change = (version: number) =>
      owner().patch(`/api/hardware/${body.id}`).set('If-Match', `"${version}"`);
    const changed = await change(body.version).send({ unitPrice: '0.425' }).expect(200);
    expect(changed.body).toMatchObject({
      unitPrice: '0.425',
      packSize: 50,
      reorderAt: 100,
      version: body.version + 1,
    });
    await change(body.version).send({ unitPrice: '0.5' }).expect(412);
    await owner().patch(`/api/hardware/${body.id}`).send({ unitPrice: '0.5' }).expect(428);
  });

  it.each([
    ['a name that is taken', { name: 'D-ring', unitPrice: '1' }, 'name'],
    ['a price below zero', { name: 'Below', unitPrice: '-1' }, 'unitPrice'],
    ['a pack of nothing', { name: 'Empty', unitPrice: '1', packSize: 0 }, 'packSize'],
    [
      'a supplier that does not exist',
      { name: 'From nowhere', unitPrice: '1', supplierId: 999 },
      'supplierId',
    ],
    ['a count of its own', { name: 'Counted', unitPrice: '1', onHand: 5 }, 'onHand'],
  ])('refuse %s', async (_what, body, field) => {
    const refused = await add(body).expect(422);
    expect(refused.body.errors).toMatchObject([{ field }]);
  });

  it('are added by the owner alone', async () => {
    for (const role of ['maker', 'bookkeeper'] as const) {
      await shop
        .as(role)
        .post('/api/hardware')
        .send({ name: 'Theirs', unitPrice: '1' })
        .expect(403);
    }
  });
});
