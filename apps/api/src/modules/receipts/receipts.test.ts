import fc from 'fast-check';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { Decimal } from 'decimal.js';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
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

const side = (more: object = {}) => ({
  leatherId: things.leatherId,
  purchaseLineId: order.leatherLine,
  form: 'side',
  measuredAreaMm2: ft2(24),
  ...more,
});
const rivets = (quantity: number, more: object = {}) => ({
  hardwareId: things.hardwareId,
  purchaseLineId: order.rivetLine,
  quantity,
  ...more,
});
const receive = (body: object, role: 'owner' | 'maker' = 'owner') =>
  shop
    .as(role)
    .post('/api/receipts')
    .send({ purchaseOrderId: order.id, ...body });
const ledger = async (query: string) =>
  (await shop.as('owner').get(`/api/stock-movements?${query}`).expect(200)).body.items;
const correct = (id: number, version: number, body: object) =>
  shop.as('owner').patch(`/api/receipts/${id}`).set('If-Match', `"${version}"`).send(body);

describe('freight and duty', () => {
  it('become part of what the leather and the hardware cost, to the cent', async () => {
    const { body } = await receive({
      lots: [side()],
      hardware: [rivets(1000)],
      freight: '18.00',
      duty: '3.33',
    }).expect(201);
    const [lot, hardware] = body.receipt.lines;
    expect(lot).toMatchObject({ goods: '204.00', carriage: '11.87' });
    expect(hardware).toMatchObject({ goods: '162.50', carriage: '9.46' });
    expect(body.lots[0]).toMatchObject({ cost: '215.87', valueOnHand: '215.87' });
    expect(body.hardware[0]).toMatchObject({ valueOnHand: '171.96' });
    expect(await ledger(`lotId=${lot.lotId}`)).toMatchObject([{ value: '215.87' }]);
    expect(await ledger(`purchaseOrderId=${order.id}`)).toHaveLength(2);
    expect(await ledger(`purchaseOrderId=${order.id + 1}`)).toEqual([]);
  });

  it('are borne by the leather alone where they are shared by area', async () => {
    const { body } = await receive({
      lots: [side({ measuredAreaMm2: ft2(30) }), side({ measuredAreaMm2: ft2(10) })],
      hardware: [rivets(1000)],
      freight: '20.00',
      sharedBy: 'area',
    }).expect(201);
    const carriage = body.receipt.lines.map((line: { carriage: string }) => line.carriage);
    expect(carriage).toEqual(['15.00', '5.00', '0.00']);
  });

  it('are refused where nothing that came can bear them', async () => {
    const refused = await receive({
      hardware: [rivets(10)],
      freight: '20.00',
      sharedBy: 'area',
    }).expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'sharedBy' }]);
    const alone = await receive({ nothingMore: true, freight: '5.00' }).expect(422);
    expect(alone.body.errors).toMatchObject([{ field: 'freight' }]);
  });

  it('are left to the owner, and a maker never sees them', async () => {
    const refused = await receive({ hardware: [rivets(10)], freight: '1.00' }, 'maker').expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'freight' }]);
    await receive({ hardware: [rivets(10)], freight: '1.00' }).expect(201);
    const seen = await shop
      .as('maker')
      .get(`/api/receipts?purchaseOrderId=${order.id}`)
      .expect(200);
    expect(seen.body.items).toHaveLength(1);
    expect(seen.text).not.toMatch(/"(freight|duty|goods|carriage)":/);
  });

  it('make the value of stock what goods and carriage come to, whatever comes', async () => {
    const cents = fc.integer({ min: 0, max: 500_00 }).map((whole) => (whole / 100).toFixed(2));
    const oneDelivery = fc.record({
      areas: fc.array(fc.integer({ min: 1, max: 400 }), { minLength: 1, maxLength: 4 }),
      counts: fc.array(fc.integer({ min: 1, max: 5000 }), { maxLength: 3 }),
      freight: cents,
      duty: cents,
      sharedBy: fc.constantFrom('value', 'area'),
    });
    await fc.assert(
      fc.asyncProperty(oneDelivery, async ({ areas, counts, ...carriage }) => {
        const { body } = await shop
          .as('owner')
          .post('/api/receipts')
          .send({
            ...carriage,
            lots: areas.map((tenths) => ({
              leatherId: things.leatherId,
              form: 'side',
              measuredAreaMm2: new Decimal('9290.304').times(tenths).toFixed(),
            })),
            hardware: counts.map((quantity) => ({ hardwareId: things.hardwareId, quantity })),
          })
          .expect(201);
        const { lines } = body.receipt as { lines: { goods: string; carriage: string }[] };
        const borne = Decimal.sum(0, ...lines.map((line) => line.carriage));
        expect(borne.toFixed(2)).toBe(new Decimal(carriage.freight).plus(carriage.duty).toFixed(2));
        const whole = Decimal.sum(borne, ...lines.map((line) => line.goods));
        const recent = await ledger(`limit=${lines.length}`);
        const values = recent.map((movement: { value: string }) => movement.value);
        expect(Decimal.sum(0, ...values).toFixed(2)).toBe(whole.toFixed(2));
      }),
      { numRuns: 25 },
    );
  });
});

