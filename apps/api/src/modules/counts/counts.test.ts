import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { writeBareJob } from '../../testing/bare-job.ts';
import { ft2, stockUp } from '../../testing/stockroom.ts';
import { startTestShop } from '../../testing/test-shop.ts';
import { inTransaction, theProgram } from '../../work.ts';
import { reserveStock } from '../stock/stock-ledger.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;
let things: Awaited<ReturnType<typeof stockUp>>;
let jobId: number;
let shelves = 0;

beforeAll(async () => {
  shop = await startTestShop();
  things = await stockUp(shop);
  jobId = await writeBareJob(shop.context, 1);
});
afterAll(() => shop.close());

interface Line {
  id: number;
  tag: string;
  lotId: number | null;
  hardwareId: number | null;
}

/** Lots of the given feet on a shelf of their own, and a sheet for it. */
async function sheetOf(...feet: number[]) {
  const place = `Rack ${++shelves}`;
  const lots = feet.map((each) => ({
    leatherId: things.leatherId,
    form: 'side',
    measuredAreaMm2: ft2(each),
    place,
  }));
  await shop.as('owner').post('/api/receipts').send({ lots }).expect(201);
  const { body } = await shop
    .as('maker')
    .post('/api/counts')
    .send({ of: 'place', place })
    .expect(201);
  return { id: body.id as number, place, lines: body.lines as Line[], body };
}

const enter = (
  id: number,
  line: Line | undefined,
  entry: object,
  role: 'maker' | 'owner' = 'maker',
) => shop.as(role).put(`/api/counts/${id}/lines/${line?.id}`).send(entry);
const handIn = (id: number, leaveUncounted = false) =>
  shop.as('maker').post(`/api/counts/${id}/handing-in`).send({ leaveUncounted });
const read = async (id: number) => (await shop.as('owner').get(`/api/counts/${id}`)).body;
const approveAsRead = (id: number, version: number) =>
  shop.as('owner').post(`/api/counts/${id}/approval`).set('If-Match', `"${version}"`).send({});
/** Approves it as it now stands. */
const approved = async (id: number, status = 201) =>
  approveAsRead(id, (await read(id)).version as number).expect(status);
const lotOf = async (line: Line | undefined) =>
  (await shop.as('owner').get(`/api/lots/${line?.lotId}`).expect(200)).body;

async function rivets(onHand: number) {
  const { body } = await shop
    .as('owner')
    .post('/api/hardware')
    .send({ name: `Snap ${++shelves}`, unitPrice: '0.20' })
    .expect(201);
  const hardware = [{ hardwareId: body.id, quantity: onHand }];
  await shop.as('owner').post('/api/receipts').send({ hardware }).expect(201);
  return body.id as number;
}

async function hardwareSheet(hardwareId: number) {
  const { body } = await shop.as('owner').post('/api/counts').send({ of: 'hardware' }).expect(201);
  const line = (body.lines as Line[]).find((each) => each.hardwareId === hardwareId);
  return { id: body.id as number, line };
}

