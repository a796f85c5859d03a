import type supertest from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Today } from '@hidewright/contract';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop, testPassword } from '../../testing/test-shop.ts';
import { verifyFolder } from '../../verify/verify-folder.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let order: Awaited<ReturnType<typeof orderMore>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());
beforeEach(async () => {
  things = await stockUp(shop);
  order = await orderMore(shop, things);
});

interface Delivery {
  id: number;
  version: number;
  lines: { id: number }[];
}

const owner = () => shop.as('owner');
async function receive(body: object): Promise<Delivery> {
  const received = owner()
    .post('/api/receipts')
    .send({ purchaseOrderId: order.id, ...body });
  return (await received.expect(201)).body.receipt;
}
/** Ordered at 162.50. */
const rivets = (cost: string) => ({
  hardware: [
    { hardwareId: things.hardwareId, purchaseLineId: order.rivetLine, quantity: 1000, cost },
  ],
});
const shortSide = () => ({
  leatherId: things.leatherId,
  purchaseLineId: order.leatherLine,
  form: 'side',
  markedAreaMm2: ft2(25),
  measuredAreaMm2: ft2(24),
});
const answer = (
  { id, version }: Delivery,
  body: object,
  by: Pick<supertest.Agent, 'post'> = owner(),
) => by.post(`/api/receipts/${id}/answers`).set('If-Match', `"${version}"`).send(body);
const read = async ({ id }: Delivery) =>
  (await owner().get(`/api/receipts/${id}`).expect(200)).body;
async function asked(kind: 'price' | 'claim') {
  const { body } = await owner().get('/api/today').expect(200);
  const here = `/stockroom/purchase-orders/${order.id}`;
  return (body as Today).now.filter((toDo) => toDo.kind === kind && toDo.to === here);
}

describe('letting a price stand', () => {
  it('is written down with its reason, and Today asks no more', async () => {
    const receipt = await receive({ ...rivets('170.00'), receivedOn: '2026-03-02' });
    expect(receipt).toMatchObject({ priceDifference: '7.50', letStand: null });
    expect(await asked('price')).toHaveLength(1);
    const reason = 'Brass went up.';
    const { body } = await answer(receipt, { matter: 'price', reason }).expect(201);
    const letStand = { reason, at: '2026-12-01T09:00:00.000Z', by: 'The owner' };
    expect(body).toMatchObject({ letStand, notClaimed: null, version: receipt.version + 1 });
    expect(await asked('price')).toEqual([]);
    const log = await owner().get('/api/activities').expect(200);
    expect(log.body.items[0]).toMatchObject({
      action: 'let the price of the delivery of Mon 2 Mar 2026 stand',
    });
  });

  it('is asked about again once another cost is typed, and not for the same', async () => {
    const receipt = await receive(rivets('170.00'));
    const { body: stands } = await answer(receipt, { matter: 'price' }).expect(201);
    const correct = async ({ version }: Delivery, goods: string) =>
      (
        await owner()
          .patch(`/api/receipts/${receipt.id}`)
          .set('If-Match', `"${version}"`)
          .send({ goods: [{ receiptLineId: receipt.lines[0]?.id, goods }] })
          .expect(200)
      ).body;
    const dearer = await correct(stands, '171.00');
    expect(dearer).toMatchObject({ priceDifference: '8.50', letStand: null });
    expect(await asked('price')).toMatchObject([
      { detail: expect.stringContaining('cost 8.50 more than ordered') },
    ]);
    const asBefore = await correct(dearer, '170.00');
    expect(asBefore).toMatchObject({ letStand: { by: 'The owner' } });
    expect(await asked('price')).toEqual([]);
    const asOrdered = await correct(asBefore, '162.50');
    expect(asOrdered).toMatchObject({ priceDifference: '0.00', letStand: null });
    const refused = await answer(asOrdered, { matter: 'price' }).expect(409);
    expect(refused.body.detail).toBe('This delivery cost what was ordered.');
  });

  it('pressed twice is done once, and somebody else is told who was quicker', async () => {
    const receipt = await receive(rivets('150.00'));
    const press = () => answer(receipt, { matter: 'price' }).set('Idempotency-Key', 'one-press');
    const [first, second] = [await press().expect(201), await press().expect(201)];
    expect(second.body).toEqual(first.body);

    const email = 'partner@example.com';
    const partner = { name: 'The partner', email, role: 'owner', password: testPassword };
    await owner().post('/api/people').send(partner).expect(201);
    const other = shop.nobody();
    await other.post('/api/session').send({ email, password: testPassword }).expect(200);
    const stale = await answer(receipt, { matter: 'price' }, other).expect(412);
    expect(stale.body.changed).toMatchObject({
      by: 'The owner',
      what: expect.stringContaining('let the price'),
    });
    const again = await answer(first.body, { matter: 'price' }, other).expect(409);
    expect(again.body.detail).toBe('The owner has let this price stand already.');
  });
});