describe('what the customer brings', () => {
  const medals = (more: object = {}) => ({ hardwareId: 0, quantity: 10, ...more });
  const addMedals = async () => {
    const medal = { name: `Medal ${things.hardwareId}`, unitPrice: '5', fromCustomer: true };
    const { body } = await shop.as('owner').post('/api/hardware').send(medal).expect(201);
    expect(body.unitPrice).toBe('0.00');
    return body.id as number;
  };
  const bring = (body: object) => receive({ purchaseOrderId: null, ...body }, 'owner');

  it('has no value in stock, and bears no freight', async () => {
    const hardwareId = await addMedals();
    const theirs = medals({ hardwareId });
    const ours = { hardwareId: things.hardwareId, quantity: 100 };
    const { body } = await bring({
      hardware: [theirs, ours],
      freight: '8.00',
      sharedBy: 'count',
    }).expect(201);
    expect(body.receipt.lines).toMatchObject([
      { goods: '0.00', carriage: '0.00' },
      { carriage: '8.00' },
    ]);
    expect(body.hardware[0]).toMatchObject({ onHand: 10, valueOnHand: '0.00' });
    const { id, version, lines } = body.receipt;
    const goods = [{ receiptLineId: lines[0].id, goods: '50.00' }];
    const put = await correct(id, version, { goods }).expect(422);
    expect(put.body.errors[0].message).toContain('leave its cost empty');
    const again = await correct(id, version, { freight: '9.00' }).expect(200);
    expect(again.body.lines).toMatchObject([{ carriage: '0.00' }, { carriage: '9.00' }]);
  });

  it('takes no cost, and no freight where nothing else came', async () => {
    const hardwareId = await addMedals();
    const costly = await bring({ hardware: [medals({ hardwareId, cost: '50' })] }).expect(422);
    expect(costly.body.errors).toMatchObject([{ field: 'hardware.0.cost' }]);
    const carried = await bring({ hardware: [medals({ hardwareId })], freight: '5' }).expect(422);
    expect(carried.body.errors[0].message).toContain('leave freight and duty at 0');
  });
});

