import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { CancellationOutlook, Order } from '@hidewright/contract';
import {
  agreedQuote,
  readyForTheBench,
  takenOn,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { verifyFolder } from '../../verify/verify-folder.ts';
import { OutgoingMail } from '../mail/outgoing-mail.entity.ts';
import { PurchaseOrder } from '../purchase-orders/purchase-order.entity.ts';

let ready: BenchShop;
beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop({ SMTP_URL: 'smtp://127.0.0.1:9' }));
});
afterEach(() => ready.shop.close());

const owner = () => ready.shop.as('owner');
const maker = () => ready.shop.as('maker');

const look = async (id: number) =>
  (await owner().get(`/api/orders/${id}/cancellation`).expect(200)).body as CancellationOutlook;
const press = (id: number, body: object) =>
  owner()
    .post(`/api/orders/${id}/cancellation`)
    .send({ why: 'The wedding is off', ...body });
async function cancel(id: number, body: object = {}): Promise<Order> {
  const { seen } = await look(id);
  return (await press(id, { seen, ...body }).expect(201)).body as Order;
}
const take = (jobId: number, quantity = 40) =>
  maker().post(`/api/jobs/${jobId}/takings`).send({ hardwareId: ready.hardwareId, quantity });
const bringBack = (jobId: number, body: object) =>
  maker().post(`/api/jobs/${jobId}/returns`).send(body);
const hardware = async () =>
  (await maker().get(`/api/hardware/${ready.hardwareId}`).expect(200)).body as {
    onHand: number;
    reserved: number;
  };
const items = async (path: string) =>
  ((await owner().get(`/api/${path}`).expect(200)).body as { items: { id: number }[] }).items;
const faults = async () =>
  (await verifyFolder(ready.shop.context.config.dataDir)).flatMap((rule) => rule.faults);

describe('what cancelling would do', () => {
  it('names what is held, what the bench gets back and what was drafted for it, and does nothing', async () => {
    const order = await takenOn(ready, 50, { awaits: ['deposit'] });
    await owner().post(`/api/orders/${order.id}/arrivals`).send({ what: 'deposit' }).expect(201);
    const supplier = await owner()
      .post('/api/suppliers')
      .send({ name: 'Fennbridge Fittings' })
      .expect(201);
    const line = { of: 'hardware', hardwareId: ready.hardwareId, quantity: 100, unitPrice: '0.17' };
    const draft = await owner()
      .post('/api/purchase-orders')
      .send({ supplierId: supplier.body.id, lines: [line] })
      .expect(201);
    await ready.shop.context.orm.em
      .fork()
      .nativeUpdate(
        PurchaseOrder,
        { id: draft.body.id as number },
        { draftedFor: `${order.quoteNumber}, packed by Wed 16 Dec 2026` },
      );
    const outlook = await look(order.id);
    expect(outlook).toMatchObject({
      because: null,
      held: [expect.stringMatching(/^[\d.]+ ft² of lot OT-118$/), '100 of Rivet 9 mm'],
      taken: [],
      packed: 0,
      purchaseOrders: [{ id: draft.body.id, supplierName: 'Fennbridge Fittings', state: 'draft' }],
      depositReceived: true,
      cannotMail: null,
    });
    expect(Number(outlook.benchMinutes)).toBeGreaterThan(0);
    expect(await look(order.id)).toEqual(outlook);
    expect((await hardware()).reserved).toBe(100);
  });

  it('is the owner’s to see and to do', async () => {
    const { id } = await takenOn(ready);
    for (const role of ['maker', 'bookkeeper'] as const) {
      await ready.shop.as(role).get(`/api/orders/${id}/cancellation`).expect(403);
      await ready.shop
        .as(role)
        .post(`/api/orders/${id}/cancellation`)
        .send({ why: 'x', seen: '' })
        .expect(403);
    }
    await owner().get('/api/orders/99/cancellation').expect(404);
  });
});

