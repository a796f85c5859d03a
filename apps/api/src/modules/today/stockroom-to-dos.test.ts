import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Today, ToDo } from '@hidewright/contract';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());
beforeEach(async () => {
  things = await stockUp(shop);
});

const owner = () => shop.as('owner');
const maker = () => shop.as('maker');

/** What of one kind stands on a role's Today. */
async function toDos(role: 'owner' | 'maker', kind: ToDo['kind']) {
  const { body } = await shop.as(role).get('/api/today').expect(200);
  return (body as Today).now.filter((toDo) => toDo.kind === kind);
}

describe('a count', () => {
  async function openSheet(place: string) {
    const side = { leatherId: things.leatherId, form: 'side', measuredAreaMm2: ft2(20), place };
    await owner()
      .post('/api/receipts')
      .send({ lots: [side, side] })
      .expect(201);
    const { body } = await maker().post('/api/counts').send({ of: 'place', place }).expect(201);
    const path = `/api/counts/${body.id}`;
    const [first] = body.lines as { id: number }[];
    const counted = maker().put(`${path}/lines/${first?.id}`).send({ unmeasured: true });
    await counted.expect(200);
    return { id: body.id as number, path, first: first?.id };
  }
  const handIn = (path: string) =>
    maker().post(`${path}/handing-in`).send({ leaveUncounted: true }).expect(201);

  it('waits for the maker while it is open and for the owner once it is handed in', async () => {
    const { id, path, first } = await openSheet('Rack 1');
    const open = { detail: 'Rack 1: 1 of 2 counted', to: `/stockroom/counts/${id}` };
    expect(await toDos('maker', 'count')).toMatchObject([open]);
    expect(await toDos('owner', 'approve')).toEqual([]);

    await handIn(path);
    expect(await toDos('maker', 'count')).toEqual([]);
    expect(await toDos('maker', 'approve')).toEqual([]);
    expect(await toDos('owner', 'approve')).toMatchObject([
      { detail: 'The count of Rack 1 waits to be approved', to: `/stockroom/counts/${id}` },
    ]);

    await owner()
      .post(`${path}/recounts`)
      .send({ lineIds: [first] })
      .expect(201);
    expect(await toDos('owner', 'approve')).toEqual([]);
    expect(await toDos('maker', 'count')).toMatchObject([
      { detail: 'Rack 1: 0 of 2 counted, 1 to count once more' },
    ]);
    await owner().post(`${path}/cancellation`).send({}).expect(201);
    expect(await toDos('maker', 'count')).toEqual([]);
  });

  it('is one ticket with all others that wait', async () => {
    for (const place of ['Rack 2', 'Rack 3']) await handIn((await openSheet(place)).path);
    expect(await toDos('owner', 'approve')).toMatchObject([
      { detail: '2 counts wait to be approved', to: '/stockroom/counts' },
    ]);
  });
});