describe('what a delivery cost, put right', () => {
  it('takes in freight that is known only later, and both can be read in the ledger', async () => {
    const first = await receive({ lots: [side()], hardware: [rivets(400)] }, 'maker').expect(201);
    const { id, version } = first.body.receipt;
    const { body } = await correct(id, version, { freight: '26.90' }).expect(200);
    expect(body).toMatchObject({ freight: '26.90', staysBecause: null, version: version + 1 });
    const [lot, hardware] = body.lines;
    expect(lot).toMatchObject({ goods: '204.00', carriage: '20.40' });
    expect(hardware).toMatchObject({ goods: '65.00', carriage: '6.50' });
    const rows = await ledger(`lotId=${lot.lotId}`);
    expect(rows.map((row: { value: string }) => row.value)).toEqual([
      '224.40',
      '-204.00',
      '204.00',
    ]);
    const read = await shop.as('owner').get(`/api/lots/${lot.lotId}`).expect(200);
    expect(read.body).toMatchObject({
      cost: '224.40',
      onHandAreaMm2: ft2(24).replace(/\.0+$/, ''),
    });
  });

  it('shows what was paid against what was ordered', async () => {
    const first = await receive({ hardware: [rivets(1000)] }).expect(201);
    const { id, version, lines } = first.body.receipt;
    const goods = [{ receiptLineId: lines[0].id, goods: '170.00' }];
    await correct(id, version, { goods }).expect(200);
    const read = await shop.as('owner').get(`/api/purchase-orders/${order.id}`).expect(200);
    expect(read.body.lines[1]).toMatchObject({ paid: '170.00', priceDifference: '7.50' });
    expect(read.body.lines[0]).toMatchObject({ paid: '0.00', priceDifference: '0.00' });
    const stale = await correct(id, version, { freight: '1.00' }).expect(412);
    expect(stale.body.changed).toMatchObject({ by: 'The owner' });
  });

  it('is refused once something of it has moved', async () => {
    const first = await receive({ lots: [side()], hardware: [rivets(400)] }).expect(201);
    const { id, version } = first.body.receipt;
    await shop
      .as('maker')
      .post('/api/adjustments')
      .send({ of: 'hardware', hardwareId: things.hardwareId, counted: 399, reason: 'Counted' })
      .expect(201);
    const refused = await correct(id, version, { freight: '1.00' }).expect(409);
    expect(refused.body.detail).toMatch(/^Some of it has moved since .*: Copper rivet/);
    expect(refused.body.detail).toMatch(/Give a bill that comes now to the bookkeeper/);
    const read = await shop.as('owner').get(`/api/receipts/${id}`).expect(200);
    expect(read.body).toMatchObject({ staysBecause: refused.body.detail, freight: '0.00' });
  });

  it('stays open when more of the same came, and the average is the sum of both', async () => {
    const first = await receive({ hardware: [rivets(400)] }).expect(201);
    await receive({ hardware: [rivets(600)] }).expect(201);
    const { id, version } = first.body.receipt;
    const { body } = await correct(id, version, { freight: '10.00' }).expect(200);
    expect(body.staysBecause).toBeNull();
    const read = await shop.as('owner').get(`/api/hardware/${things.hardwareId}`).expect(200);
    expect(read.body).toMatchObject({ onHand: 1000, valueOnHand: '172.50' });
  });

  it('stays where a newer layer lies on it, first in, first out', async () => {
    const first = await receive({ hardware: [rivets(400)] }).expect(201);
    await receive({ hardware: [rivets(600)] }).expect(201);
    const valueStock = async (stockValue: string) => {
      const { body } = await shop.as('owner').get('/api/workshop').expect(200);
      await shop
        .as('owner')
        .patch('/api/workshop')
        .set('If-Match', `"${body.version}"`)
        .send({ stockValue })
        .expect(200);
    };
    await valueStock('first in first out');
    const { id, version } = first.body.receipt;
    const refused = await correct(id, version, { freight: '10.00' }).expect(409);
    expect(refused.body.detail).toMatch(/^More has come since, and stock is valued first in/);
    await valueStock('moving average');
  });

  it('names only lines of its own', async () => {
    const first = await receive({ hardware: [rivets(5)] }).expect(201);
    const { id, version } = first.body.receipt;
    const goods = [{ receiptLineId: 999_999, goods: '1.00' }];
    const refused = await correct(id, version, { goods }).expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'goods' }]);
  });
});

