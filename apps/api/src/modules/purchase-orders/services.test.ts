import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { takenOn, readyForTheBench, type BenchShop } from '../../testing/bench-shop.ts';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { verifyFolder } from '../../verify/verify-folder.ts';

let shop: BenchShop['shop'];
let ready: BenchShop;
let things: Awaited<ReturnType<typeof stockUp>>;
let blackId: number;
let lot: { id: number; tag: string };

beforeAll(async () => {
  shop = await startTestShop();
  ready = await readyForTheBench(shop);
});
afterAll(() => shop.close());

const owner = () => shop.as('owner');
const orders = '/api/purchase-orders';
let made = 0;

/** A side of 24 ft² at 216.00, and the leather that it can become. */
beforeEach(async () => {
  things = await stockUp(shop);
  const black = { name: `Oak tan black ${++made}`, pricePerFt2: '11.00' };
  blackId = (await owner().post('/api/leathers').send(black).expect(201)).body.id;
  const side = {
    ...{ leatherId: ready.leatherId, form: 'side', measuredAreaMm2: ft2(24) },
    ...{ supplierLot: 'B 77', cost: '216.00' },
  };
  lot = (
    await owner()
      .post('/api/receipts')
      .send({ lots: [side] })
      .expect(201)
  ).body.lots[0];
});

const dyeing = (over: object = {}) => ({
  ...{ of: 'service', service: 'dyeing', lotId: lot.id, becomesLeatherId: blackId },
  ...{ unitPrice: '1.50', ...over },
});
const draft = (...lines: object[]) =>
  owner().post(orders).send({ supplierId: things.supplierId, expectedOn: '2026-12-09', lines });
const send = (id: number) => owner().post(`${orders}/${id}/sendings`).send({ by: 'hand' });
const sent = async (...lines: object[]) => {
  const { body } = await draft(...lines).expect(201);
  return (await send(body.id).expect(201)).body;
};
const readLot = async (id = lot.id) => (await owner().get(`/api/lots/${id}`).expect(200)).body;
const area = (feet: number) => ft2(feet).replace(/\.?0+$/, '');
interface Order {
  id: number;
  lines: { id: number }[];
}
const back = ({ lines: [line] }: Order, feet: number, over: object = {}) => ({
  ...{ leatherId: blackId, purchaseLineId: line?.id, form: 'side', measuredAreaMm2: ft2(feet) },
  ...over,
});
const receive = ({ id: purchaseOrderId }: Order, body: object, role: 'owner' | 'maker' = 'owner') =>
  shop
    .as(role)
    .post('/api/receipts')
    .send({ purchaseOrderId, ...body });
const faultsOf = (body: { errors: { field: string; message: string }[] }) => body.errors;