describe('an order to a supplier', () => {
  const lines = () => [
    { of: 'hardware', hardwareId: things.hardwareId, quantity: 100, unitPrice: '0.17' },
  ];
  const draft = async () =>
    (
      await owner()
        .post('/api/purchase-orders')
        .send({ supplierId: things.supplierId, lines: lines() })
        .expect(201)
    ).body as { id: number; number: string };
  const send = (id: number) =>
    owner().post(`/api/purchase-orders/${id}/sendings`).send({ by: 'hand' }).expect(201);

  it('waits to be sent by its number, or with the others as one ticket', async () => {
    const [first, second] = [await draft(), await draft()];
    expect(await toDos('owner', 'order')).toMatchObject([
      { detail: '2 orders wait to be sent', to: '/stockroom/purchase-orders?state=draft' },
    ]);
    await send(first.id);
    expect(await toDos('owner', 'order')).toMatchObject([
      {
        detail: expect.stringContaining(`${second.number} to Oldbeck Tannery`),
        to: `/stockroom/purchase-orders/${second.id}`,
      },
    ]);
    expect(await toDos('maker', 'order')).toEqual([]);
    await send(second.id);
    expect(await toDos('owner', 'order')).toEqual([]);
  });

  it('waits to be claimed where a lot came short of its mark, until the claim is settled', async () => {
    const order = await orderMore(shop, things);
    const side = (measured: number) => ({
      leatherId: things.leatherId,
      purchaseLineId: order.leatherLine,
      form: 'side',
      markedAreaMm2: ft2(25),
      measuredAreaMm2: ft2(measured),
    });
    const { body } = await maker()
      .post('/api/receipts')
      .send({ purchaseOrderId: order.id, lots: [side(24), side(24.25)] })
      .expect(201);
    const to = `/stockroom/purchase-orders/${order.id}`;
    expect(await toDos('owner', 'claim')).toMatchObject([
      { detail: expect.stringContaining('1 lot can be claimed'), action: 'Claim', to },
    ]);
    expect(await toDos('maker', 'claim')).toEqual([]);

    const claim = await owner()
      .post(`/api/receipts/${body.receipt.id}/claims`)
      .send({ by: 'hand', text: 'It is short.' })
      .expect(201);
    expect(await toDos('owner', 'claim')).toMatchObject([
      { detail: expect.stringContaining('the claim for 1 lot awaits its credit'), to },
    ]);
    await owner()
      .patch(`/api/supplier-claims/${claim.body.id}`)
      .set('If-Match', `"${claim.body.version}"`)
      .send({ state: 'given up', note: 'Let it pass.' })
      .expect(200);
    expect(await toDos('owner', 'claim')).toEqual([]);
  });

  it('waits for the credit of what went back, until it is credited or given up', async () => {
    const order = await orderMore(shop, things);
    const { hardwareId } = things;
    const rivets = { hardwareId, purchaseLineId: order.rivetLine, quantity: 1000 };
    await maker()
      .post('/api/receipts')
      .send({ purchaseOrderId: order.id, hardware: [rivets] })
      .expect(201);
    await owner()
      .post(`/api/purchase-orders/${order.id}/returns`)
      .send({ of: 'hardware', hardwareId, quantity: 200, reason: 'Wrong colour' })
      .expect(201);
    expect(await toDos('owner', 'claim')).toMatchObject([
      {
        title: 'Sent back',
        detail: expect.stringContaining('what went back awaits its credit'),
        to: `/stockroom/purchase-orders/${order.id}`,
      },
    ]);
    expect(await toDos('maker', 'claim')).toEqual([]);
    const { body } = await owner().get(`/api/purchase-orders/${order.id}/claims`).expect(200);
    await owner()
      .patch(`/api/supplier-claims/${body.items[0].id}`)
      .set('If-Match', '"1"')
      .send({ state: 'given up', note: 'They sent others instead.' })
      .expect(200);
    expect(await toDos('owner', 'claim')).toEqual([]);
  });

  it('shows the owner what came at another price, never the maker', async () => {
    const order = await orderMore(shop, things);
    const rivets = { hardwareId: things.hardwareId, purchaseLineId: order.rivetLine };
    await owner()
      .post('/api/receipts')
      .send({
        purchaseOrderId: order.id,
        hardware: [{ ...rivets, quantity: 600, cost: '105.00' }],
        receivedOn: '2026-01-30',
      })
      .expect(201);
    const to = `/stockroom/purchase-orders/${order.id}`;
    expect(await toDos('owner', 'price')).toMatchObject([
      {
        detail: expect.stringContaining('cost 7.50 more than ordered'),
        when: { word: 'received', day: '2026-01-30' },
        to,
      },
    ]);
    await owner()
      .post('/api/receipts')
      .send({
        purchaseOrderId: order.id,
        hardware: [{ ...rivets, quantity: 400, cost: '57.50' }],
      })
      .expect(201);
    expect(await toDos('owner', 'price')).toMatchObject([
      { detail: expect.stringMatching(/^2 deliveries of P-.* did not cost what was ordered$/), to },
    ]);
    expect(await toDos('maker', 'price')).toEqual([]);
  });
});
