import type { Job, Lot, StockMovement } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { readyForTheBench, takenOn, ticketOf, type BenchShop } from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { verifyFolder } from '../../verify/verify-folder.ts';

const square300 = '90000';
let ready: BenchShop;
let ticket: Job;

beforeAll(async () => {
  ready = await readyForTheBench(await startTestShop());
});
afterAll(() => ready.shop.close());

const make = async (path: string, body: object) =>
  (await ready.shop.as('owner').post(`/api/${path}`).send(body).expect(201)).body;
const post = (what: string, body: object) =>
  ready.shop.as('maker').post(`/api/jobs/${ticket.id}/${what}`).send(body);
const lotNow = async (id: number) =>
  (await ready.shop.as('owner').get(`/api/lots/${id}`).expect(200)).body as Lot;
const moved = async (query: string) =>
  (await ready.shop.as('owner').get(`/api/stock-movements?${query}`).expect(200)).body
    .items as StockMovement[];
const taken = (lotId: number) => ticket.lots.find((lot) => lot.lotId === lotId)?.takenAreaMm2;
const read = async () => {
  ticket = (await ready.shop.as('maker').get(`/api/jobs/${ticket.id}`).expect(200)).body as Job;
};

/** A side of its own for every test, and a job that has taken 4 ft² of its 12. */
let sideId: number;
beforeEach(async () => {
  const side = { leatherId: ready.leatherId, form: 'side', measuredAreaMm2: '1114836.48' };
  const lots = [
    { ...side, cost: '100.00', weightOz: '5.5', shade: 'mid tan', supplierLot: 'B 77' },
  ];
  const hardware = [{ hardwareId: ready.hardwareId, quantity: 300, cost: '51.00' }];
  sideId = ((await make('receipts', { lots, hardware })).lots as Lot[])[0]?.id ?? 0;
  ticket = await ticketOf(ready, await takenOn(ready));
  await post('takings', { lotId: sideId, areaMm2: '371612.16' }).expect(201);
});