describe('a lot that goes out', () => {
  it('is a line that says so, for all that is free where nothing else is asked', async () => {
    const { body } = await draft(dyeing()).expect(201);
    expect(body).toMatchObject({ total: '36.00' });
    expect(body.lines[0]).toMatchObject({
      of: 'service',
      name: expect.stringMatching(new RegExp(`^Dyeing of ${lot.tag}, Oak tan 5–6 oz$`)),
      areaMm2: area(24),
      amount: '36.00',
      service: { word: 'dyeing', lotId: lot.id, changes: true, state: 'to go out' },
    });
    expect(await readLot()).toMatchObject({ onHandAreaMm2: area(24), outFor: [] });
  });

  it('leaves the rack with the order, and is awaited as what it becomes', async () => {
    const order = await sent(dyeing({ areaMm2: ft2(20) }));
    expect(order.lines[0].service).toMatchObject({ state: 'out' });
    expect(await readLot()).toMatchObject({
      onHandAreaMm2: area(4),
      valueOnHand: '36.00',
      outFor: [{ service: 'dyeing', areaMm2: area(20), expectedOn: '2026-12-09' }],
    });
    const black = await owner().get(`/api/leathers/${blackId}`).expect(200);
    expect(black.body).toMatchObject({ onHandAreaMm2: '0', onOrderAreaMm2: area(20) });
    const ledger = await owner().get(`/api/stock-movements?lotId=${lot.id}`).expect(200);
    expect(ledger.body.items[0]).toMatchObject({
      ...{ kind: 'take', areaMm2: `-${area(20)}`, value: '-180.00' },
      ...{ purchaseOrderId: order.id, reason: `sent out for dyeing on ${order.number}` },
    });
  });

  it('is still among the shop’s lots where all of it is out, and not on the rack', async () => {
    const tagsOf = async (query: object) => {
      const { body } = await owner().get('/api/lots').query(query).expect(200);
      return (body.items as { tag: string }[]).map(({ tag }) => tag);
    };
    const order = await sent(dyeing());
    expect(await tagsOf({ ours: 'yes' })).toContain(lot.tag);
    expect(await tagsOf({ onRack: 'yes' })).not.toContain(lot.tag);
    await receive(order, { lots: [back(order, 23)] }).expect(201);
    expect(await tagsOf({ ours: 'yes' })).not.toContain(lot.tag);
  });

  it('stays where a job holds it by then, and the order stays a draft', async () => {
    const order = (await draft(dyeing()).expect(201)).body;
    const { job } = await takenOn(ready, 50, { evenIfShort: true });
    const hold = { lotId: lot.id, areaMm2: ft2(10) };
    await owner().post(`/api/jobs/${job.id}/reservations`).send(hold).expect(201);
    const refused = await send(order.id).expect(409);
    expect(refused.body.detail).toBe(
      `Of lot ${lot.tag} 14 ft² is free now, and 24 ft² is to go out. Held: 10 ft² for ${job.number}. Change the line to what is free, or let the job go first.`,
    );
    const read = await owner().get(`${orders}/${order.id}`).expect(200);
    expect(read.body).toMatchObject({ state: 'draft', sentAt: null });
    expect(await readLot()).toMatchObject({ onHandAreaMm2: area(24) });
  });

  it('cannot be held or taken while it is out', async () => {
    await sent(dyeing());
    const { job } = await takenOn(ready, 50, { evenIfShort: true });
    const asked = { lotId: lot.id, areaMm2: ft2(1) };
    await owner().post(`/api/jobs/${job.id}/reservations`).send(asked).expect(409);
    await owner().post(`/api/jobs/${job.id}/takings`).send(asked).expect(409);
  });

  it('is back on its lot, at what it went for, when the order is cancelled', async () => {
    const order = await sent(dyeing({ areaMm2: ft2(7) }));
    const path = `${orders}/${order.id}/cancellations`;
    const { body } = await owner().post(path).send({ reason: 'too dear' }).expect(201);
    expect(body.lines[0].service).toMatchObject({ state: 'put back' });
    const now = { onHandAreaMm2: area(24), valueOnHand: '216.00', outFor: [] };
    expect(await readLot()).toMatchObject(now);
  });

  it('is back on its lot when its line is closed, or when nothing more of the order is to come', async () => {
    const rivets = {
      ...{ of: 'hardware', hardwareId: things.hardwareId },
      ...{ quantity: 10, unitPrice: '0.10' },
    };
    const close = async (order: Order) => {
      const path = `${orders}/${order.id}/lines/${order.lines[0]?.id}/closings`;
      await owner().post(path).send({ reason: 'they are full' }).expect(201);
    };
    const first = await sent(dyeing(), rivets);
    await close(first);
    expect(await readLot()).toMatchObject({ onHandAreaMm2: area(24), outFor: [] });
    const late = await receive(first, { lots: [back(first, 24)] }).expect(409);
    expect(late.body.detail).toMatch(/^The leather of line 1 is back on its lot already\./);

    const second = await sent(dyeing(), rivets);
    const hardware = [
      { hardwareId: things.hardwareId, purchaseLineId: second.lines[1].id, quantity: 10 },
    ];
    const { body } = await receive(second, { hardware, nothingMore: true }).expect(201);
    expect(body.purchaseOrder).toMatchObject({
      state: 'received',
      lines: [{ service: { state: 'put back' }, short: { areaMm2: '0' } }, {}],
    });
    expect(await readLot()).toMatchObject({ onHandAreaMm2: area(24), valueOnHand: '216.00' });
  });
});

