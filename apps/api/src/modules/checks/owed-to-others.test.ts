import { Decimal } from 'decimal.js';
import { afterEach, beforeEach, expect, it } from 'vitest';
import type { RunsCheck, StockLevels } from '@hidewright/contract';
import {
  readyForTheBench,
  setBenchHours,
  takenOn,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;

beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop());
});
afterEach(() => ready.shop.close());

const owner = () => ready.shop.as('owner');
const maker = () => ready.shop.as('maker');

/** What another run finds of the two rivets that each of its pieces needs. */
async function foundBy(by: string, quantity = 50) {
  const runs = [{ patternId: ready.patternId, quantity, by }];
  const { body } = await maker().post('/api/checks').send({ runs }).expect(200);
  return (body as RunsCheck).runs[0]?.answers.find(({ about }) => about === 'hardware');
}

/** What the two screens say that is promised of the rivets. */
async function promised(): Promise<[string | undefined, string | undefined]> {
  const { hardwareId } = ready;
  const levels = await owner().get('/api/stock-levels').query({ hardwareId }).expect(200);
  const suggested = await owner().get('/api/order-suggestions?show=all').expect(200);
  const items = (suggested.body as { items: { name: string; promised: string }[] }).items;
  return [
    (levels.body as StockLevels).hardware[0]?.standing.promised,
    items.find(({ name }) => name === 'Rivet 9 mm')?.promised,
  ];
}

async function awaitRivets(quantity: number, expectedOn: string): Promise<void> {
  const supplier = await owner().post('/api/suppliers').send({ name: 'Kettlewell' }).expect(201);
  const lines = [{ of: 'hardware', hardwareId: ready.hardwareId, quantity, unitPrice: '0.17' }];
  const order = { supplierId: supplier.body.id, expectedOn, lines };
  const { body } = await owner().post('/api/purchase-orders').send(order).expect(201);
  await owner().post(`/api/purchase-orders/${body.id}/sendings`).send({ by: 'hand' }).expect(201);
}

it('what a job let go of is owed to it still, until it has taken it', async () => {
  const { job } = await takenOn(ready, 100, { evenIfShort: true });
  expect(await promised()).toEqual(['0', '0']);
  const item = { hardwareId: ready.hardwareId };
  await maker().post(`/api/jobs/${job.id}/releases`).send(item).expect(201);
  expect(await foundBy('2026-12-30', 100)).toMatchObject({ freeNow: '100', short: '100' });
  expect(await promised()).toEqual(['200', '200']);
  await maker()
    .post(`/api/jobs/${job.id}/reservations`)
    .send({ ...item, quantity: 180 });
  expect(await promised()).toEqual(['20', '20']);
  await maker()
    .post(`/api/jobs/${job.id}/takings`)
    .send({ ...item, quantity: 150 });
  expect(await promised()).toEqual(['20', '20']);
});

it('what was held and is not there is owed to the job that goes without', async () => {
  const { job } = await takenOn(ready, 100, { evenIfShort: true });
  const looked = { of: 'hardware', hardwareId: ready.hardwareId, counted: 150, reason: 'looked' };
  await maker().post('/api/adjustments').send(looked).expect(201);
  expect(await promised()).toEqual(['50', '50']);
  const today = await maker().get('/api/today').expect(200);
  expect(today.body.now).toContainEqual(
    expect.objectContaining({
      kind: 'too little',
      detail: 'Rivet 9 mm: a count found less than is held for J-0001',
      to: `/stockroom/hardware/${ready.hardwareId}`,
    }),
  );
  const ticket = await maker().get(`/api/jobs/${job.id}`).expect(200);
  expect(ticket.body.hardware).toMatchObject([{ held: 200, onHand: 150, missing: 50, free: 0 }]);
  const suggested = await maker().get('/api/order-suggestions?show=all').expect(200);
  const rivets = (suggested.body.items as { name: string; why: string }[]).find(
    ({ name }) => name === 'Rivet 9 mm',
  );
  expect(rivets?.why).toMatch(/^50 missing for J-0001 [^.]+\. None free, below /);
  expect((await foundBy('2026-12-30'))?.sentence).toMatch(
    /^Rivet 9 mm: 100 needed, 0 free, 100 short\. 50 more are lacking for what was promised before\. Buy 2 packs of 100\b/,
  );
  await awaitRivets(100, '2026-12-08');
  expect(await foundBy('2026-12-30')).toMatchObject({ free: '50', short: '50' });
});

it('the ticket says what of a lot that is held a count did not find', async () => {
  const { job } = await takenOn(ready, 50);
  const lot = async () => (await maker().get(`/api/jobs/${job.id}`).expect(200)).body.lots[0];
  const { heldAreaMm2, onHandAreaMm2, missingAreaMm2 } = await lot();
  expect([Number(onHandAreaMm2) > Number(heldAreaMm2), missingAreaMm2]).toEqual([true, '0']);
  const looked = { of: 'lot', lotId: ready.lotId, areaMm2: '200000', reason: 'measured again' };
  await owner().post('/api/adjustments').send(looked).expect(201);
  expect(await lot()).toMatchObject({
    heldAreaMm2,
    onHandAreaMm2: '200000',
    missingAreaMm2: new Decimal(heldAreaMm2).minus(200_000).toString(),
    freeAreaMm2: '0',
  });
});

it('a job taken on needs its hardware when it must be begun, not when it is due', async () => {
  await setBenchHours(ready, '0.5');
  await takenOn(ready, 250, { evenIfShort: true, promisedOn: '2026-12-18' });
  const hardware = [{ hardwareId: ready.hardwareId, quantity: 100, cost: '17.00' }];
  await owner().post('/api/receipts').send({ hardware }).expect(201);
  await awaitRivets(200, '2026-12-17');
  // The 100 on the shelf are for the job, which cannot wait for the delivery.
  expect(await foundBy('2027-02-26')).toMatchObject({ freeNow: '0', free: '100', short: '0' });
});