describe('not claiming what is short', () => {
  it('is written down, whatever came in spring, and a claim may follow all the same', async () => {
    const receipt = await receive({ lots: [shortSide()], receivedOn: '2026-03-02' });
    expect(await asked('claim')).toMatchObject([{ action: 'Claim' }]);
    const { body } = await answer(receipt, { matter: 'short' }).expect(201);
    expect(body).toMatchObject({ letStand: null, notClaimed: { reason: '', by: 'The owner' } });
    expect(await asked('claim')).toEqual([]);
    const twice = await answer(body, { matter: 'short' }).expect(409);
    expect(twice.body.detail).toBe('The owner has said already that this is not claimed.');

    const claim = { by: 'hand', text: 'It is short after all.' };
    await owner().post(`/api/receipts/${receipt.id}/claims`).send(claim).expect(201);
    expect(await asked('claim')).toMatchObject([{ title: 'Claimed' }]);
    const claimed = await answer(body, { matter: 'short' }).expect(409);
    expect(claimed.body.detail).toMatch(/is claimed already/);
  });

  it('says nothing of what comes short in the next delivery', async () => {
    await answer(await receive({ lots: [shortSide()] }), { matter: 'short' }).expect(201);
    await receive({ lots: [shortSide()] });
    expect(await asked('claim')).toMatchObject([
      { detail: expect.stringContaining('1 lot can be claimed') },
    ]);
  });
});

describe('an answer', () => {
  it('is the owner’s, and the maker sees neither it nor what it is about', async () => {
    const receipt = await receive({ ...rivets('170.00'), lots: [shortSide()] });
    for (const role of ['maker', 'bookkeeper'] as const)
      await answer(receipt, { matter: 'price' }, shop.as(role)).expect(403);
    await answer(receipt, { matter: 'price', reason: 'Brass went up.' }).expect(201);
    await answer(await read(receipt), { matter: 'short' }).expect(201);
    const seen = await shop.as('maker').get(`/api/receipts/${receipt.id}`).expect(200);
    expect(seen.text).not.toMatch(/priceDifference|letStand|notClaimed|Brass/);
    const bookkeeper = await shop.as('bookkeeper').get(`/api/receipts/${receipt.id}`).expect(200);
    expect(bookkeeper.body).toMatchObject({ letStand: { reason: 'Brass went up.' } });
  });

  it('needs a delivery that differs, and that came for an order', async () => {
    const loose = { ...shortSide(), purchaseLineId: null, cost: '1.00' };
    const without = await receive({ purchaseOrderId: null, lots: [loose] });
    expect(without).toMatchObject({ priceDifference: '0.00' });
    for (const matter of ['price', 'short']) {
      const refused = await answer(without, { matter }).expect(409);
      expect(refused.body.detail).toMatch(/^This came without an order/);
    }
    const asOrdered = await receive(rivets('162.50'));
    const whole = await answer(asOrdered, { matter: 'short' }).expect(409);
    expect(whole.body.detail).toBe('No lot of this delivery is short of its mark.');
    const vague = await answer(asOrdered, { matter: 'all' }).expect(422);
    expect(vague.body.errors).toMatchObject([{ field: 'matter' }]);
    await answer({ ...asOrdered, id: 999_999 }, { matter: 'price' }).expect(404);
  });

  it('keeps every rule of the books', async () => {
    const results = await verifyFolder(shop.context.config.dataDir);
    expect(results.filter(({ faults }) => faults.length > 0)).toEqual([]);
  });
});
