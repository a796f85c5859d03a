import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { nestFaults, usualSide, type Point } from '@hidewright/domain';
import type { LotLayout, LotSearch } from '@hidewright/contract';
import { coaster } from '../../testing/example-pattern.ts';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { StoredLayout } from '../layouts/layout.entity.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let leatherId: number;

beforeAll(async () => {
  shop = await startTestShop();
  leatherId = (await stockUp(shop)).leatherId;
});
afterAll(() => shop.close());

/** An arrow's head: rows leave room between such pieces. */
const points = [
  [0, 0],
  [60, 30],
  [0, 60],
  [20, 30],
].map(([x = 0, y = 0]) => ({ x, y }));
const spacingMm = 2;

async function patternNamed(name: string, outline = points): Promise<number> {
  const definition = coaster(leatherId, { outline: { shape: 'polygon', points: outline } });
  const { body } = await shop
    .as('owner')
    .post('/api/patterns')
    .send({ name, definition })
    .expect(201);
  return body.id as number;
}

/** A side on the rack, drawn with an edge that encloses this area. */
async function drawnSide(areaMm2: number): Promise<number> {
  const lot = { leatherId, form: 'side', measuredAreaMm2: ft2(22) };
  const made = await shop
    .as('owner')
    .post('/api/receipts')
    .send({ lots: [lot] });
  const [{ id }] = made.body.lots as [{ id: number }];
  const { body } = await shop.as('maker').get(`/api/lots/${id}/drawing`).expect(200);
  await shop
    .as('maker')
    .put(`/api/lots/${id}/drawing`)
    .set('If-Match', `"${body.version}"`)
    .send({ outline: usualSide(areaMm2), flaws: [], usablePercent: '85' })
    .expect(200);
  return id;
}

const start = async (lotId: number, patternId: number) => {
  const asked = shop.as('maker').post(`/api/lots/${lotId}/searches`).send({ patternId });
  return (await asked.expect(202)).body as LotSearch;
};
const read = async (id: string) =>
  (await shop.as('owner').get(`/api/searches/${id}`).expect(200)).body as LotSearch;

/** Asks again and again until it is so. */
async function until(id: string, isSo: (search: LotSearch) => boolean): Promise<LotSearch[]> {
  const seen: LotSearch[] = [];
  for (;;) {
    const now = await read(id);
    seen.push(now);
    if (isSo(now)) return seen;
    await new Promise((resolve) => setTimeout(resolve, 30));
  }
}

const keptLayouts = () => shop.context.orm.em.fork().count(StoredLayout);

function faultsOf({ outlinePath, side, placements }: LotLayout) {
  const corners = [...outlinePath.matchAll(/(-?[\d.]+)[ ,](-?[\d.]+)/g)];
  const outline: Point[] = corners.map(([, x, y]) => ({ x: Number(x), y: Number(y) }));
  return nestFaults(
    {
      outline,
      container: { type: 'polygon', points: side.outline },
      gap: spacingMm,
      trim: 3,
      rotations: [0, 90, 180, 270],
    },
    placements,
  );
}

