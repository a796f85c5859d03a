import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { writeBareJob } from '../../testing/bare-job.ts';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { reserveStock } from '../stock/stock-ledger.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let order: Awaited<ReturnType<typeof orderMore>>;
let lotId: number;
let jobId: number | undefined;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());
const side = (more: object = {}) => ({
  leatherId: things.leatherId,
  purchaseLineId: order.leatherLine,
  form: 'side',
  measuredAreaMm2: ft2(24),
  ...more,
});
beforeEach(async () => {
  things = await stockUp(shop);
  order = await orderMore(shop, things);
  const { body } = await shop
    .as('maker')
    .post('/api/receipts')
    .send({
      purchaseOrderId: order.id,
      lots: [side()],
      hardware: [
        { hardwareId: things.hardwareId, purchaseLineId: order.rivetLine, quantity: 1000 },
      ],
    })
    .expect(201);
  lotId = body.lots[0].id;
});

const back = (body: object) =>
  shop
    .as('owner')
    .post(`/api/purchase-orders/${order.id}/returns`)
    .send({ reason: 'Wrong colour', ...body });
const rivets = (quantity: number) =>
  back({ of: 'hardware', hardwareId: things.hardwareId, quantity });
const lot = () => back({ of: 'lot', lotId });
async function hold(item: { lotId: number } | { hardwareId: number }, quantity: number) {
  jobId ??= await writeBareJob(shop.context, things.hardwareId);
  const held = { ...item, jobId, quantity };
  await inTransaction(shop.context, theProgram, (work) => reserveStock(work, held));
}

describe('sending back to the supplier', () => {
  it('takes hardware off the rack at what it stands at, with the order as its paper', async () => {
    const { body } = await rivets(200).expect(201);
    expect(body).toMatchObject({
      kind: 'reject',
      quantity: -200,
      value: '-32.50',
      reason: 'Wrong colour',
      purchaseOrderNumber: expect.stringMatching(/^P-/),
    });
    const read = await shop.as('maker').get(`/api/hardware/${things.hardwareId}`).expect(200);
    expect(read.body.onHand).toBe(800);
    const list = await shop.as('maker').get(`/api/purchase-orders/${order.id}/returns`);
    expect(list.body.items).toMatchObject([{ quantity: -200 }]);
    expect(list.text).not.toContain('value');
  });

  it('takes all that is left of a lot, and a lot goes once', async () => {
    const { body } = await lot().expect(201);
    expect(body).toMatchObject({ kind: 'reject', areaMm2: '-2229672.96', value: '-204.00' });
    const read = await shop.as('owner').get(`/api/lots/${lotId}`).expect(200);
    expect(read.body).toMatchObject({ onHandAreaMm2: '0', valueOnHand: '0.00' });
    expect((await lot().expect(409)).body.detail).toMatch(/^Nothing is left of lot T-/);
  });

  it('leaves what is held for jobs, and says how much is free', async () => {
    await hold({ hardwareId: things.hardwareId }, 900);
    const refused = await rivets(200).expect(409);
    expect(refused.body.detail).toMatch(/100 is free and 900 is held for jobs/);
    expect(refused.body.allowed).toEqual(['send back up to 100']);
    await rivets(100).expect(201);
    await hold({ lotId }, 1);
    await lot().expect(409);
  });

  it('takes no more than came on the order, and nothing that did not', async () => {
    await rivets(600).expect(201);
    const refused = await rivets(401).expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'quantity' }]);
    const other = await orderMore(shop, things);
    const foreign = await shop
      .as('owner')
      .post(`/api/purchase-orders/${other.id}/returns`)
      .send({ of: 'lot', lotId, reason: 'Wrong colour' })
      .expect(422);
    expect(foreign.body.errors).toMatchObject([{ field: 'lotId' }]);
    await rivets(0).expect(422);
  });
});

describe('what went back', () => {
  const read = async (role: 'owner' | 'maker') =>
    (await shop.as(role).get(`/api/purchase-orders/${order.id}`).expect(200)).body;
  const claims = async () =>
    (await shop.as('bookkeeper').get(`/api/purchase-orders/${order.id}/claims`).expect(200)).body
      .items;
  const close = (id: number, body: object) =>
    shop.as('owner').patch(`/api/supplier-claims/${id}`).set('If-Match', '"1"').send(body);

  it('is marked on the line that it came on, for the maker too', async () => {
    expect((await read('owner')).lines[0].sentBack).toBeNull();
    await rivets(200).expect(201);
    await rivets(100).expect(201);
    await lot().expect(201);
    const lastOn = (await shop.as('maker').get('/api/today').expect(200)).body.day;
    expect((await read('maker')).lines).toMatchObject([
      { sentBack: { areaMm2: ft2(24), quantity: null, firstOn: lastOn, lastOn } },
      { sentBack: { areaMm2: null, quantity: 300, lastOn } },
    ]);
  });

  it('is owed for at what was paid for it, until it is credited', async () => {
    await rivets(200).expect(201);
    expect(await claims()).toMatchObject([
      {
        state: 'open',
        worth: '32.50',
        short: null,
        sentBack: { quantity: 200, lotTag: null, reason: 'Wrong colour' },
      },
    ]);
    const [claim] = await claims();
    await close(claim.id, { state: 'credited', credited: '40' }).expect(422);
    await close(claim.id, { state: 'credited', credited: '32.50' }).expect(200);
    expect(await claims()).toMatchObject([{ state: 'credited', credited: '32.50' }]);
  });

  it('is owed for by its mark where what it missed was claimed already', async () => {
    const { body } = await shop
      .as('owner')
      .post('/api/receipts')
      .send({
        purchaseOrderId: order.id,
        lots: [side({ markedAreaMm2: ft2(25) })],
      })
      .expect(201);
    await shop
      .as('owner')
      .post(`/api/receipts/${body.receipt.id}/claims`)
      .send({ by: 'hand', text: 'It is short.' })
      .expect(201);
    await back({ of: 'lot', lotId: body.lots[0].id }).expect(201);
    // 25 ft² were paid with 212.50: 1 ft² is claimed, and 24 ft² went back.
    expect(await claims()).toMatchObject([{ worth: '204.00' }, { worth: '8.50' }]);
  });
});
