import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { ft2, orderMore, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { reading, theProgram } from '../../work.ts';
import { OutgoingMail } from '../mail/outgoing-mail.entity.ts';
import { findPurchaseOrder } from './draft-purchase-order.ts';
import { paperOf } from './purchase-order-paper.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;

beforeAll(async () => {
  shop = await startTestShop({ SMTP_URL: 'smtp://127.0.0.1:9' });
});
afterAll(() => shop.close());
beforeEach(async () => {
  things = await stockUp(shop);
});

const owner = () => shop.as('owner');
const line = (more: object = {}) => ({
  of: 'hardware',
  hardwareId: things.hardwareId,
  quantity: 1000,
  unitPrice: '0.1625',
  ...more,
});
const hides = (more: object = {}) => ({
  of: 'leather',
  leatherId: things.leatherId,
  areaMm2: ft2(40),
  unitPrice: '8.50',
  ...more,
});

async function draft(lines: object[] = [hides(), line()]) {
  const { body } = await owner()
    .post('/api/purchase-orders')
    .send({ supplierId: things.supplierId, lines })
    .expect(201);
  return body as { id: number; number: string; version: number; lines: { id: number }[] };
}

const send = (id: number, by = 'hand') =>
  owner().post(`/api/purchase-orders/${id}/sendings`).send({ by });
const cancel = (id: number) =>
  owner().post(`/api/purchase-orders/${id}/cancellations`).send({ reason: 'Too late for us' });

describe('an order to a supplier', () => {
  it('is drafted with its number, its lines and what they come to', async () => {
    expect(await draft()).toMatchObject({
      number: expect.stringMatching(/^P-\d{4}$/),
      state: 'draft',
      total: '502.50',
      lines: [
        {
          position: 1,
          of: 'leather',
          areaMm2: '3716121.6',
          receivedAreaMm2: '0',
          quantity: null,
          amount: '340.00',
        },
        {
          position: 2,
          of: 'hardware',
          areaMm2: null,
          quantity: 1000,
          received: 0,
          unitPrice: '0.1625',
          amount: '162.50',
        },
      ],
    });
  });

  it('draws one number for one key', async () => {
    const body = { supplierId: things.supplierId, lines: [line()] };
    const post = () =>
      owner()
        .post('/api/purchase-orders')
        .set('Idempotency-Key', `draft-${things.supplierId}`)
        .send(body);
    const [first, second] = await Promise.all([post(), post()]);
    expect(first.status).toBe(201);
    expect(second.body).toEqual(first.body);
    const list = await owner()
      .get(`/api/purchase-orders?supplierId=${things.supplierId}`)
      .expect(200);
    expect(list.body.items).toHaveLength(1);
  });

  it('is changed only by whoever has read its latest version', async () => {
    const order = await draft();
    const change = (version: string | undefined, body: object) => {
      const request = owner().patch(`/api/purchase-orders/${order.id}`).send(body);
      return version === undefined ? request : request.set('If-Match', `"${version}"`);
    };
    await change(undefined, { note: 'Please hurry' }).expect(428);
    const changed = await change(String(order.version), { lines: [line({ quantity: 10 })] }).expect(
      200,
    );
    expect(changed.body).toMatchObject({
      lines: [{ quantity: 10, position: 1 }],
      version: order.version + 1,
      note: '',
    });
    const stale = await change(String(order.version), { note: 'Mine' }).expect(412);
    expect(stale.body.changed).toMatchObject({
      by: 'The owner',
      what: expect.stringContaining(order.number),
    });
  });

  it('goes by e-mail to its supplier, with a day on which it is awaited', async () => {
    const order = await draft();
    const sent = await send(order.id, 'mail').expect(201);
    expect(sent.body).toMatchObject({
      state: 'sent',
      sentAt: '2026-12-01T09:00:00.000Z',
      expectedOn: '2026-12-11',
    });
    const mail = await shop.context.orm.em
      .fork()
      .findOneOrFail(OutgoingMail, { subjectKind: 'purchase order', subjectId: order.id });
    expect(mail.recipient).toBe('orders@example.com');
    expect(mail.subject).toContain(order.number);
    expect(mail.body).toMatch(/40 ft² of Oak tan russet \d+, at USD 8\.50 per ft²/);
    expect(mail.body).toMatch(/1,000 × Copper rivet \d+, at USD 0\.1625 each/);
  });

  it('names the supplier’s own article, and how many whole sides the leather is', async () => {
    const leather = await owner()
      .post('/api/leathers')
      .send({
        ...{ name: `By the side ${things.supplierId}`, pricePerFt2: '9.00' },
        ...{ wholeForm: 'side', wholeAreaMm2: ft2(20) },
      })
      .expect(201);
    const offer = (of: object, supplierId: number, articleNumber: string) =>
      owner()
        .post('/api/supplier-offers')
        .send({ ...of, supplierId, articleNumber, breaks: [{ from: '1', price: '0.2' }] })
        .expect(201);
    const other = await stockUp(shop);
    const rivets = { hardwareId: things.hardwareId };
    await offer(rivets, things.supplierId, 'CR 7/1');
    await offer(rivets, other.supplierId, '99');
    await offer({ leatherId: things.leatherId }, things.supplierId, 'OT-7');

    const bySide = { leatherId: leather.body.id as number };
    const order = await draft([
      line(),
      hides(),
      hides(bySide),
      hides({ ...bySide, areaMm2: ft2(50) }),
    ]);
    expect(order.lines).toMatchObject([
      { articleNumber: 'CR 7/1', whole: null },
      { articleNumber: 'OT-7', whole: null },
      { articleNumber: '', whole: { count: 2, form: 'side' } },
      { articleNumber: '', whole: null },
    ]);
    const printed = await reading(shop.context, theProgram, async (work) =>
      paperOf(work, await findPurchaseOrder(work, order.id)),
    );
    expect(printed.lines).toMatchObject([
      { articleNumber: 'CR 7/1', quantity: '1,000' },
      { articleNumber: 'OT-7', quantity: '40 ft²' },
      { articleNumber: '', quantity: '2 sides, about 40 ft²' },
      { articleNumber: '', quantity: '50 ft²' },
    ]);
  });

  it('has its paper with it, and the file that was sent stays as it was', async () => {
    const order = await draft();
    const paper = (role: 'owner' | 'bookkeeper' | 'maker' = 'owner') =>
      shop.as(role).get(`/api/purchase-orders/${order.id}/paper`).buffer();
    const before = await paper().expect(200).expect('Content-Type', 'application/pdf');
    expect(before.body.subarray(0, 5).toString()).toBe('%PDF-');
    await send(order.id, 'mail').expect(201);
    const mail = await shop.context.orm.em
      .fork()
      .findOneOrFail(OutgoingMail, { subjectKind: 'purchase order', subjectId: order.id });
    expect(mail.attachments).toMatchObject([
      { name: `${order.number}.pdf`, type: 'application/pdf' },
    ]);
    const sent = await shop.context.files.read(mail.attachments[0]?.hash ?? '');
    const workshop = await owner().get('/api/workshop').expect(200);
    await owner()
      .patch('/api/workshop')
      .set('If-Match', `"${workshop.body.version}"`)
      .send({ name: 'Another name' })
      .expect(200);
    const after = await paper('bookkeeper').expect(200);
    expect(after.body.equals(sent)).toBe(true);
    await paper('maker').expect(403);
  });

  it('does not go by e-mail to a supplier without an address', async () => {
    const supplier = await owner()
      .post('/api/suppliers')
      .send({ name: `By telephone ${things.supplierId}` })
      .expect(201);
    const order = await owner()
      .post('/api/purchase-orders')
      .send({ supplierId: supplier.body.id, lines: [line()] })
      .expect(201);
    const refused = await send(order.body.id, 'mail').expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'by' }]);
    expect((await owner().get(`/api/purchase-orders/${order.body.id}`)).body.state).toBe('draft');
  });

  it('keeps to its states, and says what is allowed', async () => {
    const order = await draft();
    const early = await shop
      .as('maker')
      .post('/api/receipts')
      .send({
        purchaseOrderId: order.id,
        hardware: [
          { hardwareId: things.hardwareId, quantity: 1, purchaseLineId: order.lines[1]?.id },
        ],
      });
    expect(early).toMatchObject({ status: 409, body: { allowed: ['send', 'cancel'] } });
    await send(order.id).expect(201);
    expect((await send(order.id).expect(409)).body.allowed).toEqual(['receive']);
    const late = await owner()
      .patch(`/api/purchase-orders/${order.id}`)
      .set('If-Match', '"2"')
      .send({ note: 'x' });
    expect(late.status).toBe(409);
    expect((await cancel(order.id).expect(201)).body).toMatchObject({
      state: 'cancelled',
      cancellation: { by: 'The owner', why: 'Too late for us', at: '2026-12-01T09:00:00.000Z' },
    });
    await cancel(order.id).expect(409);
    await send(order.id).expect(409);
  });

  it('cannot be cancelled once a part of it has come', async () => {
    const order = await orderMore(shop, things);
    const hardware = [
      { hardwareId: things.hardwareId, quantity: 1, purchaseLineId: order.rivetLine },
    ];
    await owner().post('/api/receipts').send({ purchaseOrderId: order.id, hardware }).expect(201);
    expect((await cancel(order.id).expect(409)).body.allowed).toEqual(['receive']);
  });

  it('shows as on order until it is here', async () => {
    const order = await orderMore(shop, things);
    const rivets = await owner().get(`/api/hardware/${things.hardwareId}`).expect(200);
    expect(rivets.body).toMatchObject({ onOrder: 1000, short: false });
    const leather = await owner().get(`/api/leathers/${things.leatherId}`).expect(200);
    expect(leather.body).toMatchObject({ onOrderAreaMm2: '3716121.6', onHandAreaMm2: '0' });
    const awaited = await owner()
      .get(`/api/purchase-orders?awaited=yes&supplierId=${things.supplierId}`)
      .expect(200);
    expect(awaited.body.items).toMatchObject([{ id: order.id }]);
    await cancel(order.id).expect(201);
    expect((await owner().get(`/api/hardware/${things.hardwareId}`)).body).toMatchObject({
      onOrder: 0,
      short: true,
    });
  });

  it.each([
    ['no lines', () => ({ lines: [] }), 'lines'],
    ['a quantity below zero', () => ({ lines: [line({ quantity: -1 })] }), 'lines.0.quantity'],
    ['an area of nothing', () => ({ lines: [hides({ areaMm2: '0' })] }), 'lines.0.areaMm2'],
    [
      'a price with five decimals',
      () => ({ lines: [line({ unitPrice: '0.12345' })] }),
      'lines.0.unitPrice',
    ],
    ['a price below zero', () => ({ lines: [line({ unitPrice: '-1' })] }), 'lines.0.unitPrice'],
    [
      'a leather that does not exist',
      () => ({ lines: [hides({ leatherId: 99_999 })] }),
      'lines.0.leatherId',
    ],
    [
      'an amount beyond the books',
      () => ({ lines: [hides({ areaMm2: ft2(99_000), unitPrice: '999999999' })] }),
      'lines.0.unitPrice',
    ],
    [
      'a supplier that does not exist',
      () => ({ supplierId: 99_999, lines: [line()] }),
      'supplierId',
    ],
    ['a state of its own', () => ({ lines: [line()], state: 'received' }), 'state'],
    ['a day that is none', () => ({ lines: [line()], expectedOn: '2026-02-30' }), 'expectedOn'],
  ])('is not drafted with %s', async (_what, body, field) => {
    const refused = await owner()
      .post('/api/purchase-orders')
      .send({ supplierId: things.supplierId, ...body() })
      .expect(422);
    expect(refused.body.errors.map((fault: { field: string }) => fault.field)).toContain(field);
  });
});