describe('a count', () => {
  it('says what lies there and never how much of it, to nobody, while it is counted', async () => {
    const { id, body } = await sheetOf(20, 22);
    expect(body).toMatchObject({ state: 'open', lineCount: 2, countedCount: 0 });
    for (const role of ['owner', 'maker'] as const) {
      const { body: sheet } = await shop.as(role).get(`/api/counts/${id}`).expect(200);
      const text = JSON.stringify(sheet);
      expect(text).not.toContain(ft2(20));
      expect(text).not.toContain(ft2(22));
    }
  });

  it('becomes movements of kind count when the owner approves it, and not twice', async () => {
    const { id, lines } = await sheetOf(20, 22);
    await enter(id, lines[0], { areaMm2: ft2(19) }).expect(200);
    await enter(id, lines[1], { unmeasured: true }).expect(200);
    await handIn(id).expect(201);
    const sheet = await read(id);
    expect(sheet).toMatchObject({ state: 'handed in', differenceValue: '-9.00' });
    await shop.as('maker').post(`/api/counts/${id}/approval`).send({}).expect(403);
    expect((await approved(id)).body).toMatchObject({ state: 'approved' });
    const again = await approved(id, 409);
    expect(again.body.detail).toContain('was approved by The owner');
    const { body } = await shop
      .as('owner')
      .get('/api/stock-movements')
      .query({ lotId: lines[0]?.lotId })
      .expect(200);
    expect(body.items[0]).toMatchObject({ kind: 'count', areaMm2: `-${ft2(1)}`, value: '-9.00' });
    expect(await lotOf(lines[1])).toMatchObject({ onHandAreaMm2: ft2(22) });
  });

  it('shows a maker no books, differences or values, even when it is handed in', async () => {
    const { id, lines } = await sheetOf(20);
    await enter(id, lines[0], { areaMm2: ft2(18) }).expect(200);
    await handIn(id).expect(201);
    const { body } = await shop.as('maker').get(`/api/counts/${id}`).expect(200);
    const hidden = ['bookAreaMm2', 'differenceAreaMm2', 'differenceValue', 'movedQuantity'];
    for (const field of hidden) expect(body.lines[0]).not.toHaveProperty(field);
    expect(body).not.toHaveProperty('differenceValue');
    expect(body).not.toHaveProperty('broken');
  });

  it('takes what moves while it goes on for what it is', async () => {
    const hardwareId = await rivets(500);
    const { id, line } = await hardwareSheet(hardwareId);
    await enter(id, line, { quantity: 480 }).expect(200);
    shop.clock.set(new Date(shop.clock.now().getTime() + 60_000));
    const more = [{ hardwareId, quantity: 100 }];
    await shop.as('owner').post('/api/receipts').send({ hardware: more }).expect(201);
    await handIn(id, true).expect(201);
    const seen = ((await read(id)).lines as { id: number }[]).find((each) => each.id === line?.id);
    expect(seen).toMatchObject({ bookQuantity: 500, movedQuantity: 100, movedAreaMm2: null });
    await approved(id);
    const { body } = await shop.as('owner').get(`/api/hardware/${hardwareId}`).expect(200);
    expect(body.onHand).toBe(580);
  });

  it('stands against the books as they were when it was counted, even if it was sent later', async () => {
    const hardwareId = await rivets(50);
    const { id, line } = await hardwareSheet(hardwareId);
    shop.clock.set(new Date(shop.clock.now().getTime() + 600_000));
    const more = [{ hardwareId, quantity: 30 }];
    await shop.as('owner').post('/api/receipts').send({ hardware: more }).expect(201);
    shop.clock.set(new Date(shop.clock.now().getTime() + 60_000));
    await enter(id, line, { quantity: 49, secondsAgo: 300 }).expect(200);
    await handIn(id, true).expect(201);
    await approved(id);
    const { body } = await shop.as('owner').get(`/api/hardware/${hardwareId}`).expect(200);
    expect(body.onHand).toBe(79);
  });

  it('lists the jobs that it leaves short before anybody approves it', async () => {
    const hardwareId = await rivets(100);
    await inTransaction(shop.context, theProgram, (work) =>
      reserveStock(work, { jobId, hardwareId, quantity: 80 }),
    );
    const { id, line } = await hardwareSheet(hardwareId);
    await enter(id, line, { quantity: 70 }).expect(200);
    await handIn(id, true).expect(201);
    expect((await read(id)).broken).toMatchObject([{ jobId, hardwareId, quantity: 80 }]);
    await approved(id);
  });

  it('says whose figure was replaced when two count one sheet', async () => {
    const { id, lines } = await sheetOf(20);
    await enter(id, lines[0], { areaMm2: ft2(18) }, 'maker').expect(200);
    const { body } = await enter(id, lines[0], { areaMm2: ft2(19) }, 'owner').expect(200);
    expect(body.replaced).toBe('The maker had 18 ft² there; what you wrote stands now.');
    expect(body.line).toMatchObject({ countedAreaMm2: ft2(19), countedByName: 'The owner' });
    const own = await enter(id, lines[0], { areaMm2: ft2(20) }, 'owner').expect(200);
    expect(own.body.replaced).toBeNull();
  });

  it('takes up what is found by its tag, once, and hangs it there', async () => {
    const here = await sheetOf(20);
    const elsewhere = await sheetOf(25);
    const tag = elsewhere.lines[0]?.tag;
    const add = (code: string) =>
      shop.as('maker').post(`/api/counts/${here.id}/lines`).send({ code });
    const { body } = await add(`https://shop.example.com/t/${tag}`).expect(201);
    expect(body).toMatchObject({ already: false, line: { tag, added: true } });
    expect((await add(tag ?? '').expect(201)).body).toMatchObject({
      already: true,
      line: { id: body.line.id },
    });
    await add('nothing-of-ours').expect(404);
    await enter(here.id, body.line, { unmeasured: true }).expect(200);
    await handIn(here.id, true).expect(201);
    await approved(here.id);
    expect(await lotOf(elsewhere.lines[0])).toMatchObject({ place: here.place });
  });

  it('goes back for single lines, which are blind again', async () => {
    const { id, lines } = await sheetOf(20, 22);
    for (const line of lines) await enter(id, line, { areaMm2: ft2(10) }).expect(200);
    await handIn(id).expect(201);
    const lineIds = [lines[0]?.id];
    await shop.as('owner').post(`/api/counts/${id}/recounts`).send({ lineIds }).expect(201);
    const sheet = await read(id);
    expect(sheet).toMatchObject({ state: 'open', countedCount: 1 });
    expect(sheet.lines[0]).toMatchObject({ again: true, countedAreaMm2: null, bookAreaMm2: null });
    await enter(id, lines[0], { areaMm2: ft2(20) }).expect(200);
    await handIn(id).expect(201);
    await approved(id);
    expect(await lotOf(lines[0])).toMatchObject({ onHandAreaMm2: ft2(20) });
    expect(await lotOf(lines[1])).toMatchObject({ onHandAreaMm2: ft2(10) });
  });

  it('is approved only as it was read, so that nobody posts figures unseen', async () => {
    const { id, lines } = await sheetOf(20);
    await enter(id, lines[0], { areaMm2: ft2(19) }).expect(200);
    await handIn(id).expect(201);
    const seen = (await read(id)).version as number;
    const lineIds = [lines[0]?.id];
    await shop.as('owner').post(`/api/counts/${id}/recounts`).send({ lineIds }).expect(201);
    expect((await approveAsRead(id, seen).expect(409)).body.detail).toContain(
      'still being counted',
    );
    await enter(id, lines[0], { areaMm2: ft2(2) }).expect(200);
    await handIn(id).expect(201);
    const { body } = await approveAsRead(id, seen).expect(412);
    expect(body.changed).toMatchObject({ by: 'The maker' });
    await shop.as('owner').post(`/api/counts/${id}/approval`).send({}).expect(428);
    expect(await lotOf(lines[0])).toMatchObject({ onHandAreaMm2: ft2(20) });
    await approved(id);
    expect(await lotOf(lines[0])).toMatchObject({ onHandAreaMm2: ft2(2) });
  });

  it('is not approved over a later count or adjustment of the same thing, and then posts nothing', async () => {
    const { id, lines } = await sheetOf(20, 22);
    for (const line of lines) await enter(id, line, { areaMm2: ft2(10) }).expect(200);
    await handIn(id).expect(201);
    shop.clock.set(new Date(shop.clock.now().getTime() + 1000));
    const adjust = { of: 'lot', lotId: lines[1]?.lotId, areaMm2: ft2(11), reason: 'measured' };
    await shop.as('owner').post('/api/adjustments').send(adjust).expect(201);
    const { body } = await approved(id, 409);
    expect(body.detail).toMatch(/^Lot T-\d+ was counted or adjusted elsewhere after that/);
    expect(await lotOf(lines[0])).toMatchObject({ onHandAreaMm2: ft2(20) });
    expect(await read(id)).toMatchObject({ state: 'handed in' });
  });

  it('is not handed in with lines left unless that is meant', async () => {
    const { id, lines } = await sheetOf(20, 22);
    expect((await handIn(id).expect(409)).body.detail).toContain('Nothing is counted yet');
    await enter(id, lines[0], { areaMm2: '0' }).expect(200);
    expect((await handIn(id).expect(409)).body.detail).toContain('1 line is not counted yet');
    await handIn(id, true).expect(201);
    await approved(id);
    expect(await lotOf(lines[0])).toMatchObject({ onHandAreaMm2: '0', valueOnHand: '0.00' });
    expect(await lotOf(lines[1])).toMatchObject({ onHandAreaMm2: ft2(22) });
    await enter(id, lines[1], { areaMm2: ft2(1) }).expect(409);
  });

  it('put aside leaves the books as they are', async () => {
    const { id, lines } = await sheetOf(20);
    await enter(id, lines[0], { areaMm2: ft2(1) }).expect(200);
    await shop.as('owner').post(`/api/counts/${id}/cancellation`).send({}).expect(201);
    await handIn(id).expect(409);
    expect(await lotOf(lines[0])).toMatchObject({ onHandAreaMm2: ft2(20) });
  });

  it('refuses figures below nought, and areas of bins', async () => {
    const hardwareId = await rivets(5);
    const { id, line } = await hardwareSheet(hardwareId);
    await enter(id, line, { quantity: -1 }).expect(422);
    await enter(id, line, { areaMm2: ft2(1) }).expect(422);
    await enter(id, line, { quantity: 1, areaMm2: ft2(1) }).expect(422);
    const side = await sheetOf(20);
    await enter(side.id, side.lines[0], { areaMm2: '-1' }).expect(422);
    await enter(side.id, side.lines[0], { quantity: 3 }).expect(422);
    await enter(side.id, line, { areaMm2: '1' }).expect(404);
  });

  it('is opened only where something lies', async () => {
    const open = (body: object) => shop.as('maker').post('/api/counts').send(body);
    await open({ of: 'place', place: 'Nowhere' }).expect(422);
    await open({ of: 'leather', leatherId: 9999 }).expect(422);
    await open({ of: 'supplies' }).expect(422);
    const { body } = await open({ of: 'leather', leatherId: things.leatherId }).expect(201);
    expect(body.lines.length).toBeGreaterThan(5);
    const places = await shop.as('maker').get('/api/count-places').expect(200);
    expect(places.body.items).toContainEqual({ place: 'Rack 1', lots: 2, bins: 0 });
    const { body: list } = await shop.as('owner').get('/api/counts').expect(200);
    expect(list.items[0]).toMatchObject({ id: body.id, state: 'open' });
  });

  it('takes the bins of a place with its lots, and goes along all hardware by place', async () => {
    const add = async (hardware: object) =>
      (await shop.as('owner').post('/api/hardware').send(hardware).expect(201)).body.id as number;
    const far = await add({ name: 'A far snap', unitPrice: '0.20', bin: 'Zinc drawer' });
    const near = await add({ name: 'Near snap', unitPrice: '0.20', bin: 'Beech drawer' });
    const dye = await add({
      name: 'Dye',
      kind: 'supplies',
      unitPrice: '4.00',
      bin: 'Beech drawer',
    });
    const none = await add({ name: 'A stray snap', unitPrice: '0.20' });
    const parts = [{ hardwareId: near, quantity: 2 }];
    const kit = await add({ name: 'Pair of snaps', unitPrice: '0.40', bin: 'Beech drawer', parts });
    const lot = { leatherId: things.leatherId, form: 'side', measuredAreaMm2: ft2(9) };
    const lots = [{ ...lot, place: 'Beech drawer' }];
    await shop.as('owner').post('/api/receipts').send({ lots }).expect(201);
    const places = (await shop.as('maker').get('/api/count-places').expect(200)).body.items;
    expect(places).toContainEqual({ place: 'Beech drawer', lots: 1, bins: 2 });
    expect(places).toContainEqual({ place: 'Zinc drawer', lots: 0, bins: 1 });

    const open = async (body: object) =>
      (await shop.as('maker').post('/api/counts').send(body).expect(201)).body;
    const sheet = await open({ of: 'place', place: 'Beech drawer' });
    expect(sheet.lines).toMatchObject([
      { lotId: expect.any(Number), place: 'Beech drawer' },
      { hardwareId: dye, place: 'Beech drawer' },
      { hardwareId: near, place: 'Beech drawer' },
    ]);
    await enter(sheet.id, sheet.lines[2], { quantity: 12 }).expect(200);
    await handIn(sheet.id, true).expect(201);
    await approved(sheet.id);
    const { body: counted } = await shop.as('owner').get(`/api/hardware/${near}`).expect(200);
    expect(counted).toMatchObject({ onHand: 12, bin: 'Beech drawer' });

    const all = (await open({ of: 'hardware' })).lines as Line[];
    const order = all.map(({ hardwareId }) => hardwareId);
    expect(order.slice(0, 2)).toEqual([near, far]);
    expect(order).toContain(none);
    expect(order).not.toContain(kit);
    expect(order).not.toContain(dye);
    const stray = await open({ of: 'place', place: 'Zinc drawer' });
    expect(stray.lines).toMatchObject([{ hardwareId: far }]);
  });

  it('asks the ledger no more often for many lines than for few, and not for what agrees', async () => {
    const executed = vi.spyOn(shop.context.orm.em.getConnection(), 'execute');
    const asked = async (feet: number[], more: number) => {
      const { id, lines } = await sheetOf(...feet);
      for (const [at, line] of lines.entries())
        await enter(id, line, { areaMm2: ft2((feet[at] ?? 0) + more) }).expect(200);
      await handIn(id).expect(201);
      executed.mockClear();
      const sheet = await read(id);
      return { queries: executed.mock.calls.length, value: sheet.differenceValue as string };
    };
    try {
      const few = await asked([20, 22], -1);
      const many = await asked([20, 21, 22, 23, 24, 25], -1);
      expect([few.value, many.value]).toEqual(['-18.00', '-54.00']);
      expect(few.queries).toBeGreaterThan(0);
      expect(many.queries).toBe(few.queries);
      const same = await asked([20, 21, 22], 0);
      expect(same.value).toBe('0.00');
      expect(same.queries).toBeLessThan(few.queries);
    } finally {
      executed.mockRestore();
    }
  });
});