describe('leather that is short of its mark', () => {
  it('fills its line by what is paid for, and hangs as measured', async () => {
    const { body } = await receive({
      lots: [side({ measuredAreaMm2: ft2(38.5), markedAreaMm2: ft2(40) })],
      hardware: [rivets(1000)],
    }).expect(201);
    expect(body.purchaseOrder).toMatchObject({ state: 'received', awaitedOn: null });
    expect(body.purchaseOrder.lines[0]).toMatchObject({
      receivedAreaMm2: '3716121.6',
      measuredAreaMm2: '3576767.04',
      toCome: { areaMm2: '0' },
      short: { areaMm2: '0' },
    });
    expect(body.lots[0]).toMatchObject({ onHandAreaMm2: '3576767.04' });
    const leather = await shop.as('owner').get(`/api/leathers/${things.leatherId}`).expect(200);
    expect(leather.body).toMatchObject({ onOrderAreaMm2: '0' });
    const { dataDir } = shop.context.config;
    expect((await verifyFolder(dataDir)).filter(({ faults }) => faults.length > 0)).toEqual([]);
  });

  it('leaves to come what was ordered beyond the mark, on that day as well', async () => {
    const { body } = await receive({
      lots: [side({ measuredAreaMm2: ft2(24), markedAreaMm2: ft2(25.5) })],
    }).expect(201);
    expect(body.purchaseOrder.lines[0]).toMatchObject({ toCome: { areaMm2: ft2(14.5) } });
  });
});

