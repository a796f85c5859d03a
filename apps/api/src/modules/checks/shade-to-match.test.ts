import { afterEach, beforeEach, expect, it } from 'vitest';
import type { LastTime, Lot, RunCheck } from '@hidewright/contract';
import {
  agreedQuote,
  readyForTheBench,
  takenOn,
  type BenchShop,
} from '../../testing/bench-shop.ts';
import { png } from '../../testing/grey-picture.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let ready: BenchShop;
let lighter: number;

/** Two sides of one leather, the first a dark one, each enough for one run. */
beforeEach(async () => {
  ready = await readyForTheBench(await startTestShop());
  const measuredAreaMm2 = '1107102.96';
  const side = { leatherId: ready.leatherId, form: 'side', measuredAreaMm2, shade: 'light' };
  const delivery = { lots: [{ ...side, cost: '120.00' }], hardware: [] };
  const came = await as('owner').post('/api/receipts').send(delivery).expect(201);
  lighter = (came.body.lots as Lot[])[0]?.id ?? 0;
  const { version } = await get<Lot>(`lots/${ready.lotId}`);
  await as('owner')
    .patch(`/api/lots/${ready.lotId}`)
    .set('If-Match', `"${version}"`)
    .send({ shade: 'dark' })
    .expect(200);
});
afterEach(() => ready.shop.close());

const as = (role: 'owner' | 'maker') => ready.shop.as(role);
const get = async <Reply>(path: string) =>
  (await as('maker').get(`/api/${path}`).expect(200)).body as Reply;

async function lastTimeFor(quoteId: number): Promise<LastTime | null> {
  return (await get<{ lastTime: LastTime | null }>(`quotes/${quoteId}/last-time`)).lastTime;
}

async function leatherOf(quoteId: number): Promise<string | undefined> {
  const { answers } = await get<RunCheck>(`quotes/${quoteId}/check?by=2026-12-18`);
  return answers.find(({ about }) => about === 'leather')?.sentence;
}

it('is that of the lot that is held while nothing is taken, and then of what was taken', async () => {
  const order = await takenOn(ready);
  const again = (await agreedQuote(ready)).id;
  expect(await lastTimeFor(again)).toMatchObject({
    ...{ orderNumber: order.number, cut: false },
    lots: [{ lotId: ready.lotId, shade: 'dark' }],
  });
  expect(await leatherOf(again)).toContain(
    'The earlier run’s leather is dark, this would be light.',
  );

  // The maker takes the other side instead of the one that is held.
  const path = `/api/jobs/${order.job.id}`;
  await as('maker').post(`${path}/releases`).send({ lotId: ready.lotId });
  await as('maker')
    .post(`${path}/takings`)
    .send({ lotId: lighter, areaMm2: '553551.48' })
    .expect(201);
  expect(await lastTimeFor(again)).toMatchObject({
    cut: true,
    lots: [{ lotId: lighter, shade: 'light' }],
  });
  expect(await leatherOf(again)).toContain('The earlier run’s leather is light');
});

it('is shown as the swatch that was photographed, to whoever cuts', async () => {
  const picture = png(400, 200);
  const { hash } = (
    await as('maker')
      .post(`/api/lots/${ready.lotId}/photos`)
      .set('Content-Type', 'image/png')
      .send(picture)
      .expect(200)
  ).body as { hash: string };
  const drawing = `/api/lots/${ready.lotId}/drawing`;
  const { version } = await get<{ version: number }>(`lots/${ready.lotId}/drawing`);
  const photo = { hash, mmPerPixel: 2, x: 0, y: 0 };
  await as('maker')
    .put(drawing)
    .set('If-Match', `"${version}"`)
    .send({ outline: null, flaws: [], usablePercent: '85', photo })
    .expect(200);
  await takenOn(ready);
  const again = (await agreedQuote(ready)).id;
  const swatch = (await lastTimeFor(again))?.lots[0]?.photo;
  expect(swatch).toEqual({ lotId: ready.lotId, hash });
  const shown = await as('maker')
    .get(`/api/lots/${swatch?.lotId}/photos/${swatch?.hash}`)
    .expect(200);
  expect(shown.headers['content-type']).toBe('image/png');
  expect(Buffer.compare(shown.body as Buffer, picture)).toBe(0);
});
