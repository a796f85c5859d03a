import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let leatherId: number;

beforeAll(async () => {
  shop = await startTestShop();
  leatherId = (await stockUp(shop)).leatherId;
});
afterAll(() => shop.close());

async function hang(more: object = {}) {
  const lot = { leatherId, form: 'side', measuredAreaMm2: ft2(22), ...more };
  const { body } = await shop
    .as('owner')
    .post('/api/receipts')
    .send({ lots: [lot] })
    .expect(201);
  return body.lots[0] as { id: number; tag: string; version: number };
}

describe('lots', () => {
  it('are found by their tag, their leather and where they lie', async () => {
    const lot = await hang({ tag: 'HIDE-7', place: 'Loft' });
    for (const q of ['HIDE-7', 'russet', 'loft']) {
      const found = await shop.as('maker').get('/api/lots').query({ q }).expect(200);
      expect(found.body.items.map((item: { id: number }) => item.id)).toContain(lot.id);
    }
  });

  it('draw a tag that nobody has written by hand', async () => {
    const first = await hang();
    const next = `T-${String(Number(first.tag.slice(2)) + 1).padStart(4, '0')}`;
    await hang({ tag: next });
    expect((await hang()).tag).not.toBe(next);
  });

  it('keep the size of panels to the 64th of an inch', async () => {
    const lot = await hang({ form: 'panel', pieces: 12, widthMm: '279.4', heightMm: '0.396875' });
    const read = await shop.as('owner').get(`/api/lots/${lot.id}`).expect(200);
    expect(read.body).toMatchObject({
      form: 'panel',
      pieces: 12,
      widthMm: '279.4',
      heightMm: '0.396875',
    });
  });

  it('have a weight of their own, above 0, which can be put right and taken off again', async () => {
    const lot = await hang({ weightOz: '6.047' });
    const change = (version: number, weightOz: string | null) =>
      shop
        .as('maker')
        .patch(`/api/lots/${lot.id}`)
        .set('If-Match', `"${version}"`)
        .send({ weightOz });
    const { body } = await shop.as('maker').get(`/api/lots/${lot.id}`).expect(200);
    expect(body).toMatchObject({ weightOz: '6.047' });
    const moved = await change(lot.version, '5.5').expect(200);
    expect(moved.body).toMatchObject({ weightOz: '5.5' });
    const refused = await change(moved.body.version, '0').expect(422);
    expect(refused.body.errors).toMatchObject([{ field: 'weightOz' }]);
    const placed = await shop
      .as('maker')
      .patch(`/api/lots/${lot.id}`)
      .set('If-Match', `"${moved.body.version}"`)
      .send({ place: 'Loft' })
      .expect(200);
    expect(placed.body).toMatchObject({ weightOz: '5.5' });
    const off = await change(placed.body.version, null).expect(200);
    expect(off.body).toMatchObject({ weightOz: null });
  });

  it('are moved to another place by the maker, in the version that was read', async () => {
    const lot = await hang();
    const change = () =>
      shop.as('maker').patch(`/api/lots/${lot.id}`).set('If-Match', `"${lot.version}"`);
    const moved = await change().send({ place: 'Rack 3' }).expect(200);
    expect(moved.body).toMatchObject({ place: 'Rack 3', tag: lot.tag, version: lot.version + 1 });
    const stale = await change().send({ place: 'Rack 4' }).expect(412);
    expect(stale.body.changed.by).toBe('The maker');
  });

  it('never get another area or cost by a change', async () => {
    const lot = await hang();
    const change = shop
      .as('owner')
      .patch(`/api/lots/${lot.id}`)
      .set('If-Match', `"${lot.version}"`);
    const refused = await change.send({ measuredAreaMm2: ft2(30), cost: '1.00' }).expect(422);
    expect(refused.body.errors.map((fault: { field: string }) => fault.field)).toEqual([
      'measuredAreaMm2',
      'cost',
    ]);
  });

  it('sum up beside their leather', async () => {
    const before = await shop.as('owner').get(`/api/leathers/${leatherId}`).expect(200);
    await hang({ measuredAreaMm2: ft2(10) });
    const after = await shop.as('owner').get(`/api/leathers/${leatherId}`).expect(200);
    expect(Number(after.body.onHandAreaMm2) - Number(before.body.onHandAreaMm2)).toBeCloseTo(
      929_030.4,
      3,
    );
    expect(after.body.supplierName).toMatch(/^Oldbeck Tannery/);
  });

  it('are not found when there are none', async () => {
    await shop.as('owner').get('/api/lots/99999').expect(404);
    await shop.as('owner').get('/api/lots/first').expect(404);
  });
});