describe('cancelling an order', () => {
  it('lets go of what it holds, gives the bench its hours back, and keeps why', async () => {
    const order = await takenOn(ready, 50, { awaits: ['proof'] });
    const cancelled = await cancel(order.id);
    expect(cancelled).toMatchObject({
      state: 'cancelled',
      awaits: [],
      cancellation: { by: 'The owner', why: 'The wedding is off', at: expect.any(String) },
    });
    expect(await hardware()).toMatchObject({ onHand: 300, reserved: 0 });
    expect(await items('reservations')).toEqual([]);
    const { days } = (await owner().get('/api/bench-hours?days=14').expect(200)).body as {
      days: { planned: unknown[]; promised: unknown[] }[];
    };
    expect(days.flatMap(({ planned, promised }) => [...planned, ...promised])).toEqual([]);
    expect(await items('jobs?open=true')).toEqual([]);
    expect(await items('jobs?state=waiting')).toEqual([]);
    expect(await items('jobs?open=false')).toMatchObject([{ id: order.job.id, cancelled: true }]);
    expect(await items('orders?open=true')).toEqual([]);
    expect(await faults()).toEqual([]);
  });

  it('asks why, and is final', async () => {
    const order = await takenOn(ready);
    const quote = `/api/quotes/${order.quoteId}`;
    expect((await owner().get(quote).expect(200)).body.orderCancelled).toBe(false);
    const { seen } = await look(order.id);
    const silent = await press(order.id, { seen, why: ' ' }).expect(422);
    expect(silent.body.errors).toEqual([{ field: 'why', message: 'Say why it is cancelled.' }]);
    await cancel(order.id);
    const again = await press(order.id, { seen }).expect(409);
    expect(again.body.detail).toBe('O-0001 is cancelled already.');
    expect((await owner().get(quote).expect(200)).body.orderCancelled).toBe(true);
    const reply = await owner()
      .post('/api/orders')
      .send({ quoteId: order.quoteId, promisedOn: '2026-12-16' })
      .expect(409);
    expect(reply.body.detail).toContain('has been taken on as O-0001');
    await owner().post(`/api/orders/${order.id}/arrivals`).send({ what: 'proof' }).expect(409);
  });

  it('counts for nothing that others wait for', async () => {
    const order = await takenOn(ready, 250, { evenIfShort: true });
    const standing = async () => {
      const { body } = await owner().get('/api/stock-levels').expect(200);
      return (body as { hardware: { standing: object }[] }).hardware[0]?.standing;
    };
    expect(await standing()).toMatchObject({ promised: '200', reserved: '300' });
    await cancel(order.id);
    expect(await standing()).toMatchObject({ promised: '0', reserved: '0' });
    const quote = await agreedQuote(ready, 50);
    const check = await maker().get(`/api/quotes/${quote.id}/check`).expect(200);
    expect(check.body.yes).toBe(true);
  });

  it('leaves the ticket only its way back', async () => {
    const { id, job } = await takenOn(ready);
    await take(job.id).expect(201);
    const outlook = await look(id);
    expect(outlook.taken).toEqual(['40 of Rivet 9 mm']);
    expect(outlook.held).toContain('60 of Rivet 9 mm');
    await cancel(id);
    const [step] = (await maker().get(`/api/jobs/${job.id}`).expect(200)).body.steps;
    const refused = [
      await take(job.id),
      await maker().post(`/api/jobs/${job.id}/logs`).send({ stepId: step.id, minutes: '5' }),
      await maker().post(`/api/jobs/${job.id}/finish`).send({ good: 50 }),
      await maker().post(`/api/jobs/${job.id}/pauses`).send({}),
      await maker()
        .post(`/api/jobs/${job.id}/reservations`)
        .send({ hardwareId: ready.hardwareId, quantity: 1 }),
    ];
    for (const { status, body } of refused) {
      expect(status).toBe(409);
      expect(body).toMatchObject({
        detail:
          'O-0001 was cancelled, so J-0001 is over: nothing more is taken, logged, finished or compared. What it has taken can still be brought back.',
        allowed: ['bring back what was taken', 'put an offcut back'],
      });
    }
    const tooMuch = await bringBack(job.id, { hardwareId: ready.hardwareId, quantity: 41 });
    expect([tooMuch.status, tooMuch.body.allowed]).toEqual([409, ['return up to 40']]);
    await bringBack(job.id, { hardwareId: ready.hardwareId, quantity: 40 }).expect(201);
    expect(await hardware()).toEqual(expect.objectContaining({ onHand: 300, reserved: 0 }));
    expect(await faults()).toEqual([]);
  });

  it('lets leather come back as it was and as an offcut', async () => {
    const { id, job } = await takenOn(ready);
    const { lots } = (await maker().get(`/api/jobs/${job.id}`).expect(200)).body;
    const { lotId, heldAreaMm2 } = lots[0];
    await maker()
      .post(`/api/jobs/${job.id}/takings`)
      .send({ lotId, areaMm2: heldAreaMm2 })
      .expect(201);
    await cancel(id);
    await maker()
      .post(`/api/jobs/${job.id}/offcuts`)
      .send({ lotId, widthMm: '200', heightMm: '300' })
      .expect(201);
    await bringBack(job.id, { lotId, areaMm2: '100000' }).expect(201);
    const after = await look(id);
    expect(after.taken).toHaveLength(1);
    expect(await faults()).toEqual([]);
  });

  it('is not possible once something was shipped', async () => {
    const { id, job } = await takenOn(ready);
    await maker().post(`/api/jobs/${job.id}/finish`).send({ good: 50 }).expect(201);
    await maker().post(`/api/orders/${id}/shipments`).send({ shippedOn: '2026-12-01' }).expect(201);
    const { because, seen } = await look(id);
    expect(because).toMatch(/^Something of O-0001 has left the shop already/);
    const reply = await press(id, { seen }).expect(409);
    expect(reply.body.detail).toBe(because);
  });

  it('waits until its invoice is discarded or credited', async () => {
    const { id, job } = await takenOn(ready);
    await maker().post(`/api/jobs/${job.id}/finish`).send({ good: 50 }).expect(201);
    const draft = await owner().post('/api/invoices').send({ orderId: id, taxRateId: null });
    expect(draft.status).toBe(201);
    const { seen } = await look(id);
    const reply = await press(id, { seen }).expect(409);
    expect(reply.body).toMatchObject({
      detail: 'O-0001 has a draft invoice. Discard that draft first, then cancel the order.',
      allowed: ['discard the draft invoice'],
    });
    await owner()
      .post(`/api/invoices/${draft.body.id}/issue`)
      .set('If-Match', `"${draft.body.version}"`)
      .send({ issuedOn: '2026-12-01' })
      .expect(200);
    const { because } = await look(id);
    expect(because).toMatch(/was invoiced as .+\. It can be cancelled once .+ is credited in full/);
    await press(id, { seen: (await look(id)).seen }).expect(409);
    expect((await owner().get(`/api/orders/${id}`)).body.state).toBe('packed');
  });

  it('puts pieces that are packed on the shelf, at all that they cost, and learns nothing from them', async () => {
    const { id, job } = await takenOn(ready);
    await take(job.id, 100).expect(201);
    await maker().post(`/api/jobs/${job.id}/finish`).send({ good: 52, seconds: 1 }).expect(201);
    const learned = async () =>
      (
        (await owner().get(`/api/patterns/${ready.patternId}/learned`).expect(200)).body as {
          runs: unknown[];
        }
      ).runs.length;
    expect(await learned()).toBe(1);
    expect(await look(id)).toMatchObject({ packed: 50, benchMinutes: '0' });
    await cancel(id);
    const em = ready.shop.context.orm.em.fork();
    const rows = await em.execute<{ sort: string; on_hand: number; value: number }[]>(
      'SELECT sort, on_hand, value FROM finished_piece ORDER BY sort',
    );
    expect(rows.map(({ sort, on_hand }) => [sort, on_hand])).toEqual([
      ['good', 52],
      ['seconds', 1],
    ]);
    // 100 rivets at 0.17; nobody took leather.
    expect(rows.reduce((sum, { value }) => sum + value, 0)).toBe(1700);
    expect(await learned()).toBe(0);
    await maker().get(`/api/jobs/${job.id}/comparison`).expect(409);
    await maker().post(`/api/orders/${id}/shipments`).send({ shippedOn: '2026-12-01' }).expect(409);
    expect(await faults()).toEqual([]);
  });

  it('tells the customer where that is ticked, in the owner’s words', async () => {
    const { id } = await takenOn(ready);
    await cancel(id, { tellCustomer: true, word: 'We are sorry to hear it.' });
    const mails = await ready.shop.context.orm.em
      .fork()
      .find(OutgoingMail, { subjectKind: 'order' });
    expect(mails).toMatchObject([
      { recipient: 'bar@example.com', subject: 'A Test Shop: order O-0001 is cancelled' },
    ]);
    expect(mails[0]?.body).toContain('We are sorry to hear it.');
    expect(mails[0]?.body).not.toContain('The wedding is off');
  });

  it('cancels nothing where the customer should be told and cannot', async () => {
    const { id } = await takenOn(ready);
    const { version } = (await owner().get(`/api/customers/${ready.customer.id}`)).body;
    await owner()
      .patch(`/api/customers/${ready.customer.id}`)
      .set('If-Match', `"${version}"`)
      .send({ email: '' })
      .expect(200);
    const { seen, cannotMail } = await look(id);
    expect(cannotMail).toMatch(/has no e-mail address/);
    const reply = await press(id, { seen, tellCustomer: true }).expect(422);
    expect(reply.body.errors).toEqual([{ field: 'tellCustomer', message: cannotMail }]);
    expect((await owner().get(`/api/orders/${id}`)).body.state).toBe('taken on');
    expect((await hardware()).reserved).toBe(100);
  });
});

