import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { LotLayout } from '@hidewright/contract';
import { coaster } from '../../testing/example-pattern.ts';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { StoredLayout } from '../layouts/layout.entity.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let lotId: number;
let patternId: number;

const edge = [
  { x: 10, y: 20 },
  { x: 2010, y: 20 },
  { x: 2010, y: 920 },
  { x: 10, y: 920 },
];

beforeAll(async () => {
  shop = await startTestShop();
  const { leatherId } = await stockUp(shop);
  const lot = { leatherId, form: 'side', measuredAreaMm2: ft2(20) };
  const owner = shop.as('owner');
  const receipt = await owner
    .post('/api/receipts')
    .send({ lots: [lot] })
    .expect(201);
  lotId = receipt.body.lots[0].id as number;
  const definition = coaster(leatherId);
  const made = await owner.post('/api/patterns').send({ name: 'Coaster', definition }).expect(201);
  patternId = made.body.id as number;
  await owner
    .put(`/api/lots/${lotId}/drawing`)
    .set('If-Match', '"1"')
    .send({ outline: edge, flaws: [], usablePercent: '85' })
    .expect(200);
});
afterAll(() => shop.close());

const lay = (body: object) =>
  shop
    .as('maker')
    .post(`/api/lots/${lotId}/layouts`)
    .send({ patternId, search: 'strips', ...body });
const kept = () => shop.context.orm.em.fork().count(StoredLayout);

describe('a lot laid in strips for the press', () => {
  it('takes the usual width without a press, then what the widest press in use takes', async () => {
    const usual = (await lay({}).expect(201)).body as LotLayout;
    expect(Math.max(...(usual.cuts?.strips ?? []).map(({ widthMm }) => widthMm))).toBeLessThan(301);
    await shop
      .as('owner')
      .post('/api/presses')
      .send({
        name: 'Clicker by the window',
        bedWidthMm: '500',
        bedDepthMm: '400',
        throatMm: '210',
        shutHeightMm: null,
        ruleMm: null,
        reliefAreaMm2: null,
      })
      .expect(201);
    const { cuts, pieces, placements } = (await lay({}).expect(201)).body as LotLayout;
    expect(placements).toHaveLength(pieces);
    expect(cuts?.strips).toHaveLength((cuts?.at.length ?? 0) + 1);
    expect(cuts?.strips.reduce((sum, strip) => sum + strip.pieces, 0)).toBe(pieces);
    for (const { widthMm } of cuts?.strips ?? []) expect(widthMm).toBeLessThanOrEqual(210);
    const from = cuts?.along === 'width' ? 20 : 10;
    for (const cut of cuts?.at ?? []) expect(cut).toBeGreaterThan(from);
  });

  it('takes the width that is asked for, and keeps what it found', async () => {
    const first = await lay({ widestMm: '150' }).expect(201);
    const rows = await kept();
    const again = await lay({ widestMm: '150' }).expect(201);
    expect(again.body).toEqual(first.body);
    expect(await kept()).toBe(rows);
    const whole = await lay({ search: 'rows' }).expect(201);
    expect(whole.body.cuts).toBeNull();
    expect(first.body.pieces).toBeLessThanOrEqual(whole.body.pieces);
  });

  it('is refused with a width of nothing', async () => {
    const { body } = await lay({ widestMm: '0' }).expect(422);
    expect(body.errors[0].field).toBe('widestMm');
  });
});