describe('an offcut that goes back on the rack', () => {
  it('is a lot of its own, with its size, its share of the cost and the lot that it was cut from', async () => {
    const reply = await post('offcuts', {
      lotId: sideId,
      widthMm: '300',
      heightMm: '300',
      place: 'offcut bin',
    }).expect(201);
    expect(reply.body).not.toHaveProperty('cost');
    const offcut = await lotNow((reply.body as Lot).id);
    expect(offcut).toMatchObject({
      form: 'offcut',
      weightOz: '5.5',
      measuredAreaMm2: square300,
      freeAreaMm2: square300,
      widthMm: '300',
      heightMm: '300',
      // 90,000 of the 371,612.16 mm² that cost 33.33
      cost: '8.07',
      valueOnHand: '8.07',
      shade: 'mid tan',
      supplierLot: 'B 77',
      place: 'offcut bin',
    });
    await read();
    expect(taken(sideId)).toBe('281612.16');
    expect(taken(offcut.id)).toBe('0');
    expect((await lotNow(sideId)).onHandAreaMm2).toBe('743224.32');
    const [birth] = await moved(`lotId=${offcut.id}`);
    expect(birth).toMatchObject({ kind: 'return', jobNumber: ticket.number, areaMm2: square300 });
  });

  it('loses no cent: the job, the side and its offcuts bear what the side cost', async () => {
    const third = { lotId: sideId, areaMm2: '123870.72' };
    const ids = [];
    for (let n = 0; n < 3; n += 1)
      ids.push(((await post('offcuts', third).expect(201)).body as Lot).id);
    const costs = await Promise.all(ids.map(async (id) => (await lotNow(id)).cost));
    expect(costs).toEqual(['11.11', '11.11', '11.11']);
    const side = await lotNow(sideId);
    expect(new Decimal(side.valueOnHand ?? 0).plus('33.33').toFixed(2)).toBe('100.00');
    await read();
    expect(taken(sideId)).toBe('0');
    const more = await post('offcuts', third);
    expect(more.status).toBe(422);
    expect(more.body.errors[0].message).toContain('Take from it first.');
  });

  it('is taken again, and what is left of it goes back whole or as an offcut of the offcut', async () => {
    const cut = { lotId: sideId, areaMm2: square300 };
    const offcut = (await post('offcuts', cut).expect(201)).body as Lot;
    await post('takings', { lotId: offcut.id, areaMm2: square300 }).expect(201);
    const strip = { lotId: offcut.id, widthMm: '300', heightMm: '100' };
    const small = (await post('offcuts', strip).expect(201)).body as Lot;
    await read();
    expect(taken(offcut.id)).toBe('60000');
    expect((await lotNow(small.id)).cost).toBe('2.69');
    const leatherLeft = [{ lotId: offcut.id, areaMm2: '60000' }];
    await post('finish', { good: 50, leatherLeft }).expect(201);
    expect((await lotNow(offcut.id)).valueOnHand).toBe('5.38');
  });

  it('is refused beyond what the job has out, without a size, and when the job is not at the bench', async () => {
    const tooLarge = await post('offcuts', { lotId: sideId, areaMm2: '371612.161' });
    expect(tooLarge.status).toBe(422);
    expect(tooLarge.body.errors[0]).toMatchObject({ field: 'areaMm2' });
    expect(tooLarge.body.errors[0].message).toContain('This job has 4 ft² of lot');
    const none = await post('offcuts', { lotId: sideId, areaMm2: '0' });
    expect(none.body.errors[0]).toMatchObject({
      field: 'areaMm2',
      message: 'Enter its width and height, or its area.',
    });
    await post('offcuts', { lotId: sideId }).expect(422);
    await post('offcuts', { lotId: sideId, widthMm: '300' }).expect(422);
    await post('offcuts', { lotId: 9999, areaMm2: '100' }).expect(404);
    await post('offcuts', { lotId: ready.lotId, areaMm2: '100' }).expect(422);
    await ready.shop
      .as('bookkeeper')
      .post(`/api/jobs/${ticket.id}/offcuts`)
      .send({ lotId: sideId, areaMm2: '100' })
      .expect(403);
    await post('finish', { good: 50 }).expect(201);
    const late = await post('offcuts', { lotId: sideId, areaMm2: '100' });
    expect(late.status).toBe(409);
  });

  it('is kept once when the same is sent twice', async () => {
    const send = () =>
      post('offcuts', { lotId: sideId, areaMm2: '1000' }).set('Idempotency-Key', 'offcut-twice-1');
    const [one, two] = [await send(), await send()];
    expect(two.body.id).toBe(one.body.id);
    await read();
    expect(taken(sideId)).toBe('370612.16');
  });

  it('leaves the job with the difference, whatever goes back in whichever parts', async () => {
    const part = fc.record({ share: fc.integer({ min: 1, max: 60 }) });
    let round = 0;
    await fc.assert(
      fc.asyncProperty(fc.array(part, { minLength: 1, maxLength: 4 }), async (parts) => {
        round += 1;
        const lots = [
          {
            leatherId: ready.leatherId,
            tag: `R-${round}`,
            form: 'side',
            measuredAreaMm2: '700000',
            cost: '100.01',
          },
        ];
        const lotId = ((await make('receipts', { lots })).lots as Lot[])[0]?.id ?? 0;
        const before = ticket;
        await post('takings', { lotId, areaMm2: '300000' }).expect(201);
        const offcuts: number[] = [];
        for (const { share } of parts) {
          const sent = await post('offcuts', { lotId, areaMm2: String(share * 3001) });
          if (sent.status === 201) offcuts.push((sent.body as Lot).id);
        }
        const all = await moved(`jobId=${before.id}&limit=200`);
        const own = all.filter((each) => each.lotId === lotId || offcuts.includes(each.lotId ?? 0));
        const bears = own.reduce((sum, { value }) => sum.minus(value ?? 0), new Decimal(0));
        const rack = await Promise.all([lotId, ...offcuts].map(lotNow));
        const total = rack.reduce((sum, { valueOnHand }) => sum.plus(valueOnHand ?? 0), bears);
        expect(total.toFixed(2)).toBe('100.01');
        expect(bears.isNegative()).toBe(false);
      }),
      { numRuns: 6 },
    );
  });
});

it('keeps every rule of the books', async () => {
  const results = await verifyFolder(ready.shop.context.config.dataDir);
  expect(results.flatMap(({ faults }) => faults)).toEqual([]);
});
