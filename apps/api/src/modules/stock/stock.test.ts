import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { writeBareJob } from '../../testing/bare-job.ts';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { reserveStock } from './stock-ledger.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;

beforeAll(async () => {
  shop = await startTestShop();
});
afterAll(() => shop.close());
beforeEach(async () => {
  things = await stockUp(shop);
});

const side = (more: object = {}) => ({
  leatherId: things.leatherId,
  form: 'side',
  measuredAreaMm2: ft2(24.75),
  ...more,
});
const rivets = (quantity: number, more: object = {}) => ({
  hardwareId: things.hardwareId,
  quantity,
  ...more,
});
const receive = (body: object, role: 'owner' | 'maker' = 'owner') =>
  shop.as(role).post('/api/receipts').send(body);
const counts = async () =>
  (await shop.as('owner').get(`/api/hardware/${things.hardwareId}`).expect(200)).body;

describe('receiving', () => {
  it('hangs a lot with the next tag, its measured area and its cost, and writes the movement', async () => {
    const { body } = await receive({ lots: [side({ place: 'Rack 2', shade: 'dark' })] }).expect(
      201,
    );
    const [lot] = body.lots;
    expect(lot).toMatchObject({
      tag: expect.stringMatching(/^T-\d{4}$/),
      form: 'side',
      measuredAreaMm2: '2299350.24',
      onHandAreaMm2: '2299350.24',
      freeAreaMm2: '2299350.24',
      cost: '222.75',
      valueOnHand: '222.75',
      place: 'Rack 2',
      receivedOn: '2026-12-01',
    });
    const movements = await shop
      .as('bookkeeper')
      .get(`/api/stock-movements?lotId=${lot.id}`)
      .expect(200);
    expect(movements.body.items).toMatchObject([
      {
        kind: 'receive',
        areaMm2: '2299350.24',
        quantity: null,
        lotTag: lot.tag,
        value: '222.75',
        actorName: 'The owner',
      },
    ]);
  });

  it('takes a tag and a cost that the owner typed', async () => {
    const { body } = await receive({ lots: [side({ tag: 'RUSSET-1', cost: '180.00' })] }).expect(
      201,
    );
    expect(body.lots[0]).toMatchObject({ tag: 'RUSSET-1', cost: '180.00' });
    const again = await receive({ lots: [side({ tag: 'RUSSET-1' })] }).expect(422);
    expect(again.body.errors).toMatchObject([{ field: 'lots.0.tag' }]);
  });

  it('counts hardware in at its price', async () => {
    const { body } = await receive({ hardware: [rivets(600)] }).expect(201);
    expect(body.hardware).toMatchObject([
      { onHand: 600, reserved: 0, free: 600, valueOnHand: '102.00' },
    ]);
  });

  it('keeps nothing of a delivery when one line of it cannot be', async () => {
    const lots = await shop.as('owner').get('/api/lots').expect(200);
    const refused = await receive({
      lots: [side()],
      hardware: [rivets(5), { hardwareId: 99_999, quantity: 1 }],
    }).expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'hardware.1.hardwareId' }]);
    const after = await shop.as('owner').get('/api/lots').expect(200);
    expect(after.body.items).toHaveLength(lots.body.items.length);
    expect((await counts()).onHand).toBe(0);
  });

  it.each([
    ['nothing at all', () => ({}), 'lots'],
    ['a day to come', () => ({ hardware: [rivets(1)], receivedOn: '2026-12-02' }), 'receivedOn'],
    [
      'an area of nothing',
      () => ({ lots: [side({ measuredAreaMm2: '0' })] }),
      'lots.0.measuredAreaMm2',
    ],
    [
      'an area below zero',
      () => ({ lots: [side({ measuredAreaMm2: '-5' })] }),
      'lots.0.measuredAreaMm2',
    ],
    [
      'too many decimals',
      () => ({ lots: [side({ measuredAreaMm2: '1.2345' })] }),
      'lots.0.measuredAreaMm2',
    ],
    ['no number', () => ({ lots: [side({ measuredAreaMm2: 'NaN' })] }), 'lots.0.measuredAreaMm2'],
    ['a form that does not exist', () => ({ lots: [side({ form: 'cloth' })] }), 'lots.0.form'],
    ['a count below zero', () => ({ hardware: [rivets(-3)] }), 'hardware.0.quantity'],
    ['half a rivet', () => ({ hardware: [rivets(1.5)] }), 'hardware.0.quantity'],
    [
      'a field that nobody asked for',
      () => ({ hardware: [rivets(1, { value: '0.00' })] }),
      'hardware.0.value',
    ],
    [
      'a cost beyond the books',
      () => ({ hardware: [rivets(1, { cost: '9999999999999' })] }),
      'hardware.0.cost',
    ],
  ])('refuses %s', async (_what, body, field) => {
    const refused = await receive(body()).expect(422);
    expect(refused.body.errors.map((fault: { field: string }) => fault.field)).toContain(field);
  });
});