describe('part deliveries', () => {
  it('leave the rest awaited with its own day, and closed it is short', async () => {
    const first = await receive({ hardware: [rivets(600)] }).expect(201);
    const { version } = first.body.purchaseOrder;
    const awaitOn = (expectedOn: string, read = version) =>
      shop
        .as('owner')
        .patch(`/api/purchase-orders/${order.id}/lines/${order.rivetLine}`)
        .set('If-Match', `"${read}"`)
        .send({ expectedOn });
    const moved = await awaitOn('2026-12-21').expect(200);
    expect(moved.body.lines).toMatchObject([
      { expectedOn: '2026-12-11' },
      { expectedOn: '2026-12-21', toCome: { quantity: 400 }, short: { quantity: 0 } },
    ]);
    await awaitOn('2026-12-22').expect(412);
    const over = await awaitOn('2026-11-30', moved.body.version).expect(422);
    expect(over.body.errors).toMatchObject([{ field: 'expectedOn' }]);
    const closed = await receive({ nothingMore: true }).expect(201);
    expect(closed.body).toMatchObject({ receipt: null, purchaseOrder: { state: 'received' } });
    expect(closed.body.purchaseOrder.lines[1]).toMatchObject({
      toCome: { quantity: 0 },
      short: { quantity: 400 },
    });
    await awaitOn('2026-12-22', closed.body.purchaseOrder.version).expect(409);
  });

  it('leave one line closed short, and the order received once nothing is awaited', async () => {
    const path = `/api/purchase-orders/${order.id}`;
    const read = async () => (await shop.as('owner').get(path).expect(200)).body;
    const [hides, rivetLine] = (await read()).lines as { id: number }[];
    const close = (line: { id: number } | undefined, role: 'owner' | 'maker' = 'owner') =>
      shop.as(role).post(`${path}/lines/${line?.id}/closings`).send({ reason: 'sold out' });
    await close(hides, 'maker').expect(403);
    const onOrder = async () =>
      (await shop.as('owner').get(`/api/leathers/${things.leatherId}`)).body.onOrderAreaMm2;
    expect(await onOrder()).not.toBe('0');
    const one = await close(hides).expect(201);
    expect(one.body).toMatchObject({ state: 'sent', lines: [{ toCome: { areaMm2: '0' } }, {}] });
    expect(one.body.lines[0].short.areaMm2).toBe(one.body.lines[0].areaMm2);
    expect(await onOrder()).toBe('0');
    const again = await close(hides).expect(409);
    expect(again.body.detail).toMatch(/^Nothing more is awaited on line 1/);
    const none = await close(rivetLine).expect(409);
    expect(none.body.detail).toMatch(/Cancel the order instead\.$/);
    await receive({ hardware: [rivets(600)] }).expect(201);
    expect(await read()).toMatchObject({ state: 'part received' });
    const last = await close(rivetLine).expect(201);
    expect(last.body).toMatchObject({
      state: 'received',
      awaitedOn: null,
      lines: [{}, { toCome: { quantity: 0 }, short: { quantity: 400 } }],
    });
    const log = await shop.as('owner').get('/api/activities').expect(200);
    expect(log.body.items[0].action).toMatch(/^closed line 2 of purchase order P-/);
  });

  it('await a closed line after all, or all that is missing, and nothing that is here', async () => {
    const path = `/api/purchase-orders/${order.id}`;
    const reopen = (body: object, role: 'owner' | 'maker' = 'owner') =>
      shop.as(role).post(`${path}/reopenings`).send(body);
    const read = async () => (await shop.as('owner').get(path).expect(200)).body;
    const [hides, rivetLine] = (await read()).lines as { id: number }[];
    const awaited = await reopen({ lineId: hides?.id }).expect(409);
    expect(awaited.body.detail).toMatch(/^The rest of line 1 of P-\d+ is awaited already\.$/);
    await reopen({ lineId: null }).expect(409);
    await receive({ hardware: [rivets(1000)], nothingMore: true }).expect(201);
    expect(await read()).toMatchObject({
      state: 'received',
      lines: [{ toCome: { areaMm2: '0' } }, {}],
    });
    await reopen({ lineId: hides?.id }, 'maker').expect(403);
    await reopen({ lineId: 9999 }).expect(404);
    const here = await reopen({ lineId: rivetLine?.id }).expect(409);
    expect(here.body.detail).toMatch(/^All of line 2 of P-\d+ is here\.$/);
    const over = await reopen({ lineId: hides?.id, expectedOn: '2026-11-30' }).expect(422);
    expect(over.body.errors).toMatchObject([{ field: 'expectedOn' }]);
    const again = await reopen({ lineId: null, expectedOn: '2026-12-18' }).expect(201);
    expect(again.body).toMatchObject({ state: 'part received', awaitedOn: '2026-12-18' });
    expect(again.body.lines[0]).toMatchObject({ short: { areaMm2: '0' } });
    expect(again.body.lines[0].toCome.areaMm2).toBe(again.body.lines[0].areaMm2);
    const log = await shop.as('owner').get('/api/activities').expect(200);
    expect(log.body.items[0].action).toMatch(/^awaits line 1 of purchase order P-\d+ after all$/);
    await receive({ lots: [side()] }).expect(201);
    expect(await read()).toMatchObject({ receipts: 2 });
  });

  it('keep the other lines closed when one of an order that ended short is awaited', async () => {
    const path = `/api/purchase-orders/${order.id}`;
    const { lines } = (await shop.as('owner').get(path).expect(200)).body;
    await receive({ hardware: [rivets(600)], nothingMore: true }).expect(201);
    const { body } = await shop
      .as('owner')
      .post(`${path}/reopenings`)
      .send({ lineId: lines[1].id })
      .expect(201);
    expect(body).toMatchObject({
      state: 'part received',
      lines: [{ toCome: { areaMm2: '0' } }, { toCome: { quantity: 400 } }],
    });
    const last = await receive({ hardware: [rivets(400)] }).expect(201);
    expect(last.body.purchaseOrder).toMatchObject({ state: 'received' });
  });

  it('need nothing of a line that is closed', async () => {
    const path = `/api/purchase-orders/${order.id}`;
    const { lines } = (await shop.as('owner').get(path).expect(200)).body;
    const closing = { reason: 'sold out' };
    await shop.as('owner').post(`${path}/lines/${lines[0].id}/closings`).send(closing).expect(201);
    const came = await receive({ hardware: [rivets(1000)] }).expect(201);
    expect(came.body.purchaseOrder).toMatchObject({ state: 'received' });
  });

  it('are not put on the rack twice by two people', async () => {
    const body = { lots: [side()], hardware: [rivets(600)], receiptsSeen: 0 };
    const [one, two] = await Promise.all([receive(body, 'maker'), receive(body)]);
    expect([one.status, two.status].sort()).toEqual([201, 409]);
    const late = one.status === 409 ? one : two;
    const quick = one.status === 409 ? 'The owner' : 'The maker';
    expect(late.body.detail).toContain(`${quick} has received 1 lot of Oak tan russet`);
    expect(late.body.detail).toMatch(/600 × Copper rivet .+ part received now/);
    const list = await shop.as('maker').get(`/api/receipts?purchaseOrderId=${order.id}`);
    expect(list.body.items).toHaveLength(1);
    await receive({ hardware: [rivets(400)], receiptsSeen: 1 }).expect(201);
  });

  it('are refused for an order that is cancelled', async () => {
    await shop
      .as('owner')
      .post(`/api/purchase-orders/${order.id}/cancellations`)
      .send({ reason: 'Too late' })
      .expect(201);
    const refused = await receive({ hardware: [rivets(1)] }).expect(409);
    expect(refused.body.detail).toMatch(/^P-\d+ is cancelled\./);
  });

  it('keep the batch of hardware in the ledger', async () => {
    const { body } = await receive({ hardware: [rivets(600, { batch: 'K7-204' })] }).expect(201);
    expect(body.receipt.lines[0]).toMatchObject({ batch: 'K7-204' });
    const rows = await ledger(`hardwareId=${things.hardwareId}`);
    expect(rows).toMatchObject([{ reason: 'batch K7-204', quantity: 600 }]);
    await correct(body.receipt.id, body.receipt.version, { duty: '2.00' }).expect(200);
    const [again] = await ledger(`hardwareId=${things.hardwareId}`);
    expect(again).toMatchObject({ reason: 'batch K7-204, cost put right', value: '99.50' });
  });
});

