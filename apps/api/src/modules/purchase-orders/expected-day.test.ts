import { afterEach, beforeEach, expect, it } from 'vitest';
import type { OrderSuggestionReply, PurchaseOrder } from '@hidewright/contract';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;

beforeEach(async () => {
  shop = await startTestShop();
  things = await stockUp(shop);
});
afterEach(() => shop.close());

const owner = () => shop.as('owner');
/** Sessions began on 1 December: what came before is done before. */
const at = (day: string) => shop.clock.set(new Date(`${day}T09:00:00Z`));
const rivets = () => ({
  ...{ of: 'hardware', hardwareId: things.hardwareId, quantity: 100, unitPrice: '0.17' },
});

async function draft(more: object = {}): Promise<PurchaseOrder> {
  const body = { supplierId: things.supplierId, lines: [rivets()], ...more };
  return (await owner().post('/api/purchase-orders').send(body).expect(201)).body;
}

async function send(id: number): Promise<PurchaseOrder> {
  const sending = owner().post(`/api/purchase-orders/${id}/sendings`).send({ by: 'hand' });
  return (await sending.expect(201)).body;
}

const read = async (id: number): Promise<PurchaseOrder> =>
  (await owner().get(`/api/purchase-orders/${id}`).expect(200)).body;

const offer = (leadDays: number, more: object = {}) =>
  owner()
    .post('/api/supplier-offers')
    .send({
      ...{ supplierId: things.supplierId, hardwareId: things.hardwareId, leadDays },
      ...{ breaks: [{ from: '0', price: '0.17' }], ...more },
    })
    .expect(201);

async function toOrder(of: string, id: number): Promise<OrderSuggestionReply> {
  const { body } = await owner().get('/api/order-suggestions?show=all').expect(200);
  const items = body.items as OrderSuggestionReply[];
  return items.find((item) => item.of === of && item.id === id) as OrderSuggestionReply;
}

const putOnDraft = async (of: string, id: number, quantity: string): Promise<PurchaseOrder> => {
  const lines = [{ of, id, quantity, drafted: (await toOrder(of, id)).drafted }];
  const { body } = await owner()
    .post('/api/order-suggestions/purchase-orders')
    .send({ lines })
    .expect(201);
  return body.orders[0];
};

it('is worked out from the day on which it is sent, not on which it was drafted', async () => {
  await offer(7);
  at('2026-11-22');
  const { id, expectedOn, arrivesOn } = await putOnDraft('hardware', things.hardwareId, '100');
  expect({ expectedOn, arrivesOn }).toEqual({ expectedOn: null, arrivesOn: '2026-11-30' });
  at('2026-12-01');
  expect(await read(id)).toMatchObject({ arrivesOn: '2026-12-08' });
  expect(await send(id)).toMatchObject({ expectedOn: '2026-12-08', arrivesOn: null });
});

it('is worked out anew where it is over by then, and the log says so', async () => {
  at('2026-11-20');
  const { id } = await draft({ expectedOn: '2026-11-30' });
  expect(await read(id)).toMatchObject({ expectedOn: '2026-11-30', arrivesOn: '2026-11-30' });
  at('2026-12-01');
  expect(await read(id)).toMatchObject({ expectedOn: '2026-11-30', arrivesOn: '2026-12-11' });
  expect(await send(id)).toMatchObject({ expectedOn: '2026-12-11', awaitedOn: '2026-12-11' });
  expect((await toOrder('hardware', things.hardwareId)).overdue).toEqual([]);
  const { body } = await owner().get('/api/activities').expect(200);
  expect(body.items[0].action).toMatch(/by hand, awaited 2026-12-11, as 2026-11-30 is over$/);
});

it('stays where somebody chose it and it is still to come', async () => {
  const { id } = await draft({ expectedOn: '2026-12-24' });
  expect(await send(id)).toMatchObject({ expectedOn: '2026-12-24' });
});

it('goes by the offer of its own supplier, the slowest line, and working days', async () => {
  await offer(30);
  const { id, arrivesOn } = await draft({
    lines: [
      { of: 'leather', leatherId: things.leatherId, areaMm2: ft2(10), unitPrice: '9.00' },
      rivets(),
    ],
  });
  expect(arrivesOn).toBe('2026-12-31');
  expect(await send(id)).toMatchObject({ expectedOn: '2026-12-31' });
});

it('takes no notice of what another supplier says', async () => {
  const other = await owner().post('/api/suppliers').send({ name: 'Fennbridge Fittings' });
  await offer(30, { supplierId: other.body.id });
  expect(await draft()).toMatchObject({ arrivesOn: '2026-12-11' });
});

it('moves when a slower thing is added to the draft', async () => {
  await offer(7);
  const first = await putOnDraft('hardware', things.hardwareId, '100');
  const more = await putOnDraft('leather', things.leatherId, ft2(10));
  expect([more.id, first.arrivesOn, more.arrivesOn]).toEqual([
    first.id,
    '2026-12-08',
    '2026-12-11',
  ]);
});

it('learns from how long the supplier’s deliveries took', async () => {
  for (const [sent, came] of [
    ['2026-11-16', '2026-11-19'],
    ['2026-11-17', '2026-11-20'],
    ['2026-11-18', '2026-11-21'],
  ] as const) {
    at(sent);
    const { id, lines } = await draft();
    await send(id);
    at(came);
    const rivet = { hardwareId: things.hardwareId, quantity: 100, purchaseLineId: lines[0]?.id };
    const body = { purchaseOrderId: id, hardware: [rivet] };
    await owner().post('/api/receipts').send(body).expect(201);
  }
  at('2026-12-01');
  expect(await draft()).toMatchObject({ arrivesOn: '2026-12-04' });
});

it('counts the shop’s own days, whatever day it is at Greenwich', async () => {
  const { body: workshop } = await owner().get('/api/workshop').expect(200);
  const zone = owner().patch('/api/workshop').set('If-Match', `"${workshop.version}"`);
  await zone.send({ timeZone: 'America/Los_Angeles' }).expect(200);
  for (const day of ['17', '18', '19']) {
    // Half past five in the evening there, of the day before.
    shop.clock.set(new Date(`2026-11-${day}T01:30:00Z`));
    const { id, lines } = await draft();
    await send(id);
    const rivet = { hardwareId: things.hardwareId, quantity: 100, purchaseLineId: lines[0]?.id };
    const body = { purchaseOrderId: id, hardware: [rivet] };
    await owner().post('/api/receipts').send(body).expect(201);
  }
  shop.clock.set(new Date('2026-12-01T18:00:00Z'));
  expect(await draft()).toMatchObject({ arrivesOn: '2026-12-01' });
});