describe('receiving for an order', () => {
  it('fills its lines at its prices, part by part, until all of it is here', async () => {
    const order = await orderMore(shop, things);
    const first = await receive({
      purchaseOrderId: order.id,
      lots: [side({ purchaseLineId: order.leatherLine })],
      hardware: [rivets(1000, { purchaseLineId: order.rivetLine })],
    }).expect(201);
    expect(first.body.purchaseOrder).toMatchObject({ state: 'part received' });
    expect(first.body.lots[0]).toMatchObject({ cost: '210.38', purchaseOrderId: order.id });
    expect(first.body.hardware[0]).toMatchObject({
      onHand: 1000,
      onOrder: 0,
      valueOnHand: '162.50',
    });
    const second = await receive({
      purchaseOrderId: order.id,
      lots: [side({ purchaseLineId: order.leatherLine })],
    }).expect(201);
    expect(second.body.purchaseOrder).toMatchObject({ state: 'received' });
    expect(second.body.purchaseOrder.lines[0]).toMatchObject({
      receivedAreaMm2: '4598700.48',
      measuredAreaMm2: null,
      areaMm2: '3716121.6',
    });
  });

  it('makes one receipt of a delivery that is sent twice with one key, also at the same moment', async () => {
    const order = await orderMore(shop, things);
    const body = {
      purchaseOrderId: order.id,
      hardware: [rivets(400, { purchaseLineId: order.rivetLine })],
    };
    const send = () => receive(body).set('Idempotency-Key', `delivery-${order.id}`);
    const replies = await Promise.all([send(), send()]);
    expect(replies.map((reply) => reply.status)).toEqual([201, 201]);
    expect(replies[0]?.body).toEqual(replies[1]?.body);
    expect((await counts()).onHand).toBe(400);
    await receive({ ...body, nothingMore: true })
      .set('Idempotency-Key', `delivery-${order.id}`)
      .expect(422);
  });

  it('refuses a delivery that is received twice under two keys', async () => {
    const order = await orderMore(shop, things);
    const body = {
      purchaseOrderId: order.id,
      lots: [side({ purchaseLineId: order.leatherLine, measuredAreaMm2: ft2(40) })],
      hardware: [rivets(1000, { purchaseLineId: order.rivetLine })],
    };
    await receive(body).set('Idempotency-Key', `one-${order.id}`).expect(201);
    const twice = await receive(body).set('Idempotency-Key', `two-${order.id}`).expect(409);
    expect(twice.body.allowed).toEqual(['receive without the order']);
    expect((await counts()).onHand).toBe(1000);
  });

  it('receives what came beyond the order and says how much, but nothing unseen on a line that is complete', async () => {
    const order = await orderMore(shop, things);
    const on = (quantity: number) =>
      receive({
        purchaseOrderId: order.id,
        hardware: [rivets(quantity, { purchaseLineId: order.rivetLine })],
      });
    const beyond = await on(1012).expect(201);
    expect(beyond.body.purchaseOrder.lines[1]).toMatchObject({
      received: 1012,
      over: { quantity: 12, areaMm2: null },
      toCome: { quantity: 0 },
    });
    await on(1).expect(409);
    expect((await counts()).onHand).toBe(1012);
  });

  it('refuses a line that belongs to something else', async () => {
    const order = await orderMore(shop, things);
    const refused = await receive({
      purchaseOrderId: order.id,
      hardware: [rivets(1, { purchaseLineId: order.leatherLine })],
    }).expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'hardware.0.purchaseLineId' }]);
  });

  it('closes an order of which nothing more is to come', async () => {
    const order = await orderMore(shop, things);
    await receive({ purchaseOrderId: order.id, nothingMore: true }).expect(409);
    const body = {
      purchaseOrderId: order.id,
      hardware: [rivets(900, { purchaseLineId: order.rivetLine })],
    };
    const closed = await receive({ ...body, nothingMore: true }).expect(201);
    expect(closed.body.purchaseOrder.state).toBe('received');
    expect(closed.body.hardware[0].onOrder).toBe(0);
  });
});

