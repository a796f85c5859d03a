import type { LastTime, Lot, LotFamily, OrderLeather } from '@hidewright/contract';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readyForTheBench, takenOn, ticketOf, type BenchShop } from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
let sideId: number;
beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
  const side = { leatherId: ready.leatherId, form: 'side', measuredAreaMm2: '2000000' };
  const hardware = [{ hardwareId: ready.hardwareId, quantity: 900, cost: '90.00' }];
  const delivery = { lots: [{ ...side, cost: '150.00' }], hardware };
  const came = await ready.shop.as('owner').post('/api/receipts').send(delivery).expect(201);
  sideId = (came.body.lots as Lot[])[0]?.id ?? 0;
});
afterAll(() => ready.shop.close());

const get = async (path: string, role: 'owner' | 'maker' = 'maker') =>
  (await ready.shop.as(role).get(`/api/${path}`).expect(200)).body;
const post = async (jobId: number, what: string, body: object) =>
  (await ready.shop.as('maker').post(`/api/jobs/${jobId}/${what}`).send(body).expect(201)).body;

/** A job that took 2 ft² of a lot and put 300 × 200 mm of it back. */
async function cutFrom(lotId: number) {
  const order = await takenOn(ready, 50, { evenIfShort: true });
  const job = await ticketOf(ready, order);
  await ready.shop.as('maker').post(`/api/jobs/${job.id}/releases`).send({ lotId });
  await post(job.id, 'takings', { lotId, areaMm2: '185806.08' });
  const size = { widthMm: '300', heightMm: '200' };
  const offcut = (await post(job.id, 'offcuts', { lotId, ...size })) as Lot;
  return { order, job, offcut };
}

describe('the chain from the side to the customer', () => {
  it('is read both ways, over an offcut of an offcut', async () => {
    const first = await cutFrom(ready.lotId);
    const second = await ticketOf(ready, await takenOn(ready));
    await post(second.id, 'takings', { lotId: first.offcut.id, areaMm2: '60000' });
    const small = (await post(second.id, 'offcuts', {
      lotId: first.offcut.id,
      areaMm2: '20000',
    })) as Lot;

    const family = (await get(`lots/${ready.lotId}/family`)) as LotFamily;
    expect(family.lots.map(({ tag, parentId }) => [tag, parentId])).toEqual([
      ['OT-118', null],
      [first.offcut.tag, ready.lotId],
      [small.tag, first.offcut.id],
    ]);
    expect(family.wentInto).toMatchObject([
      { tag: first.offcut.tag, jobNumber: second.number, areaMm2: '40000' },
      {
        tag: 'OT-118',
        jobNumber: first.job.number,
        orderNumber: first.order.number,
        customerName: 'Brambling Brewery',
        areaMm2: '125806.08',
        good: null,
      },
    ]);

    const fromTheMiddle = (await get(`lots/${first.offcut.id}/family`)) as LotFamily;
    expect(fromTheMiddle.lots).toEqual(family.lots);
    expect(fromTheMiddle.wentInto.map(({ jobNumber }) => jobNumber)).toEqual([second.number]);
    const nothing = (await get(`lots/${small.id}/family`)) as LotFamily;
    expect(nothing.wentInto).toEqual([]);

    const back = (await get(`orders/${second.orderId}/leather`)) as OrderLeather;
    expect(back.lots).toHaveLength(1);
    expect(back.lots[0]?.areaMm2).toBe('40000');
    expect(back.lots[0]?.chain.map(({ tag }) => tag)).toEqual(['OT-118', first.offcut.tag]);
    expect(back.lots[0]?.origin).toMatchObject({ receivedOn: '2026-12-01', supplierName: null });
  });

  it('tells the maker no price and nobody’s e-mail, and knows no lot that is not there', async () => {
    const text = JSON.stringify([
      await get(`lots/${ready.lotId}/family`),
      await get(`orders/1/leather`),
      await get(`orders/1/last-time`),
    ]);
    expect(text).not.toMatch(/cost|price|value|@/i);
    const maker = ready.shop.as('maker');
    await maker.get('/api/lots/9999/family').expect(404);
    await maker.get('/api/orders/9999/leather').expect(404);
    await ready.shop.nobody().get(`/api/lots/${ready.lotId}/family`).expect(401);
  });

  it('shows on a reorder what the order before was cut from, and nothing on the first', async () => {
    const owner = ready.shop.as('owner');
    const { version } = (await get(`lots/${sideId}`)) as Lot;
    await owner
      .patch(`/api/lots/${sideId}`)
      .set('If-Match', `"${version}"`)
      .send({ shade: 'mid tan' })
      .expect(200);
    const { order } = await cutFrom(sideId);
    const again = await takenOn(ready, 50, { evenIfShort: true });
    const { lastTime } = (await get(`orders/${again.id}/last-time`)) as { lastTime: LastTime };
    expect(lastTime).toMatchObject({ orderNumber: order.number, shippedOn: null });
    expect(lastTime.lots).toMatchObject([{ lotId: sideId, shade: 'mid tan', photo: null }]);
    expect((await get(`quotes/${again.quoteId}/last-time`)).lastTime.orderNumber).toBe(
      order.number,
    );
    expect(lastTime.cut).toBe(true);
    expect((await get('orders/1/last-time')).lastTime).toBeNull();
    await ready.shop.as('bookkeeper').get('/api/orders/1/last-time').expect(403);
  });
});