describe('a delivery without an order', () => {
  const alone = (body: object) => shop.as('owner').post('/api/receipts').send(body).expect(201);

  it('stands in the ledger with its day, for leather and for hardware', async () => {
    const { body } = await alone({
      receivedOn: '2026-11-30',
      lots: [{ leatherId: things.leatherId, form: 'side', measuredAreaMm2: ft2(20) }],
      hardware: [{ hardwareId: things.hardwareId, quantity: 50, batch: 'K7-204' }],
    });
    const [lot, hardware] = body.receipt.lines;
    const reasonsOf = async (query: string) =>
      (await ledger(query)).map((row: { reason: string }) => row.reason);
    expect(await reasonsOf(`lotId=${lot.lotId}`)).toEqual(['delivery of Mon 30 Nov 2026']);
    await correct(body.receipt.id, body.receipt.version, { freight: '6.00' }).expect(200);
    expect(await reasonsOf(`hardwareId=${hardware.hardwareId}`)).toEqual([
      'delivery of Mon 30 Nov 2026, batch K7-204, cost put right',
      'to be written again at another cost',
      'delivery of Mon 30 Nov 2026, batch K7-204',
    ]);
  });

  it('is listed apart from those of orders', async () => {
    const { body } = await alone({
      hardware: [{ hardwareId: things.hardwareId, quantity: 50 }],
    });
    await receive({ hardware: [rivets(10)] }).expect(201);
    const listed = await shop.as('owner').get('/api/receipts?withoutOrder=yes').expect(200);
    expect(listed.body.items[0]).toMatchObject({ id: body.receipt.id, purchaseOrderId: null });
    const papers = listed.body.items.map(
      (each: { purchaseOrderId: number | null }) => each.purchaseOrderId,
    );
    expect(new Set(papers)).toEqual(new Set([null]));
  });
});

it('keeps every rule of the books', async () => {
  const results = await verifyFolder(shop.context.config.dataDir);
  expect(results.flatMap(({ faults }) => faults)).toEqual([]);
});