describe('adjusting', () => {
  const adjust = (body: object, role: 'owner' | 'maker' = 'maker') =>
    shop.as(role).post('/api/adjustments').send(body);

  it('sets a count to what was counted, with its reason', async () => {
    await receive({ hardware: [rivets(600)] }).expect(201);
    const { body } = await adjust({
      of: 'hardware',
      hardwareId: things.hardwareId,
      counted: 588,
      reason: 'Counted',
    }).expect(201);
    expect(body).toMatchObject({
      movement: { kind: 'adjust', quantity: -12, reason: 'Counted' },
      broken: [],
    });
    expect(await counts()).toMatchObject({ onHand: 588, valueOnHand: '99.96' });
  });

  it('sets a lot to what was measured', async () => {
    const received = await receive({ lots: [side()] }).expect(201);
    const lotId = received.body.lots[0].id;
    await adjust({ of: 'lot', lotId, areaMm2: ft2(20), reason: 'Measured again' }).expect(201);
    const lot = await shop.as('owner').get(`/api/lots/${lotId}`).expect(200);
    expect(lot.body).toMatchObject({
      onHandAreaMm2: '1858060.8',
      measuredAreaMm2: '2299350.24',
      valueOnHand: '180.00',
    });
    const used = await adjust({ of: 'lot', lotId, areaMm2: '0', reason: 'Used up' }).expect(201);
    expect(used.body.movement.areaMm2).toBe('-1858060.8');
    const onRack = await shop
      .as('maker')
      .get(`/api/lots?onRack=yes&leatherId=${things.leatherId}`)
      .expect(200);
    expect(onRack.body.items).toEqual([]);
  });

  it('sets nothing over what moved since it was measured, and says what', async () => {
    const received = await receive({ lots: [side()] }).expect(201);
    const lotId = received.body.lots[0].id;
    const books = received.body.lots[0].onHandAreaMm2 as string;
    const measured = { of: 'lot', lotId, reason: 'Measured', onHandSeenAreaMm2: books };
    await adjust({ ...measured, areaMm2: ft2(20) }, 'owner').expect(201);
    const late = await adjust({ ...measured, areaMm2: ft2(24) }).expect(409);
    expect(late.body.detail).toMatch(/^Lot T-\d+ has moved since you looked/);
    expect(late.body.detail).toContain('The owner adjusted it by −4.75 ft² (Measured)');
    expect(late.body.detail).toContain('The books say 20 ft² now, not 24.75 ft².');
    const lot = await shop.as('owner').get(`/api/lots/${lotId}`).expect(200);
    expect(lot.body.onHandAreaMm2).toBe(ft2(20).replace(/\.?0+$/, ''));

    await receive({ hardware: [rivets(100)] }).expect(201);
    const { onHand } = await counts();
    const counted = { of: 'hardware', hardwareId: things.hardwareId, reason: 'Counted' };
    await receive({ hardware: [rivets(25)] }).expect(201);
    const blind = { ...counted, counted: onHand - 3, onHandSeenQuantity: onHand };
    const { body } = await adjust(blind).expect(409);
    expect(body.detail).toContain('received 25');
    await adjust({ ...blind, onHandSeenQuantity: onHand + 25 }).expect(201);
  });

  it('names the jobs that a count leaves short', async () => {
    const job = await writeBareJob(shop.context, things.hardwareId);
    await receive({ hardware: [rivets(100)] }).expect(201);
    await inTransaction(shop.context, theProgram, (work) =>
      reserveStock(work, { jobId: job, hardwareId: things.hardwareId, quantity: 80 }),
    );
    const { body } = await adjust({
      of: 'hardware',
      hardwareId: things.hardwareId,
      counted: 50,
      reason: 'Counted',
    }).expect(201);
    expect(body.broken).toMatchObject([{ jobNumber: `J-9${job}`, quantity: 80 }]);
    const held = await shop
      .as('maker')
      .get(`/api/reservations?hardwareId=${things.hardwareId}`)
      .expect(200);
    expect(held.body.items).toMatchObject([
      { jobId: job, quantity: 80, hardwareName: expect.any(String) },
    ]);
    expect(await counts()).toMatchObject({ onHand: 50, reserved: 80, free: 0 });
  });

  it.each([
    ['a count below zero', { counted: -1, reason: 'Counted' }, 'counted'],
    ['no reason', { counted: 1, reason: ' ' }, 'reason'],
    ['a value', { counted: 1, reason: 'Counted', value: '3.00' }, 'value'],
  ])('refuses %s', async (_what, typed, field) => {
    const refused = await adjust({
      of: 'hardware',
      hardwareId: things.hardwareId,
      ...typed,
    }).expect(422);
    expect(refused.body.errors).toMatchObject([{ field }]);
  });

  it('says that there is no such thing to adjust', async () => {
    await adjust({ of: 'lot', lotId: 99_999, areaMm2: '1', reason: 'Measured' }).expect(404);
  });
});

