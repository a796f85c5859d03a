import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let lotId: number;

beforeAll(async () => {
  shop = await startTestShop();
  const { leatherId } = await stockUp(shop);
  const lot = { leatherId, form: 'side', measuredAreaMm2: ft2(22) };
  const { body } = await shop
    .as('owner')
    .post('/api/receipts')
    .send({ lots: [lot] })
    .expect(201);
  lotId = body.lots[0].id as number;
});
afterAll(() => shop.close());

const corners = (...pairs: [number, number][]) => pairs.map(([x, y]) => ({ x, y }));
const edge = corners([0, 0], [2000, 0], [2000, 900], [0, 900]);
const flaw = corners([100, 100], [140, 100], [120, 150]);
const read = async () =>
  (await shop.as('maker').get(`/api/lots/${lotId}/drawing`).expect(200)).body;
const draw = (body: object, version: number) =>
  shop.as('maker').put(`/api/lots/${lotId}/drawing`).set('If-Match', `"${version}"`).send(body);

describe('the drawing of a side', () => {
  it('is drawn by the maker with its flaws, in the version that was read', async () => {
    const blank = await read();
    expect(blank).toMatchObject({ outline: null, flaws: [], usablePercent: '85' });
    const drawing = { outline: edge, flaws: [flaw], usablePercent: '80' };
    const drawn = await draw(drawing, blank.version).expect(200);
    expect(drawn.body).toEqual({ ...drawing, photo: null, version: blank.version + 1 });
    expect(await read()).toEqual(drawn.body);
    await draw(drawing, blank.version).expect(412);
  });

  it.each([
    [
      'an edge that crosses itself',
      { outline: corners([0, 0], [100, 100], [100, 0], [0, 100]) },
      ['outline'],
    ],
    ['two corners', { outline: corners([0, 0], [1, 1]) }, ['outline']],
    ['a flaw of nothing', { flaws: [corners([5, 5], [10, 5], [15, 5])] }, ['flaws.0']],
    ['flaws without an edge', { outline: null, flaws: [flaw] }, ['outline']],
    ['more than the whole of it', { usablePercent: '101' }, ['usablePercent']],
  ])('is refused with %s, and stays as it was', async (_what, change, fields) => {
    const before = await read();
    const asked = { outline: edge, flaws: [], usablePercent: '80', ...change };
    const { body } = await draw(asked, before.version).expect(422);
    expect((body.errors as { field: string }[]).map(({ field }) => field)).toEqual(fields);
    expect(await read()).toEqual(before);
  });

  it('is not the bookkeeper’s to see', async () => {
    await shop.as('bookkeeper').get(`/api/lots/${lotId}/drawing`).expect(403);
    await shop.as('maker').get('/api/lots/999999/drawing').expect(404);
  });
});