describe('what comes back', () => {
  it('is a lot under the one that went, at what that had cost, the work and the freight', async () => {
    const order = await sent(dyeing());
    const { body } = await receive(order, {
      lots: [back(order, 23.5, { shade: 'deep' })],
      freight: '8.00',
    }).expect(201);
    expect(body.receipt.lines[0]).toMatchObject({
      ...{ goods: '36.00', carriage: '8.00', material: '216.00' },
    });
    expect(body.lots[0]).toMatchObject({
      ...{ leatherId: blackId, cost: '260.00', valueOnHand: '260.00' },
      ...{ supplierLot: 'B 77', shade: 'deep' },
    });
    expect(body.purchaseOrder).toMatchObject({
      state: 'received',
      lines: [
        {
          ...{ toCome: { areaMm2: '0' }, over: { areaMm2: '0' }, short: { areaMm2: '0' } },
          ...{ paid: '36.00', priceDifference: '0.00', service: { state: 'came back' } },
        },
      ],
    });
    const family = await owner().get(`/api/lots/${body.lots[0].id}/family`).expect(200);
    expect(family.body.lots).toMatchObject([
      { lotId: lot.id, parentId: null, service: null, onHandAreaMm2: '0' },
      { lotId: body.lots[0].id, parentId: lot.id, service: 'dyeing' },
    ]);
    expect(family.body.origin).toMatchObject({ supplierLot: 'B 77' });
  });

  it('is two lots of two leathers where a side was split, and no cent is lost', async () => {
    const order = await sent(
      dyeing({ service: 'splitting', unitPrice: null, fixedPrice: '25.01', areaMm2: ft2(7) }),
    );
    const lots = [back(order, 7), back(order, 5, { leatherId: things.leatherId })];
    const { body } = await receive(order, { lots }).expect(201);
    expect(body.receipt).toMatchObject({
      priceDifference: '0.00',
      lines: [
        { material: '36.75', goods: '14.59' },
        { material: '26.25', goods: '10.42' },
      ],
    });
    expect(body.purchaseOrder.lines[0]).toMatchObject({
      ...{ fixedPrice: '25.01', paid: '25.01', priceDifference: '0.00' },
      over: { areaMm2: '0' },
    });
    expect(await readLot()).toMatchObject({ onHandAreaMm2: area(17), valueOnHand: '153.00' });
  });

  it('shows what was asked beyond the price, and what it cost can be put right', async () => {
    const order = await sent(dyeing());
    const { body } = await receive(order, { lots: [back(order, 24, { cost: '40.00' })] });
    expect(body.purchaseOrder.lines[0]).toMatchObject({ priceDifference: '4.00' });
    expect(body.receipt).toMatchObject({ priceDifference: '4.00' });
    const { id, version, lines } = body.receipt;
    const goods = [{ receiptLineId: lines[0].id, goods: '38.00' }];
    await owner().patch(`/api/receipts/${id}`).set('If-Match', `"${version}"`).send({ goods });
    expect(await readLot(body.lots[0].id)).toMatchObject({ cost: '254.00', valueOnHand: '254.00' });
  });

  it('comes at once: what comes later has no line to come on', async () => {
    const other = { of: 'leather', leatherId: things.leatherId, areaMm2: ft2(9), unitPrice: '9' };
    const order = await sent(dyeing(), other);
    const first = await receive(order, { lots: [back(order, 20)] }, 'maker').expect(201);
    expect(first.body.purchaseOrder).toMatchObject({ state: 'part received' });
    expect(first.text).not.toMatch(/"(goods|material|fixedPrice)":/);
    const again = await receive(order, { lots: [back(order, 3)], receiptsSeen: 1 }).expect(409);
    expect(again.body.detail).toMatch(/^The leather of line 1 came back from dyeing already\./);
  });
});