describe('a search for the most pieces of a side', () => {
  it('tells how far it is until it is done, and is found at once the next time', async () => {
    const [lotId, patternId] = [await drawnSide(150_000), await patternNamed('Arrow head')];
    const before = await keptLayouts();
    const { id } = await start(lotId, patternId);
    const seen = await until(id, ({ state }) => state !== 'looking');
    const shares = seen.map(({ done }) => done);
    expect(shares).toEqual([...shares].sort((a, b) => a - b));
    expect(shares.some((share) => share > 0 && share < 1)).toBe(true);
    const last = seen.at(-1)!;
    expect(last).toMatchObject({ state: 'done', done: 1, refusal: null });
    expect(last.layout).toMatchObject({ lotId, patternId, pieces: last.pieces });
    expect(faultsOf(last.layout!)).toEqual([]);
    expect(await keptLayouts()).toBe(before + 1);

    const again = await start(lotId, patternId);
    const [known] = (await until(again.id, ({ state }) => state !== 'looking')).slice(-1);
    expect(known).toEqual({ ...last, id: again.id });
    const { body } = await shop
      .as('owner')
      .post(`/api/lots/${lotId}/layouts`)
      .send({ patternId, search: 'best' });
    expect(body).toEqual(last.layout);
    expect(await keptLayouts()).toBe(before + 1);
  });

  it('can be stopped: what it has by then is its answer, and is not kept', async () => {
    const [lotId, patternId] = [await drawnSide(1_900_000), await patternNamed('Arrow')];
    const before = await keptLayouts();
    const { id } = await start(lotId, patternId);
    await until(id, ({ pieces }) => pieces !== null);
    const { body } = await shop.as('owner').delete(`/api/searches/${id}`).expect(200);
    const stopped = body as LotSearch;
    expect(stopped.state).toBe('stopped');
    expect(stopped.done).toBeLessThan(1);
    expect(stopped.layout!.pieces).toBeGreaterThan(100);
    expect(faultsOf(stopped.layout!)).toEqual([]);
    expect(await read(id)).toEqual(stopped);
    expect(await keptLayouts()).toBe(before);
  });

  it('is joined by whoever asks for the same while it looks', async () => {
    const [lotId, patternId] = [await drawnSide(1_900_000), await patternNamed('Arrow, joined')];
    const first = await start(lotId, patternId);
    const second = await start(lotId, patternId);
    expect(second.id).toBe(first.id);
    await shop.as('maker').delete(`/api/searches/${first.id}`).expect(200);
    const third = await start(lotId, patternId);
    expect(third.id).not.toBe(first.id);
    await shop.as('maker').delete(`/api/searches/${third.id}`).expect(200);
  });

  it('waits its turn while several look', async () => {
    const lotId = await drawnSide(1_900_000);
    const patterns: number[] = [];
    for (let at = 0; at < 5; at += 1) patterns.push(await patternNamed(`Arrow ${at}`));
    const looking = [];
    for (const patternId of patterns.slice(0, 4)) looking.push(await start(lotId, patternId));
    const refused = await shop
      .as('owner')
      .post(`/api/lots/${lotId}/searches`)
      .send({ patternId: patterns[4] })
      .expect(429);
    expect(refused.body.detail).toMatch(/try again/);
    expect(refused.headers['retry-after']).toBe('5');
    const ended = looking.map(({ id }) => shop.as('owner').delete(`/api/searches/${id}`));
    for (const { body } of await Promise.all(ended))
      expect((body as LotSearch).layout!.pieces).toBeGreaterThan(100);
  });

  it('is for the owner and the maker, of what is there and drawn', async () => {
    const [lotId, patternId] = [await drawnSide(150_000), await patternNamed('Arrow, refused')];
    const ask = (role: 'owner' | 'bookkeeper', lot: number, body: object) =>
      shop.as(role).post(`/api/lots/${lot}/searches`).send(body);
    await ask('bookkeeper', lotId, { patternId }).expect(403);
    await ask('owner', 987_654, { patternId }).expect(404);
    await ask('owner', lotId, { patternId: 987_654 }).expect(422);
    await ask('owner', lotId, {}).expect(422);
    const { id } = await start(lotId, patternId);
    await shop.nobody().get(`/api/searches/${id}`).expect(401);
    await shop.as('bookkeeper').get(`/api/searches/${id}`).expect(403);
    await shop.as('bookkeeper').delete(`/api/searches/${id}`).expect(403);
    for (const unknown of ['nothing', 'A'.repeat(22)]) {
      await shop.as('owner').get(`/api/searches/${unknown}`).expect(404);
      await shop.as('owner').delete(`/api/searches/${unknown}`).expect(404);
    }
  });

  it('is stopped when the shop closes, which then takes no other', async () => {
    const [lotId, patternId] = [await drawnSide(1_900_000), await patternNamed('Arrow, last')];
    const { id } = await start(lotId, patternId);
    await shop.context.searches.close();
    expect((await read(id)).state).toBe('stopped');
    const next = shop.as('owner').post(`/api/lots/${lotId}/searches`).send({ patternId });
    await next.expect(429);
  });
});
