import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CutAdviceReply } from '@hidewright/contract';
import { StoredLayout } from '../../modules/layouts/layout.entity.ts';
import { coaster } from '../../testing/example-pattern.ts';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let leatherId: number;
let patternId: number;
beforeAll(async () => {
  shop = await startTestShop();
  leatherId = (await stockUp(shop)).leatherId;
  patternId = await addPattern('Coaster', coaster(leatherId));
});
afterAll(() => shop.close());

async function addPattern(name: string, definition: object): Promise<number> {
  const { body } = await shop
    .as('owner')
    .post('/api/patterns')
    .send({ name, definition })
    .expect(201);
  return body.id as number;
}

async function hang(): Promise<number> {
  const lot = { leatherId, form: 'side', measuredAreaMm2: ft2(20), cost: '200.00' };
  const { body } = await shop
    .as('owner')
    .post('/api/receipts')
    .send({ lots: [lot] })
    .expect(201);
  return body.lots[0].id as number;
}

const oblong = [
  { x: 0, y: 0 },
  { x: 2000, y: 0 },
  { x: 2000, y: 900 },
  { x: 0, y: 900 },
];
const panels = [
  { widthMm: '279.4', heightMm: '330.2', price: '9.00' },
  { widthMm: '304.8', heightMm: '609.6', price: null },
];
const addPress = (limits: object) =>
  shop
    .as('owner')
    .post('/api/presses')
    .send({
      name: `Clicker ${JSON.stringify(limits).length}`,
      shutHeightMm: null,
      ruleMm: null,
      reliefAreaMm2: null,
      ...limits,
    });
const advise = (id: number, body: object) =>
  shop.as('owner').post(`/api/patterns/${id}/cut-advice`).send(body);

describe('advice on what to cut from', { timeout: 300_000 }, () => {
  it('compares panels, strips and lots, with the whole price beside the share', async () => {
    const lotId = await hang();
    const reply = await advise(patternId, { good: 50, panels }).expect(200);
    const { cut, rows, rack } = reply.body as CutAdviceReply;
    expect(cut).toBe(60);
    const [small] = rows;
    expect(small).toMatchObject({ kind: 'panel', estimated: false });
    expect(small?.needed).toBe(Math.ceil(60 / (small?.pieces ?? 1)));
    expect(small?.wholePrice).toBe(((small?.needed ?? 0) * 9).toFixed(2));
    expect(Number(small?.sharePrice)).toBeLessThanOrEqual(Number(small?.wholePrice));
    expect(rows.filter(({ cheapest }) => cheapest)).toHaveLength(1);
    const strips = rows.filter(({ kind }) => kind === 'strip');
    expect(strips).toHaveLength(3);
    for (const { lengthMm, widthMm } of strips) {
      expect(Number(lengthMm) * Number(widthMm)).toBeGreaterThan(60 * Math.PI * 47.5 ** 2);
      expect(Number(widthMm)).toBeLessThanOrEqual(300);
    }
    const lot = rows.find((row) => row.lotId === lotId);
    expect(lot).toMatchObject({ kind: 'lot', estimated: true, needed: 1 });
    expect(rack).toHaveLength(1);
  });

  it('lays the pieces on a side that is drawn', async () => {
    const lotId = await hang();
    await shop
      .as('owner')
      .put(`/api/lots/${lotId}/drawing`)
      .set('If-Match', '"1"')
      .send({ outline: oblong, flaws: [], usablePercent: '85' })
      .expect(200);
    const laid = await shop
      .as('maker')
      .post(`/api/lots/${lotId}/layouts`)
      .send({ patternId })
      .expect(201);
    expect(laid.body.placements).toHaveLength(laid.body.pieces);
    const reply = await advise(patternId, { good: 50, panels: [] }).expect(200);
    const row = (reply.body as CutAdviceReply).rows.find((each) => each.lotId === lotId);
    expect(row).toMatchObject({ pieces: laid.body.pieces, estimated: false });
  });

  it('keeps what it compared: the second time nothing is worked out', async () => {
    const asked = { good: 50, panels };
    const first = await advise(patternId, asked).expect(200);
    const em = shop.context.orm.em.fork();
    const before = await em.count(StoredLayout);
    const { workers } = shop.context;
    shop.context.workers = {
      ...workers,
      layOut: () => Promise.reject(new Error('A strip or panel is worked out again.')),
      layOutSide: () => Promise.reject(new Error('A side is worked out again.')),
    };
    const again = await advise(patternId, asked);
    shop.context.workers = workers;
    expect(again.status).toBe(200);
    expect(again.body).toEqual(first.body);
    expect(await em.count(StoredLayout)).toBe(before);
  });

  it('compares a drawn side in strips too where no press takes it whole', async () => {
    const lotId = await hang();
    await shop
      .as('owner')
      .put(`/api/lots/${lotId}/drawing`)
      .set('If-Match', '"1"')
      .send({ outline: oblong, flaws: [], usablePercent: '85' })
      .expect(200);
    const rowsOf = async () => {
      const reply = await advise(patternId, { good: 50, panels: [] }).expect(200);
      const { rows, rack } = reply.body as CutAdviceReply;
      return { rows: rows.filter((row) => row.lotId === lotId), rack };
    };
    expect((await rowsOf()).rows).toMatchObject([{ stripsMm: null }]);
    const press = await addPress({ bedWidthMm: '500', bedDepthMm: '400', throatMm: '280' });
    const { rows, rack } = await rowsOf();
    expect(rows).toMatchObject([{ stripsMm: null }, { stripsMm: '280', estimated: false }]);
    expect(rows[1]?.pieces).toBeLessThanOrEqual(rows[0]?.pieces ?? 0);
    expect(rack?.filter((lot) => lot.lotId === lotId).length).toBeLessThanOrEqual(1);
    await addPress({ bedWidthMm: '3000', bedDepthMm: '2000', throatMm: null });
    expect((await rowsOf()).rows).toMatchObject([{ stripsMm: null }]);
    expect(press.status).toBe(201);
  });

  it('asks for a drawing where there is none', async () => {
    const handCount = { pieces: 21, widthMm: '279.4', heightMm: '330.2' };
    const counted = coaster(leatherId, {
      layoutBy: 'hand count',
      handCount,
      outline: null,
      container: null,
    });
    const byHand = await addPattern('Counted', counted);
    const { body } = await advise(byHand, { good: 50, panels }).expect(422);
    expect(body.errors[0].field).toBe('outline');
    const lotId = await hang();
    const blank = await shop.as('owner').post(`/api/lots/${lotId}/layouts`).send({ patternId });
    expect(blank.status).toBe(422);
    expect(blank.body.errors[0].message).toContain('Draw the edge');
  });

  it('is the owner’s alone', async () => {
    await shop
      .as('maker')
      .post(`/api/patterns/${patternId}/cut-advice`)
      .send({ good: 5, panels })
      .expect(403);
  });
});