describe('the value of stock', () => {
  it('has what is out beside it until it is back, on whichever day one asks', async () => {
    const levels = async (on: string) =>
      (await owner().get('/api/stock-levels').query({ on, leatherId: ready.leatherId })).body;
    const before = await levels('2026-12-01');
    const order = await sent(dyeing({ areaMm2: ft2(20) }));
    // Nobody is idle for twelve hours, which would end the session.
    shop.clock.set(new Date('2026-12-01T20:00:00.000Z'));
    await shop.as('maker').get('/api/session').expect(200);
    await owner().get('/api/session').expect(200);
    shop.clock.set(new Date('2026-12-02T06:00:00.000Z'));
    await receive(order, { lots: [back(order, 19)] }).expect(201);
    const beyond = (later: { outValue: string; leatherValue: string }) => [
      Number(later.outValue) - Number(before.outValue),
      Math.round(100 * (Number(later.leatherValue) - Number(before.leatherValue))) / 100,
    ];
    expect(beyond(await levels('2026-12-01'))).toEqual([180, -180]);
    const { out } = await levels('2026-12-01');
    const { number: purchaseOrderNumber } = order;
    expect(out.at(-1)).toMatchObject({ service: 'dyeing', purchaseOrderNumber, value: '180.00' });
    expect(out.at(-1).areaMm2).toBe(ft2(20));
    expect(beyond(await levels('2026-12-02'))).toEqual([0, -180]);
    expect((await levels('2026-12-02')).out).not.toContainEqual(out.at(-1));
    const maker = await shop.as('maker').get('/api/stock-levels').expect(200);
    expect(maker.text).not.toMatch(/"outValue":/);
  });
});

describe('what cannot be', () => {
  it('is said beside its field in a draft', async () => {
    const refuse = async (line: object, field: string, message: RegExp) => {
      const { body } = await draft(line).expect(422);
      const [fault] = faultsOf(body);
      expect(fault?.field).toBe(`lines.0.${field}`);
      expect(fault?.message).toMatch(message);
    };
    await refuse(dyeing({ lotId: 999_999 }), 'lotId', /^Choose a lot/);
    await refuse(dyeing({ areaMm2: ft2(25) }), 'areaMm2', /^Of T-\d+ 24 ft² is free\. Enter at/);
    await refuse(dyeing({ becomesLeatherId: 999_999 }), 'becomesLeatherId', /^Choose a leather/);
    await refuse(dyeing({ unitPrice: null }), 'unitPrice', /per ft², or for the lot/);
    await refuse(dyeing({ fixedPrice: '9.00' }), 'fixedPrice', /^Enter one price/);
    await refuse(dyeing({ service: ' ' }), 'service', /^Say which work/);
    await sent(dyeing());
    await refuse(dyeing(), 'lotId', /^Nothing of T-\d+ is free\. Choose another lot\.$/);
  });

  it('is more of a lot on two lines than there is', async () => {
    const two = await draft(dyeing({ areaMm2: ft2(20) }), dyeing({ areaMm2: ft2(5) })).expect(422);
    expect(faultsOf(two.body)).toMatchObject([{ field: 'lines.1.areaMm2' }]);
    const both = await draft(dyeing({ areaMm2: ft2(20) }), dyeing()).expect(201);
    expect(both.body.lines[1]).toMatchObject({ areaMm2: area(4) });
  });

  it('is hardware on its line, or a marked area', async () => {
    const order = await sent(dyeing());
    const hardware = [
      { hardwareId: things.hardwareId, purchaseLineId: order.lines[0].id, quantity: 3 },
    ];
    const rivets = await receive(order, { hardware }).expect(422);
    expect(faultsOf(rivets.body)).toMatchObject([{ field: 'hardware.0.purchaseLineId' }]);
    const lots = [back(order, 24, { markedAreaMm2: ft2(24) })];
    const marked = await receive(order, { lots }).expect(422);
    expect(faultsOf(marked.body)).toMatchObject([{ field: 'lots.0.markedAreaMm2' }]);
    expect(await readLot()).toMatchObject({ outFor: [{ areaMm2: area(24) }] });
  });
});

it('keeps a draft of services out of what is suggested to be ordered', async () => {
  const work = (await draft(dyeing()).expect(201)).body;
  const asked = { of: 'leather', id: things.leatherId, quantity: ft2(40), drafted: '0' };
  const path = '/api/order-suggestions/purchase-orders';
  const { body } = await owner()
    .post(path)
    .send({ lines: [asked] })
    .expect(201);
  expect(body.orders).toHaveLength(1);
  expect(body.orders[0]).toMatchObject({ lines: [{ of: 'leather', areaMm2: area(40) }] });
  expect(body.orders[0].number).not.toBe(work.number);
  const read = await owner().get(`${orders}/${work.id}`).expect(200);
  expect(read.body.lines).toMatchObject([{ of: 'service' }]);
});

it('keeps every rule of the books', async () => {
  const results = await verifyFolder(shop.context.config.dataDir);
  expect(results.flatMap(({ faults }) => faults)).toEqual([]);
});