describe('cancelling while somebody works on it', () => {
  it('gives one of the two 409, and does the other whole', async () => {
    for (let round = 0; round < 6; round += 1) {
      const { id, job } = await takenOn(ready, 50, { evenIfShort: true });
      const before = await hardware();
      const { seen } = await look(id);
      const both = await Promise.all(
        round % 2 === 0
          ? [press(id, { seen }), take(job.id, 1)]
          : [take(job.id, 1), press(id, { seen })],
      );
      expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
      const { state } = (await owner().get(`/api/orders/${id}`)).body;
      const took = (await hardware()).onHand === before.onHand - 1;
      expect(state).toBe(took ? 'in work' : 'cancelled');
      if (took) await cancel(id);
    }
    expect(await faults()).toEqual([]);
  });

  it('says so where something was logged since it was looked at', async () => {
    const { id, job } = await takenOn(ready);
    const { seen } = await look(id);
    const [step] = (await maker().get(`/api/jobs/${job.id}`)).body.steps;
    await maker()
      .post(`/api/jobs/${job.id}/logs`)
      .send({ stepId: step.id, good: 1, minutes: '5' })
      .expect(201);
    const reply = await press(id, { seen }).expect(409);
    expect(reply.body).toMatchObject({ allowed: ['look again'] });
    expect(reply.body.detail).toMatch(/^O-0001 has moved on since you looked/);
    await cancel(id);
  });
});