describe('who may do what', () => {
  it('lets the maker receive and adjust, and see neither prices nor costs nor values', async () => {
    const order = await orderMore(shop, things);
    const received = await receive(
      {
        purchaseOrderId: order.id,
        lots: [side({ purchaseLineId: order.leatherLine })],
        hardware: [rivets(10, { purchaseLineId: order.rivetLine })],
      },
      'maker',
    ).expect(201);
    const maker = shop.as('maker');
    const seen = [received];
    for (const path of [
      'leathers',
      'lots',
      'hardware',
      'suppliers',
      'purchase-orders',
      'stock-movements',
      'reservations',
    ]) {
      seen.push(await maker.get(`/api/${path}`).expect(200));
    }
    for (const path of [
      `lots/${received.body.lots[0].id}`,
      `hardware/${things.hardwareId}`,
      `purchase-orders/${order.id}`,
    ]) {
      seen.push(await maker.get(`/api/${path}`).expect(200));
    }
    for (const { text } of seen)
      expect(text).not.toMatch(/"\w*(price|cost|value|amount|total)\w*":/i);
    expect(received.body.lots[0].onHandAreaMm2).toBe('2299350.24');
  });

  it('refuses a cost that a maker types', async () => {
    const refused = await receive({ lots: [side({ cost: '1.00' })] }, 'maker').expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'lots.0.cost' }]);
  });

  it('lets the bookkeeper read and do nothing else', async () => {
    const bookkeeper = shop.as('bookkeeper');
    await bookkeeper.get('/api/stock-movements').expect(200);
    await bookkeeper
      .post('/api/receipts')
      .send({ hardware: [rivets(1)] })
      .expect(403);
    await bookkeeper
      .post('/api/adjustments')
      .send({ of: 'hardware', hardwareId: 1, counted: 1, reason: 'x' })
      .expect(403);
    await bookkeeper.post('/api/purchase-orders').send({}).expect(403);
    await shop.nobody().get('/api/lots').expect(401);
  });
});
